// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import java.util.List;
import reedling.unit.Dimension;

/**
 * One number or word that a plugin takes from the case file. Element types take numbers only.
 *
 * @param name snake_case key as written in the case file
 * @param dimension physical dimension; the value reaches the plugin in its SI unit
 * @param minimum smallest accepted value, SI, inclusive
 * @param maximum largest accepted value, SI, inclusive
 * @param defaultValue value when the key is absent, SI; NaN makes the key obligatory
 * @param meaning one sentence for help and documentation
 * @param wording what words it takes instead of a number
 */
public record Parameter(
        String name,
        Dimension dimension,
        double minimum,
        double maximum,
        double defaultValue,
        String meaning,
        Wording wording) {

    /** Kinds of values. */
    public enum Kind {
        /** A quantity. */
        NUMBER,
        /** One word out of a list. */
        CHOICE,
        /** Path of a file, taken from the folder of the case file; the plugin gets it whole. */
        FILE,
        /** Name of a lot of the case; the plugin gets the lot's number. */
        LOT
    }

    /**
     * What words a parameter takes.
     *
     * @param kind kind of value
     * @param choices accepted words of a choice, else empty
     * @param fallback word when the key is absent; empty for no file, or for all lots
     */
    public record Wording(Kind kind, List<String> choices, String fallback) {

        static final Wording NONE = new Wording(Kind.NUMBER, List.of(), "");

        public Wording {
            choices = List.copyOf(choices);
        }
    }

    /** Value of a lot parameter that was left out. */
    public static final double ALL_LOTS = -1;

    /** A number. */
    public Parameter(
            String name, Dimension dimension, double minimum, double maximum, double defaultValue, String meaning) {
        this(name, dimension, minimum, maximum, defaultValue, meaning, Wording.NONE);
    }

    /** One of several words; {@link ParameterValues#word} gives it. */
    public static Parameter choice(String name, List<String> words, String fallback, String meaning) {
        return worded(name, new Wording(Kind.CHOICE, words, fallback), 0, meaning);
    }

    /** A file, optional; {@link ParameterValues#word} gives its path, empty if there is none. */
    public static Parameter file(String name, String meaning) {
        return worded(name, new Wording(Kind.FILE, List.of(), ""), 0, meaning);
    }

    /** A lot, optional; {@link ParameterValues#get} gives its number or {@link #ALL_LOTS}. */
    public static Parameter lot(String name, String meaning) {
        return worded(name, new Wording(Kind.LOT, List.of(), ""), ALL_LOTS, meaning);
    }

    private static Parameter worded(String name, Wording wording, double number, String meaning) {
        return new Parameter(name, Dimension.NUMBER, ALL_LOTS, Double.MAX_VALUE, number, meaning, wording);
    }

    public Kind kind() {
        return wording.kind();
    }

    public boolean obligatory() {
        return Double.isNaN(defaultValue);
    }
}
