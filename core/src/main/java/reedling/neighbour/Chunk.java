// SPDX-License-Identifier: Apache-2.0
package reedling.neighbour;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;

/**
 * A range of grains that one task works on, with the pairs it computes: two segments for each material pair, one for
 * pairs inside the chunk and one for pairs whose second grain lies in a chunk of higher number.
 */
public final class Chunk {

    private final int number;
    private final PairSegment[] segments;
    private final List<List<CrossLink>> outgoing = new ArrayList<>();
    private final List<CrossLink> incoming = new ArrayList<>();
    private int from;
    private int to;

    /**
     * @param number position among the chunks
     * @param materialPairs number of material pairs
     * @param historyColumns doubles of history a row
     */
    public Chunk(int number, int materialPairs, int historyColumns) {
        this.number = number;
        segments = new PairSegment[2 * materialPairs];
        for (int s = 0; s < segments.length; s++) {
            segments[s] = new PairSegment(historyColumns, (s & 1) == 1);
            outgoing.add(new ArrayList<>());
        }
    }

    public int number() {
        return number;
    }

    /** First grain of the range. */
    public int from() {
        return from;
    }

    /** One past the last grain of the range. */
    public int to() {
        return to;
    }

    /** Segments: material pair p stands at 2 p (inside) and 2 p + 1 (across). */
    public PairSegment[] segments() {
        return segments;
    }

    /** Links of other chunks' segments into this one, by source chunk, then material pair. */
    public List<CrossLink> incoming() {
        return incoming;
    }

    /** Takes a range and forgets all pairs and links. */
    public void open(int firstGrain, int endGrain) {
        from = firstGrain;
        to = endGrain;
        incoming.clear();
        for (int s = 0; s < segments.length; s++) {
            segments[s].clear();
            outgoing.get(s).clear();
        }
    }

    /**
     * Makes a pair active; a pair across is announced to the chunk of its second grain.
     *
     * @return its row in the segment
     */
    public int activate(int segmentNumber, int i, int j, ChunkLayout layout, int ghost) {
        PairSegment segment = segments[segmentNumber];
        int row = segment.activate(i, j, ghost);
        if (segment.cross()) {
            link(segmentNumber, layout.chunkOf(j)).add(row);
        }
        return row;
    }

    /** Lists a near pair; one across prepares the link it may need later. */
    void addCandidate(int segmentNumber, int i, int j, double gap, ChunkLayout layout) {
        PairSegment segment = segments[segmentNumber];
        segment.addCandidate(i, j, gap);
        if (segment.cross() && j < layout.grains()) {
            link(segmentNumber, layout.chunkOf(j));
        }
    }

    private CrossLink link(int segmentNumber, int target) {
        List<CrossLink> links = outgoing.get(segmentNumber);
        for (int k = links.size() - 1; k >= 0; k--) {
            if (links.get(k).targetChunk() == target) {
                return links.get(k);
            }
        }
        CrossLink made = new CrossLink(segments[segmentNumber], target);
        links.add(made);
        return made;
    }

    /** Hands each chunk the links that end in it, in an order that does not depend on threads. */
    static void connect(List<Chunk> chunks) {
        for (Chunk source : chunks) {
            for (List<CrossLink> links : source.outgoing) {
                for (CrossLink link : links) {
                    chunks.get(link.targetChunk()).incoming.add(link);
                }
            }
        }
    }

    void save(SectionWriter out) throws IOException {
        for (PairSegment segment : segments) {
            segment.save(out);
        }
    }

    /** Reads pairs into an opened chunk; links follow from the order of the rows. */
    void restore(SectionReader in, ChunkLayout layout, int ghost) {
        for (int s = 0; s < segments.length; s++) {
            int[][] active = readPairs(in);
            for (int k = 0; k < active[0].length; k++) {
                activate(s, active[0][k], active[1][k], layout, ghost);
            }
            segments[s].restoreHistory(in);
            int[][] candidates = readPairs(in);
            for (int k = 0; k < candidates[0].length; k++) {
                addCandidate(s, candidates[0][k], candidates[1][k], 0, layout);
            }
            segments[s].restoreBlocks(in);
        }
    }

    private static int[][] readPairs(SectionReader in) {
        int count = in.readInt();
        int[][] pairs = new int[2][count];
        in.readInts(pairs[0], 0, count);
        in.readInts(pairs[1], 0, count);
        return pairs;
    }
}
