// SPDX-License-Identifier: Apache-2.0
package reedling.unit;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

class SpellingTest {

    private static final List<String> WORDS = List.of("density", "diameter", "deviation", "max", "min");

    @Test
    void findsTheNearestWord() {
        assertThat(Spelling.nearest("desnity", WORDS)).contains("density");
        assertThat(Spelling.nearest("diametre", WORDS)).contains("diameter");
        assertThat(Spelling.nearest("mux", WORDS)).contains("max");
        assertThat(Spelling.nearest("DENSITY", WORDS)).contains("density");
    }

    @Test
    void suggestsNothingWhenAllAreFar() {
        assertThat(Spelling.nearest("colour", WORDS)).isEmpty();
        assertThat(Spelling.nearest("x", WORDS)).isEmpty();
    }

    @Test
    void distanceCountsEdits() {
        assertThat(Spelling.distance("kitten", "sitting")).isEqualTo(3);
        assertThat(Spelling.distance("ab", "ba")).isEqualTo(1);
        assertThat(Spelling.distance("", "abc")).isEqualTo(3);
        assertThat(Spelling.distance("kpa", "kPa")).isEqualTo(0.1);
    }
}
