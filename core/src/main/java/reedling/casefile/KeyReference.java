// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;
import java.util.stream.Collectors;
import org.joml.Vector3dc;
import reedling.unit.QuantityText;

/** The declarations of {@link CaseKeys} as Markdown, one table of keys for each table of a case file. */
final class KeyReference {

    private final StringBuilder out = new StringBuilder();

    String write() {
        out.append("# Keys of a case file\n\n")
                .append("A bare number is in SI units; text may carry any unit of the right dimension, like `\"7"
                        + " mm\"`.\n");
        out.append("\n| table | | meaning |\n|---|---|---|\n");
        for (Key key : CaseKeys.ROOT.keys()) {
            String presence = key.required() ? "required" : "optional";
            out.append("| `" + key.name() + "` | " + presence + " | " + key.meaning() + " |\n");
        }
        CaseKeys.ROOT.keys().forEach(key -> described(key.name(), key.type(), key.meaning()));
        return out.toString();
    }

    /** Writes a heading and the keys of every table that a value may hold, then the tables inside it. */
    private void described(String path, ValueType type, String meaning) {
        switch (type) {
            case ValueType.Part part -> section("[" + path + "]", path, part.section());
            case ValueType.Several several -> section("[[" + path + "]]", path, several.section());
            case ValueType.Named named -> described(path + "." + named.noun(), named.entry(), meaning);
            case ValueType.QuantityOr either -> described(path, either.table(), meaning);
            case ValueType.Variants variants -> variants(path, variants);
            case ValueType.Plugin plugin ->
                heading("[" + path + "]", meaning + " " + capital(TypeText.of(plugin)) + ".");
            default -> {}
        }
    }

    /** One heading for all words that lead to the same keys. */
    private void variants(String path, ValueType.Variants type) {
        type.sections().values().stream().distinct().forEach(section -> {
            String words = type.sections().entrySet().stream()
                    .filter(entry -> entry.getValue().equals(section))
                    .map(entry -> "\"" + entry.getKey() + "\"")
                    .collect(Collectors.joining(" or "));
            section("[" + path + "] with " + type.wordKey() + " = " + words, path, section);
        });
    }

    private void heading(String title, String meaning) {
        out.append("\n## `").append(title).append("`\n\n").append(meaning).append('\n');
    }

    private void section(String title, String path, Section section) {
        heading(title, section.meaning());
        out.append("\n| key | value | default | meaning |\n|---|---|---|---|\n");
        for (Key key : section.keys()) {
            String fallback = key.required()
                    ? "required"
                    : key.fallback().map(v -> shown(key, v)).orElse("none");
            List<String> cells = List.of("`" + key.name() + "`", TypeText.of(key.type()), fallback, key.meaning());
            out.append(cells.stream().collect(Collectors.joining(" | ", "| ", " |\n")));
        }
        for (Key key : section.keys()) {
            boolean plugin = key.type() instanceof ValueType.Plugin;
            if (!plugin) {
                described(path + "." + key.name(), key.type(), key.meaning());
            }
        }
    }

    private static String shown(Key key, Object fallback) {
        if (fallback instanceof Double value && key.type() instanceof ValueType.Quantity quantity) {
            return QuantityText.of(value, quantity.dimension());
        }
        return switch (fallback) {
            case Vector3dc vector -> "[" + vector.x() + ", " + vector.y() + ", " + vector.z() + "]";
            case SearchMargin margin -> String.valueOf(margin.value());
            case String text -> TomlText.quoted(text);
            default -> fallback.toString();
        };
    }

    private static String capital(String text) {
        return Character.toUpperCase(text.charAt(0)) + text.substring(1);
    }
}
