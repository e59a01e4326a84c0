// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import org.joml.Vector3d;
import org.joml.Vector3dc;
import reedling.error.RangeCheck;

/**
 * Straight motion at one velocity.
 *
 * <p>Formula: shift = v T(t), T the integral of the strength of the timing; velocity v e(t).
 * <p>Errors: velocity not finite.
 * <p>Threads: immutable.
 *
 * @param velocity m/s at full strength, world frame
 * @param timing when it moves
 */
public record Gliding(Vector3dc velocity, Timing timing) implements Motion {

    public Gliding {
        velocity = new Vector3d(velocity);
        new RangeCheck("motion").finite("velocity", velocity.length(), "m/s").finish();
    }

    @Override
    public double longestStep(double time) {
        return timing.longestStep(time);
    }

    @Override
    public void pose(double time, Pose out) {
        double elapsed = timing.elapsed(time);
        out.reset();
        out.shift(velocity.x() * elapsed, velocity.y() * elapsed, velocity.z() * elapsed);
    }
}
