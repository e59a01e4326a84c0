// SPDX-License-Identifier: Apache-2.0
package reedling.perf;

import java.io.PrintWriter;
import java.lang.management.ManagementFactory;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Locale;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import reedling.cli.SubCommand;
import reedling.math.Lanes;
import reedling.parallel.WorkerTeam;
import reedling.run.Simulation;

/** Times the full step, every safety on, on a dense bed. */
@Command(
        name = "bench",
        description = "Times the full step on a dense bed of spheres and prints grain-steps per second.",
        mixinStandardHelpOptions = true)
public final class BenchCommand implements SubCommand, Callable<Integer> {

    private static final int SAMPLES = 10;

    @Option(names = "--bed", paramLabel = "FILE", description = "Bed file; without it a bed is made.")
    private @Nullable Path bed;

    @Option(names = "--grains", description = "Grains of the bed that is made (default: ${DEFAULT-VALUE}).")
    private int grains = 50_000;

    @Option(
            names = "--threads",
            split = ",",
            description = "Thread counts to time, e.g. 1,2 (default: 1 and all processors).")
    private int[] threads = {};

    @Option(names = "--steps", description = "Steps to time after the warm-up (default: ${DEFAULT-VALUE}).")
    private int steps = 1000;

    @Option(names = "--warmup", description = "Steps before the timing (default: ${DEFAULT-VALUE}).")
    private int warmup = 600;

    @Option(names = "--materials", description = "Materials the grains are dealt (default: ${DEFAULT-VALUE}).")
    private int materials = 1;

    @Option(names = "--json", description = "End with one line of JSON for each thread count.")
    private boolean json;

    @Spec
    @SuppressWarnings("NullAway.Init") // set by the command line library before the command runs
    private CommandSpec spec;

    @Override
    public Integer call() {
        PrintWriter out = spec.commandLine().getOut();
        DenseBed made = bed == null ? JammedBed.make(grains) : DenseBed.read(bed);
        int all = Runtime.getRuntime().availableProcessors();
        int[] counts = threads.length > 0 ? threads : all > 1 ? new int[] {1, all} : new int[] {1};
        out.printf(
                Locale.ROOT,
                "%d grains, %d lanes, median of %d samples%n",
                made.count(),
                Lanes.VECTORISED ? Lanes.TILE : 1,
                SAMPLES);
        for (int count : counts) {
            time(made, count, out);
            out.flush();
        }
        return 0;
    }

    private void time(DenseBed made, int workers, PrintWriter out) {
        try (WorkerTeam team = new WorkerTeam(workers)) {
            Simulation run = new Simulation(BedModel.of(made, materials), team);
            run.begin();
            for (int k = 0; k < warmup; k++) {
                run.step();
            }
            double[] rates = new double[SAMPLES];
            long processorStart = ManagementFactory.getThreadMXBean().getCurrentThreadCpuTime();
            long searchesBefore = run.searches();
            int perSample = Math.max(1, steps / SAMPLES);
            for (int s = 0; s < SAMPLES; s++) {
                long start = System.nanoTime();
                for (int k = 0; k < perSample; k++) {
                    run.step();
                }
                rates[s] = 1e9 * perSample * made.count() / (System.nanoTime() - start);
            }
            long processor = ManagementFactory.getThreadMXBean().getCurrentThreadCpuTime() - processorStart;
            double perProcessor = 1e9 * perSample * SAMPLES * made.count() / processor;
            Arrays.sort(rates);
            report(made, run, new Rate(rates[SAMPLES / 2], perProcessor), run.searches() - searchesBefore, out);
        }
    }

    /**
     * Grain-steps a second.
     *
     * @param wall median by the clock on the wall
     * @param processor mean by the processor time of the leading thread: what a shared machine does not disturb as much
     */
    private record Rate(double wall, double processor) {}

    private void report(DenseBed made, Simulation run, Rate rate, long searches, PrintWriter out) {
        int workers = run.team().workers();
        int chunks = run.interactions().lists().chunks().size();
        out.printf(
                Locale.ROOT,
                "%2d threads  %8.3f million grain-steps/s (%.3f by processor time)  %d chunks  %d searches  step %.3g s  "
                        + "limited by %s  residual %.2g%n",
                workers,
                rate.wall() * 1e-6,
                rate.processor() * 1e-6,
                chunks,
                searches,
                run.pastStep(),
                run.limits().binding(),
                run.ledger().relativeResidual());
        if (json) {
            out.printf(
                    Locale.ROOT,
                    "{\"grain_steps_per_s\": %.6e, \"grains\": %d, \"chunks\": %d, \"threads\": %d, \"steps\": %d, \"searches\": %d}%n",
                    rate.wall(),
                    made.count(),
                    chunks,
                    workers,
                    steps,
                    searches);
        }
    }
}
