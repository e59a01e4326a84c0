// SPDX-License-Identifier: Apache-2.0
package reedling.output;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class RunRecordTest {

    @TempDir
    Path folder;

    @Test
    void textIsJsonInTheOrderOfSetting() {
        RunRecord record = new RunRecord()
                .set("program version", "0.1.0")
                .set("seed", 42L)
                .set("end time [s]", 0.5)
                .set("ledger drift", Double.NaN)
                .set("finished", false)
                .set("plugins", List.of("hertz", "gravity"))
                .set("machine", Map.of("cores", 2))
                .set("none", Map.of())
                .set("seed", 43L);
        assertThat(record.text()).isEqualTo("""
            {
              "program version": "0.1.0",
              "seed": 43,
              "end time [s]": 0.5,
              "ledger drift": null,
              "finished": false,
              "plugins": ["hertz", "gravity"],
              "machine": {
                "cores": 2
              },
              "none": {}
            }
            """);
    }

    @Test
    void everyCharacterThatCouldBreakTextIsEscaped() {
        assertThat(JsonText.of("a\"b\\c\n\r\t\u0001</script>ü"))
                .isEqualTo("\"a\\\"b\\\\c\\n\\r\\t\\u0001\\u003c/script>ü\"\n");
    }

    @Test
    void otherTypesAreRefused() {
        assertThatThrownBy(() -> JsonText.of(new Object())).isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void savedTextIsTheOneOfTheMomentItWasTaken() throws IOException {
        RunRecord record = new RunRecord().set("steps", 1);
        WriteQueue.Job job = record.saving(folder.resolve("run.json"));
        record.set("steps", 2);
        job.run();
        assertThat(folder.resolve("run.json")).hasContent("{\n  \"steps\": 1\n}\n");
    }
}
