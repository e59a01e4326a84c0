// SPDX-License-Identifier: Apache-2.0
package reedling.vtk;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaPackage;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.NullMarked;
import org.junit.jupiter.api.Test;

/** Snapshot writers see the output contract and what that needs, nothing else of core. */
class ArchitectureTest {

    private static Stream<String> forbidden() throws IOException {
        Set<String> seen = Set.of("output", "error", "file", "plugin", "unit");
        return corePackages().filter(name -> !seen.contains(name));
    }

    private static final JavaClasses MODULE = new ClassFileImporter().importPath(Path.of("target", "classes"));

    @Test
    void moduleImportsOnlyWhatItMaySee() throws IOException {
        String[] forbidden = forbidden().map(name -> "reedling." + name + "..").toArray(String[]::new);
        assertThat(forbidden).isNotEmpty();
        noClasses()
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(forbidden)
                .allowEmptyShould(true)
                .check(MODULE);
    }

    /** One package in two jars would let each reach the other's package-private parts. */
    @Test
    void moduleHasNoPackageOfCore() throws IOException {
        List<String> core = corePackages().map(name -> "reedling." + name).toList();
        assertThat(packages()).extracting(JavaPackage::getName).doesNotContainAnyElementsOf(core);
    }

    @Test
    void everyPackageIsNullMarked() {
        assertThat(packages()).allMatch(name -> name.isAnnotatedWith(NullMarked.class));
    }

    private static Set<JavaPackage> packages() {
        return MODULE.stream().map(type -> type.getPackage()).collect(Collectors.toSet());
    }

    private static Stream<String> corePackages() throws IOException {
        try (InputStream list = ArchitectureTest.class.getResourceAsStream("/reedling/packages.txt")) {
            assertThat(list).as("core's list of packages").isNotNull();
            return new String(list.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.isBlank() && !line.startsWith("#"))
                    .map(line -> line.trim().split("\\s+")[1]);
        }
    }
}
