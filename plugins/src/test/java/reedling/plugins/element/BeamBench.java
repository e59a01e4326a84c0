// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import java.util.Map;
import reedling.material.Material;
import reedling.plugin.ParameterValues;
import reedling.structure.CrossSection;
import reedling.structure.ElementLaw;
import reedling.structure.ElementProperties;
import reedling.structure.EndCondition;
import reedling.structure.NodalLoads;
import reedling.structure.Position;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;

/** Straight beams along x, a plain step loop and sums of momentum: what the tests of the beam element share. */
final class BeamBench {

    static final Position ORIGIN = new Position(0, 0, 0);
    static final Position UP = new Position(0, 0, 1);
    static final Material STEEL = new Material("steel", 7850, 2.1e11, 0.3);

    private BeamBench() {}

    static ElementLaw law(CrossSection section, Material material, double dampingTime) {
        return law(section, material, dampingTime, 1);
    }

    static ElementLaw law(CrossSection section, Material material, double dampingTime, double inertiaFactor) {
        BeamElement type = new BeamElement();
        ParameterValues values = ParameterValues.of(type, Map.of(BeamElement.INERTIA_FACTOR, inertiaFactor));
        return type.law(new ElementProperties(section, material, dampingTime, values));
    }

    static Structure straight(ElementLaw law, double length, int elements, EndCondition start, EndCondition end) {
        return straight(law, length, elements, start, end, 0);
    }

    static Structure straight(
            ElementLaw law, double length, int elements, EndCondition start, EndCondition end, double prestretch) {
        StructureBuilder builder = new StructureBuilder();
        line(builder, law, ORIGIN, new Position(length, 0, 0), elements, prestretch);
        builder.support(0, start, -1);
        builder.support(elements, end, -1);
        return builder.build();
    }

    static void line(StructureBuilder builder, ElementLaw law, Position a, Position b, int elements, double stretch) {
        int[] pairs = new int[2 * elements];
        for (int i = 0; i <= elements; i++) {
            int node = builder.node(a.towards(b, (double) i / elements));
            if (i < elements) {
                pairs[2 * i] = node;
            }
            if (i > 0) {
                pairs[2 * i - 1] = node;
            }
        }
        builder.body("line", law, pairs, UP, stretch);
    }

    /** A step loop over one structure with constant or changing steps. */
    static final class Loop {
        final Structure structure;
        final NodalLoads loads;
        double time;
        double oldStep;
        double strainEnergy;

        Loop(Structure structure, NodalLoads loads) {
            this.structure = structure;
            this.loads = loads;
        }

        void step(double step) {
            for (int task = 0; task < structure.elementTasks(); task++) {
                structure.elementForces(task, oldStep);
            }
            strainEnergy = structure.strainEnergy();
            structure.poseSupports(time + step, step);
            for (int task = 0; task < structure.nodeTasks(); task++) {
                structure.moveNodes(task, oldStep, step, loads);
            }
            time += step;
            oldStep = step;
        }
    }

    /** Linear (0-2) and angular (3-5) momentum of the half-step state about the origin, kg m/s and kg m2/s. */
    static double[] momentum(Structure structure) {
        double[] sum = new double[6];
        var nodes = structure.nodes();
        for (int n = 0; n < nodes.count; n++) {
            double m = nodes.mass[n];
            double[] x = {nodes.position[3 * n], nodes.position[3 * n + 1], nodes.position[3 * n + 2]};
            double[] v = {nodes.velocity[3 * n], nodes.velocity[3 * n + 1], nodes.velocity[3 * n + 2]};
            for (int i = 0; i < 3; i++) {
                int j = (i + 1) % 3;
                int k = (i + 2) % 3;
                sum[i] += m * v[i];
                sum[3 + i] += m * (x[j] * v[k] - x[k] * v[j]) + nodes.spin[3 * n + i] / nodes.inverseInertia[n];
            }
        }
        return sum;
    }
}
