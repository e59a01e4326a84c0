// SPDX-License-Identifier: Apache-2.0
package reedling.field;

import java.util.Optional;
import reedling.particle.GrainStore;

/**
 * A force on single grains, bound and in SI; immutable. It has two parts, either of which may be missing: one that depends
 * on place (and time) and has a potential, and one that depends on velocity or has no potential, the {@link MotionForce}.
 *
 * <p>Threads: called by many tasks at once, each with a range of grains of its own.
 */
public interface Field {

    /**
     * Adds the part with a potential to the force rows of a range of grains.
     *
     * @param from first grain
     * @param to one past the last
     * @param time of the present positions, s
     */
    void apply(GrainStore grains, int from, int to, double time);

    /** Potential energy of a range of grains, J; 0 for a field without potential. */
    double potentialEnergy(GrainStore grains, int from, int to);

    /** The part of the field that is a uniform acceleration, m/s2, three numbers; structures feel it too. */
    double[] uniformAcceleration();

    /** The part of the force that depends on velocity or has no potential; empty if there is none. Asked once. */
    default Optional<MotionForce> motionForce() {
        return Optional.empty();
    }
}
