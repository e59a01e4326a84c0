// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;
import reedling.structure.CrossSection;
import reedling.structure.EndCondition;
import reedling.structure.NodeStore;
import reedling.structure.Position;
import reedling.structure.SpatialRotation;
import reedling.structure.Structure;

/** The forces are the exact gradient of the strain energy, objective and balanced, for rotations of any size. */
class BeamGradientTest {

    private static final double LENGTH = 0.05;

    private static Structure one() {
        return BeamBench.straight(
                BeamBench.law(new CrossSection.Rectangle(0.004, 0.002), BeamBench.STEEL, 0),
                LENGTH,
                1,
                EndCondition.FREE,
                EndCondition.FREE);
    }

    private static Structure bent(long seed, double angle, double stretch) {
        Structure structure = one();
        Random random = new Random(seed);
        NodeStore nodes = structure.nodes();
        for (int n = 0; n < 2; n++) {
            SpatialRotation.turn(
                    nodes.orientation,
                    4 * n,
                    angle * (2 * random.nextDouble() - 1),
                    angle * (2 * random.nextDouble() - 1),
                    angle * (2 * random.nextDouble() - 1));
            for (int i = 0; i < 3; i++) {
                nodes.position[3 * n + i] += stretch * LENGTH * (2 * random.nextDouble() - 1);
            }
        }
        return structure;
    }

    private static double energy(Structure structure) {
        structure.evaluateForces();
        return structure.strainEnergy();
    }

    /** Central differences of 1e-5 have a relative error of about 1e-9; 1e-6 leaves room for cancellation. */
    @Test
    void forcesAreMinusTheEnergyGradient() {
        for (long seed = 1; seed <= 20; seed++) {
            double angle = seed <= 10 ? 0.4 : 0.02;
            Structure structure = bent(seed, angle, 0.1);
            StaticSolver solver = new StaticSolver(structure, 1e-6);
            structure.evaluateForces();
            NodeStore nodes = structure.nodes();
            double[] force = nodes.force.clone();
            double[] moment = nodes.moment.clone();
            double forceScale = largest(force);
            double momentScale = largest(moment);
            for (int d = 0; d < 12; d++) {
                double step = d % 6 < 3 ? 1e-5 * LENGTH : 1e-5;
                double[] x = nodes.position.clone();
                double[] q = nodes.orientation.clone();
                solver.displace(d, step);
                double above = energy(structure);
                System.arraycopy(x, 0, nodes.position, 0, 6);
                System.arraycopy(q, 0, nodes.orientation, 0, 8);
                solver.displace(d, -step);
                double below = energy(structure);
                System.arraycopy(x, 0, nodes.position, 0, 6);
                System.arraycopy(q, 0, nodes.orientation, 0, 8);
                double expected = -(above - below) / (2 * step);
                double got = d % 6 < 3 ? force[3 * (d / 6) + d % 6] : moment[3 * (d / 6) + d % 6 - 3];
                assertThat(got)
                        .as("seed %d direction %d", seed, d)
                        .isCloseTo(expected, within(1e-6 * (d % 6 < 3 ? forceScale : momentScale)));
            }
        }
    }

    private static double largest(double[] values) {
        double largest = 0;
        for (double value : values) {
            largest = Math.max(largest, Math.abs(value));
        }
        return largest;
    }

    @Test
    void forcesAndMomentsBalanceExactly() {
        Structure structure = bent(7, 0.5, 0.2);
        structure.evaluateForces();
        NodeStore nodes = structure.nodes();
        double[] f = nodes.force;
        double[] x = nodes.position;
        double scale = largest(f);
        for (int i = 0; i < 3; i++) {
            int j = (i + 1) % 3;
            int k = (i + 2) % 3;
            double moment = nodes.moment[i] + nodes.moment[3 + i];
            for (int n = 0; n < 2; n++) {
                moment += x[3 * n + j] * f[3 * n + k] - x[3 * n + k] * f[3 * n + j];
            }
            assertThat(f[i] + f[3 + i]).isZero();
            assertThat(moment).isCloseTo(0, within(1e-14 * scale));
        }
    }

    @Test
    void rigidMotionLeavesNoForce() {
        Structure structure = one();
        NodeStore nodes = structure.nodes();
        double[] turn = {0.3, -1.1, 0.7};
        for (int n = 0; n < 2; n++) {
            SpatialRotation.turn(nodes.orientation, 4 * n, turn[0], turn[1], turn[2]);
        }
        double w = nodes.orientation[0];
        double x = nodes.orientation[1];
        double y = nodes.orientation[2];
        double z = nodes.orientation[3];
        // first column of the rotation matrix times the length, shifted
        nodes.position[3] = 1 + LENGTH * (1 - 2 * (y * y + z * z));
        nodes.position[4] = 2 + LENGTH * 2 * (x * y + w * z);
        nodes.position[5] = 3 + LENGTH * 2 * (x * z - w * y);
        nodes.position[0] = 1;
        nodes.position[1] = 2;
        nodes.position[2] = 3;
        structure.evaluateForces();
        double axialStiffness = BeamBench.STEEL.youngsModulus() * 8e-6;
        // coordinates near 3 m resolve the strain of a 50 mm element to 1e-14
        assertThat(largest(nodes.force)).isLessThan(5e-14 * axialStiffness);
    }

    /** Every direction and section axis: the frame is orthonormal, right-handed and starts along the chord. */
    @Test
    void frameFollowsChordAndUp() {
        Random random = new Random(11);
        for (int trial = 0; trial < 60; trial++) {
            Position a = new Position(random.nextGaussian(), random.nextGaussian(), random.nextGaussian());
            Position b = trial < 6
                    ? new Position(
                            a.x() + (trial % 3 == 0 ? 1 : 0) * (trial < 3 ? 1 : -1),
                            a.y() + (trial % 3 == 1 ? 1 : 0) * (trial < 3 ? 1 : -1),
                            a.z() + (trial % 3 == 2 ? 1 : 0) * (trial < 3 ? 1 : -1))
                    : new Position(random.nextGaussian(), random.nextGaussian(), random.nextGaussian());
            double[] q = new double[4];
            ElementFrame.write(a, b, BeamBench.UP, q, 0);
            double length = a.distance(b);
            double[] chord = {(b.x() - a.x()) / length, (b.y() - a.y()) / length, (b.z() - a.z()) / length};
            double[] e1 = {
                1 - 2 * (q[2] * q[2] + q[3] * q[3]), 2 * (q[1] * q[2] + q[0] * q[3]), 2 * (q[1] * q[3] - q[0] * q[2])
            };
            for (int i = 0; i < 3; i++) {
                assertThat(e1[i]).isCloseTo(chord[i], within(1e-14));
            }
            // axis 2 is level, because up is vertical
            double level = 2 * (q[2] * q[3] + q[0] * q[1]);
            assertThat(level).isCloseTo(0, within(1e-14));
        }
    }

    @Test
    void forcesDoNotJumpBetweenSeriesAndHalving() {
        double[] moment = new double[2];
        for (int side = 0; side < 2; side++) {
            Structure structure = one();
            // sin^2 of the half angle crosses 2e-3 at a relative rotation of 0.08945...
            double angle = 2 * Math.asin(Math.sqrt(2e-3)) * (1 + (side == 0 ? -1e-12 : 1e-12));
            SpatialRotation.turn(structure.nodes().orientation, 4, 0, 0.8 * angle, 0.6 * angle);
            structure.evaluateForces();
            moment[side] = structure.nodes().moment[4];
        }
        assertThat(moment[1]).isCloseTo(moment[0], within(1e-11 * Math.abs(moment[0])));
    }
}
