// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugin.ParameterValues;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/**
 * A sphere that spins about the normal of the plane it lies on. While the limit holds, I w' = -mu_w R F_n with
 * I = 2/5 m R^2 and F_n = m g, so it stops after the time t = I w0 / (mu_w R F_n) = 2/5 R w0 / (mu_w g) and has turned by
 * w0 t / 2. Below the limit it swings with the period 2 pi sqrt(I / k_w).
 */
@Tag("reference")
class TwistingLawTest {

    private static final double RADIUS = 0.01;
    private static final double G = 9.81;
    private static final Material GRAIN = new Material("grain", 2500, 1e8, 0.3);
    private static final double MASS = 2500 * 4.0 / 3 * Math.PI * RADIUS * RADIUS * RADIUS;
    private static final double INERTIA = 0.4 * MASS * RADIUS * RADIUS;
    private static final double HERTZ = 4.0 / 3 * 1e8 / (1 - 0.3 * 0.3) * Math.sqrt(RADIUS);
    private static final double REST = Math.pow(MASS * G / HERTZ, 2.0 / 3);

    private static final class Top {
        final Rig rig;
        final long grain;

        Top(double twistingFriction, double dampingRatio, double restitution, double spin) {
            TwistingProvider provider = new TwistingProvider();
            Map<String, Double> given = Map.of("twisting_friction", twistingFriction, "damping_ratio", dampingRatio);
            rig = new Rig()
                    .material(GRAIN, restitution, 0.5, 0.01)
                    .material(Impact.RIGID, restitution, 0.5, 0.01)
                    .law(Stage.TWISTING, provider.create(ParameterValues.of(provider, given)))
                    .gravity(0, 0, -G)
                    .wall(new Wall("plane", 1, new HalfSpace(), Placement.at(new Vector3d()), new Still()));
            grain = rig.grain(0, RADIUS, new double[] {0, 0, RADIUS - REST}, Impact.REST, new double[] {0, 0, spin});
        }

        double spin() {
            return rig.spin(grain)[2];
        }
    }

    private static void until(Simulation run, double time) {
        while (run.time() < time) {
            run.step();
        }
    }

    /** 0.2 %: winding up the spring costs an angle of 0.3 d / (mu_w R), 0.02 % of the way here. */
    @ParameterizedTest
    @ValueSource(doubles = {0.01, 0.05})
    void spinFallsAtAConstantRateAndStops(double friction) {
        double spin = 30;
        Top top = new Top(friction, 0.3, 0.3, spin);
        double stop = 0.4 * RADIUS * spin / (friction * G);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = top.rig.start(team);
            until(run, 0.5 * stop);
            double half = spin * (1 - run.time() / stop);
            assertThat(top.spin()).isCloseTo(half, within(2e-3 * half));
            until(run, 0.99 * stop);
            assertThat(top.spin()).isPositive();
            until(run, 1.3 * stop);
            assertThat(Math.abs(top.spin())).isLessThan(1e-3 * spin);
            assertThat(Math.abs(top.rig.velocity(top.grain)[0])).isLessThan(1e-12);
            // all of the energy went into the limit; what discretisation left over is far less
            double energy = 0.5 * INERTIA * spin * spin;
            assertThat(run.ledger().dissipated()).isCloseTo(energy, within(1e-3 * energy));
            assertThat(Math.abs(run.ledger().residual())).isLessThan(1e-4 * energy);
        }
    }

    /** 0.5 %: k_n is that of the resting overlap, which the elastic contact keeps. */
    @Test
    void twistingSpringSwingsWithItsPeriod() {
        double friction = 0.05;
        double normal = 1.5 * HERTZ * Math.sqrt(REST);
        double stiffness = 2.25 * friction * friction * normal * RADIUS * RADIUS;
        double period = 2 * Math.PI * Math.sqrt(INERTIA / stiffness);
        double largest = friction * RADIUS * MASS * G / stiffness;
        Top top = new Top(friction, 0, 1, 0.3 * largest * 2 * Math.PI / period);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = top.rig.start(team);
            double start = top.spin();
            double before = start;
            int crossings = 0;
            double first = 0;
            double last = 0;
            while (crossings < 11) {
                run.step();
                double now = top.spin();
                if (before * now < 0) {
                    // the spin shown belongs to the middle of the past step
                    last = run.time() - 0.5 * run.pastStep() - run.pastStep() * now / (now - before);
                    first = crossings++ == 0 ? last : first;
                }
                before = now;
            }
            assertThat((last - first) / 5).isCloseTo(period, within(5e-3 * period));
            assertThat(Math.abs(run.ledger().residual())).isLessThan(1e-3 * 0.5 * INERTIA * start * start);
        }
    }

    /** Rolling and twisting at once: neither takes the spin of the other, 1 % for the ringing at the start. */
    @Test
    void rollingAndTwistingAreResistedApart() {
        double spin = 20;
        Top top = new Top(0.02, 0.3, 0.3, spin);
        int row = top.rig.row(top.grain);
        top.rig.grains().velocity(row, spin * RADIUS, 0, 0);
        top.rig.grains().spin(row, 0, spin, spin);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = top.rig.start(team);
            until(run, 0.2);
            double twist = spin - 0.02 * G / (0.4 * RADIUS) * run.time();
            assertThat(top.spin()).isCloseTo(twist, within(0.01 * twist));
            double rolled = spin - 5.0 / 7 * 0.01 * G / RADIUS * run.time();
            assertThat(top.rig.spin(top.grain)[1]).isCloseTo(rolled, within(0.01 * rolled));
        }
    }

    /** Two equal spheres on one axis, pressed and spinning against each other: total angular momentum is kept to rounding. */
    @Test
    @Tag("conservation")
    void pairKeepsItsAngularMomentum() {
        TwistingProvider provider = new TwistingProvider();
        Rig rig = new Rig()
                .material(GRAIN, 0.5, 0.5, 0)
                .law(Stage.TWISTING, provider.create(ParameterValues.of(provider, Map.of("twisting_friction", 0.05))));
        Impact impact = Impact.ofTwo(
                rig,
                new Impact.Ball(RADIUS, new double[] {0.005, 0, 0}, new double[] {400, 0, 0}),
                new Impact.Ball(RADIUS, new double[] {-0.005, 0, 0}, new double[] {-100, 0, 0}),
                1e-7);
        try (WorkerTeam team = new WorkerTeam(1)) {
            impact.run(team);
        }
        double one = rig.spin(impact.first())[0];
        double two = rig.spin(impact.second())[0];
        assertThat(one + two).isCloseTo(300, within(1e-11));
        // at the limit nearly all the time: each spin changes by mu_w R* P / I, normal impulse P = m* (1 + e) v; 1 %
        // for
        // the first angle of 0.3 d / (mu_w R*)
        double change = 0.05 * RADIUS / 2 * (MASS / 2) * 1.5 * 0.01 / INERTIA;
        assertThat(one).isCloseTo(400 - change, within(0.01 * change));
    }
}
