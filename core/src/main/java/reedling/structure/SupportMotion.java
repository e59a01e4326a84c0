// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/** Prescribed rigid motion of a support. Implementations are immutable and may be read by any thread. */
@FunctionalInterface
public interface SupportMotion {

    /** Numbers written by {@link #pose}: translation (3, m) and unit quaternion w, x, y, z (4). */
    int POSE_LENGTH = 7;

    /**
     * Where the support stands: a point with reference position X is at translation + R(quaternion) X.
     *
     * @param time s
     * @param pose filled with {@link #POSE_LENGTH} numbers
     */
    void pose(double time, double[] pose);
}
