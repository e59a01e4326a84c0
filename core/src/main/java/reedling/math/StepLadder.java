// SPDX-License-Identifier: Apache-2.0
package reedling.math;

/**
 * The rungs a step may stand on while anything touches: 1 ns times 2^(k/4). Fixed once for all runs, so that restarts and
 * thread counts give identical steps.
 */
public final class StepLadder {

    /** Ratio of neighbouring rungs. */
    public static final double RATIO = 1.189207115002721; // 2^(1/4)

    private static final double FIRST = 1e-9; // s
    private static final double[] QUARTERS = {1, RATIO, 1.4142135623730951, 1.681792830507429};

    private StepLadder() {}

    /** Largest rung not above a limit, s; limits below 1 ns give rungs below it. */
    public static double floor(double limit) {
        double ratio = limit / FIRST;
        int exponent = Math.getExponent(ratio);
        double mantissa = Math.scalb(ratio, -exponent);
        double rung = Math.scalb(FIRST, exponent);
        for (int q = 3; q > 0; q--) {
            if (mantissa >= QUARTERS[q]) {
                return rung * QUARTERS[q];
            }
        }
        return rung;
    }
}
