// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.ArrayList;
import java.util.List;
import reedling.contact.ContactKind;
import reedling.contact.LawSet;
import reedling.field.Field;
import reedling.material.MaterialTable;
import reedling.neighbour.Chunk;
import reedling.neighbour.NeighbourLists;
import reedling.neighbour.PairSegment;
import reedling.parallel.Phase;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainStore;
import reedling.structure.Structure;
import reedling.wall.Wall;

/**
 * Everything that pushes grains and structures, and the phases in which they are pushed and moved. A force phase works
 * through chunks of grains and ranges of elements; a move phase through chunks and ranges of nodes. Between two phases
 * stands the team's barrier.
 *
 * <p>Threads: phases are started by one thread; every task writes only what its chunk or range owns.
 */
public final class Interactions {

    private final GrainStore grains;
    private final Structure structure;
    private final List<Field> fields;
    private final MotionForces motionForces;
    private final LawSet laws;
    private final NeighbourLists lists;
    private final CandidateWatch candidates;
    private final PairForces pairs;
    private final WallFacets facets;
    private final WallContacts walls;
    private final WireContacts wires;
    private final List<Workspace> workspaces = new ArrayList<>();
    private final List<ContactTally> coarse = new ArrayList<>();
    private final List<ContactTally> fine = new ArrayList<>();
    private final List<MoveTally> moves = new ArrayList<>();
    private double[] potentials = new double[0];

    private final StepContext coarseStep;
    private final StepContext fineStep;
    private final Phase forcePhase = this::forceTask;
    private final Phase fineForcePhase = this::fineForceTask;
    private final Phase movePhase = this::moveTask;
    private final Phase fineMovePhase = this::fineMoveTask;

    private double time;
    private double pastFine;
    private double nextCoarse;
    private double nextFine;
    private boolean energyDue;
    private double turning;

    /**
     * @param materialOfBody material number of each body of the structure
     * @param stepsPerContact steps in the duration of an impact
     * @param startTime s
     */
    public Interactions(
            GrainStore grains,
            Structure structure,
            int[] materialOfBody,
            List<Wall> walls,
            List<Field> fields,
            LawSet laws,
            MaterialTable materials,
            double stepsPerContact,
            double startTime) {
        this.grains = grains;
        this.structure = structure;
        this.fields = List.copyOf(fields);
        motionForces = new MotionForces(fields, grains);
        this.laws = laws;
        lists = new NeighbourLists(materials.materials().size(), laws.signedColumns());
        candidates = new CandidateWatch(laws);
        pairs = new PairForces(laws, materials.pairs().size());
        facets = new WallFacets(walls, startTime);
        this.walls = new WallContacts(grains, laws, materials, facets);
        wires = new WireContacts(grains, laws, materials, structure, materialOfBody);
        coarseStep = new StepContext(stepsPerContact);
        fineStep = new StepContext(stepsPerContact);
        time = startTime;
    }

    /** Phases of steps by the midpoint rule, for runs in which nothing bends. */
    public MidpointPasses midpointPasses(double stepsPerContact) {
        return new MidpointPasses(this, grains, stepsPerContact);
    }

    GrainStore grains() {
        return grains;
    }

    public NeighbourLists lists() {
        return lists;
    }

    public WallFacets facets() {
        return facets;
    }

    public WallContacts walls() {
        return walls;
    }

    public WireContacts wires() {
        return wires;
    }

    /** Tallies of the coarse contacts, one a chunk. */
    public List<ContactTally> coarse() {
        return coarse.subList(0, chunkCount());
    }

    /** Tallies of the contacts with wires in the last fine pass, one a chunk. */
    public List<ContactTally> fine() {
        return fine.subList(0, chunkCount());
    }

    /** Tallies of the last move, one a chunk. */
    public List<MoveTally> moves() {
        return moves.subList(0, chunkCount());
    }

    private int chunkCount() {
        return lists.chunks().size();
    }

    /**
     * Sorts the grains, drops those marked, and lists everything that may touch before the next search.
     *
     * @param margin search margin, m
     * @param removed grains to drop, or an empty array
     */
    public void search(double margin, boolean[] removed, WorkerTeam team) {
        double largest = largestRadius(removed);
        settleReach(largest);
        walls.copyOut(team);
        wires.copyOut(team);
        lists.search(grains, margin, removed, team);
        walls.list(lists, grains, margin, team);
        wires.list(lists, grains, margin, largest, team);
        makeRoom(team.workers());
    }

    private double largestRadius(boolean[] removed) {
        double largest = 0;
        for (int g = 0; g < grains.count(); g++) {
            if (removed.length == 0 || !removed[g]) {
                largest = Math.max(largest, grains.radius(g));
            }
        }
        return largest;
    }

    /** Settles how far the laws reach for the present grains, as the last search did; after a restored state. */
    public void settleReach() {
        settleReach(largestRadius(new boolean[0]));
    }

    private void settleReach(double largestRadius) {
        lists.reach(laws.reaches(ContactKind.GRAIN_GRAIN, 0.5 * largestRadius));
        walls.reach(largestRadius);
        wires.reach(laws.reaches(ContactKind.GRAIN_WIRE, largestRadius));
    }

    /** Makes room for the chunks there are and so many workers; after a search or a restored state. */
    public void makeRoom(int workers) {
        while (coarse.size() < chunkCount()) {
            coarse.add(new ContactTally());
            fine.add(new ContactTally());
            moves.add(new MoveTally());
        }
        wires.layOut(chunkCount(), workers);
        motionForces.makeRoom(workers);
        while (workspaces.size() < workers) {
            workspaces.add(new Workspace());
        }
        if (potentials.length < coarse.size()) {
            potentials = new double[coarse.size()];
        }
    }

    /**
     * Computes all forces at the present positions.
     *
     * @param now time of the positions, s
     * @param past the step that led here: coarse and fine, s
     * @param longest length the next step will not exceed, s
     * @param travel accumulated largest displacement since the last search, m
     * @param largestSpeed of any body, m/s
     * @param reportDue whether energies are wanted
     */
    public void force(
            double now,
            PastStep past,
            double longest,
            double travel,
            double largestSpeed,
            boolean reportDue,
            WorkerTeam team) {
        time = now;
        pastFine = past.fine();
        energyDue = reportDue;
        coarseStep.open(past.coarse(), longest, travel, largestSpeed, reportDue);
        fineStep.open(past.fine(), longest, travel, largestSpeed, reportDue);
        wires.openPass();
        team.run(forcePhase, chunkCount() + structure.elementTasks());
    }

    private void forceTask(int task, int worker) {
        if (task >= chunkCount()) {
            structure.elementForces(task - chunkCount(), pastFine);
            return;
        }
        ContactTally tally = coarse.get(task);
        tally.clear();
        contactForces(task, worker, coarseStep, tally);
        fieldForces(task, time);
        potentials[task] = energyDue ? potential(lists.chunks().get(task)) : 0;
        wireForces(task, worker);
    }

    /** Forces of grains on grains and of walls on grains, for one chunk. */
    void contactForces(int task, int worker, StepContext step, ContactTally tally) {
        Chunk chunk = lists.chunks().get(task);
        Workspace workspace = workspaces.get(worker);
        candidates.look(chunk, grains, lists.layout(), step.travel(), step.reach(), step.approach(), tally);
        pairs.apply(chunk, grains, step, workspace.rows(), tally);
        walls.apply(task, grains, step, workspace, tally);
    }

    /** Forces of all fields at a time (s), for one chunk. */
    void fieldForces(int task, double now) {
        Chunk chunk = lists.chunks().get(task);
        for (int k = 0; k < fields.size(); k++) {
            fields.get(k).apply(grains, chunk.from(), chunk.to(), now);
        }
    }

    private double potential(Chunk chunk) {
        double potential = 0;
        for (int k = 0; k < fields.size(); k++) {
            potential += fields.get(k).potentialEnergy(grains, chunk.from(), chunk.to());
        }
        return potential;
    }

    private void wireForces(int task, int worker) {
        ContactTally tally = fine.get(task);
        tally.clear();
        wires.apply(task, grains, fineStep, workspaces.get(worker), worker, tally);
    }

    /** Computes the forces of elements and wire contacts after a fine step, s. */
    public void fineForce(double past, WorkerTeam team) {
        pastFine = past;
        fineStep.pastStep(past);
        wires.openPass();
        team.run(fineForcePhase, chunkCount() + structure.elementTasks());
    }

    private void fineForceTask(int task, int worker) {
        if (task >= chunkCount()) {
            structure.elementForces(task - chunkCount(), pastFine);
        } else {
            wireForces(task, worker);
        }
    }

    /**
     * Closes the past step and opens the next; the supports must stand at the end of the first fine step.
     *
     * @param turnTime time over which orientations are turned now, s; 0 for not now
     * @param past the step that led here
     * @param coarseNext the next coarse step, s
     * @param fineNext its fine step, s
     */
    public void move(double turnTime, PastStep past, double coarseNext, double fineNext, WorkerTeam team) {
        turning = turnTime;
        coarseStep.pastStep(past.coarse());
        pastFine = past.fine();
        nextCoarse = coarseNext;
        nextFine = fineNext;
        team.run(movePhase, chunkCount() + structure.nodeTasks());
    }

    private void moveTask(int task, int worker) {
        if (task >= chunkCount()) {
            structure.moveNodes(task - chunkCount(), pastFine, nextFine, wires);
            return;
        }
        Chunk chunk = lists.chunks().get(task);
        MoveTally tally = moves.get(task);
        WireChunk near = wires.chunk(task);
        tally.clear();
        if (turning > 0) {
            GrainMotion.turn(chunk, grains, turning);
        }
        GrainMotion.importForces(chunk, grains);
        if (!motionForces.none()) {
            motionForces.apply(worker, chunk.from(), chunk.to(), time, 0.5 * coarseStep.pastStep());
            motionForces.book(worker, near.near(), 0.5 * pastFine, 0.5 * nextCoarse, tally);
        }
        GrainMotion.move(chunk, grains, 0.5 * coarseStep.pastStep(), nextCoarse, energyDue, near.near(), tally);
        NearMotion.first(near, grains, 0.5 * pastFine, nextCoarse, nextFine, energyDue, tally);
    }

    /**
     * Closes a fine step and opens the next; the supports must stand at its end.
     *
     * @param past the fine step that led here, s
     * @param next the next one, s
     */
    public void fineMove(double past, double next, WorkerTeam team) {
        pastFine = past;
        nextFine = next;
        team.run(fineMovePhase, chunkCount() + structure.nodeTasks());
    }

    private void fineMoveTask(int task, int worker) {
        if (task >= chunkCount()) {
            structure.moveNodes(task - chunkCount(), pastFine, nextFine, wires);
        } else {
            NearMotion.further(wires.chunk(task), grains, 0.5 * pastFine, nextFine, moves.get(task));
        }
    }

    /** Whether any field has a part without potential, whose work must be booked. */
    public boolean hasMotionForces() {
        return !motionForces.none();
    }

    /** Squared frequency, 1/s2, that bounds the step as the motion forces on the grains as they are now demand. */
    public double motionFrequencySquared(double now) {
        return motionForces.frequencySquared(now);
    }

    /** Potential energy of the grains in all fields at the last force phase, J; 0 unless energies were wanted. */
    public double potentialEnergy() {
        double total = 0;
        for (int c = 0; c < chunkCount(); c++) {
            total += potentials[c];
        }
        return total;
    }

    /** Contact rows of grains with grains, chunk by chunk. */
    public List<PairSegment> pairRows() {
        List<PairSegment> all = new ArrayList<>();
        lists.chunks().forEach(chunk -> all.addAll(List.of(chunk.segments())));
        return all;
    }

    /** Contact rows of grains (first) with wall facets (second), chunk by chunk. */
    public List<PairSegment> wallRows() {
        List<PairSegment> all = new ArrayList<>();
        for (int c = 0; c < chunkCount(); c++) {
            all.addAll(List.of(walls.segments(c)));
        }
        return all;
    }

    /** Contact rows of grains (first) with wires (second), chunk by chunk. */
    public List<PairSegment> wireRows() {
        List<PairSegment> all = new ArrayList<>();
        for (int c = 0; c < chunkCount(); c++) {
            for (WireRows rows : wires.chunk(c).rows()) {
                all.add(rows.segment());
            }
        }
        return all;
    }

    /** Gap between a point and the nearest wall or wire, m; for placing new grains. */
    public double gapToSurfaces(double x, double y, double z) {
        double[] normal = new double[3];
        double nearest = Double.POSITIVE_INFINITY;
        for (int facet = 0; facet < facets.count(); facet++) {
            nearest = Math.min(nearest, facets.gap(facet, x, y, z, normal));
        }
        return Math.min(nearest, wires.elements().gap(x, y, z));
    }
}
