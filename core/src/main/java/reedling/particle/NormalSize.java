// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import reedling.error.RangeCheck;

/**
 * Normal distribution of diameters by number, cut at two bounds: draws outside the bounds are rejected and repeated.
 *
 * <p>Formula: density proportional to exp(-z^2/2), z = (d - mean)/deviation, for smallest <= d <= largest.
 * <p>Errors: a value not positive, bounds in the wrong order, less than 1 % of the normal distribution between the
 * bounds (each draw would then take hundreds of trials). Threads: immutable.
 *
 * @param mean of the distribution before the cut, m
 * @param deviation standard deviation before the cut, m
 * @param smallest m
 * @param largest m
 */
public record NormalSize(double mean, double deviation, double smallest, double largest) implements SizeDistribution {

    private static final double LEAST_KEPT = 0.01;
    private static final int INTERVALS = 2000;
    /** Beyond this many deviations the density is below 1e-31 of its peak. */
    private static final double FAR = 12;

    public NormalSize {
        new RangeCheck("size")
                .positive("mean", mean, "m")
                .positive("deviation", deviation, "m")
                .positive("smallest", smallest, "m")
                .positive("largest", largest, "m")
                .require(!(largest <= smallest), "largest", largest, "m", "above the smallest, " + smallest + " m")
                .finish();
        double kept = integral(0, mean, deviation, smallest, largest) / Math.sqrt(2 * Math.PI);
        new RangeCheck("size")
                .require(kept >= LEAST_KEPT, "share of the distribution between the bounds", kept, "", "at least 0.01")
                .finish();
    }

    @Override
    public double diameter(RandomStream random) {
        while (true) {
            double drawn = mean + deviation * random.normal();
            if (drawn >= smallest && drawn <= largest) {
                return drawn;
            }
        }
    }

    @Override
    public double meanCube() {
        return integral(3, mean, deviation, smallest, largest) / integral(0, mean, deviation, smallest, largest);
    }

    @Override
    public double massPassing(double diameter) {
        double to = Math.clamp(diameter, smallest, largest);
        return integral(3, mean, deviation, smallest, to) / integral(3, mean, deviation, smallest, largest);
    }

    /** Integral of d^power exp(-z^2/2) dz between the bounds by Simpson's rule. */
    private static double integral(int power, double mean, double deviation, double smallest, double largest) {
        double from = Math.max((smallest - mean) / deviation, -FAR);
        double to = Math.min((largest - mean) / deviation, FAR);
        if (from >= to) {
            return 0;
        }
        double width = (to - from) / INTERVALS;
        double sum = 0;
        for (int k = 0; k <= INTERVALS; k++) {
            double z = from + k * width;
            double d = mean + deviation * z;
            double moment = power == 3 ? d * d * d : 1;
            int weight = k == 0 || k == INTERVALS ? 1 : 2 + 2 * (k & 1);
            sum += weight * moment * StrictMath.exp(-0.5 * z * z);
        }
        return sum * width / 3;
    }
}
