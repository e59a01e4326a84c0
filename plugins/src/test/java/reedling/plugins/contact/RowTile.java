// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.math.Lanes;

/** One tile of eight contact rows, all alike, for driving a kernel by hand: columns are set, the kernel runs, columns are read. */
final class RowTile {

    private final ContactBlock block = new ContactBlock();
    private final double[] history;
    private final int historyColumns;

    /**
     * Rows that touch, with normal x and 1 wherever 0 would not do.
     *
     * @param historyColumns doubles of history a row
     */
    RowTile(int historyColumns) {
        this.historyColumns = historyColumns;
        history = new double[Lanes.TILE * historyColumns];
        open(0, false);
        set(Column.NORMAL, 1).set(Column.MEAN_NORMAL, 1).set(Column.TOUCH, 1).set(Column.RADIUS_RATIO, 1);
        set(Column.EFFECTIVE_RADIUS, 1).set(Column.EFFECTIVE_MASS, 1).set(Column.CONTACT_RADIUS, 1);
        set(Column.INVERSE_MASS, 1).set(Column.INVERSE_MASS_SLIDING, 1).set(Column.INVERSE_INERTIA, 1);
    }

    private void open(double step, boolean energyDue) {
        block.open(Lanes.TILE, step, history, 0, historyColumns, energyDue);
    }

    RowTile set(int column, double value) {
        for (int r = 0; r < Lanes.TILE; r++) {
            block.columns()[ContactBlock.at(column) + r] = value;
        }
        return this;
    }

    /** Value of a column in the last row; all are alike. */
    double get(int column) {
        return block.columns()[ContactBlock.at(column) + Lanes.TILE - 1];
    }

    /** History of the last row. */
    double history(int column) {
        return history[block.historyAtRow(Lanes.TILE - 1, column)];
    }

    /** Runs a kernel after a step, s, with stored energy asked for, and returns that energy, J. */
    double apply(ContactKernel kernel, double step) {
        open(step, true);
        set(Column.STORED_ENERGY, 0);
        kernel.apply(block);
        return get(Column.STORED_ENERGY);
    }

    /** Shortest duration that the last kernel reported, s. */
    double duration() {
        return block.shortestDuration();
    }
}
