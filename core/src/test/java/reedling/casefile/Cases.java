// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.plugin.Parameter;
import reedling.plugin.Provider;
import reedling.unit.Dimension;

/** The small case with one thing changed, and a few providers to name in it. */
final class Cases {

    private record Named(String name, List<Parameter> parameters) implements Provider {

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
    }

    private Cases() {}

    static List<? extends Provider> providers(ProviderKind kind) {
        return switch (kind) {
            case NORMAL -> List.of(new Named("hertz", List.of()), new Named("linear", List.of(obligatory())));
            case TANGENTIAL -> List.of(new Named("mindlin", List.of()));
            case ROLLING -> List.of(new Named("elastic-plastic", List.of()));
            case ADHESION, NEAR_FIELD, TWISTING -> List.of();
            case FIELD -> List.of(new Named("gravity", List.of(gravity())), new Named("drag", List.of()));
            case ELEMENT -> List.of(new Named("beam", List.of(shear())));
        };
    }

    private static Parameter obligatory() {
        return new Parameter("stiffness", Dimension.STIFFNESS, 1, 1e9, Double.NaN, "Force over overlap.");
    }

    private static Parameter gravity() {
        return new Parameter("acceleration", Dimension.ACCELERATION, 0, 100, 9.81, "Downwards.");
    }

    private static Parameter shear() {
        return new Parameter("shear", Dimension.NUMBER, 0, 1, 0.9, "Shear factor.");
    }

    static String small() {
        try (InputStream stream = Cases.class.getResourceAsStream("small.toml")) {
            return new String(Objects.requireNonNull(stream).readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The small case with every occurrence of a text, which must occur, replaced. */
    static String with(String old, String replacement) {
        assertThat(small()).contains(old);
        return small().replace(old, replacement);
    }

    static CaseReading read(String text, String... assignments) {
        return CaseFile.read(text, "deck.toml", List.of(assignments), Cases::providers);
    }

    /** Findings of a wrong case, as printed. */
    static List<String> findings(String text, String... assignments) {
        ReedlingException thrown = catchThrowableOfType(ReedlingException.class, () -> read(text, assignments));
        assertThat(thrown).as("the case should be refused").isNotNull();
        assertThat(thrown.exitCode()).isEqualTo(ExitCode.CASE);
        return thrown.findings().stream().map(Finding::toString).toList();
    }

    static List<String> cautions(String text) {
        return read(text).cautions().stream().map(Finding::toString).toList();
    }
}
