// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.error.Finding;
import reedling.error.ReedlingException;

/** Whatever is done to a case, it is read or refused with findings; nothing else is ever thrown. */
class MutilatedCaseTest {

    private static final List<String> VALUES = List.of(
            "true",
            "-1",
            "0",
            "1e300",
            "inf",
            "\"\"",
            "\"7 mm\"",
            "[]",
            "[1, 2, 3]",
            "[[1], [2]]",
            "{}",
            "{x = 1}",
            "1979-05-27T07:32:00Z",
            "\"steel\"",
            "[{}, {}]",
            "[\"grain\", 3]",
            "'");

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void everyMutilationIsRefusedWithFindingsOrRead(long seed) {
        Random random = new Random(seed);
        int refused = 0;
        for (int run = 0; run < 100; run++) {
            List<String> lines = new ArrayList<>(Cases.small().lines().toList());
            for (int change = random.nextInt(3); change >= 0; change--) {
                mutilate(lines, random);
            }
            refused += refusal(String.join("\n", lines), "seed " + seed + ", run " + run);
        }
        assertThat(refused).isGreaterThan(50);
    }

    private static void mutilate(List<String> lines, Random random) {
        int at = random.nextInt(lines.size());
        String line = lines.get(at);
        switch (random.nextInt(5)) {
            case 0 -> lines.remove(at);
            case 1 -> lines.add(at, lines.get(random.nextInt(lines.size())));
            case 2 -> lines.set(at, line.substring(0, random.nextInt(line.length() + 1)));
            case 3 -> lines.set(at, line.replaceAll("=.*", "= " + VALUES.get(random.nextInt(VALUES.size()))));
            default -> lines.set(at, line + "  " + (char) (' ' + random.nextInt(95)));
        }
    }

    private static int refusal(String text, String label) {
        try {
            Cases.read(text);
            return 0;
        } catch (ReedlingException expected) {
            assertThat(expected.findings()).as(label).isNotEmpty();
            for (Finding finding : expected.findings()) {
                assertThat(finding.where()).as(label).startsWith("deck.toml:");
                assertThat(finding.expected()).as(label + " " + finding).isNotEmpty();
                assertThat(finding.remedy()).as(label + " " + finding).isNotEmpty();
            }
            return 1;
        }
    }
}
