// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import reedling.probe.HeapPlan;
import reedling.probe.ProbePlan;
import reedling.probe.WavePlan;
import reedling.wall.Motion;
import reedling.wall.Oscillating;

/** Probes of a case, in the order of the file. */
final class ProbeParts {

    private static final int MOST_CELLS = 10_000;

    private ProbeParts() {}

    static List<ProbePlan> plans(CaseSpecification specification, MotionParts motions, PartFaults faults) {
        double largest = specification.lots().values().stream()
                .mapToDouble(lot -> lot.diameter().largest())
                .max()
                .orElse(1e-3);
        List<ProbePlan> plans = new ArrayList<>();
        specification.probes().forEach((name, probe) -> {
            switch (probe) {
                case ProbeSpecification.Heap heap -> plans.add(heap(heap, largest));
                case ProbeSpecification.Waves waves ->
                    waves(waves, motions.of(Optional.of(waves.motion())), faults)
                            .ifPresent(plans::add);
            }
        });
        return plans;
    }

    private static ProbePlan heap(ProbeSpecification.Heap heap, double largest) {
        return new HeapPlan(
                heap.name(),
                heap.centre().x(),
                heap.centre().y(),
                heap.centre().z(),
                heap.ringWidth().orElse(largest),
                heap.flankFrom(),
                heap.flankTo());
    }

    private static Optional<ProbePlan> waves(ProbeSpecification.Waves waves, Motion motion, PartFaults faults) {
        String path = "probes." + waves.name();
        if (!(motion instanceof Oscillating vibration)) {
            faults.add(path + ".motion", '"' + waves.motion() + '"', "a vibration", "Name a motion with a frequency.");
            return Optional.empty();
        }
        double width = waves.area().maximum().x() - waves.area().minimum().x();
        double depth = waves.area().maximum().y() - waves.area().minimum().y();
        double columns = Math.ceil(width / waves.cell() - 1e-9);
        double rows = Math.ceil(depth / waves.cell() - 1e-9);
        if (columns * rows > MOST_CELLS || columns * rows < 2) {
            String got = (long) columns + " by " + (long) rows + " cells";
            faults.add(path + ".cell", got, "2 to " + MOST_CELLS + " cells in all", "Change the width of a cell.");
            return Optional.empty();
        }
        WavePlan.Area area = new WavePlan.Area(
                waves.area().minimum().x(), waves.area().minimum().y(), width, depth, (int) columns, (int) rows);
        return Optional.of(
                new WavePlan(waves.name(), area, vibration.frequency(), motion, waves.periods(), waves.onsetRatio()));
    }
}
