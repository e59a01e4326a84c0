// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import reedling.check.EnergyLedger;
import reedling.output.RunFolder;
import reedling.output.Table;
import reedling.output.Table.Column;
import reedling.output.WriteQueue;
import reedling.probe.BulkProbe;
import reedling.probe.Reading;
import reedling.probe.WallLoads;
import reedling.probe.WireLoads;
import reedling.probe.WirePeaks;

/**
 * The tables of a run: passage.csv by lot, wires.csv with one row a wire and time, walls.csv, ledger.csv, steps.csv,
 * and probe-NAME.csv for each probe of the case. Loads are extremes since the row before. Threads: rows are added by the thread of the step loop.
 */
final class RunTables implements AutoCloseable {

    private static final List<Column> WIRES = List.of(
            new Column("wire", ""),
            new Column("largest axial force", "N"),
            new Column("largest bending moment", "N m"),
            new Column("largest fibre stress", "Pa"),
            new Column("element of largest fibre stress", ""),
            new Column("stress range since measuring began at most", "Pa"),
            new Column("stress range since measuring began at least", "Pa"),
            new Column("largest sag", "m"),
            new Column("largest contact force", "N"));

    private static final List<Column> LEDGER = List.of(
            new Column("kinetic energy", "J"),
            new Column("potential energy", "J"),
            new Column("elastic energy in contacts", "J"),
            new Column("strain energy", "J"),
            new Column("dissipated", "J"),
            new Column("work of walls", "J"),
            new Column("work of fields without potential", "J"),
            new Column("throughput", "J"),
            new Column("residual", "J"),
            new Column("relative residual", ""));

    private static final List<Column> STEPS = List.of(
            new Column("step", ""),
            new Column("step size", "s"),
            new Column("limit: 0 contact 1 approach 2 stability 3 margin 4 drive 5 maximum", ""),
            new Column("fine steps", ""),
            new Column("searches", ""),
            new Column("grains", ""));

    private final Simulation simulation;
    private final RunProbes probes;
    private final Map<String, Table> tables = new LinkedHashMap<>();

    /**
     * @param resumeTime rows later than this (s) are cut off; not a number for a fresh run
     */
    RunTables(Simulation simulation, RunProbes probes, RunFolder folder, double resumeTime) throws IOException {
        this.simulation = simulation;
        this.probes = probes;
        open(folder, "passage.csv", passageColumns(), resumeTime);
        open(folder, "wires.csv", WIRES, resumeTime);
        open(folder, "walls.csv", wallColumns(), resumeTime);
        open(folder, "ledger.csv", LEDGER, resumeTime);
        open(folder, "steps.csv", STEPS, resumeTime);
        for (BulkProbe probe : probes.bulk()) {
            open(folder, fileOf(probe), bulkColumns(probe), resumeTime);
        }
    }

    private void open(RunFolder folder, String name, List<Column> columns, double resumeTime) throws IOException {
        boolean fresh = Double.isNaN(resumeTime);
        tables.put(
                name,
                fresh
                        ? Table.create(folder.resolve(name), columns)
                        : Table.resume(folder.resolve(name), columns, resumeTime));
    }

    private static String fileOf(BulkProbe probe) {
        return "probe-" + probe.name() + ".csv";
    }

    private List<Column> bulkColumns(BulkProbe probe) {
        return probes.readings(probe).stream()
                .map(reading -> new Column(reading.name(), reading.unit()))
                .toList();
    }

    private List<Column> passageColumns() {
        List<Column> columns = new ArrayList<>();
        for (var lot : simulation.model().lots()) {
            columns.add(new Column(lot.name() + ": mass fed", "kg"));
            columns.add(new Column(lot.name() + ": mass in the run", "kg"));
            for (var outlet : simulation.model().exits().outlets()) {
                columns.add(new Column(lot.name() + ": mass out at " + outlet.name(), "kg"));
            }
            columns.add(new Column(lot.name() + ": mass spilled", "kg"));
            columns.add(new Column(lot.name() + ": mass pegged", "kg"));
            columns.add(new Column(lot.name() + ": grains pegged", ""));
        }
        columns.add(new Column("open area pegged", "%"));
        return columns;
    }

    private List<Column> wallColumns() {
        List<Column> columns = new ArrayList<>();
        String[] numbers = {"force x", "force y", "force z", "torque x", "torque y", "torque z"};
        for (var wall : simulation.model().walls()) {
            for (int k = 0; k < numbers.length; k++) {
                columns.add(new Column(wall.name() + ": mean " + numbers[k], k < 3 ? "N" : "N m"));
            }
            columns.add(new Column(wall.name() + ": largest force", "N"));
        }
        return columns;
    }

    /** Adds the rows of the present time and starts a new interval. */
    void append() {
        double time = simulation.time();
        table("passage.csv").append(time, passageRow());
        for (int body = 0; body < simulation.model().structure().bodies().size(); body++) {
            table("wires.csv").append(time, wireRow(body));
        }
        table("walls.csv").append(time, wallRow());
        table("ledger.csv").append(time, ledgerRow());
        table("steps.csv")
                .append(
                        time,
                        simulation.stepCount(),
                        simulation.pastStep(),
                        simulation.stepCount() == 0 ? Double.NaN : StepTally.limit(simulation),
                        simulation.fineSteps(),
                        simulation.searches(),
                        simulation.model().grains().count());
        for (BulkProbe probe : probes.bulk()) {
            table(fileOf(probe))
                    .append(
                            time,
                            probes.readings(probe).stream()
                                    .mapToDouble(Reading::value)
                                    .toArray());
        }
        probes.wireLoads().beginInterval();
        probes.wallLoads().beginInterval();
    }

    private Table table(String name) {
        return java.util.Objects.requireNonNull(tables.get(name), name);
    }

    private double[] passageRow() {
        List<Double> row = new ArrayList<>();
        Passage passage = simulation.passage();
        int exits = simulation.model().exits().outlets().size() + 1;
        for (int lot = 0; lot < simulation.model().lots().size(); lot++) {
            int number = lot;
            double out = 0;
            for (int exit = 0; exit < exits; exit++) {
                out += passage.outMass(exit, lot);
            }
            row.add(passage.fedMass(lot));
            row.add(passage.fedMass(lot) - out);
            for (int exit = 0; exit < exits; exit++) {
                row.add(passage.outMass(exit, lot));
            }
            row.add(probes.deck().map(deck -> deck.pegging().mass(number)).orElse(Double.NaN));
            row.add(probes.deck()
                    .map(deck -> (double) deck.pegging().count(number))
                    .orElse(Double.NaN));
        }
        row.add(probes.deck().map(deck -> deck.pegging().openAreaLost()).orElse(Double.NaN));
        return row.stream().mapToDouble(Double::doubleValue).toArray();
    }

    private double[] wireRow(int body) {
        WireLoads loads = probes.wireLoads();
        WirePeaks peaks = loads.interval();
        return new double[] {
            body,
            peaks.axialForce(body),
            peaks.bendingMoment(body),
            peaks.fibreStress(body),
            peaks.stressedElement(body) < 0 ? Double.NaN : peaks.stressedElement(body),
            loads.rangeUpper(body),
            loads.rangeLower(body),
            peaks.sag(body),
            peaks.contactForce(body)
        };
    }

    private double[] wallRow() {
        WallLoads loads = probes.wallLoads();
        double[] row = new double[(WallLoads.LOAD + 1) * loads.walls()];
        int next = 0;
        for (int wall = 0; wall < loads.walls(); wall++) {
            for (int k = 0; k < WallLoads.LOAD; k++) {
                row[next++] = loads.mean(wall, k);
            }
            row[next++] = loads.largest(wall);
        }
        return row;
    }

    private double[] ledgerRow() {
        EnergyLedger ledger = simulation.ledger();
        EnergyLedger.Holdings held = ledger.holdings();
        return new double[] {
            held.kinetic(),
            held.potential(),
            held.contacts(),
            held.strain(),
            ledger.dissipated(),
            ledger.wallWork(),
            ledger.fieldWork(),
            ledger.throughput(),
            ledger.residual(),
            ledger.relativeResidual()
        };
    }

    /** Hands the waiting rows to a queue. */
    void submit(WriteQueue queue) {
        tables.forEach((name, table) -> queue.submit(name, table.takeRows()));
    }

    /** Closes all files; every job handed over must have run. */
    @Override
    public void close() throws IOException {
        IOException first = null;
        for (Table table : tables.values()) {
            try {
                table.close();
            } catch (IOException failure) {
                if (first == null) {
                    first = failure;
                } else {
                    first.addSuppressed(failure);
                }
            }
        }
        if (first != null) {
            throw first;
        }
    }
}
