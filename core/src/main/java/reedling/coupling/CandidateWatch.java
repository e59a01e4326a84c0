// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.LawSet;
import reedling.neighbour.Chunk;
import reedling.neighbour.ChunkLayout;
import reedling.neighbour.PairSegment;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/**
 * Looks at candidate pairs that could come into the reach of the laws, which for most is the touch: those that do become
 * active, those about to do so limit the next step. Gaps are counted from the reach on.
 *
 * <p>A block of candidates is left alone while its smallest gap cannot have closed:
 * {@code 2 (D - D0) + 3 v_max h_max < gap}, with D the accumulated largest displacement, D0 its value when the block was
 * last looked at, v_max the largest speed and h_max the longest next step.
 */
final class CandidateWatch {

    private final LawSet laws;

    CandidateWatch(LawSet laws) {
        this.laws = laws;
    }

    /**
     * @param travel accumulated largest displacement of any body since the last search, m
     * @param reach what the fastest two bodies may close within the longest next step, m
     */
    void look(
            Chunk chunk,
            GrainStore grains,
            ChunkLayout layout,
            double travel,
            double reach,
            ApproachRule rule,
            ContactTally tally) {
        PairSegment[] segments = chunk.segments();
        for (int s = 0; s < segments.length; s++) {
            PairSegment segment = segments[s];
            for (int block = 0; block < segment.candidateBlocks(); block++) {
                double closed = 2 * (travel - segment.blockTravel()[block]) + reach;
                if (closed >= segment.blockGap()[block]) {
                    lookAtBlock(chunk, s, block, grains, layout, rule, tally);
                    segment.blockTravel()[block] = travel;
                }
            }
        }
    }

    private void lookAtBlock(
            Chunk chunk,
            int segmentNumber,
            int block,
            GrainStore grains,
            ChunkLayout layout,
            ApproachRule rule,
            ContactTally tally) {
        PairSegment segment = chunk.segments()[segmentNumber];
        ContactKernel law =
                laws.bound(ContactKind.GRAIN_GRAIN, segmentNumber / 2).normal();
        double[] rows = grains.rows();
        double smallest = Double.POSITIVE_INFINITY;
        int end = Math.min(segment.candidateCount(), (block + 1) * PairSegment.CANDIDATE_BLOCK);
        for (int k = block * PairSegment.CANDIDATE_BLOCK; k < end; k++) {
            int i = segment.candidateFirst()[k];
            int j = segment.candidateSecond()[k];
            double gap = gap(rows, i, j) - segment.reach();
            if (gap <= 0) {
                chunk.activate(segmentNumber, i, j, layout, grains.ghost());
                segment.removeCandidate(k, grains.ghost());
            } else {
                smallest = gap < smallest ? gap : smallest;
                approach(rows, i, j, gap, segment.reach(), law, rule, tally);
            }
        }
        segment.blockGap()[block] = smallest;
    }

    static double gap(double[] rows, int i, int j) {
        int a = GrainRow.at(i);
        int b = GrainRow.at(j);
        double dx = rows[b] - rows[a];
        double dy = rows[b + 1] - rows[a + 1];
        double dz = rows[b + 2] - rows[a + 2];
        double distance = Math.sqrt(Math.fma(dx, dx, Math.fma(dy, dy, dz * dz)));
        return distance - (rows[a + GrainRow.RADIUS] + rows[b + GrainRow.RADIUS]);
    }

    /** Limits the step for two grains that are apart, by a gap less reach in m, and closing. */
    static void approach(
            double[] rows,
            int i,
            int j,
            double gap,
            double reach,
            ContactKernel law,
            ApproachRule rule,
            ContactTally tally) {
        int a = GrainRow.at(i);
        int b = GrainRow.at(j);
        double radiusI = rows[a + GrainRow.RADIUS];
        double radiusJ = rows[b + GrainRow.RADIUS];
        double distance = gap + reach + radiusI + radiusJ;
        double closing = 0;
        for (int axis = 0; axis < 3; axis++) {
            double across = rows[b + axis] - rows[a + axis];
            double velocity = rows[a + GrainRow.V + axis] - rows[b + GrainRow.V + axis];
            closing = Math.fma(across, velocity, closing);
        }
        closing /= distance;
        if (rule.concerns(gap, closing)) {
            double mass = 1 / (rows[a + GrainRow.INVERSE_MASS] + rows[b + GrainRow.INVERSE_MASS]);
            double radius = radiusI * radiusJ / (radiusI + radiusJ);
            tally.approach(rule.limit(gap, closing, law.duration(closing, radius, mass)));
        }
    }
}
