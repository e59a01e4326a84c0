// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;

class MainTest {

    @TempDir
    private Path folder;

    private final StringWriter out = new StringWriter();
    private final StringWriter err = new StringWriter();

    /** A command that fails in the given way, beside the real ones. */
    @Command(name = "fail")
    private record Failing(RuntimeException failure) implements Runnable {
        @Override
        public void run() {
            throw failure;
        }
    }

    private int execute(RuntimeException failure, String... arguments) {
        CommandLine commandLine = Main.commandLine(new FaultRecord(folder))
                .setOut(new PrintWriter(out, true))
                .setErr(new PrintWriter(err, true));
        CommandLine failing = new CommandLine(new Failing(failure));
        failing.setExecutionExceptionHandler(commandLine.getExecutionExceptionHandler());
        commandLine.addSubcommand(failing);
        failing.setErr(commandLine.getErr());
        return commandLine.execute(arguments);
    }

    private int execute(String... arguments) {
        return execute(new IllegalStateException("unused"), arguments);
    }

    @Test
    void findingsArePrintedOneALineWithoutAStackTrace() {
        Finding first = new Finding("a.toml:1", "x", "0 m", "> 0 m", "Use more.");
        Finding second = new Finding("a.toml:2", "y", "1 s", "< 1 s", "");
        int code = execute(new ReedlingException(ExitCode.CASE, List.of(first, second)), "fail");
        assertThat(code).isEqualTo(65);
        assertThat(err.toString().lines())
                .containsExactly(
                        "a.toml:1 x: is 0 m, expected > 0 m. Use more.", "a.toml:2 y: is 1 s, expected < 1 s.");
    }

    @Test
    void internalFaultIsWrittenToAFileNamedInTheMessage() throws IOException {
        int code = execute(new IllegalStateException("wheel came off"), "fail");
        assertThat(code).isEqualTo(70);
        assertThat(err.toString()).contains("Internal fault", "wheel came off").doesNotContain("\tat ");
        try (Stream<Path> files = Files.list(folder)) {
            Path record = files.findFirst().orElseThrow();
            assertThat(err.toString()).contains(record.toString());
            assertThat(record).content().contains("arguments: fail", "IllegalStateException", "\tat reedling.cli.");
        }
    }

    @Test
    void wrongCommandLinesEndWithUsageCode() {
        assertThat(execute("bogus")).isEqualTo(64);
        assertThat(execute("plugins", "--bogus")).isEqualTo(64);
        assertThat(execute()).isEqualTo(64);
        assertThat(err.toString()).contains("bogus", "Usage: reedling");
    }

    @Test
    void helpAndVersionSucceed() {
        assertThat(execute("--help")).isZero();
        assertThat(execute("--version")).isZero();
        assertThat(out.toString()).contains("Usage: reedling", "plugins", "reedling development");
    }

    @Test
    void pluginsPrintsAListInBothForms() {
        assertThat(execute("plugins")).isZero();
        assertThat(execute("plugins", "--json")).isZero();
        assertThat(out.toString()).contains("No plugins were found.", "[]");
    }

    @Test
    void brokenPluginFolderEndsWithPluginCode() {
        assertThat(execute("plugins", "--plugins", folder.resolve("absent").toString()))
                .isEqualTo(69);
        assertThat(err.toString()).contains("absent");
    }
}
