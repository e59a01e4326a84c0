// SPDX-License-Identifier: Apache-2.0
package reedling.neighbour;

import java.util.Arrays;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/**
 * Cubic cells at least as wide as the farthest a listed pair can be apart, and the memory order that follows them along
 * a Morton curve, so that grains near in space are near in memory.
 *
 * <p>Threads: built by one; read by many.
 */
public final class CellGrid {

    private static final int MORTON_BITS = 21;
    private static final int RADIX_BITS = 11;
    private static final int SPARE_CELLS = 32_768; // cells a small case may always have

    private double originX;
    private double originY;
    private double originZ;
    private double inverseCell;
    private int countX;
    private int countY;
    private int countZ;
    private int[] cellStart = new int[0];
    private int[] cellEnd = new int[0];

    private long[] keys = new long[0];
    private long[] keysCopy = new long[0];
    private int[] order = new int[0];
    private int[] orderCopy = new int[0];

    /**
     * Fits the grid to the grains' bounding box.
     *
     * @param reach largest distance between the centres of a listed pair, m
     */
    public void fit(GrainStore grains, double reach) {
        double[] low = {Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY};
        double[] high = {Double.NEGATIVE_INFINITY, Double.NEGATIVE_INFINITY, Double.NEGATIVE_INFINITY};
        double[] rows = grains.rows();
        for (int g = 0; g < grains.count(); g++) {
            int at = GrainRow.at(g);
            for (int axis = 0; axis < 3; axis++) {
                double value = rows[at + axis];
                low[axis] = value < low[axis] ? value : low[axis];
                high[axis] = value > high[axis] ? value : high[axis];
            }
        }
        if (grains.count() == 0) {
            Arrays.fill(low, 0);
            Arrays.fill(high, 0);
        }
        originX = low[0];
        originY = low[1];
        originZ = low[2];
        double cell = reach;
        while (cells(low, high, cell) > SPARE_CELLS + 2.0 * grains.count()) {
            cell *= 1.25; // a wide, thin cloud of grains: larger cells rather than an endless table
        }
        inverseCell = 1 / cell;
        countX = cellsAlong(high[0] - low[0], cell);
        countY = cellsAlong(high[1] - low[1], cell);
        countZ = cellsAlong(high[2] - low[2], cell);
    }

    private static double cells(double[] low, double[] high, double cell) {
        return (double) cellsAlong(high[0] - low[0], cell)
                * cellsAlong(high[1] - low[1], cell)
                * cellsAlong(high[2] - low[2], cell);
    }

    private static int cellsAlong(double extent, double cell) {
        return (int) Math.min(extent / cell, (1 << MORTON_BITS) - 2) + 1;
    }

    /** Cell number along x of a coordinate, clamped into the grid. */
    public int cellX(double x) {
        return clamped((x - originX) * inverseCell, countX);
    }

    /** Cell number along y of a coordinate, clamped into the grid. */
    public int cellY(double y) {
        return clamped((y - originY) * inverseCell, countY);
    }

    /** Cell number along z of a coordinate, clamped into the grid. */
    public int cellZ(double z) {
        return clamped((z - originZ) * inverseCell, countZ);
    }

    private static int clamped(double cell, int count) {
        return cell > 0 ? Math.min((int) cell, count - 1) : 0;
    }

    public int countX() {
        return countX;
    }

    public int countY() {
        return countY;
    }

    public int countZ() {
        return countZ;
    }

    /** Index of a cell in the tables of starts and ends. */
    public int index(int cx, int cy, int cz) {
        return (cz * countY + cy) * countX + cx;
    }

    /** First grain of each cell, in sorted order. */
    public int[] cellStart() {
        return cellStart;
    }

    /** One past the last grain of each cell. */
    public int[] cellEnd() {
        return cellEnd;
    }

    /**
     * Order of the grains along the curve: old row of each new row. Grains of one cell keep their order, so that the
     * order depends on the state alone.
     *
     * @param removed grains to place last, or an empty array
     */
    public int[] sortedOrder(GrainStore grains, boolean[] removed) {
        int n = grains.count();
        reserve(n);
        double[] rows = grains.rows();
        long bits = 0;
        for (int g = 0; g < n; g++) {
            int at = GrainRow.at(g);
            long key = morton(cellX(rows[at]), cellY(rows[at + 1]), cellZ(rows[at + 2]));
            keys[g] = removed.length > 0 && removed[g] ? Long.MAX_VALUE : key;
            bits |= keys[g];
            order[g] = g;
        }
        for (int shift = 0; shift < Long.SIZE && (bits >>> shift) != 0; shift += RADIX_BITS) {
            radixPass(n, shift);
        }
        return order;
    }

    private void reserve(int n) {
        if (n > keys.length) {
            int capacity = n + n / 4;
            keys = new long[capacity];
            keysCopy = new long[capacity];
            order = new int[capacity];
            orderCopy = new int[capacity];
        }
    }

    private void radixPass(int n, int shift) {
        int mask = (1 << RADIX_BITS) - 1;
        int[] start = new int[mask + 2];
        for (int k = 0; k < n; k++) {
            start[((int) (keys[k] >>> shift) & mask) + 1]++;
        }
        for (int d = 0; d <= mask; d++) {
            start[d + 1] += start[d];
        }
        for (int k = 0; k < n; k++) {
            int to = start[(int) (keys[k] >>> shift) & mask]++;
            keysCopy[to] = keys[k];
            orderCopy[to] = order[k];
        }
        long[] keySwap = keys;
        keys = keysCopy;
        keysCopy = keySwap;
        int[] orderSwap = order;
        order = orderCopy;
        orderCopy = orderSwap;
    }

    /** Fills the tables of cells from grains that already stand in sorted order. */
    public void index(GrainStore grains) {
        int cells = countX * countY * countZ;
        if (cells > cellStart.length) {
            cellStart = new int[cells];
            cellEnd = new int[cells];
        }
        Arrays.fill(cellStart, 0, cells, 0);
        Arrays.fill(cellEnd, 0, cells, 0);
        double[] rows = grains.rows();
        int previous = -1;
        for (int g = 0; g < grains.count(); g++) {
            int at = GrainRow.at(g);
            int cell = index(cellX(rows[at]), cellY(rows[at + 1]), cellZ(rows[at + 2]));
            if (cell != previous) {
                cellStart[cell] = g;
                previous = cell;
            }
            cellEnd[cell] = g + 1;
        }
    }

    private static long morton(int x, int y, int z) {
        return spread(x) | spread(y) << 1 | spread(z) << 2;
    }

    /** Puts two zero bits between the bits of a 21-bit number. */
    private static long spread(int value) {
        long v = value & 0x1fffffL;
        v = (v | v << 32) & 0x1f00000000ffffL;
        v = (v | v << 16) & 0x1f0000ff0000ffL;
        v = (v | v << 8) & 0x100f00f00f00f00fL;
        v = (v | v << 4) & 0x10c30c30c30c30c3L;
        return (v | v << 2) & 0x1249249249249249L;
    }
}
