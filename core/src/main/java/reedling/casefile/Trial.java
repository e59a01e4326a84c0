// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import reedling.parallel.WorkerTeam;
import reedling.run.Model;
import reedling.run.Simulation;

/**
 * A short stretch of a case, timed.
 *
 * @param perStep wall-clock time of a step, s
 * @param step mean step, s
 * @param fineSteps fine steps in each, mean
 * @param grains grains present, mean
 */
record Trial(double perStep, double step, double fineSteps, double grains) {

    /** Part of the time for warming up, which is not measured. */
    private static final double WARM_UP = 0.4;

    /** Runs a model, which is used up, for so many seconds of wall-clock time or to an end (s simulated). */
    static Trial run(Model model, WorkerTeam team, double seconds, double end) {
        Simulation simulation = new Simulation(model, team);
        simulation.begin();
        long begun = System.nanoTime();
        stepUntil(simulation, begun + (long) (1e9 * WARM_UP * seconds), 0.5 * end);
        long started = System.nanoTime();
        long steps = simulation.stepCount();
        long grainSteps = simulation.grainSteps();
        double time = simulation.time();
        long fine = stepUntil(simulation, begun + (long) (1e9 * seconds), end);
        double taken = Math.max(1, simulation.stepCount() - steps);
        return new Trial(
                1e-9 * (System.nanoTime() - started) / taken,
                (simulation.time() - time) / taken,
                fine / taken,
                (simulation.grainSteps() - grainSteps) / taken);
    }

    private static long stepUntil(Simulation simulation, long deadline, double end) {
        long fine = 0;
        while (System.nanoTime() < deadline && simulation.time() < end) {
            simulation.step();
            fine += simulation.fineSteps();
        }
        return fine;
    }
}
