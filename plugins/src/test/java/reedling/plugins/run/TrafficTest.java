// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
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
import reedling.plugins.Rig;
import reedling.run.Exits;
import reedling.run.Simulation;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/** Grains that rain onto a chute and leave through an outlet: counts, masses and energies. */
class TrafficTest {

    private static final double FIRST = 0.011; // s, when the feed begins

    private static Rig chute(int stepsPerContact, double speed, double rate, double width) {
        Rig rig = new Rig()
                .material(new Material("grain", 1300, 2e7, 0.3), 0.6, 0.2, 0.01)
                .gravity(0, 0, -9.81)
                .stepsPerContact(stepsPerContact);
        rig.wall(new Wall(
                "chute", 0, new HalfSpace(), Placement.facing(new Vector3d(), new Vector3d(1, 0, 1)), new Still()));
        double far = 10;
        Exits.Outlet outlet = new Exits.Outlet("below", new double[] {-far, -far, -far, far, far, -0.1});
        rig.exits(new Exits(List.of(outlet), new double[] {-far, -far, -far, far, far, far}));
        LotMix mix =
                new LotMix(List.of(new LotShare(new Lot("all", 0, new UniformSize(0.003, 0.005)), 1)), rig.table());
        Rain plan = new Rain(
                "rain",
                mix,
                new BoxRegion(new Vector3d(0.002, -0.02, 0.004), new Vector3d(width, 0.02, width)),
                new FeedRate(FeedRate.Measure.COUNT, rate, 200, FIRST, Double.POSITIVE_INFINITY),
                new Launch(new Vector3d(0, 0, -speed), 0.05, 20));
        return rig.feed(new RainFeed(plan, new RandomStream(4)));
    }

    /** The gap of the balance stays within 2 / N^2 although energy comes and goes with the grains. */
    @ParameterizedTest
    @Tag("conservation")
    @ValueSource(ints = {15, 30})
    void energyOfGrainsThatComeAndGoIsBooked(int number) {
        Rig rig = chute(number, 0.5, 2000, 0.04).reportEvery(10);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 0.28 || run.stepCount() % 10 != 1) {
                run.step();
            }
            assertThat(run.passage().fedCount()).isEqualTo(200);
            assertThat(run.passage().outCount()).isGreaterThan(100);
            assertThat(run.passage().fedCount() - run.passage().outCount())
                    .isEqualTo(rig.grains().count());
            double inside = 0;
            for (int g = 0; g < rig.grains().count(); g++) {
                inside += rig.grains().mass(g);
            }
            assertThat(run.passage().fedMass(0) - run.passage().outMass(0, 0)).isCloseTo(inside, within(1e-12));
            assertThat(Math.abs(run.ledger().relativeResidual())).isLessThan(2.0 / (number * number));
        }
    }

    /** The first grains come fast into an empty run, whose steps nothing has limited so far. */
    @Test
    void fastGrainsIntoAnEmptyRunDoNotJumpIntoTheWall() {
        Rig rig = chute(20, 12, 500, 0.01).reportEvery(1).margin(2e-3);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.passage().fedCount() == 0) {
                run.step();
            }
            while (run.time() < FIRST + 0.01) {
                run.step();
                for (int g = 0; g < rig.grains().count(); g++) {
                    double gap = (rig.grains().position(g, 0) + rig.grains().position(g, 2)) / Math.sqrt(2);
                    assertThat(gap)
                            .as("grain over the chute")
                            .isGreaterThan(0.7 * rig.grains().radius(g));
                }
            }
            assertThat(run.ledger().dissipated()).isPositive();
            assertThat(Math.abs(run.ledger().relativeResidual())).isLessThan(2.0 / (20 * 20));
        }
    }
}
