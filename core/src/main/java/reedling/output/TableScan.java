// SPDX-License-Identifier: Apache-2.0
package reedling.output;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;

/** Finds where the rows of a table end that a resumed run keeps; reads the file once, in large pieces. */
final class TableScan {

    private final RandomAccessFile rows;
    private final Path file;
    private final byte[] piece = new byte[1 << 16];
    private int filled;
    private int next;
    private long consumed;

    TableScan(RandomAccessFile rows, Path file) {
        this.rows = rows;
        this.file = file;
    }

    /** Bytes up to and with the last whole row not later than {@code resumeTime} (s). */
    long endOfRows(String header, double resumeTime) throws IOException {
        StringBuilder line = new StringBuilder();
        if (!readLine(line) || !header.equals(asUtf8(line))) {
            throw Table.otherColumns(file, asUtf8(line), header);
        }
        long end = consumed;
        while (readLine(line) && time(line) <= resumeTime) {
            end = consumed;
        }
        return end;
    }

    private static double time(StringBuilder line) {
        int comma = line.indexOf(",");
        try {
            return Double.parseDouble(comma < 0 ? line.toString() : line.substring(0, comma));
        } catch (NumberFormatException torn) {
            return Double.POSITIVE_INFINITY;
        }
    }

    /** Reads one line, one char a byte, without its end; false if the file ends before the line does. */
    private boolean readLine(StringBuilder line) throws IOException {
        line.setLength(0);
        while (true) {
            if (next == filled) {
                filled = rows.read(piece);
                next = 0;
                if (filled <= 0) {
                    filled = 0;
                    return false;
                }
            }
            byte value = piece[next++];
            consumed++;
            if (value == '\n') {
                return true;
            }
            line.append((char) (value & 0xFF));
        }
    }

    private static String asUtf8(StringBuilder bytes) {
        return new String(bytes.toString().getBytes(StandardCharsets.ISO_8859_1), StandardCharsets.UTF_8);
    }
}
