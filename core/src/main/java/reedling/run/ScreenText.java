// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import static reedling.run.PlainText.format;

import java.util.OptionalDouble;
import reedling.probe.Estimate;
import reedling.probe.LogHistogram;
import reedling.probe.MeasuredWindow;

/** The five figures a screen is judged by, in words. */
record ScreenText(RunResult result, ScreenFigures figures) {

    private static final String UNKNOWN = "not known, too little happened";

    void writeTo(PlainText text) {
        MeasuredWindow window = result.probes().window();
        ScreenPlan.Limits limits = result.plan().screen().orElseThrow().limits();
        text.section(format(
                "Result (%d of %d batches of %.3g s from %.4g s on; +- is 95 %%, by batch means)",
                figures.batches(), window.batches(), window.batchLength(), window.from()));
        if (figures.batches() < Estimate.ENOUGH) {
            text.line(format(
                    "RUN TOO SHORT: %d finished batches, at least %d are needed for intervals.",
                    figures.batches(), Estimate.ENOUGH));
        }
        text.entry("1 undersize recovery", percent(figures.recovery()) + limit(limits.recovery(), 100, "at least"));
        text.entry("", "feed " + figure(figures.throughput(), 3.6, "t/(h m)"));
        text.entry("2 good product lost", percent(figures.loss()) + limit(limits.loss(), 100, "at most"));
        text.entry("", "d50 " + figure(figures.cutSize(), 1e3, "mm"));
        text.entry(
                "3 open area pegged",
                figure(figures.pegged(), 1, "%") + trendOf(figures.pegged()) + limit(limits.pegged(), 1, "at most"));
        stress(text, limits.stressRange());
        Estimate recovery = figures.recovery();
        text.entry(
                "5 trust in figure 1",
                recovery.batches() > 1
                        ? format("+- %.2g %% of the undersize; largest contributor:", 100 * recovery.halfWidth())
                        : "no interval; largest contributor:");
        text.entry(
                "",
                result.trust().contributors().isEmpty()
                        ? UNKNOWN
                        : result.trust().contributors().getFirst());
        wires(text);
    }

    /** What the wires did and what that means for near-size grains. */
    private void wires(PlainText text) {
        LogHistogram changes = result.probes().deck().orElseThrow().opening().changes();
        if (rigid()) {
            text.line("The wires are rigid, so no gap can open: a grain close to a gap's width wedges there and stays "
                    + "until something lifts it. Let them bend to see how many of these the wires would let go.");
        } else if (!Double.isNaN(changes.percentile(0.5))) {
            text.line(format(
                    "The wires bend, so gaps breathe: of all places and moments one in two is off its width by %.2g mm "
                            + "or more, one in ten by %.2g mm. Near-size grains then work through or are lifted out "
                            + "instead of staying pegged, and the cut moves up. Compare with rigid = true.",
                    1e3 * changes.percentile(0.5), 1e3 * changes.percentile(0.9)));
        }
    }

    private boolean rigid() {
        for (int body : result.plan().screen().orElseThrow().bodies()) {
            if (!result.simulation().model().structure().bodies().get(body).rigid()) {
                return false;
            }
        }
        return true;
    }

    private void stress(PlainText text, OptionalDouble allowable) {
        if (rigid()) {
            text.entry("4 worst stress range", "none: the wires are rigid");
            return;
        }
        Estimate range = figures.stressRange();
        if (Double.isNaN(range.value())) {
            text.entry("4 worst stress range", UNKNOWN);
            return;
        }
        text.entry(
                "4 worst stress range",
                "at most " + figure(range, 1e-6, "MPa")
                        + format(", at least %.4g MPa", 1e-6 * figures.stressRangeLower()));
        text.entry(
                "",
                allowable.isPresent()
                        ? format(
                                "%.2f of the allowable %.4g MPa",
                                range.value() / allowable.getAsDouble(), 1e-6 * allowable.getAsDouble())
                        : "no allowable range was given");
        var body = result.simulation().model().structure().bodies().get(figures.worstBody());
        text.entry(
                "",
                format(
                        "%s, element %d of %d from its start",
                        body.name(), figures.worstElement() + 1, body.elementCount()));
    }

    private static String percent(Estimate part) {
        return figure(part, 100, "%") + (part.drifts() ? ", still drifting" : "");
    }

    /** A figure with its interval, in a unit that is SI over a scale. */
    private static String figure(Estimate estimate, double scale, String unit) {
        if (Double.isNaN(estimate.value())) {
            return UNKNOWN;
        }
        String value = format("%.4g", scale * estimate.value());
        return estimate.batches() > 1
                ? value + format(" +- %.2g ", scale * estimate.halfWidth()) + unit
                : value + " " + unit + " (no interval)";
    }

    private static String limit(OptionalDouble limit, double scale, String words) {
        return limit.isPresent() ? format(" (duty: %s %.3g %%)", words, scale * limit.getAsDouble()) : "";
    }

    private static String trendOf(Estimate pegged) {
        if (pegged.tooShort()) {
            return "";
        }
        return pegged.drifts() ? (pegged.trend() > 0 ? ", still rising" : ", falling") : ", steady";
    }
}
