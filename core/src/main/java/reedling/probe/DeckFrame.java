// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.util.List;
import reedling.structure.Body;
import reedling.structure.NodeStore;
import reedling.structure.Structure;

/**
 * The frame that moves with a deck of nearly parallel wires: origin in the mean of the wires' end nodes, axes along the
 * wires, across them and out of the deck. End nodes are held, so the frame follows the supports and not the wires.
 * Errors: fewer than two wires. Threads: one.
 */
public final class DeckFrame {

    private final NodeStore nodes;
    private final int[] bodies;
    private final int[] startNode;
    private final int[] endNode;
    private final double[] origin = new double[3];
    private final double[] along = new double[3];
    private final double[] across = new double[3];
    private final double[] normal = new double[3];
    private final double length;
    private final double meanGap;
    private final double width;

    /**
     * @param bodies numbers of the wires' bodies, from one side of the deck to the other
     */
    public DeckFrame(Structure structure, int[] bodies) {
        if (bodies.length < 2) {
            throw new IllegalArgumentException("a deck of " + bodies.length + " wires has no gap");
        }
        this.bodies = bodies.clone();
        nodes = structure.nodes();
        startNode = new int[bodies.length];
        endNode = new int[bodies.length];
        double sumLength = 0;
        for (int k = 0; k < bodies.length; k++) {
            Body body = structure.bodies().get(bodies[k]);
            startNode[k] = body.firstNode();
            endNode[k] = body.firstNode() + body.nodeCount() - 1;
            sumLength += distance(startNode[k], endNode[k]);
        }
        length = sumLength / bodies.length;
        update();
        double pitches = 0;
        double sumGap = 0;
        List<Body> all = structure.bodies();
        for (int k = 1; k < bodies.length; k++) {
            double pitch = Math.abs(acrossOf(k) - acrossOf(k - 1));
            pitches += pitch;
            sumGap += pitch
                    - all.get(bodies[k]).section().contactRadius()
                    - all.get(bodies[k - 1]).section().contactRadius();
        }
        meanGap = sumGap / (bodies.length - 1);
        width = pitches * bodies.length / (bodies.length - 1);
    }

    private double distance(int a, int b) {
        double squared = 0;
        for (int axis = 0; axis < 3; axis++) {
            double d = nodes.reference[3 * b + axis] - nodes.reference[3 * a + axis];
            squared += d * d;
        }
        return Math.sqrt(squared);
    }

    private double acrossOf(int wire) {
        double sum = 0;
        for (int axis = 0; axis < 3; axis++) {
            double middle = nodes.position[3 * startNode[wire] + axis] + nodes.position[3 * endNode[wire] + axis];
            sum += 0.5 * middle * across[axis];
        }
        return sum;
    }

    /** Follows the supports to where they are now. */
    public void update() {
        double[] x = nodes.position;
        int last = bodies.length - 1;
        for (int axis = 0; axis < 3; axis++) {
            double ends = 0;
            double direction = 0;
            for (int k = 0; k <= last; k++) {
                double start = x[3 * startNode[k] + axis];
                double end = x[3 * endNode[k] + axis];
                ends += start + end;
                direction += end - start;
            }
            origin[axis] = ends / (2.0 * bodies.length);
            along[axis] = direction;
            across[axis] = x[3 * startNode[last] + axis]
                    + x[3 * endNode[last] + axis]
                    - x[3 * startNode[0] + axis]
                    - x[3 * endNode[0] + axis];
        }
        scale(along);
        double common = dot(along, across);
        for (int axis = 0; axis < 3; axis++) {
            across[axis] -= common * along[axis];
        }
        scale(across);
        for (int axis = 0; axis < 3; axis++) {
            int second = (axis + 1) % 3;
            int third = (axis + 2) % 3;
            normal[axis] = along[second] * across[third] - along[third] * across[second];
        }
    }

    /** Writes the place of a point (m, world frame) in this frame: along, across, out of the deck, m. */
    public void place(double x, double y, double z, double[] out) {
        double dx = x - origin[0], dy = y - origin[1], dz = z - origin[2];
        out[0] = dx * along[0] + dy * along[1] + dz * along[2];
        out[1] = dx * across[0] + dy * across[1] + dz * across[2];
        out[2] = dx * normal[0] + dy * normal[1] + dz * normal[2];
    }

    /** Part across the wires of a vector that starts at a place of an array. */
    double across(double[] vectors, int at) {
        return vectors[at] * across[0] + vectors[at + 1] * across[1] + vectors[at + 2] * across[2];
    }

    /** Body numbers of the wires. */
    public int[] bodies() {
        return bodies.clone();
    }

    /** Mean distance between the wires' ends, m. */
    public double length() {
        return length;
    }

    /** Mean clear distance between neighbouring wires, m. */
    public double gap() {
        return meanGap;
    }

    /** Width of the deck, m: as many pitches as there are wires. */
    public double width() {
        return width;
    }

    /** Open length of all gaps together, m. */
    public double openLength() {
        return (bodies.length - 1) * length;
    }

    private static double dot(double[] a, double[] b) {
        return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
    }

    private static void scale(double[] vector) {
        double size = Math.sqrt(dot(vector, vector));
        for (int axis = 0; axis < 3; axis++) {
            vector[axis] /= size;
        }
    }
}
