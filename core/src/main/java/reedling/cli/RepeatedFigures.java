// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import reedling.probe.Estimate;

/**
 * Figures of runs that differ in their seed only: mean, interval of 95 % by Student's t, standard deviation, extremes.
 * Figures that a run does not know are left out of it. Threads: one.
 */
final class RepeatedFigures {

    private final List<Long> seeds = new ArrayList<>();
    private final Map<String, List<Double>> values = new LinkedHashMap<>();

    /** Takes the figures of one more run, of the same case. */
    void add(long seed, Map<String, Double> results) {
        seeds.add(seed);
        results.forEach((name, value) ->
                values.computeIfAbsent(name, any -> new ArrayList<>()).add(value));
    }

    /** Plain text, one line a figure. */
    String text() {
        StringBuilder text = new StringBuilder();
        text.append(String.format(
                Locale.ROOT, "%d runs; +- is 95 %% of the mean, s the spread of a single run%n", seeds.size()));
        values.forEach((name, each) -> {
            double[] known = known(each);
            Estimate estimate = Estimate.of(known);
            text.append(
                    known.length == 0
                            ? String.format(Locale.ROOT, "%-40s not known%n", name)
                            : String.format(
                                    Locale.ROOT,
                                    "%-40s %.4g +- %.2g, s %.2g, %d runs%n",
                                    name,
                                    estimate.value(),
                                    estimate.halfWidth(),
                                    deviation(known, estimate.value()),
                                    known.length));
        });
        return text.toString();
    }

    /** The same as a table in CSV, with the figures of each run behind. */
    String table() {
        StringBuilder text =
                new StringBuilder("figure,mean,half width 95 %,standard deviation,smallest,largest,runs that know it");
        seeds.forEach(seed -> text.append(",seed ").append(seed));
        text.append('\n');
        values.forEach((name, each) -> {
            double[] known = known(each);
            Estimate estimate = Estimate.of(known);
            text.append(name);
            cell(text, estimate.value());
            cell(text, estimate.halfWidth());
            cell(text, deviation(known, estimate.value()));
            cell(text, Arrays.stream(known).min().orElse(Double.NaN));
            cell(text, Arrays.stream(known).max().orElse(Double.NaN));
            text.append(',').append(known.length);
            each.forEach(value -> cell(text, value));
            text.append('\n');
        });
        return text.toString();
    }

    private static void cell(StringBuilder text, double value) {
        text.append(',');
        if (!Double.isNaN(value)) {
            text.append(value);
        }
    }

    private static double[] known(List<Double> each) {
        return each.stream()
                .mapToDouble(Double::doubleValue)
                .filter(value -> !Double.isNaN(value))
                .toArray();
    }

    private static double deviation(double[] known, double mean) {
        double squares = 0;
        for (double value : known) {
            squares += (value - mean) * (value - mean);
        }
        return known.length > 1 ? Math.sqrt(squares / (known.length - 1)) : Double.NaN;
    }
}
