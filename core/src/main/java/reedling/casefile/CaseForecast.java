// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import reedling.contact.ContactKind;
import reedling.error.ReedlingException;
import reedling.parallel.WorkerTeam;
import reedling.structure.Position;
import reedling.unit.Dimension;

/** What follows from the numbers of a case, in plain words, before anyone waits for a run. Threads: one. */
public final class CaseForecast {

    /** Wall-clock time of each of two timed trials, s. */
    private static final double TRIAL = 1;

    /** Solid fraction at which the loaded trial fills the regions that feeds rain from. */
    private static final double LOADED = 0.25;

    /** Java machine and program, bytes (measured with small cases). */
    private static final double BASE_MEMORY = 250e6;

    /** Rows, pairs with history and copies for writing, bytes a grain (about 8 pairs of 15 columns, twice). */
    private static final double GRAIN_MEMORY = 4e3;

    private final CaseAssembly assembly;
    private final CasePlugins plugins;
    private final CaseSpecification specification;
    private final ForecastText text = new ForecastText();

    private CaseForecast(CaseAssembly assembly, CasePlugins plugins) {
        this.assembly = assembly;
        this.plugins = plugins;
        specification = assembly.reading().specification();
    }

    /**
     * The forecast of a case; two short trials are run.
     *
     * @param assembly used up
     * @param threads of the trials
     */
    public static String of(CaseAssembly assembly, CasePlugins plugins, int threads) {
        return new CaseForecast(assembly, plugins).write(threads);
    }

    private String write(int threads) {
        text.line(specification.title());
        FeedFigures feeds = new FeedFigures(assembly);
        feeds.writeTo(text);
        Fall fall = new Fall(specification, gravity());
        ImpactFigures impacts = new ImpactFigures(assembly, fall.fastest());
        new WireFigures(assembly, fall, text).write(impacts.shortest(ContactKind.GRAIN_WIRE));
        if (!specification.lots().isEmpty()) {
            impacts.writeTo(text);
        }
        steps(impacts.shortest(), fall.fastest(), feeds, threads);
        assembly.reading().cautions().forEach(caution -> text.caution(caution.toString()));
        text.heading(text.cautions() == 0 ? "No cautions." : text.cautions() + " cautions.");
        return text.toString();
    }

    private Position gravity() {
        double[] sum = new double[3];
        assembly.model().fields().forEach(field -> {
            for (int axis = 0; axis < 3; axis++) {
                sum[axis] += field.uniformAcceleration()[axis];
            }
        });
        return new Position(sum[0], sum[1], sum[2]);
    }

    private void steps(double contact, double speed, FeedFigures feeds, int threads) {
        int parts = assembly.model().steps().stepsPerContact();
        double longest = Math.min(assembly.model().steps().maximum(), assembly.model().steps().drivenPeriod() / 100);
        double step = Math.min(contact / parts, longest);
        double fine = assembly.model().structure().stableStep();
        double end = specification.output().endTime();
        double count = end / step;
        text.heading("Steps");
        if (contact < Double.POSITIVE_INFINITY) {
            text.entry(
                    "contact",
                    "impact at " + ForecastText.figure(speed, Dimension.SPEED) + " lasts " + time(contact) + "; 1/"
                            + parts + " of it is " + time(contact / parts));
        }
        if (fine < Double.POSITIVE_INFINITY) {
            text.entry("structure", "stable up to " + time(fine) + ", " + (int) Math.ceil(step / fine)
                    + " fine steps in a step");
        }
        text.entry("in all", "about " + ForecastText.number(count) + " steps to " + time(end));
        text.entry(
                "memory",
                "about " + ForecastText.number((BASE_MEMORY + GRAIN_MEMORY * feeds.total()) / 1e6) + " MB at most");
        wallTime(count, feeds, threads);
    }

    private void wallTime(double count, FeedFigures feeds, int threads) {
        double end = specification.output().endTime();
        double present = specification.outlets().isEmpty() ? feeds.total() : Math.min(feeds.total(), feeds.rate());
        present = Math.max(present, assembly.model().grains().count());
        try (WorkerTeam team = new WorkerTeam(threads)) {
            Trial plain = Trial.run(assembly.model(), team, TRIAL, end);
            double perGrain = plain.grains() > 0 ? plain.perStep() / plain.grains() : 0;
            double base = 0;
            Optional<CaseAssembly> loaded = loaded();
            if (loaded.isPresent()) {
                Trial full = Trial.run(loaded.get().model(), team, TRIAL, end);
                double more = full.grains() - plain.grains();
                perGrain = more > 0 ? Math.max(0, full.perStep() - plain.perStep()) / more : 0;
                base = plain.perStep() - perGrain * plain.grains();
            }
            double wall = count * Math.max(plain.perStep(), base + perGrain * present);
            text.entry(
                    "wall-clock time",
                    "roughly " + ForecastText.duration(wall) + " on " + threads + " threads with "
                            + ForecastText.number(present) + " grains present; a guess within a factor of three, from"
                            + " trials of " + (int) TRIAL + " s");
        } catch (ReedlingException stopped) {
            stopped.findings().forEach(finding -> text.caution("the trial was stopped: " + finding));
        }
    }

    /** The case with its box-shaped streams replaced by loose blocks, so that a trial sees grains at once. */
    private Optional<CaseAssembly> loaded() {
        Map<String, FeedSpecification> feeds = new LinkedHashMap<>(specification.feeds());
        feeds.replaceAll((name, feed) -> feed instanceof FeedSpecification.Stream stream
                        && stream.region() instanceof BoxRegion box
                ? new FeedSpecification.PackedBlock(
                        name, feed.shares(), box, OptionalLong.empty(), OptionalDouble.of(LOADED), feed.velocity())
                : feed);
        if (feeds.equals(specification.feeds())) {
            return Optional.empty();
        }
        try {
            return Optional.of(CaseAssembly.make(assembly.reading().withFeeds(feeds), plugins));
        } catch (ReedlingException noRoom) {
            return Optional.empty(); // a narrow region holds no block; the plain trial must do
        }
    }

    private static String time(double seconds) {
        return ForecastText.figure(seconds, Dimension.TIME);
    }
}
