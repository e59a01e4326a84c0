// SPDX-License-Identifier: Apache-2.0
package reedling.math;

import jdk.incubator.vector.DoubleVector;
import jdk.incubator.vector.VectorMask;
import jdk.incubator.vector.VectorShuffle;

/**
 * Turns eight rows of eight doubles into eight columns, in registers: three rounds that exchange the halves of vectors
 * four, two and one places apart. The same rounds turn columns back into rows. Plain versions with the same bits run
 * where there are no 512-bit vectors.
 *
 * <p>The first round and the other two are methods of their own, with the tile in memory between them: one method for all
 * passes the compiler's limit on inlined code, and every vector becomes an object.
 */
public final class Tile {

    private static final VectorShuffle<Double> SWAP_4 = VectorShuffle.fromValues(Lanes.SPECIES, 4, 5, 6, 7, 0, 1, 2, 3);
    private static final VectorShuffle<Double> SWAP_2 = VectorShuffle.fromValues(Lanes.SPECIES, 2, 3, 0, 1, 6, 7, 4, 5);
    private static final VectorShuffle<Double> SWAP_1 = VectorShuffle.fromValues(Lanes.SPECIES, 1, 0, 3, 2, 5, 4, 7, 6);
    private static final VectorMask<Double> UPPER_4 = VectorMask.fromLong(Lanes.SPECIES, 0xf0);
    private static final VectorMask<Double> UPPER_2 = VectorMask.fromLong(Lanes.SPECIES, 0xcc);
    private static final VectorMask<Double> UPPER_1 = VectorMask.fromLong(Lanes.SPECIES, 0xaa);

    private Tile() {}

    /**
     * Combines the rows of eight pairs and does the first round of turning the result into columns; after
     * {@link #finishTurn}, lane c of {@code weight * row(first) + row(second)} of pair k stands at
     * {@code columns[at + c * stride + k]}.
     *
     * @param rows the array of rows
     * @param base index of the wanted eight doubles of row 0
     * @param length doubles from one row to the next
     * @param first row numbers of the first bodies; eight are read from {@code pair}
     * @param second row numbers of the second bodies
     * @param weight eight factors of the first row: -1 for a difference, +1 for a sum
     */
    public static void combine(
            double[] rows,
            int base,
            int length,
            int[] first,
            int[] second,
            int pair,
            double[] weight,
            double[] columns,
            int at,
            int stride) {
        DoubleVector w = DoubleVector.fromArray(Lanes.SPECIES, weight, 0);
        DoubleVector a = combined(rows, base + length * first[pair], base + length * second[pair], w);
        DoubleVector b = combined(rows, base + length * first[pair + 1], base + length * second[pair + 1], w);
        DoubleVector c = combined(rows, base + length * first[pair + 2], base + length * second[pair + 2], w);
        DoubleVector d = combined(rows, base + length * first[pair + 3], base + length * second[pair + 3], w);
        DoubleVector e = combined(rows, base + length * first[pair + 4], base + length * second[pair + 4], w);
        DoubleVector f = combined(rows, base + length * first[pair + 5], base + length * second[pair + 5], w);
        DoubleVector g = combined(rows, base + length * first[pair + 6], base + length * second[pair + 6], w);
        DoubleVector h = combined(rows, base + length * first[pair + 7], base + length * second[pair + 7], w);

        store(low4(a, e), columns, at);
        store(low4(b, f), columns, at + stride);
        store(low4(c, g), columns, at + 2 * stride);
        store(low4(d, h), columns, at + 3 * stride);
        store(high4(a, e), columns, at + 4 * stride);
        store(high4(b, f), columns, at + 5 * stride);
        store(high4(c, g), columns, at + 6 * stride);
        store(high4(d, h), columns, at + 7 * stride);
    }

    /** Second and third round of a turn, in place. */
    public static void finishTurn(double[] columns, int at, int stride) {
        DoubleVector a = load(columns, at), b = load(columns, at + stride);
        DoubleVector c = load(columns, at + 2 * stride), d = load(columns, at + 3 * stride);
        DoubleVector e = load(columns, at + 4 * stride), f = load(columns, at + 5 * stride);
        DoubleVector g = load(columns, at + 6 * stride), h = load(columns, at + 7 * stride);

        DoubleVector a2 = low2(a, c), b2 = low2(b, d), c2 = high2(a, c), d2 = high2(b, d);
        DoubleVector e2 = low2(e, g), f2 = low2(f, h), g2 = high2(e, g), h2 = high2(f, h);

        store(low1(a2, b2), columns, at);
        store(high1(a2, b2), columns, at + stride);
        store(low1(c2, d2), columns, at + 2 * stride);
        store(high1(c2, d2), columns, at + 3 * stride);
        store(low1(e2, f2), columns, at + 4 * stride);
        store(high1(e2, f2), columns, at + 5 * stride);
        store(low1(g2, h2), columns, at + 6 * stride);
        store(high1(g2, h2), columns, at + 7 * stride);
    }

    /** First round of a turn, in place. */
    public static void beginTurn(double[] columns, int at, int stride) {
        DoubleVector a = load(columns, at), b = load(columns, at + stride);
        DoubleVector c = load(columns, at + 2 * stride), d = load(columns, at + 3 * stride);
        DoubleVector e = load(columns, at + 4 * stride), f = load(columns, at + 5 * stride);
        DoubleVector g = load(columns, at + 6 * stride), h = load(columns, at + 7 * stride);
        store(low4(a, e), columns, at);
        store(low4(b, f), columns, at + stride);
        store(low4(c, g), columns, at + 2 * stride);
        store(low4(d, h), columns, at + 3 * stride);
        store(high4(a, e), columns, at + 4 * stride);
        store(high4(b, f), columns, at + 5 * stride);
        store(high4(c, g), columns, at + 6 * stride);
        store(high4(d, h), columns, at + 7 * stride);
    }

    private static DoubleVector combined(double[] rows, int first, int second, DoubleVector weight) {
        return DoubleVector.fromArray(Lanes.SPECIES, rows, first)
                .fma(weight, DoubleVector.fromArray(Lanes.SPECIES, rows, second));
    }

    /** {@link #combine} and the whole turn, one number at a time. */
    public static void combineScalar(
            double[] rows,
            int base,
            int length,
            int[] first,
            int[] second,
            int pair,
            double[] weight,
            double[] columns,
            int at,
            int stride) {
        for (int k = 0; k < Lanes.TILE; k++) {
            int i = base + length * first[pair + k];
            int j = base + length * second[pair + k];
            for (int c = 0; c < Lanes.TILE; c++) {
                columns[at + c * stride + k] = Math.fma(rows[i + c], weight[c], rows[j + c]);
            }
        }
    }

    /**
     * Adds eight turned rows, row k at {@code at + k * stride}, each to the row its pair names.
     *
     * @param target rows of eight doubles
     * @param base index of row 0 in the target
     * @param index row numbers; eight are read from {@code pair}
     */
    public static void addRows(double[] columns, int at, int stride, double[] target, int base, int[] index, int pair) {
        for (int k = 0; k < Lanes.TILE; k++) {
            int row = base + 8 * index[pair + k];
            load(target, row).add(load(columns, at + k * stride)).intoArray(target, row);
        }
    }

    /** Turns eight columns back into rows and adds them, one number at a time. */
    public static void addToRowsScalar(
            double[] columns, int at, int stride, double[] target, int base, int[] index, int pair) {
        for (int k = 0; k < Lanes.TILE; k++) {
            int row = base + 8 * index[pair + k];
            for (int c = 0; c < Lanes.TILE; c++) {
                target[row + c] += columns[at + c * stride + k];
            }
        }
    }

    /** Stores eight turned rows, row k at {@code at + k * stride}, one after the other from {@code to}. */
    public static void storeRows(double[] columns, int at, int stride, double[] target, int to) {
        for (int k = 0; k < Lanes.TILE; k++) {
            load(columns, at + k * stride).intoArray(target, to + 8 * k);
        }
    }

    /** Turns eight columns back into rows and stores them, one number at a time. */
    public static void storeRowsScalar(double[] columns, int at, int stride, double[] target, int to) {
        for (int k = 0; k < Lanes.TILE; k++) {
            for (int c = 0; c < Lanes.TILE; c++) {
                target[to + 8 * k + c] = columns[at + c * stride + k];
            }
        }
    }

    private static DoubleVector load(double[] from, int at) {
        return DoubleVector.fromArray(Lanes.SPECIES, from, at);
    }

    private static void store(DoubleVector value, double[] to, int at) {
        value.intoArray(to, at);
    }

    private static DoubleVector low4(DoubleVector a, DoubleVector b) {
        return a.blend(b.rearrange(SWAP_4), UPPER_4);
    }

    private static DoubleVector high4(DoubleVector a, DoubleVector b) {
        return a.rearrange(SWAP_4).blend(b, UPPER_4);
    }

    private static DoubleVector low2(DoubleVector a, DoubleVector b) {
        return a.blend(b.rearrange(SWAP_2), UPPER_2);
    }

    private static DoubleVector high2(DoubleVector a, DoubleVector b) {
        return a.rearrange(SWAP_2).blend(b, UPPER_2);
    }

    private static DoubleVector low1(DoubleVector a, DoubleVector b) {
        return a.blend(b.rearrange(SWAP_1), UPPER_1);
    }

    private static DoubleVector high1(DoubleVector a, DoubleVector b) {
        return a.rearrange(SWAP_1).blend(b, UPPER_1);
    }
}
