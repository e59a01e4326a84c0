// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import reedling.contact.ContactBlock;
import reedling.neighbour.PairSegment;
import reedling.particle.GrainStore;

/** The rows a stage works on: a block, where its rows come from, and what they add up to. One a worker. */
final class RowRange {

    private final ContactBlock block = new ContactBlock();
    private PairSegment segment = new PairSegment(1, false);
    private int from;
    private double[] grainRows = new double[0];
    private double[] forces = new double[0];
    private ContactTally tally = new ContactTally();

    /** Opens rows {@code from ..} of a segment, at most a block of them. */
    void open(PairSegment source, int first, StepContext step, GrainStore grains, ContactTally sums) {
        segment = source;
        from = first;
        grainRows = grains.rows();
        forces = grains.forces();
        tally = sums;
        int rows = Math.min(ContactBlock.CAPACITY, source.paddedCount() - first);
        block.open(
                rows,
                step.pastStep(),
                source.history(),
                source.historyAt(first),
                source.historyColumns(),
                step.energyDue());
        block.reportDuration(sums.shortestDuration());
        block.reach(source.reach());
    }

    ContactBlock block() {
        return block;
    }

    PairSegment segment() {
        return segment;
    }

    /** Row of the segment that is row 0 of the block. */
    int from() {
        return from;
    }

    double[] grainRows() {
        return grainRows;
    }

    double[] forces() {
        return forces;
    }

    float[] ledger() {
        return segment.ledgerHistory();
    }

    int ledgerAt() {
        return PairSegment.ledgerAt(from);
    }

    ContactTally tally() {
        return tally;
    }
}
