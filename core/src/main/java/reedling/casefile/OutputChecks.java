// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;
import reedling.unit.Dimension;
import reedling.unit.QuantityText;

/** Times and names of output and screen report against the rest of the case. */
final class OutputChecks {

    private static final List<String> INTERVALS = List.of("snapshot_every", "table_every", "checkpoint_every");

    private OutputChecks() {}

    static void run(Draft draft, Rules rules) {
        draft.output.ifPresent(output -> {
            intervals(draft.root.part("output"), output.endTime(), rules);
            draft.screen.ifPresent(screen -> measured(screen, output.endTime(), rules));
            draft.feeds.values().forEach(feed -> started(feed, output.endTime(), rules));
        });
        draft.screen.ifPresent(screen -> differ(screen, rules));
        if (draft.root.named("fields").isEmpty() && !draft.root.has("fields")) {
            rules.caution(
                    "fields", "missing", "gravity or another field", "Without a field grains only fly straight on.");
        }
    }

    private static void intervals(Values output, double end, Rules rules) {
        for (String key : INTERVALS) {
            if (output.has(key) && output.number(key) > end) {
                rules.caution(
                        "output." + key,
                        time(output.number(key)),
                        "at most end_time, " + time(end),
                        "Nothing would be written between start and end.");
            }
        }
    }

    private static void measured(ScreenSpecification screen, double end, Rules rules) {
        if (screen.measureFrom() >= end) {
            rules.error(
                    "screen.measure_from",
                    time(screen.measureFrom()),
                    "less than output.end_time, " + time(end),
                    "Run longer or measure earlier.");
        }
        if (screen.pegTime() >= end - screen.measureFrom()) {
            rules.caution(
                    "screen.peg_time",
                    time(screen.pegTime()),
                    "less than the measured part of the run, " + time(end - screen.measureFrom()),
                    "No grain could count as pegged.");
        }
    }

    private static void started(FeedSpecification feed, double end, Rules rules) {
        if (feed instanceof FeedSpecification.Stream stream && stream.start() >= end) {
            rules.caution(
                    "feeds." + feed.name() + ".start",
                    time(stream.start()),
                    "less than output.end_time, " + time(end),
                    "It would never start.");
        }
    }

    private static void differ(ScreenSpecification screen, Rules rules) {
        if (screen.undersizeLot().equals(screen.productLot())) {
            rules.error(
                    "screen.product_lot",
                    '"' + screen.productLot() + "\", which is the undersize_lot too",
                    "another lot",
                    "Correct one of them.");
        }
        if (screen.passed().equals(screen.over())) {
            rules.error(
                    "screen.over",
                    '"' + screen.over() + "\", which is the outlet passed too",
                    "another outlet",
                    "Correct one of them.");
        }
    }

    private static String time(double seconds) {
        return QuantityText.of(seconds, Dimension.TIME);
    }
}
