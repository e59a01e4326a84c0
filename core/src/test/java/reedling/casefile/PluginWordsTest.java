// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;
import reedling.plugin.Provider;

/** Parameters of plugins that are not numbers: choices, files and lots. */
class PluginWordsTest {

    @TempDir
    Path folder;

    private static final class Breeze implements Provider {

        @Override
        public String name() {
            return "breeze";
        }

        @Override
        public int apiLevel() {
            return API_LEVEL;
        }

        @Override
        public String summary() {
            return "for tests";
        }

        @Override
        public String source() {
            return "none";
        }

        @Override
        public List<Parameter> parameters() {
            return List.of(
                    Parameter.choice("mood", List.of("mild", "gusty"), "mild", "How it blows."),
                    Parameter.file("chart", "Where it blows."),
                    Parameter.lot("lot", "Whom it blows at."));
        }
    }

    private static List<? extends Provider> providers(ProviderKind kind) {
        return kind == ProviderKind.FIELD ? List.of(new Breeze()) : Cases.providers(kind);
    }

    private static String with(String keys) {
        return Cases.with("law = \"gravity\"\nacceleration = 9.8", "law = \"breeze\"\n" + keys);
    }

    private static ParameterValues values(CaseReading reading) {
        return Objects.requireNonNull(reading.specification().fields().get("gravity"))
                .parameters();
    }

    private static ParameterValues values(String keys) {
        return values(CaseFile.read(with(keys), "deck.toml", List.of(), PluginWordsTest::providers));
    }

    private static List<String> findings(String keys) {
        ReedlingException thrown = catchThrowableOfType(ReedlingException.class, () -> values(keys));
        assertThat(thrown).as("the case should be refused").isNotNull();
        return thrown.findings().stream().map(Finding::toString).toList();
    }

    @Test
    void wordsReachThePlugin() {
        ParameterValues values = values("mood = \"gusty\"\nlot = \"large\"");
        assertThat(values.word("mood")).isEqualTo("gusty");
        assertThat(values.word("chart")).isEmpty();
        assertThat(values.get("lot")).isEqualTo(1);
    }

    @Test
    void whatIsLeftOutTakesItsDefault() {
        ParameterValues values = values("");
        assertThat(values.word("mood")).isEqualTo("mild");
        assertThat(values.get("lot")).isEqualTo(Parameter.ALL_LOTS);
    }

    @Test
    void wrongWordsAreAllNamed() {
        assertThat(findings("mood = \"gussty\"\nlot = \"larg\"\nchart = 7"))
                .hasSize(3)
                .anyMatch(text -> text.contains("expected one of mild, gusty. Did you mean \"gusty\"?"))
                .anyMatch(text -> text.contains("expected one of lots: small, large. Did you mean \"large\"?"))
                .anyMatch(text -> text.contains("fields.gravity.chart: is 7, expected the path of a file"));
    }

    /** A relative path starts at the case file's folder, and the resolved case holds it whole: a resumed run finds it. */
    @Test
    void pathsStartAtTheFolderOfTheCase() throws IOException {
        Path file = Files.writeString(folder.resolve("deck.toml"), with("chart = \"wind/../wind.csv\""));
        CaseReading reading = CaseFile.read(file, List.of(), PluginWordsTest::providers);
        String whole = folder.toAbsolutePath().resolve("wind.csv").toString();
        assertThat(values(reading).word("chart")).isEqualTo(whole);
        assertThat(reading.resolvedText()).contains("chart = \"" + whole + "\"");
        assertThat(values(CaseFile.read(
                                reading.resolvedText(), "elsewhere.toml", List.of(), PluginWordsTest::providers))
                        .word("chart"))
                .isEqualTo(whole);
    }
}
