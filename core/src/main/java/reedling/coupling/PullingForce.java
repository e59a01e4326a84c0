// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;

import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.math.Lanes;

/**
 * Engine stages of contacts that may pull. Limits of friction, rolling and twisting come from a load that is never
 * negative, max(0, F_n + adhesive load), so that no tangential law needs to know of adhesion: it stands in the column of
 * the normal force while those laws run. Laws without pull skip both stages.
 */
final class PullingForce {

    private PullingForce() {}

    /** Before the tangential law: sets the normal force aside, puts the load in its place, books energy lost to tearing. */
    static void load(RowRange rows) {
        ContactBlock block = rows.block();
        double[] c = block.columns();
        double[] sums = rows.tally().sums();
        for (int r = 0; r < block.rows(); r++) {
            double force = c[at(Column.NORMAL_FORCE) + r];
            double load = (force + c[at(Column.ADHESIVE_LOAD) + r]) * c[at(Column.TOUCH) + r];
            c[at(Column.PULLING_FORCE) + r] = force;
            c[at(Column.NORMAL_FORCE) + r] = load > 0 ? load : 0;
            sums[ContactTally.NORMAL + (r & Lanes.TILE - 1)] += c[at(Column.LOST_ENERGY) + r];
        }
    }

    /** After the last law: the normal force itself again. */
    static void giveBack(RowRange rows) {
        ContactBlock block = rows.block();
        double[] c = block.columns();
        System.arraycopy(c, at(Column.PULLING_FORCE), c, at(Column.NORMAL_FORCE), block.rows());
    }
}
