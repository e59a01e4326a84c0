// SPDX-License-Identifier: Apache-2.0
package reedling.output;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.List;
import java.util.stream.Collectors;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.file.WholeFile;

/**
 * A table of numbers over time as CSV: units stand in the header, time (s) is the first column and never falls.
 * Numbers are written so that they read back bit for bit; one that is not a number is an empty cell.
 * Threads: rows are appended by one thread; the job made by {@link #takeRows} may run on another, one at a time.
 */
public final class Table implements AutoCloseable {

    /**
     * A column.
     *
     * @param name what is measured, e.g. {@code mass on deck}
     * @param unit SI unit of the numbers, empty for a count or ratio
     */
    public record Column(String name, String unit) {
        String heading() {
            return unit.isEmpty() ? name : name + " [" + unit + "]";
        }
    }

    private final FileChannel channel;
    private final int width;
    private final StringBuilder pending = new StringBuilder();

    private Table(Path file, int columns) throws IOException {
        channel = FileChannel.open(file, StandardOpenOption.WRITE, StandardOpenOption.APPEND);
        width = columns + 1;
    }

    /** Starts a table with a time column and the given ones. */
    public static Table create(Path file, List<Column> columns) throws IOException {
        WholeFile.writeText(file, header(columns) + "\n");
        return new Table(file, columns.size());
    }

    /**
     * Goes on with a table after rows later than {@code resumeTime} (s), and a last row torn by a crash, were cut off.
     * A table that is not there is started.
     *
     * @throws ReedlingException if its columns are not the given ones
     */
    public static Table resume(Path file, List<Column> columns, double resumeTime) throws IOException {
        if (!Files.exists(file)) {
            return create(file, columns);
        }
        try (RandomAccessFile rows = new RandomAccessFile(file.toFile(), "rw")) {
            rows.setLength(new TableScan(rows, file).endOfRows(header(columns), resumeTime));
            rows.getFD().sync();
        }
        return new Table(file, columns.size());
    }

    /**
     * Adds a row to those waiting.
     *
     * @param time s, not less than in the row before
     * @param values one for each column, in its unit
     */
    public void append(double time, double... values) {
        if (values.length + 1 != width) {
            throw new IllegalArgumentException("row of " + values.length + " values in a table of " + (width - 1));
        }
        appendNumber(time);
        for (double value : values) {
            pending.append(',');
            appendNumber(value);
        }
        pending.append('\n');
    }

    /**
     * Takes the waiting rows; the job returned writes them and forces them to the disk. Submitted before a checkpoint,
     * it makes sure that the rows up to that checkpoint are there when the run is resumed from it.
     */
    public WriteQueue.Job takeRows() {
        byte[] rows = pending.toString().getBytes(StandardCharsets.UTF_8);
        pending.setLength(0);
        return () -> {
            if (rows.length > 0) {
                WholeFile.writeFully(channel, ByteBuffer.wrap(rows));
                channel.force(false);
            }
        };
    }

    /** Writes the waiting rows on this thread and closes the file; every job taken must have run. */
    @Override
    public void close() throws IOException {
        try (channel) {
            takeRows().run();
        }
    }

    private static String header(List<Column> columns) {
        return columns.stream()
                .map(column -> "," + quoted(column.heading()))
                .collect(Collectors.joining("", "time [s]", ""));
    }

    /** Quoting of RFC 4180, Shafranovich, Common Format and MIME Type for Comma-Separated Values Files, 2005. */
    private static String quoted(String cell) {
        return cell.matches("[^\",\r\n]*") ? cell : '"' + cell.replace("\"", "\"\"") + '"';
    }

    private void appendNumber(double value) {
        long whole = (long) value;
        if (whole == value && Math.abs(whole) < 1_000_000_000_000_000L && (whole != 0 || 1 / value > 0)) {
            pending.append(whole);
        } else if (!Double.isNaN(value)) {
            pending.append(value);
        }
    }

    static ReedlingException otherColumns(Path file, String got, String expected) {
        return new ReedlingException(
                ExitCode.OUTPUT,
                new Finding(
                        file.toString(),
                        "header",
                        '"' + got + '"',
                        '"' + expected + '"',
                        "Move the table away or resume with the case that began it."));
    }
}
