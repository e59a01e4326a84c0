// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.Arrays;
import reedling.particle.GrainStore;

/** The order in which grains are shown to the outside: by their stable ids, not by where they lie in memory. */
final class GrainOrder {

    private GrainOrder() {}

    /** Rows of the grains in ascending order of their ids. */
    static int[] byId(GrainStore grains) {
        long[] keys = new long[grains.count()];
        for (int g = 0; g < keys.length; g++) {
            keys[g] = grains.id()[g] << 32 | g; // ids stay far below 2^31
        }
        Arrays.sort(keys);
        int[] order = new int[keys.length];
        for (int k = 0; k < order.length; k++) {
            order[k] = (int) keys[k];
        }
        return order;
    }
}
