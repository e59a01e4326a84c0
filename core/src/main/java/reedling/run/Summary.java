// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import reedling.probe.Estimate;
import reedling.probe.LogHistogram;
import reedling.probe.WireLoads;
import reedling.probe.WirePeaks;

/** The closing summary of a run: plain words, units on every number, 80 columns, ASCII. */
final class Summary {

    private static final int COLUMNS = 80;
    private static final int MOST_WIRES = 15;
    private static final String LOAD_CAUTION =
            "Stress and loads: a model result, to be checked by a licensed engineer under local codes.";

    private final Simulation simulation;
    private final RunProbes probes;
    private final RunPlan plan;
    private final Optional<ScreenFigures> figures;
    private final Trust trust;
    private final StringBuilder text = new StringBuilder();

    private Summary(
            Simulation simulation,
            RunProbes probes,
            RunPlan plan,
            Optional<ScreenFigures> figures,
            Trust trust) {
        this.simulation = simulation;
        this.probes = probes;
        this.plan = plan;
        this.figures = figures;
        this.trust = trust;
    }

    /**
     * Text of the summary, with a line end after its last line.
     *
     * @param heading how the run ended
     * @param timing line about wall-clock time
     */
    static String of(
            String heading,
            Simulation simulation,
            RunProbes probes,
            RunPlan plan,
            Optional<ScreenFigures> figures,
            Trust trust,
            String timing) {
        Summary summary = new Summary(simulation, probes, plan, figures, trust);
        summary.line(plan.identity().title());
        summary.line(heading);
        figures.ifPresent(summary::screen);
        summary.wires();
        summary.walls();
        summary.trust();
        summary.lots();
        summary.section("Timing");
        summary.line(timing);
        return summary.text.toString();
    }

    private void screen(ScreenFigures f) {
        ScreenPlan.Limits limits = plan.screen().orElseThrow().limits();
        section(format(
                "Result: %d of %d batches of %.3g s from %.4g s on; intervals of 95 %% from batch means",
                f.batches(), probes.window().batches(), probes.window().batchLength(), probes.window().from()));
        if (f.batches() < Estimate.ENOUGH) {
            line(format(
                    "RUN TOO SHORT: %d finished batches, at least %d are needed for intervals.",
                    f.batches(), Estimate.ENOUGH));
        }
        entry("1 undersize recovery", percent(f.recovery()) + limit(limits.recovery(), 100, "at least", "%"));
        entry("", "at " + figure(f.throughput(), 3.6, "t/(h m)") + " fed");
        entry("2 good product lost", percent(f.loss()) + limit(limits.loss(), 100, "at most", "%"));
        entry("", "d50 " + figure(f.cutSize(), 1e3, "mm"));
        entry("3 open area pegged", figure(f.pegged(), 1, "%") + ", " + trendOf(f.pegged())
                + limit(limits.pegged(), 1, "at most", "%"));
        entry("4 worst stress range", "at most " + figure(f.stressRange(), 1e-6, "MPa")
                + format(", at least %.4g MPa", 1e-6 * f.stressRangeLower()));
        entry("", limits.stressRange().isPresent()
                ? format("%.2f of the allowable", f.stressRange().value() / limits.stressRange().getAsDouble())
                : "no allowable range was given");
        entry("", bodyName(f.worstBody()) + ", " + place(f.worstBody(), f.worstElement()));
        entry("5 trust in figure 1", (f.recovery().batches() > 1 ? format("+- %.2g %%", 100 * f.recovery().halfWidth())
                : "no interval") + "; largest contributor:");
        entry("", trust.contributors().isEmpty() ? "not known" : trust.contributors().getFirst());
    }

    private void entry(String what, String figure) {
        line(format("%-24s %s", what, figure));
    }

    private static String percent(Estimate part) {
        return figure(part, 100, "%") + (part.drifts() ? ", still drifting" : "");
    }

    /** A figure with its interval, in a unit that is a scale times SI. */
    private static String figure(Estimate estimate, double scale, String unit) {
        if (Double.isNaN(estimate.value())) {
            return "not known: too little happened in the window";
        }
        String value = format("%.4g", scale * estimate.value());
        return estimate.batches() > 1
                ? value + format(" +- %.2g ", scale * estimate.halfWidth()) + unit
                : value + " " + unit + " (no interval)";
    }

    private static String limit(OptionalDouble limit, double scale, String words, String unit) {
        return limit.isPresent() ? format(" (duty: %s %.3g %s)", words, scale * limit.getAsDouble(), unit) : "";
    }

    private static String trendOf(Estimate pegged) {
        if (pegged.tooShort()) {
            return "run too short to see a trend";
        }
        return pegged.drifts() ? (pegged.trend() > 0 ? "still rising" : "falling") : "steady";
    }

    private String bodyName(int body) {
        return simulation.model().structure().bodies().get(body).name();
    }

    /** Place of an element along its wire. */
    private String place(int body, int element) {
        int count = simulation.model().structure().bodies().get(body).elementCount();
        return format("element %d of %d from its start", element + 1, count);
    }

    private void wires() {
        int bodies = simulation.model().structure().bodies().size();
        if (bodies == 0) {
            return;
        }
        section("Loads of wires, worst first (since measuring began)");
        line(LOAD_CAUTION);
        line("wire              stress range   stress    axial   bending   sag  contacts");
        line("                   MPa at most      MPa        N     mN m    mm         N");
        WireLoads loads = probes.wireLoads();
        WirePeaks peaks = loads.window();
        List<Integer> order = IntStream.range(0, bodies)
                .boxed()
                .sorted(Comparator.comparingDouble((Integer b) -> -orZero(loads.rangeUpper(b))))
                .toList();
        for (int b : order.subList(0, Math.min(MOST_WIRES, bodies))) {
            line(format(
                    "%-18.18s %11.4g %8.4g %8.4g %8.4g %5.2f %9.4g",
                    bodyName(b), 1e-6 * loads.rangeUpper(b), 1e-6 * peaks.fibreStress(b), peaks.axialForce(b),
                    1e3 * peaks.bendingMoment(b), 1e3 * peaks.sag(b), peaks.contactForce(b)));
        }
        if (bodies > MOST_WIRES) {
            line(format("and %d more in wires.csv", bodies - MOST_WIRES));
        }
    }

    private static double orZero(double value) {
        return Double.isNaN(value) ? 0 : value;
    }

    private void walls() {
        if (probes.wallLoads().walls() == 0) {
            return;
        }
        section("Loads of walls");
        if (simulation.model().structure().bodies().isEmpty()) {
            line(LOAD_CAUTION);
        }
        for (int wall = 0; wall < probes.wallLoads().walls(); wall++) {
            line(format(
                    "%-30.30s largest force %.4g N",
                    simulation.model().walls().get(wall).name(), probes.wallLoads().largestEver(wall)));
        }
    }

    private void trust() {
        section("Trust");
        line(format(
                "Energy ledger: %.2g of the energy is left over; up to %.2g is expected (%s).",
                trust.residual(), trust.expected(), trust.verdict()));
        percentiles("pairs of grains", probes.overlaps().pairs());
        percentiles("grains on wires", probes.overlaps().wires());
        trust.overlaps().forEach(this::line);
        StepTally steps = probes.steps();
        if (steps.steps() > 0) {
            line(format(
                    "Steps: %d of %.3g us on average (%.3g to %.3g us), %.3g fine steps each.",
                    steps.steps(), 1e6 * steps.mean(), 1e6 * steps.shortest(), 1e6 * steps.longest(),
                    steps.meanFineSteps()));
            line("Bounded by " + bounds(steps) + ".");
        }
        figures.ifPresent(f -> line("Drift of recovery: " + (f.recovery().tooShort() ? "run too short to tell"
                : f.recovery().drifts() ? "yes, the start is not over" : "none seen") + "."));
        plan.identity().cautions().forEach(this::line);
    }

    private void percentiles(String what, LogHistogram overlap) {
        if (overlap.total() > 0) {
            line(format(
                    "Overlap of %s: 99 %% below %.2g %%, 99.9 %% below %.2g %% of the radius.",
                    what, 100 * overlap.percentile(0.99), 100 * overlap.percentile(0.999)));
        }
    }

    private static String bounds(StepTally steps) {
        List<String> parts = new ArrayList<>();
        for (int k = 0; k < StepTally.LIMITS.size(); k++) {
            if (steps.part(k) >= 5e-4) {
                parts.add(format("%s %.1f %%", StepTally.LIMITS.get(k), 100 * steps.part(k)));
            }
        }
        return String.join(", ", parts);
    }

    private void lots() {
        section("Grains by lot");
        Passage passage = simulation.passage();
        int exits = simulation.model().exits().outlets().size() + 1;
        for (int lot = 0; lot < simulation.model().lots().size(); lot++) {
            long out = 0;
            double outMass = 0;
            for (int exit = 0; exit < exits; exit++) {
                out += passage.outCount(exit, lot);
                outMass += passage.outMass(exit, lot);
            }
            line(format(
                    "%s: fed %s, in the run %s",
                    simulation.model().lots().get(lot).name(),
                    amount(passage.fedCount(lot), passage.fedMass(lot)),
                    amount(passage.fedCount(lot) - out, passage.fedMass(lot) - outMass)));
            for (int exit = 0; exit < exits; exit++) {
                String name = exit == exits - 1
                        ? "spilled"
                        : "at " + simulation.model().exits().outlets().get(exit).name();
                line("  " + name + " " + amount(passage.outCount(exit, lot), passage.outMass(exit, lot)));
            }
            int number = lot;
            probes.deck().ifPresent(deck -> line("  pegged "
                    + amount(deck.pegging().count(number), deck.pegging().mass(number))));
        }
    }

    private static String amount(long count, double mass) {
        return format("%d (%.4g kg)", count, Math.abs(mass) < 1e-15 ? 0 : mass);
    }

    private void section(String heading) {
        text.append('\n').append(heading).append('\n');
    }

    /** Adds a line, broken between words where it is too long. */
    private void line(String words) {
        String rest = words;
        String indent = "";
        while (indent.length() + rest.length() > COLUMNS) {
            int end = rest.lastIndexOf(' ', COLUMNS - indent.length());
            if (end <= 0) {
                break;
            }
            text.append(indent).append(rest.substring(0, end).stripTrailing()).append('\n');
            rest = rest.substring(end + 1);
            indent = "    ";
        }
        text.append(indent).append(rest.stripTrailing()).append('\n');
    }

    private static String format(String words, Object... values) {
        return String.format(Locale.ROOT, words, values);
    }
}
