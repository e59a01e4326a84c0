// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import org.joml.Vector3dc;

/**
 * Checked values of one table, SI, defaults filled in.
 *
 * @param path as findings name it: {@code wires.deck.section}
 * @param place where the table starts
 * @param entries by key, each as its {@link ValueType} says
 * @param sound whether every declared key was read without error; only then may the getters be used
 */
record Values(String path, Place place, Map<String, Object> entries, boolean sound) {

    boolean has(String key) {
        return entries.containsKey(key);
    }

    double number(String key) {
        return (Double) get(key);
    }

    OptionalDouble optionalNumber(String key) {
        return has(key) ? OptionalDouble.of(number(key)) : OptionalDouble.empty();
    }

    long whole(String key) {
        return (Long) get(key);
    }

    OptionalLong optionalWhole(String key) {
        return has(key) ? OptionalLong.of(whole(key)) : OptionalLong.empty();
    }

    boolean flag(String key) {
        return (Boolean) get(key);
    }

    String text(String key) {
        return (String) get(key);
    }

    Optional<String> optionalText(String key) {
        return has(key) ? Optional.of(text(key)) : Optional.empty();
    }

    Vector3dc vector(String key) {
        return (Vector3dc) get(key);
    }

    Values part(String key) {
        return (Values) get(key);
    }

    PluginChoice plugin(String key) {
        return (PluginChoice) get(key);
    }

    SearchMargin margin(String key) {
        return (SearchMargin) get(key);
    }

    @SuppressWarnings("unchecked") // Couple and Choices are read as lists of text
    List<String> words(String key) {
        return (List<String>) get(key);
    }

    @SuppressWarnings("unchecked") // Shares are read as this map
    Map<String, Double> shares(String key) {
        return (Map<String, Double>) get(key);
    }

    @SuppressWarnings("unchecked") // Several is read as this list
    List<Values> several(String key) {
        return has(key) ? (List<Values>) get(key) : List.of();
    }

    @SuppressWarnings("unchecked") // Named is read as a map to what its entry type is read as; the caller knows it
    <T> Map<String, T> named(String key) {
        return has(key) ? (Map<String, T>) get(key) : Map.of();
    }

    Object get(String key) {
        Object value = entries.get(key);
        if (value == null) {
            throw new IllegalStateException(path + " has no checked value for " + key);
        }
        return value;
    }
}
