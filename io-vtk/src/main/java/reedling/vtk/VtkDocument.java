// SPDX-License-Identifier: Apache-2.0
package reedling.vtk;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import reedling.file.ChannelOutput;
import reedling.output.SnapshotFrame;
import reedling.output.SnapshotFrame.NamedArray;

/**
 * A VTK XML file of version 1.0 under construction: little endian, UInt64 headers, uncompressed raw appended data.
 * Each array is its length in bytes (UInt64) followed by its values; offsets count from behind the underscore.
 */
final class VtkDocument {

    private final StringBuilder xml = new StringBuilder("<?xml version=\"1.0\"?>\n");
    private final List<VtkArray> arrays = new ArrayList<>();
    private final String type;
    private long offset;

    /** Begins a file of a data set type, with its time and step. */
    VtkDocument(String type, SnapshotFrame frame) {
        this.type = type;
        line("<VTKFile type=\"" + type + "\" version=\"1.0\" byte_order=\"LittleEndian\" header_type=\"UInt64\">");
        line("<" + type + ">");
        line("<FieldData>");
        array(VtkArray.doubles("TimeValue", 1, frame.time()), " NumberOfTuples=\"1\"");
        array(VtkArray.longs("Step", frame.step()), " NumberOfTuples=\"1\"");
        line("</FieldData>");
    }

    VtkDocument line(String markup) {
        xml.append(markup).append('\n');
        return this;
    }

    VtkDocument array(VtkArray array) {
        return array(array, "");
    }

    private VtkDocument array(VtkArray array, String more) {
        line("<DataArray type=\"" + array.type() + "\" Name=\"" + escaped(array.name()) + "\" NumberOfComponents=\""
                + array.components() + "\"" + more + " format=\"appended\" offset=\"" + offset + "\"/>");
        arrays.add(array);
        offset += Long.BYTES + array.bytes();
        return this;
    }

    VtkDocument section(String name, List<NamedArray> fields) {
        line("<" + name + ">");
        fields.forEach(field -> array(VtkArray.of(field)));
        return line("</" + name + ">");
    }

    VtkDocument points(double[] positions) {
        return line("<Points>").array(VtkArray.doubles("Points", 3, positions)).line("</Points>");
    }

    /** Writes the finished file through a buffer that may be used again. */
    void writeTo(FileChannel channel, ByteBuffer buffer) throws IOException {
        line("</" + type + ">");
        xml.append("<AppendedData encoding=\"raw\">\n_");
        ChannelOutput out = new ChannelOutput(channel, buffer);
        text(out, xml.toString());
        for (VtkArray array : arrays) {
            out.writeLong(array.bytes());
            array.values().writeTo(out);
        }
        text(out, "\n</AppendedData>\n</VTKFile>\n");
        out.flush();
    }

    private static void text(ChannelOutput out, String text) throws IOException {
        byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
        out.writeBytes(bytes, 0, bytes.length);
    }

    static String escaped(String text) {
        return text.replace("&", "&amp;")
                .replace("<", "&lt;")
                .replace(">", "&gt;")
                .replace("\"", "&quot;");
    }
}
