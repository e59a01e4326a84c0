// SPDX-License-Identifier: Apache-2.0
package reedling;

import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.io.IOException;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.jspecify.annotations.NullMarked;
import org.junit.jupiter.api.Test;

/** Core's packages form the rows of packages.txt, and each imports lower rows only. */
class ArchitectureTest {

    private static final JavaClasses CORE = new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("reedling");

    @Test
    void everyPackageIsListedWithARow() throws IOException {
        assertThat(unlisted(CORE, PackageRows.read())).isEmpty();
        assertThat(CORE.size()).isGreaterThan(20);
    }

    @Test
    void packagesImportLowerRowsOnly() throws IOException {
        assertThat(upwardImports(CORE, PackageRows.read())).isEmpty();
    }

    @Test
    void everyPackageIsNullMarked() {
        assertThat(packagesWithoutNullMark(CORE)).isEmpty();
    }

    /** The rule must be able to fail: with the rows turned upside down the same classes break it. */
    @Test
    void rowsUpsideDownAreNoticed() throws IOException {
        Map<String, Integer> upsideDown = PackageRows.read().entrySet().stream()
                .collect(Collectors.toMap(Map.Entry::getKey, row -> -row.getValue()));
        assertThat(upwardImports(CORE, upsideDown)).anyMatch(line -> line.startsWith("reedling.cli"));
    }

    private static Set<String> unlisted(JavaClasses classes, Map<String, Integer> rows) {
        return classes.stream()
                .map(type -> PackageRows.nameOf(type.getPackageName()))
                .filter(name -> !rows.containsKey(name))
                .collect(Collectors.toCollection(TreeSet::new));
    }

    private static List<String> upwardImports(JavaClasses classes, Map<String, Integer> rows) {
        return classes.stream()
                .flatMap(type -> type.getDirectDependenciesFromSelf().stream())
                .filter(dependency -> isUpward(dependency.getOriginClass(), dependency.getTargetClass(), rows))
                .map(dependency -> dependency.getOriginClass().getName() + " -> "
                        + dependency.getTargetClass().getName())
                .distinct()
                .sorted()
                .toList();
    }

    private static boolean isUpward(JavaClass origin, JavaClass target, Map<String, Integer> rows) {
        JavaClass type = target.getBaseComponentType();
        if (!type.getPackageName().startsWith("reedling")) {
            return false;
        }
        String from = PackageRows.nameOf(origin.getPackageName());
        String to = PackageRows.nameOf(type.getPackageName());
        return !from.equals(to)
                && rows.getOrDefault(to, Integer.MAX_VALUE) >= rows.getOrDefault(from, Integer.MIN_VALUE);
    }

    private static Set<String> packagesWithoutNullMark(JavaClasses classes) {
        return classes.stream()
                .map(JavaClass::getPackage)
                .filter(name -> !name.isAnnotatedWith(NullMarked.class))
                .map(name -> name.getName())
                .collect(Collectors.toCollection(TreeSet::new));
    }
}
