// SPDX-License-Identifier: Apache-2.0
package reedling.check;

import java.util.Locale;
import reedling.neighbour.Chunk;
import reedling.neighbour.PairSegment;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/** Finds the deepest overlap of a chunk's pairs, to name its bodies in a message or to sample overlaps for a report. */
public final class OverlapSearch {

    private OverlapSearch() {}

    /** Words for the deepest pair of a chunk. */
    static String deepest(Chunk chunk, GrainStore grains) {
        double worst = 0;
        String words = "a grain on a wall or wire";
        for (PairSegment segment : chunk.segments()) {
            for (int row = 0; row < segment.activeCount(); row++) {
                int i = segment.first()[row];
                int j = segment.second()[row];
                double relative = relativeOverlap(grains.rows(), i, j);
                if (relative > worst && relative > 0.5) {
                    worst = relative;
                    words = String.format(
                            Locale.ROOT,
                            "grains %d and %d, overlap %.3g of the effective radius",
                            grains.id()[i],
                            grains.id()[j],
                            relative);
                }
            }
        }
        return words;
    }

    /** Overlap of two grains over their effective radius; negative for a gap. */
    public static double relativeOverlap(double[] rows, int i, int j) {
        int a = GrainRow.at(i);
        int b = GrainRow.at(j);
        double dx = rows[b] - rows[a], dy = rows[b + 1] - rows[a + 1], dz = rows[b + 2] - rows[a + 2];
        double ri = rows[a + GrainRow.RADIUS], rj = rows[b + GrainRow.RADIUS];
        return (ri + rj - Math.sqrt(dx * dx + dy * dy + dz * dz)) * (ri + rj) / (ri * rj);
    }
}
