// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.plugins.element.BeamElement;
import reedling.run.Simulation;
import reedling.structure.CrossSection;
import reedling.structure.EndCondition;
import reedling.structure.Position;
import reedling.structure.StructureBuilder;
import reedling.structure.WireDamping;
import reedling.structure.WireEnds;
import reedling.structure.WireMesh;
import reedling.structure.WireSpecification;

/** Grains that fall on a soft, taut wire whose own stable step is longer than their contact allows. */
class GrainOnWireTest {

    private static final Material SOFT = new Material("polyurethane", 1200, 6e7, 0.45);

    /** A bounce off a wire: velocity and spin after it, largest number of fine steps, state of the energy balance. */
    private record Bounce(double[] velocity, double[] spin, int fineSteps, double residual) {}

    private static Bounce bounce(double radius, double maximumStep, int stepsPerContact) {
        StructureBuilder builder = new StructureBuilder();
        WireEnds ends = new WireEnds(
                new Position(0, 0, 0),
                new Position(0.3, 0, 0),
                EndCondition.CLAMPED,
                EndCondition.CLAMPED,
                WireEnds.AT_REST);
        WireMesh.add(
                builder,
                new WireSpecification(
                        "wire",
                        SOFT,
                        new CrossSection.SolidCircle(0.002),
                        ends,
                        60,
                        8,
                        WireDamping.NONE,
                        "beam",
                        Map.of(),
                        false),
                new BeamElement());
        Rig rig = new Rig()
                .material(new Material("glass", 2500, 6e10, 0.22), 0.7, 0.3, 0.01)
                .material(SOFT, 0.7, 0.3, 0.01)
                .structure(builder.build(), 1)
                .maximumStep(maximumStep)
                .stepsPerContact(stepsPerContact);
        double[] start = {0.151, 0.0003, radius + 0.005};
        long grain = rig.grain(0, radius, start, new double[] {0.3, 0, -2}, new double[3]);
        int most = 0;
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 4e-3) {
                run.step();
                most = Math.max(most, run.fineSteps());
            }
            return new Bounce(
                    rig.velocity(grain),
                    rig.spin(grain),
                    most,
                    run.ledger().residual() / (0.5 * rig.grains().mass(0) * 4.09));
        }
    }

    /**
     * A free grain is far from any coarse contact, so its step is long and the wire is met in the middle of it. What is
     * left of the step must then be divided anew: at the fine step of the wire alone, this bounce ended faster than it began.
     * Reference: the same bounce with steps of 1 us all along. 1.5 % of the incoming speed: 20 against 150 steps a contact.
     */
    @Test
    @Tag("conservation")
    void contactThatBeginsInsideALongStepIsResolved() {
        for (double radius : new double[] {0.0004, 0.0015}) {
            Bounce longSteps = bounce(radius, 1e-3, 20);
            Bounce shortSteps = bounce(radius, 1e-6, 20);
            assertThat(longSteps.fineSteps).isGreaterThan(10);
            assertThat(shortSteps.fineSteps).isEqualTo(1);
            for (int axis = 0; axis < 3; axis++) {
                assertThat(longSteps.velocity[axis]).isCloseTo(shortSteps.velocity[axis], within(0.03));
                assertThat(longSteps.spin[axis] * radius).isCloseTo(shortSteps.spin[axis] * radius, within(0.03));
            }
            assertThat(Math.abs(longSteps.residual)).isLessThan(2.0 / (20 * 20));
        }
    }

    /** Energy balance of the bounce: 2 / N^2 of the energy that came in. */
    @Test
    @Tag("convergence")
    void gapOfTheBalanceShrinksWithTheSteps() {
        assertThat(Math.abs(bounce(0.0004, 1e-3, 40).residual)).isLessThan(2.0 / (40 * 40));
        assertThat(Math.abs(bounce(0.0004, 1e-3, 80).residual)).isLessThan(2.0 / (80 * 80));
    }
}
