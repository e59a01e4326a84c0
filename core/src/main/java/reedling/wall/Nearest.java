// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

/**
 * Kernels of nearest-point queries. Source: C. Ericson, Real-Time Collision Detection, 2005, chapter 5 (the clamping).
 * Threads: stateless.
 */
final class Nearest {

    private Nearest() {}

    /** How far a coordinate lies beyond [-half, half], with its sign; 0 inside. */
    static double beyond(double coordinate, double half) {
        if (coordinate > half) {
            return coordinate - half;
        }
        return coordinate < -half ? coordinate + half : 0;
    }

    /**
     * Writes the unit vector along (x, y, z) and returns the length; a zero vector gives {@code sign} times the unit
     * vector of {@code axis}.
     */
    static double normalise(double x, double y, double z, int axis, double sign, double[] normal) {
        double length = Math.sqrt(x * x + y * y + z * z);
        if (length == 0) {
            along(axis, sign, normal);
            return 0;
        }
        normal[0] = x / length;
        normal[1] = y / length;
        normal[2] = z / length;
        return length;
    }

    /** Writes {@code sign} times the unit vector of {@code axis}. */
    static void along(int axis, double sign, double[] normal) {
        normal[0] = axis == 0 ? sign : 0;
        normal[1] = axis == 1 ? sign : 0;
        normal[2] = axis == 2 ? sign : 0;
    }

    static double component(int axis, double x, double y, double z) {
        return axis == 0 ? x : axis == 1 ? y : z;
    }
}
