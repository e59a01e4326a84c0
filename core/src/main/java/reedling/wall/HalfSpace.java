// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

/** Endless flat wall: the material fills z < 0 of its frame, grains live at z > 0. Threads: immutable. */
public record HalfSpace() implements Surface {

    @Override
    public int facets() {
        return 1;
    }

    @Override
    public double gap(int facet, double x, double y, double z, double[] normal) {
        normal[0] = 0;
        normal[1] = 0;
        normal[2] = -1;
        return z;
    }

    @Override
    public double effectiveRadius(int facet, double grainRadius) {
        return grainRadius;
    }
}
