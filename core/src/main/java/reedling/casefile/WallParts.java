// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import org.joml.Vector3d;
import reedling.material.MaterialTable;
import reedling.wall.BoxInside;
import reedling.wall.BoxOutside;
import reedling.wall.ConeSheet;
import reedling.wall.CylinderInside;
import reedling.wall.CylinderOutside;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Rectangle;
import reedling.wall.Surface;
import reedling.wall.Wall;

/** Walls of a case, in the order of the file. */
final class WallParts {

    private record Placed(Surface surface, Placement placement) {}

    private WallParts() {}

    static List<Wall> walls(
            CaseSpecification specification, MaterialTable table, MotionParts motions, PartFaults faults) {
        List<Wall> walls = new ArrayList<>();
        specification
                .walls()
                .forEach((name, wall) -> faults.make("walls." + name, () -> wall(wall, table, motions))
                        .ifPresent(walls::add));
        return walls;
    }

    private static Wall wall(WallSpecification wall, MaterialTable table, MotionParts motions) {
        Placed placed = switch (wall.shape()) {
            case WallShape.Plane plane -> plane(plane);
            case WallShape.Box box -> box(box);
            case WallShape.Cylinder cylinder -> cylinder(cylinder);
            case WallShape.Cone cone ->
                new Placed(
                        new ConeSheet(cone.lowRadius(), cone.highRadius(), cone.length()),
                        Placement.facing(cone.centre(), cone.direction()));
        };
        return new Wall(
                wall.name(),
                table.indexOf(wall.material()),
                placed.surface,
                placed.placement,
                motions.of(wall.motion()));
    }

    private static Placed plane(WallShape.Plane plane) {
        return plane.sheet()
                .map(sheet -> new Placed(
                        new Rectangle(sheet.width(), sheet.depth()),
                        Placement.axes(plane.point(), sheet.along(), plane.normal())))
                .orElseGet(() -> new Placed(new HalfSpace(), Placement.facing(plane.point(), plane.normal())));
    }

    private static Placed box(WallShape.Box box) {
        Vector3d sides = new Vector3d(box.box().maximum()).sub(box.box().minimum());
        Vector3d centre =
                new Vector3d(box.box().maximum()).add(box.box().minimum()).mul(0.5);
        Surface surface = box.side() == WallShape.Side.OUTSIDE
                ? new BoxOutside(sides.x, sides.y, sides.z)
                : new BoxInside(sides.x, sides.y, sides.z, faces(box.openFaces()));
        return new Placed(surface, Placement.at(centre));
    }

    private static Set<BoxInside.Face> faces(Set<WallShape.Face> open) {
        Set<BoxInside.Face> faces = EnumSet.noneOf(BoxInside.Face.class);
        open.forEach(face -> faces.add(BoxInside.Face.valueOf(face.name())));
        return faces;
    }

    private static Placed cylinder(WallShape.Cylinder cylinder) {
        Surface surface = cylinder.side() == WallShape.Side.OUTSIDE
                ? new CylinderOutside(cylinder.radius(), cylinder.length())
                : new CylinderInside(
                        cylinder.radius(),
                        cylinder.length(),
                        cylinder.closedEnds().contains(WallShape.End.LOW),
                        cylinder.closedEnds().contains(WallShape.End.HIGH));
        return new Placed(surface, Placement.facing(cylinder.centre(), cylinder.direction()));
    }
}
