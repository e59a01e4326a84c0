// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.io.IOException;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.coupling.Interactions;
import reedling.neighbour.PairSegment;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/**
 * How deep contacts are, over all samples: pairs of grains relative to the smaller radius, grains on wires relative to
 * their radius and in m. Softened grains overlap deeper than real ones; on a screen this decides what passes. Threads:
 * one, between steps.
 */
public final class OverlapSample implements Persistent {

    private final LogHistogram pairs = new LogHistogram(-7, 8);
    private final LogHistogram wires = new LogHistogram(-7, 8);
    private final LogHistogram wireDepth = new LogHistogram(-10, 9); // m

    /** Looks at all contacts at their present places. */
    public void sample(Interactions interactions, GrainStore grains) {
        double[] rows = grains.rows();
        for (PairSegment segment : interactions.pairRows()) {
            for (int row = 0; row < segment.activeCount(); row++) {
                samplePair(rows, GrainRow.at(segment.first()[row]), GrainRow.at(segment.second()[row]));
            }
        }
        interactions.wires().visitOverlaps(grains, (grain, body, overlap) -> {
            wires.add(overlap / grains.radius(grain));
            wireDepth.add(overlap);
        });
    }

    private void samplePair(double[] rows, int a, int b) {
        double dx = rows[b] - rows[a], dy = rows[b + 1] - rows[a + 1], dz = rows[b + 2] - rows[a + 2];
        double overlap = rows[a + GrainRow.RADIUS] + rows[b + GrainRow.RADIUS] - Math.sqrt(dx * dx + dy * dy + dz * dz);
        if (overlap > 0) {
            pairs.add(overlap / Math.min(rows[a + GrainRow.RADIUS], rows[b + GrainRow.RADIUS]));
        }
    }

    /** Overlap of two grains over the smaller radius. */
    public LogHistogram pairs() {
        return pairs;
    }

    /** Overlap of a grain and a wire over the grain's radius. */
    public LogHistogram wires() {
        return wires;
    }

    /** Overlap of a grain and a wire, m. */
    public LogHistogram wireDepth() {
        return wireDepth;
    }

    @Override
    public String section() {
        return "overlaps";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        pairs.save(out);
        wires.save(out);
        wireDepth.save(out);
    }

    @Override
    public void restore(SectionReader in) {
        pairs.restore(in);
        wires.restore(in);
        wireDepth.restore(in);
    }
}
