// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import reedling.plugin.Provider;

/** Maker of one kind of element, found by {@link java.util.ServiceLoader}. */
public interface ElementType extends Provider {

    /**
     * The law of elements that share section, material and parameters.
     *
     * @throws reedling.error.ReedlingException if the section or a number is not one this element can use
     */
    ElementLaw law(ElementProperties properties);
}
