// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.List;
import java.util.Optional;
import reedling.checkpoint.Persistent;

/**
 * Takes grains from one time to the next: first all forces where they stand, from which the step's length follows, then
 * the move. {@link KickDriftKick} is what runs use; {@link MidpointStepper} is for references.
 *
 * <p>Threads: one; phases inside use the team.
 */
interface Stepper {

    /** Part of the stability limit of lasting contacts that a step may take. */
    double stableShare();

    /** Length of a past step (s) whose closing half the velocities still lack: all of it, or 0. */
    double unclosed(double past);

    /** Computes the forces from which the next step is chosen. */
    void look(StepStart start);

    /**
     * Moves everything that moves on the coarse step; the first fine step of what bends is taken too.
     *
     * @param turnTime time over which orientations are turned now, s; 0 for not now
     * @param next length the step may have, s
     * @param fine its fine step, s
     * @return length the step has, s: {@code next}, or less
     */
    double move(StepStart start, double turnTime, double next, double fine);

    /** What the midpoint rule took to settle; empty for explicit steps. */
    Optional<MidpointTally> midpoint();

    /** What a resumed run needs of the stepper. */
    default List<Persistent> persistents() {
        return midpoint().<List<Persistent>>map(List::of).orElse(List.of());
    }
}
