// SPDX-License-Identifier: Apache-2.0
package reedling.math;

/**
 * Roots made of additions, multiplications and divisions only: the same bits on every machine, and no allocation, which
 * {@link StrictMath#pow} costs.
 */
public final class Roots {

    private static final int NEWTON_STEPS =
            6; // from a start within 25 % the error falls below one unit in the last place

    private Roots() {}

    /** Third root of a positive finite number; infinity for infinity, not a number for a negative number. */
    public static double third(double x) {
        if (!(x > 0) || x == Double.POSITIVE_INFINITY) {
            return x < 0 ? Double.NaN : x;
        }
        int power = Math.floorDiv(Math.getExponent(x), 3);
        double part = Math.scalb(x, -3 * power); // 1 <= part < 8 for normal numbers
        double root = 0.48 * (1 + (part - 1) * (1.0 / 7) + Math.sqrt(part));
        for (int k = 0; k < NEWTON_STEPS; k++) {
            root = (2 * root + part / (root * root)) * (1.0 / 3);
        }
        return Math.scalb(root, power);
    }

    /** Fifth root of a positive finite number; infinity for infinity, not a number for a negative number. */
    public static double fifth(double x) {
        if (!(x > 0) || x == Double.POSITIVE_INFINITY) {
            return x < 0 ? Double.NaN : x;
        }
        int exponent = Math.getExponent(x);
        int power = Math.floorDiv(exponent, 5);
        double part = Math.scalb(x, -5 * power); // 1 <= part < 32 for normal numbers
        double root = 1 + (part - 1) * (1.0 / 31);
        root = 0.5 * (root + Math.sqrt(Math.sqrt(part)));
        for (int k = 0; k < NEWTON_STEPS; k++) {
            double squared = root * root;
            root = 0.2 * (4 * root + part / (squared * squared));
        }
        return Math.scalb(root, power);
    }

    /** Tenth root of a positive finite number. */
    public static double tenth(double x) {
        return Math.sqrt(fifth(x));
    }
}
