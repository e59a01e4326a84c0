// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.LinkedHashMap;
import java.util.Map;
import reedling.probe.BulkProbe;
import reedling.probe.Reading;

/** The figures of a run by name, so that repeated runs can be averaged without knowing what they mean. */
final class Results {

    private Results() {}

    /** Names {@code PROBE.figure_unit} and {@code screen.figure_unit}, SI; not a number where nothing is known. */
    static Map<String, Double> of(RunResult result) {
        Map<String, Double> all = new LinkedHashMap<>();
        for (BulkProbe probe : result.probes().bulk()) {
            for (Reading reading : result.probes().readings(probe)) {
                all.put(probe.name() + "." + reading.key(), reading.value());
            }
        }
        result.figures().ifPresent(figures -> {
            all.put("screen.undersize_recovery", figures.recovery().value());
            all.put("screen.product_lost", figures.loss().value());
            all.put("screen.d50_m", figures.cutSize().value());
            all.put("screen.open_area_pegged_percent", figures.pegged().value());
            all.put("screen.worst_stress_range_Pa", figures.stressRange().value());
        });
        return all;
    }
}
