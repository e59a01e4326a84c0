// SPDX-License-Identifier: Apache-2.0
package reedling.file;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.SplittableRandom;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ChannelOutputTest {

    @TempDir
    Path folder;

    @ParameterizedTest
    @ValueSource(ints = {8, 11, 64, 4096})
    void bulkOutputAgreesWithOneValueAtATimeForAnyBufferSize(int bufferBytes) throws IOException {
        SplittableRandom random = new SplittableRandom(7);
        double[] doubles = random.doubles(100).toArray();
        int[] ints = random.ints(100).toArray();
        long[] longs = random.longs(100).toArray();
        float[] floats = new float[100];
        for (int i = 0; i < floats.length; i++) {
            floats[i] = (float) random.nextDouble();
        }
        ByteBuffer expected = ByteBuffer.allocate(4096).order(ByteOrder.LITTLE_ENDIAN);
        expected.put((byte) 1);
        for (int i = 3; i < 97; i++) {
            expected.putDouble(doubles[i]);
        }
        for (int i = 3; i < 97; i++) {
            expected.putInt(ints[i]);
        }
        for (int i = 3; i < 97; i++) {
            expected.putLong(longs[i]);
        }
        for (int i = 3; i < 97; i++) {
            expected.putFloat(floats[i]);
        }
        expected.put(new byte[] {3, 0, 0, 0, 'e', 'n', 'd'});

        Path file = folder.resolve("numbers");
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.CREATE, StandardOpenOption.WRITE)) {
            ChannelOutput out = new ChannelOutput(channel, ByteBuffer.allocateDirect(bufferBytes));
            out.writeBoolean(true);
            out.writeDoubles(doubles, 3, 97);
            out.writeInts(ints, 3, 97);
            out.writeLongs(longs, 3, 97);
            out.writeFloats(floats, 3, 97);
            out.writeText("end");
            assertThat(out.count()).isEqualTo(expected.position());
            out.flush();
            assertThat(out.count()).isEqualTo(expected.position());
        }
        ByteArrayOutputStream want = new ByteArrayOutputStream();
        want.write(expected.array(), 0, expected.position());
        assertThat(Files.readAllBytes(file)).isEqualTo(want.toByteArray());
    }
}
