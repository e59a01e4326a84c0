// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Map;
import java.util.SplittableRandom;
import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.checkpoint.CheckpointFolder;
import reedling.checkpoint.CheckpointHeader;
import reedling.checkpoint.CheckpointReader;
import reedling.checkpoint.CheckpointWriter;
import reedling.checkpoint.Persistent;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.run.StateDigest;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/** A run in a gas and a magnetic field, resumed from a checkpoint on other threads, ends with the bits of one that never stopped. */
@Tag("conservation")
class FieldResumeTest {

    private static final int BEFORE = 500;
    private static final int AFTER = 700;

    @TempDir
    Path folder;

    private static Rig scene() {
        Rig rig = new Rig()
                .material(new Material("seed", 1200, 1e7, 0.3), 0.6, 0.4, 0.03)
                .gravity(0, 0, -9.81)
                .field(FreeFlight.gas(
                        Map.of("velocity_x", 3.0, "swing", 0.3, "swing_frequency", 50.0),
                        Map.of("lift", "constant", "spin_damping", "stokes")))
                .field(FreeFlight.charged(Map.of("magnetic_y", 2.0, "charge_per_mass", 5.0)))
                .wall(new Wall(
                        "floor",
                        0,
                        new HalfSpace(),
                        Placement.facing(new Vector3d(), new Vector3d(0, 0, 1)),
                        new Still()))
                .reportEvery(7);
        SplittableRandom random = new SplittableRandom(5);
        for (int k = 0; k < 400; k++) {
            double[] centre = {k % 8 * 0.0065, k / 8 % 8 * 0.0065, 0.004 + k / 64 * 0.0065};
            double[] spin = {random.nextDouble(-50, 50), random.nextDouble(-50, 50), random.nextDouble(-50, 50)};
            rig.grain(0, random.nextDouble(0.0025, 0.003), centre, new double[] {0, 0, -1}, spin);
        }
        return rig;
    }

    private static void steps(Simulation run, int count) {
        for (int k = 0; k < count; k++) {
            run.step();
        }
    }

    @Test
    void resumedRunEndsWithTheSameBits() throws IOException {
        String whole;
        double work;
        CheckpointFolder checkpoints = CheckpointFolder.create(folder);
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = scene().start(team);
            steps(run, BEFORE);
            CheckpointWriter writer =
                    new CheckpointWriter(new CheckpointHeader("test", "0123", run.stepCount(), run.time(), Map.of()));
            for (Persistent owner : run.persistents()) {
                writer.save(owner);
            }
            checkpoints.write(writer);
            steps(run, AFTER);
            whole = StateDigest.of(run);
            work = run.ledger().fieldWork();
            assertThat(run.interactions().lists().chunks().size()).isGreaterThan(1);
            assertThat(work).isNotZero();
        }
        try (WorkerTeam team = new WorkerTeam(1);
                CheckpointReader reader = CheckpointFolder.latest(folder).reader()) {
            Simulation resumed = new Simulation(scene().start(team).model(), team);
            for (Persistent owner : resumed.persistents()) {
                reader.restore(owner);
            }
            steps(resumed, AFTER);
            assertThat(StateDigest.of(resumed)).isEqualTo(whole);
            assertThat(resumed.ledger().fieldWork()).isEqualTo(work);
        }
    }
}
