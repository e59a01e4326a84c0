// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * Kick-drift-kick of a range of nodes: gathers element slots, closes the old step, books energies, opens the new step.
 *
 * <p>Formula: v_n = (v + h/2 (F/m + alpha v_s)) / (1 + h/2 alpha); a_d = -alpha (v_n - v_s);
 * v' = v_n + h'/2 (F/m + a_d); x' = x + h' v'; the same without alpha for spin; q' = exp(h' w') q. Modal damping is
 * implicit in the closing kick and uses the same force in the opening one, so the whole is a mid-point rule in v_n and
 * cannot feed energy for any alpha h <= 2.
 *
 * <p>Held nodes follow their pose; velocity = displacement / h', so that their work 1/2 (R_old + R_new) . dx with
 * R = -F closes the ledger.
 *
 * <p>Source: W. C. Swope and others, 1982 (velocity form of the Verlet method), from memory.
 */
final class NodeStage {

    private final NodeStore nodes;
    private final double[] slots;
    private final int[] slotStart;
    private final int[] slotOffset;
    private final ModalDamping damping;
    private final SupportPoses poses;
    private final NodeSums sums;
    private final double[] gravity;
    private final double[][] scratch;

    NodeStage(Mesh mesh, ModalDamping damping, SupportPoses poses, NodeSums sums, Position gravity) {
        this.nodes = mesh.nodes();
        this.slots = mesh.slots();
        this.slotStart = mesh.slotStart();
        this.slotOffset = mesh.slotOffset();
        this.damping = damping;
        this.poses = poses;
        this.sums = sums;
        this.gravity = new double[] {gravity.x(), gravity.y(), gravity.z()};
        this.scratch = new double[sums.rows.length / NodeSums.ROW][3];
    }

    /** Sums the element forces of each node of a range in ascending element order into the node's force and moment. */
    void gather(int first, int last) {
        double[] force = nodes.force;
        double[] moment = nodes.moment;
        for (int n = first; n < last; n++) {
            double fx = 0;
            double fy = 0;
            double fz = 0;
            double mx = 0;
            double my = 0;
            double mz = 0;
            for (int k = slotStart[n]; k < slotStart[n + 1]; k++) {
                int s = slotOffset[k];
                fx += slots[s];
                fy += slots[s + 1];
                fz += slots[s + 2];
                mx += slots[s + 3];
                my += slots[s + 4];
                mz += slots[s + 5];
            }
            int at = 3 * n;
            force[at] = fx;
            force[at + 1] = fy;
            force[at + 2] = fz;
            moment[at] = mx;
            moment[at + 1] = my;
            moment[at + 2] = mz;
        }
    }

    /** Closes the old step (s, 0 at the start), books energies into the task's row and opens the new one (s, > 0). */
    void move(int task, int first, int last, double oldStep, double newStep) {
        int row = task * NodeSums.ROW;
        double[] r = sums.rows;
        r[row + NodeSums.KINETIC] = 0;
        r[row + NodeSums.GRAVITY] = 0;
        r[row + NodeSums.MODAL] += r[row + NodeSums.MODAL_PENDING];
        r[row + NodeSums.SUPPORT] += r[row + NodeSums.SUPPORT_PENDING];
        r[row + NodeSums.MODAL_PENDING] = 0;
        r[row + NodeSums.SUPPORT_PENDING] = 0;
        double[] triple = scratch[task];
        for (int n = first; n < last; n++) {
            if (nodes.inverseMass[n] > 0) {
                moveFree(n, row, oldStep, newStep);
            } else {
                moveHeld(n, row, oldStep, newStep, triple);
            }
            if (nodes.inverseInertia[n] > 0) {
                turnFree(n, row, oldStep, newStep);
            } else {
                turnHeld(n, row, oldStep, newStep, triple);
            }
        }
    }

    private void moveFree(int n, int row, double oldStep, double newStep) {
        double[] r = sums.rows;
        double mass = nodes.mass[n];
        double inverse = nodes.inverseMass[n];
        double alpha = damping.alpha[n];
        double close = 0.5 * oldStep;
        double open = 0.5 * newStep;
        double implicit = 1 / (1 + close * alpha);
        double s = damping.fraction[n];
        int ends = nodes.body[n] * ModalDamping.ENDS;
        double[] end = damping.endVelocity;
        double kinetic = 0;
        double potential = 0;
        double modal = 0;
        double modalPending = 0;
        double support = 0;
        double supportPending = 0;
        for (int i = 0; i < 3; i++) {
            int at = 3 * n + i;
            double force = nodes.force[at] + mass * gravity[i];
            nodes.force[at] = force;
            double a = force * inverse;
            double old = nodes.velocity[at];
            double oldSupport = end[ends + i] + s * (end[ends + 3 + i] - end[ends + i]);
            double newSupport = end[ends + 6 + i] + s * (end[ends + 9 + i] - end[ends + 6 + i]);
            double centredSupport = oldStep == 0 ? newSupport : 0.5 * (oldSupport + newSupport);
            double v = (old + close * (a + alpha * centredSupport)) * implicit;
            double drag = -alpha * (v - centredSupport);
            double opened = v + open * (a + drag);
            kinetic += v * v;
            potential += gravity[i] * nodes.position[at];
            double halfDrag = mass * drag;
            modal -= halfDrag * (old - oldSupport) * close;
            support += halfDrag * oldSupport * close;
            modalPending -= halfDrag * (opened - newSupport) * open;
            supportPending += halfDrag * newSupport * open;
            nodes.velocity[at] = opened;
            nodes.position[at] += newStep * opened;
        }
        r[row + NodeSums.KINETIC] += 0.5 * mass * kinetic;
        r[row + NodeSums.GRAVITY] -= mass * potential;
        r[row + NodeSums.MODAL] += modal;
        r[row + NodeSums.SUPPORT] += support;
        r[row + NodeSums.MODAL_PENDING] += modalPending;
        r[row + NodeSums.SUPPORT_PENDING] += supportPending;
    }

    private void turnFree(int n, int row, double oldStep, double newStep) {
        double inverse = nodes.inverseInertia[n];
        double[] spin = nodes.spin;
        double square = 0;
        for (int i = 0; i < 3; i++) {
            int at = 3 * n + i;
            double a = nodes.moment[at] * inverse;
            double w = spin[at] + 0.5 * oldStep * a;
            square += w * w;
            spin[at] = w + 0.5 * newStep * a;
        }
        sums.rows[row + NodeSums.KINETIC] += 0.5 * square / inverse;
        int at = 3 * n;
        SpatialRotation.turn(
                nodes.orientation, 4 * n, newStep * spin[at], newStep * spin[at + 1], newStep * spin[at + 2]);
    }

    private void moveHeld(int n, int row, double oldStep, double newStep, double[] next) {
        double closing = 0;
        double opening = 0;
        poses.position(nodes, n, nodes.support[n], next);
        for (int i = 0; i < 3; i++) {
            int at = 3 * n + i;
            double reaction = -nodes.force[at];
            double displacement = next[i] - nodes.position[at];
            closing += reaction * nodes.velocity[at];
            opening += reaction * displacement;
            nodes.velocity[at] = displacement / newStep;
            nodes.position[at] = next[i];
        }
        sums.rows[row + NodeSums.SUPPORT] += 0.5 * oldStep * closing;
        sums.rows[row + NodeSums.SUPPORT_PENDING] += 0.5 * opening;
    }

    private void turnHeld(int n, int row, double oldStep, double newStep, double[] rotation) {
        double closing = 0;
        double opening = 0;
        poses.rotation(nodes, n, nodes.support[n], rotation);
        for (int i = 0; i < 3; i++) {
            int at = 3 * n + i;
            double reaction = -nodes.moment[at];
            closing += reaction * nodes.spin[at];
            opening += reaction * rotation[i];
            nodes.spin[at] = rotation[i] / newStep;
        }
        poses.orient(nodes, n);
        sums.rows[row + NodeSums.SUPPORT] += 0.5 * oldStep * closing;
        sums.rows[row + NodeSums.SUPPORT_PENDING] += 0.5 * opening;
    }
}
