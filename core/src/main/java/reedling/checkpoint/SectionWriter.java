// SPDX-License-Identifier: Apache-2.0
package reedling.checkpoint;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.util.ArrayList;
import java.util.List;
import java.util.zip.CRC32C;
import reedling.file.LittleEndianOutput;
import reedling.file.WholeFile;

/**
 * One section of a checkpoint, held in memory. Filling it is the private copy of its owner's state, so the owner may go
 * on as soon as {@link Persistent#save} returns while another thread writes the bytes to the disk.
 * Threads: one fills it, then one reads it.
 */
public final class SectionWriter extends LittleEndianOutput {

    private static final int FIRST_BYTES = 1 << 10;
    private static final int LARGEST_BYTES = 1 << 22;

    private final List<ByteBuffer> full = new ArrayList<>();

    SectionWriter() {
        super(ByteBuffer.allocate(FIRST_BYTES));
    }

    @Override
    protected ByteBuffer next(ByteBuffer filled) {
        full.add(filled);
        return ByteBuffer.allocate(Math.min(LARGEST_BYTES, 2 * filled.capacity()));
    }

    private List<ByteBuffer> pieces() {
        List<ByteBuffer> pieces = new ArrayList<>();
        full.forEach(piece -> pieces.add(piece.asReadOnlyBuffer()));
        pieces.add(current().duplicate().flip());
        return pieces;
    }

    int checksum() {
        CRC32C checksum = new CRC32C();
        pieces().forEach(checksum::update);
        return (int) checksum.getValue();
    }

    void writeTo(FileChannel channel) throws IOException {
        for (ByteBuffer piece : pieces()) {
            WholeFile.writeFully(channel, piece);
        }
    }

    void appendTo(SectionWriter other) throws IOException {
        for (ByteBuffer piece : pieces()) {
            byte[] bytes = new byte[piece.remaining()];
            piece.get(bytes);
            other.writeBytes(bytes, 0, bytes.length);
        }
    }
}
