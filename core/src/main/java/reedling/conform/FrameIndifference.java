// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.List;
import java.util.Locale;
import reedling.material.MaterialPair;

/** The same motion in a frame that is turned, moved and in uniform motion gives the same forces, turned. */
final class FrameIndifference implements Check {

    private static final int COUPLES = 24;
    private static final int STEPS = 400;
    private static final int FRAMES = 3;

    /** Rounding of overlaps and slips, which are small differences of coordinates. */
    private static final double ROUNDING = 1e-6;

    @Override
    public String name() {
        return "frame indifference";
    }

    @Override
    public Outcome run(Subject subject) {
        MaterialPair pair = Reference.lossy();
        Cycles cycles = Cycles.of(COUPLES, pair);
        Recording.Plan plan = new Recording.Plan(pair, STEPS, cycles.duration(), 0, 0);
        Recording here = Recording.of(subject.laws(), cycles.couples(), cycles.motions(), PairBench.ONE_CELL, plan);
        double worst = 0;
        for (int k = 0; k < FRAMES; k++) {
            Frame frame = Frame.random(100 + k, k * Reference.RADIUS, k * Reference.RADIUS / cycles.duration());
            List<PairMotion> moved = cycles.motions().stream().map(frame::of).toList();
            Recording there = Recording.of(subject.laws(), cycles.couples(), moved, PairBench.ONE_CELL, plan);
            worst = Math.max(worst, here.difference(there, frame::turn));
        }
        return Outcome.of(
                worst <= ROUNDING,
                String.format(
                        Locale.ROOT,
                        "In a turned and moving frame the forces differ by %.2g of the largest:"
                                + " the law knows directions or velocities of its own.",
                        worst),
                String.format(Locale.ROOT, "Turned, moved and in uniform motion: %.1e of the largest force.", worst));
    }
}
