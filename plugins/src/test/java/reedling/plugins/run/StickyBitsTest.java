// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.checkpoint.CheckpointFolder;
import reedling.checkpoint.CheckpointHeader;
import reedling.checkpoint.CheckpointReader;
import reedling.checkpoint.CheckpointWriter;
import reedling.checkpoint.Persistent;
import reedling.contact.ContactLaw;
import reedling.contact.LawSet;
import reedling.contact.Stage;
import reedling.neighbour.PairSegment;
import reedling.parallel.WorkerTeam;
import reedling.plugin.ParameterValues;
import reedling.plugins.Rig;
import reedling.plugins.contact.JkrProvider;
import reedling.plugins.contact.LennardJonesProvider;
import reedling.plugins.contact.MindlinProvider;
import reedling.run.Model;
import reedling.run.Simulation;
import reedling.run.StateDigest;

/**
 * Laws that reach over gaps give the same bits on any number of threads, with any width of vectors, and after a resume.
 *
 * <p>As a program it prints the digest of the state after some steps.
 */
@Tag("conservation")
class StickyBitsTest {

    private static final int BEFORE = 2000;
    private static final int AFTER = 3000;

    @TempDir
    Path folder;

    private static Map<Stage, ContactLaw> laws() {
        Map<Stage, ContactLaw> laws = new EnumMap<>(Stage.class);
        JkrProvider jkr = new JkrProvider();
        laws.put(Stage.NORMAL, jkr.create(ParameterValues.of(jkr, Map.of("work_of_adhesion", 0.5, "on_wires", 2.0))));
        LennardJonesProvider near = new LennardJonesProvider();
        Map<String, Double> values = Map.of(
                "depth", 1e-8, "zero_distance", 2e-4, "contact_distance", 2.2e-4, "cutoff", 6e-4, "charge", 1e-11);
        laws.put(Stage.NEAR_FIELD, near.create(ParameterValues.of(near, values)));
        return laws;
    }

    private static String digest(int threads, int steps) {
        Rig rig = ShakenScreen.scene(11).reportEvery(100);
        laws().forEach(rig::law);
        try (WorkerTeam team = new WorkerTeam(threads)) {
            Simulation run = rig.start(team);
            while (run.stepCount() < steps) {
                run.step();
            }
            return StateDigest.of(run);
        }
    }

    @Test
    void threadsDoNotChangeABit() {
        assertThat(digest(3, 1000)).isEqualTo(digest(1, 1000));
    }

    /** So that equality means something: grains hold on to wires and each other; for walls see HangingGrainTest. */
    @Test
    void sceneCoversWhatItShould() {
        Rig rig = ShakenScreen.scene(11).reportEvery(100);
        laws().forEach(rig::law);
        boolean onGrains = false;
        boolean onWires = false;
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.stepCount() < 1000) {
                run.step();
                onGrains |= anyJoined(run.interactions().pairRows());
                onWires |= anyJoined(run.interactions().wireRows());
            }
            assertThat(onGrains).isTrue();
            assertThat(onWires).isTrue();
        }
    }

    private static boolean anyJoined(List<PairSegment> segments) {
        for (PairSegment segment : segments) {
            for (int row = 0; row < segment.activeCount(); row++) {
                int tile = row & -8;
                if (segment.history()[segment.historyAt(tile) + 8 + row - tile] > 0) {
                    return true;
                }
            }
        }
        return false;
    }

    @Test
    void lanesDoNotChangeABit() throws IOException, InterruptedException {
        assertThat(withLanes(8)).isEqualTo(withLanes(1)).hasSizeGreaterThan(8);
    }

    private static String withLanes(int lanes) throws IOException, InterruptedException {
        Process process = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "--add-modules",
                        "jdk.incubator.vector",
                        "-XX:+UseSerialGC",
                        "-Dreedling.lanes=" + lanes,
                        "-cp",
                        System.getProperty("java.class.path"),
                        StickyBitsTest.class.getName(),
                        "700")
                .redirectError(ProcessBuilder.Redirect.DISCARD)
                .start();
        String printed = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8).strip();
        assertThat(process.waitFor()).isZero();
        return printed;
    }

    private static Simulation sticky(WorkerTeam team) {
        Model dry = RainDeck.shaken().model();
        Map<Stage, ContactLaw> laws = laws();
        MindlinProvider friction = new MindlinProvider();
        laws.put(Stage.TANGENTIAL, friction.create(ParameterValues.of(friction, Map.of())));
        return new Simulation(
                new Model(
                        dry.materials(),
                        dry.lots(),
                        dry.grains(),
                        dry.structure(),
                        dry.materialOfBody(),
                        dry.walls(),
                        dry.fields(),
                        new LawSet(laws, dry.materials()),
                        dry.feeds(),
                        dry.exits(),
                        dry.steps()),
                team);
    }

    @Test
    void resumedRunEndsWithTheSameBits() throws IOException {
        String whole;
        CheckpointFolder checkpoints = CheckpointFolder.create(folder);
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = sticky(team);
            run.begin();
            steps(run, BEFORE);
            CheckpointWriter writer =
                    new CheckpointWriter(new CheckpointHeader("test", "0123", run.stepCount(), run.time(), Map.of()));
            for (Persistent owner : run.persistents()) {
                writer.save(owner);
            }
            checkpoints.write(writer);
            steps(run, AFTER);
            whole = StateDigest.of(run);
        }
        try (WorkerTeam team = new WorkerTeam(1);
                CheckpointReader reader = CheckpointFolder.latest(folder).reader()) {
            Simulation resumed = sticky(team);
            for (Persistent owner : resumed.persistents()) {
                reader.restore(owner);
            }
            steps(resumed, AFTER);
            assertThat(StateDigest.of(resumed)).isEqualTo(whole);
        }
    }

    private static void steps(Simulation run, int count) {
        for (int k = 0; k < count; k++) {
            run.step();
        }
    }

    /** Prints the digest on one thread. */
    public static void main(String[] arguments) {
        System.out.println(digest(1, Integer.parseInt(arguments[0])));
    }
}
