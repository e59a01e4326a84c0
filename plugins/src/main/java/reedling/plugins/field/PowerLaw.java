// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

/**
 * x^p for a fixed p in a drag curve, to 1e-12 of itself and with the same bits on every machine: the power of x's exponent
 * and that of one of 256 knots from tables made by {@link StrictMath#pow}, times three terms of the binomial series for the
 * rest. With StrictMath.pow the drag and lift of a grain took about 210 ns, with this 75 ns (mean of 5000 calls for 1000
 * grains, one core, not a dedicated machine).
 *
 * <p>Threads: immutable.
 */
final class PowerLaw {

    private static final int KNOTS = 256;
    private static final int SPAN = 200; // binary exponents on either side of 0
    private static final int BIAS = 1023;
    private static final long MANTISSA = (1L << 52) - 1;
    private static final long ONE = (long) BIAS << 52;

    private final double p;
    private final double[] scale = new double[2 * SPAN + 1];
    private final double[] knot = new double[KNOTS];
    private final double[] power = new double[KNOTS];

    /**
     * @param p 0 < p < 1
     */
    PowerLaw(double p) {
        this.p = p;
        for (int e = -SPAN; e <= SPAN; e++) {
            scale[e + SPAN] = StrictMath.pow(2, p * e);
        }
        for (int k = 0; k < KNOTS; k++) {
            knot[k] = 1 + (k + 0.5) / KNOTS;
            power[k] = StrictMath.pow(knot[k], p);
        }
    }

    /** x^p; 0 for x below 2^-200, and {@link StrictMath#pow} itself for what is not an everyday number. */
    double of(double x) {
        long bits = Double.doubleToRawLongBits(x);
        int exponent = (int) (bits >>> 52) - BIAS;
        if (exponent < -SPAN) {
            return 0;
        }
        if (exponent > SPAN) {
            return StrictMath.pow(x, p);
        }
        int k = (int) (bits >>> 44) & KNOTS - 1;
        double mantissa = Double.longBitsToDouble(bits & MANTISSA | ONE);
        double d = mantissa / knot[k] - 1;
        double series = 1 + p * d * (1 + (p - 1) / 2 * d * (1 + (p - 2) / 3 * d));
        return scale[exponent + SPAN] * power[k] * series;
    }
}
