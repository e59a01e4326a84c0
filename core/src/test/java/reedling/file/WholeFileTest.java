// SPDX-License-Identifier: Apache-2.0
package reedling.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WholeFileTest {

    @TempDir
    Path folder;

    @Test
    void failingWriteLeavesNoFile() {
        assertThatThrownBy(() -> WholeFile.write(folder.resolve("a"), channel -> {
                    WholeFile.writeFully(channel, ByteBuffer.wrap(new byte[100]));
                    throw new IOException("disk full");
                }))
                .hasMessage("disk full");
        assertThat(folder).isEmptyDirectory();
    }

    @Test
    void failingWriteKeepsTheOldContent() throws IOException {
        Path file = folder.resolve("a");
        WholeFile.writeText(file, "old");
        assertThatThrownBy(() -> WholeFile.write(file, channel -> {
                    throw new IllegalStateException("bad content");
                }))
                .isInstanceOf(IllegalStateException.class);
        assertThat(folder).isDirectoryContaining(path -> path.equals(file));
        assertThat(file).hasContent("old");
        assertThat(folder.toFile().list()).containsExactly("a");
    }

    @Test
    void targetIsUntouchedWhileTheNewContentIsBeingWritten() throws IOException {
        Path file = folder.resolve("a");
        WholeFile.writeText(file, "old");
        WholeFile.write(file, channel -> {
            WholeFile.writeFully(channel, ByteBuffer.wrap("new".getBytes()));
            assertThat(file).hasContent("old");
        });
        assertThat(file).hasContent("new");
    }

    @Test
    void leftoversOfACrashAreRemovedAndNothingElse() throws IOException {
        Files.writeString(folder.resolve(".run.json.part"), "{");
        Files.writeString(folder.resolve("run.json"), "{}");
        WholeFile.removeLeftovers(folder);
        assertThat(folder.toFile().list()).containsExactly("run.json");
    }
}
