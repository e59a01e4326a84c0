// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.math.StepLadder;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/**
 * A grain that bobs on a plane with a linear spring, under the midpoint rule. With y = x - i v / w a step multiplies y by
 * A = (1 + i (1 - theta) z) / (1 - i theta z), z = w h (derived by inserting exp(i w t); textbook): order two and |A| = 1 for
 * theta = 1/2, damping of order one otherwise.
 */
class MidpointOscillatorTest {

    private static final double RADIUS = 0.005;
    private static final double GRAVITY = 10;
    private static final double DENSITY = 2500;
    private static final double STEP = StepLadder.floor(1e-4);

    /** Magnitude and angle of A. */
    private record Factor(double size, double angle) {

        static Factor of(double theta, double z) {
            double up = 1 + (1 - theta) * (1 - theta) * z * z;
            double down = 1 + theta * theta * z * z;
            return new Factor(Math.sqrt(up / down), Math.atan((1 - theta) * z) + Math.atan(theta * z));
        }

        /** Real part of A^n. */
        double real(int n) {
            return Math.pow(size, n) * Math.cos(n * angle);
        }
    }

    /**
     * 1e-6 of the amplitude after 100 steps: an iteration stops when no grain moves by more than 1e-13 of its radius, 1e-8 of
     * the amplitude or less, a step. The printed sizes and angles guard the formula.
     */
    @ParameterizedTest
    @Tag("reference")
    @CsvSource({
        "0.5, 0.1, 1, 0.099916791",
        "0.6, 0.1, 0.99900309, 0.099906842",
        "1, 0.1, 0.99503719, 0.099668652",
        "0.5, 0.5, 1, 0.48995733",
        "0.6, 0.5, 0.97679498, 0.48885235"
    })
    void oscillationFollowsItsClosedForm(double theta, double z, double size, double angle) {
        Factor factor = Factor.of(theta, z);
        assertThat(factor.size).isCloseTo(size, within(1e-8));
        assertThat(factor.angle).isCloseTo(angle, within(1e-8));
        double frequency = z / STEP;
        double amplitude = 0.5 * GRAVITY / (frequency * frequency);
        double mass = DENSITY * 4 / 3 * Math.PI * RADIUS * RADIUS * RADIUS;
        double stiffness = mass * frequency * frequency;
        double rest = RADIUS - mass * GRAVITY / stiffness;
        Rig rig = new Rig()
                .material(new Material("grain", DENSITY, 1e7, 0.3), 1, 0, 0)
                .without(Stage.TANGENTIAL)
                .without(Stage.ROLLING)
                .law(Stage.NORMAL, new LinearSpringTest.LinearSpring(stiffness, 0))
                .gravity(0, 0, -GRAVITY)
                .maximumStep(STEP * (1 + 1e-12))
                .midpoint(theta, 1e-13);
        rig.wall(new Wall("plane", 0, new HalfSpace(), Placement.at(new Vector3d()), new Still()));
        long grain = rig.grain(0, RADIUS, new double[] {0, 0, rest + amplitude}, Impact.REST, Impact.REST);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            for (int n = 1; n <= 100; n++) {
                run.step();
                assertThat(run.pastStep()).isEqualTo(STEP);
                double deviation = rig.centre(grain)[2] - rest;
                assertThat(deviation).isCloseTo(amplitude * factor.real(n), within(1e-6 * amplitude));
            }
        }
    }
}
