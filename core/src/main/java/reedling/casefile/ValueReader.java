// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import org.joml.Vector3d;

/** Reads nodes as their declared types; what does not fit becomes a finding and an empty result. */
final class ValueReader {

    private static final String NAME = "[A-Za-z][A-Za-z0-9_-]*";

    private final Findings findings;
    private final NumberReader numbers;
    private final NameReader names;
    private final PluginReader plugins;

    ValueReader(Node.Table root, ProviderLookup lookup, Findings findings) {
        this.findings = findings;
        this.numbers = new NumberReader(findings);
        this.names = new NameReader(root, numbers, findings);
        this.plugins = new PluginReader(lookup, numbers, names, findings);
    }

    Optional<?> read(Node node, ValueType type, String path) {
        return switch (type) {
            case ValueType.Quantity quantity -> numbers.quantity(node, quantity, path);
            case ValueType.Vector vector -> vector(node, vector, path);
            case ValueType.Whole whole -> numbers.whole(node, whole, path);
            case ValueType.Margin margin -> numbers.margin(node, margin, path);
            case ValueType.Flag flag -> flag(node, path);
            case ValueType.Text text -> names.text(node, "text", path);
            case ValueType.Choice choice -> names.choice(node, choice.words(), path);
            case ValueType.Choices choices -> names.choices(node, choices.words(), path);
            case ValueType.Reference reference -> names.reference(node, reference.table(), path);
            case ValueType.Couple couple -> names.couple(node, couple.table(), path);
            case ValueType.Shares shares -> names.shares(node, shares.table(), path);
            case ValueType.Plugin plugin -> plugins.read(node, plugin, path);
            case ValueType.Part part -> asTable(node, type, path).map(table -> section(table, part.section(), path));
            case ValueType.Variants variants ->
                asTable(node, type, path).flatMap(table -> variant(table, variants, path));
            case ValueType.QuantityOr either ->
                node instanceof Node.Table
                        ? read(node, either.table(), path)
                        : numbers.quantity(node, either.quantity(), path);
            case ValueType.Named named -> asTable(node, type, path).map(table -> named(table, named, path));
            case ValueType.Several several -> several(node, several.section(), path);
        };
    }

    /** Reads a table; the result says whether all of it was sound. */
    Values section(Node.Table table, Section section, String path) {
        Map<String, Object> read = new LinkedHashMap<>();
        boolean sound = unknownKeys(table, section, path);
        for (Key key : section.keys()) {
            String inner = join(path, key.name());
            Node node = table.entries().get(key.name());
            Optional<?> value = node == null ? absent(table, key, inner) : read(node, key.type(), inner);
            value.ifPresent(v -> read.put(key.name(), v));
            boolean missing = value.isEmpty() && (node != null || key.required());
            sound &= !missing && value.map(ValueReader::sound).orElse(true);
        }
        return new Values(path, table.place(), read, sound);
    }

    static String join(String path, String name) {
        return path.isEmpty() ? name : path + "." + name;
    }

    private static boolean sound(Object value) {
        return !(value instanceof Values values) || values.sound();
    }

    private boolean unknownKeys(Node.Table table, Section section, String path) {
        boolean sound = true;
        for (Map.Entry<String, Node> entry : table.entries().entrySet()) {
            if (section.key(entry.getKey()).isEmpty()) {
                sound = false;
                findings.unknown(entry.getValue().place(), join(path, entry.getKey()), entry.getKey(), section.names());
            }
        }
        return sound;
    }

    private Optional<?> absent(Node.Table table, Key key, String path) {
        if (key.required()) {
            findings.missing(table.place(), path, TypeText.of(key.type()), key.meaning());
        }
        return key.type() instanceof ValueType.Plugin plugin && key.fallback().isPresent()
                ? plugins.read(new Node.Scalar(table.place(), key.fallback().get()), plugin, path)
                : key.fallback();
    }

    private Optional<Node.Table> asTable(Node node, ValueType type, String path) {
        if (node instanceof Node.Table table) {
            return Optional.of(table);
        }
        findings.error(node.place(), path, node.shown(), TypeText.of(type), "Write it as a table of keys.");
        return Optional.empty();
    }

    private Optional<Values> variant(Node.Table table, ValueType.Variants variants, String path) {
        List<String> words = List.copyOf(variants.sections().keySet());
        ValueType.Choice choice = new ValueType.Choice(words);
        String inner = join(path, variants.wordKey());
        Node word = table.entries().get(variants.wordKey());
        if (word == null) {
            findings.missing(table.place(), inner, TypeText.of(choice), "It decides which other keys belong here.");
            return Optional.empty();
        }
        Key wordKey = Key.required(variants.wordKey(), choice, "Which of the variants.");
        return names.choice(word, words, inner)
                .map(name -> section(
                        table,
                        Objects.requireNonNull(variants.sections().get(name)).after(List.of(wordKey)),
                        path));
    }

    private Map<String, Object> named(Node.Table table, ValueType.Named type, String path) {
        Map<String, Object> all = new LinkedHashMap<>();
        table.entries().forEach((name, node) -> {
            String inner = join(path, name);
            if (!name.matches(NAME)) {
                String remedy = "The name becomes part of file names and table headers.";
                findings.error(
                        node.place(),
                        inner,
                        "named " + TomlText.quoted(name),
                        "letters, digits, _ and -, " + "starting with a letter",
                        remedy);
            }
            read(node, type.entry(), inner).ifPresent(value -> all.put(name, value));
        });
        return all;
    }

    private Optional<List<Values>> several(Node node, Section section, String path) {
        if (!(node instanceof Node.Sequence list) || !list.items().stream().allMatch(Node.Table.class::isInstance)) {
            findings.error(node.place(), path, node.shown(), "a list of tables", "Write [[" + path + "]] for each.");
            return Optional.empty();
        }
        List<Values> all = new ArrayList<>();
        for (int k = 0; k < list.items().size(); k++) {
            all.add(section((Node.Table) list.items().get(k), section, path + "[" + (k + 1) + "]"));
        }
        return Optional.of(all);
    }

    private Optional<Boolean> flag(Node node, String path) {
        if (node instanceof Node.Scalar scalar && scalar.value() instanceof Boolean value) {
            return Optional.of(value);
        }
        findings.error(node.place(), path, node.shown(), "true or false", "Write true or false without quotes.");
        return Optional.empty();
    }

    private Optional<Vector3d> vector(Node node, ValueType.Vector type, String path) {
        if (!(node instanceof Node.Sequence list) || list.items().size() != 3) {
            findings.error(
                    node.place(), path, node.shown(), TypeText.of(type), "Write three components, like [0, 0, 1].");
            return Optional.empty();
        }
        double[] parts = new double[3];
        ValueType.Quantity part = new ValueType.Quantity(type.dimension(), Range.ANY);
        boolean whole = true;
        for (int k = 0; k < 3; k++) {
            Optional<Double> value = numbers.quantity(list.items().get(k), part, path + "[" + (k + 1) + "]");
            parts[k] = value.orElse(0.0);
            whole &= value.isPresent();
        }
        Vector3d vector = new Vector3d(parts[0], parts[1], parts[2]);
        if (whole && !type.zero() && vector.lengthSquared() == 0) {
            findings.error(node.place(), path, "[0, 0, 0]", TypeText.of(type), "Give it a direction.");
            return Optional.empty();
        }
        return whole ? Optional.of(vector) : Optional.empty();
    }
}
