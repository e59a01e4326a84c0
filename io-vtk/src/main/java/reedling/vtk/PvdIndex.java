// SPDX-License-Identifier: Apache-2.0
package reedling.vtk;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoublePredicate;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.SAXException;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.file.WholeFile;

/** The index of a run: which file shows which part at which time. On the disk it is replaced in one step. */
final class PvdIndex {

    /**
     * One data set.
     *
     * @param time s
     * @param part number of the data set among those of its time
     * @param file path relative to the index, with slashes
     */
    record Entry(double time, int part, String name, String file) {
        String xml() {
            return "<DataSet timestep=\"" + time + "\" group=\"\" part=\"" + part + "\" name=\""
                    + VtkDocument.escaped(name) + "\" file=\"" + VtkDocument.escaped(file) + "\"/>\n";
        }
    }

    private static final String HEAD = """
        <?xml version="1.0"?>
        <VTKFile type="Collection" version="1.0" byte_order="LittleEndian" header_type="UInt64">
        <Collection>
        """;
    private static final String TAIL = "</Collection>\n</VTKFile>\n";

    private final Path path;
    private final List<Entry> entries = new ArrayList<>();
    private final StringBuilder text = new StringBuilder();

    PvdIndex(Path path) {
        this.path = path;
    }

    /** Reads an index back; one that cannot be read is refused. */
    static PvdIndex read(Path path) throws IOException {
        PvdIndex index = new PvdIndex(path);
        try {
            NodeList sets = DocumentBuilderFactory.newDefaultInstance()
                    .newDocumentBuilder()
                    .parse(new ByteArrayInputStream(Files.readAllBytes(path)))
                    .getElementsByTagName("DataSet");
            for (int i = 0; i < sets.getLength(); i++) {
                Element set = (Element) sets.item(i);
                index.add(new Entry(
                        Double.parseDouble(set.getAttribute("timestep")),
                        Integer.parseInt(set.getAttribute("part")),
                        set.getAttribute("name"),
                        set.getAttribute("file")));
            }
            return index;
        } catch (SAXException | ParserConfigurationException | NumberFormatException cause) {
            throw new ReedlingException(
                    ExitCode.INPUT_OUTPUT,
                    new Finding(
                            path.toString(),
                            "",
                            "unreadable: " + cause.getMessage(),
                            "an index of snapshots",
                            "Move it away to resume without the earlier snapshots."),
                    cause);
        }
    }

    List<Entry> entries() {
        return entries;
    }

    void add(Entry entry) {
        entries.add(entry);
        text.append(entry.xml());
    }

    /** Forgets entries by their time (s); true if there were any. */
    boolean drop(DoublePredicate times) {
        boolean dropped = entries.removeIf(entry -> times.test(entry.time()));
        if (dropped) {
            text.setLength(0);
            entries.forEach(entry -> text.append(entry.xml()));
        }
        return dropped;
    }

    /** Replaces the index on the disk; after a loss of power it may be the one before, which is valid too. */
    void save() throws IOException {
        byte[] bytes = (HEAD + text + TAIL).getBytes(StandardCharsets.UTF_8);
        WholeFile.write(path, channel -> WholeFile.writeFully(channel, ByteBuffer.wrap(bytes)));
    }
}
