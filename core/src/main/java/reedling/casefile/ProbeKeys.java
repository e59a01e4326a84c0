// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import reedling.unit.Dimension;
import reedling.unit.QuantityText;

/** Keys of probes. */
final class ProbeKeys {

    private static final ValueType PART = Key.quantity(Dimension.NUMBER, Range.closed(0, 1));

    private static final ValueType WIDTH = Key.quantity(Dimension.LENGTH, Range.above(0, 10));

    private static final Section HEAP = Section.of(
            "Angle of repose of a heap on a level plate, z up: a cone is fitted to the flank by least squares. The height"
                    + " of a ring around the axis is the mean of the highest points in its cells; the foot radius is where"
                    + " it falls below one grain.",
            Key.required("centre", Key.vector(Dimension.LENGTH), "Middle of the heap, on the plate."),
            Key.optional("ring_width", WIDTH, "Width of rings and cells; without it the largest grain of the case."),
            Key.preset("flank_from", PART, 0.2, "Where the flank begins, as part of the foot radius."),
            Key.preset("flank_to", PART, 0.8, "Where the flank ends, as part of the foot radius."));

    private static final Section WAVES = Section.of(
            "Waves on a layer shaken up and down, z up: solid depth (volume of grains over an area) at half the frequency"
                    + " of the drive, its dominant wavelength, and the floor's acceleration at which it first stands out.",
            BoxKeys.MIN,
            BoxKeys.MAX,
            Key.required("cell", WIDTH, "Largest width of a cell; about two grains."),
            Key.required("motion", new ValueType.Reference("motions"), "Vibration of the floor."),
            Key.preset("periods", new ValueType.Whole(8, 8000), 8L, "Periods of the drive in a window: 8, 16, 24, ..."),
            Key.preset(
                    "onset_ratio",
                    Key.quantity(Dimension.NUMBER, Range.above(1, 1000)),
                    5.0,
                    "Waves stand out when they exceed the background by this factor in two windows in a row."));

    static final ValueType.Variants TYPE = new ValueType.Variants("kind", kinds());

    private ProbeKeys() {}

    private static Map<String, Section> kinds() {
        Map<String, Section> kinds = new LinkedHashMap<>();
        kinds.put("heap", HEAP);
        kinds.put("layer-waves", WAVES);
        return kinds;
    }

    static Optional<? extends ProbeSpecification> read(String name, Values values, Rules rules) {
        return values.text("kind").equals("heap") ? heap(name, values, rules) : waves(name, values, rules);
    }

    private static Optional<ProbeSpecification> heap(String name, Values values, Rules rules) {
        double from = values.number("flank_from");
        double to = values.number("flank_to");
        if (from >= to) {
            String least = "more than flank_from, " + QuantityText.of(from, Dimension.NUMBER);
            rules.error(values.path() + ".flank_to", QuantityText.of(to, Dimension.NUMBER), least, "Exchange the two.");
            return Optional.empty();
        }
        return Optional.of(new ProbeSpecification.Heap(
                name, values.vector("centre"), values.optionalNumber("ring_width"), from, to));
    }

    private static Optional<ProbeSpecification> waves(String name, Values values, Rules rules) {
        long periods = values.whole("periods");
        if (periods % 8 != 0) {
            rules.error(
                    values.path() + ".periods",
                    Long.toString(periods),
                    "a multiple of 8",
                    "Only then do waves and background stay apart.");
            return Optional.empty();
        }
        return BoxKeys.read(values, rules)
                .map(box -> new ProbeSpecification.Waves(
                        name,
                        box,
                        values.number("cell"),
                        values.text("motion"),
                        (int) periods,
                        values.number("onset_ratio")));
    }
}
