// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import reedling.unit.Dimension;
import reedling.unit.QuantityText;

/**
 * Accepted values of a key, SI.
 *
 * @param minimum smallest value, or its limit
 * @param minimumOpen whether the minimum itself is refused
 * @param maximum largest value, or its limit
 * @param maximumOpen whether the maximum itself is refused
 * @param advice what to do about a value outside
 */
record Range(double minimum, boolean minimumOpen, double maximum, boolean maximumOpen, String advice) {

    private static final String CHECK = "Check the value and its unit.";

    static final Range ANY = new Range(Double.NEGATIVE_INFINITY, true, Double.POSITIVE_INFINITY, true, CHECK);

    /** minimum <= value <= maximum. */
    static Range closed(double minimum, double maximum) {
        return new Range(minimum, false, maximum, false, CHECK);
    }

    /** minimum < value <= maximum. */
    static Range above(double minimum, double maximum) {
        return new Range(minimum, true, maximum, false, CHECK);
    }

    /** minimum <= value < maximum. */
    static Range below(double minimum, double maximum) {
        return new Range(minimum, false, maximum, true, CHECK);
    }

    Range withAdvice(String sentence) {
        return new Range(minimum, minimumOpen, maximum, maximumOpen, sentence);
    }

    boolean holds(double value) {
        boolean high = minimumOpen ? value > minimum : value >= minimum;
        boolean low = maximumOpen ? value < maximum : value <= maximum;
        return high && low;
    }

    /** As messages print it: {@code 0 ≤ value < 0.5}; empty without limits. */
    String text(Dimension dimension) {
        boolean lower = minimum != Double.NEGATIVE_INFINITY;
        boolean upper = maximum != Double.POSITIVE_INFINITY;
        String from = QuantityText.of(minimum, dimension);
        String to = QuantityText.of(maximum, dimension);
        if (lower && upper) {
            return from + (minimumOpen ? " < " : " ≤ ") + "value" + (maximumOpen ? " < " : " ≤ ") + to;
        }
        if (lower) {
            return "value " + (minimumOpen ? "> " : "≥ ") + from;
        }
        return upper ? "value " + (maximumOpen ? "< " : "≤ ") + to : "";
    }
}
