// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;

/**
 * Normal impacts through the whole step loop against Hertz's theory. Set-ups of the benchmark tests 1 to 3 of Y. C.
 * Chung and J. Y. Ooi, Benchmark tests for verifying discrete element modelling codes at particle impact level, 2011 (as
 * remembered); the expected numbers are Hertz's closed forms: d_max = (15 m* v^2 / (16 E* sqrt(R*)))^(2/5),
 * F_max = 4/3 E* sqrt(R*) d_max^(3/2), t_c = 2.943275 d_max / v.
 */
@Tag("reference")
class NormalImpactTest {

    private static final Material ALUMINA = new Material("alumina", 4000, 3.8e11, 0.23);

    private record Hertz(double overlap, double force, double duration) {

        static Hertz of(double mass, double radius, double modulus, double speed) {
            double overlap = Math.pow(15 * mass * speed * speed / (16 * modulus * Math.sqrt(radius)), 0.4);
            double force = 4.0 / 3 * modulus * Math.sqrt(radius) * Math.pow(overlap, 1.5);
            return new Hertz(overlap, force, 2.943275 * overlap / speed);
        }
    }

    private static Rig elastic(Material material) {
        return new Rig()
                .material(material, 1, 0.3, 0.01)
                .material(Impact.RIGID, 1, 0.3, 0.01)
                .stepsPerContact(400);
    }

    private static double sphereMass(Material material, double radius) {
        return material.density() * 4 / 3 * Math.PI * radius * radius * radius;
    }

    /** 0.1 % is what 400 steps a contact leave of the peak between two steps and of the touch between two steps. */
    private static void assertClose(Impact.Seen seen, Hertz expected) {
        assertThat(seen.overlap()).isCloseTo(expected.overlap, within(1e-3 * expected.overlap));
        assertThat(seen.force()).isCloseTo(expected.force, within(1e-3 * expected.force));
        assertThat(seen.duration()).isCloseTo(expected.duration, within(1e-3 * expected.duration));
    }

    /** Test 1: glass and limestone spheres; the printed numbers guard the closed forms of this test. */
    @ParameterizedTest
    @CsvSource({
        "2800, 4.8e10, 0.2, 0.000274113, 10696.9, 4.03395e-05",
        "2500, 2.0e10, 0.25, 0.000368304, 7108.24, 5.4201e-05"
    })
    void equalSpheresBounceAsHertzSays(
            double density, double modulus, double poisson, double overlap, double force, double duration) {
        Material material = new Material("stone", density, modulus, poisson);
        double speed = 10;
        Rig rig = elastic(material);
        Impact impact = Impact.ofTwo(
                rig,
                new Impact.Ball(0.01, new double[] {speed, 0, 0}, Impact.REST),
                new Impact.Ball(0.01, new double[] {-speed, 0, 0}, Impact.REST),
                1e-6);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Impact.Seen seen = impact.run(team);
            Hertz expected = Hertz.of(
                    0.5 * sphereMass(material, 0.01), 0.005, 0.5 * modulus / (1 - poisson * poisson), 2 * speed);
            assertThat(expected.overlap).isCloseTo(overlap, within(1e-5 * overlap));
            assertThat(expected.force).isCloseTo(force, within(1e-5 * force));
            assertThat(expected.duration).isCloseTo(duration, within(1e-5 * duration));
            assertClose(seen, expected);
            // 2e-6: the energy error of 400 steps a contact is of the order of 1e-6
            assertThat(rig.velocity(impact.first())[0]).isCloseTo(-speed, within(2e-6 * speed));
            assertThat(rig.velocity(impact.second())[0]).isCloseTo(speed, within(2e-6 * speed));
        }
    }

    /** Test 2: aluminium and magnesium alloy on a rigid plane. */
    @ParameterizedTest
    @CsvSource({
        "2699, 7e10, 0.3, 4.97172e-05, 11369.9, 0.000731657",
        "1800, 4e10, 0.35, 5.21233e-05, 7232.68, 0.000767066"
    })
    void sphereBouncesOffARigidPlaneAsHertzSays(
            double density, double modulus, double poisson, double overlap, double force, double duration) {
        Material alloy = new Material("alloy", density, modulus, poisson);
        Rig rig = elastic(alloy);
        Impact impact = Impact.onPlane(rig, 0.1, new double[] {0.2, 0, 0}, Impact.REST, 1e-7);
        try (WorkerTeam team = new WorkerTeam(1)) {
            assertClose(impact.run(team), new Hertz(overlap, force, duration));
            assertThat(rig.velocity(impact.first())[0]).isCloseTo(-0.2, within(2e-6 * 0.2));
        }
    }

    @Test
    void unequalSpheresBounceAsHertzSays() {
        Rig rig = elastic(new Material("glass", 2500, 6e10, 0.22));
        Impact impact = Impact.ofTwo(
                rig,
                new Impact.Ball(0.003, new double[] {1, 0, 0}, Impact.REST),
                new Impact.Ball(0.006, Impact.REST, Impact.REST),
                1e-7);
        try (WorkerTeam team = new WorkerTeam(1)) {
            assertClose(impact.run(team), new Hertz(7.74839e-06, 40.5451, 2.28057e-05));
            // elastic exchange: masses 1 : 8
            assertThat(rig.velocity(impact.first())[0]).isCloseTo(-7.0 / 9, within(2e-6));
            assertThat(rig.velocity(impact.second())[0]).isCloseTo(2.0 / 9, within(2e-6));
        }
    }

    /**
     * Test 3, with the total force clipped at zero and the damping calibrated for it. Peak values come from an
     * integration of the same law with another method in {@link DampedHertz}. 0.3 % on peaks; 1e-3 on restitution, the
     * scatter that the phase of the touch leaves.
     */
    @ParameterizedTest
    @ValueSource(doubles = {0.9, 0.8, 0.6, 0.4, 0.2, 0.1})
    void restitutionIsTheOneAskedFor(double restitution) {
        Rig rig = new Rig()
                .material(ALUMINA, restitution, 0.3, 0)
                .material(Impact.RIGID, restitution, 0.3, 0)
                .stepsPerContact(500);
        double speed = 3.9;
        Impact impact = Impact.onPlane(rig, 0.0025, new double[] {speed, 0, 0}, Impact.REST, 1e-6 * speed);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Impact.Seen seen = impact.run(team);
            double mass = sphereMass(ALUMINA, 0.0025);
            double stiffness = 4.0 / 3 * 3.8e11 / (1 - 0.23 * 0.23) * Math.sqrt(0.0025);
            DampedHertz expected = DampedHertz.withRestitution(restitution);
            assertThat(-rig.velocity(impact.first())[0] / speed).isCloseTo(restitution, within(1e-3));
            double length = expected.length(mass, stiffness, speed);
            assertThat(seen.overlap()).isCloseTo(expected.peakOverlap() * length, within(3e-3 * length));
            double force = stiffness * length * Math.sqrt(length);
            assertThat(seen.force()).isCloseTo(expected.peakForce() * force, within(3e-3 * force));
            assertThat(seen.duration()).isCloseTo(expected.duration() * length / speed, within(3e-3 * seen.duration()));
        }
    }

    /** Restitution does not depend on speed, the duration goes with v^(-1/5): scaling of the equation of motion. */
    @Test
    void restitutionAndScalingHoldAtAllSpeeds() {
        double[] speeds = {0.01, 0.1, 1, 10};
        double[] durations = new double[speeds.length];
        for (int k = 0; k < speeds.length; k++) {
            Rig rig = new Rig()
                    .material(ALUMINA, 0.6, 0.3, 0)
                    .material(Impact.RIGID, 0.6, 0.3, 0)
                    .stepsPerContact(500);
            Impact impact = Impact.onPlane(rig, 0.0025, new double[] {speeds[k], 0, 0}, Impact.REST, 1e-6 * speeds[k]);
            try (WorkerTeam team = new WorkerTeam(1)) {
                durations[k] = impact.run(team).duration();
                assertThat(-rig.velocity(impact.first())[0] / speeds[k]).isCloseTo(0.6, within(1e-4));
            }
            assertThat(durations[0] / durations[k]).isCloseTo(Math.pow(speeds[k] / speeds[0], 0.2), within(3e-3));
        }
    }
}
