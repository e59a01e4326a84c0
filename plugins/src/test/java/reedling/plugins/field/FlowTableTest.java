// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;

/** Tables of gas velocities: what is read, and what is said of those that cannot be. */
class FlowTableTest {

    @TempDir
    Path folder;

    private String file(String... lines) throws IOException {
        return Files.write(folder.resolve("wind.csv"), List.of(lines)).toString();
    }

    private static List<String> findings(String file) {
        ReedlingException thrown = catchThrowableOfType(ReedlingException.class, () -> FlowTable.read(file));
        assertThat(thrown).as("the table should be refused").isNotNull();
        assertThat(thrown.exitCode()).isEqualTo(ExitCode.CASE);
        return thrown.findings().stream().map(Finding::toString).toList();
    }

    @Test
    void nodesMayStandInAnyOrder() throws IOException {
        TableFlow flow = FlowTable.read(file(
                "# measured behind the fan",
                FlowTable.HEADER,
                "0.1, 0, 0,   2, 0, 0",
                "0,   0, 0.2, 3, 0, 1",
                "",
                "0,   0, 0,   1, 0, 0",
                "0.1, 0, 0.2, 4, 0, 1"));
        double[] out = new double[6];
        flow.at(0.025, 17, 0.05, out);
        assertThat(out).containsExactly(new double[] {1 + 0.25 + 0.5, 0, 0.25, 0, 5, 0}, within(1e-12));
        assertThat(flow.grid().count()).containsExactly(2, 1, 2);
    }

    @Test
    void everyBadLineIsNamed() throws IOException {
        String file = file("x,y,z,u,v,w", "0,0,0,1,0", "0,0,1,1,0,fast", "0,0,2,1,0,NaN");
        assertThat(findings(file))
                .hasSize(4)
                .allMatch(text -> text.contains("wind.csv"))
                .anyMatch(text -> text.contains("line 1: is \"x,y,z,u,v,w\", expected " + FlowTable.HEADER))
                .anyMatch(text -> text.contains("line 2: is \"0,0,0,1,0\", expected six finite numbers"))
                .anyMatch(text -> text.contains("line 3"))
                .anyMatch(text -> text.contains("line 4"));
    }

    @Test
    void gridMustBeRegularAndWhole() throws IOException {
        assertThat(findings(file(FlowTable.HEADER, "0,0,0,1,0,0", "1,0,0,1,0,0", "3,0,0,1,0,0")))
                .singleElement()
                .asString()
                .contains("coordinate x: is 1.0 m, expected 1.5 m in steps of 1.5 m");
        assertThat(findings(file(FlowTable.HEADER, "0,0,0,1,0,0", "1,0,0,1,0,0", "0,1,0,1,0,0")))
                .singleElement()
                .asString()
                .contains("nodes: is 3 nodes, expected 4 for a grid of 2 x 2 x 1");
        assertThat(findings(file(FlowTable.HEADER, "0,0,0,1,0,0", "1,0,0,1,0,0", "0,1,0,1,0,0", "0,1,0,1,0,0")))
                .singleElement()
                .asString()
                .contains("given twice");
        assertThat(findings(file(FlowTable.HEADER))).singleElement().asString().contains("a line for each node");
        assertThat(findings(folder.resolve("none.csv").toString()))
                .singleElement()
                .asString()
                .contains("unreadable");
    }
}
