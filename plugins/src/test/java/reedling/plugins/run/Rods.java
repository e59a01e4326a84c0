// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import java.util.Map;
import reedling.material.Material;
import reedling.plugin.ParameterValues;
import reedling.plugins.element.BeamElement;
import reedling.structure.CrossSection;
import reedling.structure.ElementLaw;
import reedling.structure.ElementProperties;
import reedling.structure.EndCondition;
import reedling.structure.NodeStore;
import reedling.structure.Position;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;

/** Straight rods along x, centred on the origin, with the same condition at both ends. */
final class Rods {

    private Rods() {}

    static Structure along(double length, int elements, CrossSection section, Material material, EndCondition ends) {
        BeamElement type = new BeamElement();
        ElementLaw law = type.law(new ElementProperties(section, material, 0, ParameterValues.of(type, Map.of())));
        StructureBuilder builder = new StructureBuilder();
        int[] pairs = new int[2 * elements];
        for (int e = 0; e < elements; e++) {
            pairs[2 * e] = e;
            pairs[2 * e + 1] = e + 1;
        }
        for (int n = 0; n <= elements; n++) {
            builder.node(new Position(length * ((double) n / elements - 0.5), 0, 0));
        }
        builder.body("rod", law, pairs, new Position(0, 0, 1), 0);
        builder.support(0, ends, -1);
        builder.support(elements, ends, -1);
        return builder.build();
    }

    /** Mass, kg, and moment of inertia about z through the centre, kg m2, of the nodes as they are lumped. */
    static double[] massAndInertia(NodeStore nodes) {
        double mass = 0;
        double inertia = 0;
        for (int n = 0; n < nodes.count; n++) {
            mass += nodes.mass[n];
            inertia += nodes.mass[n] * nodes.position[3 * n] * nodes.position[3 * n] + 1 / nodes.inverseInertia[n];
        }
        return new double[] {mass, inertia};
    }

    /** Velocity of the centre along z, m/s, and mean spin about y, rad/s, from momenta. */
    static double[] centreMotion(NodeStore nodes) {
        double momentum = 0;
        double turning = 0;
        for (int n = 0; n < nodes.count; n++) {
            momentum += nodes.mass[n] * nodes.velocity[3 * n + 2];
            turning += -nodes.mass[n] * nodes.position[3 * n] * nodes.velocity[3 * n + 2]
                    + nodes.spin[3 * n + 1] / nodes.inverseInertia[n];
        }
        double[] whole = massAndInertia(nodes);
        return new double[] {momentum / whole[0], turning / whole[1]};
    }
}
