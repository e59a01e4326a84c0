// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import reedling.unit.Dimension;

/**
 * One number a plugin takes from the case file.
 *
 * @param name snake_case key as written in the case file
 * @param dimension physical dimension; the value reaches the plugin in its SI unit
 * @param minimum smallest accepted value, SI, inclusive
 * @param maximum largest accepted value, SI, inclusive
 * @param defaultValue value when the key is absent, SI; NaN makes the key obligatory
 * @param meaning one sentence for help and documentation
 */
public record Parameter(
        String name, Dimension dimension, double minimum, double maximum, double defaultValue, String meaning) {

    public boolean obligatory() {
        return Double.isNaN(defaultValue);
    }
}
