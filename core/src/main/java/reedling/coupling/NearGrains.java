// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.Arrays;
import reedling.particle.GrainRow;

/**
 * Grains of one chunk that are near a structure and therefore move with it on the fine step, with the force rows that
 * the contacts with structures give them.
 *
 * <p>Threads: written by the task of its chunk only.
 */
final class NearGrains {

    private int from;
    private boolean[] flags = new boolean[0];
    private int[] grains = new int[16];
    private double[] forces = new double[GrainRow.FORCE_LENGTH * 16];
    private int count;

    /** Forgets all grains and takes a range. */
    void open(int firstGrain, int endGrain) {
        from = firstGrain;
        count = 0;
        if (flags.length < endGrain - firstGrain) {
            flags = new boolean[endGrain - firstGrain];
        }
        Arrays.fill(flags, false);
    }

    /** Adds a grain with a clear force row. */
    void add(int grain) {
        if (count == grains.length) {
            grains = Arrays.copyOf(grains, 2 * count);
            forces = Arrays.copyOf(forces, GrainRow.FORCE_LENGTH * grains.length);
        }
        flags[grain - from] = true;
        Arrays.fill(forces, forceAt(count), forceAt(count + 1), 0);
        grains[count++] = grain;
    }

    boolean contains(int grain) {
        return flags[grain - from];
    }

    int count() {
        return count;
    }

    int grain(int near) {
        return grains[near];
    }

    /** Force rows laid out as {@link GrainRow} says, from index 0. */
    double[] forces() {
        return forces;
    }

    static int forceAt(int near) {
        return GrainRow.FORCE_LENGTH * near;
    }
}
