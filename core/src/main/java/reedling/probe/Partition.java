// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.util.Arrays;

/**
 * Partition curve: of the grains of a size that were decided upon, the part that went over the deck. The cut size d50 is
 * where it crosses one half, on the curve made to rise by pooling neighbours that fall (weights: grains).
 *
 * <p>Source: partition curve of K. F. Tromp, 1937 (from memory); pool-adjacent-violators, R. E. Barlow, D. J. Bartholomew, J. M. Bremner and H. D. Brunk, Statistical
 * Inference under Order Restrictions, 1972 (from memory).
 *
 * @param diameter middles of the size classes, m
 * @param passed grains through the deck
 * @param over grains over the deck
 */
public record Partition(double[] diameter, long[] passed, long[] over) {

    /** From what left in the batches from one (inclusive) to another (exclusive). */
    public static Partition of(SizePassage sizes, int passedExit, int overExit, int fromBatch, int toBatch) {
        double[] diameter = new double[SizePassage.CLASSES];
        long[] passed = new long[SizePassage.CLASSES];
        long[] over = new long[SizePassage.CLASSES];
        for (int k = 0; k < diameter.length; k++) {
            diameter[k] = sizes.diameter(k);
            passed[k] = sizes.count(passedExit, k, fromBatch, toBatch);
            over[k] = sizes.count(overExit, k, fromBatch, toBatch);
        }
        return new Partition(diameter, passed, over);
    }

    /** Part of a class that went over the deck; not a number for an empty class. */
    public double partOver(int k) {
        return (double) over[k] / (passed[k] + over[k]);
    }

    /** Cut size d50, m; not a number if the curve does not cross one half. */
    public double cutSize() {
        return sizeAt(0.5);
    }

    /** Probable error (d75 - d25)/2, m: half the width over which the deck is undecided. */
    public double probableError() {
        return 0.5 * (sizeAt(0.75) - sizeAt(0.25));
    }

    /** Sharpness d25/d75: 1 for a perfect cut. */
    public double sharpness() {
        return sizeAt(0.25) / sizeAt(0.75);
    }

    /**
     * Size of which a part goes over, on the pooled curve with straight lines between the middles of the classes.
     *
     * @param wanted 0 to 1
     * @return m; not a number if the curve does not cross that part
     */
    public double sizeAt(double wanted) {
        double[] weight = new double[diameter.length];
        double[] part = new double[diameter.length];
        double[] middle = new double[diameter.length];
        int blocks = 0;
        for (int k = 0; k < diameter.length; k++) {
            double grains = passed[k] + over[k];
            if (grains > 0) {
                weight[blocks] = grains;
                part[blocks] = over[k] / grains;
                middle[blocks++] = diameter[k];
                blocks = pool(weight, part, middle, blocks);
            }
        }
        return crossing(Arrays.copyOf(part, blocks), middle, wanted);
    }

    private static int pool(double[] weight, double[] part, double[] middle, int blocks) {
        int left = blocks;
        while (left > 1 && part[left - 2] >= part[left - 1]) {
            double sum = weight[left - 2] + weight[left - 1];
            part[left - 2] = (weight[left - 2] * part[left - 2] + weight[left - 1] * part[left - 1]) / sum;
            middle[left - 2] = (weight[left - 2] * middle[left - 2] + weight[left - 1] * middle[left - 1]) / sum;
            weight[left - 2] = sum;
            left--;
        }
        return left;
    }

    private static double crossing(double[] part, double[] middle, double wanted) {
        for (int k = 0; k < part.length; k++) {
            if (Double.compare(part[k], wanted) == 0) {
                return middle[k];
            }
            if (k > 0 && part[k - 1] < wanted && part[k] > wanted) {
                double t = (wanted - part[k - 1]) / (part[k] - part[k - 1]);
                return middle[k - 1] + t * (middle[k] - middle[k - 1]);
            }
        }
        return Double.NaN;
    }
}
