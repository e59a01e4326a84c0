// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Test;
import reedling.material.Material;
import reedling.plugins.element.BeamElement;
import reedling.probe.WireShape;
import reedling.structure.CrossSection;
import reedling.structure.EndCondition;
import reedling.structure.Position;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;
import reedling.structure.SupportMotion;
import reedling.structure.WireDamping;
import reedling.structure.WireEnds;
import reedling.structure.WireMesh;
import reedling.structure.WireSpecification;

/** A wire that only follows its turned and shifted support has no sag; a node pushed away has the push. */
class WireShapeTest {

    private static final Material STEEL = new Material("steel", 7850, 2e11, 0.3);
    private static final SupportMotion TURNED = (time, pose) -> {
        double half = 0.35;
        pose[0] = 0.02;
        pose[1] = -0.01;
        pose[2] = 0.03;
        pose[3] = Math.cos(half);
        pose[4] = Math.sin(half) * 0.6;
        pose[5] = 0;
        pose[6] = Math.sin(half) * 0.8;
    };

    private static Structure wire(EndCondition start, EndCondition end) {
        StructureBuilder builder = new StructureBuilder();
        int motion = builder.motion(TURNED);
        WireEnds ends = new WireEnds(new Position(0.1, 0, 0), new Position(0.2, 0.03, 0.01), start, end, motion);
        WireSpecification specification = new WireSpecification(
                "wire",
                STEEL,
                new CrossSection.SolidCircle(1e-3),
                ends,
                8,
                0,
                WireDamping.NONE,
                "beam",
                Map.of(),
                false);
        WireMesh.add(builder, specification, new BeamElement());
        return builder.build();
    }

    private static void check(Structure structure) {
        var body = structure.bodies().getFirst();
        assertThat(WireShape.largestSag(structure.nodes(), body)).isCloseTo(0, within(1e-15));
        structure.nodes().position[3 * 4 + 1] += 2e-4;
        assertThat(WireShape.largestSag(structure.nodes(), body)).isCloseTo(2e-4, within(1e-15));
        double[] sag = new double[3];
        WireShape.sag(structure.nodes(), body, 4, sag);
        assertThat(sag[1]).isCloseTo(2e-4, within(1e-15));
    }

    @Test
    void aWireHeldAtBothEnds() {
        check(wire(EndCondition.CLAMPED, EndCondition.CLAMPED));
    }

    @Test
    void aCantileverHeldAtItsStartOrItsEnd() {
        check(wire(EndCondition.CLAMPED, EndCondition.FREE));
        check(wire(EndCondition.FREE, EndCondition.CLAMPED));
    }
}
