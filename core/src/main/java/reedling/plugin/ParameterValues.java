// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import java.util.HashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * Checked values of a plugin's parameters, SI, one for each declared parameter.
 *
 * @param values numbers by parameter name; complete (defaults filled in) and inside the declared ranges
 * @param words choices and paths by parameter name, complete
 */
public record ParameterValues(Map<String, Double> values, Map<String, String> words) {

    public ParameterValues {
        values = Map.copyOf(values);
        words = Map.copyOf(words);
    }

    /** Numbers only. */
    public ParameterValues(Map<String, Double> values) {
        this(values, Map.of());
    }

    /** Value of a declared parameter, SI. */
    public double get(String name) {
        return declared(values.get(name), name);
    }

    /** Word of a declared choice, or path of a file. */
    public String word(String name) {
        return declared(words.get(name), name);
    }

    private static <T> T declared(@Nullable T value, String name) {
        if (value == null) {
            throw new IllegalArgumentException("parameter " + name + " was not declared by this plugin");
        }
        return value;
    }

    /** All defaults of a provider, with the given values laid over them. */
    public static ParameterValues of(Provider provider, Map<String, Double> given) {
        return of(provider, given, Map.of());
    }

    /** All defaults of a provider, with the given numbers and words laid over them. */
    public static ParameterValues of(Provider provider, Map<String, Double> given, Map<String, String> givenWords) {
        Map<String, Double> numbers = new HashMap<>();
        Map<String, String> words = new HashMap<>();
        for (Parameter parameter : provider.parameters()) {
            switch (parameter.kind()) {
                case CHOICE, FILE ->
                    words.put(parameter.name(), parameter.wording().fallback());
                case NUMBER, LOT -> {
                    if (!parameter.obligatory()) {
                        numbers.put(parameter.name(), parameter.defaultValue());
                    }
                }
            }
        }
        numbers.putAll(given);
        words.putAll(givenWords);
        return new ParameterValues(numbers, words);
    }
}
