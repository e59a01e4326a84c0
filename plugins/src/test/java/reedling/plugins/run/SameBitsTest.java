// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.parallel.WorkerTeam;
import reedling.run.Simulation;

/** The same case gives the same bits on any number of threads, with any width of vectors, however often it is looked at. */
@Tag("conservation")
class SameBitsTest {

    private static final int STEPS = 2000;

    @Test
    void threadsDoNotChangeABit() {
        long one = ShakenScreen.digest(1, STEPS, 1000);
        assertThat(ShakenScreen.digest(2, STEPS, 1000)).isEqualTo(one);
        assertThat(ShakenScreen.digest(3, STEPS, 1000)).isEqualTo(one);
    }

    @Test
    void reportsDoNotChangeABit() {
        assertThat(ShakenScreen.digest(1, 600, 1)).isEqualTo(ShakenScreen.digest(1, 600, 1000));
    }

    /** So that equality above means something: the scene has chunks, searches, fine steps, and touches everything. */
    @Test
    void sceneCoversWhatItShould() {
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = ShakenScreen.scene(11).reportEvery(100).start(team);
            int fine = 0;
            double roller = 0;
            while (run.stepCount() <= STEPS) {
                run.step();
                fine = Math.max(fine, run.fineSteps());
                roller = Math.max(roller, Math.abs(run.interactions().walls().sumLoads()[6 + 2]));
            }
            assertThat(run.interactions().lists().chunks().size()).isGreaterThan(2);
            assertThat(run.searches()).isGreaterThan(10);
            assertThat(fine).isGreaterThan(1);
            assertThat(roller).isPositive();
            assertThat(run.model().structure().energy(0).kinetic()).isPositive();
            long same = ShakenScreen.digest(run);
            run.step();
            assertThat(ShakenScreen.digest(run)).isNotEqualTo(same);
        }
    }

    /** The width is chosen once per virtual machine, so each runs in one of its own. */
    @Test
    void lanesDoNotChangeABit() throws IOException, InterruptedException {
        assertThat(digestWithLanes(8)).isEqualTo(digestWithLanes(1)).hasSizeGreaterThan(8);
    }

    private static String digestWithLanes(int lanes) throws IOException, InterruptedException {
        Process process = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "--add-modules",
                        "jdk.incubator.vector",
                        "-XX:+UseSerialGC",
                        "-Dreedling.lanes=" + lanes,
                        "-cp",
                        System.getProperty("java.class.path"),
                        ShakenScreen.class.getName(),
                        "700")
                .redirectError(ProcessBuilder.Redirect.DISCARD)
                .start();
        String printed = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8).strip();
        assertThat(process.waitFor()).isZero();
        return printed;
    }
}
