// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.io.IOException;
import java.util.Arrays;
import reedling.checkpoint.SectionWriter;
import reedling.neighbour.PairSegment;

/**
 * Contacts of grains with wires in one chunk and material pair. A row stands for a grain and a connected run of one
 * wire's elements, not for an element, so that friction survives sliding over a node. Rows that ended stay until the
 * next search and are used again when the same grain touches the same wire.
 *
 * <p>Threads: written by the task of its chunk; nodes read the loads after a barrier.
 */
final class WireRows {

    /** Doubles of geometry a row: normal 3, overlap, place along the element 0..1, distance from the axis, R*. */
    static final int GEOMETRY = 8;

    static final int OVERLAP = 3;
    static final int ALONG = 4;
    static final int DISTANCE = 5;
    static final int EFFECTIVE_RADIUS = 6;

    private final PairSegment segment;
    private int[] element = new int[0];
    private int[] near = new int[0];
    private int[] nextOfGrain = new int[0];
    private long[] seen = new long[0];
    private double[] geometry = new double[0];

    WireRows(int historyColumns) {
        segment = new PairSegment(historyColumns, true);
    }

    /** Grain, wire, history and the force rows for the wire of each row. */
    PairSegment segment() {
        return segment;
    }

    /** Element of each row. */
    int[] element() {
        return element;
    }

    /** Number among the chunk's near grains of each row's grain. */
    int[] near() {
        return near;
    }

    /** Row of the same grain that was added before, or -1. */
    int[] nextOfGrain() {
        return nextOfGrain;
    }

    /** Pass in which each row was found touching last. */
    long[] seen() {
        return seen;
    }

    double[] geometry() {
        return geometry;
    }

    void clear() {
        segment.clear();
    }

    /** Adds a row of a grain and a wire with zero history, chained to the grain's other rows. */
    int add(int grain, int wire, int nearNumber, int chained, double effectiveRadius, int ghost) {
        int row = segment.activate(grain, wire, ghost);
        if (segment.paddedCount() > element.length) {
            int capacity = 2 * segment.paddedCount();
            element = Arrays.copyOf(element, capacity);
            near = Arrays.copyOf(near, capacity);
            nextOfGrain = Arrays.copyOf(nextOfGrain, capacity);
            seen = Arrays.copyOf(seen, capacity);
            geometry = Arrays.copyOf(geometry, GEOMETRY * capacity);
        }
        near[row] = nearNumber;
        nextOfGrain[row] = chained;
        seen[row] = -1;
        element[row] = -1;
        geometry[GEOMETRY * row + EFFECTIVE_RADIUS] = effectiveRadius;
        return row;
    }

    /** Writes rows, history and geometry. */
    void save(SectionWriter out) throws IOException {
        int count = segment.activeCount();
        out.writeInt(count);
        out.writeInts(segment.first(), 0, count);
        out.writeInts(segment.second(), 0, count);
        out.writeInts(near, 0, count);
        out.writeInts(element, 0, count);
        out.writeLongs(seen, 0, count);
        out.writeDoubles(geometry, 0, GEOMETRY * count);
        segment.saveHistory(out);
    }
}
