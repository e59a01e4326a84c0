// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import reedling.particle.Basis;
import reedling.particle.SieveSize;
import reedling.unit.Dimension;
import reedling.unit.QuantityText;

/** Keys of a sieve table; rows may stand in any order. */
final class SieveKeys {

    private static final ValueType PART = Key.quantity(Dimension.NUMBER, Range.closed(0, 1e9));

    private static final Section SIEVE = Section.of(
            "One sieve.",
            Key.required("opening", SizeKeys.SIZE, "Width of its openings; a round grain as large just passes."),
            Key.optional(
                    "retained", PART, "What lies on it, in grams, per cent or grains: only the proportions count."),
            Key.optional(
                    "passing",
                    Key.quantity(Dimension.NUMBER, Range.closed(0, 1)),
                    "Part of the whole that passes it, such as \"35 %\"."));

    private final Values table;
    private final List<Values> sieves;
    private final Rules rules;

    private SieveKeys(Values table, Rules rules) {
        this.table = table;
        this.rules = rules;
        sieves = table.several("sieves").stream()
                .filter(Values::sound)
                .sorted(Comparator.comparingDouble(sieve -> sieve.number("opening")))
                .toList();
    }

    static Section section(Key basis) {
        return Section.of(
                "Sieve table. Between two sieves the passing part is a straight line over the logarithm of the size.",
                basis,
                Key.required(
                        "sieves", new ValueType.Several(SIEVE), "Sieves, each with retained, or each with passing."),
                Key.preset("pan", PART, 0.0, "What lies in the pan below the finest sieve, if retained is given."),
                Key.optional("min", SizeKeys.SIZE, "Smallest size of what passes the finest sieve, if anything does."),
                Key.optional(
                        "max", SizeKeys.SIZE, "Largest size of what lies on the coarsest sieve, if anything does."));
    }

    static Optional<DiameterSpecification> read(Values table, Basis basis, Rules rules) {
        SieveKeys keys = new SieveKeys(table, rules);
        return keys.sound() ? keys.distribution(basis) : Optional.empty();
    }

    private boolean sound() {
        if (sieves.size() < table.several("sieves").size()) {
            return false;
        }
        if (sieves.isEmpty()) {
            rules.error(path("sieves"), "empty", "at least one sieve", "Write a row for each sieve.");
            return false;
        }
        boolean sound = true;
        for (int k = 0; k < sieves.size(); k++) {
            sound &= rules.exactlyOne(sieves.get(k), "retained", "passing");
            sound &= k == 0 || apart(sieves.get(k - 1), sieves.get(k));
        }
        return sound && alike();
    }

    private boolean apart(Values finer, Values coarser) {
        boolean apart = finer.number("opening") < coarser.number("opening");
        if (!apart) {
            String got = length(coarser.number("opening")) + " as in " + finer.path();
            rules.error(coarser.path() + ".opening", got, "each opening once", "Remove one of the rows.");
        }
        return apart;
    }

    private boolean alike() {
        boolean passing = byPassing();
        for (Values sieve : sieves) {
            if (sieve.has("passing") != passing) {
                String given = sieve.has("passing") ? "passing" : "retained";
                String got = "given where other sieves have " + (passing ? "passing" : "retained");
                rules.error(sieve.path() + "." + given, got, "the same for all sieves", "Convert one kind.");
                return false;
            }
        }
        if (passing && table.number("pan") > 0) {
            rules.error(path("pan"), "given with passing", "retained", "The finest sieve's passing says it already.");
            return false;
        }
        return true;
    }

    private boolean byPassing() {
        return sieves.getFirst().has("passing");
    }

    private Optional<DiameterSpecification> distribution(Basis basis) {
        Optional<double[]> parts = byPassing() ? passing() : retained();
        return parts.filter(this::endsKnown).map(passing -> {
            List<Double> sizes = new ArrayList<>(
                    sieves.stream().map(sieve -> sieve.number("opening")).toList());
            List<Double> below = new ArrayList<>();
            for (double part : passing) {
                below.add(part);
            }
            if (below.getFirst() > 0) {
                sizes.addFirst(table.number("min"));
                below.addFirst(0.0);
            }
            if (below.getLast() < 1) {
                sizes.addLast(table.number("max"));
                below.addLast(1.0);
            }
            return new DiameterSpecification.Graded(new SieveSize(basis, array(sizes), array(below)));
        });
    }

    private static double[] array(List<Double> values) {
        return values.stream().mapToDouble(Double::doubleValue).toArray();
    }

    private Optional<double[]> passing() {
        double[] below = new double[sieves.size()];
        for (int k = 0; k < below.length; k++) {
            below[k] = sieves.get(k).number("passing");
            if (k > 0 && below[k] < below[k - 1]) {
                rules.error(
                        sieves.get(k).path() + ".passing",
                        percent(below[k]),
                        "at least what passes the finer " + sieves.get(k - 1).path() + ", " + percent(below[k - 1]),
                        "Exchange the two, or give what is retained.");
                return Optional.empty();
            }
        }
        return Optional.of(below);
    }

    private Optional<double[]> retained() {
        double[] below = new double[sieves.size()];
        double sum = table.number("pan");
        for (int k = 0; k < below.length; k++) {
            below[k] = sum;
            sum += sieves.get(k).number("retained");
        }
        if (sum == 0) {
            rules.error(path("sieves"), "without anything retained", "a part above 0", "Enter what was weighed.");
            return Optional.empty();
        }
        for (int k = 0; k < below.length; k++) {
            below[k] /= sum;
        }
        return Optional.of(below);
    }

    /** Whether sizes are known of what is finer than the finest and coarser than the coarsest sieve. */
    private boolean endsKnown(double[] passing) {
        double finest = sieves.getFirst().number("opening");
        double coarsest = sieves.getLast().number("opening");
        boolean known = end("min", passing[0] > 0, finest, "less than the finest opening, " + length(finest), -1);
        known &= end(
                "max",
                passing[passing.length - 1] < 1,
                coarsest,
                "more than the coarsest opening, " + length(coarsest),
                1);
        if (known && passing[0] == 1) {
            rules.caution(path("sieves"), "a table that all passes", "something retained", "Use finer sieves.");
        }
        return known;
    }

    private boolean end(String key, boolean needed, double opening, String expected, int side) {
        boolean given = table.has(key);
        if (needed && !given) {
            String got = "missing, though "
                    + (side < 0 ? "something passes the finest" : "something lies on the coarsest") + " sieve";
            rules.missing(path(key), got, "a size " + expected, "Say how far these grains reach.");
        } else if (needed && side * (table.number(key) - opening) <= 0) {
            rules.error(path(key), length(table.number(key)), expected, "Say how far these grains reach.");
        } else if (given && !needed) {
            rules.caution(path(key), length(table.number(key)), "no value", "There is nothing beyond that sieve.");
        }
        return !needed || given && side * (table.number(key) - opening) > 0;
    }

    private String path(String key) {
        return table.path() + "." + key;
    }

    private static String percent(double part) {
        return QuantityText.of(part, Dimension.NUMBER);
    }

    private static String length(double metres) {
        return QuantityText.of(metres, Dimension.LENGTH);
    }
}
