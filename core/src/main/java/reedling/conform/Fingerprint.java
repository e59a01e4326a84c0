// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import reedling.material.MaterialPair;

/** All bits of the forces that a law gives along fixed random motions, as one number. */
final class Fingerprint {

    private static final int COUPLES = 61;
    private static final int STEPS = 300;
    private static final long PRIME = 0x100000001B3L; // of the hash of G. Fowler, L. C. Noll and K.-P. Vo, from memory

    private Fingerprint() {}

    static long of(Subject subject) {
        MaterialPair pair = Reference.lossy();
        Cycles cycles = Cycles.of(COUPLES, pair);
        Recording.Plan plan = new Recording.Plan(pair, STEPS, cycles.duration(), 0, 0);
        Recording all = Recording.of(subject.laws(), cycles.couples(), cycles.motions(), Reference.RADIUS, plan);
        long hash = 0xCBF29CE484222325L;
        for (double[] loads : all.loads()) {
            for (double load : loads) {
                hash = (hash ^ Double.doubleToRawLongBits(load + 0.0)) * PRIME;
            }
        }
        return hash;
    }
}
