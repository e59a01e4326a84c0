// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.IntStream;
import reedling.probe.Estimate;

/**
 * How far a result can be trusted, in numbers and plain words.
 *
 * @param residual relative residual of the energy ledger, absolute value
 * @param expected what discretisation alone explains, 2/N^2 with N steps in a contact
 * @param verdict plain word on the two
 * @param overlaps softening and overlap warnings
 * @param contributors what makes the undersize recovery uncertain, largest first
 */
record Trust(double residual, double expected, String verdict, List<String> overlaps, List<String> contributors) {

    /** Part of |grain - gap|, or of the gaps' own opening, that overlaps on wires may reach. Common practice, no source. */
    private static final double SOFT = 0.1;

    /** Overlap over radius of one pair in a hundred that is still called small. Common practice, no source. */
    private static final double SMALL_OVERLAP = 0.05;

    static Trust of(Simulation simulation, RunProbes probes, RunPlan plan, Optional<ScreenFigures> figures) {
        int perContact = simulation.model().steps().stepsPerContact();
        double expected = 2.0 / perContact / perContact;
        double residual = Math.abs(simulation.ledger().relativeResidual());
        List<String> overlaps = new ArrayList<>();
        if (probes.overlaps().pairs().percentile(0.99) > SMALL_OVERLAP) {
            overlaps.add("One pair of grains in a hundred overlaps by more than 5 % of a radius: grains are soft.");
        }
        plan.screen().ifPresent(screen -> overlaps.addAll(softening(simulation, probes, screen)));
        return new Trust(
                residual,
                expected,
                verdict(residual / expected),
                List.copyOf(overlaps),
                figures.map(one -> contributors(one, residual / expected, !overlaps.isEmpty()))
                        .orElse(List.of()));
    }

    private static String verdict(double ratio) {
        if (ratio <= 1) {
            return "good";
        }
        return ratio <= 5 ? "fair: take more steps per contact" : "poor: do not rely on this run";
    }

    private static List<String> softening(Simulation simulation, RunProbes probes, ScreenPlan screen) {
        List<String> warnings = new ArrayList<>();
        RunProbes.Deck deck = probes.deck().orElseThrow();
        double depth = probes.overlaps().wireDepth().percentile(0.99);
        for (int lot : new int[] {screen.undersizeLot(), screen.productLot()}) {
            var one = simulation.model().lots().get(lot);
            double distance =
                    Math.abs(Math.cbrt(one.sizes().meanCube()) - deck.frame().gap());
            if (depth > SOFT * distance) {
                warnings.add(String.format(
                        Locale.ROOT,
                        "Softening decides for lot %s: overlaps on wires reach %.3g mm, over 10 %% of the %.3g mm "
                                + "between grain and gap. Repeat with four times the modulus.",
                        one.name(),
                        1e3 * depth,
                        1e3 * distance));
            }
        }
        double opening = deck.opening().changes().percentile(0.99);
        boolean bends = IntStream.of(screen.bodies())
                .anyMatch(body ->
                        !simulation.model().structure().bodies().get(body).rigid());
        if (bends && depth > SOFT * opening) {
            warnings.add(String.format(
                    Locale.ROOT,
                    "Softening: overlaps on wires reach %.3g mm, over 10 %% of the %.3g mm by which gaps open. "
                            + "Repeat with four times the modulus.",
                    1e3 * depth,
                    1e3 * opening));
        }
        return warnings;
    }

    private static List<String> contributors(ScreenFigures figures, double ratio, boolean soft) {
        Estimate recovery = figures.recovery();
        List<String> all = new ArrayList<>();
        if (soft) {
            all.add("softening (see the warning; its size needs a repeat with stiffer grains)");
        }
        if (ratio > 1) {
            all.add("time step (the energy ledger leaves more than it should)");
        }
        if (recovery.tooShort() || figures.batches() < Estimate.ENOUGH) {
            all.add("run too short (" + recovery.batches() + " batches, at least " + Estimate.ENOUGH + " needed)");
        }
        if (recovery.drifts()) {
            all.add("drift (recovery still rises or falls from batch to batch)");
        }
        if (recovery.batches() > 1) {
            all.add(String.format(Locale.ROOT, "scatter from batch to batch (+- %.2g %%)", 100 * recovery.halfWidth()));
        }
        return List.copyOf(all);
    }
}
