// SPDX-License-Identifier: Apache-2.0
package reedling;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;

/** The rows of core's packages, read from the list that the documentation shows. */
final class PackageRows {

    private PackageRows() {}

    /** Row by the name of the package below {@code reedling}. */
    static Map<String, Integer> read() throws IOException {
        try (InputStream list = PackageRows.class.getResourceAsStream("/reedling/packages.txt")) {
            if (list == null) {
                throw new IOException("reedling/packages.txt is missing from the class path");
            }
            Map<String, Integer> rows = new LinkedHashMap<>();
            new String(list.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.isBlank() && !line.startsWith("#"))
                    .map(line -> line.trim().split("\\s+"))
                    .forEach(words -> rows.put(words[1], Integer.valueOf(words[0])));
            return rows;
        }
    }

    /** Name below {@code reedling}, without subpackages: cell for reedling.cell.grid; empty for reedling itself. */
    static String nameOf(String packageName) {
        String[] parts = packageName.split("\\.");
        return parts.length > 1 ? parts[1] : "";
    }
}
