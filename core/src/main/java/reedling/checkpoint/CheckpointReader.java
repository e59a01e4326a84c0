// SPDX-License-Identifier: Apache-2.0
package reedling.checkpoint;

import java.io.IOException;
import java.lang.foreign.Arena;
import java.lang.foreign.MemorySegment;
import java.nio.channels.FileChannel;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.zip.CRC32C;

/**
 * An open checkpoint whose every byte was checked: opening refuses, each with its own message, what is not a
 * checkpoint, has another format version, is truncated or damaged. The file is mapped, not loaded.
 * Threads: one at a time.
 */
public final class CheckpointReader implements AutoCloseable {

    private static final long CHECKSUM_PIECE = 1L << 26;

    private final Path file;
    private final Arena arena;
    private final MemorySegment bytes;
    private final CheckpointHeader header;
    private final Map<String, Extent> sections = new LinkedHashMap<>();

    private record Extent(long start, long count, int checksum) {}

    private CheckpointReader(Path file, Arena arena, MemorySegment bytes) {
        this.file = file;
        this.arena = arena;
        this.bytes = bytes;
        SectionReader head = checkedHead();
        header = readHeader(head);
        readSections(head);
        sections.forEach(this::checkSection);
    }

    /**
     * Opens and checks a whole file.
     *
     * @throws reedling.error.ReedlingException with exit code CHECKPOINT if the file cannot be used
     */
    @SuppressWarnings("MustBeClosedChecker") // the reader owns the arena and closes it
    public static CheckpointReader open(Path file) throws IOException {
        Arena arena = Arena.ofShared();
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.READ)) {
            return new CheckpointReader(
                    file, arena, channel.map(FileChannel.MapMode.READ_ONLY, 0, channel.size(), arena));
        } catch (IOException | RuntimeException | Error failure) {
            arena.close();
            throw failure;
        }
    }

    public Path file() {
        return file;
    }

    public CheckpointHeader header() {
        return header;
    }

    /** Names of the sections, in the order of the file. */
    public Set<String> sections() {
        return Collections.unmodifiableSet(sections.keySet());
    }

    /** A reader at the start of a section; a section that is not there is refused by name. */
    public SectionReader section(String name) {
        Extent extent = sections.get(name);
        if (extent == null) {
            throw CheckpointFault.MISSING_SECTION.in(
                    file, "section " + name, "missing (there are " + sections.keySet() + ")");
        }
        return new SectionReader(file, name, bytes.asSlice(extent.start, extent.count));
    }

    /** Restores an owner, and refuses a section of which the owner leaves bytes unread. */
    public void restore(Persistent owner) throws IOException {
        SectionReader section = section(owner.section());
        owner.restore(section);
        if (section.remaining() != 0) {
            throw CheckpointFault.SECTION_TOO_LONG.in(
                    file, "section " + owner.section(), "left with " + section.remaining() + " unread bytes");
        }
    }

    @Override
    public void close() {
        arena.close();
    }

    private SectionReader checkedHead() {
        long size = bytes.byteSize();
        long compared = Math.min(size, CheckpointFormat.MAGIC.length);
        if (MemorySegment.ofArray(CheckpointFormat.MAGIC).asSlice(0, compared).mismatch(bytes.asSlice(0, compared))
                >= 0) {
            throw CheckpointFault.NOT_A_CHECKPOINT.in(file, "", "some other file");
        }
        requireSize(CheckpointFormat.PREFIX_BYTES + Integer.BYTES);
        int version = bytes.get(CheckpointFormat.INT, CheckpointFormat.MAGIC.length);
        if (version != CheckpointFormat.VERSION) {
            throw CheckpointFault.OTHER_VERSION.in(file, "", "of format version " + version);
        }
        long length = bytes.get(CheckpointFormat.LONG, CheckpointFormat.MAGIC.length + Integer.BYTES);
        if (length < 0 || length > size - CheckpointFormat.PREFIX_BYTES - Integer.BYTES) {
            throw CheckpointFault.TRUNCATED.in(file, "", size + " bytes, too few for a header of " + length + " bytes");
        }
        long end = CheckpointFormat.PREFIX_BYTES + length;
        if (checksum(bytes.asSlice(0, end)) != bytes.get(CheckpointFormat.INT, end)) {
            throw CheckpointFault.DAMAGED_HEADER.in(file, "header", "damaged");
        }
        return new SectionReader(file, "header", bytes.asSlice(CheckpointFormat.PREFIX_BYTES, length));
    }

    private static CheckpointHeader readHeader(SectionReader head) {
        String programVersion = head.readText();
        String caseDigest = head.readText();
        long step = head.readLong();
        double time = head.readDouble();
        Map<String, Integer> plugins = new TreeMap<>();
        for (int left = head.readInt(); left > 0; left--) {
            plugins.put(head.readText(), head.readInt());
        }
        return new CheckpointHeader(programVersion, caseDigest, step, time, plugins);
    }

    private void readSections(SectionReader head) {
        long start = CheckpointFormat.PREFIX_BYTES + head.size() + Integer.BYTES;
        for (int left = head.readInt(); left > 0; left--) {
            String name = head.readText();
            Extent extent = new Extent(start, head.readLong(), head.readInt());
            sections.put(name, extent);
            start += extent.count;
        }
        requireSize(start);
        if (start < bytes.byteSize()) {
            throw CheckpointFault.TRAILING_BYTES.in(
                    file, "", bytes.byteSize() + " bytes long though its sections end at " + start);
        }
    }

    private void checkSection(String name, Extent extent) {
        if (checksum(bytes.asSlice(extent.start, extent.count)) != extent.checksum) {
            throw CheckpointFault.DAMAGED_SECTION.in(file, "section " + name, "damaged");
        }
    }

    private void requireSize(long needed) {
        if (bytes.byteSize() < needed) {
            throw CheckpointFault.TRUNCATED.in(
                    file, "", "cut off after " + bytes.byteSize() + " of " + needed + " bytes");
        }
    }

    private static int checksum(MemorySegment part) {
        CRC32C checksum = new CRC32C();
        for (long start = 0; start < part.byteSize(); start += CHECKSUM_PIECE) {
            checksum.update(part.asSlice(start, Math.min(CHECKSUM_PIECE, part.byteSize() - start))
                    .asByteBuffer());
        }
        return (int) checksum.getValue();
    }
}
