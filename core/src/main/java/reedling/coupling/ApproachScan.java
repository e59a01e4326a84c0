// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;

import jdk.incubator.vector.VectorOperators;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.math.Lanes;

/** Limits the step for rows that do not touch now but are about to; runs before later stages write over the gather. */
final class ApproachScan {

    private ApproachScan() {}

    static void scan(ContactBlock block, ContactKernel normal, ApproachRule rule, ContactTally tally) {
        double[] c = block.columns();
        for (int r = 0; r < block.rows(); r += Lanes.TILE) {
            if (anyApart(c, r)) {
                scanTile(c, r, block.reach(), normal, rule, tally);
            }
        }
    }

    private static boolean anyApart(double[] c, int row) {
        if (Lanes.VECTORISED) {
            return load(c, Column.OVERLAP, row)
                    .test(VectorOperators.IS_NEGATIVE)
                    .anyTrue();
        }
        return true;
    }

    private static void scanTile(
            double[] c, int from, double reach, ContactKernel normal, ApproachRule rule, ContactTally tally) {
        for (int r = from; r < from + Lanes.TILE; r++) {
            double gap = -c[at(Column.OVERLAP) + r];
            if (gap > 0) {
                gap = ApproachRule.ahead(gap, reach);
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
