// SPDX-License-Identifier: Apache-2.0
package reedling.perf;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Level;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import reedling.conform.KernelLoop;
import reedling.conform.LoadedLaws;
import reedling.conform.Subject;
import reedling.contact.ContactLawProvider;

/** Each built-in contact law alone, on a full block in mid-contact: nanoseconds a row. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Warmup(iterations = 2, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(
        value = 1,
        jvmArgsAppend = {
            "--add-modules",
            "jdk.incubator.vector",
            "-XX:-DoEscapeAnalysis",
            "-XX:ObjectAlignmentInBytes=64",
            "-XX:+UseSerialGC"
        })
public class LawBenchmark {

    private static final int ROWS = 80;

    private static final Map<String, Map<String, Double>> GIVEN = Map.of(
            "dmt-adhesion", Map.of("work_of_adhesion", 0.05),
            "jkr", Map.of("work_of_adhesion", 0.05),
            "lennard-jones", Map.of("depth", 1e-9, "zero_distance", 1e-4, "contact_distance", 1e-4, "cutoff", 5e-4));

    @Param({
        "hertz",
        "linear-spring",
        "jkr",
        "dmt-adhesion",
        "lennard-jones",
        "mindlin",
        "mindlin-secant",
        "mindlin-incremental",
        "elastic-plastic",
        "viscous-rolling",
        "twisting-spring"
    })
    private String law = "";

    private Optional<KernelLoop> loop = Optional.empty();

    /** Brings a block of the law into mid-contact. */
    @Setup(Level.Trial)
    public void begin() {
        List<ContactLawProvider> loaded = LoadedLaws.onClassPath();
        ContactLawProvider provider = loaded.stream()
                .filter(other -> other.name().equals(law))
                .findFirst()
                .orElseThrow();
        KernelLoop made = KernelLoop.of(Subject.of(provider, GIVEN.getOrDefault(law, Map.of()), loaded));
        if (made.rows() != ROWS) {
            throw new IllegalStateException("a block of " + made.rows() + " rows, expected " + ROWS);
        }
        loop = Optional.of(made);
    }

    /** One call of the kernel, counted as one operation a row. */
    @Benchmark
    @OperationsPerInvocation(ROWS)
    public double row() {
        return loop.orElseThrow().call();
    }
}
