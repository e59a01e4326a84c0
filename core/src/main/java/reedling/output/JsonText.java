// SPDX-License-Identifier: Apache-2.0
package reedling.output;

import java.util.List;
import java.util.Map;

/**
 * JSON text of maps, lists, texts, numbers and truth values, after RFC 8259 (Bray, The JavaScript Object Notation Data
 * Interchange Format, 2017). JSON has no word for a number that is not finite; it becomes {@code null}.
 */
public final class JsonText {

    private static final String INDENT = "  ";

    private final StringBuilder text = new StringBuilder();

    private JsonText() {}

    /**
     * Text of a value, two spaces a level, keys in the order of the map.
     *
     * @throws IllegalArgumentException for a value of any other type
     */
    public static String of(Object value) {
        JsonText json = new JsonText();
        json.append(value, "");
        return json.text.append('\n').toString();
    }

    private void append(Object value, String indent) {
        switch (value) {
            case Map<?, ?> map -> appendMap(map, indent);
            case List<?> list -> appendList(list, indent);
            case Double number -> text.append(Double.isFinite(number) ? number.toString() : "null");
            case Float number -> text.append(Float.isFinite(number) ? number.toString() : "null");
            case Integer number -> text.append(number);
            case Long number -> text.append(number);
            case Boolean truth -> text.append(truth);
            case CharSequence characters -> appendQuoted(characters);
            default ->
                throw new IllegalArgumentException(
                        "no JSON form of " + value.getClass().getName());
        }
    }

    private void appendMap(Map<?, ?> map, String indent) {
        String separator = "";
        text.append('{');
        for (Map.Entry<?, ?> entry : map.entrySet()) {
            text.append(separator).append('\n').append(indent).append(INDENT);
            appendQuoted(entry.getKey().toString());
            text.append(": ");
            append(entry.getValue(), indent + INDENT);
            separator = ",";
        }
        text.append(map.isEmpty() ? "}" : "\n" + indent + "}");
    }

    private void appendList(List<?> list, String indent) {
        String separator = "";
        text.append('[');
        for (Object element : list) {
            text.append(separator);
            append(element, indent + INDENT);
            separator = ", ";
        }
        text.append(']');
    }

    private void appendQuoted(CharSequence characters) {
        text.append('"');
        characters.chars().forEach(character -> {
            switch (character) {
                case '"' -> text.append("\\\"");
                case '\\' -> text.append("\\\\");
                case '\n' -> text.append("\\n");
                case '\r' -> text.append("\\r");
                case '\t' -> text.append("\\t");
                default -> {
                    // a '<' kept plain could end a script element when the record is put into a page
                    if (character < 0x20 || character == '<') {
                        text.append("\\u%04x".formatted(character));
                    } else {
                        text.append((char) character);
                    }
                }
            }
        });
        text.append('"');
    }
}
