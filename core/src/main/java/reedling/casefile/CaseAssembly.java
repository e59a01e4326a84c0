// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import reedling.error.Finding;
import reedling.material.MaterialTable;
import reedling.particle.Lot;
import reedling.probe.ProbePlan;
import reedling.run.Model;
import reedling.run.RunIdentity;
import reedling.run.RunPlan;
import reedling.run.ScreenPlan;
import reedling.run.StepSettings;
import reedling.wall.Wall;

/**
 * A case made ready to run. A model is used up by one simulation: make a new assembly for the next.
 *
 * @param model what the run starts from
 * @param screen the deck to report on, if there is one
 * @param probes what else to measure
 * @param plugins name of each plugin in use and the version of the history it keeps
 * @param reading the case
 */
public record CaseAssembly(
        Model model,
        Optional<ScreenPlan> screen,
        List<ProbePlan> probes,
        Map<String, Integer> plugins,
        CaseReading reading) {

    /** Longest step where the case names none, s: bounds what a run does before anything moves. */
    static final double LONGEST_STEP = 1e-3;

    /** Steps between two closings of the energy balance. */
    private static final int REPORT_EVERY = 20;

    /**
     * Makes all parts of a case; blocks of grains are filled.
     *
     * @throws reedling.error.ReedlingException with everything that a part refuses, and where it is written
     */
    public static CaseAssembly make(CaseReading reading, CasePlugins available) {
        CaseSpecification specification = reading.specification();
        PartFaults faults = new PartFaults(reading);
        MaterialTable table = MaterialParts.table(specification);
        List<Lot> lots = LotParts.lots(specification, table, faults);
        MotionParts motions = MotionParts.make(specification, faults);
        List<Wall> walls = WallParts.walls(specification, table, motions, faults);
        LawParts laws = LawParts.make(reading, available, faults);
        WireParts wires = WireParts.make(reading, available, laws, motions, faults);
        if (lots.size() < specification.lots().size()) {
            faults.finish(); // feeds and screen need every lot
        }
        Optional<ScreenPlan> screen = ExitParts.screen(specification, wires, lots, faults);
        List<ProbePlan> probes = ProbeParts.plans(specification, motions, faults);
        FeedParts feeds = FeedParts.make(specification, table, lots, faults);
        faults.finish();
        Model model = new Model(
                table,
                lots,
                feeds.grains(),
                wires.structure(),
                wires.materialOfBody(),
                walls,
                laws.fields(),
                laws.bind(table),
                feeds.lines(),
                ExitParts.exits(specification),
                steps(specification, motions));
        return new CaseAssembly(model, screen, probes, laws.plugins(), reading);
    }

    private static StepSettings steps(CaseSpecification specification, MotionParts motions) {
        StepSpecification steps = specification.steps();
        double smallest = specification.lots().values().stream()
                .mapToDouble(lot -> 0.5 * lot.diameter().smallest())
                .min()
                .orElse(0);
        return new StepSettings(
                steps.stepsPerContact(),
                steps.maximum().orElse(LONGEST_STEP),
                motions.shortestPeriod(),
                steps.searchMargin().length(smallest),
                REPORT_EVERY,
                steps.midpoint());
    }

    /**
     * What the run writes and when.
     *
     * @param programVersion version of this program
     * @param caseDigest digest of the resolved case
     */
    public RunPlan plan(String programVersion, String caseDigest) {
        CaseSpecification specification = reading.specification();
        OutputSpecification output = specification.output();
        double never = Double.POSITIVE_INFINITY;
        RunPlan.Intervals intervals = new RunPlan.Intervals(
                output.snapshotEvery().orElse(never),
                output.tableEvery().orElse(never),
                output.checkpointEvery().orElse(never),
                output.checkpointEveryWall().orElse(never));
        RunIdentity identity = new RunIdentity(
                specification.title(),
                programVersion,
                caseDigest,
                plugins,
                specification.seed(),
                reading.cautions().stream().map(Finding::toString).toList());
        return new RunPlan(output.endTime(), intervals, screen, probes, identity);
    }
}
