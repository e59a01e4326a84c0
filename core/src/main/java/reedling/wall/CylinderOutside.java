// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import reedling.error.RangeCheck;

/**
 * Solid cylinder seen from outside (shaft, roller), about the z axis of its frame and centred on the origin, with
 * flat caps. Facet 0 is the curved side with both edges, facets 1 and 2 are the caps at -z and +z; convex, so exactly
 * one facet stands for any point.
 *
 * <p>Edges take the stiffness of the side. Inside, the nearer of side and cap stands for the point.
 * <p>Errors: radius or length not positive. Threads: immutable.
 *
 * @param radius m
 * @param length extent along z, m
 */
public record CylinderOutside(double radius, double length) implements Surface {

    public CylinderOutside {
        new RangeCheck("wall.cylinder")
                .positive("radius", radius, "m")
                .positive("length", length, "m")
                .finish();
    }

    @Override
    public int facets() {
        return 3;
    }

    @Override
    public double gap(int facet, double x, double y, double z, double[] normal) {
        double distance = Math.sqrt(x * x + y * y);
        double outSide = distance - radius;
        double outCap = Math.abs(z) - 0.5 * length;
        double sign = z < 0 ? -1 : 1;
        boolean side = outSide > 0 || outCap <= 0 && outSide >= outCap;
        if (side != (facet == 0) || !side && (facet == 1) != (sign < 0)) {
            Nearest.along(2, -sign, normal);
            return Double.POSITIVE_INFINITY;
        }
        if (!side) {
            Nearest.along(2, -sign, normal);
            return outCap;
        }
        double radialX = distance == 0 ? 1 : x / distance;
        double radialY = distance == 0 ? 0 : y / distance;
        if (outCap > 0) {
            return Nearest.normalise(-radialX * outSide, -radialY * outSide, -sign * outCap, 0, 1, normal);
        }
        normal[0] = -radialX;
        normal[1] = -radialY;
        normal[2] = 0;
        return outSide;
    }

    @Override
    public double effectiveRadius(int facet, double grainRadius) {
        return facet == 0 ? HertzLine.outside(grainRadius, radius) : grainRadius;
    }
}
