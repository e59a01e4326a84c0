// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import reedling.error.RangeCheck;

/**
 * Every diameter between two bounds equally likely, by number.
 *
 * <p>Formula: mean of d^3 = (b^4 - a^4)/(4 (b - a)) = (a + b)(a^2 + b^2)/4; part of the mass below d: (d^4 -
 * a^4)/(b^4 - a^4).
 * <p>Errors: bounds not positive or in the wrong order. Threads: immutable.
 *
 * @param smallest a, m
 * @param largest b, m
 */
public record UniformSize(double smallest, double largest) implements SizeDistribution {

    public UniformSize {
        new RangeCheck("size")
                .positive("smallest", smallest, "m")
                .positive("largest", largest, "m")
                .require(!(largest < smallest), "largest", largest, "m", "at least the smallest, " + smallest + " m")
                .finish();
    }

    @Override
    public double diameter(RandomStream random) {
        return Math.min(random.uniform(smallest, largest), largest);
    }

    @Override
    public double meanCube() {
        return 0.25 * (smallest + largest) * (smallest * smallest + largest * largest);
    }

    @Override
    public double massPassing(double diameter) {
        if (diameter < smallest) {
            return 0;
        }
        return diameter >= largest ? 1 : (fourth(diameter) - fourth(smallest)) / (fourth(largest) - fourth(smallest));
    }

    private static double fourth(double length) {
        return length * length * length * length;
    }
}
