// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.ArrayList;
import java.util.List;
import reedling.material.MaterialPair;

/**
 * A set of couples with random motions.
 *
 * @param couples equal and unequal spheres
 * @param motions closed cycles, one a couple
 * @param duration of every motion, s: several contacts long
 */
record Cycles(List<Couple> couples, List<PairMotion> motions, double duration) {

    private static final double CONTACTS = 6;

    /** The first so many couples of a fixed list. */
    static Cycles of(int count, MaterialPair pair) {
        Couple equal = Reference.equal();
        double duration = CONTACTS * Reference.duration(equal, pair, Reference.DEPTH * equal.effectiveRadius());
        List<Couple> couples = new ArrayList<>();
        List<PairMotion> motions = new ArrayList<>();
        for (int p = 0; p < count; p++) {
            Couple couple = new Couple(Reference.RADIUS, Reference.RADIUS * (p % 3 == 0 ? 1 : 0.5 + 0.25 * (p % 7)));
            couples.add(couple);
            motions.add(new RandomCycle(p + 1, couple, duration));
        }
        return new Cycles(couples, motions, duration);
    }

    List<Couple> exchangedCouples() {
        return couples.stream().map(Couple::exchanged).toList();
    }

    List<PairMotion> exchangedMotions() {
        return motions.stream().map(PairMotion::exchanged).toList();
    }
}
