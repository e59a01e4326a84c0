// SPDX-License-Identifier: Apache-2.0
package reedling.checkpoint;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Map;
import java.util.SplittableRandom;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.error.ExitCode;
import reedling.error.ReedlingException;

class CheckpointReaderTest {

    private static final CheckpointHeader HEADER =
            new CheckpointHeader("0.1.0", "digest", 1234, 0.1 + 0.2, Map.of("history-law", 2, "gravity", 0));

    @TempDir
    Path folder;

    private Path file;

    @BeforeEach
    void writeTwoSections() throws IOException {
        CheckpointWriter writer = new CheckpointWriter(HEADER);
        writer.save(new Numbers(new double[] {1, -0.0, Double.NaN, Double.MIN_VALUE}, 7));
        writer.section("clock").writeLong(99);
        file = CheckpointFolder.create(folder).write(writer);
    }

    @Test
    void headerAndSectionsComeBackBitForBit() throws IOException {
        try (CheckpointReader reader = CheckpointReader.open(file)) {
            assertThat(reader.header()).isEqualTo(HEADER);
            assertThat(reader.sections()).containsExactly("numbers", "clock");
            Numbers restored = new Numbers(new double[4], 0);
            reader.restore(restored);
            assertThat(restored.values).containsExactly(1, -0.0, Double.NaN, Double.MIN_VALUE);
            assertThat(restored.seed).isEqualTo(7);
            assertThat(reader.section("clock").readLong()).isEqualTo(99);
        }
    }

    @Test
    void arraysLargerThanAnyBufferComeBack() throws IOException {
        SplittableRandom random = new SplittableRandom(5);
        double[] doubles = random.doubles(1_500_000).toArray();
        int[] ints = random.ints(300_001).toArray();
        long[] longs = random.longs(1_001).toArray();
        CheckpointWriter writer = new CheckpointWriter(HEADER);
        SectionWriter section = writer.section("large");
        section.writeByte(-3);
        section.writeDoubles(doubles, 0, doubles.length);
        section.writeInts(ints, 1, ints.length);
        section.writeText("grün");
        section.writeLongs(longs, 0, 1_000);
        section.writeFloats(new float[] {1.5f}, 0, 1);
        Path large = CheckpointFolder.resume(folder, file).write(writer);
        try (CheckpointReader reader = CheckpointReader.open(large)) {
            SectionReader in = reader.section("large");
            assertThat(in.readByte()).isEqualTo(-3);
            double[] backDoubles = new double[doubles.length];
            in.readDoubles(backDoubles, 0, doubles.length);
            assertThat(backDoubles).isEqualTo(doubles);
            int[] backInts = new int[ints.length];
            in.readInts(backInts, 1, ints.length);
            assertThat(Arrays.copyOfRange(backInts, 1, ints.length))
                    .isEqualTo(Arrays.copyOfRange(ints, 1, ints.length));
            assertThat(in.readText()).isEqualTo("grün");
            long[] backLongs = new long[1_000];
            in.readLongs(backLongs, 0, 1_000);
            assertThat(backLongs).isEqualTo(Arrays.copyOf(longs, 1_000));
            float[] backFloats = new float[1];
            in.readFloats(backFloats, 0, 1);
            assertThat(backFloats).containsExactly(1.5f);
            assertThat(in.remaining()).isZero();
        }
    }

    @Test
    void anyFlippedByteIsOneClearError() throws IOException {
        byte[] whole = Files.readAllBytes(file);
        for (int at = 0; at < whole.length; at++) {
            byte[] damaged = whole.clone();
            damaged[at] ^= 0x40;
            assertThat(refusal(damaged).findings()).as("byte %d", at).hasSize(1);
        }
    }

    @Test
    void anyTruncationIsOneClearError() throws IOException {
        byte[] whole = Files.readAllBytes(file);
        for (int length = 0; length < whole.length; length++) {
            ReedlingException refusal = refusal(Arrays.copyOf(whole, length));
            assertThat(refusal.findings()).hasSize(1);
            assertThat(refusal.getMessage()).as("length %d", length).contains("expected a whole file");
        }
    }

    @Test
    void eachKindOfDamageHasItsOwnMessage() throws IOException {
        byte[] whole = Files.readAllBytes(file);
        assertThat(refusal("time,mass on deck".getBytes()).getMessage()).contains("is some other file");
        byte[] future = whole.clone();
        future[CheckpointFormat.MAGIC.length] = 9;
        assertThat(refusal(future).getMessage()).contains("is of format version 9");
        byte[] header = whole.clone();
        header[CheckpointFormat.PREFIX_BYTES + 5] ^= 1;
        assertThat(refusal(header).getMessage()).contains("header: is damaged");
        byte[] section = whole.clone();
        section[whole.length - 1] ^= 1;
        assertThat(refusal(section).getMessage()).contains("section clock: is damaged");
        assertThat(refusal(Arrays.copyOf(whole, whole.length + 1)).getMessage())
                .contains("nothing after the last section");
    }

    @Test
    void missingSectionNamesThoseThatAreThere() throws IOException {
        try (CheckpointReader reader = CheckpointReader.open(file)) {
            assertThatThrownBy(() -> reader.section("walls"))
                    .isInstanceOf(ReedlingException.class)
                    .hasMessageContaining("section walls: is missing (there are [numbers, clock])");
        }
    }

    @Test
    void ownerThatReadsMoreOrLessThanItWroteIsRefused() throws IOException {
        try (CheckpointReader reader = CheckpointReader.open(file)) {
            assertThatThrownBy(() -> reader.restore(new Numbers(new double[5], 0)))
                    .hasMessageContaining("section numbers: is 40 bytes");
            assertThatThrownBy(() -> reader.restore(new Numbers(new double[3], 0)))
                    .hasMessageContaining("left with 8 unread bytes");
        }
    }

    private ReedlingException refusal(byte[] content) throws IOException {
        Path damaged = folder.resolve("damaged");
        Files.write(damaged, content);
        ReedlingException refusal = catchThrowableOfType(
                ReedlingException.class, () -> CheckpointReader.open(damaged).close());
        assertThat(refusal).isNotNull();
        assertThat(refusal.exitCode()).isEqualTo(ExitCode.CHECKPOINT);
        return refusal;
    }

    private static final class Numbers implements Persistent {
        private final double[] values;
        private long seed;

        Numbers(double[] values, long seed) {
            this.values = values;
            this.seed = seed;
        }

        @Override
        public String section() {
            return "numbers";
        }

        @Override
        public void save(SectionWriter out) throws IOException {
            out.writeLong(seed);
            out.writeDoubles(values, 0, values.length);
        }

        @Override
        public void restore(SectionReader in) {
            seed = in.readLong();
            in.readDoubles(values, 0, values.length);
        }
    }
}
