// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.joml.Vector3d;
import reedling.unit.Dimension;

/** Keys of feeds. */
final class FeedKeys {

    private static final long MOST_GRAINS = 1_000_000_000L;

    private static final Section BOX = Section.of("Box along the world axes.", BoxKeys.MIN, BoxKeys.MAX);

    private static final Section DISC = Section.of(
            "Flat disc.",
            Key.required("centre", Key.vector(Dimension.LENGTH), "Centre."),
            Key.required("normal", Key.direction(), "Direction across the disc; its length does not matter."),
            Key.required("radius", Key.quantity(Dimension.LENGTH, Range.above(0, 100)), "Radius."));

    private static final List<Key> LOTS = List.of(
            Key.optional("lot", new ValueType.Reference("lots"), "The lot, if there is only one."),
            Key.optional("lots", new ValueType.Shares("lots"), "Lots and their shares of the mass."));

    private static final Key VELOCITY = Key.preset(
            "velocity", Key.vector(Dimension.SPEED), new Vector3d(), "Velocity of every grain when it is put in.");

    private static final Key COUNT = Key.optional("count", new ValueType.Whole(1, MOST_GRAINS), "Number of grains.");

    private static final Section PACKED_BLOCK = Section.of(
                    "Grains that lie in a box when the run starts.",
                    Key.required("region", variants("box"), "Where they lie."),
                    COUNT,
                    Key.optional(
                            "solid_fraction",
                            Key.quantity(
                                    Dimension.NUMBER,
                                    Range.above(0, 0.6).withAdvice("Spheres dropped into a box reach about 0.6.")),
                            "Volume of grains over volume of the box."),
                    VELOCITY)
            .after(LOTS);

    private static final Section STREAM = Section.of(
                    "Grains put in over time: scattered over a region, or as a jet through it.",
                    Key.required("region", variants("box", "disc"), "Where they appear."),
                    Key.optional("mass_rate", Key.quantity(Dimension.MASS_RATE, Range.above(0, 1e4)), "Mass per time."),
                    Key.optional(
                            "count_rate", Key.quantity(Dimension.COUNT_RATE, Range.above(0, 1e9)), "Grains per time."),
                    Key.preset("start", Key.quantity(Dimension.TIME, Range.closed(0, 1e6)), 0.0, "First instant."),
                    Key.optional("stop", Key.quantity(Dimension.TIME, Range.above(0, 1e6)), "Last instant."),
                    Key.optional(
                            "total_mass",
                            Key.quantity(Dimension.MASS, Range.above(0, 1e7)),
                            "The feed ends when this mass was put in."),
                    Key.optional(
                            "total_count",
                            new ValueType.Whole(1, MOST_GRAINS),
                            "The feed ends when this number of grains was put in."),
                    VELOCITY,
                    Key.preset(
                            "jitter",
                            Key.quantity(Dimension.SPEED, Range.closed(0, 100)),
                            0.0,
                            "Largest random deviation of each velocity component."))
            .after(LOTS);

    static final ValueType.Variants TYPE = new ValueType.Variants("kind", kinds());

    private FeedKeys() {}

    private static Map<String, Section> kinds() {
        Map<String, Section> kinds = new LinkedHashMap<>();
        kinds.put("packed-block", PACKED_BLOCK);
        kinds.put("rain", STREAM);
        kinds.put("jet", STREAM);
        return kinds;
    }

    private static ValueType.Variants variants(String... shapes) {
        Map<String, Section> sections = new LinkedHashMap<>();
        for (String shape : shapes) {
            sections.put(shape, shape.equals("box") ? BOX : DISC);
        }
        return new ValueType.Variants("shape", sections);
    }

    static Optional<FeedSpecification> read(String name, Values values, Rules rules) {
        boolean sound = rules.exactlyOne(values, "lot", "lots");
        if (values.text("kind").equals("packed-block")) {
            sound &= rules.exactlyOne(values, "count", "solid_fraction");
            Optional<BoxRegion> box = BoxKeys.read(values.part("region"), rules);
            return sound ? box.map(region -> block(name, values, region)) : Optional.empty();
        }
        sound &= rules.exactlyOne(values, "mass_rate", "count_rate");
        sound &= rules.atMostOne(values, "stop", "total_mass", "total_count");
        sound &= TimeOrder.holds(values, rules);
        Optional<? extends Region> region = region(values.part("region"), rules);
        return sound ? region.map(place -> stream(name, values, place)) : Optional.empty();
    }

    private static Optional<? extends Region> region(Values values, Rules rules) {
        return values.text("shape").equals("box")
                ? BoxKeys.read(values, rules)
                : Optional.of(
                        new DiscRegion(values.vector("centre"), values.vector("normal"), values.number("radius")));
    }

    private static Map<String, Double> shares(Values values) {
        return values.has("lot") ? Map.of(values.text("lot"), 1.0) : values.shares("lots");
    }

    private static FeedSpecification block(String name, Values values, BoxRegion region) {
        return new FeedSpecification.PackedBlock(
                name,
                shares(values),
                region,
                values.optionalWhole("count"),
                values.optionalNumber("solid_fraction"),
                values.vector("velocity"));
    }

    private static FeedSpecification stream(String name, Values values, Region region) {
        return new FeedSpecification.Stream(
                name,
                FeedSpecification.StreamKind.valueOf(values.text("kind").toUpperCase(Locale.ROOT)),
                shares(values),
                region,
                values.optionalNumber("mass_rate"),
                values.optionalNumber("count_rate"),
                values.number("start"),
                values.optionalNumber("stop"),
                values.optionalNumber("total_mass"),
                values.optionalWhole("total_count"),
                values.vector("velocity"),
                values.number("jitter"));
    }
}
