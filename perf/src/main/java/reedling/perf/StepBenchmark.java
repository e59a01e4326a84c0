// SPDX-License-Identifier: Apache-2.0
package reedling.perf;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Level;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;
import org.openjdk.jmh.annotations.Warmup;
import reedling.parallel.WorkerTeam;
import reedling.run.Simulation;

/** The full step, every safety on, on a jammed bed: one invocation is one step of all grains. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 3)
@Measurement(iterations = 5, time = 2)
@Fork(
        value = 1,
        jvmArgsAppend = {
            "--add-modules",
            "jdk.incubator.vector",
            "-XX:-DoEscapeAnalysis",
            "-XX:ObjectAlignmentInBytes=64",
            "-XX:+UseSerialGC"
        })
public class StepBenchmark {

    @Param({"2000", "10000"})
    private int grains;

    @Param({"1", "2"})
    private int threads;

    @Param({"1", "2"})
    private int materials;

    private WorkerTeam team = new WorkerTeam(1);
    private Simulation simulation = new Simulation(BedModel.of(new DenseBed(new double[3], new double[0]), 1), team);

    /** Makes the bed and lets it run in. */
    @Setup(Level.Trial)
    public void begin() {
        team.close();
        team = new WorkerTeam(threads);
        simulation = new Simulation(BedModel.of(JammedBed.make(grains), materials), team);
        simulation.begin();
    }

    /** Ends the workers. */
    @TearDown(Level.Trial)
    public void end() {
        team.close();
    }

    /** One step; the time it returns keeps the compiler from dropping it. */
    @Benchmark
    public double step() {
        simulation.step();
        return simulation.time();
    }
}
