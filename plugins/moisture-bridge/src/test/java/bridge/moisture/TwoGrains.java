// SPDX-License-Identifier: Apache-2.0
package bridge.moisture;

import java.util.List;
import java.util.Map;
import reedling.conform.LoadedLaws;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.LawSet;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.material.MaterialTable;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.particle.Lot;
import reedling.particle.SingleSize;
import reedling.plugin.ParameterValues;
import reedling.run.Exits;
import reedling.run.Model;
import reedling.run.Simulation;
import reedling.run.StepSettings;
import reedling.structure.StructureBuilder;

/** A run of the whole program with two equal, elastic grains that meet head-on, on top of the built-in normal law. */
final class TwoGrains {

    static final double RADIUS = 2e-3; // m
    static final double MASS = 2e-5; // kg, effective

    private static final double DENSITY = 2 * MASS / (4.0 / 3 * Math.PI * RADIUS * RADIUS * RADIUS);
    private static final double APART = 1e-3; // m
    private static final double LONGEST = 0.05; // s

    /**
     * What became of it.
     *
     * @param speed of separation, m/s; 0 where the grains still hold together
     * @param lost energy that left the motion, J, by the ledger
     * @param residual of the ledger, J
     */
    record Outcome(double speed, double lost, double residual) {}

    private TwoGrains() {}

    /**
     * @param law the adhesion
     * @param speed of approach, m/s
     * @param gap at the start, m
     */
    static Outcome meet(ContactLaw law, double speed, double gap, int stepsPerContact) {
        GrainStore grains = new GrainStore();
        grains.add(-2 * RADIUS - gap, 0, 0, RADIUS, DENSITY, 0, 0);
        grains.add(0, 0, 0, RADIUS, DENSITY, 0, 0);
        grains.velocity(0, speed, 0, 0);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = new Simulation(model(grains, law, stepsPerContact), team);
            run.begin();
            while (run.time() < LONGEST) {
                run.step();
                double leaving = Math.abs(row(grains, GrainRow.V));
                if (Math.abs(row(grains, GrainRow.X)) > 2 * RADIUS + APART) {
                    return new Outcome(
                            leaving, run.ledger().dissipated(), run.ledger().residual());
                }
            }
            return new Outcome(0, run.ledger().dissipated(), run.ledger().residual());
        }
    }

    /** Difference of the two grains. */
    private static double row(GrainStore grains, int offset) {
        double[] rows = grains.rows();
        return rows[GrainRow.at(1) + offset] - rows[GrainRow.at(0) + offset];
    }

    private static Model model(GrainStore grains, ContactLaw law, int stepsPerContact) {
        Material seed = new Material("seed", DENSITY, 5e7, 0.3);
        MaterialTable table = new MaterialTable(List.of(seed), List.of(new MaterialPair(seed, seed, 1, 0, 0)));
        return new Model(
                table,
                List.of(new Lot("all", 0, new SingleSize(2 * RADIUS))),
                grains,
                new StructureBuilder().build(),
                new int[0],
                List.of(),
                List.of(),
                new LawSet(Map.of(Stage.NORMAL, hertz(), Stage.ADHESION, law), table),
                List.of(),
                Exits.none(),
                new StepSettings(stepsPerContact, 1e-3, Double.POSITIVE_INFINITY, 1e-3, 1));
    }

    private static ContactLaw hertz() {
        ContactLawProvider hertz = LoadedLaws.onClassPath().stream()
                .filter(law -> law.name().equals("hertz"))
                .findFirst()
                .orElseThrow();
        return hertz.create(ParameterValues.of(hertz, Map.of()));
    }
}
