// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Momentum;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.structure.CrossSection;
import reedling.structure.EndCondition;
import reedling.structure.NodeStore;
import reedling.structure.Structure;
import reedling.wall.HertzLine;

/** Spheres that hit free and supported beams through the contacts with wires. */
class RodImpactTest {

    private static final double SPHERE = 0.1;
    private static final double SPHERE_MASS = 0.05;
    private static final double THICKNESS = 0.04;

    /** Light and as good as rigid: its lowest bending period is 0.1 ms, the contact lasts 8 ms. */
    private static Structure rigidRod(int elements) {
        CrossSection section = new CrossSection.SolidCircle(THICKNESS);
        return Rods.along(
                1, elements, section, new Material("rod", 0.5 / section.area(), 2e13, 0.3), EndCondition.FREE);
    }

    private static Rig rig(double restitution, double friction, Structure rod) {
        double density = SPHERE_MASS / (4.0 / 3 * Math.PI * SPHERE * SPHERE * SPHERE);
        return new Rig()
                .material(new Material("ball", density, 4e4, 0.3), restitution, friction, 0.02)
                .material(new Material("rod", 400, 2e13, 0.3), restitution, friction, 0.02)
                .margin(0.05)
                .structure(rod, 1);
    }

    /** Restitution of a contact with a dashpot for the sphere's mass against a fixed wall, but a smaller moved mass. */
    private static double restitutionOf(double asked, double massRatio) {
        double low = 0;
        double high = 8;
        for (int k = 0; k < 60; k++) {
            double middle = 0.5 * (low + high);
            if (clipped(middle) > asked) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return clipped(low * Math.sqrt(massRatio));
    }

    /** e of a damped Hertz contact clipped at zero force (map to the linear oscillator: Antypov and Elliott, 2011). */
    private static double clipped(double zeta) {
        if (Math.abs(zeta - 1) < 1e-9) {
            return Math.exp(-2);
        }
        double angle = zeta < 1
                ? Math.acos(zeta) / Math.sqrt(1 - zeta * zeta)
                : Math.log(zeta + Math.sqrt(zeta * zeta - 1)) / Math.sqrt(zeta * zeta - 1);
        return Math.exp(-2 * zeta * angle);
    }

    /**
     * Impulse mechanics: J = (1 + e) v / (1/m + 1/M + x^2/I), v = 2 m/s. The dashpot is made for the sphere's mass, so e is
     * that of a contact with the moved mass 1/(1/m + 1/M + x^2/I) instead. I is that of the lumped mesh, 0.7 % above M L^2/12
     * at 20 elements. 0.5 % is for what rings on in the rod.
     */
    @ParameterizedTest
    @Tag("reference")
    @CsvSource({"0, 1, 0.181818", "0.3, 1, 0.165563", "0.3, 0.5, 0", "0.5, 0.05, 0"})
    void rodTakesTheImpulseOfARigidBody(double place, double asked, double elasticImpulse) {
        Structure rod = rigidRod(20);
        Rig rig = rig(asked, 0, rod).stepsPerContact(60);
        double reach = SPHERE + 0.5 * THICKNESS + 1e-4;
        double[] rest = new double[3];
        long ball = rig.grain(0, SPHERE, new double[] {place, 0, -reach}, new double[] {0, 0, 2}, rest);
        double inertia = Rods.massAndInertia(rod.nodes())[1];
        assertThat(inertia).isCloseTo(0.5 / 12, within(0.01 * 0.5 / 12));
        Momentum before = Momentum.of(rig.grains(), rod.nodes());
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 0.02) {
                run.step();
            }
        }
        double inverse = 1 / SPHERE_MASS + 1 / 0.5 + place * place / inertia;
        double restitution = restitutionOf(asked, SPHERE_MASS * inverse);
        double impulse = (1 + restitution) * 2 / inverse;
        double tolerance = 0.005;
        if (asked == 1) {
            assertThat(impulse).isCloseTo(elasticImpulse, within(0.001 * elasticImpulse));
        }
        double speed = 2 - impulse / SPHERE_MASS;
        double[] motion = Rods.centreMotion(rod.nodes());
        assertThat(rig.velocity(ball)[2]).isCloseTo(speed, within(tolerance * 2));
        assertThat(motion[0]).isCloseTo(impulse / 0.5, within(tolerance * motion[0]));
        assertThat(motion[1]).isCloseTo(-impulse * place / inertia, within(tolerance * Math.abs(motion[1]) + 1e-6));
        assertThat(Momentum.of(rig.grains(), rod.nodes()).largestChange(before)).isLessThan(1e-12);
    }

    /**
     * A spinning ball slides along a free rod over its nodes, with friction and rolling resistance, while others collide
     * with it: forces act where torques say, whatever the place along the element.
     */
    @Test
    @Tag("conservation")
    void momentumStaysWhileABallSlidesOverNodes() {
        Structure rod = rigidRod(20);
        Rig rig = rig(0.5, 0.4, rod).stepsPerContact(40);
        double reach = SPHERE + 0.5 * THICKNESS - 1e-3;
        rig.grain(0, SPHERE, new double[] {-0.215, 0.02, -reach}, new double[] {4, 0.5, 2}, new double[] {3, -8, 5});
        rig.grain(0, SPHERE, new double[] {0.02, 0.02, -reach - 0.02}, new double[] {1, 0, 1}, new double[] {0, 20, 0});
        rig.grain(0, SPHERE, new double[] {-0.2, 0.05, -2 * SPHERE - reach}, new double[] {4, 0, 3}, new double[3]);
        Momentum before = Momentum.of(rig.grains(), rod.nodes());
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = rig.start(team);
            boolean several = false;
            while (run.time() < 0.04) {
                run.step();
                several |= run.fineSteps() > 1;
            }
            assertThat(several).as("steps with several fine steps").isTrue();
            assertThat(run.ledger().dissipated()).isPositive();
        }
        double turned = 0;
        NodeStore nodes = rod.nodes();
        for (int n = 0; n < nodes.count; n++) {
            turned += Math.abs(nodes.spin[3 * n]);
        }
        assertThat(turned).as("spin about the rod's axis").isPositive();
        assertThat(Momentum.of(rig.grains(), nodes).largestChange(before)).isLessThan(1e-12);
    }

    /**
     * Light steel sphere on the middle of a pinned beam: peak force 4.912 N at 72.09 us, contact until 155.3 us, rebound at
     * 0.003025 m/s, deflection 1.115 um. Hertz contact with modal superposition after S. Timoshenko, 1913 (W. Goldsmith,
     * Impact, 1960), computed independently with Bernoulli-Euler modes. 3 %, of which the lumped mesh of 40 elements takes
     * about 1 %. The section is slender and thin, so the grain's radius is chosen for R* = 0.01 m on it.
     */
    @Test
    @Tag("reference")
    void sphereOnAPinnedBeamReboundsAsTheModesSay() {
        CrossSection section = new CrossSection.Rectangle(0.002, 0.002);
        Material beam = new Material("beam", 0.78 / section.area(), 179.167 / section.secondMoment2(), 0.3);
        Structure structure = Rods.along(0.1535, 40, section, beam, EndCondition.PINNED);
        double width = structure.bodies().getFirst().section().contactRadius();
        double radius = radiusFor(0.01, width);
        double flexible = 1 / (1 / 1.18132e11 - (1 - 0.09) / beam.youngsModulus());
        double density = 0.0326726 / (4.0 / 3 * Math.PI * radius * radius * radius);
        Rig rig = new Rig()
                .material(new Material("ball", density, flexible * (1 - 0.09), 0.3), 1, 0, 0)
                .material(beam, 1, 0, 0)
                .without(Stage.TANGENTIAL)
                .without(Stage.ROLLING)
                .maximumStep(1e-6)
                .structure(structure, 1);
        double[] start = {0, 0, radius + width + 1e-9};
        long ball = rig.grain(0, radius, start, new double[] {0, 0, -0.01}, new double[3]);
        Blow blow = strike(rig, ball, structure.nodes());
        assertThat(blow.force).isCloseTo(4.912, within(0.03 * 4.912));
        assertThat(blow.forceTime).isCloseTo(7.209e-5, within(0.05 * 7.209e-5));
        assertThat(blow.end).isCloseTo(1.553e-4, within(0.03 * 1.553e-4));
        assertThat(rig.velocity(ball)[2]).isCloseTo(0.003025, within(0.03 * 0.003025));
        assertThat(blow.deflection).isCloseTo(1.115e-6, within(0.03 * 1.115e-6));
    }

    private static final class Blow {
        double force;
        double forceTime;
        double end;
        double deflection;
    }

    private static Blow strike(Rig rig, long ball, NodeStore nodes) {
        Blow blow = new Blow();
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            double speed = rig.velocity(ball)[2];
            double old = 0;
            while (run.time() < 0.0015) {
                run.step();
                double now = rig.velocity(ball)[2];
                double force = 0.0326726 * (now - speed) / (0.5 * (old + run.pastStep()));
                if (force > blow.force) {
                    blow.force = force;
                    blow.forceTime = run.time() - run.pastStep();
                }
                blow.end = now > speed ? run.time() : blow.end;
                blow.deflection = Math.max(blow.deflection, -nodes.position[3 * 20 + 2]);
                speed = now;
                old = run.pastStep();
            }
        }
        return blow;
    }

    private static double radiusFor(double effective, double cylinder) {
        double low = 1e-4;
        double high = 1;
        for (int k = 0; k < 80; k++) {
            double middle = 0.5 * (low + high);
            if (HertzLine.outside(middle, cylinder) < effective) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }
}
