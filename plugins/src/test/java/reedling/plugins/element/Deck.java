// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import java.util.Map;
import reedling.material.Material;
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

/** Polyurethane wires of 2 mm over 0.3 m under 8 N: a small screen deck for the tests. */
final class Deck {

    static final Material POLYURETHANE = new Material("polyurethane", 1200, 6e7, 0.45);

    /** Throw of 2.5 mm at 45 degrees, 20 Hz. */
    static final SupportMotion SHAKER = (time, pose) -> {
        double s = 0.0025 * StrictMath.sin(2 * Math.PI * 20 * time) / Math.sqrt(2);
        pose[0] = s;
        pose[1] = 0;
        pose[2] = s;
        pose[3] = 1;
        pose[4] = 0;
        pose[5] = 0;
        pose[6] = 0;
    };

    private Deck() {}

    static WireSpecification wire(int index, int motion, WireDamping damping, boolean rigid) {
        double y = 0.0074 * index;
        WireEnds ends = new WireEnds(
                new Position(0, y, 0),
                new Position(0.3, y, -0.026),
                EndCondition.CLAMPED,
                EndCondition.CLAMPED,
                motion);
        return new WireSpecification(
                "wire " + index,
                POLYURETHANE,
                new CrossSection.SolidCircle(0.002),
                ends,
                60,
                8,
                damping,
                "beam",
                Map.of(),
                rigid);
    }

    static Structure shaken(int wires, WireDamping damping) {
        StructureBuilder builder = new StructureBuilder().gravity(new Position(0, 0, -9.81));
        int motion = builder.motion(SHAKER);
        for (int i = 0; i < wires; i++) {
            WireMesh.add(builder, wire(i, motion, damping, false), new BeamElement());
        }
        return builder.build();
    }
}
