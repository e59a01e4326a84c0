// SPDX-License-Identifier: Apache-2.0
package reedling.vtk;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.xpath.XPathConstants;
import javax.xml.xpath.XPathFactory;
import org.w3c.dom.Document;
import org.w3c.dom.Element;

/** Reads a file with raw appended data the way the format describes it, knowing nothing of the writer. */
final class VtkFile {

    private static final String APPENDED = "<AppendedData encoding=\"raw\">";

    private final Document xml;
    private final ByteBuffer appended;

    VtkFile(Path file) throws Exception {
        byte[] bytes = Files.readAllBytes(file);
        String latin = new String(bytes, StandardCharsets.ISO_8859_1);
        int cut = latin.indexOf(APPENDED);
        int first = latin.indexOf('_', cut + APPENDED.length()) + 1;
        byte[] head = (latin.substring(0, cut) + "</VTKFile>").getBytes(StandardCharsets.ISO_8859_1);
        xml = DocumentBuilderFactory.newDefaultInstance().newDocumentBuilder().parse(new ByteArrayInputStream(head));
        appended = ByteBuffer.wrap(bytes, first, bytes.length - first).slice().order(ByteOrder.LITTLE_ENDIAN);
        if (!latin.endsWith("\n</AppendedData>\n</VTKFile>\n")) {
            throw new IOException("no end of file");
        }
    }

    String attribute(String path, String name) throws Exception {
        return element(path).getAttribute(name);
    }

    int integer(String path, String name) throws Exception {
        return Integer.parseInt(attribute(path, name));
    }

    /** Values of an array as doubles, whatever their type. */
    double[] array(String section, String name) throws Exception {
        Element array = element("//" + section + "/DataArray[@Name='" + name + "']");
        int offset = Integer.parseInt(array.getAttribute("offset"));
        long bytes = appended.getLong(offset);
        String type = array.getAttribute("type");
        int size = Integer.parseInt(type.replaceAll("\\D", "")) / 8;
        double[] values = new double[Math.toIntExact(bytes / size)];
        for (int i = 0; i < values.length; i++) {
            int at = offset + Long.BYTES + i * size;
            values[i] = switch (type) {
                case "Float64" -> appended.getDouble(at);
                case "Float32" -> appended.getFloat(at);
                case "Int64" -> appended.getLong(at);
                case "Int32" -> appended.getInt(at);
                case "UInt8" -> appended.get(at) & 0xFF;
                default -> throw new IOException(type);
            };
        }
        return values;
    }

    /** Bytes of the appended data, up to the line end before the closing tag. */
    int appendedBytes() {
        return appended.capacity() - "\n</AppendedData>\n</VTKFile>\n".length();
    }

    private Element element(String path) throws Exception {
        return (Element) XPathFactory.newDefaultInstance().newXPath().evaluate(path, xml, XPathConstants.NODE);
    }
}
