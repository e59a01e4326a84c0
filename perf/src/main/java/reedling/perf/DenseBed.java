// SPDX-License-Identifier: Apache-2.0
package reedling.perf;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;

/**
 * A jammed bed of spheres in a box, as flat columns.
 *
 * <p>File, little endian: int64 number of grains; 3 doubles box edges (m); a row of 10 doubles a grain: centre 3 and
 * radius (m), velocity 3 (m/s), spin 3 (rad/s).
 *
 * @param edges box edges from the origin, m
 * @param rows ten doubles a grain
 */
record DenseBed(double[] edges, double[] rows) {

    /** Doubles a grain. */
    static final int ROW = 10;

    private static final int HEADER = 4 * Long.BYTES;

    int count() {
        return rows.length / ROW;
    }

    /** Reads a bed file. */
    static DenseBed read(Path file) {
        try {
            ByteBuffer bytes = ByteBuffer.wrap(Files.readAllBytes(file)).order(ByteOrder.LITTLE_ENDIAN);
            long count = bytes.remaining() < HEADER ? -1 : bytes.getLong();
            if (count < 1 || bytes.remaining() != HEADER - Long.BYTES + count * ROW * Double.BYTES) {
                throw new ReedlingException(
                        ExitCode.NO_INPUT,
                        new Finding(
                                file.toString(),
                                "",
                                "not a bed file of its length",
                                "",
                                "Write the number of grains, three box edges and ten numbers a grain."));
            }
            double[] edges = {bytes.getDouble(), bytes.getDouble(), bytes.getDouble()};
            double[] rows = new double[(int) count * ROW];
            bytes.asDoubleBuffer().get(rows);
            return new DenseBed(edges, rows);
        } catch (NoSuchFileException missing) {
            throw new ReedlingException(
                    ExitCode.NO_INPUT, new Finding(file.toString(), "", "missing", "a bed file", "Check the path."));
        } catch (IOException unreadable) {
            throw new ReedlingException(
                    ExitCode.NO_INPUT,
                    new Finding(file.toString(), "", "unreadable", "a bed file", unreadable.toString()),
                    unreadable);
        }
    }
}
