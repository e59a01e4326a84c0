// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.nio.file.Files;
import java.util.List;
import org.junit.jupiter.api.Test;
import reedling.error.ExitCode;
import reedling.error.ReedlingException;

/** What only the parts themselves can tell is refused at the line of the case that asked for it. */
class RefusedPartsTest {

    private static String text() throws IOException {
        return Files.readString(Shipped.file("first-look"));
    }

    /** The findings for the first-look case with one text changed, as printed. */
    private static List<String> findings(String old, String changed) throws IOException {
        assertThat(text()).contains(old);
        CaseReading reading = CaseFile.read(text().replace(old, changed), "case.toml", List.of(), Shipped.PLUGINS);
        ReedlingException refused =
                catchThrowableOfType(ReedlingException.class, () -> CaseAssembly.make(reading, Shipped.PLUGINS));
        assertThat(refused.exitCode()).isEqualTo(ExitCode.CASE);
        return refused.findings().stream().map(Object::toString).toList();
    }

    private static int line(String start) throws IOException {
        List<String> lines = text().lines().toList();
        for (int k = 0; k < lines.size(); k++) {
            if (lines.get(k).startsWith(start)) {
                return k + 1;
            }
        }
        throw new IllegalArgumentException(start);
    }

    @Test
    void vibrationThatStartsLateNeedsARamp() throws IOException {
        assertThat(findings("ramp_up = \"0.1 s\"", "start = \"0.1 s\""))
                .singleElement()
                .asString()
                .startsWith("case.toml:" + line("[motions.throw]") + ":")
                .contains("motions.throw, ramp", "a ramp > 0");
    }

    @Test
    void motionRisesAndFallsAlike() throws IOException {
        assertThat(findings("ramp_up = \"0.1 s\"", "ramp_up = \"0.1 s\"\nstop = \"1 s\"\nramp_down = \"0.2 s\""))
                .singleElement()
                .asString()
                .startsWith("case.toml:" + (line("ramp_up") + 2) + ":")
                .contains("motions.throw.ramp_down: is 0.2 s, expected ramp_up, 0.1 s");
    }

    @Test
    void wireStretchedTooFarIsRefusedOnceForTheWholeRow() throws IOException {
        assertThat(findings("tension = \"8 N\"", "tension = \"80 N\""))
                .singleElement()
                .asString()
                .startsWith("case.toml:" + line("tension") + ":")
                .contains("wires.deck.tension", "at most 0.3");
    }

    @Test
    void deckNeedsTwoWires() throws IOException {
        assertThat(findings("count = 7", "count = 1"))
                .anySatisfy(finding -> assertThat(finding)
                        .startsWith("case.toml:" + line("wires = \"deck\"") + ":")
                        .contains("screen.wires: is a single wire"));
    }

    @Test
    void totalIsCountedAsTheRateIs() throws IOException {
        assertThat(findings("mass_rate = \"0.05 kg/s\"", "mass_rate = \"0.05 kg/s\"\ntotal_count = 20"))
                .singleElement()
                .asString()
                .startsWith("case.toml:" + (line("mass_rate") + 1) + ":")
                .contains("feeds.inlet.total_count: is given with mass_rate, expected total_mass");
    }

    @Test
    void everyPartThatIsWrongIsNamedAtOnce() throws IOException {
        String motion = text().replace("ramp_up = \"0.1 s\"", "start = \"0.1 s\"");
        CaseReading reading = CaseFile.read(
                motion.replace("tension = \"8 N\"", "tension = \"80 N\""), "case.toml", List.of(), Shipped.PLUGINS);
        ReedlingException refused =
                catchThrowableOfType(ReedlingException.class, () -> CaseAssembly.make(reading, Shipped.PLUGINS));
        assertThat(refused.findings()).hasSize(2);
    }
}
