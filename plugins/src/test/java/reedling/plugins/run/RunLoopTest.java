// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.checkpoint.CheckpointFolder;
import reedling.checkpoint.CheckpointReader;
import reedling.error.ExitCode;
import reedling.error.ReedlingException;
import reedling.output.RunFolder;
import reedling.output.SnapshotFrame;
import reedling.output.SnapshotFrame.NamedArray;
import reedling.output.WriteQueue;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.run.Model;
import reedling.run.ProgressText;
import reedling.run.RunLoop;
import reedling.run.RunOutput;
import reedling.run.RunPlan;
import reedling.run.Simulation;
import reedling.run.StateDigest;
import reedling.run.StateOwners;
import reedling.run.StopFlag;

class RunLoopTest {

    @TempDir
    Path folder;

    private final List<SnapshotFrame> frames = new ArrayList<>();
    private final ByteArrayOutputStream progress = new ByteArrayOutputStream();
    private final StopFlag stop = new StopFlag();
    private StateOwners owners = List::of;
    private Consumer<SnapshotFrame> onFrame = frame -> {};

    private record Ended(RunLoop.Outcome outcome, String digest, String summary) {}

    /** Begins a simulation, lets something happen to it, and runs it. */
    private Ended run(Model model, RunPlan plan, Runnable before) throws IOException {
        PrintStream out = new PrintStream(progress, true, StandardCharsets.UTF_8);
        try (WorkerTeam team = new WorkerTeam(2);
                RunFolder run = RunFolder.create(folder.resolve("run"));
                WriteQueue queue = new WriteQueue(3)) {
            Simulation simulation = new Simulation(model, team);
            simulation.begin();
            before.run();
            RunOutput output = new RunOutput(
                    run,
                    queue,
                    List.of(frame -> {
                        frames.add(frame);
                        onFrame.accept(frame);
                    }),
                    CheckpointFolder.create(run.path()),
                    new ProgressText(out, false, 80, System::nanoTime));
            try (RunLoop loop = new RunLoop(simulation, plan, output, owners, stop, Double.NaN)) {
                RunLoop.Outcome outcome = loop.run();
                return new Ended(outcome, StateDigest.of(simulation), loop.summary());
            }
        }
    }

    private List<String> lines(String file) throws IOException {
        return Files.readAllLines(folder.resolve("run").resolve(file));
    }

    private static double[] row(String line) {
        List<Double> values = new ArrayList<>();
        for (String cell : line.split(",", -1)) {
            values.add(cell.isEmpty() ? Double.NaN : Double.parseDouble(cell));
        }
        return values.stream().mapToDouble(Double::doubleValue).toArray();
    }

    @Test
    void writesWhatIsDueAndNeverChangesAStep() throws IOException {
        Ended ended = run(RainDeck.shaken().model(), RainDeck.plan(0.15, 0.05), () -> {});

        assertThat(ended.outcome).isEqualTo(RunLoop.Outcome.FINISHED);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation bare = new Simulation(RainDeck.shaken().model(), team);
            bare.begin();
            while (bare.time() < 0.15) {
                bare.step();
            }
            assertThat(StateDigest.of(bare)).isEqualTo(ended.digest);
        }
        assertThat(lines("passage.csv")).hasSize(1 + 16); // at 0, 0.01 ... 0.15
        assertThat(lines("wires.csv")).hasSize(1 + 16 * RainDeck.WIRES);
        assertThat(frames).hasSize(9); // at 0, 0.02 ... 0.14, and the end
        double[] second = row(lines("ledger.csv").get(2));
        assertThat(second[0]).isBetween(0.01, 0.0111);
        assertThat(lines("run.json")).anyMatch(line -> line.contains("\"state_digest\": \"" + ended.digest + "\""));
        assertThat(Files.list(folder.resolve("run"))
                        .map(file -> file.getFileName().toString()))
                .contains("checkpoint_000003.rck", "checkpoint_000002.rck", "walls.csv", "steps.csv", "partition.csv");
    }

    @Test
    void framesHoldTheNamedArraysInOrderOfIds() throws IOException {
        run(RainDeck.shaken().model(), RainDeck.plan(0.1, 0.05), () -> {});
        SnapshotFrame last = frames.getLast();
        assertThat(last.grains().fields())
                .extracting(NamedArray::name)
                .containsExactly("radius [m]", "velocity [m/s]", "spin [rad/s]", "lot", "material", "id", "pegged");
        int[] ids = ((NamedArray.Ints) last.grains().fields().get(5)).values();
        assertThat(ids).isSorted().hasSizeGreaterThan(20);
        SnapshotFrame.LineMesh wires = last.structures().getFirst();
        assertThat(wires.pointFields())
                .extracting(NamedArray::name)
                .containsExactly("displacement [m]", "velocity [m/s]");
        assertThat(wires.cellFields())
                .extracting(NamedArray::name)
                .containsExactly(
                        "axial force [N]", "bending moment [N m]", "max fibre stress [Pa]", "radius [m]", "body");
        float[] displacement = ((NamedArray.Floats) wires.pointFields().getFirst()).values();
        float[] axial = ((NamedArray.Floats) wires.cellFields().getFirst()).values();
        for (int end : new int[] {0, 16}) {
            assertThat(displacement[3 * end + 2]).isCloseTo(0, within(1e-9f)); // the deck itself moves by millimetres
        }
        for (float force : axial) {
            assertThat(force).isCloseTo((float) RainDeck.TENSION, within(4f));
        }
    }

    @Test
    void passageAddsUpToWhatWasFed() throws IOException {
        run(RainDeck.shaken().model(), RainDeck.plan(0.25, 0.05), () -> {});
        List<String> lines = lines("passage.csv");
        assertThat(lines.getFirst())
                .startsWith("time [s],vetch: mass fed [kg],vetch: mass in the run [kg],"
                        + "vetch: mass out at below [kg],vetch: mass out at end [kg],vetch: mass spilled [kg]");
        double[] last = row(lines.getLast());
        for (int lot = 0; lot < 2; lot++) {
            int at = 1 + 7 * lot;
            assertThat(last[at]).isPositive();
            assertThat(last[at + 1] + last[at + 2] + last[at + 3] + last[at + 4])
                    .isCloseTo(last[at], within(1e-15));
            assertThat(last[at + 2] + last[at + 3]).isPositive();
        }
        long passed = 0;
        for (String line :
                lines("partition.csv").subList(1, lines("partition.csv").size())) {
            passed += (long) row(line)[1];
        }
        assertThat(passed).isPositive();
    }

    @Test
    void summaryIsPlainAsciiInEightyColumnsWithTheFiveFigures() throws IOException {
        Ended ended = run(RainDeck.shaken().model(), RainDeck.plan(0.25, 0.1), () -> {});
        assertThat(lines("summary.txt")).isEqualTo(ended.summary.lines().toList());
        assertThat(ended.summary.lines()).allMatch(line -> line.length() <= 80);
        assertThat(ended.summary.chars()).allMatch(c -> c == '\n' || c >= ' ' && c < 127);
        assertThat(ended.summary)
                .contains(
                        "1 undersize recovery",
                        "2 good product lost",
                        "3 open area pegged",
                        "4 worst stress range",
                        "5 trust in figure 1",
                        "10 of 10 batches",
                        "(duty: at least 90.0 %)",
                        "A caution.");
        assertThat(ended.summary.replaceAll("\\s+", " ")).contains("licensed engineer under local codes");
        assertThat(ended.summary).doesNotContain("NaN");
        assertThat(progress.toString(StandardCharsets.UTF_8).lines()).hasSizeBetween(9, 20);
    }

    @Test
    void aRunWithoutAScreenReportsCountsLoadsAndTrust() throws IOException {
        RunPlan plan = new RunPlan(0.02, RunPlan.Intervals.NEVER, Optional.empty(), RainDeck.identity());
        Ended ended = run(RainDeck.shaken().model(), plan, () -> {});
        assertThat(ended.summary)
                .contains("Loads of wires", "Trust", "vetch: fed")
                .doesNotContain("undersize recovery", "pegged", "NaN");
    }

    @Test
    void aShortRunSaysSo() throws IOException {
        Ended ended = run(RainDeck.shaken().model(), RainDeck.plan(0.02, 0.019), () -> stop.raise());
        assertThat(ended.outcome).isEqualTo(RunLoop.Outcome.STOPPED);
        assertThat(ended.summary).contains("RUN TOO SHORT").doesNotContain("NaN");
        assertThat(lines("run.json")).anyMatch(line -> line.contains("\"status\": \"stopped\""));
        assertThat(folder.resolve("run/checkpoint_000001.rck")).exists();
    }

    /** Grains of 5 MPa on bending wires overlap by a tenth of what decides whether they pass. */
    @Test
    void softeningAndTheLedgerAreJudgedInPlainWords() throws IOException {
        Ended ended = run(RainDeck.shaken().model(), RainDeck.plan(0.15, 0.05), () -> {});
        assertThat(ended.summary.replaceAll("\\s+", " "))
                .contains("Softening decides for lot peas", "Repeat with four times the modulus", "is expected (good)");
    }

    @Test
    void aStopEndsTheRunAfterItsStepWithACheckpoint() throws IOException {
        RunPlan plan = RainDeck.plan(5, 0.05);
        onFrame = frame -> {
            if (frame.time() > 0.03) {
                stop.raise();
            }
        };
        Ended ended = run(RainDeck.shaken().model(), plan, () -> {});
        assertThat(ended.outcome).isEqualTo(RunLoop.Outcome.STOPPED);
        double last = row(lines("steps.csv").getLast())[0];
        assertThat(last).isBetween(0.04, 4.9);
        try (CheckpointReader reader =
                CheckpointFolder.latest(folder.resolve("run")).reader()) {
            assertThat(reader.header().time()).isEqualTo(last);
        }
    }

    @Test
    void aWriterThatFailsEndsTheRunAndTheRecordSaysSo() {
        onFrame = frame -> {
            throw new java.io.UncheckedIOException(new IOException("disk full"));
        };
        assertThatThrownBy(() -> run(RainDeck.shaken().model(), RainDeck.plan(0.5, 0.05), () -> {}))
                .isInstanceOf(ReedlingException.class)
                .hasMessageContaining("snapshot");
        assertThat(folder.resolve("run/run.json")).content().contains("\"status\": \"failed: ", "disk full");
    }

    /** A grain falls freely; what makes it fail happens while the first checkpoint is taken. */
    @Test
    void aGuardFailureLeavesTheFolderReadableWithTheLastGoodCheckpoint() throws IOException {
        Model model =
                RainDeck.still().feeding(0).grain(0.03, 0.0185, 0.19, 3e-3).model();
        owners = () -> {
            model.grains().rows()[GrainRow.at(0) + GrainRow.V] = Double.NaN;
            return List.of();
        };
        assertThatThrownBy(() -> run(model, RainDeck.plan(0.1, 0.05), () -> {}))
                .isInstanceOfSatisfying(
                        ReedlingException.class,
                        failure -> assertThat(failure.exitCode()).isEqualTo(ExitCode.GUARD));
        assertThat(folder.resolve("run/run.json")).content().contains("\"status\": \"failed: ", "grain 0");
        assertThat(folder.resolve("run/run.log")).content().contains("failed at");
        assertThat(lines("passage.csv")).hasSize(1 + 6); // at 0, 0.01 ... 0.05
        try (CheckpointReader reader =
                CheckpointFolder.latest(folder.resolve("run")).reader()) {
            assertThat(reader.header().time()).isBetween(0.05, 0.0511);
        }
    }
}
