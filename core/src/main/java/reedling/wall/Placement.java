// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import org.joml.Matrix3d;
import org.joml.Quaterniond;
import org.joml.Quaterniondc;
import org.joml.Vector3d;
import org.joml.Vector3dc;
import reedling.error.RangeCheck;

/**
 * Where the frame of a surface stands in the world while its wall is at rest.
 *
 * <p>Errors: origin not finite, axes of zero length or parallel. Threads: immutable.
 *
 * @param origin m, world frame
 * @param rotation unit quaternion from the frame of the surface to the world
 */
public record Placement(Vector3dc origin, Quaterniondc rotation) {

    public Placement {
        new RangeCheck("wall.placement")
                .finite("origin", origin.length(), "m")
                .positive("rotation", rotation.lengthSquared(), "")
                .finish();
        origin = new Vector3d(origin);
        rotation = new Quaterniond(rotation).normalize();
    }

    /** The frame of the surface is the world frame. */
    public static Placement world() {
        return new Placement(new Vector3d(), new Quaterniond());
    }

    /** The world frame moved to {@code origin} (m). */
    public static Placement at(Vector3dc origin) {
        return new Placement(origin, new Quaterniond());
    }

    /** Axis z along {@code normal} at {@code point} (m); the other two axes are chosen, the same way every time. */
    public static Placement facing(Vector3dc point, Vector3dc normal) {
        new RangeCheck("wall.placement")
                .positive("normal", normal.length(), "m")
                .finish();
        boolean upright = Math.abs(normal.z()) > 0.9 * normal.length();
        return axes(point, upright ? new Vector3d(1, 0, 0) : new Vector3d(0, 0, 1), normal);
    }

    /** Axis z from one point to another with the origin half-way, for cylinders. */
    public static Placement along(Vector3dc from, Vector3dc to) {
        return facing(new Vector3d(from).lerp(to, 0.5), new Vector3d(to).sub(from));
    }

    /** Axis z along {@code z}, axis x along the part of {@code x} at right angles to it. */
    public static Placement axes(Vector3dc origin, Vector3dc x, Vector3dc z) {
        Vector3d second = new Vector3d(z).cross(x);
        new RangeCheck("wall.placement")
                .positive("angle between the axes x and z", second.length(), "")
                .finish();
        second.normalize();
        Vector3d third = new Vector3d(z).normalize();
        Vector3d first = new Vector3d(second).cross(third);
        return new Placement(origin, new Quaterniond().setFromNormalized(new Matrix3d(first, second, third)));
    }
}
