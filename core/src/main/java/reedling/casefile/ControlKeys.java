// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import reedling.run.MidpointRule;
import reedling.unit.Dimension;

/** Keys of the case itself, its laws, steps, output and report. */
final class ControlKeys {

    private static final ValueType INTERVAL = Key.quantity(Dimension.TIME, Range.above(0, 1e7));

    static final String EXPLICIT = "explicit";
    static final String MIDPOINT = "midpoint";

    static final Section CASE = Section.of(
            "What the case is.",
            Key.required("title", new ValueType.Text(), "One line for reports."),
            Key.preset("notes", new ValueType.Text(), "", "Free text: sources of the numbers, doubts, history."),
            Key.preset("seed", new ValueType.Whole(0, Long.MAX_VALUE), 1L, "Seed of every random choice of the run."));

    static final Section BOX = Section.of("Box along the world axes.", BoxKeys.MIN, BoxKeys.MAX);

    static final Section SCREEN = Section.of(
            "Makes the report that of a screen deck.",
            Key.required("wires", new ValueType.Reference("wires"), "The row of wires that is the deck."),
            Key.required("undersize_lot", new ValueType.Reference("lots"), "The lot that should pass."),
            Key.required("product_lot", new ValueType.Reference("lots"), "The lot that should go over."),
            Key.required("passed", new ValueType.Reference("outlets"), "The outlet below the deck."),
            Key.required("over", new ValueType.Reference("outlets"), "The outlet at the end of the deck."),
            Key.required("peg_time", INTERVAL, "A grain that stays in place for this long counts as pegged."),
            Key.required(
                    "peg_distance",
                    Key.quantity(Dimension.LENGTH, Range.above(0, 1)),
                    "How far a pegged grain may move relative to the deck."),
            Key.preset(
                    "measure_from",
                    Key.quantity(Dimension.TIME, Range.closed(0, 1e7)),
                    0.0,
                    "Start of the measured part of the run."));

    static final Section STEPS = Section.of(
            "Limits of the time step.",
            Key.preset("steps_per_contact", new ValueType.Whole(5, 10_000), 20L, "Time steps in the shortest contact."),
            Key.optional("maximum", INTERVAL, "Longest time step; without it only stability limits it."),
            Key.preset(
                    "search_margin",
                    new ValueType.Margin(Range.above(0, 2), Range.above(0, 0.1)),
                    new SearchMargin(0.3, true),
                    "How far beyond touch the neighbour search looks: fraction of the smallest radius, or a length."),
            Key.preset(
                    "integrator",
                    new ValueType.Choice(List.of(EXPLICIT, MIDPOINT)),
                    EXPLICIT,
                    "How grains are moved: explicit steps of second order, or the midpoint rule, a reference mode for"
                            + " grains and walls that takes several times as long."),
            Key.optional(
                    "theta",
                    Key.quantity(Dimension.NUMBER, Range.closed(0.5, 1)),
                    "Of the midpoint rule: where in the step forces are taken; 0.5 unless given, second order only"
                            + " there."),
            Key.optional(
                    "tolerance",
                    Key.quantity(Dimension.NUMBER, Range.closed(1e-13, 1e-2)),
                    "Of the midpoint rule: change of a velocity in the last iteration, as a fraction of the largest"
                            + " speed; 1e-8 unless given."));

    static final Section OUTPUT = Section.of(
            "What a run writes and when. Intervals are counted in simulated time unless said; absent means never.",
            Key.required("end_time", INTERVAL, "Simulated time at which the run ends."),
            Key.optional("snapshot_every", INTERVAL, "Interval of snapshots."),
            Key.optional("table_every", INTERVAL, "Interval of table rows."),
            Key.optional("checkpoint_every", INTERVAL, "Interval of checkpoints."),
            Key.optional("checkpoint_every_wall", INTERVAL, "Interval of checkpoints in wall-clock time."),
            Key.preset(
                    "ledger",
                    new ValueType.Choice(List.of("total", "channels")),
                    "total",
                    "Energy ledger: one total, or each kind of storage and dissipation by itself."));

    private ControlKeys() {}

    static ScreenSpecification screen(Values values) {
        return new ScreenSpecification(
                values.text("wires"),
                values.text("undersize_lot"),
                values.text("product_lot"),
                values.text("passed"),
                values.text("over"),
                values.number("peg_time"),
                values.number("peg_distance"),
                values.number("measure_from"));
    }

    static StepSpecification steps(Values values) {
        return new StepSpecification(
                (int) values.whole("steps_per_contact"),
                values.optionalNumber("maximum"),
                values.margin("search_margin"),
                midpoint(values));
    }

    private static Optional<MidpointRule> midpoint(Values values) {
        return values.text("integrator").equals(MIDPOINT)
                ? Optional.of(new MidpointRule(
                        values.optionalNumber("theta").orElse(MidpointRule.MIDDLE),
                        values.optionalNumber("tolerance").orElse(MidpointRule.TOLERANCE)))
                : Optional.empty();
    }

    static OutputSpecification output(Values values) {
        return new OutputSpecification(
                values.number("end_time"),
                values.optionalNumber("snapshot_every"),
                values.optionalNumber("table_every"),
                values.optionalNumber("checkpoint_every"),
                values.optionalNumber("checkpoint_every_wall"),
                OutputSpecification.Ledger.valueOf(values.text("ledger").toUpperCase(Locale.ROOT)));
    }
}
