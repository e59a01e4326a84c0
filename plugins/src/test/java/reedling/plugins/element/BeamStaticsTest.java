// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.material.Material;
import reedling.structure.CrossSection;
import reedling.structure.ElementSet;
import reedling.structure.EndCondition;
import reedling.structure.NodeStore;
import reedling.structure.SpatialRotation;
import reedling.structure.Structure;

/** Equilibria of straight beams against textbook values. */
@Tag("reference")
class BeamStaticsTest {

    /** Slender enough for EA L^2/EI = 16 (L/d)^2 = 1e6: as good as inextensible and without shear. */
    private static final double DIAMETER = 0.004;

    private static final double SLENDER_BENDING = 2.1e11 * Math.PI * 2.56e-10 / 64;

    private static Structure slender(int elements) {
        return BeamBench.straight(
                BeamBench.law(new CrossSection.SolidCircle(DIAMETER), BeamBench.STEEL, 0),
                1,
                elements,
                EndCondition.CLAMPED,
                EndCondition.FREE);
    }

    private static double angle(NodeStore nodes, int node, int axis) {
        double[] out = new double[3];
        SpatialRotation.between(new double[] {1, 0, 0, 0}, 0, nodes.orientation, 4 * node, out);
        return out[axis];
    }

    /** Small load on a cantilever: w = PL^3/3EI + PL/kGA, textbook; 0.5 % is far above the 1e-5 geometric effect. */
    @Test
    void smallTipForceBendsAsTimoshenkoSays() {
        Structure structure = BeamBench.straight(
                BeamBench.law(new CrossSection.Rectangle(0.02, 0.01), BeamBench.STEEL, 0),
                1,
                1,
                EndCondition.CLAMPED,
                EndCondition.FREE);
        StaticSolver solver = new StaticSolver(structure, 1e-6);
        solver.loads[6 + 2] = 10;
        solver.solve(1);
        NodeStore nodes = structure.nodes();
        assertThat(nodes.position[5]).isCloseTo(0.00952381 + 7.429e-7, within(0.005 * 0.0095));
        assertThat(angle(nodes, 1, 1)).isCloseTo(-0.0142857, within(0.005 * 0.0143));
        ElementSet set = structure.elementSets().getFirst();
        double[] row = new double[6];
        set.law.results(set, 0, 1, row);
        // root moment 10 N m from one element: the moment is linear along it; stress M/W with W = b h^2/6
        assertThat(row[1]).isCloseTo(10, within(0.005 * 10));
        assertThat(row[3]).isCloseTo(10 / (0.02 * 1e-4 / 6), within(0.005 * 3e7));
        assertThat(row[5]).isZero();
    }

    /** Small tip moment: w = ML^2/2EI, theta = ML/EI, textbook, 0.5 %. */
    @Test
    void smallTipMomentBendsAsBernoulliSays() {
        Structure structure = BeamBench.straight(
                BeamBench.law(new CrossSection.Rectangle(0.02, 0.01), BeamBench.STEEL, 0),
                1,
                20,
                EndCondition.CLAMPED,
                EndCondition.FREE);
        StaticSolver solver = new StaticSolver(structure, 1e-6);
        solver.loads[6 * 20 + 4] = -20;
        solver.solve(1);
        assertThat(structure.nodes().position[62]).isCloseTo(0.0285714, within(0.005 * 0.0286));
        assertThat(angle(structure.nodes(), 20, 1)).isCloseTo(-0.0571429, within(0.005 * 0.0571));
    }

    /**
     * Elastica of a cantilever under a transverse dead tip load (K. E. Bisshopp and D. C. Drucker, Large deflection of
     * cantilever beams, 1945; table of K. Mattiasson, 1981). Rows: PL^2/EI, w/L, u/L, tip angle. 0.2 % of L at 20
     * elements: the element error at P L^2/EI = 10 is 0.03 %, the stretch 1e-5.
     */
    @Test
    void cantileverFollowsTheElastica() {
        double[][] table = {
            {1, 0.30172, 0.05643, 0.46135}, {2, 0.49346, 0.16064, 0.78175}, {3, 0.60325, 0.25442, 0.98602},
            {4, 0.66996, 0.32894, 1.12124}, {5, 0.71379, 0.38763, 1.21537}, {6, 0.74457, 0.43459, 1.28370},
            {7, 0.76737, 0.47293, 1.33496}, {8, 0.78498, 0.50483, 1.37443}, {9, 0.79906, 0.53182, 1.40547},
            {10, 0.81061, 0.55500, 1.43029}
        };
        for (int elements : new int[] {20, 10}) {
            double tolerance = elements == 20 ? 0.002 : 0.005;
            Structure structure = slender(elements);
            StaticSolver solver = new StaticSolver(structure, 1e-6);
            for (double[] row : table) {
                solver.loads[6 * elements + 2] = row[0] * SLENDER_BENDING;
                solver.solve(1);
                NodeStore nodes = structure.nodes();
                assertThat(nodes.position[3 * elements + 2]).isCloseTo(row[1], within(tolerance * row[1]));
                assertThat(1 - nodes.position[3 * elements]).isCloseTo(row[2], within(tolerance));
                assertThat(-angle(nodes, elements, 1)).isCloseTo(row[3], within(tolerance * row[3]));
            }
        }
    }

    /** Pure end moment rolls the beam into an arc of radius EI/M: exact for every mesh, closed form. */
    @Test
    void endMomentRollsTheBeamIntoACircle() {
        for (int elements : new int[] {8, 20}) {
            Structure structure = slender(elements);
            StaticSolver solver = new StaticSolver(structure, 1e-6);
            double[] parts = {0.125, 0.25, 0.5, 1};
            double last = 0;
            for (double part : parts) {
                for (double p = last + 0.0625; p <= part; p += 0.0625) {
                    solver.loads[6 * elements + 4] = -2 * Math.PI * SLENDER_BENDING * p;
                    solver.solve(1);
                }
                last = part;
                double total = 2 * Math.PI * part;
                NodeStore nodes = structure.nodes();
                // the chord of each element keeps its length, so nodes lie on a polygon of sides L/n
                double side = 1.0 / elements;
                double turn = total / elements;
                double radius = 0.5 * side / Math.sin(0.5 * turn);
                assertThat(nodes.position[3 * elements]).isCloseTo(radius * Math.sin(total), within(1e-7));
                assertThat(nodes.position[3 * elements + 2]).isCloseTo(radius * (1 - Math.cos(total)), within(1e-7));
                // the arc of the continuous beam, 0.5 % of L
                assertThat(nodes.position[3 * elements])
                        .isCloseTo(Math.sin(total) / total, within(elements == 20 ? 0.005 : 0.03));
                assertUniformMoment(structure, elements, 2 * Math.PI * SLENDER_BENDING * part);
            }
        }
    }

    private static void assertUniformMoment(Structure structure, int elements, double moment) {
        ElementSet set = structure.elementSets().getFirst();
        double[] rows = new double[6 * elements];
        set.law.results(set, 0, elements, rows);
        for (int e = 0; e < elements; e++) {
            assertThat(rows[6 * e + 1]).isCloseTo(moment, within(1e-5 * moment));
        }
    }

    /** Post-buckled column (S. Timoshenko and J. Gere, Theory of elastic stability, table of the elastica), 0.5 %. */
    @Test
    void bucklingColumnFollowsTheElastica() {
        double[][] table = {
            {1.015, 19.743, 0.97050, 0.21667},
            {1.063, 39.800, 0.88236, 0.42035},
            {1.152, 60.050, 0.74061, 0.59358},
            {1.293, 79.899, 0.56039, 0.71899},
            {1.518, 99.972, 0.34929, 0.79148}
        };
        // the critical load of the mesh is 0.26/n^2 high, which the first row magnifies by 70
        int elements = 90;
        Structure structure = slender(elements);
        StaticSolver full = new StaticSolver(structure, 1e-6);
        StaticSolver solver = new StaticSolver(full, d -> d == 0 || d == 2 || d == 4);
        double critical = Math.PI * Math.PI * SLENDER_BENDING / 4;
        // from the far end backwards: begin well bent by a side load, then take it away
        solver.loads[6 * elements] = -1.518 * critical;
        solver.loads[6 * elements + 2] = critical;
        solver.solve(4);
        solver.loads[6 * elements + 2] = 0;
        for (int row = table.length - 1; row >= 0; row--) {
            solver.loads[6 * elements] = -table[row][0] * critical;
            solver.solve(1);
            NodeStore nodes = structure.nodes();
            double degrees = Math.toDegrees(-angle(nodes, elements, 1));
            double tolerance = 0.005;
            assertThat(degrees).isCloseTo(table[row][1], within(tolerance * table[row][1]));
            assertThat(nodes.position[3 * elements]).isCloseTo(table[row][2], within(tolerance));
            assertThat(nodes.position[3 * elements + 2]).isCloseTo(table[row][3], within(tolerance * table[row][3]));
        }
    }

    /** Twist of a bar, TL/GJ, textbook: exact for any mesh, 0.5 % asked. */
    @Test
    void torqueTwistsTheBar() {
        double diameter = Math.sqrt(Math.sqrt(32 * 1.5708e-8 / Math.PI));
        Material bar = new Material("bar", 7850, 2 * 8e10 * 1.3, 0.3);
        Structure structure = BeamBench.straight(
                BeamBench.law(new CrossSection.SolidCircle(diameter), bar, 0),
                1,
                20,
                EndCondition.CLAMPED,
                EndCondition.FREE);
        StaticSolver solver = new StaticSolver(structure, 1e-6);
        solver.loads[6 * 20 + 3] = 10;
        solver.solve(1);
        assertThat(angle(structure.nodes(), 20, 0)).isCloseTo(0.00795775, within(1e-5 * 0.008));
        ElementSet set = structure.elementSets().getFirst();
        double[] rows = new double[6 * 20];
        set.law.results(set, 0, 20, rows);
        assertThat(rows[6 * 7 + 2]).isCloseTo(10, within(1e-7 * 10));
    }
}
