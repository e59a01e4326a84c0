// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import reedling.error.RangeCheck;

/**
 * Solid box seen from outside, centred on the origin of its frame; convex, hence one facet and one contact.
 *
 * <p>Outside, the gap is the distance to the nearest point (face, edge or corner); inside, to the nearest face, the
 * earlier axis winning ties. Edges and corners take the stiffness of the flat face.
 * <p>Errors: a side not positive. Threads: immutable.
 *
 * @param width extent along x, m
 * @param depth extent along y, m
 * @param height extent along z, m
 */
public record BoxOutside(double width, double depth, double height) implements Surface {

    public BoxOutside {
        new RangeCheck("wall.box")
                .positive("width", width, "m")
                .positive("depth", depth, "m")
                .positive("height", height, "m")
                .finish();
    }

    @Override
    public int facets() {
        return 1;
    }

    @Override
    public double gap(int facet, double x, double y, double z, double[] normal) {
        double pastX = Nearest.beyond(x, 0.5 * width);
        double pastY = Nearest.beyond(y, 0.5 * depth);
        double pastZ = Nearest.beyond(z, 0.5 * height);
        if (pastX != 0 || pastY != 0 || pastZ != 0) {
            return Nearest.normalise(-pastX, -pastY, -pastZ, 0, 1, normal);
        }
        double depthX = 0.5 * width - Math.abs(x);
        double depthY = 0.5 * depth - Math.abs(y);
        double depthZ = 0.5 * height - Math.abs(z);
        int axis = depthX <= depthY && depthX <= depthZ ? 0 : depthY <= depthZ ? 1 : 2;
        Nearest.along(axis, Nearest.component(axis, x, y, z) < 0 ? 1 : -1, normal);
        return -Nearest.component(axis, depthX, depthY, depthZ);
    }

    @Override
    public double effectiveRadius(int facet, double grainRadius) {
        return grainRadius;
    }
}
