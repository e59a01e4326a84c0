// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * An axis of a drawing.
 *
 * @param low smallest value shown
 * @param high largest value shown
 * @param from pixel of the smallest
 * @param to pixel of the largest
 * @param logarithmic whether equal ratios are equally far apart
 */
record Axis(double low, double high, double from, double to, boolean logarithmic) {

    private static final int MARKS = 6;

    /** An axis that holds all values with a little room, and zero if it is near. */
    static Axis around(double least, double most, double from, double to, boolean logarithmic) {
        if (logarithmic) {
            return new Axis(least / 1.3, most * 1.3, from, to, true);
        }
        double low = least > 0 && least < 0.5 * most ? 0 : least;
        double high = most < 0 && most > 0.5 * least ? 0 : most;
        double room = high > low ? 0.05 * (high - low) : Math.max(0.1 * Math.abs(high), 1e-12);
        return new Axis(low == 0 ? 0 : low - room, high == 0 ? 0 : high + room, from, to, false);
    }

    double pixel(double value) {
        double share = logarithmic ? Math.log(value / low) / Math.log(high / low) : (value - low) / (high - low);
        return from + share * (to - from);
    }

    /** Round values to write at the axis. */
    List<Double> marks() {
        List<Double> marks = new ArrayList<>();
        if (logarithmic) {
            for (int power = (int) Math.ceil(Math.log10(low)); power <= Math.log10(high); power++) {
                marks.add(Math.pow(10, power));
            }
            return marks;
        }
        double step = step();
        for (long k = (long) Math.ceil(low / step - 1e-9); k * step <= high + 1e-9 * step; k++) {
            marks.add(k * step);
        }
        return marks;
    }

    private double step() {
        double raw = (high - low) / MARKS;
        double unit = Math.pow(10, Math.floor(Math.log10(raw)));
        for (double factor : new double[] {1, 2, 5}) {
            if (factor * unit >= raw) {
                return factor * unit;
            }
        }
        return 10 * unit;
    }

    /** A value as written at the axis. */
    String written(double value) {
        double size = Math.max(Math.abs(low), Math.abs(high));
        if (logarithmic || size < 1e-3 || size >= 1e5) {
            String text = String.format(Locale.ROOT, "%.3g", value);
            return value == 0 ? "0" : text.contains(".") ? text.replaceAll("\\.?0+(e|$)", "$1") : text;
        }
        int digits = (int) Math.max(0, Math.ceil(-Math.log10(step()) - 1e-9));
        return String.format(Locale.ROOT, "%." + digits + "f", value);
    }
}
