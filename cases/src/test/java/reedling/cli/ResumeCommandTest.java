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

class ResumeCommandTest {

    @TempDir
    private Path folder;

    private Program program;
    private String run = "";

    @BeforeEach
    void aShortRun() {
        program = new Program(folder);
        run = folder.resolve("run").toString();
        assertThat(program.run("run", Program.FIRST_LOOK, "--out", run, "--threads", "1", "--until", "5 ms"))
                .isZero();
    }

    @Test
    void keysThatChangeTheSimulationAreRefused() {
        assertThat(program.run("resume", run, "--set", "wires.deck.tension=\"6 N\"", "--set", "case.seed=2"))
                .isEqualTo(ExitCode.USAGE.number());
        assertThat(program.err()).contains("--set wires.deck.tension", "--set case.seed", "output.end_time");
    }

    @Test
    void anotherEndIsTakenWhileNothingIsMeasured() throws IOException {
        assertThat(program.run("resume", run, "--set", "output.end_time=\"2 s\"", "--until", "8 ms"))
                .isZero();
        assertThat(Program.recorded(Path.of(run), "end_time_s")).isEqualTo("2.0");
        assertThat(Double.parseDouble(Program.recorded(Path.of(run), "time_s"))).isGreaterThanOrEqualTo(0.008);
    }

    @Test
    void anotherEndIsRefusedOnceMeasuringHasBegun() {
        String measured = folder.resolve("measured").toString();
        assertThat(program.run(
                        "run",
                        Program.FIRST_LOOK,
                        "--out",
                        measured,
                        "--until",
                        "5 ms",
                        "--set",
                        "screen.measure_from=\"1 ms\""))
                .isZero();
        assertThat(program.run("resume", measured, "--set", "output.end_time=\"2 s\""))
                .isEqualTo(ExitCode.CHECKPOINT.number());
        assertThat(program.err()).contains("output.end_time: is set anew", "measuring began at 0.001 s");
    }

    @Test
    void changedCaseIsRefused() throws IOException {
        Path text = Path.of(run, "case.toml");
        Files.writeString(text, Files.readString(text).replace("8 N", "7 N"));
        assertThat(program.run("resume", run)).isEqualTo(ExitCode.CHECKPOINT.number());
        assertThat(program.err()).contains("case.toml", "changed since the run began");
    }

    @Test
    void folderWithoutARunIsRefused() {
        assertThat(program.run("resume", folder.resolve("none").toString())).isEqualTo(ExitCode.OUTPUT.number());
        assertThat(program.err()).contains("without a run");
    }

    @Test
    void damagedNewestCheckpointIsPassedOver() throws IOException {
        assertThat(program.run("resume", run, "--until", "8 ms", "--threads", "1"))
                .isZero();
        String whole = Program.recorded(Path.of(run), "state_digest");
        Path newest = Path.of(run, "checkpoint_000002.rck");
        byte[] bytes = Files.readAllBytes(newest);
        bytes[bytes.length / 2] ^= 1;
        Files.write(newest, bytes);
        assertThat(program.run("resume", run, "--until", "8 ms", "--threads", "1"))
                .isZero();
        assertThat(program.err()).contains("passed over: ", "checkpoint_000002.rck");
        assertThat(Program.recorded(Path.of(run), "state_digest")).isEqualTo(whole);
    }
}
