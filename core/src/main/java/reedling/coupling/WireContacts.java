// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKind;
import reedling.contact.LawSet;
import reedling.material.MaterialTable;
import reedling.math.Tile;
import reedling.neighbour.Chunk;
import reedling.neighbour.ChunkLayout;
import reedling.neighbour.HistoryCarry;
import reedling.neighbour.NeighbourLists;
import reedling.neighbour.PairSegment;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.structure.NodalLoads;
import reedling.structure.NodeStore;
import reedling.structure.Structure;

/**
 * Contacts of grains with the wires of a structure, the fastest class of forces: computed on every fine step. Force and
 * torque go to the grain's own row and to the two nodes of the element with the weights of the contact's place, so that
 * momentum and angular momentum are kept to round-off.
 *
 * <p>Threads: each chunk's rows belong to its task; nodes add loads of all chunks in chunk order after a barrier.
 */
public final class WireContacts implements NodalLoads, Persistent {

    private final GrainStore grains;
    private final LawSet laws;
    private final MaterialTable materials;
    private final WireElements elements;
    private final HistoryCarry carry;
    private final List<StageLine> lawLines = new ArrayList<>();
    private final List<WireChunk> pool = new ArrayList<>();
    private final List<WireTouch> touches = new ArrayList<>();
    private int chunks;
    private long pass;
    private boolean listedAnew;
    private double[] reach;

    WireContacts(GrainStore grains, LawSet laws, MaterialTable materials, Structure structure, int[] materialOfBody) {
        this.grains = grains;
        this.laws = laws;
        this.materials = materials;
        elements = new WireElements(structure, materialOfBody);
        carry = new HistoryCarry(laws.signedColumns(), false);
        reach = new double[materials.pairs().size()];
        for (int pair = 0; pair < materials.pairs().size(); pair++) {
            lawLines.add(StageLine.ofLaws(laws.bound(ContactKind.GRAIN_WIRE, pair)));
        }
    }

    WireElements elements() {
        return elements;
    }

    WireChunk chunk(int number) {
        return pool.get(number);
    }

    void copyOut(WorkerTeam team) {
        List<PairSegment[]> segments = new ArrayList<>();
        for (int c = 0; c < chunks; c++) {
            WireRows[] rows = pool.get(c).rows();
            PairSegment[] own = new PairSegment[rows.length];
            for (int pair = 0; pair < rows.length; pair++) {
                own[pair] = rows[pair].segment();
            }
            segments.add(own);
        }
        carry.copyOut(segments, team);
    }

    /** Makes room for so many chunks and workers. */
    void layOut(int chunkCount, int workers) {
        chunks = chunkCount;
        while (pool.size() < chunkCount) {
            WireChunk made = new WireChunk(materials.pairs().size(), laws.historyColumns());
            setReach(made);
            pool.add(made);
        }
        while (touches.size() < workers) {
            touches.add(new WireTouch(elements, laws));
        }
    }

    /** Sets how far the laws reach, m, for each material pair; before a search and after a restored state. */
    void reach(double[] byMaterialPair) {
        reach = byMaterialPair.clone();
        pool.forEach(this::setReach);
    }

    private void setReach(WireChunk chunk) {
        for (int pair = 0; pair < reach.length; pair++) {
            chunk.rows()[pair].segment().reach(reach[pair]);
        }
    }

    /** Lists near grains and elements anew after the grains were sorted. */
    void list(NeighbourLists lists, GrainStore grains, double margin, double largestRadius, WorkerTeam team) {
        carry.rename(lists.newRow(), grains.count());
        layOut(lists.chunks().size(), team.workers());
        double far = margin + Arrays.stream(reach).max().orElse(0);
        elements.enter(lists.grid(), largestRadius + far);
        team.run((task, worker) -> list(lists.chunks().get(task), grains, far), chunks);
        listedAnew = true;
    }

    private void list(Chunk range, GrainStore grains, double margin) {
        WireChunk chunk = pool.get(range.number());
        chunk.open(range.from(), range.to());
        double[] rows = grains.rows();
        double[] x = elements.nodes().position;
        for (int g = range.from(); g < range.to(); g++) {
            int at = GrainRow.at(g);
            boolean near = false;
            int cell = elements.cellOf(rows[at], rows[at + 1], rows[at + 2]);
            for (int k = elements.entriesStart(cell); k < elements.entriesEnd(cell); k++) {
                int element = elements.entries()[k];
                double far = rows[at + GrainRow.RADIUS] + elements.radius(elements.body(element)) + margin;
                double along = elements.nearest(element, rows[at], rows[at + 1], rows[at + 2]);
                int a = 3 * elements.firstNode(element);
                int b = 3 * elements.secondNode(element);
                double dx = Math.fma(along, x[b] - x[a], x[a]) - rows[at];
                double dy = Math.fma(along, x[b + 1] - x[a + 1], x[a + 1]) - rows[at + 1];
                double dz = Math.fma(along, x[b + 2] - x[a + 2], x[a + 2]) - rows[at + 2];
                if (dx * dx + dy * dy + dz * dz < far * far) {
                    if (!near) {
                        chunk.beginGrain(g);
                        near = true;
                    }
                    chunk.addCandidate(element);
                }
            }
            if (near) {
                giveBack(chunk, g, grains);
            }
        }
    }

    private void giveBack(WireChunk chunk, int grain, GrainStore grains) {
        int number = chunk.near().count() - 1;
        for (int place = carry.firstOf(grain); place < carry.endOf(grain); place++) {
            int carried = carry.rowAt(place);
            int wire = carry.bodyOf(carried);
            int pair = MaterialTable.pairIndex(grains.material()[grain], elements.material(wire));
            double effective = reedling.wall.HertzLine.outside(grains.radius(grain), elements.radius(wire));
            int row = chunk.addRow(pair, number, wire, effective, grains.ghost());
            carry.giveBack(carried, chunk.rows()[pair].segment(), row);
        }
    }

    /** Opens a pass over all contacts; one thread. */
    void openPass() {
        pass++;
        listedAnew = false;
    }

    /** Finds the touching rows of a chunk and adds their forces to the near grains and the rows' loads. */
    void apply(int number, GrainStore grains, StepContext step, Workspace workspace, int worker, ContactTally tally) {
        WireChunk chunk = pool.get(number);
        touches.get(worker).update(chunk, grains, pass, step.approach(), tally);
        RowRange range = workspace.rows();
        for (int pair = 0; pair < chunk.rows().length; pair++) {
            WireRows rows = chunk.rows()[pair];
            PairSegment segment = rows.segment();
            for (int from = 0; from < segment.paddedCount(); from += ContactBlock.CAPACITY) {
                range.open(segment, from, step, grains, tally);
                gather(range.block(), rows, from, grains, workspace.row());
                lawLines.get(pair).run(range);
                scatter(range.block(), chunk, rows, from);
            }
        }
    }

    private void gather(ContactBlock block, WireRows rows, int from, GrainStore grains, SurfaceRow row) {
        double[] c = block.columns();
        double halfStep = 0.5 * block.step();
        row.reach = block.reach();
        for (int r = 0; r < block.rows(); r++) {
            int k = from + r;
            if (k >= rows.segment().activeCount() || rows.element()[k] < 0) {
                SurfaceRow.writeIdle(c, r);
            } else {
                int grainAt = GrainRow.at(rows.segment().first()[k]);
                fill(row, rows, k, grains.rows(), grainAt);
                row.write(c, r, grains.rows(), grainAt, halfStep);
            }
        }
    }

    private void fill(SurfaceRow row, WireRows rows, int k, double[] grainRows, int grainAt) {
        NodeStore nodes = elements.nodes();
        int element = rows.element()[k];
        int wire = rows.segment().second()[k];
        int first = elements.firstNode(element), second = elements.secondNode(element);
        int a = 3 * first, b = 3 * second;
        double[] g = rows.geometry();
        int at = WireRows.GEOMETRY * k;
        double along = g[at + WireRows.ALONG];
        boolean touching = rows.seen()[k] == pass;
        double tangent = 0;
        double length = 0;
        for (int axis = 0; axis < 3; axis++) {
            double va = nodes.velocity[a + axis];
            double wa = nodes.spin[a + axis];
            row.normal[axis] = g[at + axis];
            row.velocity[axis] = Math.fma(along, nodes.velocity[b + axis] - va, va);
            row.spin[axis] = Math.fma(along, nodes.spin[b + axis] - wa, wa);
        }
        row.relativeTo(grainRows, grainAt);
        for (int axis = 0; axis < 3; axis++) {
            double d = nodes.position[b + axis] - nodes.position[a + axis];
            tangent = Math.fma(row.relative[axis], d, tangent);
            length = Math.fma(d, d, length);
        }
        double closing = row.relative[0] * g[at] + row.relative[1] * g[at + 1] + row.relative[2] * g[at + 2];
        double inverseDistance = 1 / g[at + WireRows.DISTANCE];
        for (int axis = 0; axis < 3; axis++) {
            double d = nodes.position[b + axis] - nodes.position[a + axis];
            double across = row.relative[axis] - closing * g[at + axis] - tangent / length * d;
            row.normalRate[axis] = -across * inverseDistance; // sliding along the wire does not turn the normal
        }
        double near = 1 - along;
        row.overlap = touching
                ? g[at + WireRows.OVERLAP]
                : Math.min(-row.reach, g[at + WireRows.OVERLAP]) - Double.MIN_NORMAL;
        row.leverSecond = elements.radius(wire) - 0.5 * row.overlap;
        row.inverseMass = near * near * nodes.inverseMass[first] + along * along * nodes.inverseMass[second];
        row.inverseInertia = near * near * nodes.inverseInertia[first] + along * along * nodes.inverseInertia[second];
        row.inverseMassSliding = Math.fma(row.leverSecond * row.leverSecond, row.inverseInertia, row.inverseMass);
        row.effectiveRadius = g[at + WireRows.EFFECTIVE_RADIUS];
    }

    private static void scatter(ContactBlock block, WireChunk chunk, WireRows rows, int from) {
        double[] c = block.columns();
        double[] forces = chunk.near().forces();
        double[] exports = rows.segment().exports();
        int count = Math.min(block.rows(), rows.segment().activeCount() - from);
        for (int r = 0; r < count; r++) {
            Tile.addRow(c, ForceRows.first(r), forces, NearGrains.forceAt(rows.near()[from + r]));
            Tile.copyRow(c, ForceRows.second(r), exports, PairSegment.PAD + 8 * (from + r));
        }
    }

    @Override
    public void addTo(int firstNode, int lastNode, double[] force, double[] moment) {
        for (int c = 0; c < chunks; c++) {
            for (WireRows rows : pool.get(c).rows()) {
                for (int k = 0; k < rows.segment().activeCount(); k++) {
                    if (rows.seen()[k] == pass) {
                        addRow(rows, k, firstNode, lastNode, force, moment);
                    }
                }
            }
        }
    }

    private void addRow(WireRows rows, int k, int firstNode, int lastNode, double[] force, double[] moment) {
        int element = rows.element()[k];
        int first = elements.firstNode(element), second = elements.secondNode(element);
        double along = rows.geometry()[WireRows.GEOMETRY * k + WireRows.ALONG];
        int from = PairSegment.PAD + 8 * k;
        if (first >= firstNode && first < lastNode) {
            add(rows.segment().exports(), from, 1 - along, force, moment, 3 * first);
        }
        if (second >= firstNode && second < lastNode) {
            add(rows.segment().exports(), from, along, force, moment, 3 * second);
        }
    }

    /** Takes a grain that overlaps a wire. */
    @FunctionalInterface
    public interface OverlapVisitor {

        /**
         * @param grain row of the grain
         * @param body number of the wire's body
         * @param overlap deepest overlap of the two at their present places, m, > 0
         */
        void touch(int grain, int body, double overlap);
    }

    /** Shows every grain and wire that overlap at their present places, between two steps; one thread, in chunk order. */
    public void visitOverlaps(GrainStore grains, OverlapVisitor visitor) {
        for (int c = 0; c < chunks; c++) {
            WireChunk chunk = pool.get(c);
            for (int number = 0; number < chunk.near().count(); number++) {
                visitGrain(chunk, number, grains, visitor);
            }
        }
    }

    private void visitGrain(WireChunk chunk, int number, GrainStore grains, OverlapVisitor visitor) {
        int grain = chunk.near().grain(number);
        int end = chunk.candidateEnd(number);
        int k = chunk.candidateStart(number);
        while (k < end) {
            int body = elements.body(chunk.candidate(k));
            double deepest = 0;
            for (; k < end && elements.body(chunk.candidate(k)) == body; k++) {
                deepest = Math.max(deepest, elements.overlap(chunk.candidate(k), grains.rows(), GrainRow.at(grain)));
            }
            if (deepest > 0) {
                visitor.touch(grain, body, deepest);
            }
        }
    }

    /**
     * Adds the forces of the last pass on each wire; one thread, between two steps.
     *
     * @param perBody three doubles a body, N, world frame; added to
     * @return false if the rows were listed anew since that pass, which leaves no forces to add
     */
    public boolean addForces(double[] perBody) {
        for (int c = 0; c < chunks && !listedAnew; c++) {
            for (WireRows rows : pool.get(c).rows()) {
                for (int k = 0; k < rows.segment().activeCount(); k++) {
                    if (rows.seen()[k] == pass) {
                        addForce(rows, k, perBody);
                    }
                }
            }
        }
        return !listedAnew;
    }

    private static void addForce(WireRows rows, int k, double[] perBody) {
        int to = 3 * rows.segment().second()[k];
        int from = PairSegment.PAD + 8 * k + GrainRow.FORCE;
        for (int axis = 0; axis < 3; axis++) {
            perBody[to + axis] += rows.segment().exports()[from + axis];
        }
    }

    private static void add(double[] exports, int from, double weight, double[] force, double[] moment, int to) {
        for (int axis = 0; axis < 3; axis++) {
            force[to + axis] += weight * exports[from + GrainRow.FORCE + axis];
            moment[to + axis] += weight * exports[from + GrainRow.TORQUE + axis];
        }
    }

    @Override
    public String section() {
        return "wire contacts";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        out.writeInt(chunks);
        out.writeLong(pass);
        for (int c = 0; c < chunks; c++) {
            pool.get(c).save(out);
        }
    }

    @Override
    public void restore(SectionReader in) {
        layOut(in.readInt(), touches.size());
        pass = in.readLong();
        ChunkLayout layout = ChunkLayout.of(grains.count());
        for (int c = 0; c < chunks; c++) {
            pool.get(c).open(layout.from(c), layout.to(c));
            pool.get(c).restore(in, grains.ghost());
        }
    }
}
