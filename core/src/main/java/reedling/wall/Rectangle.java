// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import reedling.error.RangeCheck;

/**
 * Flat sheet of no thickness, touched from both sides and at its rim; it lies in z = 0 of its frame, centred on the
 * origin.
 *
 * <p>The gap is the distance to the nearest point of the sheet and never negative, so a grain is pushed back to the
 * side its centre is on. On the sheet itself the normal is -z.
 * <p>Errors: a side not positive. Threads: immutable.
 *
 * @param width extent along x, m
 * @param depth extent along y, m
 */
public record Rectangle(double width, double depth) implements Surface {

    public Rectangle {
        new RangeCheck("wall.rectangle")
                .positive("width", width, "m")
                .positive("depth", depth, "m")
                .finish();
    }

    @Override
    public int facets() {
        return 1;
    }

    @Override
    public double gap(int facet, double x, double y, double z, double[] normal) {
        return Nearest.normalise(-Nearest.beyond(x, 0.5 * width), -Nearest.beyond(y, 0.5 * depth), -z, 2, -1, normal);
    }

    @Override
    public double effectiveRadius(int facet, double grainRadius) {
        return grainRadius;
    }
}
