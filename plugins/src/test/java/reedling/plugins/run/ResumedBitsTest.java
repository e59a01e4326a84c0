// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.checkpoint.CheckpointFolder;
import reedling.checkpoint.CheckpointHeader;
import reedling.checkpoint.CheckpointReader;
import reedling.checkpoint.CheckpointWriter;
import reedling.checkpoint.Persistent;
import reedling.parallel.WorkerTeam;
import reedling.run.Simulation;
import reedling.run.StateDigest;

/** A run resumed from a checkpoint, with other threads, ends with the bits of one that never stopped. */
class ResumedBitsTest {

    private static final int BEFORE = 3000;
    private static final int AFTER = 4000;

    @TempDir
    Path folder;

    @Test
    void resumedRunEndsWithTheSameBits() throws IOException {
        String whole;
        CheckpointFolder checkpoints = CheckpointFolder.create(folder);
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = new Simulation(RainDeck.shaken().model(), team);
            run.begin();
            steps(run, BEFORE);
            CheckpointWriter writer =
                    new CheckpointWriter(new CheckpointHeader("test", "0123", run.stepCount(), run.time(), Map.of()));
            for (Persistent owner : run.persistents()) {
                writer.save(owner);
            }
            checkpoints.write(writer);
            steps(run, AFTER);
            assertThat(run.searches()).isGreaterThan(10);
            assertThat(run.passage().fedCount()).isGreaterThan(20);
            whole = StateDigest.of(run);
        }
        try (WorkerTeam team = new WorkerTeam(1);
                CheckpointReader reader = CheckpointFolder.latest(folder).reader()) {
            Simulation resumed = new Simulation(RainDeck.shaken().model(), team);
            for (Persistent owner : resumed.persistents()) {
                reader.restore(owner);
            }
            assertThat(resumed.stepCount()).isEqualTo(BEFORE);
            steps(resumed, AFTER);
            assertThat(StateDigest.of(resumed)).isEqualTo(whole);
        }
    }

    private static void steps(Simulation run, int count) {
        for (int k = 0; k < count; k++) {
            run.step();
        }
    }
}
