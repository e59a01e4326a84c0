// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * Where and how a wire is held.
 *
 * @param start first end, m, reference position
 * @param end other end, m
 * @param startCondition how the first end is held
 * @param endCondition how the other end is held
 * @param motion index of the support motion both ends follow, or {@link #AT_REST}
 */
public record WireEnds(
        Position start, Position end, EndCondition startCondition, EndCondition endCondition, int motion) {

    /** Supports that do not move. */
    public static final int AT_REST = -1;

    /** Distance between the ends, m. */
    public double span() {
        return start.distance(end);
    }
}
