// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import org.tomlj.Toml;
import org.tomlj.TomlArray;
import org.tomlj.TomlParseError;
import org.tomlj.TomlParseResult;
import org.tomlj.TomlPosition;
import org.tomlj.TomlTable;

/** Reads TOML text into nodes with places; faults of syntax become findings and the rest of the file is still read. */
final class TomlTree {

    private static final Pattern DEFINED_TWICE =
            Pattern.compile("(.+) previously defined at line (\\d+), column (\\d+)");
    private static final Pattern UNEXPECTED = Pattern.compile("Unexpected (.+), expected (.+)", Pattern.DOTALL);
    private static final String QUOTES = "Text, and values with a unit, stand in double quotes, like \"7 mm\".";

    private final String source;

    private TomlTree(String source) {
        this.source = source;
    }

    /**
     * The tree of a file's text.
     *
     * @param source file name for places
     */
    static Node.Table read(String text, String source, Findings findings) {
        TomlTree tree = new TomlTree(source);
        TomlParseResult result = Toml.parse(text);
        List<String> lines = text.lines().toList();
        int bodyEnd = 0;
        for (TomlParseError error : result.errors()) {
            findings.markIncomplete();
            int line = error.position().line();
            boolean twice =
                    DEFINED_TWICE.matcher(String.valueOf(error.getMessage())).matches();
            // keys below a table header that was used before are twice there too: one finding is enough
            if (!twice || line >= bodyEnd) {
                tree.report(error, findings);
            }
            if (twice && isHeader(lines, line)) {
                bodyEnd = nextHeader(lines, line);
            }
        }
        return tree.table(new Place(source, 1, 1), result);
    }

    private static boolean isHeader(List<String> lines, int line) {
        return line <= lines.size() && lines.get(line - 1).strip().startsWith("[");
    }

    private static int nextHeader(List<String> lines, int line) {
        int next = line + 1;
        while (next <= lines.size() && !isHeader(lines, next)) {
            next++;
        }
        return next;
    }

    /** A single value, as it may stand right of an equals sign; empty if it is malformed. */
    static Optional<Node> value(String text) {
        TomlParseResult result = Toml.parse("value = " + text);
        boolean alone = result.errors().isEmpty() && result.keySet().size() == 1;
        return alone
                ? Optional.of(everywhere(new TomlTree("").node(new Place("", 1, 1), result.get(List.of("value")))))
                : Optional.empty();
    }

    /** The same value, said to come from the command line. */
    private static Node everywhere(Node node) {
        return switch (node) {
            case Node.Scalar scalar -> new Node.Scalar(Place.COMMAND_LINE, scalar.value());
            case Node.Sequence list ->
                new Node.Sequence(
                        Place.COMMAND_LINE,
                        new ArrayList<>(
                                list.items().stream().map(TomlTree::everywhere).toList()));
            case Node.Table table -> {
                Node.Table copy = Node.Table.empty(Place.COMMAND_LINE);
                table.entries().forEach((name, inner) -> copy.entries().put(name, everywhere(inner)));
                yield copy;
            }
        };
    }

    private Node.Table table(Place place, TomlTable table) {
        List<Map.Entry<String, Node>> entries = new ArrayList<>();
        for (String key : table.keySet()) {
            Place at = place(table.inputPositionOf(List.of(key)));
            entries.add(Map.entry(key, node(at, table.get(List.of(key)))));
        }
        entries.sort(Comparator.comparing(entry -> entry.getValue().place()));
        Map<String, Node> inOrder = new LinkedHashMap<>();
        entries.forEach(entry -> inOrder.put(entry.getKey(), entry.getValue()));
        return new Node.Table(place, inOrder);
    }

    private Node node(Place place, @Nullable Object value) {
        return switch (value) {
            case TomlTable table -> table(place, table);
            case TomlArray array -> {
                List<Node> items = new ArrayList<>();
                for (int k = 0; k < array.size(); k++) {
                    items.add(node(place(array.inputPositionOf(k)), array.get(k)));
                }
                yield new Node.Sequence(place, items);
            }
            case null -> throw new IllegalStateException("a TOML key without value at " + place.where());
            default -> new Node.Scalar(place, value);
        };
    }

    private Place place(@Nullable TomlPosition position) {
        return position == null ? new Place(source, 1, 1) : new Place(source, position.line(), position.column());
    }

    private void report(TomlParseError error, Findings findings) {
        Place place = place(error.position());
        String message = String.valueOf(error.getMessage());
        Matcher twice = DEFINED_TWICE.matcher(message);
        Matcher unexpected = UNEXPECTED.matcher(message);
        if (twice.matches()) {
            Place first = new Place(source, Integer.parseInt(twice.group(2)), Integer.parseInt(twice.group(3)));
            String remedy = "The first stands at " + first.where() + "; rename or remove one of them.";
            findings.error(place, twice.group(1), "written twice", "each name once", remedy);
        } else if (unexpected.matches()) {
            findings.error(place, "TOML syntax", "broken by " + unexpected.group(1), unexpected.group(2), QUOTES);
        } else {
            findings.error(place, "TOML syntax", "broken: " + message, "TOML 1.0", QUOTES);
        }
    }
}
