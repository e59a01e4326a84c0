// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.checkpoint.CheckpointFolder;
import reedling.checkpoint.CheckpointHeader;
import reedling.checkpoint.CheckpointReader;
import reedling.checkpoint.CheckpointWriter;
import reedling.checkpoint.Persistent;
import reedling.error.ReedlingException;
import reedling.feed.BoxRegion;
import reedling.feed.FeedRate;
import reedling.feed.Launch;
import reedling.feed.LotMix;
import reedling.feed.LotShare;
import reedling.feed.Rain;
import reedling.feed.RainFeed;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.particle.Lot;
import reedling.particle.RandomStream;
import reedling.particle.UniformSize;
import reedling.plugins.Momentum;
import reedling.plugins.Rig;
import reedling.run.Exits;
import reedling.run.MidpointTally;
import reedling.run.Simulation;
import reedling.run.StateDigest;
import reedling.wall.HalfSpace;
import reedling.wall.Oscillating;
import reedling.wall.Placement;
import reedling.wall.Stroke;
import reedling.wall.Timing;
import reedling.wall.Wall;

/** Runs by the midpoint rule: against explicit steps, conservation, same bits, feeds and exits, resuming. */
class MidpointRunTest {

    @TempDir
    Path folder;

    /** Eleven grains that fly at one another, collide with friction, and fly apart for good. */
    private static Rig burst(int stepsPerContact) {
        SplittableRandom random = new SplittableRandom(5);
        Rig rig = new Rig()
                .material(new Material("grain", 2000, 5e6, 0.3), 0.7, 0.4, 0.03)
                .stepsPerContact(stepsPerContact);
        for (int k = 0; k < 11; k++) {
            double[] way = new double[3];
            double[] spin = new double[3];
            double squared = 0;
            for (int axis = 0; axis < 3; axis++) {
                way[axis] = random.nextDouble(-1, 1);
                spin[axis] = random.nextDouble(-200, 200);
                squared += way[axis] * way[axis];
            }
            double scale = 0.008 / Math.sqrt(squared);
            double[] centre = {scale * way[0], scale * way[1], scale * way[2]};
            double[] velocity = {-100 * centre[0], -100 * centre[1], -100 * centre[2]};
            boolean free = true;
            for (int g = 0; g < rig.grains().count(); g++) {
                double gap = 0;
                for (int axis = 0; axis < 3; axis++) {
                    gap += Math.pow(rig.grains().position(g, axis) - centre[axis], 2);
                }
                free &= gap > 0.0031 * 0.0031;
            }
            if (free) {
                rig.grain(0, 0.0015, centre, velocity, spin);
            }
        }
        return rig;
    }

    /** Velocities and spins times radius of all grains by id when they have flown apart, m/s. */
    private static double[] after(Rig rig) {
        double[] all = new double[6 * rig.grains().count()];
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 0.03) {
                run.step();
            }
            assertThat(run.ledger().dissipated())
                    .isGreaterThan(0.05 * run.ledger().throughput());
        }
        for (int id = 0; id < rig.grains().count(); id++) {
            System.arraycopy(rig.velocity(id), 0, all, 6 * id, 3);
            for (int axis = 0; axis < 3; axis++) {
                all[6 * id + 3 + axis] = 0.0015 * rig.spin(id)[axis];
            }
        }
        return all;
    }

    private static double distance(double[] a, double[] b) {
        double squared = 0;
        for (int k = 0; k < a.length; k++) {
            squared += (a[k] - b[k]) * (a[k] - b[k]);
        }
        return Math.sqrt(squared / a.length);
    }

    /** Two methods that share neither start nor end of a step meet as steps shrink; the speed of approach is 0.8 m/s. */
    @Test
    @Tag("convergence")
    void explicitAndMidpointMeetAsStepsShrink() {
        double[] apart = new double[3];
        for (int k = 0; k < 3; k++) {
            int number = 40 << 2 * k;
            apart[k] = distance(after(burst(number)), after(burst(number).midpoint(0.5, 1e-8)));
        }
        assertThat(apart[0]).isBetween(1e-6, 0.008);
        assertThat(apart[1]).isLessThan(apart[0] / 3);
        assertThat(apart[2]).isLessThan(apart[1] / 3);
    }

    /** Rows are opposite, and x1 x v1 - x0 x v0 = x_m x (v1 - v0) at the middle where they act: 1e-12 for round-off. */
    @Test
    @Tag("conservation")
    void momentumAndAngularMomentumStay() {
        Rig rig = GrainCloudTest.cloud(3, 0.6).midpoint(0.5, 1e-8);
        Momentum before = Momentum.of(rig.grains());
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = rig.start(team);
            while (run.stepCount() < 200) {
                run.step();
            }
            assertThat(run.ledger().dissipated()).isPositive();
            assertThat(Momentum.of(rig.grains()).largestChange(before)).isLessThan(1e-12);
        }
    }

    /** Residual of the balance over the throughput: half of what explicit steps are held to, 2 / N^2. */
    @ParameterizedTest
    @Tag("convergence")
    @ValueSource(ints = {15, 30, 60})
    void balanceOfACloudCloses(int stepsPerContact) {
        for (long seed = 7; seed < 11; seed++) {
            assertThat(Math.abs(residual(seed, stepsPerContact)))
                    .as("seed %d", seed)
                    .isLessThan(1.0 / (stepsPerContact * stepsPerContact));
        }
    }

    private static double residual(long seed, int stepsPerContact) {
        Rig rig =
                GrainCloudTest.cloud(seed, 0.7).stepsPerContact(stepsPerContact).midpoint(0.5, 1e-6);
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = rig.start(team);
            while (run.time() < 3e-3) {
                run.step();
            }
            return run.ledger().relativeResidual();
        }
    }

    @Test
    @Tag("conservation")
    void threadsDoNotChangeABit() {
        String one = digest(1);
        assertThat(digest(2)).isEqualTo(one);
        assertThat(digest(3)).isEqualTo(one);
    }

    private static String digest(int threads) {
        Rig rig = GrainCloudTest.cloud(3, 0.6).midpoint(0.5, 1e-8);
        try (WorkerTeam team = new WorkerTeam(threads)) {
            Simulation run = rig.start(team);
            while (run.stepCount() < 150) {
                run.step();
            }
            assertThat(run.interactions().lists().chunks().size()).isGreaterThan(2);
            return StateDigest.of(run);
        }
    }

    /** Rain on a sloping plate that shakes; grains leave below. */
    private static Rig shakenPlate(int stepsPerContact) {
        Rig rig = new Rig()
                .material(new Material("grain", 1300, 2e6, 0.3), 0.5, 0.3, 0.02)
                .gravity(0, 0, -9.81)
                .stepsPerContact(stepsPerContact)
                .maximumStep(1e-4)
                .midpoint(0.5, 1e-8);
        rig.wall(new Wall(
                "plate",
                0,
                new HalfSpace(),
                Placement.facing(new Vector3d(), new Vector3d(0.6, 0, 1)),
                Oscillating.harmonic(new Stroke(new Vector3d(0, 0, 1), 1e-3, 0), 25, Timing.always())));
        double far = 10;
        Exits.Outlet outlet = new Exits.Outlet("below", new double[] {-far, -far, -far, far, far, -0.02});
        rig.exits(new Exits(List.of(outlet), new double[] {-far, -far, -far, far, far, far}));
        LotMix mix =
                new LotMix(List.of(new LotShare(new Lot("all", 0, new UniformSize(0.003, 0.005)), 1)), rig.table());
        Rain plan = new Rain(
                "rain",
                mix,
                new BoxRegion(new Vector3d(0, -0.01, 0.01), new Vector3d(0.02, 0.01, 0.02)),
                new FeedRate(FeedRate.Measure.COUNT, 1000, 60, 0, Double.POSITIVE_INFINITY),
                new Launch(new Vector3d(0, 0, -0.3), 0.05, 20));
        return rig.feed(new RainFeed(plan, new RandomStream(4)));
    }

    /** What feeds, walls, friction and gravity bring and take is booked: gap within 4 / N^2. */
    @ParameterizedTest
    @Tag("convergence")
    @ValueSource(ints = {10, 20})
    void balanceOfAShakenPlateCloses(int stepsPerContact) {
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = shakenPlate(stepsPerContact).start(team);
            while (run.time() < 0.25) {
                run.step();
            }
            MidpointTally tally = run.midpoint().orElseThrow();
            assertThat(run.passage().outCount()).isGreaterThan(10);
            assertThat(Math.abs(run.ledger().relativeResidual())).isLessThan(4.0 / (stepsPerContact * stepsPerContact));
            assertThat(tally.meanIterations()).isBetween(1.0, 12.0);
            assertThat(tally.steps()).isEqualTo(run.stepCount());
        }
    }

    @Test
    void resumedRunEndsWithTheSameBits() throws IOException {
        String whole;
        double iterations;
        CheckpointFolder checkpoints = CheckpointFolder.create(folder);
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = shakenPlate(12).start(team);
            steps(run, 900);
            CheckpointWriter writer =
                    new CheckpointWriter(new CheckpointHeader("test", "0123", run.stepCount(), run.time(), Map.of()));
            for (Persistent owner : run.persistents()) {
                writer.save(owner);
            }
            checkpoints.write(writer);
            steps(run, 900);
            assertThat(run.passage().fedCount()).isGreaterThan(20);
            assertThat(run.searches()).isGreaterThan(5);
            whole = StateDigest.of(run);
            iterations = run.midpoint().orElseThrow().meanIterations();
        }
        try (WorkerTeam team = new WorkerTeam(1);
                CheckpointReader reader = CheckpointFolder.latest(folder).reader()) {
            Simulation resumed = shakenPlate(12).simulation(team);
            for (Persistent owner : resumed.persistents()) {
                reader.restore(owner);
            }
            steps(resumed, 900);
            assertThat(StateDigest.of(resumed)).isEqualTo(whole);
            assertThat(resumed.midpoint().orElseThrow().meanIterations()).isEqualTo(iterations);
        }
    }

    private static void steps(Simulation run, int count) {
        for (int k = 0; k < count; k++) {
            run.step();
        }
    }

    @Test
    void partsThatBendAreRefused() {
        Rig rig = new Rig()
                .material(new Material("grain", 1300, 2e6, 0.3), 0.5, 0.3, 0.02)
                .structure(RainDeck.still().structure(), 0, 0, 0, 0, 0, 0)
                .midpoint(0.5, 1e-8);
        try (WorkerTeam team = new WorkerTeam(1)) {
            assertThatThrownBy(() -> rig.start(team))
                    .isInstanceOf(ReedlingException.class)
                    .hasMessageContaining("use the explicit integrator");
        }
    }
}
