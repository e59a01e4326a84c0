// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.joml.Vector3dc;
import reedling.unit.Dimension;

/** Keys of walls. */
final class WallKeys {

    private static final List<String> FACES = List.of("low-x", "high-x", "low-y", "high-y", "low-z", "high-z");

    private static final ValueType EXTENT = Key.quantity(Dimension.LENGTH, Range.above(0, 1000));

    private static final Key SIDE = Key.required(
            "side", new ValueType.Choice(List.of("inside", "outside")), "Which side of the surface the grains are on.");

    private static final List<Key> COMMON = List.of(
            Key.required("material", new ValueType.Reference("materials"), "Material of the surface."),
            Key.optional(
                    "motion", new ValueType.Reference("motions"), "Prescribed motion; without it the wall rests."));

    private static final Section PLANE = Section.of(
                    "Flat wall: endless, or a rectangular sheet of no thickness if along, width and depth are given.",
                    Key.required("point", Key.vector(Dimension.LENGTH), "A point of it; centre of the sheet."),
                    Key.required("normal", Key.direction(), "Towards the grains; its length does not matter."),
                    Key.optional(
                            "along", Key.direction(), "Direction of the sheet's width, at right angles to normal."),
                    Key.optional("width", EXTENT, "Extent of the sheet along that direction."),
                    Key.optional("depth", EXTENT, "Extent of the sheet across it."))
            .after(COMMON);

    private static final Section BOX = Section.of(
                    "Box along the world axes.",
                    BoxKeys.MIN,
                    BoxKeys.MAX,
                    SIDE,
                    Key.preset(
                            "open_faces",
                            new ValueType.Choices(FACES),
                            List.of(),
                            "Faces left out; only for grains inside."))
            .after(COMMON);

    private static final Section CYLINDER = Section.of(
                    "Round wall about an axis.",
                    Key.required("centre", Key.vector(Dimension.LENGTH), "Middle of the axis."),
                    Key.required("direction", Key.direction(), "Direction of the axis; its length does not matter."),
                    Key.required("radius", EXTENT, "Radius."),
                    Key.required("length", EXTENT, "Length along the axis."),
                    SIDE,
                    Key.preset(
                            "closed_ends",
                            new ValueType.Choices(List.of("low", "high")),
                            List.of(),
                            "Ends with a flat disc; low is where the direction comes from. Only for grains inside."))
            .after(COMMON);

    private static final ValueType RIM = Key.quantity(Dimension.LENGTH, Range.closed(0, 1000));

    private static final Section CONE = Section.of(
                    "Conical sheet of no thickness about an axis, open at both ends: a funnel. Grains may be on both sides.",
                    Key.required("centre", Key.vector(Dimension.LENGTH), "Middle of the axis."),
                    Key.required("direction", Key.direction(), "Direction of the axis; its length does not matter."),
                    Key.required("low_radius", RIM, "Radius at the end the direction comes from."),
                    Key.required("high_radius", RIM, "Radius at the other end."),
                    Key.required("length", EXTENT, "Length along the axis."))
            .after(COMMON);

    static final ValueType.Variants TYPE = new ValueType.Variants("shape", shapes());

    private WallKeys() {}

    private static Map<String, Section> shapes() {
        Map<String, Section> shapes = new LinkedHashMap<>();
        shapes.put("plane", PLANE);
        shapes.put("box", BOX);
        shapes.put("cylinder", CYLINDER);
        shapes.put("cone", CONE);
        return shapes;
    }

    static Optional<WallSpecification> read(String name, Values values, Rules rules) {
        Optional<? extends WallShape> shape = switch (values.text("shape")) {
            case "plane" -> plane(values, rules);
            case "box" -> box(values, rules);
            case "cone" -> cone(values, rules);
            default -> Optional.of(cylinder(values));
        };
        return shape.map(surface ->
                new WallSpecification(name, values.text("material"), surface, values.optionalText("motion")));
    }

    private static Optional<WallShape.Plane> plane(Values values, Rules rules) {
        Vector3dc point = values.vector("point");
        Vector3dc normal = values.vector("normal");
        long given =
                List.of("along", "width", "depth").stream().filter(values::has).count();
        if (given == 0) {
            return Optional.of(new WallShape.Plane(point, normal, Optional.empty()));
        }
        if (given < 3) {
            rules.missing(
                    values.path(),
                    "a sheet with " + given + " of along, width and depth",
                    "all three or none",
                    "Add the others, or remove them for an endless wall.");
            return Optional.empty();
        }
        Vector3dc along = values.vector("along");
        if (!RightAngle.between(normal, along)) {
            rules.error(
                    values.path() + ".along",
                    "not in the plane",
                    "a direction at right angles to normal",
                    RightAngle.REMEDY);
            return Optional.empty();
        }
        WallShape.Sheet sheet = new WallShape.Sheet(along, values.number("width"), values.number("depth"));
        return Optional.of(new WallShape.Plane(point, normal, Optional.of(sheet)));
    }

    private static Optional<WallShape.Box> box(Values values, Rules rules) {
        Set<WallShape.Face> open = enums(WallShape.Face.class, values.words("open_faces"));
        WallShape.Side side = side(values);
        boolean sound = true;
        if (side == WallShape.Side.OUTSIDE && !open.isEmpty()) {
            rules.error(
                    values.path() + ".open_faces",
                    "given for side = \"outside\"",
                    "none",
                    "Only a box with grains inside has open faces.");
            sound = false;
        }
        if (open.size() == FACES.size()) {
            rules.error(values.path() + ".open_faces", "all six faces", "at most five", "Remove the wall instead.");
            sound = false;
        }
        Optional<BoxRegion> box = BoxKeys.read(values, rules);
        return sound ? box.map(region -> new WallShape.Box(region, side, open)) : Optional.empty();
    }

    private static WallShape.Cylinder cylinder(Values values) {
        return new WallShape.Cylinder(
                values.vector("centre"),
                values.vector("direction"),
                values.number("radius"),
                values.number("length"),
                side(values),
                enums(WallShape.End.class, values.words("closed_ends")));
    }

    private static Optional<WallShape.Cone> cone(Values values, Rules rules) {
        double low = values.number("low_radius");
        double high = values.number("high_radius");
        if (low == 0 && high == 0) {
            rules.error(values.path() + ".high_radius", "0, as low_radius", "one radius above 0", "Widen one end.");
            return Optional.empty();
        }
        return Optional.of(new WallShape.Cone(
                values.vector("centre"), values.vector("direction"), low, high, values.number("length")));
    }

    private static WallShape.Side side(Values values) {
        return WallShape.Side.valueOf(values.text("side").toUpperCase(Locale.ROOT));
    }

    private static <E extends Enum<E>> Set<E> enums(Class<E> type, List<String> words) {
        return words.stream()
                .map(word -> Enum.valueOf(type, word.toUpperCase(Locale.ROOT).replace('-', '_')))
                .collect(Collectors.toCollection(() -> EnumSet.noneOf(type)));
    }
}
