// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.error.ExitCode;

class RepeatCommandTest {

    @TempDir
    private Path folder;

    private static Map<String, Double> results(double angle, double wave) {
        Map<String, Double> results = new LinkedHashMap<>();
        results.put("heap.angle_deg", angle);
        results.put("bed.wave_m", wave);
        return results;
    }

    /** 1, 2, 3: mean 2, deviation 1, half width 4.303 / sqrt(3) = 2.484. */
    @Test
    void figuresAreAveragedOverTheRunsThatKnowThem() {
        RepeatedFigures figures = new RepeatedFigures();
        figures.add(4, results(1, Double.NaN));
        figures.add(5, results(2, Double.NaN));
        figures.add(9, results(3, Double.NaN));
        assertThat(figures.text().lines())
                .anyMatch(line -> line.matches("heap.angle_deg +2.000 \\+- 2.5, s 1.0, 3 runs"))
                .anyMatch(line -> line.matches("bed.wave_m +not known"));
        assertThat(figures.table().lines())
                .anyMatch(line -> line.endsWith(",seed 4,seed 5,seed 9"))
                .anyMatch(line -> line.matches("heap.angle_deg,2.0,2.48\\d+,1.0,1.0,3.0,3,1.0,2.0,3.0"))
                .contains("bed.wave_m,,,,,,0,,,");
    }

    @Test
    void seedsAreARangeOrAList() {
        assertThat(SeedList.of("3..5")).isEqualTo(List.of(3L, 4L, 5L));
        assertThat(SeedList.of("7,3,20")).isEqualTo(List.of(7L, 3L, 20L));
        for (String wrong : List.of("5..3", "4", "4,4", "1..2000", "a..b", "", "1,,2", "-1..3")) {
            assertThatThrownBy(() -> SeedList.of(wrong)).as(wrong).hasMessageContaining("--seeds");
        }
    }

    @Test
    void eachSeedHasAFolderAndTheMeanATable() throws IOException {
        Program program = new Program(folder);
        Path out = folder.resolve("runs");
        assertThat(program.run(
                        "repeat",
                        Path.of("heap").toString(),
                        "--seeds",
                        "2,5",
                        "--out",
                        out.toString(),
                        "--until",
                        "0.002 s",
                        "--set",
                        "feeds.filling.count=200"))
                .as(program.err())
                .isZero();
        assertThat(program.out()).contains("2 runs;", "heap.foot_radius_m");
        assertThat(Files.readString(out.resolve("repeat.csv"))).contains("seed 2,seed 5", "heap.top_height_m,");
        assertThat(Program.recorded(out.resolve("seed-2"), "seed")).isEqualTo("2");
        assertThat(Program.recorded(out.resolve("seed-5"), "seed")).isEqualTo("5");
        assertThat(Program.recorded(out.resolve("seed-2"), "state_digest"))
                .isNotEqualTo(Program.recorded(out.resolve("seed-5"), "state_digest"));
        assertThat(out.resolve("seed-2").resolve("probe-heap.csv"))
                .content()
                .startsWith("time [s],angle of repose [deg]");
        assertThat(out.resolve("seed-2").resolve("probe-heap-end.csv")).isRegularFile();
        assertThat(program.run("repeat", "heap", "--seeds", "1..2", "--out", out.toString()))
                .isEqualTo(ExitCode.OUTPUT.number());
    }
}
