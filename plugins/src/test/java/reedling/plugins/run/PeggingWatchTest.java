// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Map;
import java.util.stream.IntStream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.checkpoint.CheckpointFolder;
import reedling.checkpoint.CheckpointHeader;
import reedling.checkpoint.CheckpointReader;
import reedling.checkpoint.CheckpointWriter;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.probe.DeckFrame;
import reedling.probe.PegRule;
import reedling.probe.PeggingWatch;
import reedling.run.Model;
import reedling.run.Simulation;

/** Grains put between the wires of a still deck by hand: gap 5.4 mm, wires of 2 mm, rule 50 ms and 0.5 mm. */
class PeggingWatchTest {

    private static final double MIDDLE = 0.5 * RainDeck.PITCH;
    private static final double STUCK = 2.75e-3;

    private final WorkerTeam team = new WorkerTeam(1);
    private final RainDeck deck = RainDeck.still().feeding(0);

    @AfterEach
    void endTeam() {
        team.close();
    }

    private static PeggingWatch watch(Model model) {
        DeckFrame frame = new DeckFrame(
                model.structure(), IntStream.range(0, RainDeck.WIRES).toArray());
        return new PeggingWatch(frame, new PegRule(0.05, 0.5e-3), RainDeck.WIRES, 2);
    }

    private Simulation begin(Model model) {
        Simulation simulation = new Simulation(model, team);
        simulation.begin();
        return simulation;
    }

    private static void sample(PeggingWatch watch, double time, Simulation simulation) {
        watch.sample(
                time, simulation.model().grains(), simulation.interactions().wires());
    }

    /** Moves grains and deck together, m. */
    private static void carry(Model model, double dx, double dz) {
        for (int n = 0; n < model.structure().nodes().count; n++) {
            model.structure().nodes().position[3 * n] += dx;
            model.structure().nodes().position[3 * n + 2] += dz;
        }
        for (int g = 0; g < model.grains().count(); g++) {
            push(model, g, 0, dx);
            push(model, g, 2, dz);
        }
    }

    private static void push(Model model, int grain, int axis, double distance) {
        model.grains().rows()[GrainRow.at(grain) + axis] += distance;
    }

    @Test
    void aGrainStuckInAGapPegsAfterItsTime() {
        Simulation simulation = begin(deck.grain(0.03, MIDDLE, 0, STUCK).model());
        PeggingWatch watch = watch(simulation.model());
        sample(watch, 0, simulation);
        sample(watch, 0.045, simulation);
        assertThat(watch.count(1)).isZero();
        sample(watch, 0.05, simulation);
        assertThat(watch.count(1)).isEqualTo(1);
        assertThat(watch.count(0)).isZero();
        assertThat(watch.pegged(simulation.model().grains().id()[0])).isTrue();
        assertThat(watch.mass(1)).isCloseTo(1280 * 4.0 / 3 * Math.PI * STUCK * STUCK * STUCK, within(1e-12));
        // 5.5 mm of five gaps of 60 mm
        assertThat(watch.openAreaLost()).isCloseTo(100 * 5.5 / 300, within(1e-9));
    }

    @Test
    void aPeggedGrainMayTravelWithTheDeck() {
        Simulation simulation = begin(deck.grain(0.03, MIDDLE, 0, STUCK).model());
        PeggingWatch watch = watch(simulation.model());
        for (int k = 0; k <= 10; k++) {
            sample(watch, 0.01 * k, simulation);
            carry(simulation.model(), 1e-3, k % 2 == 0 ? 2e-3 : -2e-3);
        }
        assertThat(watch.count(1)).isEqualTo(1);
    }

    @Test
    void aGrainThatSlidesAlongTheGapDoesNotPegAndOneThatComesLooseIsLetGo() {
        Simulation simulation = begin(deck.grain(0.02, MIDDLE, 0, STUCK).model());
        PeggingWatch watch = watch(simulation.model());
        for (int k = 0; k <= 20; k++) {
            sample(watch, 0.01 * k, simulation);
            push(simulation.model(), 0, 0, 0.2e-3); // 0.6 mm in 30 ms
        }
        assertThat(watch.count(1)).isZero();
        sample(watch, 0.3, simulation);
        sample(watch, 0.36, simulation);
        assertThat(watch.count(1)).isEqualTo(1);
        push(simulation.model(), 0, 2, STUCK + 1e-6); // out of the layer
        sample(watch, 0.37, simulation);
        assertThat(watch.count(1)).isZero();
    }

    @Test
    void aGrainOnOneWireOrFarFromTheLayerDoesNotPeg() {
        Simulation simulation = begin(deck.grain(0.02, MIDDLE - 1.5e-3, 0, 1.3e-3) // one wire only
                .grain(0.03, 3 * MIDDLE, 7.05e-3, 7e-3) // on two wires, its centre above its own radius
                .model());
        PeggingWatch watch = watch(simulation.model());
        for (int k = 0; k <= 10; k++) {
            sample(watch, 0.01 * k, simulation);
        }
        int[] touches = new int[2];
        simulation
                .interactions()
                .wires()
                .visitOverlaps(simulation.model().grains(), (grain, body, overlap) -> touches[grain]++);
        assertThat(touches).containsExactlyInAnyOrder(1, 2);
        assertThat(watch.count(1)).isZero();
    }

    @Test
    void aRestoredWatchGoesOnWhereItStood(@TempDir Path folder) throws IOException {
        Simulation simulation = begin(deck.grain(0.03, MIDDLE, 0, STUCK).model());
        PeggingWatch watch = watch(simulation.model());
        sample(watch, 0, simulation);
        CheckpointWriter checkpoint = new CheckpointWriter(new CheckpointHeader("test", "", 0, 0, Map.of()));
        checkpoint.save(watch);
        Path file = CheckpointFolder.create(folder).write(checkpoint);
        PeggingWatch again = watch(simulation.model());
        try (CheckpointReader reader = CheckpointReader.open(file)) {
            reader.restore(again);
        }
        sample(again, 0.05, simulation);
        assertThat(again.count(1)).isEqualTo(1);
    }

    @Test
    void theFrameKnowsTheDeck() {
        DeckFrame frame = new DeckFrame(
                deck.structure(), IntStream.range(0, RainDeck.WIRES).toArray());
        assertThat(frame.gap()).isCloseTo(5.4e-3, within(1e-15));
        assertThat(frame.length()).isCloseTo(RainDeck.SPAN, within(1e-15));
        assertThat(frame.width()).isCloseTo(RainDeck.WIRES * RainDeck.PITCH, within(1e-15));
    }
}
