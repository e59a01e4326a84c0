// SPDX-License-Identifier: Apache-2.0
package reedling.field;

import reedling.plugin.ParameterValues;
import reedling.plugin.Provider;

/** A field as a plugin; found by ServiceLoader. */
public interface FieldProvider extends Provider {

    /** Makes the field from checked values. */
    Field create(ParameterValues values);
}
