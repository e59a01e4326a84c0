// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import java.util.Map;

/**
 * Checked values of a plugin's parameters, SI, one for each declared parameter.
 *
 * @param values by parameter name; complete (defaults filled in) and inside the declared ranges
 */
public record ParameterValues(Map<String, Double> values) {

    public ParameterValues {
        values = Map.copyOf(values);
    }

    /** Value of a declared parameter, SI. */
    public double get(String name) {
        Double value = values.get(name);
        if (value == null) {
            throw new IllegalArgumentException("parameter " + name + " was not declared by this plugin");
        }
        return value;
    }

    /** All defaults of a provider, with the given values laid over them. */
    public static ParameterValues of(Provider provider, Map<String, Double> given) {
        Map<String, Double> all = new java.util.HashMap<>();
        for (Parameter parameter : provider.parameters()) {
            if (!parameter.obligatory()) {
                all.put(parameter.name(), parameter.defaultValue());
            }
        }
        all.putAll(given);
        return new ParameterValues(all);
    }
}
