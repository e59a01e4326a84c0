// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static reedling.structure.EndCondition.CLAMPED;
import static reedling.structure.EndCondition.FREE;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.structure.CrossSection;
import reedling.structure.NodeStore;
import reedling.structure.Structure;

/** How the error falls with the mesh; the limits themselves are closed forms. */
@Tag("convergence")
class BeamErrorTableTest {

    private static final double DIAMETER = 0.004;
    private static final double SLENDER_BENDING = 2.1e11 * Math.PI * 2.56e-10 / 64;

    private static Structure slender(int elements) {
        return BeamBench.straight(
                BeamBench.law(new CrossSection.SolidCircle(DIAMETER), BeamBench.STEEL, 0), 1, elements, CLAMPED, FREE);
    }

    /**
     * Second order: the errors of tip deflection and shortening in per cent of L fall by four per doubling. The columns
     * were measured with an earlier prototype of the same formulas, so they guard the translation, not the physics; 10 % or the last digit of the reference.
     */
    @Test
    void elasticaErrorIsOfSecondOrder() {
        double[][] reference = {{1, 0.30172, 0.05643}, {5, 0.71379, 0.38763}, {10, 0.81061, 0.55500}};
        double[][][] known = {
            {{0.050, -0.058}, {0.012, -0.015}, {0.003, -0.004}},
            {{0.536, -0.052}, {0.127, -0.019}, {0.032, -0.005}},
            {{0.818, 0.073}, {0.186, -0.001}, {0.046, -0.002}}
        };
        for (int row = 0; row < 3; row++) {
            double[] deflection = new double[3];
            for (int level = 0; level < 3; level++) {
                int elements = 4 << level;
                Structure structure = slender(elements);
                StaticSolver solver = new StaticSolver(structure, 1e-6);
                solver.loads[6 * elements + 2] = reference[row][0] * SLENDER_BENDING;
                solver.solve(2);
                NodeStore nodes = structure.nodes();
                deflection[level] = 100 * (nodes.position[3 * elements + 2] - reference[row][1]);
                double shortening = 100 * (1 - nodes.position[3 * elements] - reference[row][2]);
                assertKnown(deflection[level], known[row][level][0]);
                assertKnown(shortening, known[row][level][1]);
            }
            assertThat(deflection[0] / deflection[1]).isBetween(3.5, 4.7);
            assertThat(deflection[1] / deflection[2]).isBetween(3.3, 4.7);
        }
    }

    private static void assertKnown(double got, double expected) {
        assertThat(got).isCloseTo(expected, within(0.1 * Math.abs(expected) + 0.0015));
    }

    /**
     * Round steel wire of 1 mm and 50 mm, clamped and free: errors of three modes in per cent at 4, 8, 16 and 32
     * elements, measured with an earlier prototype of the same formulas; 10 % of the error or 0.03.
     */
    @Test
    void roundWireHasTheKnownFrequencyErrors() {
        double[][] known = {{-2.81, -8.98, -14.1}, {-0.74, -2.61, -4.35}, {-0.21, -0.81, -1.47}, {-0.07, -0.35, -0.72}};
        double[] roots = {1.875104, 4.694091, 7.854757};
        double speed = Math.sqrt(2.1e11 / 7850) * 0.001 / 4;
        for (int level = 0; level < 4; level++) {
            Structure structure = BeamBench.straight(
                    BeamBench.law(new CrossSection.SolidCircle(0.001), BeamBench.STEEL, 0),
                    0.05,
                    4 << level,
                    CLAMPED,
                    FREE);
            // differences of 1e-6 m would stretch these short elements enough to act like a small tension
            double[] got = new StaticSolver(new StaticSolver(structure, 1e-7), d -> d == 2 || d == 4).frequencies();
            for (int mode = 0; mode < 3; mode++) {
                double exact = roots[mode] * roots[mode] / 0.0025 * speed / (2 * Math.PI);
                double error = 100 * (got[mode] / exact - 1);
                assertThat(error)
                        .as("%d elements, mode %d", 4 << level, mode + 1)
                        .isCloseTo(known[level][mode], within(0.1 * Math.abs(known[level][mode]) + 0.03));
            }
        }
    }
}
