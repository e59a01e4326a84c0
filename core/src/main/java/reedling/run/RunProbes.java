// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import reedling.checkpoint.Persistent;
import reedling.probe.BatchMean;
import reedling.probe.BulkProbe;
import reedling.probe.DeckFrame;
import reedling.probe.DeckOpening;
import reedling.probe.MeasuredWindow;
import reedling.probe.OverlapSample;
import reedling.probe.PeggingWatch;
import reedling.probe.ProbePlan;
import reedling.probe.Reading;
import reedling.probe.SizePassage;
import reedling.probe.WallLoads;
import reedling.probe.WireLoads;

/** All that is measured in a run, looked at after each step; see the probes for what each means. Threads: one. */
public final class RunProbes {

    /** Longest time between two samples of pegging and overlaps, s. */
    static final double SAMPLE_EVERY = 5e-3;

    private final Simulation simulation;
    private final MeasuredWindow window;
    private final WireLoads wireLoads;
    private final WallLoads wallLoads;
    private final SizePassage sizes;
    private final OverlapSample overlaps = new OverlapSample();
    private final StepTally steps = new StepTally();
    private final Optional<Deck> deck;
    private final Due sampleDue;
    private final List<Bulk> bulk = new ArrayList<>();

    /** A probe and when it looks. */
    private record Bulk(BulkProbe probe, Due due) {}

    /**
     * What is measured on a screen deck.
     *
     * @param frame the frame that moves with it
     * @param pegging grains stuck in its gaps
     * @param opening change of its gaps
     * @param openAreaLost part of the open area that is pegged, per cent, by batch
     */
    public record Deck(DeckFrame frame, PeggingWatch pegging, DeckOpening opening, BatchMean openAreaLost) {

        static Deck of(ScreenPlan plan, MeasuredWindow window, Model model) {
            DeckFrame frame = new DeckFrame(model.structure(), plan.bodies());
            int bodies = model.structure().bodies().size();
            return new Deck(
                    frame,
                    new PeggingWatch(frame, plan.peg(), bodies, model.lots().size()),
                    new DeckOpening(frame, model.structure()),
                    new BatchMean("open area lost", window));
        }
    }

    /**
     * @param done time (s) for which everything was sampled; negative for a fresh run
     */
    RunProbes(Simulation simulation, RunPlan plan, double done) {
        this.simulation = simulation;
        Model model = simulation.model();
        window = plan.window();
        wireLoads = new WireLoads(model.structure(), window);
        wallLoads = new WallLoads(model.walls().size());
        sizes = new SizePassage(window, model.lots(), model.exits().outlets().size() + 1);
        deck = plan.screen().map(screen -> Deck.of(screen, window, model));
        sampleDue = new Due(Math.min(SAMPLE_EVERY, plan.intervals().table()), done);
        simulation.watch(sizes);
        for (ProbePlan each : plan.probes()) {
            BulkProbe probe = each.open();
            bulk.add(new Bulk(probe, new Due(probe.every(), done)));
        }
    }

    /** Looks at what the last step left. */
    void afterStep() {
        steps.take(simulation);
        double time = simulation.time();
        if (simulation.stepCount() % WireLoads.EVERY == 0) {
            wireLoads.sample(time, simulation.interactions().wires());
            wallLoads.sample(simulation.interactions().walls().lastLoads());
        }
        if (sampleDue.take(time)) {
            sample(time);
        }
        for (Bulk each : bulk) {
            if (each.due.take(time)) {
                each.probe.sample(time, simulation.model().grains());
            }
        }
    }

    /** Looks at what stands before the first step. */
    void sample() {
        sample(simulation.time());
        bulk.forEach(
                each -> each.probe.sample(simulation.time(), simulation.model().grains()));
    }

    private void sample(double time) {
        boolean measured = window.batchOf(time) != MeasuredWindow.OUTSIDE;
        if (measured) {
            overlaps.sample(simulation.interactions(), simulation.model().grains());
        }
        deck.ifPresent(one -> {
            one.pegging.sample(
                    time, simulation.model().grains(), simulation.interactions().wires());
            one.openAreaLost.add(time, one.pegging.openAreaLost());
            if (measured) {
                one.opening.sample();
            }
        });
    }

    boolean pegged(long id) {
        return deck.isPresent() && deck.get().pegging.pegged(id);
    }

    /** Everything here that a resumed run needs. */
    List<Persistent> persistents() {
        List<Persistent> all = new ArrayList<>(List.of(wireLoads, wallLoads, sizes, overlaps, steps));
        deck.ifPresent(one -> all.addAll(List.of(one.pegging, one.opening, one.openAreaLost)));
        bulk.forEach(each -> all.add(each.probe));
        return all;
    }

    public MeasuredWindow window() {
        return window;
    }

    public WireLoads wireLoads() {
        return wireLoads;
    }

    public WallLoads wallLoads() {
        return wallLoads;
    }

    public SizePassage sizes() {
        return sizes;
    }

    public OverlapSample overlaps() {
        return overlaps;
    }

    public StepTally steps() {
        return steps;
    }

    /** The probes of the case. */
    public List<BulkProbe> bulk() {
        return bulk.stream().map(Bulk::probe).toList();
    }

    /** Figures of a probe as they stand. */
    public List<Reading> readings(BulkProbe probe) {
        return probe.readings(simulation.model().grains());
    }

    /** What is measured on the deck; empty without a screen. */
    public Optional<Deck> deck() {
        return deck;
    }
}
