// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.tomlj.Toml;

/** Schema and key reference come from the declarations, so that both hold every key that validation knows. */
class CaseDocumentsTest {

    @Test
    void referenceListsEveryKeyWithRangeAndDefault() {
        String reference = CaseFile.keyReference();
        assertThat(reference)
                .contains("## `[materials.NAME]`")
                .contains("| `poisson_ratio` | a plain number, 0 ≤ value < 0.5 | required | Lateral contraction over "
                        + "extension. |")
                .contains("## `[feeds.NAME] with kind = \"rain\" or \"jet\"`")
                .contains("## `[feeds.NAME.region] with shape = \"disc\"`")
                .contains("## `[lots.NAME.diameter] with distribution = \"uniform\"`")
                .contains("## `[lots.NAME.diameter] with distribution = \"sieve-table\"`")
                .contains("## `[[lots.NAME.diameter.sieves]]`")
                .contains("| `basis` | one of mass, number | required |")
                .contains("## `[walls.NAME] with shape = \"cone\"`")
                .contains("## `[probes.NAME] with kind = \"heap\"`")
                .contains("| `flank_to` | a plain number, 0 ≤ value ≤ 1 | 0.8 |")
                .contains("## `[probes.NAME] with kind = \"layer-waves\"`")
                .contains("## `[[pairs]]`")
                .contains("| `rigid` | true or false | false |")
                .contains("| `element` | the name of an element type");
    }

    @Test
    void everyKeyOfTheShippedVocabularyStandsInBothDocuments() {
        String schema = CaseFile.schema();
        String reference = CaseFile.keyReference();
        for (List<String> path : Toml.parse(Cases.small()).dottedKeySet().stream()
                .map(Toml::parseDottedKey)
                .toList()) {
            String key = path.getLast();
            boolean chosenByUser =
                    List.of("small", "large", "acceleration", "shear", "law").contains(key);
            if (!chosenByUser && !path.contains("element")) {
                assertThat(schema).contains("\"" + key + "\": {");
                boolean word = List.of("kind", "shape", "distribution").contains(key);
                assertThat(reference).contains(word ? "with " + key + " = " : "| `" + key + "` |");
            }
        }
    }

    /** On one line JSON differs from TOML only in its colons, so that the TOML reader can tell if it is well formed. */
    @Test
    void schemaIsWellFormed() {
        String schema = CaseFile.schema();
        StringBuilder toml = new StringBuilder("schema = ");
        boolean quoted = false;
        for (int k = 0; k < schema.length(); k++) {
            char sign = schema.charAt(k);
            quoted ^= sign == '"' && schema.charAt(k - 1) != '\\';
            toml.append(sign == ':' && !quoted ? '=' : sign);
        }
        // JSON and TOML share text, numbers, flags and lists
        assertThat(Toml.parse(toml.toString().replaceAll("\\s*\\n\\s*", " ")).errors())
                .isEmpty();
        assertThat(schema).startsWith("{\n  \"$schema\": \"https://json-schema.org/draft/2020-12/schema\"");
        assertThat(schema).contains("\"const\": \"packed-block\"").contains("\"exclusiveMaximum\": 0.5");
    }
}
