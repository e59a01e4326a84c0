// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.contact.Column;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.parallel.WorkerTeam;
import reedling.plugin.ParameterValues;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/**
 * Adhesion by a constant force F_c = 2 pi w R* (Derjaguin, Muller and Toporov, 1975) on a Hertz contact, F = k d^(3/2):
 * pull-off, rest, and impacts, whose energy is 1/2 m v^2 = 2/5 k d^(5/2) - F_c d at the deepest point.
 */
@Tag("reference")
class DmtAdhesionTest {

    private static final Material GRAIN = new Material("grain", 2500, 1e8, 0.3);
    private static final double RADIUS = 1e-4;
    private static final double MASS = 2500 * 4.0 / 3 * Math.PI * RADIUS * RADIUS * RADIUS;
    private static final double HERTZ = 4.0 / 3 * 1e8 / (1 - 0.3 * 0.3) * Math.sqrt(RADIUS);
    private static final double ADHESION = 0.02;
    private static final double PULL_OFF = 2 * Math.PI * ADHESION * RADIUS;

    private static ContactLaw law(double workOfAdhesion) {
        DmtAdhesionProvider provider = new DmtAdhesionProvider();
        return provider.create(ParameterValues.of(provider, Map.of("work_of_adhesion", workOfAdhesion)));
    }

    private static Rig sticky(double restitution, double friction, int stepsPerContact) {
        return new Rig()
                .material(GRAIN, restitution, friction, 0)
                .material(Impact.RIGID, restitution, friction, 0)
                .law(Stage.ADHESION, law(ADHESION))
                .stepsPerContact(stepsPerContact)
                .margin(1e-5);
    }

    /** Deepest overlap of an elastic impact, by bisection of the energy balance. */
    private static double deepest(double speed) {
        double low = Math.pow(PULL_OFF / HERTZ, 2.0 / 3);
        double high = RADIUS;
        while (high - low > 1e-15 * RADIUS) {
            double d = 0.5 * (low + high);
            double energy = 0.4 * HERTZ * d * d * Math.sqrt(d) - PULL_OFF * d;
            if (energy < 0.5 * MASS * speed * speed) {
                low = d;
            } else {
                high = d;
            }
        }
        return low;
    }

    /** 0.1 % on the overlap, 0.5 % on the speed: the force jumps between two of 500 steps. */
    @ParameterizedTest
    @ValueSource(doubles = {0.02, 0.1, 1})
    void elasticImpactGoesDeeperAndLosesNothing(double speed) {
        Rig rig = sticky(1, 0, 500);
        Impact impact = Impact.onPlane(rig, RADIUS, new double[] {speed, 0, 0}, Impact.REST, 1e-6 * speed);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Impact.Seen seen = impact.run(team);
            assertThat(seen.overlap()).isCloseTo(deepest(speed), within(1e-3 * deepest(speed)));
        }
        assertThat(-rig.velocity(impact.first())[0] / speed).isCloseTo(1, within(5e-3));
    }

    /** A grain under a plane: weight below F_c hangs at the overlap where k d^(3/2) = F_c - m g, a larger one tears off. */
    @ParameterizedTest
    @CsvSource({"0.5, true", "0.98, true", "1.02, false", "2, false"})
    void grainHangsUpToThePullOffForce(double load, boolean hangs) {
        double gravity = load * PULL_OFF / MASS;
        Rig rig = sticky(1, 0, 40).gravity(-gravity, 0, 0);
        rig.wall(new Wall(
                "plane", 1, new HalfSpace(), Placement.facing(new Vector3d(), new Vector3d(-1, 0, 0)), new Still()));
        double rest = Math.pow((PULL_OFF - Math.min(load, 0.98) * PULL_OFF) / HERTZ, 2.0 / 3);
        long grain = rig.grain(0, RADIUS, new double[] {-RADIUS + rest, 0, 0}, Impact.REST, Impact.REST);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 0.01) {
                run.step();
            }
            double overlap = RADIUS + rig.centre(grain)[0];
            if (hangs) {
                assertThat(overlap).isCloseTo(rest, within(1e-6 * rest)); // rounding of the position: 1e-16 / 1e-9
            } else {
                assertThat(overlap).isLessThan(-RADIUS);
            }
        }
    }

    /** A damped impact well below the speed that adhesion can hold sticks and comes to rest where k d^(3/2) = F_c. */
    @Test
    void slowDampedImpactSticks() {
        double rest = Math.pow(PULL_OFF / HERTZ, 2.0 / 3);
        double scale = Math.sqrt(PULL_OFF * rest / MASS);
        Rig rig = sticky(0.5, 0, 80);
        rig.wall(new Wall(
                "plane", 1, new HalfSpace(), Placement.facing(new Vector3d(), new Vector3d(-1, 0, 0)), new Still()));
        double[] velocity = {0.2 * scale, 0, 0};
        long grain = rig.grain(0, RADIUS, new double[] {-RADIUS - 1e-8, 0, 0}, velocity, Impact.REST);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 0.01) {
                run.step();
            }
            assertThat(RADIUS + rig.centre(grain)[0]).isCloseTo(rest, within(0.01 * rest));
            assertThat(Math.abs(rig.velocity(grain)[0])).isLessThan(1e-6 * scale);
        }
    }

    /**
     * Pulled along a wall that nothing presses it on but adhesion: friction is at most mu F_c. Below 7/2 mu F_c the grain
     * rolls with 5/7 of the acceleration, above it slides with what friction leaves (rigid sphere, textbook). 0.5 %: lever
     * shortened by the overlap, and the ring of the tangential spring.
     */
    @ParameterizedTest
    @CsvSource({"0.9, false", "1.3, true"})
    void frictionLimitCountsTheAdhesivePressure(double share, boolean slides) {
        double friction = 0.4;
        double limit = friction * PULL_OFF / MASS;
        double pull = share * 3.5 * limit;
        double expected = slides ? pull - limit : 5.0 / 7 * pull;
        Rig rig = sticky(0.3, friction, 40).gravity(0, pull, 0);
        rig.wall(new Wall(
                "plane", 1, new HalfSpace(), Placement.facing(new Vector3d(), new Vector3d(-1, 0, 0)), new Still()));
        double rest = Math.pow(PULL_OFF / HERTZ, 2.0 / 3);
        long grain = rig.grain(0, RADIUS, new double[] {-RADIUS + rest, 0, 0}, Impact.REST, Impact.REST);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 0.005) {
                run.step();
            }
            double speed = expected * (run.time() - 0.5 * run.pastStep());
            assertThat(rig.velocity(grain)[1]).isCloseTo(speed, within(5e-3 * speed));
        }
    }

    /** The rows themselves: force, load of the limits, energy, and nothing where there is a gap. */
    @Test
    void kernelAddsToWhatTheNormalLawWrote() {
        ContactKernel kernel = law(ADHESION).bind(new MaterialPair(GRAIN, GRAIN, 1, 0, 0), ContactKind.GRAIN_GRAIN, 1);
        RowTile tile = new RowTile(1)
                .set(Column.EFFECTIVE_RADIUS, RADIUS)
                .set(Column.OVERLAP, 1e-7)
                .set(Column.ELASTIC_FORCE, 3e-5);
        double energy = tile.apply(kernel, 1e-6);
        assertThat(tile.get(Column.ELASTIC_FORCE)).isCloseTo(3e-5 - PULL_OFF, within(1e-18));
        assertThat(tile.get(Column.ADHESIVE_LOAD)).isCloseTo(PULL_OFF, within(1e-18));
        assertThat(energy).isCloseTo(-PULL_OFF * 1e-7, within(1e-24));
        tile = new RowTile(1).set(Column.OVERLAP, -1e-9).set(Column.TOUCH, 0).set(Column.ELASTIC_FORCE, 0);
        assertThat(tile.apply(kernel, 1e-6)).isZero();
        assertThat(tile.get(Column.ELASTIC_FORCE)).isZero();
        assertThat(tile.get(Column.ADHESIVE_LOAD)).isZero();
        assertThat(tile.duration()).isInfinite();
    }

    /** Duration at rest: 4.030 / w, w^2 = 3/2 k d_0^(1/2) / m, the Hertz time of a contact at its resting overlap. */
    @Test
    void durationIsThatOfTheContactAtRest() {
        MaterialPair pair = new MaterialPair(GRAIN, Impact.RIGID, 1, 0, 0);
        ContactKernel kernel = law(ADHESION).bind(pair, ContactKind.GRAIN_WALL, 1);
        double rest = Math.pow(PULL_OFF / HERTZ, 2.0 / 3);
        double expected = 4.030 / Math.sqrt(1.5 * HERTZ * Math.sqrt(rest) / MASS);
        assertThat(kernel.duration(1e-6, RADIUS, MASS)).isCloseTo(expected, within(1e-3 * expected));
        RowTile tile = new RowTile(1)
                .set(Column.EFFECTIVE_RADIUS, RADIUS)
                .set(Column.EFFECTIVE_MASS, MASS)
                .set(Column.OVERLAP, 1e-9);
        tile.apply(kernel, 0);
        assertThat(tile.duration()).isCloseTo(kernel.duration(1, RADIUS, MASS), within(1e-12 * expected));
    }

    /** First order at the jump of the force: 320 steps leave at most a quarter of what 40 leave. */
    @Test
    @Tag("convergence")
    void ledgerClosesWithTheStep() {
        double coarse = residual(40);
        assertThat(coarse).isLessThan(0.05);
        assertThat(residual(320)).isLessThan(coarse / 4);
    }

    private static double residual(int stepsPerContact) {
        double largest = 0;
        for (double speed : new double[] {0.03, 0.05, 0.07, 0.09}) {
            Rig rig = sticky(0.8, 0.3, stepsPerContact);
            rig.wall(new Wall(
                    "plane",
                    1,
                    new HalfSpace(),
                    Placement.facing(new Vector3d(), new Vector3d(-1, 0, 0)),
                    new Still()));
            double[] velocity = {speed, 0.5 * speed, 0};
            rig.grain(0, RADIUS, new double[] {-RADIUS - 1e-8, 0, 0}, velocity, Impact.REST);
            try (WorkerTeam team = new WorkerTeam(1)) {
                Simulation run = rig.start(team);
                while (run.time() < 2e-4) {
                    run.step();
                }
                double share = run.ledger().residual() / (0.5 * MASS * 1.25 * speed * speed);
                largest = Math.max(largest, Math.abs(share));
            }
        }
        return largest;
    }
}
