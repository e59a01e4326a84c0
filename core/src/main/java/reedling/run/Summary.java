// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import static reedling.run.PlainText.cell;
import static reedling.run.PlainText.format;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import reedling.probe.BulkProbe;
import reedling.probe.LogHistogram;
import reedling.probe.Reading;
import reedling.probe.WireLoads;
import reedling.probe.WirePeaks;

/** The closing summary of a run: plain words, units on every number, 80 columns, ASCII. */
final class Summary {

    private static final int MOST_WIRES = 15;
    private static final String LOAD_CAUTION =
            "Stress and loads: a model result, to be checked by a licensed engineer under local codes.";

    private final Simulation simulation;
    private final RunProbes probes;
    private final RunPlan plan;
    private final Optional<ScreenFigures> figures;
    private final Trust trust;
    private final PlainText text = new PlainText();

    private Summary(RunResult result) {
        simulation = result.simulation();
        probes = result.probes();
        plan = result.plan();
        figures = result.figures();
        trust = result.trust();
    }

    /**
     * Text of the summary, with a line end after its last line.
     *
     * @param heading how the run ended
     * @param timing line about wall-clock time
     */
    static String of(RunResult result, String heading, String timing) {
        Summary summary = new Summary(result);
        summary.text.line(result.plan().identity().title());
        summary.text.line(heading);
        result.figures().ifPresent(figures -> new ScreenText(result, figures).writeTo(summary.text));
        summary.bulk();
        summary.wires();
        summary.walls();
        summary.trust();
        summary.lots();
        summary.text.section("Timing");
        summary.text.line(timing);
        return summary.text.toString();
    }

    private void bulk() {
        for (BulkProbe probe : probes.bulk()) {
            text.section("Probe " + probe.name());
            for (Reading reading : probes.readings(probe)) {
                String value = Double.isNaN(reading.value())
                        ? "not known"
                        : format("%.4g %s", reading.value(), reading.unit());
                text.line(format("%-34s %s", reading.name(), value));
            }
        }
    }

    private void wires() {
        int bodies = simulation.model().structure().bodies().size();
        if (bodies == 0) {
            return;
        }
        text.section("Loads of wires, worst first (since measuring began)");
        text.line(LOAD_CAUTION);
        text.line("wire              stress range   stress    axial   bending     sag  contacts");
        text.line("                   MPa at most      MPa        N      mN m      mm         N");
        WireLoads loads = probes.wireLoads();
        WirePeaks peaks = loads.window();
        List<Integer> order = IntStream.range(0, bodies)
                .boxed()
                .sorted(Comparator.comparingDouble((Integer b) -> -orZero(loads.rangeUpper(b))))
                .toList();
        for (int b : order.subList(0, Math.min(MOST_WIRES, bodies))) {
            text.line(format(
                            "%-18.18s",
                            simulation.model().structure().bodies().get(b).name())
                    + cell(12, 1e-6 * loads.rangeUpper(b))
                    + cell(9, 1e-6 * peaks.fibreStress(b))
                    + cell(9, peaks.axialForce(b))
                    + cell(10, 1e3 * peaks.bendingMoment(b))
                    + cell(8, 1e3 * peaks.sag(b))
                    + cell(10, peaks.contactForce(b)));
        }
        if (bodies > MOST_WIRES) {
            text.line(format("and %d more in wires.csv", bodies - MOST_WIRES));
        }
    }

    private static double orZero(double value) {
        return Double.isNaN(value) ? 0 : value;
    }

    private void walls() {
        if (probes.wallLoads().walls() == 0) {
            return;
        }
        text.section("Loads of walls (whole run)");
        if (simulation.model().structure().bodies().isEmpty()) {
            text.line(LOAD_CAUTION);
        }
        for (int wall = 0; wall < probes.wallLoads().walls(); wall++) {
            text.line(format(
                    "%-30.30s largest force %.4g N",
                    simulation.model().walls().get(wall).name(),
                    probes.wallLoads().largestEver(wall)));
        }
    }

    private void trust() {
        text.section("Trust");
        text.line(format(
                "Energy ledger: %.2g of the energy is left over; up to %.2g is expected (%s).",
                trust.residual(), trust.expected(), trust.verdict()));
        percentiles("pairs of grains", probes.overlaps().pairs());
        percentiles("grains on wires", probes.overlaps().wires());
        trust.overlaps().forEach(text::line);
        StepTally steps = probes.steps();
        if (steps.steps() > 0) {
            text.line(format(
                    "Steps: %d of %.3g us on average (%.3g to %.3g us), %.3g fine steps each.",
                    steps.steps(),
                    1e6 * steps.mean(),
                    1e6 * steps.shortest(),
                    1e6 * steps.longest(),
                    steps.meanFineSteps()));
            text.line("Bounded by " + bounds(steps) + ".");
        }
        simulation.midpoint().ifPresent(this::midpoint);
        figures.ifPresent(f -> text.line("Drift of recovery: "
                + (f.recovery().tooShort()
                        ? "run too short to tell"
                        : f.recovery().drifts() ? "yes, the start is not over" : "none seen")
                + "."));
        plan.identity().cautions().forEach(text::line);
    }

    private void midpoint(MidpointTally tally) {
        MidpointRule rule = simulation.model().steps().midpoint().orElseThrow();
        text.line(format(
                "Midpoint rule (theta %.3g, tolerance %.2g): %.3g iterations a step, %d at most;",
                rule.theta(), rule.tolerance(), tally.meanIterations(), tally.mostIterations()));
        text.line(format("%d halvings, %.3g force passes a step (explicit: 1).", tally.halvings(), tally.meanPasses()));
    }

    private void percentiles(String what, LogHistogram overlap) {
        if (overlap.total() > 0) {
            text.line(format(
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
        text.section("Grains by lot");
        Passage passage = simulation.passage();
        int exits = simulation.model().exits().outlets().size() + 1;
        for (int lot = 0; lot < simulation.model().lots().size(); lot++) {
            long out = 0;
            double outMass = 0;
            for (int exit = 0; exit < exits; exit++) {
                out += passage.outCount(exit, lot);
                outMass += passage.outMass(exit, lot);
            }
            text.line(format(
                    "%s: fed %s, in the run %s",
                    simulation.model().lots().get(lot).name(),
                    amount(passage.fedCount(lot), passage.fedMass(lot)),
                    amount(passage.fedCount(lot) - out, passage.fedMass(lot) - outMass)));
            for (int exit = 0; exit < exits; exit++) {
                String name = exit == exits - 1
                        ? "spilled"
                        : "at " + simulation.model().exits().outlets().get(exit).name();
                text.line("  " + name + " " + amount(passage.outCount(exit, lot), passage.outMass(exit, lot)));
            }
            int number = lot;
            probes.deck()
                    .ifPresent(deck -> text.line("  pegged "
                            + amount(
                                    deck.pegging().count(number), deck.pegging().mass(number))));
        }
    }

    private static String amount(long count, double mass) {
        return format("%d (%.4g kg)", count, Math.abs(mass) < 1e-15 ? 0 : mass);
    }
}
