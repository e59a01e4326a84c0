// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.Optional;

/**
 * What a run has found so far.
 *
 * @param simulation as it stands
 * @param probes what was measured
 * @param plan of the run
 * @param figures of the screen; empty without one
 * @param trust how far to trust them
 */
record RunResult(Simulation simulation, RunProbes probes, RunPlan plan, Optional<ScreenFigures> figures, Trust trust) {

    static RunResult of(Simulation simulation, RunProbes probes, RunPlan plan) {
        Optional<ScreenFigures> figures =
                plan.screen().map(screen -> ScreenFigures.of(probes, screen, simulation.time()));
        return new RunResult(simulation, probes, plan, figures, Trust.of(simulation, probes, plan, figures));
    }
}
