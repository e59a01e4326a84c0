// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;

/** A run of bytes with its length before it. */
final class SectionBytes {

    private SectionBytes() {}

    static void write(ByteArrayOutputStream bytes, SectionWriter out) throws IOException {
        out.writeInt(bytes.size());
        out.writeBytes(bytes.toByteArray(), 0, bytes.size());
    }

    static byte[] read(SectionReader in) {
        byte[] bytes = new byte[in.readInt()];
        in.readBytes(bytes, 0, bytes.length);
        return bytes;
    }
}
