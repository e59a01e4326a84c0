// SPDX-License-Identifier: Apache-2.0
package reedling.math;

import jdk.incubator.vector.DoubleVector;
import jdk.incubator.vector.VectorMask;
import jdk.incubator.vector.VectorShuffle;

/**
 * Turns eight rows of eight doubles into eight columns, in registers: three rounds that exchange the halves of vectors
 * four, two and one places apart. The same rounds turn columns back into rows. Plain versions with the same bits run
 * where there are no 512-bit vectors.
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
     * Combines the rows of eight pairs and turns the result into columns: lane c of
     * {@code weight * row(first) + row(second)} of pair k goes to {@code columns[at + c * stride + k]}.
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

        DoubleVector a4 = low4(a, e), b4 = low4(b, f), c4 = low4(c, g), d4 = low4(d, h);
        DoubleVector e4 = high4(a, e), f4 = high4(b, f), g4 = high4(c, g), h4 = high4(d, h);

        DoubleVector a2 = low2(a4, c4), b2 = low2(b4, d4), c2 = high2(a4, c4), d2 = high2(b4, d4);
        DoubleVector e2 = low2(e4, g4), f2 = low2(f4, h4), g2 = high2(e4, g4), h2 = high2(f4, h4);

        low1(a2, b2).intoArray(columns, at);
        high1(a2, b2).intoArray(columns, at + stride);
        low1(c2, d2).intoArray(columns, at + 2 * stride);
        high1(c2, d2).intoArray(columns, at + 3 * stride);
        low1(e2, f2).intoArray(columns, at + 4 * stride);
        high1(e2, f2).intoArray(columns, at + 5 * stride);
        low1(g2, h2).intoArray(columns, at + 6 * stride);
        high1(g2, h2).intoArray(columns, at + 7 * stride);
    }

    private static DoubleVector combined(double[] rows, int first, int second, DoubleVector weight) {
        return DoubleVector.fromArray(Lanes.SPECIES, rows, first)
                .fma(weight, DoubleVector.fromArray(Lanes.SPECIES, rows, second));
    }

    /** {@link #combine} one number at a time. */
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
     * Turns eight columns back into rows and adds each to the row its pair names.
     *
     * @param columns column c of the tile starts at {@code at + c * stride}
     * @param target rows of eight doubles
     * @param base index of row 0 in the target
     * @param index row numbers; eight are read from {@code pair}
     */
    public static void addToRows(double[] columns, int at, int stride, double[] target, int base, int[] index, int pair) {
        DoubleVector c0 = load(columns, at), c1 = load(columns, at + stride);
        DoubleVector c2 = load(columns, at + 2 * stride), c3 = load(columns, at + 3 * stride);
        DoubleVector c4 = load(columns, at + 4 * stride), c5 = load(columns, at + 5 * stride);
        DoubleVector c6 = load(columns, at + 6 * stride), c7 = load(columns, at + 7 * stride);

        DoubleVector a4 = low4(c0, c4), b4 = low4(c1, c5), c4l = low4(c2, c6), d4 = low4(c3, c7);
        DoubleVector e4 = high4(c0, c4), f4 = high4(c1, c5), g4 = high4(c2, c6), h4 = high4(c3, c7);

        DoubleVector a2 = low2(a4, c4l), b2 = low2(b4, d4), c2l = high2(a4, c4l), d2 = high2(b4, d4);
        DoubleVector e2 = low2(e4, g4), f2 = low2(f4, h4), g2 = high2(e4, g4), h2 = high2(f4, h4);

        add(low1(a2, b2), target, base + 8 * index[pair]);
        add(high1(a2, b2), target, base + 8 * index[pair + 1]);
        add(low1(c2l, d2), target, base + 8 * index[pair + 2]);
        add(high1(c2l, d2), target, base + 8 * index[pair + 3]);
        add(low1(e2, f2), target, base + 8 * index[pair + 4]);
        add(high1(e2, f2), target, base + 8 * index[pair + 5]);
        add(low1(g2, h2), target, base + 8 * index[pair + 6]);
        add(high1(g2, h2), target, base + 8 * index[pair + 7]);
    }

    /** {@link #addToRows} one number at a time. */
    public static void addToRowsScalar(
            double[] columns, int at, int stride, double[] target, int base, int[] index, int pair) {
        for (int k = 0; k < Lanes.TILE; k++) {
            int row = base + 8 * index[pair + k];
            for (int c = 0; c < Lanes.TILE; c++) {
                target[row + c] += columns[at + c * stride + k];
            }
        }
    }

    /** As {@link #addToRows}, but stores the eight rows one after the other from {@code to}. */
    public static void storeRows(double[] columns, int at, int stride, double[] target, int to) {
        DoubleVector c0 = load(columns, at), c1 = load(columns, at + stride);
        DoubleVector c2 = load(columns, at + 2 * stride), c3 = load(columns, at + 3 * stride);
        DoubleVector c4 = load(columns, at + 4 * stride), c5 = load(columns, at + 5 * stride);
        DoubleVector c6 = load(columns, at + 6 * stride), c7 = load(columns, at + 7 * stride);

        DoubleVector a4 = low4(c0, c4), b4 = low4(c1, c5), c4l = low4(c2, c6), d4 = low4(c3, c7);
        DoubleVector e4 = high4(c0, c4), f4 = high4(c1, c5), g4 = high4(c2, c6), h4 = high4(c3, c7);

        DoubleVector a2 = low2(a4, c4l), b2 = low2(b4, d4), c2l = high2(a4, c4l), d2 = high2(b4, d4);
        DoubleVector e2 = low2(e4, g4), f2 = low2(f4, h4), g2 = high2(e4, g4), h2 = high2(f4, h4);

        low1(a2, b2).intoArray(target, to);
        high1(a2, b2).intoArray(target, to + 8);
        low1(c2l, d2).intoArray(target, to + 16);
        high1(c2l, d2).intoArray(target, to + 24);
        low1(e2, f2).intoArray(target, to + 32);
        high1(e2, f2).intoArray(target, to + 40);
        low1(g2, h2).intoArray(target, to + 48);
        high1(g2, h2).intoArray(target, to + 56);
    }

    /** {@link #storeRows} one number at a time. */
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

    private static void add(DoubleVector row, double[] target, int at) {
        load(target, at).add(row).intoArray(target, at);
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
