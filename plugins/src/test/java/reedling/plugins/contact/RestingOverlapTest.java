// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/**
 * A known first-order error of the dashpot's velocity. It is taken at the end of the step from the elastic force of its own
 * contact alone, so a contact that carries a load at rest feels a closing speed of -h F_el / (2 m) and settles where
 * F_el = F (1 + h c / (2 m)): the force is right, the overlap too large by the power 2/3 of that factor. It goes away with
 * the step.
 */
class RestingOverlapTest {

    private static final double RADIUS = 0.01;
    private static final double G = 9.81;

    @ParameterizedTest
    @Tag("convergence")
    @CsvSource({"0.3, 20", "0.3, 80", "0.7, 20", "1, 20"})
    void restingOverlapExceedsHertzByTheHalfStepOfTheDashpot(double restitution, int stepsPerContact) {
        Material grain = new Material("grain", 2500, 1e8, 0.3);
        double mass = 2500 * 4.0 / 3 * Math.PI * RADIUS * RADIUS * RADIUS;
        double modulus = 1e8 / (1 - 0.3 * 0.3);
        double hertz = Math.pow(mass * G / (4.0 / 3 * modulus * Math.sqrt(RADIUS)), 2.0 / 3);
        Rig rig = new Rig()
                .material(grain, restitution, 0, 0)
                .material(Impact.RIGID, restitution, 0, 0)
                .stepsPerContact(stepsPerContact)
                .gravity(0, 0, -G);
        rig.wall(new Wall("plane", 1, new HalfSpace(), Placement.at(new Vector3d()), new Still()));
        long id = rig.grain(0, RADIUS, new double[] {0, 0, RADIUS - hertz}, Impact.REST, Impact.REST);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 0.2) {
                run.step();
            }
            double overlap = RADIUS - rig.centre(id)[2];
            double zeta = Restitution.dampingRatio(restitution);
            double stiffness = 2 * modulus * Math.sqrt(RADIUS * overlap);
            double dashpot = Math.sqrt(5) * zeta * Math.sqrt(2.0 / 3 * stiffness * mass);
            double factor = Math.pow(1 + run.pastStep() * dashpot / (2 * mass), 2.0 / 3);
            assertThat(overlap / hertz).isCloseTo(factor, within(1e-6));
            assertThat(factor).isLessThan(1 + 1.2 / stepsPerContact);
        }
    }
}
