// SPDX-License-Identifier: Apache-2.0
package reedling.math;

import jdk.incubator.vector.DoubleVector;
import jdk.incubator.vector.VectorShape;
import jdk.incubator.vector.VectorSpecies;

/**
 * Chooses once, at start, how kernels run: eight doubles at a time where the machine has 512-bit vectors, else one at
 * a time. Both give the same bits: every kernel uses fused multiply-add in the same places, and sums over rows are kept
 * in eight accumulators by row number modulo 8. The system property {@code reedling.lanes} (1 or 8) forces a choice.
 */
public final class Lanes {

    /** Rows in a tile, whatever the machine; blocks are multiples of it. */
    public static final int TILE = 8;

    /** Eight doubles; kernels fixed to eight lanes use it only where {@link #VECTORISED} is true. */
    public static final VectorSpecies<Double> SPECIES = DoubleVector.SPECIES_512;

    /** True where eight-lane kernels run as vector instructions. */
    public static final boolean VECTORISED = choose();

    private Lanes() {}

    private static boolean choose() {
        String forced = System.getProperty("reedling.lanes");
        if (forced != null) {
            return "8".equals(forced);
        }
        return VectorShape.preferredShape().vectorBitSize() >= SPECIES.vectorBitSize();
    }

    /** The smaller of two lane by lane; the second where either is not a number, as {@code a < b ? a : b}. */
    public static DoubleVector smaller(DoubleVector a, DoubleVector b) {
        return b.blend(a, a.lt(b));
    }

    /** The larger of two lane by lane; the second where either is not a number, as {@code a > b ? a : b}. */
    public static DoubleVector larger(DoubleVector a, DoubleVector b) {
        return b.blend(a, b.lt(a));
    }
}
