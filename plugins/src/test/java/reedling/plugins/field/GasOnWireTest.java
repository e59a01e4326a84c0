// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.field.Field;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.plugins.element.BeamElement;
import reedling.run.Simulation;
import reedling.structure.CrossSection;
import reedling.structure.EndCondition;
import reedling.structure.Position;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;
import reedling.structure.WireDamping;
import reedling.structure.WireEnds;
import reedling.structure.WireMesh;
import reedling.structure.WireSpecification;

/** A grain that moves with a wire on fine steps feels a gas on coarse ones; its work must still be booked in full. */
class GasOnWireTest {

    private static final Material WIRE = new Material("polyurethane", 1200, 6e7, 0.45);

    private static Structure wire() {
        StructureBuilder builder = new StructureBuilder();
        WireEnds ends = new WireEnds(
                new Position(0, 0, 0),
                new Position(0.3, 0, 0),
                EndCondition.CLAMPED,
                EndCondition.CLAMPED,
                WireEnds.AT_REST);
        WireSpecification wire = new WireSpecification(
                "wire",
                WIRE,
                new CrossSection.SolidCircle(0.002),
                ends,
                60,
                8,
                WireDamping.NONE,
                "beam",
                Map.of(),
                false);
        WireMesh.add(builder, wire, new BeamElement());
        return builder.build();
    }

    /** Residual over the energy that a grain brings, thrown at a wire through a thick gas. */
    private static double residual(int number) {
        Field gas = FreeFlight.gas(
                Map.of("viscosity", 0.03),
                Map.of("drag", "stokes", "spin_damping", "stokes", "lift", "rubinow-keller"));
        Rig rig = new Rig()
                .material(new Material("glass", 2500, 6e10, 0.22), 0.7, 0.3, 0.01)
                .material(WIRE, 0.7, 0.3, 0.01)
                .structure(wire(), 1)
                .field(gas)
                .stepsPerContact(number);
        rig.grain(0, 0.0015, new double[] {0.151, 0.0003, 0.0065}, new double[] {0.3, 0, -2}, new double[] {0, 50, 0});
        double brought = 0.5 * rig.grains().mass(0) * 4.09;
        int most = 0;
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 12e-3) {
                run.step();
                most = Math.max(most, run.fineSteps());
            }
            assertThat(most).isGreaterThan(10);
            assertThat(rig.velocity(0)[2]).isPositive();
            assertThat(run.ledger().fieldWork()).isBetween(-0.6 * brought, -0.1 * brought);
            return run.ledger().residual() / brought;
        }
    }

    /** 2 / N^2, the bound of the contacts alone. */
    @Test
    @Tag("conservation")
    void balanceClosesOnAWire() {
        for (int number : new int[] {20, 40, 80}) {
            double residual = residual(number);
            assertThat(Math.abs(residual)).as("N %s", number).isLessThan(2.0 / (number * number));
        }
    }
}
