// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;
import java.util.Map;

/** Writes maps, lists, text, numbers and flags as indented JSON. */
final class JsonText {

    private JsonText() {}

    static String write(Object value) {
        StringBuilder out = new StringBuilder();
        write(value, "\n", out);
        return out.append('\n').toString();
    }

    private static void write(Object value, String newline, StringBuilder out) {
        String inner = newline + "  ";
        switch (value) {
            case Map<?, ?> map -> {
                out.append('{');
                String comma = "";
                for (Map.Entry<?, ?> entry : map.entrySet()) {
                    out.append(comma)
                            .append(inner)
                            .append(TomlText.quoted(entry.getKey().toString()))
                            .append(": ");
                    write(entry.getValue(), inner, out);
                    comma = ",";
                }
                out.append(map.isEmpty() ? "}" : newline + "}");
            }
            case List<?> list -> {
                out.append('[');
                String comma = "";
                for (Object item : list) {
                    out.append(comma).append(inner);
                    write(item, inner, out);
                    comma = ",";
                }
                out.append(list.isEmpty() ? "]" : newline + "]");
            }
            // the escapes that TOML and JSON share are all that is used
            case String text -> out.append(TomlText.quoted(text));
            default -> out.append(value);
        }
    }
}
