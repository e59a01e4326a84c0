// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.joml.Vector3d;
import org.joml.Vector3dc;
import reedling.unit.Dimension;

/** Keys of rows of wires. */
final class WireKeys {

    private static final ValueType DIAMETER = Key.quantity(Dimension.LENGTH, Range.closed(1e-6, 1));

    private static final ValueType SUPPORT = new ValueType.Choice(List.of("clamped", "pinned", "free"));

    static final Section SECTION = Section.of(
            "A row of equal, parallel, straight wires, rods or tubes.",
            Key.required("material", new ValueType.Reference("materials"), "Material of the wires."),
            Key.required("section", new ValueType.Variants("shape", sections()), "Cross-section."),
            Key.required("start", Key.vector(Dimension.LENGTH), "Start of the first wire."),
            Key.required("end", Key.vector(Dimension.LENGTH), "End of the first wire."),
            Key.preset("count", new ValueType.Whole(1, 100_000), 1L, "Number of wires."),
            Key.optional("pitch", Key.vector(Dimension.LENGTH), "From the axis of one wire to that of the next."),
            Key.required("elements", new ValueType.Whole(2, 100_000), "Number of elements of each wire."),
            Key.preset(
                    "tension",
                    Key.quantity(Dimension.FORCE, Range.closed(0, 1e7)),
                    0.0,
                    "Pulling force in each wire at rest; start and end are the tensioned positions."),
            Key.preset("start_support", SUPPORT, "clamped", "How the start is held."),
            Key.preset("end_support", SUPPORT, "clamped", "How the end is held."),
            Key.optional("motion", new ValueType.Reference("motions"), "Motion of the supports; without it they rest."),
            Key.preset(
                    "strain_damping",
                    Key.quantity(Dimension.TIME, Range.closed(0, 1)),
                    0.0,
                    "beta of stress = C (strain + beta strain rate)."),
            Key.preset(
                    "first_mode_damping",
                    Key.quantity(Dimension.NUMBER, Range.below(0, 1)),
                    0.0,
                    "Damping ratio of the first lateral mode, relative to the supports; known from a tap test."),
            Key.preset(
                    "rigid", new ValueType.Flag(), false, "Whether the wires follow their supports without bending."),
            Key.preset("element", new ValueType.Plugin(ProviderKind.ELEMENT, "element"), "beam", "Element type."));

    private WireKeys() {}

    private static Map<String, Section> sections() {
        Map<String, Section> sections = new LinkedHashMap<>();
        sections.put("round", Section.of("Solid round section.", Key.required("diameter", DIAMETER, "Diameter.")));
        sections.put(
                "tube",
                Section.of(
                        "Hollow round section.",
                        Key.required("outer", DIAMETER, "Outer diameter."),
                        Key.required("inner", DIAMETER, "Inner diameter.")));
        return sections;
    }

    static Optional<WireSpecification> read(String name, Values values, Rules rules) {
        boolean sound = !values.part("section").has("outer") || hollow(values.part("section"), rules);
        sound &= supported(values, rules);
        if (values.whole("count") > 1 && !values.has("pitch")) {
            rules.missing(
                    values.path() + ".pitch",
                    "missing",
                    "the way from one wire to the next, as there are several",
                    "Add pitch, for example [0, \"7.4 mm\", 0].");
            sound = false;
        }
        if (values.vector("start").equals(values.vector("end"))) {
            rules.error(values.path() + ".end", "the same point as start", "another point", "Give the wire a length.");
            sound = false;
        }
        return sound ? Optional.of(specification(name, values)) : Optional.empty();
    }

    private static boolean hollow(Values section, Rules rules) {
        if (section.number("inner") < section.number("outer")) {
            return true;
        }
        rules.error(section.path() + ".inner", "not smaller than outer", "inner < outer", "Exchange the two.");
        return false;
    }

    private static boolean supported(Values values, Rules rules) {
        boolean free = values.text("start_support").equals("free")
                || values.text("end_support").equals("free");
        if (free && values.number("tension") > 0) {
            rules.error(
                    values.path() + ".tension",
                    "above zero with a free end",
                    "0 N",
                    "A free end holds no tension: clamp or pin it.");
            return false;
        }
        return true;
    }

    private static WireSpecification specification(String name, Values values) {
        Vector3dc pitch = values.has("pitch") ? values.vector("pitch") : new Vector3d();
        Values section = values.part("section");
        return new WireSpecification(
                name,
                values.text("material"),
                section.has("outer")
                        ? new WireSection.Tube(section.number("outer"), section.number("inner"))
                        : new WireSection.Round(section.number("diameter")),
                values.vector("start"),
                values.vector("end"),
                (int) values.whole("count"),
                pitch,
                (int) values.whole("elements"),
                values.number("tension"),
                support(values, "start_support"),
                support(values, "end_support"),
                values.optionalText("motion"),
                values.number("strain_damping"),
                values.number("first_mode_damping"),
                values.flag("rigid"),
                values.plugin("element"));
    }

    private static WireSupport support(Values values, String key) {
        return WireSupport.valueOf(values.text(key).toUpperCase(Locale.ROOT));
    }
}
