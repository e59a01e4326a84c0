// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import reedling.particle.Basis;
import reedling.particle.RosinRammlerSize;
import reedling.particle.SchuhmannSize;
import reedling.unit.Dimension;
import reedling.unit.QuantityText;

/** Keys of size distributions as laboratories give them: sieve table, Rosin-Rammler, Gates-Gaudin-Schuhmann. */
final class SizeKeys {

    static final ValueType SIZE = Key.quantity(Dimension.LENGTH, Range.closed(1e-6, 1));

    private static final double LEAST_KEPT = 0.01;

    private static final Key BASIS = Key.required(
            "basis",
            new ValueType.Choice(List.of("mass", "number")),
            "What the parts are parts of: mass, as scales give it, or number of grains, as counting gives it.");

    private static final Key LOWER_CUT =
            Key.required("min", SIZE, "Lower cut: smaller grains are left out and the rest counts as the whole.");

    private static final ValueType INDEX = Key.quantity(Dimension.NUMBER, Range.closed(0.1, 50));

    private static final Section ROSIN_RAMMLER = Section.of(
            "Rosin-Rammler-Sperling-Bennett: a part exp(-(d/characteristic_size)^uniformity) is larger than d.",
            BASIS,
            Key.required("characteristic_size", SIZE, "Size that 36.8 % is larger than, before cutting."),
            Key.required("uniformity", INDEX, "Uniformity index n: large for nearly equal grains."),
            LOWER_CUT,
            Key.required("max", SIZE, "Upper cut."));

    private static final Section SCHUHMANN = Section.of(
            "Gates-Gaudin-Schuhmann: a part (d/size_modulus)^distribution_modulus is smaller than d.",
            BASIS,
            Key.required("size_modulus", SIZE, "Size k that all grains are smaller than, before cutting."),
            Key.required("distribution_modulus", INDEX, "Exponent m: large for nearly equal grains."),
            LOWER_CUT,
            Key.optional("max", SIZE, "Upper cut; without it the size modulus."));

    private SizeKeys() {}

    static Map<String, Section> sections() {
        Map<String, Section> sections = new LinkedHashMap<>();
        sections.put("sieve-table", SieveKeys.section(BASIS));
        sections.put("rosin-rammler", ROSIN_RAMMLER);
        sections.put("gates-gaudin-schuhmann", SCHUHMANN);
        return sections;
    }

    /** The distribution of a table with one of these words; empty if it is of another kind or was refused. */
    static Optional<DiameterSpecification> read(Values table, Rules rules) {
        return switch (table.text("distribution")) {
            case "sieve-table" -> SieveKeys.read(table, basis(table), rules);
            case "rosin-rammler" -> rosinRammler(table, rules);
            default -> schuhmann(table, rules);
        };
    }

    private static Basis basis(Values table) {
        return Basis.valueOf(table.text("basis").toUpperCase(Locale.ROOT));
    }

    private static Optional<DiameterSpecification> rosinRammler(Values table, Rules rules) {
        double size = table.number("characteristic_size");
        double uniformity = table.number("uniformity");
        double smallest = table.number("min");
        double largest = table.number("max");
        if (!LotKeys.rising(table, smallest, largest, rules)) {
            return Optional.empty();
        }
        double kept = StrictMath.exp(-StrictMath.pow(smallest / size, uniformity))
                - StrictMath.exp(-StrictMath.pow(largest / size, uniformity));
        if (kept < LEAST_KEPT) {
            rules.error(
                    table.path() + ".characteristic_size",
                    length(size) + ", which leaves " + QuantityText.of(kept, Dimension.NUMBER)
                            + " of the distribution between min and max",
                    "at least " + LEAST_KEPT,
                    "Move the cuts or the characteristic size.");
            return Optional.empty();
        }
        return Optional.of(new DiameterSpecification.Graded(
                new RosinRammlerSize(basis(table), size, uniformity, smallest, largest)));
    }

    private static Optional<DiameterSpecification> schuhmann(Values table, Rules rules) {
        double modulus = table.number("size_modulus");
        double smallest = table.number("min");
        double largest = table.optionalNumber("max").orElse(modulus);
        if (largest > modulus) {
            String most = "at most size_modulus, " + length(modulus);
            rules.error(table.path() + ".max", length(largest), most, "No grain is larger: lower the cut.");
            return Optional.empty();
        }
        if (!table.has("max") && smallest >= modulus) {
            String most = "less than size_modulus, " + length(modulus);
            rules.error(table.path() + ".min", length(smallest), most, "Lower the cut.");
            return Optional.empty();
        }
        return LotKeys.rising(table, smallest, largest, rules)
                ? Optional.of(new DiameterSpecification.Graded(new SchuhmannSize(
                        basis(table), modulus, table.number("distribution_modulus"), smallest, largest)))
                : Optional.empty();
    }

    private static String length(double metres) {
        return QuantityText.of(metres, Dimension.LENGTH);
    }
}
