// SPDX-License-Identifier: Apache-2.0
package reedling.file;

import java.io.File;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.Objects;

/**
 * Writes a file that appears whole or not at all: under a temporary name in the same folder, forced to the disk, then
 * renamed in one step over the old one. A reader, or a machine that loses power, sees the old content or the new one.
 * Threads: no state; two threads must not write the same target.
 */
public final class WholeFile {

    private static final String SUFFIX = ".part";

    private WholeFile() {}

    /** What goes into the file. */
    @FunctionalInterface
    public interface Content {
        void writeTo(FileChannel channel) throws IOException;
    }

    /**
     * Writes {@code target}, replacing it if it exists. The new name is safe against loss of power once
     * {@link #syncFolder} was called; several files may share that call.
     *
     * @throws IOException if writing fails; then nothing new is left in the folder and an old target is unchanged
     */
    public static void write(Path target, Content content) throws IOException {
        Path part = target.resolveSibling("." + target.getFileName() + SUFFIX);
        try {
            try (FileChannel channel = FileChannel.open(
                    part, StandardOpenOption.CREATE, StandardOpenOption.WRITE, StandardOpenOption.TRUNCATE_EXISTING)) {
                content.writeTo(channel);
                channel.force(false); // content and length; times may be lost
            }
            Files.move(part, target, StandardCopyOption.ATOMIC_MOVE);
        } catch (IOException | RuntimeException | Error failure) {
            deleteAfter(failure, part);
            throw failure;
        }
    }

    /** Writes UTF-8 text as a whole file and makes its name safe too. */
    public static void writeText(Path target, String text) throws IOException {
        write(target, channel -> writeFully(channel, ByteBuffer.wrap(text.getBytes(StandardCharsets.UTF_8))));
        syncFolder(Objects.requireNonNull(target.toAbsolutePath().getParent(), "a file lies in a folder"));
    }

    /** Writes all that remains in a buffer; a channel may take less at one call. */
    public static void writeFully(FileChannel channel, ByteBuffer buffer) throws IOException {
        while (buffer.hasRemaining()) {
            channel.write(buffer);
        }
    }

    /** Makes renames and deletions in a folder safe against loss of power, where the system lets a folder be opened. */
    public static void syncFolder(Path folder) throws IOException {
        if (File.separatorChar == '/') {
            try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
                channel.force(true);
            }
        }
    }

    /** Removes what writes cut short by a crash left behind. Only for the process that owns the folder. */
    public static void removeLeftovers(Path folder) throws IOException {
        try (DirectoryStream<Path> parts = Files.newDirectoryStream(folder, ".*" + SUFFIX)) {
            for (Path part : parts) {
                Files.deleteIfExists(part);
            }
        }
    }

    private static void deleteAfter(Throwable failure, Path part) {
        try {
            Files.deleteIfExists(part);
        } catch (IOException second) {
            failure.addSuppressed(second);
        }
    }
}
