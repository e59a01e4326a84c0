// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.error.ExitCode;

/** A run in a Java machine of its own, killed or asked to end, goes on to the state of a run that nobody stopped. */
@Tag("slow")
class KilledRunTest {

    private static final String UNTIL = "0.15 s";

    @TempDir
    private Path folder;

    private Process start(Path out) throws IOException {
        return new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "--add-modules",
                        "jdk.incubator.vector",
                        "-cp",
                        System.getProperty("java.class.path"),
                        "reedling.cli.Main",
                        "run",
                        Program.FIRST_LOOK,
                        "--out",
                        out.toString(),
                        "--threads",
                        "2",
                        "--until",
                        UNTIL,
                        "--set",
                        "output.checkpoint_every=\"0.01 s\"")
                .redirectErrorStream(true)
                .redirectOutput(new File(folder.toFile(), "output.txt"))
                .start();
    }

    private static void awaitCheckpoint(Path out, Process process) throws InterruptedException {
        for (int k = 0; k < 3000 && !Files.exists(out.resolve("checkpoint_000003.rck")); k++) {
            assertThat(process.isAlive()).isTrue();
            Thread.sleep(20);
        }
    }

    private String undisturbed() throws IOException {
        Path whole = folder.resolve("whole");
        assertThat(new Program(folder)
                        .run("run", Program.FIRST_LOOK, "--out", whole.toString(), "--threads", "1", "--until", UNTIL))
                .isZero();
        return Program.recorded(whole, "state_digest");
    }

    private String resumed(Path out) throws IOException {
        assertThat(new Program(folder).run("resume", out.toString(), "--until", UNTIL))
                .isZero();
        return Program.recorded(out, "state_digest");
    }

    @Test
    void killedRunGoesOnFromItsLastCheckpoint() throws IOException, InterruptedException {
        Path out = folder.resolve("killed");
        Process process = start(out);
        awaitCheckpoint(out, process);
        process.destroyForcibly().waitFor(60, TimeUnit.SECONDS);
        assertThat(Double.parseDouble(Program.recorded(out, "time_s"))).isLessThan(0.15);
        assertThat(resumed(out)).isEqualTo(undisturbed());
    }

    @Test
    void signalledRunWritesACheckpointAndEndsWithItsOwnCode() throws IOException, InterruptedException {
        Path out = folder.resolve("stopped");
        Process process = start(out);
        awaitCheckpoint(out, process);
        process.destroy(); // SIGTERM
        assertThat(process.waitFor(60, TimeUnit.SECONDS)).isTrue();
        assertThat(process.exitValue()).isEqualTo(ExitCode.STOPPED.number());
        assertThat(Files.readString(folder.resolve("output.txt"))).contains("go on with: reedling resume " + out);
        assertThat(Program.recorded(out, "status")).isEqualTo("stopped");
        assertThat(resumed(out)).isEqualTo(undisturbed());
    }
}
