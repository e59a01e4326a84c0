// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.List;
import java.util.Optional;
import reedling.probe.MeasuredWindow;
import reedling.probe.ProbePlan;

/**
 * What a run writes, when, and what it is measured for; SI.
 *
 * @param endTime simulated end, s
 * @param intervals when what is written
 * @param screen the deck to report on, if there is one
 * @param probes what else is measured
 * @param identity what goes into the run record besides results
 */
public record RunPlan(
        double endTime,
        Intervals intervals,
        Optional<ScreenPlan> screen,
        List<ProbePlan> probes,
        RunIdentity identity) {

    public RunPlan {
        probes = List.copyOf(probes);
    }

    /** Without probes. */
    public RunPlan(double endTime, Intervals intervals, Optional<ScreenPlan> screen, RunIdentity identity) {
        this(endTime, intervals, screen, List.of(), identity);
    }

    /** Batches of the measured window. */
    public static final int BATCHES = 10;

    /**
     * Times between two of each, s; infinite for never.
     *
     * @param snapshot simulated time
     * @param table simulated time
     * @param checkpoint simulated time
     * @param checkpointWall time of the clock on the wall
     */
    public record Intervals(double snapshot, double table, double checkpoint, double checkpointWall) {

        /** Nothing but what is written at the start and the end. */
        public static final Intervals NEVER = new Intervals(
                Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY);
    }

    /** The part of the run that is measured; all of it without a screen. */
    public MeasuredWindow window() {
        return new MeasuredWindow(screen.map(ScreenPlan::measureFrom).orElse(0.0), endTime, BATCHES);
    }
}
