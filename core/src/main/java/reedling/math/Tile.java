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
 * <p>The first round and the other two stand in methods of their own, with the tile in memory between them: one method
 * for all passes the compiler's limit on inlined code, and every vector becomes an object. After the first round the
 * tile falls into two quads, vectors 0-3 and 4-7, which the later rounds keep apart; so a stage that wants four columns
 * turns one quad and goes on with them in registers ({@link #swap2}, {@link #swap1} and the blends beside them). Loops
 * over tiles stand inside the methods, so that masks and shuffles stay in registers from tile to tile.
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
     * Combines the rows of pairs, {@code weight * row(first) + row(second)}, and does the first round of turning each
     * eight of them into columns.
     *
     * @param rows the array of rows
     * @param base index of the wanted eight doubles of row 0
     * @param length doubles from one row to the next
     * @param first row numbers of the first bodies, read from {@code pair}
     * @param second row numbers of the second bodies
     * @param count pairs, a multiple of eight
     * @param weight eight factors of the first row: -1 for a difference, +1 for a sum
     * @param at index of column 0 of the first tile; the next tile follows eight doubles on
     * @param stride doubles from one column to the next
     */
    public static void combine(
            double[] rows,
            int base,
            int length,
            int[] first,
            int[] second,
            int pair,
            int count,
            double[] weight,
            double[] columns,
            int at,
            int stride) {
        DoubleVector w = DoubleVector.fromArray(Lanes.SPECIES, weight, 0);
        for (int t = 0; t < count; t += Lanes.TILE) {
            int p = pair + t;
            DoubleVector a = combined(rows, base + length * first[p], base + length * second[p], w);
            DoubleVector b = combined(rows, base + length * first[p + 1], base + length * second[p + 1], w);
            DoubleVector c = combined(rows, base + length * first[p + 2], base + length * second[p + 2], w);
            DoubleVector d = combined(rows, base + length * first[p + 3], base + length * second[p + 3], w);
            DoubleVector e = combined(rows, base + length * first[p + 4], base + length * second[p + 4], w);
            DoubleVector f = combined(rows, base + length * first[p + 5], base + length * second[p + 5], w);
            DoubleVector g = combined(rows, base + length * first[p + 6], base + length * second[p + 6], w);
            DoubleVector h = combined(rows, base + length * first[p + 7], base + length * second[p + 7], w);
            store4(a, e, columns, at + t, stride);
            store4(b, f, columns, at + t + stride, stride);
            store4(c, g, columns, at + t + 2 * stride, stride);
            store4(d, h, columns, at + t + 3 * stride, stride);
        }
    }

    /** Stores two vectors that stand four apart in a tile, their upper and lower halves exchanged: part of the first round. */
    public static void store4(DoubleVector lower, DoubleVector upper, double[] columns, int at, int stride) {
        DoubleVector swapped = crossed(lower, upper, SWAP_4, UPPER_4);
        lower.blend(swapped, UPPER_4).intoArray(columns, at);
        swapped.blend(upper, UPPER_4).intoArray(columns, at + 4 * stride);
    }

    /** The quarters that two vectors two apart must exchange, each already in the other's place. */
    public static DoubleVector swap2(DoubleVector lower, DoubleVector upper) {
        return crossed(lower, upper, SWAP_2, UPPER_2);
    }

    /** The earlier of two vectors two apart after the exchange; the later is {@code take2(swapped, upper)}. */
    public static DoubleVector take2(DoubleVector base, DoubleVector upperPlaces) {
        return base.blend(upperPlaces, UPPER_2);
    }

    /** The numbers that two neighbouring vectors must exchange, each already in the other's place. */
    public static DoubleVector swap1(DoubleVector lower, DoubleVector upper) {
        return crossed(lower, upper, SWAP_1, UPPER_1);
    }

    /** The earlier of two neighbouring vectors after the exchange; the later is {@code take1(swapped, upper)}. */
    public static DoubleVector take1(DoubleVector base, DoubleVector upperPlaces) {
        return base.blend(upperPlaces, UPPER_1);
    }

    /** Second and third round of a turn of one quad (four columns) of so many tiles, in place. */
    public static void finishQuad(double[] columns, int at, int stride, int tiles) {
        for (int t = 0; t < tiles; t++) {
            int k = at + Lanes.TILE * t;
            DoubleVector a = load(columns, k), b = load(columns, k + stride);
            DoubleVector c = load(columns, k + 2 * stride), d = load(columns, k + 3 * stride);
            DoubleVector ac = swap2(a, c), bd = swap2(b, d);
            DoubleVector a2 = take2(a, ac), b2 = take2(b, bd), c2 = take2(ac, c), d2 = take2(bd, d);
            DoubleVector ab = swap1(a2, b2), cd = swap1(c2, d2);
            take1(a2, ab).intoArray(columns, k);
            take1(ab, b2).intoArray(columns, k + stride);
            take1(c2, cd).intoArray(columns, k + 2 * stride);
            take1(cd, d2).intoArray(columns, k + 3 * stride);
        }
    }

    private static DoubleVector combined(double[] rows, int first, int second, DoubleVector weight) {
        return load(rows, first).fma(weight, load(rows, second));
    }

    /** The combined rows of pairs as columns, one number at a time. */
    public static void combineScalar(
            double[] rows,
            int base,
            int length,
            int[] first,
            int[] second,
            int pair,
            int count,
            double[] weight,
            double[] columns,
            int at,
            int stride) {
        for (int k = 0; k < count; k++) {
            int i = base + length * first[pair + k];
            int j = base + length * second[pair + k];
            for (int c = 0; c < Lanes.TILE; c++) {
                columns[at + c * stride + k] = Math.fma(rows[i + c], weight[c], rows[j + c]);
            }
        }
    }

    /** Adds eight doubles of one array to eight of another. */
    public static void addRow(double[] from, int fromAt, double[] to, int toAt) {
        if (Lanes.VECTORISED) {
            load(to, toAt).add(load(from, fromAt)).intoArray(to, toAt);
        } else {
            for (int c = 0; c < Lanes.TILE; c++) {
                to[toAt + c] += from[fromAt + c];
            }
        }
    }

    /** Turns eight columns back into rows, in place: all three rounds, one number at a time. */
    public static void turnScalar(double[] columns, int at, int stride) {
        for (int row = 0; row < Lanes.TILE; row++) {
            for (int c = 0; c < row; c++) {
                double kept = columns[at + c * stride + row];
                columns[at + c * stride + row] = columns[at + row * stride + c];
                columns[at + row * stride + c] = kept;
            }
        }
    }

    /** Copies eight doubles of one array to eight of another. */
    public static void copyRow(double[] from, int fromAt, double[] to, int toAt) {
        System.arraycopy(from, fromAt, to, toAt, Lanes.TILE);
    }

    private static DoubleVector load(double[] from, int at) {
        return DoubleVector.fromArray(Lanes.SPECIES, from, at);
    }

    /**
     * The halves that two vectors must exchange, each already in the other's place: the upper halves of the first in the
     * lower places, the lower halves of the second in the upper places.
     */
    private static DoubleVector crossed(
            DoubleVector first, DoubleVector second, VectorShuffle<Double> swap, VectorMask<Double> upper) {
        return second.blend(first, upper).rearrange(swap);
    }
}
