// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import java.util.Arrays;
import reedling.error.RangeCheck;

/**
 * Sizes from a sieve table. A round grain passes an opening as wide as its diameter.
 *
 * <p>Formula: between two openings the passing part is a straight line over the logarithm of the diameter, as on the
 * semi-logarithmic paper such tables are drawn on: density proportional to 1/d inside a class.
 * <p>Errors: fewer than two openings; openings that do not rise; passing parts that fall, or do not run from 0 to 1.
 * Source: interpolation by common practice, no source. Threads: immutable.
 */
public final class SieveSize implements SizeDistribution {

    private final PowerClasses classes;

    /**
     * @param basis what the parts are parts of
     * @param opening m, rising
     * @param passing part below each opening, from 0 to 1
     */
    public SieveSize(Basis basis, double[] opening, double[] passing) {
        new RangeCheck("size")
                .require(opening.length >= 2, "openings", opening.length, "", "at least 2")
                .require(passing.length == opening.length, "passing parts", passing.length, "", "one an opening")
                .finish();
        RangeCheck check = new RangeCheck("size").positive("opening", opening[0], "m");
        double[] share = new double[opening.length - 1];
        for (int k = 0; k < share.length; k++) {
            String above = "above the opening before, " + opening[k] + " m";
            share[k] = passing[k + 1] - passing[k];
            check.require(opening[k + 1] > opening[k], "opening", opening[k + 1], "m", above)
                    .require(share[k] >= 0, "part between two openings", share[k], "", ">= 0");
        }
        check.require(passing[0] == 0, "passing part of the finest", passing[0], "", "0")
                .require(passing[share.length] == 1, "passing part of the coarsest", passing[share.length], "", "1")
                .finish();
        int first = firstFilled(share);
        int last = lastFilled(share);
        classes = new PowerClasses(
                basis, Arrays.copyOfRange(opening, first, last + 2), Arrays.copyOfRange(share, first, last + 1), 0);
    }

    private static int firstFilled(double[] share) {
        int k = 0;
        while (share[k] == 0) {
            k++;
        }
        return k;
    }

    private static int lastFilled(double[] share) {
        int k = share.length - 1;
        while (share[k] == 0) {
            k--;
        }
        return k;
    }

    @Override
    public double diameter(RandomStream random) {
        return classes.diameter(random.uniform());
    }

    @Override
    public double meanCube() {
        return classes.meanCube();
    }

    @Override
    public double smallest() {
        return classes.smallest();
    }

    @Override
    public double largest() {
        return classes.largest();
    }

    @Override
    public double massPassing(double diameter) {
        return classes.massPassing(diameter);
    }
}
