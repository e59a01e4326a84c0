// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import reedling.structure.Body;
import reedling.structure.NodeStore;

/**
 * How far the nodes of a line body are from where they would be if the body followed its supports without bending: on
 * the line between two held ends; at rest in the frame of the one held end; at the reference place where no end is held.
 */
public final class WireShape {

    private WireShape() {}

    /**
     * Displacement of a node relative to the moving supports.
     *
     * @param out filled with three numbers, m, world frame
     */
    public static void sag(NodeStore nodes, Body body, int node, double[] out) {
        int first = body.firstNode();
        int last = first + body.nodeCount() - 1;
        boolean firstHeld = nodes.inverseMass[first] == 0;
        boolean lastHeld = nodes.inverseMass[last] == 0;
        if (firstHeld && lastHeld) {
            betweenEnds(nodes, 3 * first, 3 * last, 3 * node, out);
        } else if (firstHeld || lastHeld) {
            fromEnd(nodes, firstHeld ? first : last, node, out);
        } else {
            for (int axis = 0; axis < 3; axis++) {
                out[axis] = nodes.position[3 * node + axis] - nodes.reference[3 * node + axis];
            }
        }
    }

    private static void betweenEnds(NodeStore nodes, int a, int b, int n, double[] out) {
        double[] rest = nodes.reference;
        double dot = 0;
        double squared = 0;
        for (int axis = 0; axis < 3; axis++) {
            double d = rest[b + axis] - rest[a + axis];
            dot += (rest[n + axis] - rest[a + axis]) * d;
            squared += d * d;
        }
        double place = squared > 0 ? dot / squared : 0;
        double[] x = nodes.position;
        for (int axis = 0; axis < 3; axis++) {
            out[axis] = x[n + axis] - Math.fma(place, x[b + axis] - x[a + axis], x[a + axis]);
        }
    }

    private static void fromEnd(NodeStore nodes, int held, int node, double[] out) {
        double[] rest = nodes.reference;
        double[] q = nodes.orientation;
        double rx = rest[3 * node] - rest[3 * held];
        double ry = rest[3 * node + 1] - rest[3 * held + 1];
        double rz = rest[3 * node + 2] - rest[3 * held + 2];
        double w = q[4 * held], x = q[4 * held + 1], y = q[4 * held + 2], z = q[4 * held + 3];
        // r + 2 w (q x r) + 2 q x (q x r)
        double cx = y * rz - z * ry, cy = z * rx - x * rz, cz = x * ry - y * rx;
        double turnedX = rx + 2 * (w * cx + y * cz - z * cy);
        double turnedY = ry + 2 * (w * cy + z * cx - x * cz);
        double turnedZ = rz + 2 * (w * cz + x * cy - y * cx);
        out[0] = nodes.position[3 * node] - nodes.position[3 * held] - turnedX;
        out[1] = nodes.position[3 * node + 1] - nodes.position[3 * held + 1] - turnedY;
        out[2] = nodes.position[3 * node + 2] - nodes.position[3 * held + 2] - turnedZ;
    }

    /** Largest such displacement of a body, m. */
    public static double largestSag(NodeStore nodes, Body body) {
        double[] one = new double[3];
        double squared = 0;
        for (int n = body.firstNode(); n < body.firstNode() + body.nodeCount(); n++) {
            sag(nodes, body, n, one);
            squared = Math.max(squared, one[0] * one[0] + one[1] * one[1] + one[2] * one[2]);
        }
        return Math.sqrt(squared);
    }
}
