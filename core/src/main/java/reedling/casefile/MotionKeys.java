// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.joml.Vector3dc;
import reedling.unit.Dimension;

/** Keys of prescribed motions. */
final class MotionKeys {

    private static final ValueType TIME = Key.quantity(Dimension.TIME, Range.closed(0, 1e6));

    private static final ValueType AMPLITUDE = Key.quantity(Dimension.LENGTH, Range.above(0, 10));

    private static final List<Key> TIMING = List.of(
            Key.preset("start", TIME, 0.0, "First instant of motion; phases are counted from it."),
            Key.preset("ramp_up", TIME, 0.0, "Duration of the smooth rise after the start."),
            Key.optional("stop", TIME, "First instant of rest; without it the motion never stops."),
            Key.preset("ramp_down", TIME, 0.0, "Duration of the smooth fall before the stop."));

    private static final List<Key> VIBRATION = List.of(
            Key.required(
                    "frequency", Key.quantity(Dimension.FREQUENCY, Range.above(0, 1e5)), "Frequency; rpm is accepted."),
            Key.preset("phase", Key.quantity(Dimension.ANGLE, Range.ANY), 0.0, "Phase at the start."));

    private static final Key FIRST = Key.required("first_axis", Key.direction(), "u1; its length does not matter.");
    private static final Key SECOND = Key.required("second_axis", Key.direction(), "u2, at right angles to u1.");

    static final ValueType.Variants TYPE = new ValueType.Variants("kind", kinds());

    private MotionKeys() {}

    private static Map<String, Section> kinds() {
        Map<String, Section> kinds = new LinkedHashMap<>();
        kinds.put(
                "constant-velocity",
                section(
                        "Straight motion.",
                        List.of(),
                        Key.required("velocity", Key.vector(Dimension.SPEED), "Velocity at full strength.")));
        kinds.put(
                "rotation",
                section(
                        "Rotation about a fixed axis.",
                        List.of(),
                        Key.required("point", Key.vector(Dimension.LENGTH), "A point of the axis."),
                        Key.required(
                                "axis", Key.direction(), "Direction of the axis; positive speeds turn right-handed."),
                        Key.required(
                                "speed",
                                Key.quantity(Dimension.ANGULAR_SPEED, Range.closed(-1e5, 1e5)),
                                "Angular speed.")));
        kinds.put(
                "harmonic",
                section(
                        "Straight vibration: amplitude * direction * sin(2 pi frequency (t - start) + phase).",
                        VIBRATION,
                        Key.required("direction", Key.direction(), "Direction; its length does not matter."),
                        Key.optional("amplitude", AMPLITUDE, "Half of the stroke."),
                        Key.optional("stroke", AMPLITUDE, "Peak to peak.")));
        kinds.put(
                "elliptic",
                section(
                        "Elliptic vibration: a1 u1 cos(p) + a2 u2 sin(p), p = 2 pi frequency (t - start) + phase.",
                        VIBRATION,
                        FIRST,
                        Key.required("first_amplitude", AMPLITUDE, "a1, half of the first axis."),
                        SECOND,
                        Key.required("second_amplitude", AMPLITUDE, "a2, half of the second axis.")));
        kinds.put(
                "circular",
                section(
                        "Circular vibration: as elliptic with equal amplitudes, running from u1 to u2.",
                        VIBRATION,
                        FIRST,
                        SECOND,
                        Key.required("amplitude", AMPLITUDE, "Radius of the circle.")));
        return kinds;
    }

    private static Section section(String meaning, List<Key> more, Key... own) {
        List<Key> keys = new ArrayList<>(List.of(own));
        keys.addAll(more);
        keys.addAll(TIMING);
        return new Section(meaning, keys);
    }

    static Optional<MotionSpecification> read(String name, Values values, Rules rules) {
        boolean timed = TimeOrder.holds(values, rules);
        Optional<? extends MotionSpecification.Path> path = switch (values.text("kind")) {
            case "constant-velocity" ->
                Optional.of(new MotionSpecification.ConstantVelocity(values.vector("velocity")));
            case "rotation" ->
                Optional.of(new MotionSpecification.Rotation(
                        values.vector("point"), values.vector("axis"), values.number("speed")));
            case "harmonic" -> harmonic(values, rules);
            case "elliptic" -> elliptic(values, "first_amplitude", "second_amplitude", rules);
            default -> elliptic(values, "amplitude", "amplitude", rules);
        };
        return timed
                ? path.map(p -> new MotionSpecification(
                        name,
                        p,
                        values.number("start"),
                        values.number("ramp_up"),
                        values.optionalNumber("stop"),
                        values.number("ramp_down")))
                : Optional.empty();
    }

    private static Optional<MotionSpecification.Harmonic> harmonic(Values values, Rules rules) {
        if (!rules.exactlyOne(values, "amplitude", "stroke")) {
            return Optional.empty();
        }
        double amplitude = values.has("stroke") ? 0.5 * values.number("stroke") : values.number("amplitude");
        return Optional.of(new MotionSpecification.Harmonic(
                values.vector("direction"), amplitude, values.number("frequency"), values.number("phase")));
    }

    private static Optional<MotionSpecification.Elliptic> elliptic(
            Values values, String first, String second, Rules rules) {
        Vector3dc u1 = values.vector("first_axis");
        Vector3dc u2 = values.vector("second_axis");
        if (!RightAngle.between(u1, u2)) {
            rules.error(
                    values.path() + ".second_axis",
                    "not at right angles to first_axis",
                    "a direction at right angles to it",
                    RightAngle.REMEDY);
            return Optional.empty();
        }
        return Optional.of(new MotionSpecification.Elliptic(
                u1,
                values.number(first),
                u2,
                values.number(second),
                values.number("frequency"),
                values.number("phase")));
    }
}
