// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

import java.util.Arrays;
import jdk.incubator.vector.DoubleVector;
import reedling.math.Lanes;

/**
 * A block of contact rows of one contact kind and one material pair, held as columns, with a window into the history
 * of those rows. Row counts are multiples of 8; rows that fill up a tile have TOUCH = 0 and finite values everywhere.
 *
 * <p>History of rows 8 g .. 8 g + 7, column c, stands at {@code historyAt(8 g, c)} .. + 7 in {@link #history()}.
 *
 * <p>Threads: one block a worker; not shared.
 */
public final class ContactBlock {

    /** Most rows of a block. */
    public static final int CAPACITY = 128;

    /** Columns are {@code CAPACITY + 8} apart so that they do not fall on the same cache sets. */
    private static final int STRIDE = CAPACITY + 8;

    private static final int PAD = 6; // doubles before column 0: columns then start on a 64-byte line

    private final double[] columns = new double[PAD + Column.COUNT * STRIDE];
    private int rows;
    private double step;
    private double[] history = new double[0];
    private int historyStart;
    private int historyColumns;
    private double reach;
    private boolean energyDue;
    private double shortestDuration = Double.POSITIVE_INFINITY;
    private final ContactRow row = new ContactRow(this);

    /** Index of the first row of a column in {@link #columns()}. */
    public static int at(int column) {
        return PAD + column * STRIDE;
    }

    public double[] columns() {
        return columns;
    }

    /** The window for laws that look at one row after the other. */
    ContactRow row() {
        return row;
    }

    /** Eight rows of a column from {@code row}, a multiple of 8, as a vector. */
    public static DoubleVector load(double[] columns, int column, int row) {
        return DoubleVector.fromArray(Lanes.SPECIES, columns, at(column) + row);
    }

    /** Stores eight rows of a column. */
    public static void store(DoubleVector value, double[] columns, int column, int row) {
        value.intoArray(columns, at(column) + row);
    }

    /** Sets so many columns to zero for all rows. */
    public void clear(int column, int columnCount) {
        for (int c = column; c < column + columnCount; c++) {
            Arrays.fill(columns, at(c), at(c) + rows, 0);
        }
    }

    /** Number of rows, a multiple of 8. */
    public int rows() {
        return rows;
    }

    /** Length of the step that led to the present positions, s; 0 at the start of a run. */
    public double step() {
        return step;
    }

    /** Reach of the laws, m: rows have TOUCH = 1 while their overlap is above minus this. */
    public double reach() {
        return reach;
    }

    /** Sets the reach of the laws, m. */
    public void reach(double metres) {
        reach = metres;
    }

    public double[] history() {
        return history;
    }

    /** Index in {@link #history()} of one history column of a row that is a multiple of 8; its tile of 8 rows follows. */
    public int historyAt(int row, int column) {
        return historyStart + (row * historyColumns) + 8 * column;
    }

    /** Index in {@link #history()} of one history column of any row. */
    public int historyAtRow(int row, int column) {
        return historyAt(row & ~7, column) + (row & 7);
    }

    /** True when {@link Column#STORED_ENERGY} must be filled, for a ledger report. */
    public boolean energyDue() {
        return energyDue;
    }

    /** Shortest contact duration that normal stages reported so far in the step, s; a longer one need not be reported. */
    public double shortestDuration() {
        return shortestDuration;
    }

    /** A normal stage reports the shortest contact duration of its touching rows, s; not a number stops the run. */
    public void reportDuration(double duration) {
        shortestDuration =
                duration < shortestDuration ? duration : Double.isNaN(duration) ? duration : shortestDuration;
    }

    /** Opens the block for rows of a list. */
    public void open(
            int rowCount, double pastStep, double[] historyArray, int start, int columnsPerRow, boolean energyIsDue) {
        rows = rowCount;
        step = pastStep;
        history = historyArray;
        historyStart = start;
        historyColumns = columnsPerRow;
        energyDue = energyIsDue;
        shortestDuration = Double.POSITIVE_INFINITY;
    }
}
