// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import reedling.contact.HistoryColumn;
import reedling.material.MaterialPair;

/**
 * What a law remembers is what it declares: searches, which exchange the bodies of a row and forget rows that came apart,
 * change no force. The couples turn once about while they touch, so that their order in memory changes.
 */
final class CarriedHistory implements Check {

    private static final int COUPLES = 40;
    private static final int STEPS = 1200;
    private static final int SEARCH_EVERY = 7;
    private static final double ROUNDING = 1e-6;

    @Override
    public String name() {
        return "history is what it is declared to be";
    }

    @Override
    public Outcome run(Subject subject) {
        List<String> findings = new ArrayList<>();
        Set<String> names = new HashSet<>();
        for (HistoryColumn column : subject.law().history()) {
            if (column.components() != 1 && column.components() != 3) {
                findings.add("History column \"" + column.name() + "\" has " + column.components()
                        + " components: declare scalars and vectors.");
            }
            if (column.name().isBlank() || !names.add(column.name())) {
                findings.add("History column name \"" + column.name() + "\" is blank or used twice.");
            }
        }
        MaterialPair pair = Reference.lossy();
        Cycles cycles = Cycles.of(COUPLES, pair);
        List<PairMotion> turning = cycles.motions().stream()
                .map(motion -> turning(motion, cycles.duration()))
                .toList();
        Recording.Plan still = new Recording.Plan(pair, STEPS, cycles.duration(), 0, 0);
        Recording.Plan searching = new Recording.Plan(pair, STEPS, cycles.duration(), 0, SEARCH_EVERY);
        double margin = 0.1 * Reference.RADIUS;
        Recording once = Recording.of(subject.laws(), cycles.couples(), turning, margin, still);
        Recording often = Recording.of(subject.laws(), cycles.couples(), turning, margin, searching);
        double difference = once.difference(often, (loads, from) -> {});
        if (!(difference <= ROUNDING)) {
            findings.add(String.format(
                    Locale.ROOT,
                    "After searches the forces differ by %.2g of the largest: a vector declared as scalars, a vector that"
                            + " does not change its sign with the order of the bodies, or history kept after the bodies parted.",
                    difference));
        }
        return new Outcome(
                findings,
                String.format(
                        Locale.ROOT,
                        "%d history columns; %d exchanges of the bodies: %.1e of the largest force.",
                        subject.law().history().size(),
                        often.swaps(),
                        difference));
    }

    /** Turns a motion once about the axis (1, 1, 1) on its way, bodies and all. */
    private static PairMotion turning(PairMotion motion, double duration) {
        double third = Math.sqrt(1.0 / 3);
        return (time, pose) -> {
            motion.at(time, pose);
            double angle = 2 * Math.PI * time / duration;
            double c = Math.cos(angle);
            double s = Math.sin(angle) * third;
            double d = (1 - c) / 3;
            double[] matrix = {c + d, d - s, d + s, d + s, c + d, d - s, d - s, d + s, c + d};
            // angles are integrals of the spin: what the bodies turn by themselves stays in small angles, the whole is
            // added
            new Frame(matrix, new double[3], new double[3]).turn(pose, 0);
            for (int k = PairMotion.ANGLES; k < PairMotion.LENGTH; k++) {
                pose[k] += angle * third;
            }
        };
    }
}
