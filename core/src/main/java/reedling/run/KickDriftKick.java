// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.Optional;
import reedling.coupling.Interactions;
import reedling.parallel.WorkerTeam;
import reedling.time.StepControl;

/** Explicit steps of second order: velocities stand at the half step between two steps. One force pass a step. */
final class KickDriftKick implements Stepper {

    private static final double STABLE = 0.8;

    private final Interactions interactions;
    private final StepControl control;
    private final WorkerTeam team;

    KickDriftKick(Interactions interactions, StepControl control, WorkerTeam team) {
        this.interactions = interactions;
        this.control = control;
        this.team = team;
    }

    @Override
    public double stableShare() {
        return STABLE;
    }

    @Override
    public double unclosed(double past) {
        return past;
    }

    @Override
    public void look(StepStart start) {
        interactions.force(
                start.time(),
                start.past(),
                control.longestNext(),
                start.travel(),
                start.largestSpeed(),
                start.report(),
                team);
    }

    @Override
    public double move(StepStart start, double turnTime, double next, double fine) {
        interactions.move(turnTime, start.past(), next, fine, team);
        return next;
    }

    @Override
    public Optional<MidpointTally> midpoint() {
        return Optional.empty();
    }
}
