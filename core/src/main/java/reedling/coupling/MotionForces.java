// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import reedling.field.Field;
import reedling.field.MotionBlock;
import reedling.field.MotionForce;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/**
 * Applies the motion forces of all fields to the grains of a chunk, between the last of the other forces and the closing
 * half kick, and books what their kicks do. Several of them are found in two sweeps, so that each knows the others.
 *
 * <p>The work of a kick of length t is t F . (v before + v after) / 2 with the velocities of the whole kick: the exact
 * change of kinetic energy that F has part in. Summed over a step it is the trapezoidal force times the displacement.
 *
 * <p>Threads: each worker has blocks of its own; a chunk's tally is written by the chunk's task.
 */
final class MotionForces {

    /** Squared frequency that stands for a rate, over the squared rate: the stability rule then keeps h below 0.1/rate. */
    private static final double RATE_AS_FREQUENCY = 256;

    /** Grains looked at together when only rates are wanted. */
    private static final int PIECE = 1024;

    private final GrainStore grains;
    private final List<MotionForce> forces;
    private final List<MotionBlock> blocks = new ArrayList<>(); // one a force and worker

    MotionForces(List<Field> fields, GrainStore grains) {
        this.grains = grains;
        forces = fields.stream()
                .map(Field::motionForce)
                .flatMap(Optional::stream)
                .toList();
    }

    boolean none() {
        return forces.isEmpty();
    }

    void makeRoom(int workers) {
        while (blocks.size() < workers * forces.size()) {
            blocks.add(new MotionBlock(grains));
        }
    }

    /**
     * Adds the forces to the force rows of a range of grains, which must be complete otherwise.
     *
     * @param worker whose blocks are used
     * @param time of the positions, s
     * @param halfPast half of the past step, s
     */
    void apply(int worker, int from, int to, double time, double halfPast) {
        int first = worker * forces.size();
        for (int k = 0; k < forces.size(); k++) {
            blocks.get(first + k).open(from, to, time, halfPast);
        }
        int sweeps = Math.min(2, forces.size());
        for (int sweep = 0; sweep < sweeps; sweep++) {
            for (int k = 0; k < forces.size(); k++) {
                MotionBlock block = blocks.get(first + k);
                if (sweep > 0) {
                    block.addTo(grains.forces(), -1);
                }
                forces.get(k).push(block);
                block.addTo(grains.forces(), 1);
            }
        }
    }

    /**
     * Books the work of the closing kick and of the coming opening one, and the rates; after {@link #apply}.
     *
     * @param near grains that move on the fine step
     * @param halfPastFine half of the past fine step, s
     * @param halfNext half of the next step, s
     */
    void book(int worker, NearGrains near, double halfPastFine, double halfNext, MoveTally tally) {
        for (int k = 0; k < forces.size(); k++) {
            MotionBlock block = blocks.get(worker * forces.size() + k);
            for (int g = block.from(); g < block.to(); g++) {
                int own = block.ownAt(g);
                book(block, own + GrainRow.FORCE, g, GrainRow.FORCE, halfNext, tally);
                book(block, own + GrainRow.TORQUE, g, GrainRow.TORQUE, halfNext, tally);
            }
            double structures = 0;
            for (int n = 0; n < near.count(); n++) {
                structures += shift(block, near.grain(n), near.forces(), NearGrains.forceAt(n));
            }
            tally.openingWork(halfPastFine * halfNext * structures);
            tally.frequencySquared(RATE_AS_FREQUENCY * block.fastestRate() * block.fastestRate());
        }
    }

    /** Force or torque, by its place in a force row; velocity or spin stand in the grain's row with 1/m or 1/I behind. */
    private void book(MotionBlock block, int own, int g, int part, double halfNext, MoveTally tally) {
        double[] rows = grains.rows();
        int v = GrainRow.at(g) + (part == GrainRow.FORCE ? GrainRow.V : GrainRow.W);
        int f = GrainRow.forceAt(g) + part;
        double inverse = rows[v + 3];
        double closing = 0;
        double opening = 0;
        for (int axis = 0; axis < 3; axis++) {
            double force = block.own()[own + axis];
            double acceleration = inverse * grains.forces()[f + axis];
            double now = rows[v + axis] + block.halfPast() * acceleration;
            closing += force * (rows[v + axis] + now);
            opening += force * (now + now + halfNext * acceleration);
        }
        tally.closingWork(0.5 * block.halfPast() * closing);
        tally.openingWork(0.5 * halfNext * opening);
    }

    /** Force times what a structure's force on a near grain adds to its velocity for each second of a kick, N m/s2. */
    private double shift(MotionBlock block, int g, double[] fine, int f) {
        double[] rows = grains.rows();
        double[] own = block.own();
        int at = GrainRow.at(g);
        int o = block.ownAt(g);
        double push = 0;
        double turn = 0;
        for (int axis = 0; axis < 3; axis++) {
            push += own[o + GrainRow.FORCE + axis] * fine[f + GrainRow.FORCE + axis];
            turn += own[o + GrainRow.TORQUE + axis] * fine[f + GrainRow.TORQUE + axis];
        }
        return push * rows[at + GrainRow.INVERSE_MASS] + turn * rows[at + GrainRow.INVERSE_INERTIA];
    }

    /** Squared frequency that stands for the fastest rate of any grain as it is now; by one thread, between phases. */
    double frequencySquared(double time) {
        makeRoom(1);
        double largest = 0;
        for (int k = 0; k < forces.size(); k++) {
            MotionBlock block = blocks.get(k);
            for (int g = 0; g < grains.count(); g += PIECE) {
                block.open(g, Math.min(g + PIECE, grains.count()), time, 0);
                forces.get(k).push(block);
                largest = Math.max(largest, block.fastestRate());
            }
        }
        return RATE_AS_FREQUENCY * largest * largest;
    }
}
