// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import java.util.Arrays;
import reedling.error.RangeCheck;

/**
 * Rosin-Rammler-Sperling-Bennett distribution between two cuts; what lies outside is left out and the rest counts as the
 * whole.
 *
 * <p>Formula: R = exp(-t), t = (d/d')^n, is the part larger than d; R(d') = 36.8 %. Density over ln d by the basis: n t
 * exp(-t); by mass times d^e, by number times d^(e-3), e of {@link Basis#massPower}.
 * <p>The number density has no closed inverse. The range is cut into 256 classes of equal ratio, filled by Simpson's rule
 * (relative error about 1e-6 where (largest/smallest)^(n/256) is below 2); inside a class diameters are drawn
 * evenly over ln d and accepted against the density itself, so that the shape is exact.
 * <p>Errors: a number not positive; cuts in the wrong order; less than 1 % between the cuts. Source: P. Rosin and E.
 * Rammler, The laws governing the fineness of powdered coal, 1933; DIN 66145 (both from memory). Threads: immutable.
 */
public final class RosinRammlerSize implements SizeDistribution {

    private static final double LEAST_KEPT = 0.01;
    private static final int CLASSES = 256;
    private static final int INTERVALS = 8;

    private final double size;
    private final double uniformity;
    private final double smallest;
    private final double largest;
    private final int massPower;
    private final double[] numberBelow;
    private final double[] massBelow;

    /**
     * @param basis what R is a part of
     * @param size characteristic size d', m
     * @param uniformity n
     * @param smallest lower cut, m
     * @param largest upper cut, m
     */
    public RosinRammlerSize(Basis basis, double size, double uniformity, double smallest, double largest) {
        new RangeCheck("size")
                .positive("characteristic size", size, "m")
                .positive("uniformity", uniformity, "")
                .positive("smallest", smallest, "m")
                .positive("largest", largest, "m")
                .require(largest > smallest, "largest", largest, "m", "above the smallest, " + smallest + " m")
                .finish();
        this.size = size;
        this.uniformity = uniformity;
        this.smallest = smallest;
        this.largest = largest;
        massPower = basis.massPower();
        double kept = uncutRetained(smallest) - uncutRetained(largest);
        new RangeCheck("size")
                .require(kept >= LEAST_KEPT, "part of the distribution between the cuts", kept, "", "at least 0.01")
                .finish();
        numberBelow = running(massPower - 3);
        massBelow = running(massPower);
    }

    private double[] running(int weight) {
        double[] below = new double[CLASSES + 1];
        for (int k = 0; k < CLASSES; k++) {
            below[k + 1] = below[k] + integral(logEdge(k), logEdge(k + 1), weight);
        }
        return below;
    }

    /** ln(d/d') at a class bound. */
    private double logEdge(int k) {
        double low = StrictMath.log(smallest / size);
        return low + k * (StrictMath.log(largest / size) - low) / CLASSES;
    }

    /** Logarithm of the density over ln d, weighted with a power of d/d', at x = ln(d/d'). */
    private double logDensity(double x, int weight) {
        return (uniformity + weight) * x - StrictMath.exp(uniformity * x);
    }

    private double integral(double from, double to, int weight) {
        double width = (to - from) / INTERVALS;
        double sum = 0;
        for (int k = 0; k <= INTERVALS; k++) {
            int simpson = k == 0 || k == INTERVALS ? 1 : 2 + 2 * (k & 1);
            sum += simpson * StrictMath.exp(logDensity(from + k * width, weight));
        }
        return sum * width / 3;
    }

    /** Part larger than a diameter (m) before the cuts, by the basis. */
    public double uncutRetained(double diameter) {
        return StrictMath.exp(-StrictMath.pow(diameter / size, uniformity));
    }

    /** Diameter (m) that a part is larger than, before the cuts, by the basis. */
    public double uncutDiameter(double retained) {
        return size * StrictMath.pow(-StrictMath.log(retained), 1 / uniformity);
    }

    @Override
    public double diameter(RandomStream random) {
        int weight = massPower - 3;
        double u = random.uniform() * numberBelow[CLASSES];
        int found = Arrays.binarySearch(numberBelow, u);
        int k = Math.clamp(found >= 0 ? found : -found - 2, 0, CLASSES - 1);
        double from = logEdge(k);
        double to = logEdge(k + 1);
        double peak = logDensity(Math.clamp(logMode(weight), from, to), weight);
        while (true) {
            double x = random.uniform(from, to);
            if (StrictMath.log(1 - random.uniform()) <= logDensity(x, weight) - peak) {
                return Math.clamp(size * StrictMath.exp(x), smallest, largest);
            }
        }
    }

    /** ln(d/d') of the largest density over ln d; minus infinity where it only falls. */
    private double logMode(int weight) {
        double t = (uniformity + weight) / uniformity;
        return t > 0 ? StrictMath.log(t) / uniformity : Double.NEGATIVE_INFINITY;
    }

    @Override
    public double meanCube() {
        return size * size * size * massBelow[CLASSES] / numberBelow[CLASSES];
    }

    @Override
    public double smallest() {
        return smallest;
    }

    @Override
    public double largest() {
        return largest;
    }

    @Override
    public double massPassing(double diameter) {
        if (diameter <= smallest) {
            return 0;
        }
        if (diameter >= largest) {
            return 1;
        }
        if (massPower == 0) {
            double first = uncutRetained(smallest);
            return (first - uncutRetained(diameter)) / (first - uncutRetained(largest));
        }
        double x = StrictMath.log(diameter / size);
        int k = Math.clamp((long) ((x - logEdge(0)) / (logEdge(1) - logEdge(0))), 0, CLASSES - 1);
        return (massBelow[k] + integral(logEdge(k), x, massPower)) / massBelow[CLASSES];
    }
}
