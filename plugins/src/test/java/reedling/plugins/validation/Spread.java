// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.validation;

import java.util.Arrays;
import java.util.Locale;

/**
 * Values of several seeds.
 *
 * @param mean of all
 * @param deviation standard deviation of one value
 * @param count of values
 */
record Spread(double mean, double deviation, int count) {

    static Spread of(double... values) {
        double mean = Arrays.stream(values).average().orElseThrow();
        double squared = Arrays.stream(values).map(v -> (v - mean) * (v - mean)).sum();
        return new Spread(mean, Math.sqrt(squared / (values.length - 1)), values.length);
    }

    /** Says what came out, for the reader of a slow check. */
    void print(String what) {
        System.out.println(what + ": " + this);
    }

    @Override
    public String toString() {
        return String.format(Locale.ROOT, "%.4f, standard deviation %.4f of %d seeds", mean, deviation, count);
    }
}
