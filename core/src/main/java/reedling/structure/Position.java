// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * A point or direction in the world frame.
 *
 * @param x m (or direction component)
 * @param y m
 * @param z m
 */
public record Position(double x, double y, double z) {

    /** Distance to another point, m. */
    public double distance(Position other) {
        double dx = other.x - x;
        double dy = other.y - y;
        double dz = other.z - z;
        return Math.sqrt(dx * dx + dy * dy + dz * dz);
    }

    /** Point at a fraction of the way to another point. */
    public Position towards(Position other, double fraction) {
        return new Position(x + fraction * (other.x - x), y + fraction * (other.y - y), z + fraction * (other.z - z));
    }

    boolean finite() {
        return Double.isFinite(x) && Double.isFinite(y) && Double.isFinite(z);
    }
}
