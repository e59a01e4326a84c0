// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.ArrayList;
import java.util.List;
import reedling.material.MaterialPair;

/** A row's result has the same bits wherever the row stands in a block and whatever stands beside it. */
final class RowIndependence implements Check {

    private static final int COUPLES = 61;
    private static final int STEPS = 300;
    private static final int STRIDE = 5;
    private static final double GRID = 0x1p-45; // m and rad

    @Override
    public String name() {
        return "splitting a block changes no bit";
    }

    @Override
    public Outcome run(Subject subject) {
        MaterialPair pair = Reference.lossy();
        Cycles cycles = Cycles.of(COUPLES, pair);
        Recording.Plan plan = new Recording.Plan(pair, STEPS, cycles.duration(), GRID, 0);
        Recording together = Recording.of(subject.laws(), cycles.couples(), cycles.motions(), PairBench.ONE_CELL, plan);
        int differing = 0;
        for (int first = 0; first < STRIDE; first++) {
            List<Couple> couples = new ArrayList<>();
            List<PairMotion> motions = new ArrayList<>();
            for (int p = first; p < COUPLES; p += STRIDE) {
                couples.addFirst(cycles.couples().get(p));
                motions.addFirst(cycles.motions().get(p));
            }
            Recording apart = Recording.of(subject.laws(), couples, motions, PairBench.ONE_CELL, plan);
            for (int k = 0; k < couples.size(); k++) {
                int p = first + STRIDE * (couples.size() - 1 - k);
                differing += sameBits(together, p, apart, k) ? 0 : 1;
            }
        }
        return Outcome.of(
                differing == 0,
                differing + " of " + COUPLES + " contacts have other forces when they stand in another block:"
                        + " a row's result must depend on that row alone.",
                COUPLES + " contacts, " + STEPS + " steps, in one block and in " + STRIDE + " of another order: "
                        + (differing == 0 ? "the same bits." : differing + " differ."));
    }

    static boolean sameBits(Recording a, int coupleOfA, Recording b, int coupleOfB) {
        for (int step = 0; step < a.loads().size(); step++) {
            for (int c = 0; c < PairMotion.LENGTH; c++) {
                double one = a.loads().get(step)[coupleOfA * PairMotion.LENGTH + c];
                double other = b.loads().get(step)[coupleOfB * PairMotion.LENGTH + c];
                if (Double.doubleToRawLongBits(one + 0.0) != Double.doubleToRawLongBits(other + 0.0)) {
                    return false;
                }
            }
        }
        return true;
    }
}
