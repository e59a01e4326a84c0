// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.error.ExitCode;

class RunCommandTest {

    /** By then the first grains have hit the deck. */
    private static final String UNTIL = "0.06 s";

    @TempDir
    private Path folder;

    private Program program;

    @BeforeEach
    void program() {
        program = new Program(folder);
    }

    private Path run(String name, String threads, String until) {
        Path out = folder.resolve(name);
        assertThat(program.run(
                        "run",
                        Program.FIRST_LOOK,
                        "--out",
                        out.toString(),
                        "--threads",
                        threads,
                        "--until",
                        until,
                        "--set",
                        "output.checkpoint_every=\"0.01 s\""))
                .isEqualTo(ExitCode.OK.number());
        return out;
    }

    @Test
    void runLeavesAFolderThatSaysWhatHappened() throws IOException {
        Path out = run("one", "1", "0.02 s");
        assertThat(out.resolve("case.toml")).content().contains("checkpoint_every = \"0.01 s\"");
        assertThat(Double.parseDouble(Program.recorded(out, "time_s"))).isGreaterThanOrEqualTo(0.02);
        assertThat(Program.recorded(out, "threads")).isEqualTo("1");
        assertThat(Integer.parseInt(Program.recorded(out, "steps"))).isGreaterThan(50);
        assertThat(Double.parseDouble(Program.recorded(out, "wall_s"))).isPositive();
        assertThat(Double.parseDouble(Program.recorded(out, "grain_steps_per_s")))
                .isPositive();
        assertThat(Math.abs(Double.parseDouble(Program.recorded(out, "ledger_residual"))))
                .isLessThan(1e-2);
        assertThat(Program.recorded(out, "state_digest")).hasSizeGreaterThan(16);
        assertThat(out.resolve("summary.txt")).isRegularFile();
        assertThat(program.out()).contains("First look at a wire deck", "Results: " + out, "reedling resume " + out);
    }

    @Test
    void stateIsTheSameForOneAndTwoThreads() throws IOException {
        String one = Program.recorded(run("one", "1", UNTIL), "state_digest");
        assertThat(Program.recorded(run("two", "2", UNTIL), "state_digest")).isEqualTo(one);
        assertThat(Program.recorded(run("less", "1", "0.05 s"), "state_digest")).isNotEqualTo(one);
    }

    @Test
    void stoppedRunGoesOnToTheSameState() throws IOException {
        String whole = Program.recorded(run("whole", "1", UNTIL), "state_digest");
        Path parts = run("parts", "2", "0.045 s");
        assertThat(Program.recorded(parts, "state_digest")).isNotEqualTo(whole);
        assertThat(program.run("resume", parts.toString(), "--threads", "1", "--until", UNTIL))
                .isZero();
        assertThat(Program.recorded(parts, "state_digest")).isEqualTo(whole);
        assertThat(program.run("resume", parts.toString(), "--until", UNTIL)).isZero();
        assertThat(program.out()).contains("nothing is left to do");
    }

    @Test
    void usedFolderIsRefusedWithARemedy() throws IOException {
        Path used = Files.createDirectory(folder.resolve("used"));
        Files.writeString(used.resolve("notes.txt"), "mine");
        assertThat(program.run("run", Program.FIRST_LOOK, "--out", used.toString()))
                .isEqualTo(ExitCode.OUTPUT.number());
        assertThat(program.err()).contains(used.toString(), "is a folder that is not empty", "--out");
        assertThat(used).isDirectoryContaining("glob:**notes.txt");
    }

    @Test
    void wrongCaseMakesNoFolder() {
        Path out = folder.resolve("out");
        assertThat(program.run(
                        "run", Program.FIRST_LOOK, "--out", out.toString(), "--set", "wires.deck.tension=\"80 N\""))
                .isEqualTo(ExitCode.CASE.number());
        assertThat(program.err()).contains("--set wires.deck.tension: is 80.0 N", "at most 0.3");
        assertThat(out).doesNotExist();
    }

    @Test
    void missingCaseIsNoInput() {
        assertThat(program.run("run", folder.resolve("none.toml").toString())).isEqualTo(ExitCode.NO_INPUT.number());
        assertThat(program.err()).contains("none.toml", "missing");
    }

    @Test
    void threadsAndTimesAreChecked() {
        assertThat(program.run("run", Program.FIRST_LOOK, "--threads", "0")).isEqualTo(ExitCode.USAGE.number());
        assertThat(program.err()).contains("--threads: is 0, expected 1 to 1024");
        assertThat(program.run("run", Program.FIRST_LOOK, "--until", "3 kg")).isEqualTo(ExitCode.USAGE.number());
        assertThat(program.err()).contains("--until", "3 kg");
        assertThat(program.run("run", Program.FIRST_LOOK, "--until", "9 s")).isEqualTo(ExitCode.USAGE.number());
        assertThat(program.err()).contains("at most output.end_time, 0.6 s", "--set 'output.end_time=\"9 s\"'");
    }
}
