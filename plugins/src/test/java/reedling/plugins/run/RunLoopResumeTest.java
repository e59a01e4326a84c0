// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.checkpoint.CheckpointFolder;
import reedling.checkpoint.CheckpointReader;
import reedling.output.RunFolder;
import reedling.output.WriteQueue;
import reedling.parallel.WorkerTeam;
import reedling.probe.SizePassage;
import reedling.run.Progress;
import reedling.run.RunLoop;
import reedling.run.RunOutput;
import reedling.run.RunPlan;
import reedling.run.RunProbes;
import reedling.run.Simulation;
import reedling.run.StateOwners;
import reedling.run.StopFlag;

/** What was measured goes on from a checkpoint as if the run had never stopped. */
class RunLoopResumeTest {

    private static final RunPlan PLAN = RainDeck.plan(0.2, 0.05);
    private static final StateOwners NO_ENGINE = List::of;

    @TempDir
    Path folder;

    private double[] figures(RunProbes probes) {
        SizePassage sizes = probes.sizes();
        return IntStream.range(0, RainDeck.WIRES)
                .boxed()
                .flatMap(wire -> java.util.stream.Stream.of(
                        probes.wireLoads().rangeUpper(wire),
                        probes.wireLoads().rangeLower(wire),
                        probes.wireLoads().window().sag(wire),
                        probes.wireLoads().interval().contactForce(wire),
                        probes.wallLoads().largestEver(wire % 2),
                        probes.overlaps().pairs().percentile(0.99),
                        probes.overlaps().wires().percentile(0.999),
                        probes.steps().mean(),
                        (double) probes.steps().steps(),
                        probes.deck().orElseThrow().opening().changes().percentile(0.9),
                        sizes.leftMass(wire, 0, 0),
                        sizes.leftMass(wire, 1, 1),
                        sizes.fedMass(wire, 1)))
                .mapToDouble(Double::doubleValue)
                .toArray();
    }

    /** Runs a loop to a time and gives what it measured. */
    private double[] runTo(double time) throws IOException {
        try (WorkerTeam team = new WorkerTeam(1);
                RunFolder run = RunFolder.create(folder.resolve("run"));
                WriteQueue queue = new WriteQueue(2)) {
            Simulation simulation = new Simulation(RainDeck.shaken().model(), team);
            simulation.begin();
            RunOutput output =
                    new RunOutput(run, queue, List.of(), CheckpointFolder.create(run.path()), Progress.SILENT);
            try (RunLoop loop = new RunLoop(simulation, PLAN, output, NO_ENGINE, new StopFlag(), Double.NaN)) {
                loop.run(time);
                return figures(loop.probes());
            }
        }
    }

    @Test
    void whatWasMeasuredIsRestoredAndLaterRowsAreCut() throws IOException {
        double[] measured = runTo(0.16);
        Path rows = folder.resolve("run/ledger.csv");
        List<String> whole = Files.readAllLines(rows);
        Files.writeString(
                rows,
                String.join("\n", whole) + "\n0.17,1,2,3,4,5,6,7,8,9\n0.18,1,2",
                java.nio.charset.StandardCharsets.UTF_8);
        try (WorkerTeam team = new WorkerTeam(1);
                CheckpointReader reader =
                        CheckpointFolder.latest(folder.resolve("run")).reader();
                RunFolder run = RunFolder.resume(folder.resolve("run"));
                WriteQueue queue = new WriteQueue(2)) {
            Simulation simulation = new Simulation(RainDeck.shaken().model(), team);
            RunOutput output = new RunOutput(
                    run, queue, List.of(), CheckpointFolder.resume(run.path(), reader.file()), Progress.SILENT);
            try (RunLoop loop = new RunLoop(
                    simulation,
                    PLAN,
                    output,
                    NO_ENGINE,
                    new StopFlag(),
                    reader.header().time())) {
                assertThat(figures(loop.probes())).isNotEqualTo(measured);
                loop.restore(reader);
                double[] restored = figures(loop.probes());
                // the last row began a new interval after the checkpoint was taken; all else is the same
                assertThat(restored).hasSameSizeAs(measured);
                for (int k = 0; k < restored.length; k++) {
                    if (k % 13 != 3) {
                        assertThat(restored[k]).as("figure " + k).isEqualTo(measured[k]);
                    }
                }
                assertThat(reader.header().caseDigest()).isEqualTo("0123");
            }
        }
        assertThat(Files.readAllLines(rows)).isEqualTo(whole);
    }
}
