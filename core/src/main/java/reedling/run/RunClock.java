// SPDX-License-Identifier: Apache-2.0
package reedling.run;

/**
 * Wall-clock times of one session of a run, and how much is left. Threads: one.
 */
final class RunClock {

    private static final double SMOOTHING = 10; // s of wall-clock time over which the speed is averaged

    private final long start = System.nanoTime();
    private final double startTime;
    private final long startGrainSteps;
    private double stepping;
    private double measuring;
    private double writing;
    private long mark = start;
    private double markTime;
    private double speed;

    RunClock(Simulation simulation) {
        startTime = simulation.time();
        markTime = startTime;
        startGrainSteps = simulation.grainSteps();
    }

    /** Wall-clock time since the start of the session, s. */
    double elapsed() {
        return 1e-9 * (System.nanoTime() - start);
    }

    /** Books one turn of the loop: ns at its start, after the step, after measuring, and at its end. */
    void book(long begun, long stepped, long measured, long written) {
        stepping += 1e-9 * (stepped - begun);
        measuring += 1e-9 * (measured - stepped);
        writing += 1e-9 * (written - measured);
    }

    /** Time in steps, s. */
    double stepping() {
        return stepping;
    }

    /** Time in probes, s. */
    double measuring() {
        return measuring;
    }

    /** Time in which the loop copied and handed over what is written, s. */
    double writing() {
        return writing;
    }

    double grainStepsPerSecond(Simulation simulation) {
        double elapsed = elapsed();
        return elapsed > 0 ? (simulation.grainSteps() - startGrainSteps) / elapsed : 0;
    }

    /** Estimate of the wall-clock time to a simulated time (s), s. */
    double timeLeft(double time, double endTime) {
        long now = System.nanoTime();
        double waited = 1e-9 * (now - mark);
        if (waited > 0) {
            double recent = (time - markTime) / waited;
            double weight = speed == 0 ? 1 : Math.min(1, waited / SMOOTHING);
            speed += weight * (recent - speed);
            mark = now;
            markTime = time;
        }
        return speed > 0 ? Math.max(0, endTime - time) / speed : Double.POSITIVE_INFINITY;
    }
}
