// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.EigenDecompositionSymmetric;
import org.hipparchus.linear.LUDecomposition;
import org.hipparchus.linear.RealMatrix;
import reedling.structure.NodeStore;
import reedling.structure.SpatialRotation;
import reedling.structure.Structure;

/** Newton's method and vibration modes with a finite-difference stiffness: slow, simple, independent of any tangent. */
final class StaticSolver {

    private final Structure structure;
    private final NodeStore nodes;
    private final int[] unknown;
    private final double step;

    /** Dead loads: force and moment per node, 6 numbers each. */
    final double[] loads;

    /** @param step displacement (m) and rotation (rad) of the central differences */
    StaticSolver(Structure structure, double step) {
        this.structure = structure;
        this.nodes = structure.nodes();
        this.step = step;
        this.loads = new double[6 * nodes.count];
        this.unknown = java.util.stream.IntStream.range(0, 6 * nodes.count)
                .filter(d -> (d % 6 < 3 ? nodes.inverseMass : nodes.inverseInertia)[d / 6] > 0)
                .toArray();
    }

    /** Keeps only unknowns of the given directions (0-2 displacement, 3-5 rotation). */
    StaticSolver(StaticSolver other, java.util.function.IntPredicate direction) {
        this.structure = other.structure;
        this.nodes = other.nodes;
        this.step = other.step;
        this.loads = other.loads;
        this.unknown = java.util.Arrays.stream(other.unknown)
                .filter(d -> direction.test(d % 6))
                .toArray();
    }

    /** Solves for equilibrium in equal load increments; fails the test where Newton's method does not converge. */
    void solve(int increments) {
        for (int i = 1; i <= increments; i++) {
            double change = Double.POSITIVE_INFINITY;
            for (int iteration = 0; iteration < 60 && change > 1e-8; iteration++) {
                change = improve((double) i / increments);
            }
            if (!(change <= 1e-8)) {
                throw new AssertionError("no equilibrium at load increment " + i + ", last change " + change);
            }
        }
    }

    /** One Newton step, shortened so that no node turns by more than 0.3 rad; returns the largest change (m, rad). */
    private double improve(double loadPart) {
        double[] r = residual(loadPart);
        double[] du = new LUDecomposition(stiffness())
                .getSolver()
                .solve(new ArrayRealVector(r))
                .toArray();
        double turn = 0;
        double change = 0;
        for (int a = 0; a < du.length; a++) {
            change = Math.max(change, Math.abs(du[a]));
            turn = unknown[a] % 6 < 3 ? turn : Math.max(turn, Math.abs(du[a]));
        }
        double part = Math.min(1, 0.3 / turn);
        for (int a = 0; a < unknown.length; a++) {
            displace(unknown[a], part * du[a]);
        }
        return change;
    }

    private double[] residual(double part) {
        structure.evaluateForces();
        double[] r = new double[unknown.length];
        for (int a = 0; a < r.length; a++) {
            r[a] = force(unknown[a]) + part * loads[unknown[a]];
        }
        return r;
    }

    private double force(int d) {
        int n = d / 6;
        int i = d % 6;
        return i < 3 ? nodes.force[3 * n + i] : nodes.moment[3 * n + i - 3];
    }

    void displace(int d, double amount) {
        int n = d / 6;
        int i = d % 6;
        if (i < 3) {
            nodes.position[3 * n + i] += amount;
        } else {
            SpatialRotation.turn(
                    nodes.orientation, 4 * n, i == 3 ? amount : 0, i == 4 ? amount : 0, i == 5 ? amount : 0);
        }
    }

    /** Minus the derivative of the element forces by the unknowns. */
    RealMatrix stiffness() {
        int size = unknown.length;
        double[][] k = new double[size][size];
        for (int b = 0; b < size; b++) {
            double[] saveX = nodes.position.clone();
            double[] saveQ = nodes.orientation.clone();
            displace(unknown[b], step);
            structure.evaluateForces();
            for (int a = 0; a < size; a++) {
                k[a][b] = -force(unknown[a]);
            }
            restore(saveX, saveQ);
            displace(unknown[b], -step);
            structure.evaluateForces();
            for (int a = 0; a < size; a++) {
                k[a][b] = (k[a][b] + force(unknown[a])) / (2 * step);
            }
            restore(saveX, saveQ);
        }
        return new Array2DRowRealMatrix(k, false);
    }

    private void restore(double[] x, double[] q) {
        System.arraycopy(x, 0, nodes.position, 0, x.length);
        System.arraycopy(q, 0, nodes.orientation, 0, q.length);
    }

    /** Squared angular frequencies in ascending order, 1/s2. */
    double[] squaredFrequencies() {
        double[][] k = stiffness().getData();
        int size = unknown.length;
        for (int a = 0; a < size; a++) {
            for (int b = 0; b <= a; b++) {
                double mean = 0.5 * (k[a][b] + k[b][a]) * Math.sqrt(inverse(unknown[a]) * inverse(unknown[b]));
                k[a][b] = mean;
                k[b][a] = mean;
            }
        }
        double[] values = new EigenDecompositionSymmetric(new Array2DRowRealMatrix(k, false)).getEigenvalues();
        java.util.Arrays.sort(values);
        return values;
    }

    /** Frequencies in ascending order, Hz. */
    double[] frequencies() {
        double[] squared = squaredFrequencies();
        double[] hertz = new double[squared.length];
        for (int i = 0; i < hertz.length; i++) {
            hertz[i] = Math.sqrt(Math.max(0, squared[i])) / (2 * Math.PI);
        }
        return hertz;
    }

    private double inverse(int d) {
        return (d % 6 < 3 ? nodes.inverseMass : nodes.inverseInertia)[d / 6];
    }
}
