// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import org.joml.Vector3d;
import org.joml.Vector3dc;
import reedling.error.RangeCheck;
import reedling.particle.RandomStream;

/**
 * Box along the world axes; an extent of 0 makes it a rectangle or a line. Errors: a corner not finite, the high corner
 * below the low one. Threads: immutable.
 *
 * @param low corner, m
 * @param high corner, m
 */
public record BoxRegion(Vector3dc low, Vector3dc high) implements Region {

    public BoxRegion {
        low = new Vector3d(low);
        high = new Vector3d(high);
        new RangeCheck("region.box")
                .notNegative("extent along x", high.x() - low.x(), "m")
                .notNegative("extent along y", high.y() - low.y(), "m")
                .notNegative("extent along z", high.z() - low.z(), "m")
                .finish();
    }

    /** m3. */
    public double volume() {
        return (high.x() - low.x()) * (high.y() - low.y()) * (high.z() - low.z());
    }

    /** Smallest of the three extents, m. */
    public double narrowest() {
        return Math.min(high.x() - low.x(), Math.min(high.y() - low.y(), high.z() - low.z()));
    }

    @Override
    public void draw(RandomStream random, double radius, double[] centre) {
        centre[0] = between(random, low.x(), high.x(), radius);
        centre[1] = between(random, low.y(), high.y(), radius);
        centre[2] = between(random, low.z(), high.z(), radius);
    }

    private static double between(RandomStream random, double low, double high, double radius) {
        double middle = 0.5 * (low + high);
        double play = Math.max(0, 0.5 * (high - low) - radius);
        return middle + play * (2 * random.uniform() - 1);
    }
}
