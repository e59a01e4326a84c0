// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.ArrayList;
import java.util.List;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKind;
import reedling.contact.LawSet;
import reedling.neighbour.Chunk;
import reedling.neighbour.PairSegment;
import reedling.particle.GrainStore;

/** Forces of all active grain-grain pairs of a chunk: block after block is gathered, handed to the laws and scattered. */
final class PairForces {

    private final LawSet laws;
    private final StageLine gather = StageLine.of(
            new CombineLine(false),
            new CombineLine(true),
            new PairDistance(),
            new PairApproach(),
            new PairSliding(),
            new PairLevers());
    private final List<StageLine> lawLines = new ArrayList<>();
    private final StageLine scatter = StageLine.of(new PairScatter());

    PairForces(LawSet laws, int materialPairs) {
        this.laws = laws;
        for (int pair = 0; pair < materialPairs; pair++) {
            lawLines.add(StageLine.ofLaws(laws.bound(ContactKind.GRAIN_GRAIN, pair)));
        }
    }

    void apply(Chunk chunk, GrainStore grains, StepContext step, RowRange rows, ContactTally tally) {
        PairSegment[] segments = chunk.segments();
        for (int s = 0; s < segments.length; s++) {
            PairSegment segment = segments[s];
            int pair = s / 2;
            for (int from = 0; from < segment.paddedCount(); from += ContactBlock.CAPACITY) {
                rows.open(segment, from, step, grains, tally);
                gather.run(rows);
                ApproachScan.scan(
                        rows.block(), laws.bound(ContactKind.GRAIN_GRAIN, pair).normal(), step.approach(), tally);
                lawLines.get(pair).run(rows);
                scatter.run(rows);
            }
        }
    }
}
