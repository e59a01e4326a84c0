// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.List;
import java.util.Map;
import reedling.contact.ContactLaw;
import reedling.contact.Stage;
import reedling.material.MaterialPair;

/**
 * Declared stiffness over the slope of the force, by finite differences at rest, loading and unloading.
 *
 * @param normal along the normal
 * @param sliding along the surface, before it slips
 */
record Slopes(Range normal, Range sliding) {

    private static final double[] DEPTHS = {0.001, 0.003, 0.01, 0.03}; // over the effective radius
    private static final double NUDGE = 1e-4; // of the overlap
    private static final double NOTHING = 1e-6; // of the normal slope: rounding of the tilted normal force
    private static final double STEP = 1e-6; // s

    /**
     * Ratios seen.
     *
     * @param smallest infinite if there was no force
     * @param largest 0 if there was no force
     */
    record Range(double smallest, double largest) {
        static final Range NONE = new Range(Double.POSITIVE_INFINITY, 0);

        boolean any() {
            return smallest <= largest || Double.isNaN(smallest);
        }

        Range with(double declared, double slope) {
            if (!(slope > 0)) {
                return this; // softening: no oscillation to follow
            }
            double ratio = declared / slope;
            return Double.isNaN(ratio)
                    ? new Range(Double.NaN, Double.NaN)
                    : new Range(Math.min(smallest, ratio), Math.max(largest, ratio));
        }
    }

    static Slopes of(Map<Stage, ContactLaw> laws) {
        Range normal = Range.NONE;
        Range sliding = Range.NONE;
        MaterialPair pair = Reference.elastic(0.5, 0.1);
        Couple couple = Reference.equal();
        for (double depth : DEPTHS) {
            double overlap = depth * couple.effectiveRadius();
            double nudge = NUDGE * overlap;
            try (PairBench bench = new PairBench(laws, pair, List.of(couple), PairBench.ONE_CELL)) {
                double before = at(bench, couple, overlap, 0, 0)[0];
                double after = at(bench, couple, overlap + nudge, 0, 0)[0];
                normal = normal.with(bench.normalStiffness(0), (after - before) / nudge);
                double back = at(bench, couple, overlap, 0, 0)[0];
                normal = normal.with(bench.normalStiffness(0), (after - back) / nudge);
                double normalSlope = (after - back) / nudge;
                at(bench, couple, overlap, nudge, nudge / STEP);
                double slid = at(bench, couple, overlap, nudge, 0)[1]; // at rest again: no dashpot
                if (slid / nudge > NOTHING * normalSlope) {
                    sliding = sliding.with(bench.slidingStiffness(0), slid / nudge);
                }
            }
        }
        return new Slopes(normal, sliding);
    }

    /** Normal force and friction on the first body, N, at rest but for a slide along y, m, at a speed, m/s. */
    private static double[] at(PairBench bench, Couple couple, double overlap, double along, double speed) {
        double distance = couple.firstRadius() + couple.secondRadius() - overlap;
        double across = Math.sqrt(distance * distance - along * along);
        double[] centres = {0, along, 0, across, 0, 0};
        bench.place(0, centres, new double[] {0, speed, 0, 0, 0, 0}, new double[6], 0);
        bench.place(1, centres, new double[6], new double[6], 3);
        bench.evaluate(STEP, false);
        double nx = across / distance, ny = -along / distance;
        double fx = bench.force(0, 0), fy = bench.force(0, 1);
        return new double[] {-(fx * nx + fy * ny), fx * ny - fy * nx};
    }
}
