// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.Arrays;
import reedling.neighbour.Chunk;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/**
 * Motion of grains under the generalised midpoint rule with steps of h,
 *
 * <pre>
 * v_theta = v0 + theta h a(x_theta, v_theta)        x_theta = x0 + theta h v_theta
 * x1 = x0 + h v_theta                               v1 = v0 + (v_theta - v0) / theta
 * </pre>
 *
 * and likewise for spins. In a trial, grain rows hold x_theta and the mean velocity on the way there, (v0 + v_theta) / 2:
 * just what a step of length theta h leaves, so that laws that advance a stretch and look half a step ahead for their
 * dashpots need not know of trials.
 *
 * <p>Source: generalised midpoint rule as in J. C. Simo and T. J. R. Hughes, Computational Inelasticity, 1998 (from
 * memory). Threads: the rows of a chunk belong to its task.
 */
final class MidpointMotion {

    /** Part of a radius that a grain's displacement may still change by when its velocity counts as settled. */
    private static final double ROUND_OFF = 1e-13;

    private static final int[] OFFSETS = {GrainRow.V, GrainRow.W};

    private final GrainStore grains;
    private double[] startRows = new double[0];
    private double[] startForces = new double[0];

    MidpointMotion(GrainStore grains) {
        this.grains = grains;
    }

    /** Makes room for all grains there are. */
    void makeRoom() {
        if (startRows.length < grains.rows().length) {
            startRows = new double[grains.rows().length];
            startForces = new double[grains.forces().length];
        }
    }

    /** Remembers where grains stand and what pushes them there. */
    void start(Chunk chunk, MoveTally tally) {
        GrainMotion.importForces(chunk, grains);
        int at = GrainRow.at(chunk.from());
        int f = GrainRow.forceAt(chunk.from());
        System.arraycopy(grains.rows(), at, startRows, at, GrainRow.at(chunk.to()) - at);
        System.arraycopy(grains.forces(), f, startForces, f, GrainRow.forceAt(chunk.to()) - f);
        for (int g = chunk.from(); g < chunk.to(); g++) {
            GrainMotion.frequency(startRows, GrainRow.at(g), startForces, GrainRow.forceAt(g), tally);
        }
    }

    /**
     * First trial, from the forces at the start.
     *
     * @param span theta h, s
     * @return largest speed of a grain or of its surface by its spin, m/s
     */
    double predict(Chunk chunk, double span) {
        double largest = 0;
        for (int g = chunk.from(); g < chunk.to(); g++) {
            int at = GrainRow.at(g);
            aim(at, startForces, GrainRow.forceAt(g), span);
            double spin = startRows[at + GrainRow.RADIUS] * length(grains.rows(), at + GrainRow.W);
            largest = Math.max(largest, Math.max(length(grains.rows(), at + GrainRow.V), spin));
        }
        clear(chunk);
        return largest;
    }

    /**
     * Next trial, from the forces of the last.
     *
     * @param span theta h, s
     * @param accepted change of v_theta that counts as none, m/s
     * @return whether all grains have settled
     */
    boolean correct(Chunk chunk, double span, double accepted) {
        GrainMotion.importForces(chunk, grains);
        double[] rows = grains.rows();
        boolean settled = true;
        for (int g = chunk.from(); g < chunk.to(); g++) {
            int at = GrainRow.at(g);
            double vx = rows[at + GrainRow.V], vy = rows[at + GrainRow.V + 1], vz = rows[at + GrainRow.V + 2];
            double wx = rows[at + GrainRow.W], wy = rows[at + GrainRow.W + 1], wz = rows[at + GrainRow.W + 2];
            aim(at, grains.forces(), GrainRow.forceAt(g), span);
            double radius = rows[at + GrainRow.RADIUS];
            double change = 2 * changeOf(rows, at + GrainRow.V, vx, vy, vz); // rows hold means with v0
            double turn = 2 * radius * changeOf(rows, at + GrainRow.W, wx, wy, wz);
            double worse = change >= turn ? change : turn;
            settled &= worse <= accepted || worse * span <= ROUND_OFF * radius;
        }
        clear(chunk);
        return settled;
    }

    /** Puts a grain where a force row sends it: x_theta, and the mean velocity and spin on the way there. */
    private void aim(int at, double[] forces, int f, double span) {
        double[] rows = grains.rows();
        double push = span * startRows[at + GrainRow.INVERSE_MASS];
        double turn = span * startRows[at + GrainRow.INVERSE_INERTIA];
        double radius = startRows[at + GrainRow.RADIUS];
        for (int axis = 0; axis < 3; axis++) {
            double gain = push * forces[f + GrainRow.FORCE + axis];
            double speed = startRows[at + GrainRow.V + axis];
            rows[at + GrainRow.X + axis] = Math.fma(span, speed + gain, startRows[at + GrainRow.X + axis]);
            rows[at + GrainRow.V + axis] = Math.fma(0.5, gain, speed);
            double spin = Math.fma(0.5 * turn, forces[f + GrainRow.TORQUE + axis], startRows[at + GrainRow.W + axis]);
            rows[at + GrainRow.W + axis] = spin;
            rows[at + GrainRow.RADIUS_W + axis] = radius * spin;
        }
    }

    /** Puts grains at the end of the step, with v_theta as their velocity: displacement over step. */
    void arrive(Chunk chunk, double step, MoveTally tally) {
        double[] rows = grains.rows();
        for (int g = chunk.from(); g < chunk.to(); g++) {
            int at = GrainRow.at(g);
            double radius = startRows[at + GrainRow.RADIUS];
            for (int offset : OFFSETS) {
                for (int k = at + offset; k < at + offset + 3; k++) {
                    rows[k] = Math.fma(2.0, rows[k], -startRows[k]);
                }
            }
            for (int axis = 0; axis < 3; axis++) {
                rows[at + GrainRow.X + axis] =
                        Math.fma(step, rows[at + GrainRow.V + axis], startRows[at + GrainRow.X + axis]);
                rows[at + GrainRow.RADIUS_W + axis] = radius * rows[at + GrainRow.W + axis];
            }
            tally.speedSquared(squared(rows, at + GrainRow.V));
        }
    }

    /** Gives grains the velocities of the end of the step. */
    void close(Chunk chunk, double theta, boolean energyDue, MoveTally tally) {
        double[] rows = grains.rows();
        for (int g = chunk.from(); g < chunk.to(); g++) {
            int at = GrainRow.at(g);
            double radius = startRows[at + GrainRow.RADIUS];
            for (int offset : OFFSETS) {
                for (int k = at + offset; k < at + offset + 3; k++) {
                    rows[k] = startRows[k] + (rows[k] - startRows[k]) / theta;
                }
            }
            for (int axis = 0; axis < 3; axis++) {
                rows[at + GrainRow.RADIUS_W + axis] = radius * rows[at + GrainRow.W + axis];
            }
            tally.speedSquared(squared(rows, at + GrainRow.V));
            if (energyDue) {
                tally.kinetic(GrainMotion.kineticEnergy(rows, at));
            }
        }
        clear(chunk);
    }

    private void clear(Chunk chunk) {
        Arrays.fill(grains.forces(), GrainRow.forceAt(chunk.from()), GrainRow.forceAt(chunk.to()), 0);
    }

    private static double changeOf(double[] rows, int k, double x, double y, double z) {
        double dx = rows[k] - x, dy = rows[k + 1] - y, dz = rows[k + 2] - z;
        return Math.sqrt(Math.fma(dx, dx, Math.fma(dy, dy, dz * dz)));
    }

    private static double squared(double[] rows, int k) {
        return Math.fma(rows[k], rows[k], Math.fma(rows[k + 1], rows[k + 1], rows[k + 2] * rows[k + 2]));
    }

    private static double length(double[] rows, int k) {
        return Math.sqrt(squared(rows, k));
    }
}
