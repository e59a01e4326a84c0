// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.error.ExitCode;

class CertifyCommandTest {

    @TempDir
    private Path folder;

    private Program program;

    @BeforeEach
    void program() {
        program = new Program(folder);
    }

    @Test
    void certificateOfABuiltInLawIsWrittenInThreeForms() throws IOException {
        Path out = folder.resolve("certificate");
        assertThat(program.run("certify", "mindlin", "--out", out.toString())).isEqualTo(ExitCode.OK.number());
        assertThat(out.resolve("certificate.txt"))
                .content()
                .contains("Passed: all 10 checks.", "passivity", "ns a contact and step", "one row at a time");
        assertThat(out.resolve("certificate.json"))
                .content()
                .contains("\"name\": \"mindlin\"", "\"passed\": true", "\"nanoseconds_per_contact\": ");
        assertThat(out.resolve("certificate.html"))
                .content()
                .contains("<svg", "Oblique impact", "overlap, µm", "published")
                .doesNotContain("http", "NaN", "src=");
    }

    @Test
    void fieldsAndElementsAreTriedToo() {
        assertThat(program.run("certify", "gravity", "--set", "z=-9.81 m/s2")).isEqualTo(ExitCode.OK.number());
    }

    @Test
    void unknownPluginsAndParametersAreRefused() {
        assertThat(program.run("certify", "hertzz")).isEqualTo(ExitCode.PLUGIN.number());
        assertThat(program.run("certify", "hertz", "--set", "softness=3")).isEqualTo(ExitCode.USAGE.number());
        assertThat(program.run("certify", "elastic-plastic", "--set", "damping_ratio=7"))
                .isEqualTo(ExitCode.USAGE.number());
    }
}
