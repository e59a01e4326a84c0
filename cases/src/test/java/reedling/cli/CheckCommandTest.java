// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.error.ExitCode;

class CheckCommandTest {

    @TempDir
    private Path folder;

    private Program program;

    @BeforeEach
    void program() {
        program = new Program(folder);
    }

    /**
     * Acceleration A w^2/g = 0.0025 (40 pi)^2 / 9.80665 = 4.03; throw index A w^2 cos 45 / (g cos 5) = 2.86; stiffness
     * 4 T/L + 192 EI/L^3 = 106.67 + 0.33 N/m; layer sqrt(EI/T) = 2.43 mm: closed forms worked by hand.
     */
    @Test
    void deckFiguresAreThoseWorkedByHand() {
        assertThat(program.run("check", Path.of("wire-deck").toString())).isZero();
        String text = program.out().replaceAll("\\s+", " ");
        assertThat(text)
                .contains("15 wires, 900 elements, 915 nodes", "15 of 300 mm, gap 5.4 mm")
                .contains("acceleration 4.03 g, throw index 2.86", "mid-span 107 N/m", "sqrt(EI/T) = 2.43 mm")
                .contains("600 g in 5 s", "120 g/s", "around half of a grain (Rayleigh)")
                .contains("is within 5 % of harmonic 4 of the drive, 80 Hz")
                .contains("wall-clock time", "5 cautions.");
        assertThat(program.out().lines()).allSatisfy(line -> assertThat(line).hasSizeLessThanOrEqualTo(80));
        assertThat(program.out()).isASCII();
    }

    /** Sieved mass: 11 % below 4 mm, 48 % below 4.5 mm; the d10 and d50 lie between their sieves. */
    @Test
    void sizesOfASieveTableAreForetold() {
        assertThat(program.run("check", "heap")).isZero();
        assertThat(program.out().replaceAll("\\s+", " "))
                .contains("lot vetch d10 3.94 mm, d50 4.52 mm, d90 5.05 mm; about 5,000 grains");
    }

    @Test
    void otherTensionIsClearOfTheHarmonics() {
        assertThat(program.run("check", "wire-deck", "--set", "wires.deck.tension=\"6 N\""))
                .isZero();
        assertThat(program.out()).doesNotContain("of harmonic");
    }

    @Test
    void allErrorsAreListedWithFileAndLine() {
        assertThat(program.run(
                        "check",
                        "wire-deck",
                        "--set",
                        "materials.seed.density=\"-1 kg/m3\"",
                        "--set",
                        "feeds.inlet.kind=\"hail\""))
                .isEqualTo(ExitCode.CASE.number());
        assertThat(program.err().lines().count()).isGreaterThanOrEqualTo(2);
        assertThat(program.err()).contains("materials.seed.density", "feeds.inlet");
        assertThat(program.out()).isEmpty();
    }
}
