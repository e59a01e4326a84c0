// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;

import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;

/** Limits the step for rows that do not touch now but are about to; runs before later stages write over the gather. */
final class ApproachScan {

    private ApproachScan() {}

    static void scan(ContactBlock block, ContactKernel normal, ApproachRule rule, ContactTally tally) {
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
