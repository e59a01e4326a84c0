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
import reedling.neighbour.HistoryCarry;
import reedling.neighbour.NeighbourLists;
import reedling.neighbour.PairSegment;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.wall.WallPose;

/**
 * Contacts of grains with rigid walls: one row for each grain and each facet near it, listed at every search and looked
 * at in every step. Sums the force and torque on each wall, by chunk and then in chunk order.
 *
 * <p>Threads: each chunk's rows and sums belong to its task.
 */
public final class WallContacts implements Persistent {

    /** Doubles a wall: force 3, torque about the pivot 3. */
    static final int LOAD = 6;

    private static final int FACET_LIMIT = 1 << 20; // facets a grain can name

    private final GrainStore grains;
    private final LawSet laws;
    private final MaterialTable materials;
    private final WallFacets facets;
    private final HistoryCarry carry;
    private final List<StageLine> lawLines = new ArrayList<>();
    private final List<PairSegment[]> segments = new ArrayList<>();
    private final List<double[][]> radii = new ArrayList<>();
    private final List<double[]> loads = new ArrayList<>();
    private final double[] total;
    private double[] reach;
    private int chunks;

    WallContacts(GrainStore grains, LawSet laws, MaterialTable materials, WallFacets facets) {
        this.grains = grains;
        if (facets.count() >= FACET_LIMIT) {
            throw new IllegalArgumentException(facets.count() + " wall facets are more than " + FACET_LIMIT);
        }
        this.laws = laws;
        this.materials = materials;
        this.facets = facets;
        carry = new HistoryCarry(laws.signedColumns(), false);
        for (int pair = 0; pair < materials.pairs().size(); pair++) {
            lawLines.add(StageLine.ofLaws(laws.bound(ContactKind.GRAIN_WALL, pair)));
        }
        total = new double[LOAD * facets.walls().size()];
        reach = new double[materials.pairs().size()];
    }

    /** Segments of one chunk, one for each material pair. */
    PairSegment[] segments(int chunk) {
        return segments.get(chunk);
    }

    void copyOut(WorkerTeam team) {
        carry.copyOut(segments.subList(0, chunks), team);
    }

    /** Sets how far the laws reach for grains up to a radius, m; before a search and after a restored state. */
    void reach(double largestRadius) {
        double widest = largestRadius; // largest effective radius; that of a sphere in a bore is larger than its own
        if (laws.reach(ContactKind.GRAIN_WALL, 1) > 0) {
            for (int facet = 0; facet < facets.count(); facet++) {
                widest = Math.max(widest, facets.effectiveRadius(facet, largestRadius));
            }
        }
        reach = laws.reaches(ContactKind.GRAIN_WALL, widest);
        segments.forEach(this::setReach);
    }

    private void setReach(PairSegment[] own) {
        for (int pair = 0; pair < own.length; pair++) {
            own[pair].reach(reach[pair]);
        }
    }

    /** Lists all near facets anew after the grains were sorted. */
    void list(NeighbourLists lists, GrainStore grains, double margin, WorkerTeam team) {
        carry.rename(lists.newRow(), grains.count());
        layOut(lists.chunks().size());
        team.run((task, worker) -> list(lists.chunks().get(task), grains, margin), chunks);
    }

    /** Makes empty segments for so many chunks. */
    void layOut(int count) {
        chunks = count;
        while (segments.size() < count) {
            PairSegment[] made = new PairSegment[materials.pairs().size()];
            Arrays.setAll(made, k -> new PairSegment(laws.historyColumns(), false));
            setReach(made);
            segments.add(made);
            double[][] cached = new double[made.length][];
            Arrays.fill(cached, new double[0]);
            radii.add(cached);
            loads.add(new double[total.length]);
        }
    }

    private void list(Chunk chunk, GrainStore grains, double margin) {
        PairSegment[] own = segments.get(chunk.number());
        double[][] effective = radii.get(chunk.number());
        for (PairSegment segment : own) {
            segment.clear();
        }
        double[] normal = new double[3];
        double[] rows = grains.rows();
        for (int g = chunk.from(); g < chunk.to(); g++) {
            int at = GrainRow.at(g);
            double radius = rows[at + GrainRow.RADIUS];
            for (int facet = 0; facet < facets.count(); facet++) {
                double gap = facets.gap(facet, rows[at], rows[at + 1], rows[at + 2], normal) - radius;
                int pair = MaterialTable.pairIndex(
                        grains.material()[g], facets.pose(facet).wall().material());
                if (gap < margin + reach[pair]) {
                    int row = own[pair].activate(g, facet, grains.ghost());
                    effective[pair] = keep(effective[pair], row, facets.effectiveRadius(facet, radius));
                    int carried = carry.find(g, facet);
                    if (carried >= 0) {
                        carry.giveBack(carried, own[pair], row);
                    }
                }
            }
        }
    }

    private static double[] keep(double[] values, int row, double value) {
        double[] wide = row < values.length ? values : Arrays.copyOf(values, Math.max(64, 2 * row));
        wide[row] = value;
        return wide;
    }

    void apply(int chunk, GrainStore grains, StepContext step, Workspace workspace, ContactTally tally) {
        double[] load = loads.get(chunk);
        Arrays.fill(load, 0);
        PairSegment[] own = segments.get(chunk);
        RowRange rows = workspace.rows();
        for (int pair = 0; pair < own.length; pair++) {
            PairSegment segment = own[pair];
            for (int from = 0; from < segment.paddedCount(); from += ContactBlock.CAPACITY) {
                rows.open(segment, from, step, grains, tally);
                gather(rows.block(), segment, from, radii.get(chunk)[pair], grains, workspace.row());
                ApproachScan.scan(
                        rows.block(), laws.bound(ContactKind.GRAIN_WALL, pair).normal(), step.approach(), tally);
                lawLines.get(pair).run(rows);
                scatter(rows.block(), segment, from, grains, load);
            }
        }
    }

    private void gather(
            ContactBlock block, PairSegment segment, int from, double[] effective, GrainStore grains, SurfaceRow row) {
        double[] c = block.columns();
        double[] rows = grains.rows();
        double halfStep = 0.5 * block.step();
        row.reach = block.reach();
        for (int r = 0; r < block.rows(); r++) {
            if (from + r >= segment.activeCount()) {
                SurfaceRow.writeIdle(c, r);
                continue;
            }
            int facet = segment.second()[from + r];
            int at = GrainRow.at(segment.first()[from + r]);
            double gap = facets.gap(facet, rows[at], rows[at + 1], rows[at + 2], row.normal);
            if (gap == Double.POSITIVE_INFINITY) {
                SurfaceRow.writeIdle(c, r); // another facet of the wall stands for this point
                continue;
            }
            WallPose pose = facets.pose(facet);
            row.overlap = rows[at + GrainRow.RADIUS] - gap;
            double lever = rows[at + GrainRow.RADIUS] - 0.5 * row.overlap;
            pose.velocityAt(
                    Math.fma(lever, row.normal[0], rows[at]),
                    Math.fma(lever, row.normal[1], rows[at + 1]),
                    Math.fma(lever, row.normal[2], rows[at + 2]),
                    row.velocity);
            row.spin[0] = pose.spinX();
            row.spin[1] = pose.spinY();
            row.spin[2] = pose.spinZ();
            row.normalRate[0] = row.spin[1] * row.normal[2] - row.spin[2] * row.normal[1];
            row.normalRate[1] = row.spin[2] * row.normal[0] - row.spin[0] * row.normal[2];
            row.normalRate[2] = row.spin[0] * row.normal[1] - row.spin[1] * row.normal[0];
            row.leverSecond = 0;
            row.inverseMass = 0;
            row.inverseMassSliding = 0;
            row.inverseInertia = 0;
            row.effectiveRadius = effective[from + r];
            row.relativeTo(rows, at);
            row.write(c, r, rows, at, halfStep);
        }
    }

    private void scatter(ContactBlock block, PairSegment segment, int from, GrainStore grains, double[] load) {
        double[] c = block.columns();
        double[] rows = grains.rows();
        double[] forces = grains.forces();
        int rowCount = Math.min(block.rows(), segment.activeCount() - from);
        for (int r = 0; r < rowCount; r++) {
            int grain = segment.first()[from + r];
            int onGrain = ForceRows.first(r);
            int onWall = ForceRows.second(r) + GrainRow.FORCE;
            Tile.addRow(c, onGrain, forces, GrainRow.forceAt(grain));
            int facet = segment.second()[from + r];
            WallPose pose = facets.pose(facet);
            int to = LOAD * facets.wallOf(facet);
            int at = GrainRow.at(grain);
            double fx = c[onWall], fy = c[onWall + 1], fz = c[onWall + 2];
            // The force acts where the grain's own torque says: torque of the pair about the pivot is conserved.
            double ax = rows[at] - pose.centreX(),
                    ay = rows[at + 1] - pose.centreY(),
                    az = rows[at + 2] - pose.centreZ();
            load[to] += fx;
            load[to + 1] += fy;
            load[to + 2] += fz;
            load[to + 3] += ay * fz - az * fy - c[onGrain + GrainRow.TORQUE];
            load[to + 4] += az * fx - ax * fz - c[onGrain + GrainRow.TORQUE + 1];
            load[to + 5] += ax * fy - ay * fx - c[onGrain + GrainRow.TORQUE + 2];
        }
    }

    /** Adds the chunks' loads up in chunk order: force (N) and torque about the pivot (N m), six doubles a wall. */
    public double[] sumLoads() {
        Arrays.fill(total, 0);
        for (int chunk = 0; chunk < chunks; chunk++) {
            double[] load = loads.get(chunk);
            for (int k = 0; k < total.length; k++) {
                total[k] += load[k];
            }
        }
        return total;
    }

    /** What {@link #sumLoads} gave last, that is in the last step; not to be changed. */
    public double[] lastLoads() {
        return total;
    }

    @Override
    public String section() {
        return "wall contacts";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        out.writeInt(chunks);
        for (int chunk = 0; chunk < chunks; chunk++) {
            for (PairSegment segment : segments.get(chunk)) {
                int count = segment.activeCount();
                out.writeInt(count);
                out.writeInts(segment.first(), 0, count);
                out.writeInts(segment.second(), 0, count);
                segment.saveHistory(out);
            }
        }
        for (WallPose pose : facets.walls()) {
            out.writeDouble(pose.timeBefore());
            out.writeDouble(pose.time());
            out.writeDouble(pose.step());
        }
    }

    @Override
    public void restore(SectionReader in) {
        layOut(in.readInt());
        for (int chunk = 0; chunk < chunks; chunk++) {
            for (int pair = 0; pair < segments.get(chunk).length; pair++) {
                restoreSegment(chunk, pair, in);
            }
        }
        for (WallPose pose : facets.walls()) {
            double before = in.readDouble();
            double now = in.readDouble();
            pose.restore(before, now, in.readDouble());
        }
    }

    private void restoreSegment(int chunk, int pair, SectionReader in) {
        PairSegment segment = segments.get(chunk)[pair];
        int count = in.readInt();
        int[] first = new int[count];
        int[] second = new int[count];
        in.readInts(first, 0, count);
        in.readInts(second, 0, count);
        segment.clear();
        double[] kept = radii.get(chunk)[pair];
        for (int k = 0; k < count; k++) {
            int row = segment.activate(first[k], second[k], grains.ghost());
            kept = keep(kept, row, facets.effectiveRadius(second[k], grains.radius(first[k])));
        }
        radii.get(chunk)[pair] = kept;
        segment.restoreHistory(in);
    }
}
