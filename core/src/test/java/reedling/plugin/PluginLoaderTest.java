// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;

class PluginLoaderTest {

    private static final PluginService<Greeting> GREETING = new PluginService<>("greeting", Greeting.class);

    @TempDir
    private Path folder;

    private PluginCatalogue load() {
        return PluginLoader.load(List.of(GREETING), Optional.of(folder));
    }

    private ReedlingException failure() {
        ReedlingException failure = catchThrowableOfType(ReedlingException.class, this::load);
        assertThat(failure).isNotNull();
        assertThat(failure.exitCode()).isEqualTo(ExitCode.PLUGIN);
        return failure;
    }

    private static String text(ReedlingException failure) {
        return failure.findings().stream().map(Finding::toString).collect(Collectors.joining("\n"));
    }

    @Test
    void classPathPluginsAreFoundWithoutAFolder() {
        PluginCatalogue catalogue = PluginLoader.load(List.of(GREETING), Optional.empty());
        assertThat(catalogue.names(GREETING)).containsExactly("plain-hello");
        assertThat(catalogue.find(GREETING, "plain-hello")).containsInstanceOf(ClassPathGreeting.class);
    }

    @Test
    void jarOfTheFolderIsFoundAndDescribed() throws IOException {
        Path jar = PluginJar.greeting("Loud", "loud-hello", "API_LEVEL").write(folder.resolve("loud.jar"));
        PluginCatalogue catalogue = load();
        assertThat(catalogue.require(GREETING, "loud-hello", "test").greet()).isEqualTo("greetings");
        assertThat(catalogue.descriptions())
                .extracting(PluginDescription::name)
                .containsExactly("loud-hello", "plain-hello");
        PluginDescription loud = catalogue.descriptions().getFirst();
        assertThat(loud)
                .isEqualTo(new PluginDescription(
                        "loud-hello",
                        "greeting",
                        jar.toString(),
                        "3.1",
                        "Greets.",
                        "common practice, no source",
                        List.of()));
    }

    @Test
    void twoProvidersOfOneNameAreRefusedNamingBothJars() throws IOException {
        Path first = PluginJar.greeting("One", "twin", "API_LEVEL").write(folder.resolve("a-first.jar"));
        Path second = PluginJar.greeting("Two", "twin", "API_LEVEL").write(folder.resolve("b-second.jar"));
        assertThat(text(failure())).contains("twin", first.toString(), second.toString());
    }

    @Test
    void folderCannotReplaceAClassPathPlugin() throws IOException {
        PluginJar.greeting("One", "plain-hello", "API_LEVEL").write(folder.resolve("a.jar"));
        assertThat(text(failure())).contains("plain-hello", "already provided by", "test-classes");
    }

    @Test
    void otherApiLevelIsRefusedWithBothLevels() throws IOException {
        Path jar = PluginJar.greeting("Old", "old-hello", "API_LEVEL + 6").write(folder.resolve("old.jar"));
        assertThat(failure().findings()).singleElement().satisfies(finding -> {
            assertThat(finding.where()).isEqualTo(jar.toString());
            assertThat(finding.got()).isEqualTo("7");
            assertThat(finding.expected()).isEqualTo("1");
        });
    }

    @Test
    void namesOfTheWrongFormAreRefused() throws IOException {
        PluginJar.greeting("Shout", "Loud_Hello", "API_LEVEL").write(folder.resolve("a.jar"));
        PluginJar.greeting("Dash", "loud-", "API_LEVEL").write(folder.resolve("b.jar"));
        assertThat(failure().findings()).extracting(Finding::got).containsExactly("\"Loud_Hello\"", "\"loud-\"");
    }

    @Test
    void throwingConstructorIsReportedWithJarAndReason() throws IOException {
        Path jar = PluginJar.greeting("Broken", "broken", "API_LEVEL")
                .with("public Broken() { throw new IllegalStateException(\"no licence file\"); }")
                .write(folder.resolve("broken.jar"));
        assertThat(text(failure())).contains(jar.toString(), "site.Broken", "no licence file");
    }

    @Test
    void missingClassIsReportedWithJar() throws IOException {
        Path jar = new PluginJar()
                .provider("site.Present", "package site; public class Present {}")
                .write(folder.resolve("wrong.jar"));
        assertThat(text(failure())).contains(jar.toString(), "site.Present");
    }

    @Test
    void missingLibraryIsReportedWithJarAndRemedy() throws IOException {
        Path jar = PluginJar.greeting("Needy", "needy", "API_LEVEL")
                .with("{ lib.Library.load(); }")
                .source("lib.Library", "package lib; public class Library { public static void load() {} }")
                .leavingOut("lib.Library")
                .write(folder.resolve("needy.jar"));
        assertThat(text(failure())).contains(jar.toString(), "lib/Library", "inside the plugin's jar");
    }

    @Test
    void fileThatIsNoJarIsReported() throws IOException {
        Path file = Files.writeString(folder.resolve("text.jar"), "not a zip archive");
        assertThat(text(failure())).contains(file.toString(), "not a readable jar");
    }

    @Test
    void jarWithoutPluginsIsReported() throws IOException {
        Path jar = new PluginJar()
                .source("site.Tool", "package site; class Tool {}")
                .write(folder.resolve("tool.jar"));
        assertThat(text(failure())).contains(jar.toString(), "without plugins", "META-INF/services");
    }

    @Test
    void unreadableFolderIsReported() {
        folder = folder.resolve("absent");
        assertThat(text(failure())).contains("absent", "unreadable");
    }

    @Test
    void unsoundParametersAreReported() throws IOException {
        PluginJar.greeting("Odd", "odd", "API_LEVEL").with("""
                        public java.util.List<reedling.plugin.Parameter> parameters() {
                            var unit = reedling.unit.Dimension.LENGTH;
                            return java.util.List.of(
                                new reedling.plugin.Parameter("Wide Gap", unit, 0, 1, 0.5, "x"),
                                new reedling.plugin.Parameter("gap", unit, 0, 1, 2, "x"),
                                new reedling.plugin.Parameter("free_gap", unit, 0, 1, Double.NaN, "x"));
                        }
                        """).write(folder.resolve("odd.jar"));
        assertThat(failure().findings()).extracting(Finding::got).containsExactly("\"Wide Gap\"", "2.0 m");
    }

    @Test
    void allFaultsAreReportedAtOnce() throws IOException {
        Files.writeString(folder.resolve("a.jar"), "not a zip archive");
        PluginJar.greeting("Old", "old-hello", "9").write(folder.resolve("b.jar"));
        PluginJar.greeting("Shout", "LOUD", "API_LEVEL").write(folder.resolve("c.jar"));
        assertThat(failure().findings()).hasSize(3);
    }

    @Test
    void eachJarSeesItsOwnVersionOfALibrary() throws IOException {
        for (String version : List.of("1", "2")) {
            PluginJar.greeting("Versioned", "versioned-" + version, "API_LEVEL")
                    .with("{ reedlingLibrary = lib.Library.VERSION.toString(); } String reedlingLibrary;"
                            + " @Override public String toString() { return reedlingLibrary; }")
                    .source(
                            "lib.Library",
                            "package lib; public class Library { public static final Object VERSION = " + version
                                    + "; }")
                    .write(folder.resolve("v" + version + ".jar"));
        }
        PluginCatalogue catalogue = load();
        assertThat(catalogue.require(GREETING, "versioned-1", "test")).hasToString("1");
        assertThat(catalogue.require(GREETING, "versioned-2", "test")).hasToString("2");
    }

    @Test
    void classOfTheJarComesBeforeOneOfTheSameNameInTheProgram() throws IOException {
        PluginJar.greeting("Own", "own-library", "API_LEVEL")
                .with("@Override public String toString() { return org.assertj.core.api.Condition.ORIGIN; }")
                .source(
                        "org.assertj.core.api.Condition",
                        "package org.assertj.core.api; public class Condition { public static String ORIGIN ="
                                + " new String(\"jar\"); }")
                .write(folder.resolve("own.jar"));
        assertThat(load().require(GREETING, "own-library", "test")).hasToString("jar");
    }

    @Test
    void unknownNameListsTheAlternativesAndTheNearest() {
        PluginCatalogue catalogue = PluginLoader.load(List.of(GREETING), Optional.empty());
        ReedlingException failure = catchThrowableOfType(
                ReedlingException.class, () -> catalogue.require(GREETING, "plane-helo", "deck.toml:14"));
        assertThat(failure.exitCode()).isEqualTo(ExitCode.PLUGIN);
        assertThat(failure)
                .hasMessage("deck.toml:14 greeting plugin: is \"plane-helo\", expected plain-hello."
                        + " Did you mean plain-hello?");
    }
}
