// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.List;
import jdk.incubator.vector.DoubleVector;
import jdk.incubator.vector.VectorMask;
import jdk.incubator.vector.VectorShuffle;
import reedling.math.Lanes;
import reedling.math.Tile;
import reedling.neighbour.Chunk;
import reedling.neighbour.CrossLink;
import reedling.neighbour.PairSegment;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/**
 * Moves the grains of a chunk: adds force rows exported by other chunks, closes the past step with half a kick, notes
 * energies, opens the next with half a kick, drifts. Kick-drift-kick (velocity Verlet) with a step that may change between
 * steps: the closing half kick uses the old step, the opening one the new.
 *
 * <p>Source: Swope, Andersen, Berens and Wilson, 1982 (velocity form of Verlet's method; from memory).
 */
final class GrainMotion {

    private static final VectorMask<Double> LOWER_THREE = VectorMask.fromLong(Lanes.SPECIES, 0x07);
    private static final VectorMask<Double> UPPER_THREE = VectorMask.fromLong(Lanes.SPECIES, 0x70);
    private static final VectorShuffle<Double> SWAP_HALVES =
            VectorShuffle.fromValues(Lanes.SPECIES, 4, 5, 6, 7, 0, 1, 2, 3);

    private GrainMotion() {}

    /** Adds the rows that other chunks computed for grains of this one, in the order of the links. */
    static void importForces(Chunk chunk, GrainStore grains) {
        double[] forces = grains.forces();
        List<CrossLink> links = chunk.incoming();
        for (int k = 0; k < links.size(); k++) {
            CrossLink link = links.get(k);
            PairSegment segment = link.segment();
            double[] exports = segment.exports();
            int[] second = segment.second();
            int[] rows = link.rows();
            for (int r = 0; r < link.count(); r++) {
                int from = PairSegment.PAD + 8 * rows[r];
                int to = GrainRow.forceAt(second[rows[r]]);
                Tile.addRow(exports, from, forces, to);
            }
        }
    }

    /**
     * Kicks and drifts all grains of a chunk that are not near a structure, and clears their force rows.
     *
     * @param halfPast half of the past step, s
     * @param next the next step, s
     * @param near for each grain of the chunk, whether it moves with a structure on the fine step
     */
    static void move(
            Chunk chunk,
            GrainStore grains,
            double halfPast,
            double next,
            boolean energyDue,
            NearGrains near,
            MoveTally tally) {
        if (Lanes.VECTORISED && !energyDue) {
            moveRows(chunk, grains, halfPast, next, near, tally);
        } else {
            moveEach(chunk, grains, halfPast, next, energyDue, near, tally);
        }
    }

    private static void moveEach(
            Chunk chunk,
            GrainStore grains,
            double halfPast,
            double next,
            boolean energyDue,
            NearGrains near,
            MoveTally tally) {
        double[] rows = grains.rows();
        double[] forces = grains.forces();
        double halfNext = 0.5 * next;
        for (int g = chunk.from(); g < chunk.to(); g++) {
            int at = GrainRow.at(g);
            int f = GrainRow.forceAt(g);
            kick(rows, at, forces, f, halfPast);
            if (!near.contains(g)) {
                if (energyDue) {
                    tally.kinetic(kineticEnergy(rows, at));
                }
                kick(rows, at, forces, f, halfNext);
                drift(rows, at, next, tally);
                frequency(rows, at, forces, f, tally);
                clear(forces, f);
            }
        }
    }

    /** The same bits as {@link #moveEach}, a line of eight numbers at a time; lanes that do not move are blended back. */
    private static void moveRows(
            Chunk chunk, GrainStore grains, double halfPast, double next, NearGrains near, MoveTally tally) {
        double[] rows = grains.rows();
        double[] forces = grains.forces();
        DoubleVector closing = DoubleVector.broadcast(Lanes.SPECIES, halfPast);
        DoubleVector opening = DoubleVector.broadcast(Lanes.SPECIES, 0.5 * next);
        DoubleVector step = DoubleVector.broadcast(Lanes.SPECIES, next);
        for (int g = chunk.from(); g < chunk.to(); g++) {
            int at = GrainRow.at(g);
            int f = GrainRow.forceAt(g);
            DoubleVector force = DoubleVector.fromArray(Lanes.SPECIES, forces, f);
            DoubleVector line = DoubleVector.fromArray(Lanes.SPECIES, rows, at);
            DoubleVector spins = DoubleVector.fromArray(Lanes.SPECIES, rows, at + GrainRow.W);
            DoubleVector perMass = DoubleVector.broadcast(Lanes.SPECIES, rows[at + GrainRow.INVERSE_MASS]);
            DoubleVector perInertia = DoubleVector.broadcast(Lanes.SPECIES, rows[at + GrainRow.INVERSE_INERTIA]);
            line = line.blend(force.fma(closing.mul(perMass), line), UPPER_THREE);
            spins = spins.blend(force.fma(closing.mul(perInertia), spins), LOWER_THREE);
            boolean free = !near.contains(g);
            if (free) {
                line = line.blend(force.fma(opening.mul(perMass), line), UPPER_THREE);
                line = line.blend(line.rearrange(SWAP_HALVES).fma(step, line), LOWER_THREE);
                spins = spins.blend(force.fma(opening.mul(perInertia), spins), LOWER_THREE);
                DoubleVector radius = DoubleVector.broadcast(Lanes.SPECIES, rows[at + GrainRow.RADIUS]);
                spins = spins.blend(spins.rearrange(SWAP_HALVES).mul(radius), UPPER_THREE);
            }
            line.intoArray(rows, at);
            spins.intoArray(rows, at + GrainRow.W);
            if (free) {
                speed(rows, at, tally);
                frequency(rows, at, forces, f, tally);
                clear(forces, f);
            }
        }
    }

    /** Adds half a step's impulse of a force row: v += h/2 F/m, w += h/2 T/I. */
    static void kick(double[] rows, int at, double[] forces, int f, double half) {
        double push = half * rows[at + GrainRow.INVERSE_MASS];
        double turn = half * rows[at + GrainRow.INVERSE_INERTIA];
        rows[at + GrainRow.V] = Math.fma(push, forces[f + GrainRow.FORCE], rows[at + GrainRow.V]);
        rows[at + GrainRow.V + 1] = Math.fma(push, forces[f + GrainRow.FORCE + 1], rows[at + GrainRow.V + 1]);
        rows[at + GrainRow.V + 2] = Math.fma(push, forces[f + GrainRow.FORCE + 2], rows[at + GrainRow.V + 2]);
        rows[at + GrainRow.W] = Math.fma(turn, forces[f + GrainRow.TORQUE], rows[at + GrainRow.W]);
        rows[at + GrainRow.W + 1] = Math.fma(turn, forces[f + GrainRow.TORQUE + 1], rows[at + GrainRow.W + 1]);
        rows[at + GrainRow.W + 2] = Math.fma(turn, forces[f + GrainRow.TORQUE + 2], rows[at + GrainRow.W + 2]);
    }

    /** Moves a grain on, x += h v, and keeps radius times spin up to date. */
    static void drift(double[] rows, int at, double step, MoveTally tally) {
        double radius = rows[at + GrainRow.RADIUS];
        rows[at + GrainRow.X] = Math.fma(step, rows[at + GrainRow.V], rows[at + GrainRow.X]);
        rows[at + GrainRow.X + 1] = Math.fma(step, rows[at + GrainRow.V + 1], rows[at + GrainRow.X + 1]);
        rows[at + GrainRow.X + 2] = Math.fma(step, rows[at + GrainRow.V + 2], rows[at + GrainRow.X + 2]);
        rows[at + GrainRow.RADIUS_W] = radius * rows[at + GrainRow.W];
        rows[at + GrainRow.RADIUS_W + 1] = radius * rows[at + GrainRow.W + 1];
        rows[at + GrainRow.RADIUS_W + 2] = radius * rows[at + GrainRow.W + 2];
        speed(rows, at, tally);
    }

    private static void speed(double[] rows, int at, MoveTally tally) {
        double vx = rows[at + GrainRow.V];
        double vy = rows[at + GrainRow.V + 1];
        double vz = rows[at + GrainRow.V + 2];
        tally.speedSquared(Math.fma(vx, vx, Math.fma(vy, vy, vz * vz)));
    }

    /** Translation and rotation energy of a grain, J. */
    static double kineticEnergy(double[] rows, int at) {
        double vx = rows[at + GrainRow.V];
        double vy = rows[at + GrainRow.V + 1];
        double vz = rows[at + GrainRow.V + 2];
        double wx = rows[at + GrainRow.W];
        double wy = rows[at + GrainRow.W + 1];
        double wz = rows[at + GrainRow.W + 2];
        return 0.5 * (vx * vx + vy * vy + vz * vz) / rows[at + GrainRow.INVERSE_MASS]
                + 0.5 * (wx * wx + wy * wy + wz * wz) / rows[at + GrainRow.INVERSE_INERTIA];
    }

    /**
     * Estimate of the highest frequency of a grain in its contacts, from the sums of their stiffness:
     * w^2 = max(2/3 (S_n + 2 S_t), 10/3 S_t) / m, the second for rotation against tangential springs.
     */
    static void frequency(double[] rows, int at, double[] forces, int f, MoveTally tally) {
        double normal = forces[f + GrainRow.NORMAL_STIFFNESS];
        double sliding = forces[f + GrainRow.TANGENTIAL_STIFFNESS];
        double translation = 2.0 / 3 * (normal + 2 * sliding);
        double rotation = 10.0 / 3 * sliding;
        tally.frequencySquared(Math.max(translation, rotation) * rows[at + GrainRow.INVERSE_MASS]);
    }

    static void clear(double[] forces, int f) {
        if (Lanes.VECTORISED) {
            DoubleVector.zero(Lanes.SPECIES).intoArray(forces, f);
        } else {
            for (int c = 0; c < GrainRow.FORCE_LENGTH; c++) {
                forces[f + c] = 0;
            }
        }
    }

    /**
     * Turns the orientations of a chunk's grains by their spin over a time (s), q' = exp(t w / 2) q. A sphere's orientation
     * pushes nothing, it is only looked at; so it is advanced now and then.
     */
    static void turn(Chunk chunk, GrainStore grains, double time) {
        double[] rows = grains.rows();
        double[] q = grains.orientation();
        for (int g = chunk.from(); g < chunk.to(); g++) {
            int at = GrainRow.at(g) + GrainRow.W;
            double x = 0.5 * time * rows[at], y = 0.5 * time * rows[at + 1], z = 0.5 * time * rows[at + 2];
            double half = Math.sqrt(x * x + y * y + z * z);
            double c = StrictMath.cos(half);
            double s = half > 0 ? StrictMath.sin(half) / half : 1;
            compose(q, 4 * g, c, s * x, s * y, s * z);
        }
    }

    /** Sets q' = (w, x, y, z) q, kept at length 1. */
    private static void compose(double[] q, int at, double w, double x, double y, double z) {
        double a = q[at], b = q[at + 1], c = q[at + 2], d = q[at + 3];
        double newW = w * a - x * b - y * c - z * d;
        double newX = w * b + x * a + y * d - z * c;
        double newY = w * c - x * d + y * a + z * b;
        double newZ = w * d + x * c - y * b + z * a;
        double scale = 1 / Math.sqrt(newW * newW + newX * newX + newY * newY + newZ * newZ);
        q[at] = scale * newW;
        q[at + 1] = scale * newX;
        q[at + 2] = scale * newY;
        q[at + 3] = scale * newZ;
    }
}
