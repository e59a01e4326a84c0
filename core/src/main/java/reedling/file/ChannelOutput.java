// SPDX-License-Identifier: Apache-2.0
package reedling.file;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;

/** Streams numbers into a file through one buffer that the caller may use again for the next file. */
public final class ChannelOutput extends LittleEndianOutput {

    private final FileChannel channel;

    /**
     * @param channel open for writing
     * @param buffer best direct and about 1 MiB; cleared here
     */
    public ChannelOutput(FileChannel channel, ByteBuffer buffer) {
        super(buffer.clear());
        this.channel = channel;
    }

    @Override
    protected ByteBuffer next(ByteBuffer filled) throws IOException {
        WholeFile.writeFully(channel, filled);
        return filled.clear();
    }

    /** Hands everything to the channel. */
    public void flush() throws IOException {
        pass();
    }
}
