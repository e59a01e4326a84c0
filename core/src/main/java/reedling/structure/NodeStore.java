// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import java.io.DataInput;
import java.io.DataOutput;
import java.io.IOException;
import java.util.Arrays;

/**
 * Flat arrays of all nodes, world frame, SI.
 *
 * <p>Owned by {@link Structure}; a thread writes only the nodes of the range it was given. Velocity and spin are those
 * of the last opening half kick (half-step values).
 */
public final class NodeStore {

    /** Number of nodes. */
    public final int count;

    /** Reference positions, m, 3 per node. */
    public final double[] reference;

    /** Positions x, m, 3 per node. */
    public final double[] position;

    /** Velocities v, m/s, 3 per node. */
    public final double[] velocity;

    /** Orientation quaternions q as w, x, y, z, 4 per node; identity as meshed. */
    public final double[] orientation;

    /** Spatial spin, rad/s, 3 per node. */
    public final double[] spin;

    /** Force of the last node stage, N, 3 per node: elements, loads and gravity, without modal damping. */
    public final double[] force;

    /** Moment of the last node stage, N m, 3 per node. */
    public final double[] moment;

    /** Mass, kg, one per node, also of held nodes. */
    public final double[] mass;

    /** 1/m, 1/kg; 0 where the position is held. */
    public final double[] inverseMass;

    /** 1/J, 1/(kg m2); 0 where the orientation is held. */
    public final double[] inverseInertia;

    /** Index of the support motion a held node follows; -1 for a support at rest or a free node. */
    public final int[] support;

    /** Index of the body a node belongs to. */
    public final int[] body;

    NodeStore(int count) {
        this.count = count;
        reference = new double[3 * count];
        position = new double[3 * count];
        velocity = new double[3 * count];
        orientation = new double[4 * count];
        spin = new double[3 * count];
        force = new double[3 * count];
        moment = new double[3 * count];
        mass = new double[count];
        inverseMass = new double[count];
        inverseInertia = new double[count];
        support = new int[count];
        body = new int[count];
        Arrays.fill(support, -1);
    }

    void write(DataOutput out) throws IOException {
        for (double[] column : state()) {
            Columns.write(column, out);
        }
    }

    void read(DataInput in) throws IOException {
        for (double[] column : state()) {
            Columns.read(column, in);
        }
    }

    private double[][] state() {
        return new double[][] {position, velocity, orientation, spin, force, moment};
    }
}
