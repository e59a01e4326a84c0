// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import reedling.unit.Dimension;
import reedling.unit.QuantityText;

/** Keys of lots of grain. */
final class LotKeys {

    private static final ValueType SIZE = SizeKeys.SIZE;

    private static final ValueType.Variants DISTRIBUTION = new ValueType.Variants("distribution", distributions());

    static final Section SECTION = Section.of(
            "A lot of grain: one material, one distribution of sizes.",
            Key.required("material", new ValueType.Reference("materials"), "Material of its grains."),
            Key.required(
                    "diameter",
                    new ValueType.QuantityOr((ValueType.Quantity) SIZE, DISTRIBUTION),
                    "One diameter for all grains, or a distribution."));

    private LotKeys() {}

    private static Map<String, Section> distributions() {
        Key min = Key.required("min", SIZE, "Smallest diameter.");
        Key max = Key.required("max", SIZE, "Largest diameter.");
        Map<String, Section> sections = new LinkedHashMap<>();
        sections.put(
                "truncated-normal",
                Section.of(
                        "Normal distribution by number, cut at both ends.",
                        Key.required("mean", SIZE, "Mean before cutting."),
                        Key.required("deviation", SIZE, "Standard deviation before cutting."),
                        min,
                        max));
        sections.put("uniform", Section.of("All diameters between two limits equally likely, by number.", min, max));
        sections.putAll(SizeKeys.sections());
        return sections;
    }

    static Optional<LotSpecification> read(String name, Values values, Rules rules) {
        Optional<DiameterSpecification> diameter = values.get("diameter") instanceof Values table
                ? distribution(table, rules)
                : Optional.of(new DiameterSpecification.Single(values.number("diameter")));
        return diameter.map(sizes -> new LotSpecification(name, values.text("material"), sizes));
    }

    private static Optional<DiameterSpecification> distribution(Values table, Rules rules) {
        return switch (table.text("distribution")) {
            case "uniform" ->
                ordered(table, rules)
                        ? Optional.of(new DiameterSpecification.Uniform(table.number("min"), table.number("max")))
                        : Optional.empty();
            case "truncated-normal" ->
                ordered(table, rules)
                        ? Optional.of(new DiameterSpecification.TruncatedNormal(
                                table.number("mean"),
                                table.number("deviation"),
                                table.number("min"),
                                table.number("max")))
                        : Optional.empty();
            default -> SizeKeys.read(table, rules);
        };
    }

    /** Whether the largest size of a table is above the smallest; reports it otherwise. */
    static boolean rising(Values table, double smallest, double largest, Rules rules) {
        if (smallest >= largest) {
            rules.error(
                    table.path() + ".max",
                    length(largest),
                    "more than min, " + length(smallest),
                    "Exchange the two, or give one diameter for all grains.");
        }
        return smallest < largest;
    }

    private static boolean ordered(Values table, Rules rules) {
        double smallest = table.number("min");
        double largest = table.number("max");
        if (!rising(table, smallest, largest, rules)) {
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
