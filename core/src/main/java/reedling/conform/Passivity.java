// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.List;
import java.util.Locale;
import reedling.material.MaterialPair;

/**
 * Over a closed motion the bodies give back no more work than was done on them, whatever they do in between. Tried with
 * and without dashpots and friction.
 */
final class Passivity implements Check {

    private static final int COUPLES = 64;
    private static final int STEPS = 4000;

    /** Work of steps is summed by the trapezoidal rule; jumps of the force, where bodies snap, cost about a step's work. */
    private static final double TOLERANCE = 2e-3;

    @Override
    public String name() {
        return "passivity";
    }

    @Override
    public Outcome run(Subject subject) {
        double worst = 0;
        String where = "";
        List<MaterialPair> pairs = List.of(
                Reference.lossy(),
                Reference.elastic(0, 0),
                Reference.elastic(0.4, 0.1),
                Reference.elastic(100, 100),
                Reference.pair(0.2, 1, 0.3));
        for (MaterialPair pair : pairs) {
            double created = created(subject, pair);
            if (!(created <= worst)) {
                worst = Double.isNaN(created) ? Double.POSITIVE_INFINITY : created;
                where = String.format(
                        Locale.ROOT,
                        "restitution %.2g, friction %.2g, rolling friction %.2g",
                        pair.restitution(),
                        pair.friction(),
                        pair.rollingFriction());
            }
        }
        return Outcome.of(
                worst <= TOLERANCE,
                String.format(
                        Locale.ROOT, "A closed motion creates %.2g of the work exchanged on it (%s).", worst, where),
                String.format(
                        Locale.ROOT,
                        "%d closed random motions: at most %.1e of the work exchanged is created.",
                        COUPLES * pairs.size(),
                        worst));
    }

    /** Largest energy created in a closed motion, over the sum of all work to and fro. */
    private static double created(Subject subject, MaterialPair pair) {
        Cycles cycles = Cycles.of(COUPLES, pair);
        double[] work = new double[COUPLES];
        double[] exchanged = new double[COUPLES];
        double[][] old = new double[COUPLES][PairMotion.LENGTH];
        try (PairBench bench = new PairBench(subject.laws(), pair, cycles.couples(), Reference.RADIUS)) {
            new Drive(bench, cycles.motions(), cycles.duration() / STEPS).run(0, STEPS, (step, drive) -> {
                for (int p = 0; p < COUPLES; p++) {
                    double done = 0;
                    for (int c = 0; c < PairMotion.LENGTH; c++) {
                        double load = drive.load(p, c);
                        done += step == 0 ? 0 : 0.5 * (old[p][c] + load) * drive.moved(p, c);
                        old[p][c] = load;
                    }
                    work[p] += done;
                    exchanged[p] += Math.abs(done);
                }
            });
        }
        double worst = 0;
        for (int p = 0; p < COUPLES; p++) {
            double created = exchanged[p] == 0 ? 0 : work[p] / exchanged[p];
            worst = created <= worst ? worst : created;
        }
        return worst;
    }
}
