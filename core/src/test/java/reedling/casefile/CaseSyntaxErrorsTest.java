// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class CaseSyntaxErrorsTest {

    @Test
    void malformedTomlIsPlacedAndNothingIsCalledMissing() {
        assertThat(Cases.findings(Cases.with("diameter = \"4 mm\"", "diameter = 4 mm")))
                .containsExactly("deck.toml:27:14 TOML syntax: is broken by 'mm', expected a newline or end-of-input. "
                        + "Text, and values with a unit, stand in double quotes, like \"7 mm\".");
    }

    @Test
    void otherMistakesAreStillFoundInMalformedToml() {
        String text = Cases.with("diameter = \"4 mm\"", "diameter = 4 mm").replace("tension", "tensoin");
        assertThat(Cases.findings(text)).hasSize(2).last().asString().contains("Did you mean tension?");
    }

    @Test
    void duplicateNamesPointAtTheFirst() {
        assertThat(Cases.findings(Cases.with("[materials.steel]", "[materials.grain]")))
                .containsExactly("deck.toml:9:1 materials.grain: is written twice, expected each name once. "
                        + "The first stands at deck.toml:4:1; rename or remove one of them.");
        assertThat(Cases.findings(Cases.with("density = 7850", "density = 7850\ndensity = 7800")))
                .containsExactly("deck.toml:11:1 density: is written twice, expected each name once. "
                        + "The first stands at deck.toml:10:1; rename or remove one of them.");
    }

    @Test
    void numbersBeyondTomlAreNamed() {
        assertThat(Cases.findings(Cases.with("count = 100", "count = 99999999999999999999")))
                .containsExactly("deck.toml:37:9 TOML syntax: is broken: Integer is too large, expected TOML 1.0. "
                        + "Text, and values with a unit, stand in double quotes, like \"7 mm\".");
    }

    @Test
    void anEmptyFileNamesAllThatMustBeThere() {
        assertThat(Cases.findings(""))
                .extracting(finding -> finding.split(" ")[1])
                .containsExactly("case:", "materials:", "pairs:", "lots:", "feeds:", "bounds:", "output:");
    }

    @Test
    void datesAndListsInOddPlacesAreRefused() {
        assertThat(Cases.findings(Cases.with("\"4 mm\"", "1979-05-27")))
                .containsExactly("deck.toml:27:1 lots.small.diameter: is 1979-05-27, expected a length (m), "
                        + "1 µm ≤ value ≤ 1 m. Write a number in m, or text with a unit.");
        assertThat(Cases.findings(Cases.with("[bounds]", "[[bounds]]")))
                .containsExactly(
                        "deck.toml:126:1 bounds: is a list of 1, expected a table. " + "Write it as a table of keys.");
    }
}
