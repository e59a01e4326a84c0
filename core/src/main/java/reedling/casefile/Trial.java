// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import reedling.parallel.WorkerTeam;
import reedling.run.Model;
import reedling.run.Simulation;

/**
 * A short stretch of a case, timed.
 *
 * @param perStep wall-clock time of a step in the fastest stretch, s: least disturbed by compiling and other programs
 * @param step mean step, s
 * @param grains grains in that fastest stretch
 */
record Trial(double perStep, double step, double grains) {

    /** Steps of a stretch. */
    private static final int STRETCH = 100;

    /** Part of the time for warming up, which is not measured. */
    private static final double WARM_UP = 0.5;

    /** Runs a model, which is used up, for so many seconds of wall-clock time or to an end (s simulated). */
    static Trial run(Model model, WorkerTeam team, double seconds, double end) {
        Simulation simulation = new Simulation(model, team);
        simulation.begin();
        long begun = System.nanoTime();
        double best = Double.POSITIVE_INFINITY;
        double grains = model.grains().count();
        do {
            long started = System.nanoTime();
            long steps = simulation.stepCount();
            while (simulation.stepCount() - steps < STRETCH && simulation.time() < end) {
                simulation.step();
            }
            double each = 1e-9 * (System.nanoTime() - started) / Math.max(1, simulation.stepCount() - steps);
            boolean warm = System.nanoTime() - begun > 1e9 * WARM_UP * seconds;
            if (each < best && warm || Double.isInfinite(best)) {
                best = each;
                grains = model.grains().count();
            }
        } while (System.nanoTime() - begun < 1e9 * seconds && simulation.time() < end);
        return new Trial(best, simulation.time() / Math.max(1, simulation.stepCount()), grains);
    }
}
