// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

/**
 * A rigid displacement: a point X of the wall at rest is found at {@code pivot + shift + R(q) (X - pivot)}.
 *
 * <p>A plain carrier filled by {@link Motion#pose}; the fields are public so that a fill costs no allocation and no
 * calls. Threads: confined to its owner.
 */
public final class Pose {

    /** Displacement of the pivot, m, world frame. */
    public double shiftX;

    public double shiftY;
    public double shiftZ;

    /** Unit quaternion of the rotation about the pivot. */
    public double qw = 1;

    public double qx;
    public double qy;
    public double qz;

    /** Point at rest about which the rotation is meant, m, world frame. */
    public double pivotX;

    public double pivotY;
    public double pivotZ;

    /** Sets the displacement of a wall at rest, with the origin as pivot. */
    public void reset() {
        shift(0, 0, 0);
        turn(1, 0, 0, 0);
        pivotX = 0;
        pivotY = 0;
        pivotZ = 0;
    }

    void shift(double x, double y, double z) {
        shiftX = x;
        shiftY = y;
        shiftZ = z;
    }

    void turn(double w, double x, double y, double z) {
        qw = w;
        qx = x;
        qy = y;
        qz = z;
    }
}
