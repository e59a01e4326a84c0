// SPDX-License-Identifier: Apache-2.0
package reedling.checkpoint;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * One checkpoint, gathered in memory by the thread that runs the loop and then written by any other:
 * {@code save} every owner, then hand the writer to {@link CheckpointFolder#write}.
 */
public final class CheckpointWriter {

    private final CheckpointHeader header;
    private final Map<String, SectionWriter> sections = new LinkedHashMap<>();

    public CheckpointWriter(CheckpointHeader header) {
        this.header = header;
    }

    /** Copies the state of one owner into its section. */
    public void save(Persistent owner) throws IOException {
        owner.save(section(owner.section()));
    }

    /** Opens a section that has no owner object. Two sections of one name are a fault of the program. */
    public SectionWriter section(String name) {
        SectionWriter section = new SectionWriter();
        if (sections.putIfAbsent(name, section) != null) {
            throw new IllegalStateException("two sections named " + name);
        }
        return section;
    }

    void writeTo(FileChannel channel) throws IOException {
        SectionWriter head = head();
        SectionWriter start = new SectionWriter();
        start.writeBytes(CheckpointFormat.MAGIC, 0, CheckpointFormat.MAGIC.length);
        start.writeInt(CheckpointFormat.VERSION);
        start.writeLong(head.count());
        head.appendTo(start);
        start.writeInt(start.checksum());
        start.writeTo(channel);
        for (SectionWriter section : sections.values()) {
            section.writeTo(channel);
        }
    }

    private SectionWriter head() throws IOException {
        SectionWriter head = new SectionWriter();
        head.writeText(header.programVersion());
        head.writeText(header.caseDigest());
        head.writeLong(header.step());
        head.writeDouble(header.time());
        head.writeInt(header.plugins().size());
        for (Map.Entry<String, Integer> plugin : header.plugins().entrySet()) {
            head.writeText(plugin.getKey());
            head.writeInt(plugin.getValue());
        }
        head.writeInt(sections.size());
        for (Map.Entry<String, SectionWriter> section : sections.entrySet()) {
            head.writeText(section.getKey());
            head.writeLong(section.getValue().count());
            head.writeInt(section.getValue().checksum());
        }
        return head;
    }
}
