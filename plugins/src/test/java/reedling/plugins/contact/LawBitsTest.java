// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Eight lanes and plain loops of every contact law give the same bits; each width runs in a virtual machine of its own. */
@Tag("conservation")
class LawBitsTest {

    @Test
    void lanesDoNotChangeABitOfAnyLaw() throws IOException, InterruptedException {
        List<String> plain = digests(1);
        assertThat(plain).hasSizeGreaterThan(8);
        assertThat(digests(8)).isEqualTo(plain);
    }

    private static List<String> digests(int lanes) throws IOException, InterruptedException {
        Process process = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "--add-modules",
                        "jdk.incubator.vector",
                        "-XX:+UseSerialGC",
                        "-Dreedling.lanes=" + lanes,
                        "-cp",
                        System.getProperty("java.class.path"),
                        LawBits.class.getName())
                .redirectError(ProcessBuilder.Redirect.DISCARD)
                .start();
        String printed = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8).strip();
        assertThat(process.waitFor()).isZero();
        return printed.lines().toList();
    }
}
