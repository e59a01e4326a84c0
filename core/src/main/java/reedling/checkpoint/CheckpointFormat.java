// SPDX-License-Identifier: Apache-2.0
package reedling.checkpoint;

import java.lang.foreign.ValueLayout;
import java.nio.ByteOrder;

/**
 * Layout of a checkpoint file; all numbers little endian.
 *
 *     byte[8]  magic            the last bytes show a transfer that rewrote line ends
 *     int      format version
 *     long     header bytes n
 *     byte[n]  header           program version, case digest, step, time, plugins (name, history version),
 *                               then of each section its name, bytes and CRC-32C
 *     int      CRC-32C          of everything before it
 *     byte[]   the sections, back to back, in the order of the header; nothing after the last
 *
 * Text is an int of bytes, then UTF-8. A count is an int.
 */
final class CheckpointFormat {

    static final byte[] MAGIC = {(byte) 0x8E, 'r', 'e', 'e', 'd', '\r', '\n', 0x1A};
    static final int VERSION = 1;
    /** Bytes before the header proper: magic, version, length. */
    static final int PREFIX_BYTES = MAGIC.length + Integer.BYTES + Long.BYTES;

    static final ValueLayout.OfInt INT = ValueLayout.JAVA_INT_UNALIGNED.withOrder(ByteOrder.LITTLE_ENDIAN);
    static final ValueLayout.OfLong LONG = ValueLayout.JAVA_LONG_UNALIGNED.withOrder(ByteOrder.LITTLE_ENDIAN);
    static final ValueLayout.OfFloat FLOAT = ValueLayout.JAVA_FLOAT_UNALIGNED.withOrder(ByteOrder.LITTLE_ENDIAN);
    static final ValueLayout.OfDouble DOUBLE = ValueLayout.JAVA_DOUBLE_UNALIGNED.withOrder(ByteOrder.LITTLE_ENDIAN);

    private CheckpointFormat() {}
}
