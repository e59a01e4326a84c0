// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;

import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.contact.LawSet;

/** Runs the stages of a block after it was gathered: normal law, solve, friction, rolling, finish. */
final class StageRunner {

    private StageRunner() {}

    static void run(ContactBlock block, LawSet.Bound laws, float[] ledger, int ledgerAt, ContactTally tally) {
        laws.normal().apply(block);
        if (block.energyDue()) {
            tally.store(block, ContactTally.STORED);
            block.clear(Column.STORED_ENERGY, 1);
        }
        NormalSolve.solve(block, ledger, ledgerAt, tally);
        ContactKernel tangential = laws.tangential();
        if (tangential != null) {
            tangential.apply(block);
        } else {
            block.clear(Column.FRICTION, 4);
        }
        ContactKernel rolling = laws.rolling();
        if (rolling != null) {
            rolling.apply(block);
        } else {
            block.clear(Column.ROLLING_MOMENT, 3);
        }
        ContactFinish.finish(block, ledger, ledgerAt, tally);
    }

    /** Limits the step for rows that do not touch now but are about to; call before the stages write over the gather. */
    static void approach(ContactBlock block, ContactKernel normal, ApproachRule rule, ContactTally tally) {
        double[] c = block.columns();
        int overlap = at(Column.OVERLAP);
        for (int r = 0; r < block.rows(); r++) {
            double gap = -c[overlap + r];
            if (gap >= 0) {
                double closing = c[at(Column.CLOSING) + r];
                if (rule.concerns(gap, closing)) {
                    double radius = c[at(Column.EFFECTIVE_RADIUS) + r];
                    double mass = c[at(Column.EFFECTIVE_MASS) + r];
                    tally.approach(rule.limit(gap, closing, normal.duration(closing, radius, mass)));
                }
            }
        }
    }
}
