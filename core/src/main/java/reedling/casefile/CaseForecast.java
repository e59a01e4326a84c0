// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import reedling.contact.ContactKind;
import reedling.error.ReedlingException;
import reedling.material.MaterialTable;
import reedling.parallel.WorkerTeam;
import reedling.structure.Position;
import reedling.time.RayleighStep;
import reedling.unit.Dimension;

/** What follows from the numbers of a case, in plain words, before anyone waits for a run. Threads: one. */
public final class CaseForecast {

    /** Wall-clock time of each of two timed trials, s. */
    private static final double TRIAL = 1.5;

    /** Solid fraction at which the loaded trial fills the regions that feeds rain from. */
    private static final double LOADED = 0.25;

    /** Java machine and program, bytes: 195 MB resident without grains in {@code bench}, and some room for tables. */
    private static final double BASE_MEMORY = 250e6;

    /** Bytes a grain: 1.13 kB resident on the dense bed of {@code bench}, and as much again for copies that are written. */
    private static final double GRAIN_MEMORY = 2.5e3;

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
        steps(impacts, fall.fastest(), feeds, threads);
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

    /** Contacts of grains with grains and walls bound the step, those with wires the fine step of the structure. */
    private void steps(ImpactFigures impacts, double speed, FeedFigures feeds, int threads) {
        int parts = assembly.model().steps().stepsPerContact();
        double contact = impacts.shortest(ContactKind.GRAIN_GRAIN, ContactKind.GRAIN_WALL) / parts;
        double onWire = impacts.shortest(ContactKind.GRAIN_WIRE) / parts;
        double stable = assembly.model().structure().stableStep();
        double longest = Math.min(
                assembly.model().steps().maximum(), assembly.model().steps().drivenPeriod() / 100);
        double step = Math.min(contact, longest);
        text.heading("Steps");
        text.entry("longest", time(longest) + " (maximum, and 1/100 of the shortest period)");
        if (contact < Double.POSITIVE_INFINITY) {
            text.entry(
                    "contact",
                    time(contact) + ": 1/" + parts + " of an impact at " + ForecastText.figure(speed, Dimension.SPEED));
        }
        double wave = surfaceWave();
        if (wave < Double.POSITIVE_INFINITY) {
            text.entry("surface wave", time(wave) + " around half of a grain (Rayleigh); for comparison only");
        }
        if (stable < Double.POSITIVE_INFINITY) {
            double fine = Math.min(stable, onWire);
            text.entry(
                    "structure",
                    "stable up to " + time(stable) + ", contact on wires " + time(onWire) + ": "
                            + (int) Math.ceil(step / fine) + " fine steps in a step, at most");
        }
        double end = specification.output().endTime();
        text.entry("in all", "at most about " + ForecastText.number(end / step) + " steps to " + time(end));
        text.entry(
                "memory",
                "about " + ForecastText.number((BASE_MEMORY + GRAIN_MEMORY * feeds.total()) / 1e6) + " MB at most");
        wallTime(step, feeds, threads);
    }

    /** Shortest Rayleigh time of any grain, s; infinite without grains. */
    private double surfaceWave() {
        MaterialTable table = assembly.model().materials();
        return specification.lots().values().stream()
                .mapToDouble(lot -> RayleighStep.of(
                        table.materials().get(table.indexOf(lot.material())),
                        0.5 * lot.diameter().smallest()))
                .min()
                .orElse(Double.POSITIVE_INFINITY);
    }

    private void wallTime(double shortest, FeedFigures feeds, int threads) {
        double end = specification.output().endTime();
        double present = specification.outlets().isEmpty() ? feeds.total() : Math.min(feeds.total(), feeds.rate());
        present = Math.max(present, assembly.model().grains().count());
        try (WorkerTeam team = new WorkerTeam(threads)) {
            Trial plain = Trial.run(assembly.model(), team, TRIAL, end);
            Optional<CaseAssembly> crowd = loaded();
            Trial loaded = crowd.isEmpty() ? plain : Trial.run(crowd.get().model(), team, TRIAL, end);
            double more = loaded.grains() - plain.grains();
            double perGrain = more > 0
                    ? Math.max(0, loaded.perStep() - plain.perStep()) / more
                    : plain.perStep() / Math.max(1, plain.grains());
            double step = Math.max(shortest, Math.min(plain.step(), loaded.step()));
            double wall =
                    end / step * Math.max(plain.perStep(), loaded.perStep() + perGrain * (present - loaded.grains()));
            text.entry(
                    "wall-clock time",
                    "very roughly " + ForecastText.duration(wall) + " on " + threads + " threads with "
                            + ForecastText.number(present) + " grains present; from trials of a second or two with "
                            + ForecastText.number(loaded.grains()) + " grains, wrong by a factor of three or so");
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
