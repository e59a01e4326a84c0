// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Set;
import java.util.SplittableRandom;
import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.wall.BoxInside;
import reedling.wall.CylinderInside;
import reedling.wall.Motion;
import reedling.wall.Oscillating;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Stroke;
import reedling.wall.Timing;
import reedling.wall.Turning;
import reedling.wall.Wall;

/**
 * Beds of grains with friction and rolling resistance in resting, shaken and turning vessels: the energy balance. Its gap
 * measures the discretisation, C / N^2 of the throughput with C about 1, so 2 / N^2 is the bound; a gap that does not fall
 * with N would be a term forgotten.
 */
class SettlingBedTest {

    private static final double G = 9.81;

    private static Rig grains(long seed, int count, int stepsPerContact) {
        SplittableRandom random = new SplittableRandom(seed);
        Rig rig = new Rig()
                .material(new Material("seed", 1200, 1e7, 0.3), 0.7, 0.5, 0.05)
                .gravity(0, 0, -G)
                .stepsPerContact(stepsPerContact);
        for (int k = 0; k < count; k++) {
            double[] centre = {
                (k % 6 - 2.5) * 0.0065 + random.nextDouble(-2e-4, 2e-4),
                (k / 6 % 6 - 2.5) * 0.0065 + random.nextDouble(-2e-4, 2e-4),
                k / 36 * 0.0065 - 0.016
            };
            rig.grain(0, random.nextDouble(0.0025, 0.003), centre, new double[3], new double[3]);
        }
        return rig;
    }

    private static Wall box(Motion motion) {
        return new Wall(
                "box", 0, new BoxInside(0.04, 0.04, 0.04, Set.of(BoxInside.Face.HIGH_Z)), Placement.world(), motion);
    }

    private static Simulation run(Rig rig, WorkerTeam team, double end) {
        Simulation run = rig.reportEvery(5).start(team);
        while (run.time() < end || run.stepCount() % 5 != 1) {
            run.step();
        }
        return run;
    }

    private static double residual(Rig rig, double end) {
        try (WorkerTeam team = new WorkerTeam(2)) {
            return run(rig, team, end).ledger().relativeResidual();
        }
    }

    @Test
    @Tag("convergence")
    void gapOfASettlingBedFallsByFourWhenStepsDouble() {
        double[] gap = new double[3];
        for (int k = 0; k < 3; k++) {
            int number = 10 << k;
            gap[k] = residual(grains(3, 216, number).wall(box(new Still())), 0.15);
            assertThat(Math.abs(gap[k])).isLessThan(2.0 / (number * number));
        }
        assertThat(gap[0] / gap[1]).isBetween(2.5, 6.5);
        assertThat(gap[1] / gap[2]).isBetween(2.5, 6.5);
    }

    @ParameterizedTest
    @Tag("conservation")
    @ValueSource(ints = {20, 40})
    void gapOfAShakenBoxStaysInItsBand(int number) {
        Stroke stroke = new Stroke(new Vector3d(1, 0, 1), 0.0015, 0);
        Motion shaking = Oscillating.harmonic(stroke, 25, Timing.always());
        assertThat(Math.abs(residual(grains(4, 216, number).wall(box(shaking)), 0.15)))
                .isLessThan(2.0 / (number * number));
    }

    /** A drum that turns at 5 rad/s with a load thrown against its shell: work by force and torque. */
    @ParameterizedTest
    @Tag("conservation")
    @ValueSource(ints = {20, 40})
    void gapOfATurningDrumStaysInItsBand(int number) {
        try (WorkerTeam team = new WorkerTeam(2)) {
            Rig rig = grains(5, 144, number).wall(drum(5));
            Simulation run = run(rig, team, 0.3);
            assertThat(run.ledger().wallWork()).isGreaterThan(0.1 * run.ledger().dissipated());
            assertThat(Math.abs(run.ledger().relativeResidual())).isLessThan(2.0 / (number * number));
        }
    }

    private static Wall drum(double speed) {
        Motion turning = new Turning(new Vector3d(), new Vector3d(0, 1, 0), speed, Timing.always());
        return new Wall(
                "drum",
                0,
                new CylinderInside(0.04, 0.05, true, true),
                Placement.along(new Vector3d(0, -0.025, 0), new Vector3d(0, 0.025, 0)),
                turning);
    }

    /** A settled bed presses on the floor with its weight; 0.1 % is what is left of its rattling. */
    @Test
    @Tag("reference")
    void floorCarriesTheWeight() {
        Rig rig = grains(6, 180, 20).wall(box(new Still()));
        double mass = 0;
        for (int g = 0; g < 180; g++) {
            mass += rig.grains().mass(g);
        }
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = run(rig, team, 0.6);
            double force = run.interactions().walls().sumLoads()[2];
            assertThat(force).isCloseTo(-mass * G, within(1e-3 * mass * G));
        }
    }
}
