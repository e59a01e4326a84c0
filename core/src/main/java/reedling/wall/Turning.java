// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import org.joml.Vector3d;
import org.joml.Vector3dc;
import reedling.error.RangeCheck;

/**
 * Rotation about a fixed axis at one speed.
 *
 * <p>Formula: angle = w T(t), T the integral of the strength of the timing; spin w e(t), right-handed about the axis.
 * <p>Errors: point or speed not finite, axis of zero length.
 * <p>Threads: immutable.
 *
 * @param point a point of the axis, m, world frame; the pivot of the pose
 * @param axis direction of the axis; stored at length 1
 * @param speed rad/s at full strength
 * @param timing when it turns
 */
public record Turning(Vector3dc point, Vector3dc axis, double speed, Timing timing) implements Motion {

    public Turning {
        new RangeCheck("motion")
                .finite("point", point.length(), "m")
                .positive("axis", axis.length(), "m")
                .finite("speed", speed, "rad/s")
                .finish();
        point = new Vector3d(point);
        axis = new Vector3d(axis).normalize();
    }

    @Override
    public double longestStep(double time) {
        return timing.longestStep(time);
    }

    @Override
    public void pose(double time, Pose out) {
        double halfTurns = speed * timing.elapsed(time) / (4 * Math.PI);
        double sine = Circle.sine(halfTurns);
        out.shift(0, 0, 0);
        out.turn(Circle.cosine(halfTurns), sine * axis.x(), sine * axis.y(), sine * axis.z());
        out.pivotX = point.x();
        out.pivotY = point.y();
        out.pivotZ = point.z();
    }
}
