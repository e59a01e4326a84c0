// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A case that asks for the midpoint rule: run, stopped, resumed, and what is said of it. */
class MidpointCaseTest {

    private static final String CASE = """
            [case]
            title = "A block falls on a shaken plate"
            seed = 4

            [materials.grain]
            density = 1300
            youngs_modulus = "5 MPa"
            poisson_ratio = 0.3

            [[pairs]]
            materials = ["grain", "grain"]
            restitution = 0.5
            friction = 0.3
            rolling_friction = 0.02

            [lots.pea]
            material = "grain"
            diameter = "4 mm"

            [feeds.block]
            kind = "packed-block"
            lot = "pea"
            solid_fraction = 0.4
            region = {shape = "box", min = ["-12 mm", "-12 mm", "2.1 mm"], max = ["12 mm", "12 mm", "20 mm"]}

            [motions.shake]
            kind = "harmonic"
            direction = [0, 0, 1]
            stroke = "2 mm"
            frequency = "30 Hz"

            [walls.plate]
            shape = "plane"
            material = "grain"
            point = [0, 0, 0]
            normal = [0, 0, 1]
            motion = "shake"

            [bounds]
            min = [-1, -1, -1]
            max = [1, 1, 1]

            [fields.gravity]
            law = "gravity"

            [steps]
            integrator = "midpoint"
            theta = 0.5
            tolerance = 1e-9

            [output]
            end_time = "45 ms"
            """;

    @TempDir
    private Path folder;

    @Test
    void resumedMidpointRunEndsWithTheSameBitsAndSaysWhatItTook() throws IOException {
        Path text = Files.writeString(folder.resolve("case.toml"), CASE);
        Path whole = folder.resolve("whole");
        Path parts = folder.resolve("parts");
        Program program = new Program(folder);
        assertThat(program.run("run", text.toString(), "--out", whole.toString(), "--threads", "2"))
                .as(program.err())
                .isZero();
        assertThat(program.run("run", text.toString(), "--out", parts.toString(), "--until", "30 ms"))
                .isZero();
        assertThat(program.run("resume", parts.toString(), "--threads", "1")).isZero();
        for (String key : new String[] {"state_digest", "steps", "iterations_mean", "force_passes_per_step"}) {
            assertThat(Program.recorded(parts, key)).as(key).isEqualTo(Program.recorded(whole, key));
        }
        assertThat(Program.recorded(whole, "name")).isEqualTo("midpoint");
        assertThat(Double.parseDouble(Program.recorded(whole, "iterations_mean")))
                .isBetween(1.0, 12.0);
        assertThat(Files.readString(whole.resolve("summary.txt")))
                .contains("Midpoint rule (theta 0.500, tolerance 1.0e-09):", "force passes a step (explicit: 1)");
        assertThat(program.run("check", text.toString())).isZero();
        assertThat(program.out()).contains("steps.integrator");
    }
}
