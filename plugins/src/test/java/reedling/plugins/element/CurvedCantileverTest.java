// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.material.Material;
import reedling.structure.CrossSection;
import reedling.structure.EndCondition;
import reedling.structure.NodeStore;
import reedling.structure.Position;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;

/**
 * Arc of 45 degrees, radius 100, unit square section, E = 1e7, nu = 0 (unit-free), clamped, dead tip load out of its
 * plane (K.-J. Bathe and S. Bolourchi, Large displacement analysis of three-dimensional beam structures, 1979).
 */
@Tag("reference")
class CurvedCantileverTest {

    private static Structure arc(int elements) {
        StructureBuilder builder = new StructureBuilder();
        int[] pairs = new int[2 * elements];
        for (int i = 0; i <= elements; i++) {
            double phi = Math.PI / 4 * i / elements;
            builder.node(new Position(100 * (1 - Math.cos(phi)), 100 * Math.sin(phi), 0));
            if (i < elements) {
                pairs[2 * i] = i;
                pairs[2 * i + 1] = i + 1;
            }
        }
        builder.body(
                "arc",
                BeamBench.law(new CrossSection.Rectangle(1, 1), new Material("unit", 1, 1e7, 0), 0),
                pairs,
                BeamBench.UP,
                0);
        builder.support(0, EndCondition.CLAMPED, -1);
        return builder.build();
    }

    /**
     * Tip positions of a geometrically exact rod solved by shooting with GJ = 0.140577 G; 0.3 % of the radius. The
     * section here has GJ = 0.140833 G, which moves the tip by less than 0.01.
     */
    @Test
    void tipFollowsTheExactRod() {
        double[][] table = {{300, 22.113, 58.536, 40.480}, {450, 18.369, 51.970, 48.705}, {600, 15.558, 46.892, 53.607}
        };
        int elements = 16;
        Structure structure = arc(elements);
        StaticSolver solver = new StaticSolver(structure, 1e-5);
        for (double[] row : table) {
            solver.loads[6 * elements + 2] = row[0];
            // increments of a load already carried start from the last equilibrium
            solver.solve(row[0] == 300 ? 4 : 1);
            NodeStore nodes = structure.nodes();
            for (int i = 0; i < 3; i++) {
                assertThat(nodes.position[3 * elements + i]).isCloseTo(row[1 + i], within(0.3));
            }
        }
    }

    /** Eight elements at P = 600: the discretisation error of this element is known to be below 0.05 per coordinate. */
    @Test
    void eightElementsAreCloseToTheLimit() {
        Structure structure = arc(8);
        StaticSolver solver = new StaticSolver(structure, 1e-5);
        solver.loads[6 * 8 + 2] = 600;
        solver.solve(6);
        double[] limit = {15.56, 46.89, 53.61};
        for (int i = 0; i < 3; i++) {
            assertThat(structure.nodes().position[24 + i]).isCloseTo(limit[i], within(0.05));
        }
    }

    /** Small load, A. Castigliano's theorem with this section's EI and GJ, shear neglected; 0.5 %. */
    @Test
    void smallLoadFollowsCastigliano() {
        int elements = 32;
        Structure structure = arc(elements);
        StaticSolver solver = new StaticSolver(structure, 1e-5);
        solver.loads[6 * elements + 2] = 1;
        solver.solve(1);
        double phi = Math.PI / 4;
        double bending = 1e7 / 12;
        double torsion = new CrossSection.Rectangle(1, 1).torsionConstant() * 5e6;
        double expected = 1e6
                * ((phi / 2 - Math.sin(2 * phi) / 4) / bending
                        + (1.5 * phi - 2 * Math.sin(phi) + Math.sin(2 * phi) / 4) / torsion);
        assertThat(structure.nodes().position[3 * elements + 2]).isCloseTo(expected, within(0.005 * expected));
    }
}
