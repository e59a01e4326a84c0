// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import org.joml.Vector3d;
import org.joml.Vector3dc;

/**
 * Flat disc.
 *
 * @param centre m
 * @param normal direction across the disc, not zero
 * @param radius m, > 0
 */
public record DiscRegion(Vector3dc centre, Vector3dc normal, double radius) implements Region {

    /** Half extent of a disc along an axis: radius times the sine of the angle between axis and normal. */
    @Override
    public BoxRegion surroundings() {
        Vector3d n = new Vector3d(normal).normalize();
        Vector3d half = new Vector3d(across(n.x), across(n.y), across(n.z)).mul(radius);
        return new BoxRegion(new Vector3d(centre).sub(half), new Vector3d(centre).add(half));
    }

    private static double across(double cosine) {
        return Math.sqrt(Math.max(0, 1 - cosine * cosine));
    }
}
