// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

import reedling.plugin.ParameterValues;
import reedling.plugin.Provider;

/** A contact stage as a plugin; found by ServiceLoader. */
public interface ContactLawProvider extends Provider {

    /** The stage it serves. */
    Stage stage();

    /** Makes the law from checked values. */
    ContactLaw create(ParameterValues values);
}
