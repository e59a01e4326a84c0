// SPDX-License-Identifier: Apache-2.0
package reedling.neighbour;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.material.MaterialTable;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/**
 * Owns the chunks and their pair lists. A search sorts the grains along the cells, cuts them into chunks, lists every
 * pair nearer than the search margin once, in the chunk of its lower grain, and gives living contacts their history
 * back.
 *
 * <p>Threads: a search is called by one thread between steps and uses the team.
 */
public final class NeighbourLists implements Persistent {

    private final int materialPairs;
    private final int historyColumns;
    private final HistoryCarry carry;
    private final CellGrid grid = new CellGrid();
    private final List<Chunk> pool = new ArrayList<>();
    private final List<CandidateSort> sorts = new ArrayList<>();
    private List<Chunk> chunks = new ArrayList<>();
    private ChunkLayout layout = ChunkLayout.of(0);
    private int[] newRow = new int[0];
    private double[] reach;
    private double largestReach;

    /**
     * @param materials number of materials
     * @param signedColumns for each history column of a row, whether it turns its sign with the order of the two grains
     */
    public NeighbourLists(int materials, boolean[] signedColumns) {
        materialPairs = materials * (materials + 1) / 2;
        historyColumns = signedColumns.length;
        carry = new HistoryCarry(signedColumns, true);
        reach = new double[materialPairs];
    }

    public List<Chunk> chunks() {
        return chunks;
    }

    public ChunkLayout layout() {
        return layout;
    }

    public CellGrid grid() {
        return grid;
    }

    /** New row of each grain that the last search sorted, -1 for one that left. */
    public int[] newRow() {
        return newRow;
    }

    /**
     * Sets how far the laws reach over gaps, m, for each material pair; before a search and after a restored state. Pairs
     * in reach are active.
     */
    public void reach(double[] byMaterialPair) {
        reach = byMaterialPair.clone();
        largestReach = 0;
        for (double one : reach) {
            largestReach = Math.max(largestReach, one);
        }
        chunks.forEach(this::setReach);
    }

    private void setReach(Chunk chunk) {
        for (int s = 0; s < chunk.segments().length; s++) {
            chunk.segments()[s].reach(reach[s / 2]);
        }
    }

    /**
     * Sorts the grains, drops those marked, and builds all lists anew.
     *
     * @param margin pairs with a gap less than it beyond their reach are listed, m
     * @param removed grains to drop, or an empty array
     */
    public void search(GrainStore grains, double margin, boolean[] removed, WorkerTeam team) {
        carry.copyOut(chunks.stream().map(Chunk::segments).toList(), team);
        double largest = largestRadius(grains);
        grid.fit(grains, 2 * largest + (margin + largestReach));
        sortGrains(grains, removed);
        grid.index(grains);
        layOut(grains.count());
        carry.rename(newRow, grains.count());
        while (sorts.size() < team.workers()) {
            sorts.add(new CandidateSort());
        }
        team.run((task, worker) -> list(chunks.get(task), grains, margin, sorts.get(worker)), chunks.size());
        Chunk.connect(chunks);
    }

    private static double largestRadius(GrainStore grains) {
        double largest = 1e-9; // m, so that an empty case has a grid too
        for (int g = 0; g < grains.count(); g++) {
            largest = Math.max(largest, grains.radius(g));
        }
        return largest;
    }

    private void sortGrains(GrainStore grains, boolean[] removed) {
        int[] order = grid.sortedOrder(grains, removed);
        int count = grains.count();
        int kept = count;
        if (newRow.length < count) {
            newRow = new int[count + count / 4];
        }
        for (int k = 0; k < count; k++) {
            newRow[order[k]] = k;
        }
        if (removed.length > 0) {
            for (int g = 0; g < count; g++) {
                if (removed[g]) {
                    newRow[g] = -1;
                    kept--;
                }
            }
        }
        grains.reorder(order, kept);
    }

    /** Cuts so many grains into chunks without listing any pair; a search or a checkpoint fills them. */
    public void layOut(int grains) {
        layout = ChunkLayout.of(grains);
        while (pool.size() < layout.count()) {
            pool.add(new Chunk(pool.size(), materialPairs, historyColumns));
        }
        chunks = new ArrayList<>(pool.subList(0, layout.count()));
        for (Chunk chunk : chunks) {
            chunk.open(layout.from(chunk.number()), layout.to(chunk.number()));
        }
    }

    private void list(Chunk chunk, GrainStore grains, double margin, CandidateSort sort) {
        setReach(chunk);
        for (int i = chunk.from(); i < chunk.to(); i++) {
            listPairsOf(i, chunk, grains, margin + largestReach);
        }
        for (PairSegment segment : chunk.segments()) {
            segment.sortCandidates(sort, margin);
        }
    }

    private void listPairsOf(int i, Chunk chunk, GrainStore grains, double margin) {
        double[] rows = grains.rows();
        int at = GrainRow.at(i);
        int cx = grid.cellX(rows[at]);
        int cy = grid.cellY(rows[at + 1]);
        int cz = grid.cellZ(rows[at + 2]);
        int x1 = Math.min(cx + 1, grid.countX() - 1);
        int y1 = Math.min(cy + 1, grid.countY() - 1);
        int z1 = Math.min(cz + 1, grid.countZ() - 1);
        for (int z = Math.max(cz - 1, 0); z <= z1; z++) {
            for (int y = Math.max(cy - 1, 0); y <= y1; y++) {
                for (int x = Math.max(cx - 1, 0); x <= x1; x++) {
                    int cell = grid.index(x, y, z);
                    int end = grid.cellEnd()[cell];
                    if (end > i + 1) {
                        listPairsInCell(i, Math.max(i + 1, grid.cellStart()[cell]), end, chunk, grains, margin);
                    }
                }
            }
        }
    }

    private void listPairsInCell(int i, int from, int end, Chunk chunk, GrainStore grains, double margin) {
        double[] rows = grains.rows();
        int at = GrainRow.at(i);
        double xi = rows[at];
        double yi = rows[at + 1];
        double zi = rows[at + 2];
        double reach = rows[at + GrainRow.RADIUS] + margin;
        for (int j = from; j < end; j++) {
            int other = GrainRow.at(j);
            double dx = rows[other] - xi;
            double dy = rows[other + 1] - yi;
            double dz = rows[other + 2] - zi;
            double far = reach + rows[other + GrainRow.RADIUS];
            double squared = Math.fma(dx, dx, Math.fma(dy, dy, dz * dz));
            if (squared < far * far) {
                place(i, j, Math.sqrt(squared) - (far - margin), chunk, grains);
            }
        }
    }

    private void place(int i, int j, double gap, Chunk chunk, GrainStore grains) {
        int pair = MaterialTable.pairIndex(grains.material()[i], grains.material()[j]);
        int segmentNumber = 2 * pair + (j < chunk.to() ? 0 : 1);
        int carried = carry.find(i, j);
        double ahead = gap - reach[pair];
        if (carried >= 0 || ahead <= 0) {
            int row = chunk.activate(segmentNumber, i, j, layout, grains.ghost());
            if (carried >= 0) {
                carry.giveBack(carried, chunk.segments()[segmentNumber], row);
            }
        } else {
            chunk.addCandidate(segmentNumber, i, j, ahead, layout);
        }
    }

    @Override
    public String section() {
        return "pairs";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        out.writeInt(layout.grains());
        for (Chunk chunk : chunks) {
            chunk.save(out);
        }
    }

    @Override
    public void restore(SectionReader in) {
        int grains = in.readInt();
        layOut(grains);
        for (Chunk chunk : chunks) {
            chunk.restore(in, layout, grains); // the first ghost's row is the number of grains
        }
        Chunk.connect(chunks);
    }
}
