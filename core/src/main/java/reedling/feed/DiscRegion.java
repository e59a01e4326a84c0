// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import org.joml.Vector3d;
import org.joml.Vector3dc;
import reedling.error.RangeCheck;
import reedling.particle.RandomStream;

/**
 * Flat disc, as the mouth of a pipe: centres lie in its plane, spread evenly over its area.
 *
 * <p>Errors: centre not finite, axis of zero length, radius not positive. Threads: immutable.
 *
 * @param centre m
 * @param axis at right angles to the disc; stored at length 1
 * @param radius m
 */
public record DiscRegion(Vector3dc centre, Vector3dc axis, double radius) implements Region {

    public DiscRegion {
        new RangeCheck("region.disc")
                .finite("centre", centre.length(), "m")
                .positive("axis", axis.length(), "m")
                .positive("radius", radius, "m")
                .finish();
        centre = new Vector3d(centre);
        axis = new Vector3d(axis).normalize();
    }

    @Override
    public void draw(RandomStream random, double grainRadius, double[] out) {
        double distance = Math.max(0, radius - grainRadius) * Math.sqrt(random.uniform());
        double angle = 2 * Math.PI * random.uniform();
        Vector3d seed = Math.abs(axis.z()) < 0.9 ? new Vector3d(0, 0, 1) : new Vector3d(1, 0, 0);
        Vector3d one = seed.cross(axis).normalize();
        Vector3d two = new Vector3d(axis).cross(one);
        double along = distance * StrictMath.cos(angle);
        double across = distance * StrictMath.sin(angle);
        out[0] = centre.x() + along * one.x + across * two.x;
        out[1] = centre.y() + along * one.y + across * two.y;
        out[2] = centre.z() + along * one.z + across * two.z;
    }
}
