// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import java.util.EnumSet;
import java.util.Set;
import reedling.error.RangeCheck;

/**
 * Box seen from inside, centred on the origin of its frame; each closed face is a facet, open faces do not exist.
 *
 * <p>With all faces closed each facet is an endless half space, so a grain is always pushed inwards. With an open
 * face the closed ones are sheets of no thickness, touched from both sides and at their free rims, so that a grain
 * may leave over a rim and fall past the outside. An edge between two closed sheets belongs, seen from outside, to
 * the facet of the lower number: one contact there, not two.
 * <p>Errors: a side not positive, all faces open. Threads: immutable.
 */
public final class BoxInside implements Surface {

    /** A face of the box, named by the axis it stands across and the end of that axis. */
    public enum Face {
        LOW_X,
        HIGH_X,
        LOW_Y,
        HIGH_Y,
        LOW_Z,
        HIGH_Z;

        int axis() {
            return ordinal() >> 1;
        }

        double sign() {
            return (ordinal() & 1) == 0 ? -1 : 1;
        }
    }

    private static final Face[] FACES = Face.values();

    private final double[] half;
    private final Face[] closed;
    private final boolean[] isClosed = new boolean[FACES.length];
    private final boolean sheets;

    /**
     * @param width extent along x, m
     * @param depth extent along y, m
     * @param height extent along z, m
     * @param open faces left out
     */
    public BoxInside(double width, double depth, double height, Set<Face> open) {
        new RangeCheck("wall.box")
                .positive("width", width, "m")
                .positive("depth", depth, "m")
                .positive("height", height, "m")
                .require(open.size() < FACES.length, "open faces", open.size(), "", "at most 5")
                .finish();
        half = new double[] {0.5 * width, 0.5 * depth, 0.5 * height};
        EnumSet<Face> kept = EnumSet.allOf(Face.class);
        kept.removeAll(open);
        closed = kept.toArray(new Face[0]);
        for (Face face : closed) {
            isClosed[face.ordinal()] = true;
        }
        sheets = !open.isEmpty();
    }

    /** The face a facet stands for. */
    public Face face(int facet) {
        return closed[facet];
    }

    @Override
    public int facets() {
        return closed.length;
    }

    @Override
    public double gap(int facet, double x, double y, double z, double[] normal) {
        Face face = closed[facet];
        int axis = face.axis();
        double sign = face.sign();
        double inward = half[axis] - sign * Nearest.component(axis, x, y, z);
        if (!sheets) {
            Nearest.along(axis, sign, normal);
            return inward;
        }
        double pastX = axis == 0 ? 0 : Nearest.beyond(x, half[0]);
        double pastY = axis == 1 ? 0 : Nearest.beyond(y, half[1]);
        double pastZ = axis == 2 ? 0 : Nearest.beyond(z, half[2]);
        if (left(face, inward, 0, pastX) || left(face, inward, 1, pastY) || left(face, inward, 2, pastZ)) {
            Nearest.along(axis, sign, normal);
            return Double.POSITIVE_INFINITY;
        }
        double across = sign * inward;
        double toX = axis == 0 ? across : -pastX;
        double toY = axis == 1 ? across : -pastY;
        double toZ = axis == 2 ? across : -pastZ;
        return Nearest.normalise(toX, toY, toZ, axis, sign, normal);
    }

    @Override
    public double effectiveRadius(int facet, double grainRadius) {
        return grainRadius;
    }

    /** Whether a point past the edge towards another axis is left to the closed face found there. */
    private boolean left(Face face, double inward, int axis, double past) {
        if (past == 0) {
            return false;
        }
        int neighbour = 2 * axis + (past > 0 ? 1 : 0);
        return isClosed[neighbour] && (inward >= 0 || neighbour < face.ordinal());
    }
}
