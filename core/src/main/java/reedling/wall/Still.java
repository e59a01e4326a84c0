// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

/** A wall that stays where it was placed. Threads: immutable. */
public record Still() implements Motion {

    @Override
    public void pose(double time, Pose out) {
        out.reset();
    }
}
