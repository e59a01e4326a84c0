// SPDX-License-Identifier: Apache-2.0
package reedling.time;

/**
 * What bounds the next step, s; infinite where nothing does.
 *
 * @param duration contact duration over the number of steps it must take
 * @param approach bodies about to touch
 * @param persistent contacts that last, by their frequency
 * @param margin the search margin: no body may use up more than a fifth of it in one step
 * @param driven the fastest prescribed motion, or one that starts or stops
 * @param maximum the case's own
 */
public record StepLimits(
        double duration, double approach, double persistent, double margin, double driven, double maximum) {

    /** The smallest of all; not a number if one is not. */
    public double smallest() {
        return Math.min(
                Math.min(Math.min(duration, approach), Math.min(persistent, margin)), Math.min(driven, maximum));
    }

    /** Name of what binds, for the progress line. */
    public String binding() {
        double least = smallest();
        if (least == duration) {
            return "contact";
        }
        if (least == approach) {
            return "approach";
        }
        if (least == persistent) {
            return "stability";
        }
        if (least == margin) {
            return "margin";
        }
        return least == driven ? "drive" : "maximum";
    }
}
