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

        DoubleVector ae = crossed(a, e, SWAP_4, UPPER_4), bf = crossed(b, f, SWAP_4, UPPER_4);
        DoubleVector cg = crossed(c, g, SWAP_4, UPPER_4), dh = crossed(d, h, SWAP_4, UPPER_4);
        store(a.blend(ae, UPPER_4), columns, at);
        store(b.blend(bf, UPPER_4), columns, at + stride);
        store(c.blend(cg, UPPER_4), columns, at + 2 * stride);
        store(d.blend(dh, UPPER_4), columns, at + 3 * stride);
        store(ae.blend(e, UPPER_4), columns, at + 4 * stride);
        store(bf.blend(f, UPPER_4), columns, at + 5 * stride);
        store(cg.blend(g, UPPER_4), columns, at + 6 * stride);
        store(dh.blend(h, UPPER_4), columns, at + 7 * stride);
    }

    /** Second and third round of a turn, in place. */
    public static void finishTurn(double[] columns, int at, int stride) {
        DoubleVector a = load(columns, at), b = load(columns, at + stride);
        DoubleVector c = load(columns, at + 2 * stride), d = load(columns, at + 3 * stride);
        DoubleVector e = load(columns, at + 4 * stride), f = load(columns, at + 5 * stride);
        DoubleVector g = load(columns, at + 6 * stride), h = load(columns, at + 7 * stride);

        DoubleVector ac = crossed(a, c, SWAP_2, UPPER_2), bd = crossed(b, d, SWAP_2, UPPER_2);
        DoubleVector eg = crossed(e, g, SWAP_2, UPPER_2), fh = crossed(f, h, SWAP_2, UPPER_2);
        DoubleVector a2 = a.blend(ac, UPPER_2),
                b2 = b.blend(bd, UPPER_2),
                c2 = ac.blend(c, UPPER_2),
                d2 = bd.blend(d, UPPER_2);
        DoubleVector e2 = e.blend(eg, UPPER_2),
                f2 = f.blend(fh, UPPER_2),
                g2 = eg.blend(g, UPPER_2),
                h2 = fh.blend(h, UPPER_2);

        DoubleVector ab = crossed(a2, b2, SWAP_1, UPPER_1), cd = crossed(c2, d2, SWAP_1, UPPER_1);
        DoubleVector ef = crossed(e2, f2, SWAP_1, UPPER_1), gh = crossed(g2, h2, SWAP_1, UPPER_1);
        store(a2.blend(ab, UPPER_1), columns, at);
        store(ab.blend(b2, UPPER_1), columns, at + stride);
        store(c2.blend(cd, UPPER_1), columns, at + 2 * stride);
        store(cd.blend(d2, UPPER_1), columns, at + 3 * stride);
        store(e2.blend(ef, UPPER_1), columns, at + 4 * stride);
        store(ef.blend(f2, UPPER_1), columns, at + 5 * stride);
        store(g2.blend(gh, UPPER_1), columns, at + 6 * stride);
        store(gh.blend(h2, UPPER_1), columns, at + 7 * stride);
    }

    /** First round of a turn, in place. */
    public static void beginTurn(double[] columns, int at, int stride) {
        DoubleVector a = load(columns, at), b = load(columns, at + stride);
        DoubleVector c = load(columns, at + 2 * stride), d = load(columns, at + 3 * stride);
        DoubleVector e = load(columns, at + 4 * stride), f = load(columns, at + 5 * stride);
        DoubleVector g = load(columns, at + 6 * stride), h = load(columns, at + 7 * stride);
        DoubleVector ae = crossed(a, e, SWAP_4, UPPER_4), bf = crossed(b, f, SWAP_4, UPPER_4);
        DoubleVector cg = crossed(c, g, SWAP_4, UPPER_4), dh = crossed(d, h, SWAP_4, UPPER_4);
        store(a.blend(ae, UPPER_4), columns, at);
        store(b.blend(bf, UPPER_4), columns, at + stride);
        store(c.blend(cg, UPPER_4), columns, at + 2 * stride);
        store(d.blend(dh, UPPER_4), columns, at + 3 * stride);
        store(ae.blend(e, UPPER_4), columns, at + 4 * stride);
        store(bf.blend(f, UPPER_4), columns, at + 5 * stride);
        store(cg.blend(g, UPPER_4), columns, at + 6 * stride);
        store(dh.blend(h, UPPER_4), columns, at + 7 * stride);
    }

    private static DoubleVector combined(double[] rows, int first, int second, DoubleVector weight) {
        return DoubleVector.fromArray(Lanes.SPECIES, rows, first)
                .fma(weight, DoubleVector.fromArray(Lanes.SPECIES, rows, second));
    }

    /** The combined rows of eight pairs, one number at a time and not turned yet: {@link #turnScalar} turns them. */
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
                columns[at + k * stride + c] = Math.fma(rows[i + c], weight[c], rows[j + c]);
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

    /** Turns eight columns back into rows, in place: {@link #beginTurn} and {@link #finishTurn} one number at a time. */
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

    private static void store(DoubleVector value, double[] to, int at) {
        value.intoArray(to, at);
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
