// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

/**
 * Spheres in a box while they are being packed: columns of equal length, m, world frame. Threads: confined to its
 * owner.
 */
final class Spheres {

    final BoxRegion box;
    final double[] radius;
    final double[] x;
    final double[] y;
    final double[] z;
    final double largest;

    Spheres(BoxRegion box, double[] radius) {
        this.box = box;
        this.radius = radius;
        x = new double[radius.length];
        y = new double[radius.length];
        z = new double[radius.length];
        double most = 0;
        for (double each : radius) {
            most = Math.max(most, each);
        }
        largest = most;
    }

    int size() {
        return radius.length;
    }

    /** Part of the box filled at full size. */
    double solidFraction() {
        double sum = 0;
        for (double each : radius) {
            sum += each * each * each;
        }
        return 4 * Math.PI / 3 * sum / box.volume();
    }

    /** Moves a sphere, taken at {@code scale} times its radius, back between the faces of the box. */
    void confine(int k, double scale) {
        double r = scale * radius[k];
        x[k] = Math.max(box.low().x() + r, Math.min(box.high().x() - r, x[k]));
        y[k] = Math.max(box.low().y() + r, Math.min(box.high().y() - r, y[k]));
        z[k] = Math.max(box.low().z() + r, Math.min(box.high().z() - r, z[k]));
    }
}
