// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

/**
 * Sine and cosine of an angle counted in full turns, by plain arithmetic.
 *
 * <p>Formula: nearest quarter turn taken off exactly, the rest r (|r| at most pi/4) by the Taylor series to r^17 and
 * r^18; the first term left out is below 1e-19.
 * <p>Why not StrictMath: its sine makes a small array on every call, and walls move every step. Same bits on every
 * machine, because only additions and multiplications are used.
 * <p>Threads: stateless.
 */
final class Circle {

    private static final double[] SINE = reciprocalFactorials(1);
    private static final double[] COSINE = reciprocalFactorials(0);

    private Circle() {}

    static double sine(double turns) {
        return quarter(turns, 0);
    }

    static double cosine(double turns) {
        return quarter(turns, 1);
    }

    private static double quarter(double turns, int shift) {
        double quarters = Math.rint(4 * turns);
        double rest = 2 * Math.PI * (turns - 0.25 * quarters);
        int quadrant = (int) (((long) quarters + shift) & 3);
        double value = (quadrant & 1) == 0 ? rest * series(SINE, rest * rest) : series(COSINE, rest * rest);
        return quadrant < 2 ? value : -value;
    }

    private static double series(double[] coefficient, double square) {
        double sum = coefficient[coefficient.length - 1];
        for (int k = coefficient.length - 2; k >= 0; k--) {
            sum = coefficient[k] + square * sum;
        }
        return sum;
    }

    /** (-1)^k / (2 k + first)!; the factorials up to 18! are exact in double. */
    private static double[] reciprocalFactorials(int first) {
        double[] coefficient = new double[first == 1 ? 9 : 10];
        double factorial = 1;
        for (int k = 0; k < coefficient.length; k++) {
            if (k > 0) {
                factorial *= (2.0 * k + first) * (2.0 * k + first - 1);
            }
            coefficient[k] = (k % 2 == 0 ? 1 : -1) / factorial;
        }
        return coefficient;
    }
}
