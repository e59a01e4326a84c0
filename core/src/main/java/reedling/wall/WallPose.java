// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import org.joml.Quaterniondc;
import org.joml.Vector3dc;

/**
 * A wall at one moment of a run: where it is, and the velocity with which the last step brought it there.
 *
 * <p>Formula: velocity of the pivot u = (shift - shift before)/h, spin w = rotation vector of (q conj(q before))/h,
 * and at a point p: u + w x (p - c), c the pivot's present place. Displacement over h and not the derivative of the
 * motion, so that the work of the wall closes in the energy ledger.
 * <p>Where: h duration of the step (s); p in m, world frame.
 * <p>Threads: one thread advances, with a barrier before others query; queries write only to the caller's array.
 */
public final class WallPose {

    private final Wall wall;
    private final Pose pose = new Pose();
    private final Pose before = new Pose();
    private double time;
    private double timeBefore;
    private double step;
    private double originX;
    private double originY;
    private double originZ;
    /** Rotation from the surface's frame to the world, row by row. */
    private double r00, r01, r02, r10, r11, r12, r20, r21, r22;

    private double velocityX;
    private double velocityY;
    private double velocityZ;
    private double spinX;
    private double spinY;
    private double spinZ;

    /** The wall at {@code time} (s) with no velocity, as before the first step. */
    public WallPose(Wall wall, double time) {
        this.wall = wall;
        restore(time, time, 0);
    }

    public Wall wall() {
        return wall;
    }

    /** Moves the wall to {@code newTime} (s), {@code duration} (s, > 0) after its last place. */
    public void advance(double newTime, double duration) {
        restore(time, newTime, duration);
    }

    /**
     * Sets the wall as it was after a step, for a resumed run: the same three numbers give the same bits.
     *
     * @param earlier time of the place before, s
     * @param now time of the present place, s
     * @param duration of the step between them, s; 0 for a wall without velocity
     */
    public void restore(double earlier, double now, double duration) {
        timeBefore = earlier;
        time = now;
        step = duration;
        wall.motion().pose(earlier, before);
        wall.motion().pose(now, pose);
        placeFrame();
        setVelocity();
    }

    /** Time of the present place, s. */
    public double time() {
        return time;
    }

    /** Time of the place before, s. */
    public double timeBefore() {
        return timeBefore;
    }

    /** Duration of the step between the two places, s. */
    public double step() {
        return step;
    }

    /**
     * Signed distance from a point to a facet, as {@link Surface#gap} but in the world frame.
     *
     * @param x point, m, world frame; likewise y and z
     * @param normal filled with the unit vector from the point to the wall, world frame
     */
    public double gap(int facet, double x, double y, double z, double[] normal) {
        double dx = x - originX;
        double dy = y - originY;
        double dz = z - originZ;
        double bodyX = r00 * dx + r10 * dy + r20 * dz;
        double bodyY = r01 * dx + r11 * dy + r21 * dz;
        double bodyZ = r02 * dx + r12 * dy + r22 * dz;
        double gap = wall.surface().gap(facet, bodyX, bodyY, bodyZ, normal);
        double nx = normal[0];
        double ny = normal[1];
        double nz = normal[2];
        normal[0] = r00 * nx + r01 * ny + r02 * nz;
        normal[1] = r10 * nx + r11 * ny + r12 * nz;
        normal[2] = r20 * nx + r21 * ny + r22 * nz;
        return gap;
    }

    /**
     * Writes the velocity (m/s, world frame) of the wall at a world point (m) into the first three places of {@code
     * out}.
     */
    public void velocityAt(double x, double y, double z, double[] out) {
        double ax = x - centreX();
        double ay = y - centreY();
        double az = z - centreZ();
        out[0] = velocityX + spinY * az - spinZ * ay;
        out[1] = velocityY + spinZ * ax - spinX * az;
        out[2] = velocityZ + spinX * ay - spinY * ax;
    }

    /** Present place of the pivot, m, world frame. */
    public double centreX() {
        return pose.pivotX + pose.shiftX;
    }

    public double centreY() {
        return pose.pivotY + pose.shiftY;
    }

    public double centreZ() {
        return pose.pivotZ + pose.shiftZ;
    }

    /** Velocity of the pivot, m/s. */
    public double velocityX() {
        return velocityX;
    }

    public double velocityY() {
        return velocityY;
    }

    public double velocityZ() {
        return velocityZ;
    }

    /** Spin, rad/s, world frame. */
    public double spinX() {
        return spinX;
    }

    public double spinY() {
        return spinY;
    }

    public double spinZ() {
        return spinZ;
    }

    /** Writes the world place (m) of a point of the surface's frame (m) into the first three places of {@code out}. */
    public void toWorld(double x, double y, double z, double[] out) {
        out[0] = originX + r00 * x + r01 * y + r02 * z;
        out[1] = originY + r10 * x + r11 * y + r12 * z;
        out[2] = originZ + r20 * x + r21 * y + r22 * z;
    }

    private void placeFrame() {
        setRotation(pose.qw, pose.qx, pose.qy, pose.qz);
        Vector3dc rest = wall.placement().origin();
        double ax = rest.x() - pose.pivotX;
        double ay = rest.y() - pose.pivotY;
        double az = rest.z() - pose.pivotZ;
        originX = centreX() + r00 * ax + r01 * ay + r02 * az;
        originY = centreY() + r10 * ax + r11 * ay + r12 * az;
        originZ = centreZ() + r20 * ax + r21 * ay + r22 * az;
        Quaterniondc p = wall.placement().rotation();
        setRotation(
                pose.qw * p.w() - pose.qx * p.x() - pose.qy * p.y() - pose.qz * p.z(),
                pose.qw * p.x() + pose.qx * p.w() + pose.qy * p.z() - pose.qz * p.y(),
                pose.qw * p.y() - pose.qx * p.z() + pose.qy * p.w() + pose.qz * p.x(),
                pose.qw * p.z() + pose.qx * p.y() - pose.qy * p.x() + pose.qz * p.w());
    }

    private void setRotation(double w, double x, double y, double z) {
        r00 = 1 - 2 * (y * y + z * z);
        r01 = 2 * (x * y - w * z);
        r02 = 2 * (x * z + w * y);
        r10 = 2 * (x * y + w * z);
        r11 = 1 - 2 * (x * x + z * z);
        r12 = 2 * (y * z - w * x);
        r20 = 2 * (x * z - w * y);
        r21 = 2 * (y * z + w * x);
        r22 = 1 - 2 * (x * x + y * y);
    }

    private void setVelocity() {
        double perStep = step > 0 ? 1 / step : 0;
        velocityX = (pose.shiftX - before.shiftX) * perStep;
        velocityY = (pose.shiftY - before.shiftY) * perStep;
        velocityZ = (pose.shiftZ - before.shiftZ) * perStep;
        // rotation between the two places: q conj(q before)
        double w = pose.qw * before.qw + pose.qx * before.qx + pose.qy * before.qy + pose.qz * before.qz;
        double x = -pose.qw * before.qx + pose.qx * before.qw - pose.qy * before.qz + pose.qz * before.qy;
        double y = -pose.qw * before.qy + pose.qx * before.qz + pose.qy * before.qw - pose.qz * before.qx;
        double z = -pose.qw * before.qz - pose.qx * before.qy + pose.qy * before.qx + pose.qz * before.qw;
        double sine = Math.sqrt(x * x + y * y + z * z);
        // the shorter way round; a vanishing rotation has the limit 2 of angle / sine
        double angle = 2 * StrictMath.atan2(sine, Math.abs(w));
        double scale = (sine < 1e-150 ? 2 : angle / sine) * (w < 0 ? -perStep : perStep);
        spinX = scale * x;
        spinY = scale * y;
        spinZ = scale * z;
    }
}
