// SPDX-License-Identifier: Apache-2.0
package reedling.output;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import reedling.error.ReedlingException;

class TableTest {

    private static final List<Table.Column> COLUMNS = List.of(
            new Table.Column("mass on deck", "kg"),
            new Table.Column("passed, all", ""),
            new Table.Column("größe", "m"));
    private static final String HEADER = "time [s],mass on deck [kg],\"passed, all\",größe [m]\n";

    @TempDir
    Path folder;

    @Test
    void unitsStandInTheHeaderAndNumbersReadBackExactly() throws IOException {
        Path file = folder.resolve("deck.csv");
        try (Table table = Table.create(file, COLUMNS)) {
            table.append(0, 0.1 + 0.2, 12, Double.NaN);
            table.append(1e-7, -0.0, 1e300, Double.POSITIVE_INFINITY);
        }
        assertThat(file).hasContent(HEADER + "0,0.30000000000000004,12,\n1.0E-7,-0.0,1.0E300,Infinity\n");
        assertThat(0.30000000000000004).isEqualTo(0.1 + 0.2);
    }

    @Test
    void rowsReachTheFileOnlyWithTheJobThatTookThem() throws IOException {
        Path file = folder.resolve("deck.csv");
        try (Table table = Table.create(file, COLUMNS)) {
            table.append(1, 1, 1, 1);
            WriteQueue.Job job = table.takeRows();
            table.append(2, 2, 2, 2);
            assertThat(file).hasContent(HEADER);
            job.run();
            assertThat(file).hasContent(HEADER + "1,1,1,1\n");
        }
        assertThat(file).hasContent(HEADER + "1,1,1,1\n2,2,2,2\n");
    }

    @ParameterizedTest
    @CsvSource({"0.25, 2", "0.2, 2", "0.19, 1", "0, 0", "9, 3"})
    void resumeCutsRowsLaterThanItsTime(double resumeTime, int kept) throws IOException {
        Path file = folder.resolve("deck.csv");
        try (Table table = Table.create(file, COLUMNS)) {
            for (int row = 1; row <= 3; row++) {
                table.append(row / 10.0, row, row, row);
            }
        }
        try (Table table = Table.resume(file, COLUMNS, resumeTime)) {
            table.append(10, 0, 0, 0);
        }
        List<String> lines = Files.readAllLines(file);
        assertThat(lines).hasSize(kept + 2);
        assertThat(lines.getLast()).isEqualTo("10,0,0,0");
    }

    @Test
    void resumeCutsARowTornByACrashInAnyPlace() throws IOException {
        String row = "0.25,1,2,3";
        for (int length = 1; length <= row.length(); length++) {
            Path file = folder.resolve("deck" + length + ".csv");
            try (Table table = Table.create(file, COLUMNS)) {
                table.append(0.125, 1, 1, 1);
            }
            Files.writeString(file, row.substring(0, length), StandardOpenOption.APPEND);
            Table.resume(file, COLUMNS, 5).close();
            assertThat(file).hasContent(HEADER + "0.125,1,1,1\n");
        }
    }

    @Test
    void longTableIsCutAtTheRightRow() throws IOException {
        Path file = folder.resolve("deck.csv");
        try (Table table = Table.create(file, COLUMNS)) {
            for (int row = 0; row < 20_000; row++) {
                table.append(row, row, row, row);
            }
        }
        Table.resume(file, COLUMNS, 15_000).close();
        assertThat(Files.readAllLines(file)).hasSize(15_002).last().isEqualTo("15000,15000,15000,15000");
    }

    @Test
    void otherColumnsAreRefusedOnResume() throws IOException {
        Path file = folder.resolve("deck.csv");
        Table.create(file, COLUMNS.subList(0, 1)).close();
        assertThatThrownBy(() -> Table.resume(file, COLUMNS, 0))
                .isInstanceOf(ReedlingException.class)
                .hasMessageContaining("is \"time [s],mass on deck [kg]\"");
    }

    @Test
    void rowOfAnotherWidthIsAFaultOfTheProgram() throws IOException {
        try (Table table = Table.create(folder.resolve("deck.csv"), COLUMNS)) {
            assertThatThrownBy(() -> table.append(0, 1)).isInstanceOf(IllegalArgumentException.class);
        }
    }
}
