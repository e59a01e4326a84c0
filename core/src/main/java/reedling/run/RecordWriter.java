// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import reedling.math.Lanes;
import reedling.output.RunRecord;
import reedling.probe.Estimate;
import reedling.structure.Body;

/** Fills the run record {@code run.json}. Threads: one. */
final class RecordWriter {

    private final RunResult result;
    private final Simulation simulation;
    private final RunProbes probes;
    private final RunClock clock;

    private RecordWriter(RunResult result, RunClock clock) {
        this.result = result;
        this.clock = clock;
        simulation = result.simulation();
        probes = result.probes();
    }

    /**
     * The record as the run stands.
     *
     * @param status running, finished, stopped, or what failed
     */
    static RunRecord record(RunResult result, RunClock clock, String status) {
        return new RecordWriter(result, clock).record(status);
    }

    private RunRecord record(String status) {
        RunIdentity identity = result.plan().identity();
        RunRecord record = new RunRecord()
                .set("title", identity.title())
                .set("status", status)
                .set("time_s", simulation.time())
                .set("end_time_s", result.plan().endTime())
                .set("steps", simulation.stepCount())
                .set("state_digest", StateDigest.of(simulation))
                .set("ledger_residual", simulation.ledger().relativeResidual())
                .set("ledger", ledger(result.trust()))
                .set("integrator", integrator())
                .set("wall_s", clock.elapsed())
                .set("grain_steps_per_s", clock.grainStepsPerSecond(simulation))
                .set("phases_s", phases())
                .set("threads", simulation.team().workers())
                .set("lanes", Lanes.VECTORISED ? Lanes.TILE : 1)
                .set("versions", versions(identity))
                .set("plugins", new TreeMap<>(identity.plugins()))
                .set("seed", identity.seed())
                .set("machine", machine())
                .set("lots", lots())
                .set(
                        "wires",
                        simulation.model().structure().bodies().stream()
                                .map(Body::name)
                                .toList());
        result.figures()
                .ifPresent(one -> record.set("screen", screen(one))
                        .set("uncertainty", result.trust().contributors()));
        record.set("results", Results.of(result));
        List<String> cautions = new ArrayList<>(identity.cautions());
        cautions.addAll(result.trust().overlaps());
        return record.set("cautions", cautions);
    }

    private Map<String, Object> ledger(Trust trust) {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("residual_J", simulation.ledger().residual());
        map.put("throughput_J", simulation.ledger().throughput());
        map.put("dissipated_J", simulation.ledger().dissipated());
        map.put("expected_relative", trust.expected());
        map.put("verdict", trust.verdict());
        return map;
    }

    private Map<String, Object> integrator() {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("name", simulation.midpoint().isPresent() ? "midpoint" : "explicit");
        simulation.model().steps().midpoint().ifPresent(rule -> {
            map.put("theta", rule.theta());
            map.put("tolerance", rule.tolerance());
        });
        simulation.midpoint().ifPresent(tally -> {
            map.put("iterations_mean", tally.meanIterations());
            map.put("iterations_most", tally.mostIterations());
            map.put("halvings", tally.halvings());
            map.put("force_passes_per_step", tally.meanPasses());
        });
        return map;
    }

    private Map<String, Object> phases() {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("stepping", clock.stepping());
        map.put("measuring", clock.measuring());
        map.put("writing", clock.writing());
        return map;
    }

    private static Map<String, Object> versions(RunIdentity identity) {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("reedling", identity.programVersion());
        map.put("java", Runtime.version().toString());
        map.put("case_digest", identity.caseDigest());
        return map;
    }

    private static Map<String, Object> machine() {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("system", System.getProperty("os.name") + " " + System.getProperty("os.version"));
        map.put("architecture", System.getProperty("os.arch"));
        map.put("processors", Runtime.getRuntime().availableProcessors());
        map.put("java_memory_bytes", Runtime.getRuntime().maxMemory());
        return map;
    }

    private List<Object> lots() {
        List<Object> all = new ArrayList<>();
        Passage passage = simulation.passage();
        var outlets = simulation.model().exits().outlets();
        for (int lot = 0; lot < simulation.model().lots().size(); lot++) {
            int number = lot;
            Map<String, Object> map = new LinkedHashMap<>();
            map.put("name", simulation.model().lots().get(lot).name());
            map.put("fed", amount(passage.fedCount(lot), passage.fedMass(lot)));
            for (int exit = 0; exit < outlets.size(); exit++) {
                map.put(
                        "out_" + outlets.get(exit).name(),
                        amount(passage.outCount(exit, lot), passage.outMass(exit, lot)));
            }
            map.put("spilled", amount(passage.outCount(outlets.size(), lot), passage.outMass(outlets.size(), lot)));
            probes.deck()
                    .ifPresent(deck -> map.put(
                            "pegged",
                            amount(deck.pegging().count(number), deck.pegging().mass(number))));
            all.add(map);
        }
        return all;
    }

    private static Map<String, Object> amount(long count, double mass) {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("grains", count);
        map.put("mass_kg", mass);
        return map;
    }

    private Map<String, Object> screen(ScreenFigures figures) {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("batches", figures.batches());
        map.put("throughput_kg_per_s_m", estimate(figures.throughput()));
        map.put("undersize_recovery", estimate(figures.recovery()));
        map.put("product_lost", estimate(figures.loss()));
        map.put("undersize_in_over", figures.separation().undersizeInOver());
        map.put("product_in_passed", figures.separation().productInPassed());
        map.put("d50_m", estimate(figures.cutSize()));
        map.put("d25_m", figures.partition().sizeAt(0.25));
        map.put("d75_m", figures.partition().sizeAt(0.75));
        map.put("probable_error_m", figures.partition().probableError());
        map.put("open_area_pegged_percent", estimate(figures.pegged()));
        map.put("worst_stress_range_at_most_Pa", estimate(figures.stressRange()));
        map.put("worst_stress_range_at_least_Pa", figures.stressRangeLower());
        map.put(
                "worst_wire",
                simulation.model().structure().bodies().get(figures.worstBody()).name());
        map.put("worst_element", figures.worstElement());
        return map;
    }

    private static Map<String, Object> estimate(Estimate estimate) {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("value", estimate.value());
        map.put("half_width_95", estimate.halfWidth());
        map.put("batches", estimate.batches());
        map.put("too_short", estimate.tooShort());
        map.put("drifts", estimate.drifts());
        return map;
    }
}
