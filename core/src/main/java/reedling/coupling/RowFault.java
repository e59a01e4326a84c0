// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.Arrays;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.contact.LawFault;
import reedling.neighbour.PairSegment;

/** Something that a contact law threw, with the row of contacts it was given. */
public final class RowFault extends RuntimeException {

    private final String law;
    private final transient PairSegment segment;
    private final int row;

    private RowFault(String law, PairSegment segment, int row, Throwable cause) {
        super("contact law " + law + " threw " + cause, cause);
        this.law = law;
        this.segment = segment;
        this.row = row;
    }

    /** Finds the row by handing the law one after the other; the run is over anyway. */
    static RowFault of(ContactKernel kernel, RowRange rows, Throwable thrown) {
        boolean named = thrown instanceof LawFault;
        String law = named ? ((LawFault) thrown).law() : kernel.getClass().getName();
        Throwable cause = named && thrown.getCause() != null ? thrown.getCause() : thrown;
        return new RowFault(law, rows.segment(), rows.from() + culprit(kernel, rows.block()), cause);
    }

    private static int culprit(ContactKernel kernel, ContactBlock block) {
        int first = 0;
        for (int row = block.rows() - 1; row >= 0; row--) {
            if (block.columns()[ContactBlock.at(Column.TOUCH) + row] > 0) {
                first = row;
            }
        }
        for (int row = first; row < block.rows(); row++) {
            if (throwsAt(kernel, block, row)) {
                return row;
            }
        }
        return first;
    }

    private static boolean throwsAt(ContactKernel kernel, ContactBlock block, int row) {
        ContactBlock alone = new ContactBlock();
        for (int column = 0; column < Column.COUNT; column++) {
            double value = block.columns()[ContactBlock.at(column) + row];
            Arrays.fill(alone.columns(), ContactBlock.at(column), ContactBlock.at(column) + 8, value);
        }
        int columns = (block.historyAt(8, 0) - block.historyAt(0, 0)) / 8;
        double[] history = new double[8 * columns];
        for (int column = 0; column < columns; column++) {
            Arrays.fill(history, 8 * column, 8 * column + 8, block.history()[block.historyAtRow(row, column)]);
        }
        alone.open(8, block.step(), history, 0, columns, block.energyDue());
        try {
            kernel.apply(alone);
            return false;
        } catch (RuntimeException | LinkageError again) {
            return true;
        }
    }

    /** Name of the law. */
    public String law() {
        return law;
    }

    /** Segment that holds the row. */
    public PairSegment segment() {
        return segment;
    }

    /** Row in the segment. */
    public int row() {
        return row;
    }
}
