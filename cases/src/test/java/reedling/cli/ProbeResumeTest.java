// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A probe that remembers a window must not notice that its run was stopped inside one. */
class ProbeResumeTest {

    private static final List<String> THIN_LAYER = List.of(
            "--set", "feeds.layer.count=150",
            "--set", "motions.shake.frequency=\"80 Hz\"",
            "--set", "motions.shake.amplitude=\"0.1 mm\"",
            "--set", "motions.shake.ramp_up=\"20 ms\"",
            "--set", "output.table_every=\"20 ms\"",
            "--set", "output.end_time=\"0.33 s\"");

    @TempDir
    private Path folder;

    private Path run(Program program, String name, String until) {
        Path out = folder.resolve(name);
        List<String> arguments = new ArrayList<>(
                List.of("run", "shaken-bed", "--out", out.toString(), "--threads", "1", "--until", until));
        arguments.addAll(THIN_LAYER);
        assertThat(program.run(arguments.toArray(new String[0])))
                .as(program.err())
                .isZero();
        return out;
    }

    @Test
    void resumedRunWritesTheSameFiguresOfProbes() throws IOException {
        Program program = new Program(folder);
        Path whole = run(program, "whole", "0.33 s");
        Path parts = run(program, "parts", "0.16 s");
        assertThat(program.run("resume", parts.toString(), "--threads", "2"))
                .as(program.err())
                .isZero();
        assertThat(Program.recorded(parts, "state_digest")).isEqualTo(Program.recorded(whole, "state_digest"));
        for (String table : List.of("probe-waves.csv", "probe-waves-end.csv")) {
            assertThat(Files.readString(parts.resolve(table))).isEqualTo(Files.readString(whole.resolve(table)));
        }
        assertThat(Double.parseDouble(Program.recorded(whole, "waves.dominant_wavelength_m")))
                .isPositive();
        assertThat(program.out()).contains("Probe waves", "rms wave at half frequency");
    }
}
