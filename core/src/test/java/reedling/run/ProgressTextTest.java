// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

class ProgressTextTest {

    private static final long SECOND = 1_000_000_000L;

    private final ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    private final PrintStream out = new PrintStream(bytes, true, StandardCharsets.UTF_8);
    private long now;

    private static Progress.Status at(double time) {
        return new Progress.Status(time, 5, 1.83e-5, "contact", 1.24e7, 3725, 5700, 4210, -1.2e-5);
    }

    private String text() {
        return bytes.toString(StandardCharsets.UTF_8);
    }

    /** Steps of 0.01 s of 5 s, each taking so long (ns). */
    private void run(Progress progress, long perStep) {
        for (int step = 1; step <= 500; step++) {
            now += perStep;
            if (progress.wanted(step * 0.01 / 5)) {
                progress.show(at(step * 0.01));
            }
        }
        progress.close();
    }

    @Test
    void aFastRunIntoAPipeGetsALineAtEachTenth() {
        run(new ProgressText(out, false, 80, () -> now), SECOND / 1000);
        assertThat(text().lines()).hasSize(10).allMatch(line -> line.contains("of 5.000 s"));
        assertThat(text()).doesNotContain("\r");
    }

    @Test
    void aSlowRunIntoAPipeGetsALineEveryTenSecondsAndAtEachTenth() {
        run(new ProgressText(out, false, 80, () -> now), SECOND);
        // 500 s: a tenth takes 50 s, and its line starts the ten seconds anew
        assertThat(text().lines()).hasSize(50);
    }

    @Test
    void aTerminalGetsOneLineThatIsWrittenOver() {
        run(new ProgressText(out, true, 80, () -> now), SECOND / 100);
        assertThat(text().lines().filter(line -> !line.isEmpty())).hasSize(25); // every 0.2 s of 5 s
        assertThat(text().split("\r")).allMatch(line -> line.strip().length() < 80);
        assertThat(text()).endsWith(System.lineSeparator()).contains("\r");
        assertThat(text().chars()).allMatch(c -> c < 127);
    }

    @Test
    void theLineNamesTimeStepLimitSpeedGrainsAndResidual() {
        assertThat(ProgressText.line(at(2.5)))
                .isEqualTo("2.500 of 5.000 s, 1 h 02 min left, step 18.3 us (contact), 12.4 M grain-steps/s, "
                        + "5700 in, 4210 out, residual -1.2e-05");
    }
}
