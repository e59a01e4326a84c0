// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.BiFunction;
import reedling.material.Material;
import reedling.material.MaterialPair;

/**
 * The parts of a case that are sound so far; checks across parts look at these, so that one wrong key does not hide what
 * is wrong elsewhere.
 */
final class Draft {

    final Values root;
    final Map<String, Material> materials;
    final List<MaterialPair> pairs;
    final Map<String, LotSpecification> lots;
    final Map<String, FeedSpecification> feeds;
    final Map<String, WallSpecification> walls;
    final Map<String, MotionSpecification> motions;
    final Map<String, WireSpecification> wires;
    final Map<String, OutletSpecification> outlets;
    final Map<String, PluginChoice> fields;
    final Map<String, ProbeSpecification> probes;
    final Optional<BoxRegion> bounds;
    final Optional<ScreenSpecification> screen;
    final Optional<LawsSpecification> laws;
    final Optional<StepSpecification> steps;
    final Optional<OutputSpecification> output;

    Draft(Values root, Rules rules) {
        this.root = root;
        materials = each("materials", (name, values) -> Optional.of(MaterialKeys.read(name, values)));
        pairs = root.several("pairs").stream()
                .filter(Values::sound)
                .flatMap(v -> pair(v).stream())
                .toList();
        lots = each("lots", (name, values) -> LotKeys.read(name, values, rules));
        feeds = each("feeds", (name, values) -> FeedKeys.read(name, values, rules));
        walls = each("walls", (name, values) -> WallKeys.read(name, values, rules));
        motions = each("motions", (name, values) -> MotionKeys.read(name, values, rules));
        wires = each("wires", (name, values) -> WireKeys.read(name, values, rules));
        outlets = each(
                "outlets",
                (name, values) -> BoxKeys.read(values, rules).map(box -> new OutletSpecification(name, box)));
        fields = Collections.unmodifiableMap(new LinkedHashMap<>(root.<PluginChoice>named("fields")));
        probes = each("probes", (name, values) -> ProbeKeys.read(name, values, rules));
        bounds = part("bounds").flatMap(values -> BoxKeys.read(values, rules));
        screen = part("screen").map(ControlKeys::screen);
        laws = part("laws").map(LawKeys::read);
        steps = part("steps").map(ControlKeys::steps);
        output = part("output").map(ControlKeys::output);
    }

    Optional<Values> part(String key) {
        return root.has(key) ? Optional.of(root.part(key)).filter(Values::sound) : Optional.empty();
    }

    private <T> Map<String, T> each(String key, BiFunction<String, Values, ? extends Optional<? extends T>> reader) {
        Map<String, T> sound = new LinkedHashMap<>();
        root.<Values>named(key).forEach((name, values) -> {
            if (values.sound()) {
                reader.apply(name, values).ifPresent(part -> sound.put(name, part));
            }
        });
        return Collections.unmodifiableMap(sound);
    }

    private Optional<MaterialPair> pair(Values values) {
        List<String> names = values.words("materials");
        Material first = materials.get(names.get(0));
        Material second = materials.get(names.get(1));
        if (first == null || second == null) {
            return Optional.empty();
        }
        return Optional.of(new MaterialPair(
                first,
                second,
                values.number("restitution"),
                values.number("friction"),
                values.number("rolling_friction")));
    }

    /** The complete case; only when nothing was found wrong. */
    CaseSpecification complete() {
        Values about = root.part("case");
        return new CaseSpecification(
                about.text("title"),
                about.text("notes"),
                about.whole("seed"),
                materials,
                pairs,
                lots,
                feeds,
                walls,
                motions,
                wires,
                outlets,
                bounds.orElseThrow(),
                screen,
                probes,
                laws.orElseThrow(),
                fields,
                steps.orElseThrow(),
                output.orElseThrow());
    }
}
