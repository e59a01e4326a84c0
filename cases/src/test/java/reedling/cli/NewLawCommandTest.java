// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.error.ExitCode;

/** What the command writes; {@code ci/new-law} builds and certifies it. */
class NewLawCommandTest {

    @TempDir
    private Path folder;

    private Program program;

    @BeforeEach
    void program() {
        program = new Program(folder);
    }

    @Test
    void projectIsNamedAfterItsFolderAndHoldsTheProgram() throws IOException {
        Path project = folder.resolve("soft-shell");
        assertThat(program.run("new-law", project.toString())).isEqualTo(ExitCode.OK.number());
        assertThat(project.resolve("src/main/java/site/laws/SoftShellProvider.java"))
                .content()
                .contains("class SoftShellProvider", "return \"soft-shell\"");
        assertThat(project.resolve("src/main/resources/META-INF/services/reedling.contact.ContactLawProvider"))
                .content()
                .isEqualTo("site.laws.SoftShellProvider\n");
        try (Stream<Path> files = Files.walk(project)) {
            List<Path> texts = files.filter(file -> file.toString().matches(".*\\.(java|md|xml)"))
                    .toList();
            assertThat(texts)
                    .hasSizeGreaterThanOrEqualTo(6)
                    .allSatisfy(file -> assertThat(file).content().doesNotContainPattern("@[A-Za-z]+@"));
        }
        String pom = Files.readString(project.resolve("pom.xml"));
        Path everything = project.resolve("program/org/reedling/program/everything");
        try (Stream<Path> versions = Files.list(everything)) {
            Path version = versions.findFirst().orElseThrow();
            assertThat(pom).contains("<version>" + version.getFileName() + "</version>");
            assertThat(version.resolve("everything-" + version.getFileName() + ".pom"))
                    .content()
                    .contains("<packaging>pom</packaging>", "picocli");
        }
    }

    @Test
    void sameProgramGetsTheSameVersions() throws IOException {
        Path first = folder.resolve("one-law");
        Path second = folder.resolve("other-law");
        program.run("new-law", first.toString());
        program.run("new-law", second.toString());
        assertThat(files(first.resolve("program"))).hasSizeGreaterThan(10).isEqualTo(files(second.resolve("program")));
    }

    private static List<String> files(Path folder) throws IOException {
        try (Stream<Path> files = Files.walk(folder)) {
            return files.map(file -> folder.relativize(file).toString())
                    .sorted()
                    .toList();
        }
    }

    @Test
    void usedFoldersAndWrongNamesAreRefused() throws IOException {
        Files.writeString(folder.resolve("mine.txt"), "mine");
        assertThat(program.run("new-law", folder.toString(), "--name", "soft-shell"))
                .isEqualTo(ExitCode.OUTPUT.number());
        assertThat(program.run("new-law", folder.resolve("x").toString(), "--name", "Soft_Shell"))
                .isEqualTo(ExitCode.USAGE.number());
        assertThat(program.err()).contains("Soft_Shell", "kebab-case");
        assertThat(folder.resolve("x")).doesNotExist();
    }
}
