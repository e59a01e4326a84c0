// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import reedling.unit.Dimension;
import reedling.unit.QuantityText;

/** Keys of lots of grain. */
final class LotKeys {

    private static final ValueType SIZE = Key.quantity(Dimension.LENGTH, Range.closed(1e-6, 1));

    private static final ValueType.Variants DISTRIBUTION = new ValueType.Variants("distribution", distributions());

    static final Section SECTION = Section.of(
            "A lot of grain: one material, one distribution of sizes.",
            Key.required("material", new ValueType.Reference("materials"), "Material of its grains."),
            Key.required(
                    "diameter",
                    new ValueType.QuantityOr((ValueType.Quantity) SIZE, DISTRIBUTION),
                    "One diameter for all grains, or a distribution by number."));

    private LotKeys() {}

    private static Map<String, Section> distributions() {
        Key min = Key.required("min", SIZE, "Smallest diameter.");
        Key max = Key.required("max", SIZE, "Largest diameter.");
        Map<String, Section> sections = new LinkedHashMap<>();
        sections.put(
                "truncated-normal",
                Section.of(
                        "Normal distribution cut at both ends.",
                        Key.required("mean", SIZE, "Mean before cutting."),
                        Key.required("deviation", SIZE, "Standard deviation before cutting."),
                        min,
                        max));
        sections.put("uniform", Section.of("All diameters between two limits equally likely, by number.", min, max));
        return sections;
    }

    static Optional<LotSpecification> read(String name, Values values, Rules rules) {
        DiameterSpecification diameter = values.get("diameter") instanceof Values table
                ? distribution(table)
                : new DiameterSpecification.Single(values.number("diameter"));
        boolean sound = !(values.get("diameter") instanceof Values table) || ordered(table, rules);
        return sound ? Optional.of(new LotSpecification(name, values.text("material"), diameter)) : Optional.empty();
    }

    private static DiameterSpecification distribution(Values table) {
        double smallest = table.number("min");
        double largest = table.number("max");
        return table.text("distribution").equals("uniform")
                ? new DiameterSpecification.Uniform(smallest, largest)
                : new DiameterSpecification.TruncatedNormal(
                        table.number("mean"), table.number("deviation"), smallest, largest);
    }

    private static boolean ordered(Values table, Rules rules) {
        double smallest = table.number("min");
        double largest = table.number("max");
        if (smallest >= largest) {
            rules.error(
                    table.path() + ".max",
                    length(largest),
                    "more than min, " + length(smallest),
                    "Exchange the two, or give one diameter for all grains.");
            return false;
        }
        double mean = table.has("mean") ? table.number("mean") : 0.5 * (smallest + largest);
        if (mean <= smallest || mean >= largest) {
            String range = length(smallest) + " < value < " + length(largest) + ", between min and max";
            rules.error(table.path() + ".mean", length(mean), range, "Move the mean or the cuts.");
            return false;
        }
        return true;
    }

    private static String length(double metres) {
        return QuantityText.of(metres, Dimension.LENGTH);
    }
}
