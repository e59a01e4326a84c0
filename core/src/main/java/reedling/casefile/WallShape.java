// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.Optional;
import java.util.Set;
import org.joml.Vector3dc;

/** Surface of a wall; lengths in m, world frame at time 0. */
public sealed interface WallShape {

    /**
     * Flat wall: the material lies on the far side of the normal. Endless, or a rectangular sheet around the point.
     *
     * @param point a point of the plane; centre of the sheet
     * @param normal towards the grains, not zero
     * @param sheet its outline; empty for an endless wall
     */
    record Plane(Vector3dc point, Vector3dc normal, Optional<Sheet> sheet) implements WallShape {}

    /**
     * Outline of a rectangular sheet.
     *
     * @param along direction of the width, in the plane, not zero
     * @param width extent along it, m
     * @param depth extent across it, m
     */
    record Sheet(Vector3dc along, double width, double depth) {}

    /** Which side of a closed surface the grains are on. */
    enum Side {
        INSIDE,
        OUTSIDE
    }

    /** Face of a box, named by the axis it stands across and the end of that axis. */
    enum Face {
        LOW_X,
        HIGH_X,
        LOW_Y,
        HIGH_Y,
        LOW_Z,
        HIGH_Z
    }

    /** Box along the world axes; open faces are for grains inside only. */
    record Box(BoxRegion box, Side side, Set<Face> openFaces) implements WallShape {}

    /** End of a cylinder: low is where its direction comes from. */
    enum End {
        LOW,
        HIGH
    }

    /**
     * Round wall about an axis.
     *
     * @param centre middle of the axis
     * @param direction of the axis, not zero
     * @param radius m
     * @param length m
     * @param side where the grains are
     * @param closedEnds ends with a flat disc, for grains inside
     */
    record Cylinder(Vector3dc centre, Vector3dc direction, double radius, double length, Side side, Set<End> closedEnds)
            implements WallShape {}

    /**
     * Conical sheet about an axis, open at both ends.
     *
     * @param centre middle of the axis
     * @param direction of the axis, not zero
     * @param lowRadius at the end its direction comes from, m
     * @param highRadius at the other end, m
     * @param length along the axis, m
     */
    record Cone(Vector3dc centre, Vector3dc direction, double lowRadius, double highRadius, double length)
            implements WallShape {}
}
