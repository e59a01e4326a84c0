// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.math.StepLadder;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/**
 * A linear contact law as a site might write it, in a plain loop, and with it the stability limit of the stepper: a grain
 * that bobs on a plane is a linear oscillator, whose step-by-step solution with velocity Verlet is known in closed form,
 * x_n = A cos(n theta), theta = 2 asin(w h / 2), stable for w h < 2 (textbook).
 */
class LinearSpringTest {

    private static final double RADIUS = 0.005;
    private static final double GRAVITY = 10;
    private static final double STEP = StepLadder.floor(1e-4);

    /**
     * A linear spring in compression.
     *
     * @param stiffness N/m
     * @param reported share of the stiffness that the law admits to; 0 leaves the step to the test
     */
    record LinearSpring(double stiffness, double reported) implements ContactLaw, ContactKernel {

        @Override
        public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
            return this;
        }

        @Override
        public void apply(ContactBlock block) {
            double[] c = block.columns();
            for (int r = 0; r < block.rows(); r++) {
                double overlap = Math.max(0, c[ContactBlock.at(Column.OVERLAP) + r]);
                c[ContactBlock.at(Column.ELASTIC_FORCE) + r] = stiffness * overlap;
                c[ContactBlock.at(Column.DAMPING) + r] = 0;
                c[ContactBlock.at(Column.STIFFNESS) + r] = reported * stiffness;
                c[ContactBlock.at(Column.CONTACT_RADIUS) + r] = 1;
                if (block.energyDue()) {
                    c[ContactBlock.at(Column.STORED_ENERGY) + r] = 0.5 * stiffness * overlap * overlap;
                }
            }
        }
    }

    private static final class Bob {
        final Rig rig = new Rig()
                .material(new Material("grain", 2500, 1e7, 0.3), 1, 0, 0)
                .without(Stage.TANGENTIAL)
                .without(Stage.ROLLING)
                .gravity(0, 0, -GRAVITY)
                .maximumStep(STEP * (1 + 1e-12));
        final double rest;
        final long grain;

        Bob(double frequency, double reported, double amplitude) {
            double mass = 2500 * 4.0 / 3 * Math.PI * RADIUS * RADIUS * RADIUS;
            double stiffness = mass * frequency * frequency;
            rest = RADIUS - mass * GRAVITY / stiffness;
            rig.law(Stage.NORMAL, new LinearSpring(stiffness, reported));
            rig.wall(new Wall("plane", 0, new HalfSpace(), Placement.at(new Vector3d()), new Still()));
            grain = rig.grain(0, RADIUS, new double[] {0, 0, rest + amplitude}, Impact.REST, Impact.REST);
        }

        double deviation() {
            return rig.centre(grain)[2] - rest;
        }
    }

    /** 1e-8 of the amplitude: positions carry 16 digits of the radius, the amplitude is 1/1000 of it or more. */
    @ParameterizedTest
    @Tag("reference")
    @ValueSource(doubles = {0.1, 0.5, 1, 1.9})
    void oscillationFollowsItsClosedForm(double angle) {
        double amplitude = 0.5 * GRAVITY / (angle / STEP * angle / STEP);
        Bob bob = new Bob(angle / STEP, 0, amplitude);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = bob.rig.start(team);
            double turn = 2 * Math.asin(0.5 * angle);
            for (int n = 1; n <= 200; n++) {
                run.step();
                assertThat(run.pastStep()).isEqualTo(STEP);
                assertThat(bob.deviation()).isCloseTo(amplitude * Math.cos(n * turn), within(1e-8 * amplitude));
            }
        }
    }

    /** w h = 2.02 grows by 1.33 a step: 30 steps blow a disturbance up by 5000. */
    @Test
    @Tag("reference")
    void stepBeyondTheLimitBlowsUp() {
        double angle = 2.02;
        double amplitude = 1e-6 * GRAVITY / (angle / STEP * angle / STEP);
        Bob bob = new Bob(angle / STEP, 0, amplitude);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = bob.rig.start(team);
            for (int n = 1; n <= 30; n++) {
                run.step();
            }
            assertThat(Math.abs(bob.deviation()) / amplitude).isGreaterThan(1000);
        }
    }

    /** A law that reports its stiffness gets a step of at most 0.8 of the limit, and keeps its energy. */
    @Test
    void stepControlKeepsAnHonestLawStable() {
        double angle = 2.02;
        double frequency = angle / STEP;
        double amplitude = 0.5 * GRAVITY / (frequency * frequency);
        Bob bob = new Bob(frequency, 1, amplitude);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = bob.rig.start(team);
            double largest = 0;
            for (int n = 1; n <= 1000; n++) {
                run.step();
                assertThat(run.pastStep()).isLessThanOrEqualTo(0.8 * 2 / frequency);
                largest = Math.max(largest, Math.abs(bob.deviation()));
            }
            assertThat(run.limits().binding()).isEqualTo("stability");
            assertThat(largest).isLessThan(1.01 * amplitude);
        }
    }
}
