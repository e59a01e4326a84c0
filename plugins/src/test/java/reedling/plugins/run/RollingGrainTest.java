// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugin.ParameterValues;
import reedling.plugins.Rig;
import reedling.plugins.contact.RollingProvider;
import reedling.run.Simulation;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/**
 * One sphere that slides, rolls and rocks on a plane, against textbook mechanics of a rigid sphere. The grain starts at the
 * overlap of its own weight, so nothing bounces. Tolerance 0.2 % unless said otherwise: the overlap shortens the lever by
 * 0.04 %, and the tangential spring rings for a few milliseconds after each change of regime.
 */
@Tag("reference")
class RollingGrainTest {

    private static final double RADIUS = 0.01;
    private static final double G = 9.81;
    private static final Material GRAIN = new Material("grain", 2500, 1e8, 0.3);
    private static final Material RIGID = new Material("rigid", 1, 1e30, 0.3);
    private static final double MASS = 2500 * 4.0 / 3 * Math.PI * RADIUS * RADIUS * RADIUS;

    /** Overlap that carries a normal load, m: F = 4/3 E* sqrt(R) d^(3/2). */
    private static double overlap(double load) {
        double stiffness = 4.0 / 3 * 1e8 / (1 - 0.3 * 0.3) * Math.sqrt(RADIUS);
        return Math.pow(load / stiffness, 2.0 / 3);
    }

    /** A grain on the plane z = 0, gravity tilted towards +x. */
    private static final class Slope {
        final Rig rig;
        final long grain;

        Slope(double degrees, double speed, double spin, Rig made) {
            double angle = Math.toRadians(degrees);
            rig = made.gravity(G * Math.sin(angle), 0, -G * Math.cos(angle));
            rig.wall(new Wall("plane", 1, new HalfSpace(), Placement.at(new Vector3d()), new Still()));
            double height = RADIUS - overlap(MASS * G * Math.cos(angle));
            grain = rig.grain(
                    0, RADIUS, new double[] {0, 0, height}, new double[] {speed, 0, 0}, new double[] {0, spin, 0});
        }

        double speed() {
            return rig.velocity(grain)[0];
        }

        double spin() {
            return rig.spin(grain)[1];
        }

        double place() {
            return rig.centre(grain)[0];
        }

        /** Speed of the surface over the plane: positive spin about y rolls towards +x. */
        double slip() {
            return speed() - RADIUS * spin();
        }
    }

    private static Rig lossy(double friction, double rollingFriction) {
        return new Rig()
                .material(GRAIN, 0.3, friction, rollingFriction)
                .material(RIGID, 0.3, friction, rollingFriction);
    }

    private static void until(Simulation run, double time) {
        while (run.time() < time) {
            run.step();
        }
    }

    /** Launched flat: v = 5/7 v0, t = 2 v0 / (7 mu g), s = 12 v0^2 / (49 mu g). Spinning: v = 2/7 w0 R, s = v t / 2. */
    @ParameterizedTest
    @CsvSource({"1, 0, 0.714286, 0.0832137", "0, 100, 0.285714, 0.013869"})
    void slidingTurnsIntoRolling(double speed, double spin, double rolling, double distance) {
        Slope slope = new Slope(0, speed, spin, lossy(0.3, 0));
        double first = slope.slip();
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = slope.rig.start(team);
            until(run, 0.05);
            double left = slope.slip();
            // sliding speed falls at a constant rate until it is used up
            double start = run.time() - 0.5 * run.pastStep();
            double duration = start * first / (first - left);
            assertThat(duration).isCloseTo(0.0970827, within(0.002 * 0.0970827));
            until(run, 0.12);
            assertThat(slope.speed()).isCloseTo(rolling, within(0.002 * rolling));
            assertThat(slope.spin()).isCloseTo(rolling / RADIUS, within(0.002 * rolling / RADIUS));
            double expected = distance + rolling * (run.time() - 0.0970827);
            assertThat(slope.place()).isCloseTo(expected, within(0.002 * expected));
        }
    }

    /** Released on a slope: rolls with 5/7 g sin if tan <= 3.5 mu, else slides with g (sin - mu cos). */
    @ParameterizedTest
    @CsvSource({
        "20, 0.3, 2.39658, 239.658",
        "45, 0.3, 4.9548, 495.48",
        "50, 0.3, 5.62317, 472.931",
        "30, 0.1, 4.05543, 212.393",
        "60, 0.4, 6.53371, 490.5"
    })
    void releasedSphereRollsOrSlides(double degrees, double friction, double acceleration, double spinning) {
        Slope slope = new Slope(degrees, 0, 0, lossy(friction, 0));
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = slope.rig.start(team);
            until(run, 0.1);
            double time = run.time() - 0.5 * run.pastStep();
            double speed = slope.speed();
            double spin = slope.spin();
            until(run, 0.3);
            double passed = run.time() - 0.5 * run.pastStep() - time;
            assertThat((slope.speed() - speed) / passed).isCloseTo(acceleration, within(0.002 * acceleration));
            assertThat((slope.spin() - spin) / passed).isCloseTo(spinning, within(0.002 * spinning));
        }
    }

    /** a = 5/7 mu_r g; 1 %: winding up the rolling spring and ringing out are outside the formula. */
    @Test
    void rollingResistanceStopsTheSphere() {
        Slope slope = new Slope(0, 0.5, 0.5 / RADIUS, lossy(0.5, 0.02));
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = slope.rig.start(team);
            until(run, 2);
            double braked = (0.5 - slope.speed()) / (run.time() - 0.5 * run.pastStep());
            assertThat(braked).isCloseTo(0.140143, within(0.01 * 0.140143));
            until(run, 3.4);
            assertThat(slope.speed()).isPositive();
            until(run, 4);
            assertThat(slope.place()).isCloseTo(0.891947, within(0.01 * 0.891947));
            assertThat(Math.abs(slope.speed())).isLessThan(1e-4);
        }
    }

    /** Limit angle tan = mu_r: at 0.9 of it the sphere stays for good, at 1.1 it rolls off with 5/7 g (sin - mu_r cos). */
    @Test
    void rollingResistanceHoldsTheSphereOnAGentleSlope() {
        double limit = Math.toDegrees(Math.atan(0.02));
        Slope gentle = new Slope(0.9 * limit, 0, 0, lossy(0.8, 0.02));
        Slope steep = new Slope(1.1 * limit, 0, 0, lossy(0.8, 0.02));
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = gentle.rig.start(team);
            until(run, 1);
            double place = gentle.place();
            until(run, 2);
            assertThat(gentle.place()).isCloseTo(place, within(1e-7));
            assertThat(gentle.place()).isLessThan(0.05 * RADIUS);
            run = steep.rig.start(team);
            until(run, 1);
            double speed = steep.speed();
            double angle = Math.toRadians(1.1 * limit);
            double expected = 5.0 / 7 * G * (Math.sin(angle) - 0.02 * Math.cos(angle));
            until(run, 2);
            assertThat(steep.speed() - speed).isCloseTo(expected, within(0.01 * expected));
        }
    }

    /**
     * Small rocking below the limit moment: T = 2 pi sqrt(7/5 m R^2 / k_r), with k_r = 2.25 mu_r^2 k_n R^2 of the law and
     * k_n at the resting overlap. 1 %: the tangential spring gives by k_r / (k_t R^2) = 0.1 %.
     */
    @Test
    void rollingSpringRocksWithItsPeriod() {
        RollingProvider provider = new RollingProvider();
        double mu = 0.02;
        Rig rig = new Rig()
                .material(GRAIN, 1, 0.8, mu)
                .material(RIGID, 1, 0.8, mu)
                .law(Stage.ROLLING, provider.create(ParameterValues.of(provider, Map.of("damping_ratio", 0.0))));
        double normalStiffness = 2 * 1e8 / (1 - 0.3 * 0.3) * Math.sqrt(RADIUS * overlap(MASS * G));
        double rollingStiffness = 2.25 * mu * mu * normalStiffness * RADIUS * RADIUS;
        double period = 2 * Math.PI * Math.sqrt(1.4 * MASS * RADIUS * RADIUS / rollingStiffness);
        double largest = mu * RADIUS * MASS * G / rollingStiffness;
        double spin = 0.3 * largest * 2 * Math.PI / period;
        Slope slope = new Slope(0, spin * RADIUS, spin, rig);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = slope.rig.start(team);
            int crossings = 0;
            double last = 0;
            double first = 0;
            double before = slope.spin();
            double middle = 0;
            while (crossings < 11) {
                run.step();
                double now = slope.spin();
                double at = run.time() - 0.5 * run.pastStep();
                if (before * now < 0) {
                    last = middle + (at - middle) * before / (before - now);
                    first = crossings++ == 0 ? last : first;
                }
                before = now;
                middle = at;
            }
            assertThat((last - first) / 5).isCloseTo(period, within(0.01 * period));
        }
    }

    /** A tenth of the friction needed: sliding, the friction force is mu N whatever the speed. */
    @ParameterizedTest
    @ValueSource(doubles = {0.1, 3})
    void slidingFrictionDoesNotDependOnSpeed(double speed) {
        Slope slope = new Slope(0, speed, 0, lossy(0.01, 0));
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = slope.rig.start(team);
            until(run, 0.1);
            double braked = (speed - slope.speed()) / (run.time() - 0.5 * run.pastStep());
            assertThat(braked).isCloseTo(0.01 * G, within(0.002 * 0.01 * G));
        }
    }
}
