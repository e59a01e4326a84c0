// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import reedling.checkpoint.CheckpointFolder;
import reedling.checkpoint.CheckpointHeader;
import reedling.checkpoint.CheckpointReader;
import reedling.checkpoint.CheckpointWriter;
import reedling.contact.ContactLaw;
import reedling.contact.LawSet;
import reedling.contact.Stage;
import reedling.coupling.ContactTally;
import reedling.coupling.Interactions;
import reedling.coupling.PastStep;
import reedling.material.MaterialPair;
import reedling.material.MaterialTable;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.structure.StructureBuilder;

/**
 * Couples of grains, far from one another, whose motion is laid down from outside and whose forces are computed by the
 * engine's own force phase, laws and all. Body 2 p is the first and 2 p + 1 the second of couple p.
 *
 * <p>Threads: one.
 */
final class PairBench implements AutoCloseable {

    /** Most couples, so that all grains stand in one chunk. */
    static final int MOST_COUPLES = 80;

    /** Margin, m, that puts all grains into one cell, so that a search never changes their order. */
    static final double ONE_CELL = 1000;

    private static final double NO_LONGEST_STEP = 1e-30; // s: nothing is ever about to touch
    private static final double LOOK_AT_ALL = 1e35; // m/s: every candidate is looked at in every force phase

    private final WorkerTeam team = new WorkerTeam(1);
    private final GrainStore grains = new GrainStore();
    private final Interactions interactions;
    private final double margin;
    private final double spacing; // m, of the couples; a power of two, so that adding it to a coordinate loses no bit
    private final int[] rowOf;

    PairBench(Map<Stage, ContactLaw> laws, MaterialPair pair, List<Couple> couples, double margin) {
        if (couples.size() > MOST_COUPLES) {
            throw new IllegalArgumentException("at most " + MOST_COUPLES + " couples, got " + couples.size());
        }
        MaterialTable table = new MaterialTable(List.of(pair.first()), List.of(pair));
        this.margin = margin;
        spacing = spacing(couples);
        rowOf = new int[2 * couples.size()];
        interactions = new Interactions(
                grains,
                new StructureBuilder().build(),
                new int[0],
                List.of(),
                List.of(),
                new LawSet(laws, table),
                table,
                20,
                0);
        for (int p = 0; p < couples.size(); p++) {
            double apart =
                    4 * Math.max(couples.get(p).firstRadius(), couples.get(p).secondRadius());
            for (int side = 0; side < 2; side++) {
                double radius = couples.get(p).radius(side);
                grains.add(
                        spacing * p + side * apart, 0, 0, radius, pair.first().density(), 0, 0);
            }
        }
        search();
    }

    private static double spacing(List<Couple> couples) {
        double largest = 0;
        for (Couple couple : couples) {
            largest = Math.max(largest, Math.max(couple.firstRadius(), couple.secondRadius()));
        }
        return Math.scalb(1.0, Math.getExponent(16 * largest) + 1);
    }

    int couples() {
        return rowOf.length / 2;
    }

    /** Sorts the grains and lists all pairs anew, as a run does now and then. */
    void search() {
        interactions.search(margin, new boolean[0], team);
        findRows();
    }

    private void findRows() {
        for (int row = 0; row < grains.count(); row++) {
            rowOf[(int) grains.id()[row]] = row;
        }
    }

    /** True where the second body of a couple stands before the first in memory. */
    boolean swapped(int couple) {
        return rowOf[2 * couple] > rowOf[2 * couple + 1];
    }

    double mass(int body) {
        return grains.mass(rowOf[body]);
    }

    double inertia(int body) {
        return 1 / grains.rows()[GrainRow.at(rowOf[body]) + GrainRow.INVERSE_INERTIA];
    }

    /** Puts a body where it is wanted: three numbers each from an index, relative to the couple's place. */
    void place(int body, double[] centres, double[] velocities, double[] spins, int from) {
        int row = rowOf[body];
        int at = GrainRow.at(row) + GrainRow.X;
        double[] rows = grains.rows();
        int couple = body / 2;
        rows[at] = centres[from] + spacing * couple;
        rows[at + 1] = centres[from + 1];
        rows[at + 2] = centres[from + 2];
        grains.velocity(row, velocities[from], velocities[from + 1], velocities[from + 2]);
        grains.spin(row, spins[from], spins[from + 1], spins[from + 2]);
    }

    /**
     * Computes the forces at the present positions.
     *
     * @param pastStep length of the step that led here, s
     * @param energyDue whether stored energies are wanted
     */
    void evaluate(double pastStep, boolean energyDue) {
        Arrays.fill(grains.forces(), 0);
        interactions.force(0, new PastStep(pastStep, pastStep), NO_LONGEST_STEP, 0, LOOK_AT_ALL, energyDue, team);
    }

    /** One component of the force on a body, N. */
    double force(int body, int axis) {
        return grains.forces()[GrainRow.forceAt(rowOf[body]) + GrainRow.FORCE + axis];
    }

    /** One component of the torque on a body, N m. */
    double torque(int body, int axis) {
        return grains.forces()[GrainRow.forceAt(rowOf[body]) + GrainRow.TORQUE + axis];
    }

    /** Normal stiffness that the laws declared for a body's contact, N/m. */
    double normalStiffness(int body) {
        return grains.forces()[GrainRow.forceAt(rowOf[body]) + GrainRow.NORMAL_STIFFNESS];
    }

    /** Stiffness along the surface that the laws declared for a body's contact, N/m. */
    double slidingStiffness(int body) {
        return grains.forces()[GrainRow.forceAt(rowOf[body]) + GrainRow.TANGENTIAL_STIFFNESS];
    }

    /** Limits and energies of the last force phase. */
    ContactTally tally() {
        return interactions.coarse().getFirst();
    }

    /** Writes grains, lists and history into a checkpoint. */
    void save(Path folder) throws IOException {
        CheckpointWriter writer = new CheckpointWriter(new CheckpointHeader("conform", "conform", 0, 0, Map.of()));
        writer.save(grains);
        writer.save(interactions.lists());
        CheckpointFolder.create(folder).write(writer);
    }

    /** Reads what {@link #save} wrote. */
    void restore(Path folder) throws IOException {
        try (CheckpointReader reader = CheckpointFolder.latest(folder).reader()) {
            reader.restore(grains);
            reader.restore(interactions.lists());
        }
        interactions.makeRoom(team.workers());
        findRows();
    }

    @Override
    public void close() {
        team.close();
    }
}
