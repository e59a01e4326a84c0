// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

/**
 * Prescribed rigid motion of a wall: an exact function of time, so a resumed run finds the same wall at the same place.
 *
 * <p>Every implementation uses plain arithmetic only, hence the same bits on every machine, and allocates nothing.
 * <p>Threads: immutable.
 */
public sealed interface Motion permits Still, Gliding, Turning, Oscillating {

    /**
     * Writes the displacement from the rest position at {@code time}; every field of {@code out} is set.
     *
     * @param time s
     * @param out filled; owned by the caller
     */
    void pose(double time, Pose out);

    /**
     * Longest step from {@code time} (s) in which the velocity does not change unforeseen, s: bodies near a wall look ahead
     * with the velocity of the step before.
     */
    default double longestStep(double time) {
        return Double.POSITIVE_INFINITY;
    }
}
