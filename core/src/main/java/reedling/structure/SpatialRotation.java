// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * Small rotations of unit quaternions (w, x, y, z) held in flat arrays. Stateless.
 *
 * <p>Only correctly rounded operations and {@link StrictMath}, so that all machines give the same bits.
 */
public final class SpatialRotation {

    /** Below this angle (rad) the series are exact to the last bit. */
    private static final double SMALL_ANGLE = 0.02;

    private SpatialRotation() {}

    /**
     * Turns a quaternion by the spatial rotation vector (ax, ay, az): q = norm(exp(a) q), with one Newton step for the
     * norm.
     */
    public static void turn(double[] q, int at, double ax, double ay, double az) {
        double a2 = ax * ax + ay * ay + az * az;
        double s;
        double c;
        if (a2 < SMALL_ANGLE * SMALL_ANGLE) {
            // next terms a^6/322560 and a^6/46080 are below 1e-15
            s = 0.5 * (1 - a2 / 24 * (1 - a2 / 80));
            c = 1 - a2 / 8 * (1 - a2 / 48);
        } else {
            double angle = Math.sqrt(a2);
            s = StrictMath.sin(0.5 * angle) / angle;
            c = StrictMath.cos(0.5 * angle);
        }
        double ux = s * ax;
        double uy = s * ay;
        double uz = s * az;
        double qw = q[at];
        double qx = q[at + 1];
        double qy = q[at + 2];
        double qz = q[at + 3];
        double w = c * qw - ux * qx - uy * qy - uz * qz;
        double x = c * qx + ux * qw + uy * qz - uz * qy;
        double y = c * qy + uy * qw + uz * qx - ux * qz;
        double z = c * qz + uz * qw + ux * qy - uy * qx;
        double norm = 1.5 - 0.5 * (w * w + x * x + y * y + z * z);
        q[at] = norm * w;
        q[at + 1] = norm * x;
        q[at + 2] = norm * y;
        q[at + 3] = norm * z;
    }

    /** Spatial rotation vector (rad, into {@code out[0..2]}) that turns quaternion {@code from} into {@code to}. */
    public static void between(double[] from, int f, double[] to, int t, double[] out) {
        double fw = from[f];
        double fx = from[f + 1];
        double fy = from[f + 2];
        double fz = from[f + 3];
        double w = to[t] * fw + to[t + 1] * fx + to[t + 2] * fy + to[t + 3] * fz;
        double sign = w < 0 ? -1 : 1;
        double tw = sign * to[t];
        double tx = sign * to[t + 1];
        double ty = sign * to[t + 2];
        double tz = sign * to[t + 3];
        double ux = fw * tx - tw * fx + fy * tz - fz * ty;
        double uy = fw * ty - tw * fy + fz * tx - fx * tz;
        double uz = fw * tz - tw * fz + fx * ty - fy * tx;
        double s = Math.sqrt(ux * ux + uy * uy + uz * uz);
        double scale = s < 1e-9 ? 2 : 2 * StrictMath.atan2(s, Math.abs(w)) / s;
        out[0] = scale * ux;
        out[1] = scale * uy;
        out[2] = scale * uz;
    }

    /** Point of a pose: translation + R(quaternion) X, for the point at {@code reference[at..at+2]}. */
    static void place(double[] pose, int p, double[] reference, int at, double[] out) {
        double w = pose[p + 3];
        double ux = pose[p + 4];
        double uy = pose[p + 5];
        double uz = pose[p + 6];
        double x = reference[at];
        double y = reference[at + 1];
        double z = reference[at + 2];
        double tx = 2 * (uy * z - uz * y);
        double ty = 2 * (uz * x - ux * z);
        double tz = 2 * (ux * y - uy * x);
        out[0] = pose[p] + x + w * tx + uy * tz - uz * ty;
        out[1] = pose[p + 1] + y + w * ty + uz * tx - ux * tz;
        out[2] = pose[p + 2] + z + w * tz + ux * ty - uy * tx;
    }
}
