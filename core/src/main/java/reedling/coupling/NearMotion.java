// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/**
 * Moves the near grains of a chunk on the fine step of the structure. Their coarse forces reach them as half kicks at both
 * ends of the coarse step, the forces of wires as half kicks of every fine step (multiple time stepping after Tuckerman,
 * Berne and Martyna, 1992; from memory).
 */
final class NearMotion {

    private NearMotion() {}

    /**
     * First fine step of a coarse one: closes both past half kicks, notes energies, opens both new ones and drifts. The
     * coarse closing kick was already given to every grain of the chunk.
     *
     * @param halfPastFine half of the past fine step, s
     * @param next the next coarse step, s
     * @param nextFine its fine step, s
     */
    static void first(
            WireChunk chunk,
            GrainStore grains,
            double halfPastFine,
            double next,
            double nextFine,
            boolean energyDue,
            MoveTally tally) {
        NearGrains near = chunk.near();
        double[] rows = grains.rows();
        double[] forces = grains.forces();
        double halfNext = 0.5 * next;
        double halfNextFine = 0.5 * nextFine;
        for (int k = 0; k < near.count(); k++) {
            int grain = near.grain(k);
            int at = GrainRow.at(grain);
            int coarse = GrainRow.forceAt(grain);
            int fine = NearGrains.forceAt(k);
            GrainMotion.kick(rows, at, near.forces(), fine, halfPastFine);
            if (energyDue) {
                tally.kinetic(GrainMotion.kineticEnergy(rows, at));
            }
            GrainMotion.kick(rows, at, forces, coarse, halfNext);
            GrainMotion.kick(rows, at, near.forces(), fine, halfNextFine);
            GrainMotion.drift(rows, at, nextFine, tally);
            GrainMotion.frequency(rows, at, forces, coarse, tally);
            GrainMotion.clear(forces, coarse);
            GrainMotion.clear(near.forces(), fine);
        }
    }

    /**
     * A further fine step: closes one half kick, opens the next, drifts.
     *
     * @param halfPast half of the fine step that ends, s
     * @param next the next fine step, s
     */
    static void further(WireChunk chunk, GrainStore grains, double halfPast, double next, MoveTally tally) {
        NearGrains near = chunk.near();
        double[] rows = grains.rows();
        double halfNext = 0.5 * next;
        for (int k = 0; k < near.count(); k++) {
            int at = GrainRow.at(near.grain(k));
            int f = NearGrains.forceAt(k);
            GrainMotion.kick(rows, at, near.forces(), f, halfPast);
            GrainMotion.kick(rows, at, near.forces(), f, halfNext);
            GrainMotion.drift(rows, at, next, tally);
            GrainMotion.clear(near.forces(), f);
        }
    }
}
