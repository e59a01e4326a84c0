// SPDX-License-Identifier: Apache-2.0
package reedling.checkpoint;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.error.ReedlingException;

class CheckpointFolderTest {

    @TempDir
    Path folder;

    @Test
    void onlyTheLastTwoAreKept() throws IOException {
        CheckpointFolder checkpoints = CheckpointFolder.create(folder);
        for (int step = 1; step <= 4; step++) {
            checkpoints.write(checkpoint(step));
        }
        assertThat(folder.toFile().list()).containsExactlyInAnyOrder("checkpoint_000003.rck", "checkpoint_000004.rck");
        assertThat(latestStep()).isEqualTo(4);
    }

    @Test
    void damagedNewestFallsBackToThePreviousAndSaysSo() throws IOException {
        CheckpointFolder checkpoints = CheckpointFolder.create(folder);
        checkpoints.write(checkpoint(1));
        Path newest = checkpoints.write(checkpoint(2));
        damage(newest);
        CheckpointFolder.Latest latest = CheckpointFolder.latest(folder);
        try (CheckpointReader reader = latest.reader()) {
            assertThat(reader.header().step()).isEqualTo(1);
        }
        assertThat(latest.passedOver()).singleElement().asString().contains("checkpoint_000002.rck", "damaged");
    }

    @Test
    void damagedFilesAreNeverCountedAmongThoseKept() throws IOException {
        CheckpointFolder checkpoints = CheckpointFolder.create(folder);
        Path first = checkpoints.write(checkpoint(1));
        damage(checkpoints.write(checkpoint(2)));
        CheckpointFolder resumed = CheckpointFolder.resume(folder, first);
        damage(resumed.write(checkpoint(3)));
        assertThat(latestStep()).isEqualTo(1);
        resumed.write(checkpoint(4));
        assertThat(first).doesNotExist();
        assertThat(latestStep()).isEqualTo(4);
    }

    @Test
    void resumedRunStillPrunesTheOlderOnes() throws IOException {
        CheckpointFolder checkpoints = CheckpointFolder.create(folder);
        checkpoints.write(checkpoint(1));
        Path second = checkpoints.write(checkpoint(2));
        CheckpointFolder.resume(folder, second).write(checkpoint(3));
        assertThat(folder.toFile().list()).containsExactlyInAnyOrder("checkpoint_000002.rck", "checkpoint_000003.rck");
    }

    @Test
    void partlyWrittenFileIsNotPickedUp() throws IOException {
        CheckpointFolder.create(folder).write(checkpoint(1));
        Files.write(folder.resolve(".checkpoint_000002.rck.part"), new byte[10]);
        assertThat(latestStep()).isEqualTo(1);
    }

    @Test
    void folderWithoutUsableCheckpointIsRefusedWithEveryFinding() throws IOException {
        assertThatThrownBy(() -> CheckpointFolder.latest(folder)).hasMessageContaining("without a checkpoint");
        CheckpointFolder checkpoints = CheckpointFolder.create(folder);
        damage(checkpoints.write(checkpoint(1)));
        damage(checkpoints.write(checkpoint(2)));
        assertThatThrownBy(() -> CheckpointFolder.latest(folder))
                .isInstanceOfSatisfying(
                        ReedlingException.class,
                        refusal -> assertThat(refusal.findings()).hasSize(2));
    }

    private long latestStep() throws IOException {
        try (CheckpointReader reader = CheckpointFolder.latest(folder).reader()) {
            return reader.header().step();
        }
    }

    private static void damage(Path file) throws IOException {
        byte[] bytes = Files.readAllBytes(file);
        bytes[bytes.length - 1] ^= 1;
        Files.write(file, bytes);
    }

    private static CheckpointWriter checkpoint(long step) throws IOException {
        CheckpointWriter writer =
                new CheckpointWriter(new CheckpointHeader("0.1.0", "digest", step, 0.5 * step, Map.of()));
        writer.section("grains").writeDouble(step);
        return writer;
    }
}
