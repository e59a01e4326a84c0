// SPDX-License-Identifier: Apache-2.0
package reedling.output;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.error.ExitCode;
import reedling.error.ReedlingException;

class RunFolderTest {

    @TempDir
    Path parent;

    @Test
    void earlierRunIsRefusedWithItsRemedy() throws IOException {
        Path path = parent.resolve("a/b");
        RunFolder.create(path).close();
        assertThatThrownBy(() -> RunFolder.create(path))
                .isInstanceOfSatisfying(
                        ReedlingException.class,
                        refusal -> assertThat(refusal.exitCode()).isEqualTo(ExitCode.OUTPUT))
                .hasMessageContaining("Choose another name, or resume that run.");
        RunFolder.resume(path).close();
    }

    @Test
    void folderInUseIsRefusedAndFreeAgainAfterClose() throws IOException {
        Path path = parent.resolve("run");
        try (RunFolder first = RunFolder.create(path)) {
            assertThatThrownBy(() -> RunFolder.resume(path)).hasMessageContaining("in use by this process");
            assertThat(lockAttemptByAnotherProcess(path))
                    .contains("in use by process " + ProcessHandle.current().pid());
        }
        assertThat(lockAttemptByAnotherProcess(path)).isEqualTo("free");
    }

    @Test
    void refusedSecondUseDoesNotFreeTheFolder() throws IOException {
        Path path = parent.resolve("run");
        try (RunFolder first = RunFolder.create(path)) {
            assertThatThrownBy(() -> RunFolder.create(path)).isInstanceOf(ReedlingException.class);
            assertThat(lockAttemptByAnotherProcess(path)).contains("in use");
        }
    }

    @Test
    void resumeNeedsAnEarlierRun() {
        assertThatThrownBy(() -> RunFolder.resume(parent)).hasMessageContaining("without a run");
    }

    @Test
    void fileInTheWayIsRefused() throws IOException {
        Path file = Files.writeString(parent.resolve("run"), "");
        assertThatThrownBy(() -> RunFolder.create(file)).hasMessageContaining("is a file");
        assertThatThrownBy(() -> RunFolder.create(file.resolve("below"))).hasMessageContaining("impossible to use");
    }

    @Test
    void logGoesOnAfterResume() throws IOException {
        Path path = parent.resolve("run");
        try (RunFolder folder = RunFolder.create(path)) {
            folder.log("started");
        }
        try (RunFolder folder = RunFolder.resume(path)) {
            folder.log("resumed");
        }
        assertThat(Files.readAllLines(path.resolve("run.log")))
                .hasSize(2)
                .last()
                .asString()
                .endsWith("Z resumed");
    }

    private static String lockAttemptByAnotherProcess(Path path) throws IOException {
        Process process = new ProcessBuilder(
                        ProcessHandle.current().info().command().orElse("java"),
                        "-cp",
                        System.getProperty("java.class.path"),
                        LockAttempt.class.getName(),
                        path.toString())
                .redirectErrorStream(true)
                .start();
        String said = new String(process.getInputStream().readAllBytes()).strip();
        try {
            assertThat(process.waitFor(30, TimeUnit.SECONDS)).isTrue();
        } catch (InterruptedException interrupted) {
            throw new IOException(interrupted);
        }
        return said;
    }

    /** Runs in a process of its own: tries to take the folder named by its argument. */
    static final class LockAttempt {
        public static void main(String[] arguments) throws IOException {
            try (RunFolder folder = RunFolder.resume(Path.of(arguments[0]))) {
                System.out.println("free");
            } catch (ReedlingException refused) {
                System.out.println(refused.getMessage());
            }
        }
    }
}
