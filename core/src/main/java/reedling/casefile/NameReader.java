// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import reedling.unit.Dimension;
import reedling.unit.QuantityText;
import reedling.unit.Spelling;

/** Reads words, and names of other parts of the case. */
final class NameReader {

    private static final double SHARE_TOLERANCE = 1e-6;

    private final Node.Table root;
    private final NumberReader numbers;
    private final Findings findings;

    NameReader(Node.Table root, NumberReader numbers, Findings findings) {
        this.root = root;
        this.numbers = numbers;
        this.findings = findings;
    }

    Optional<String> text(Node node, String expected, String path) {
        if (node instanceof Node.Scalar scalar && scalar.value() instanceof String text) {
            return Optional.of(text);
        }
        findings.error(node.place(), path, node.shown(), expected, "Write it in double quotes.");
        return Optional.empty();
    }

    Optional<String> choice(Node node, List<String> words, String path) {
        String expected = TypeText.of(new ValueType.Choice(words));
        return text(node, expected, path).filter(word -> {
            boolean known = words.contains(word);
            if (!known) {
                findings.error(node.place(), path, node.shown(), expected, suggestion(word, words, "Choose one."));
            }
            return known;
        });
    }

    Optional<List<String>> choices(Node node, List<String> words, String path) {
        if (!(node instanceof Node.Sequence list)) {
            String expected = TypeText.of(new ValueType.Choices(words));
            findings.error(
                    node.place(), path, node.shown(), expected, "Write a list, like [\"" + words.get(0) + "\"].");
            return Optional.empty();
        }
        List<String> chosen = new ArrayList<>();
        for (int k = 0; k < list.items().size(); k++) {
            String inner = path + "[" + (k + 1) + "]";
            Node item = list.items().get(k);
            choice(item, words, inner).ifPresent(word -> {
                if (chosen.contains(word)) {
                    findings.error(item.place(), inner, item.shown() + " again", "each word once", "Remove one.");
                }
                chosen.add(word);
            });
        }
        return chosen.size() == list.items().size() ? Optional.of(List.copyOf(chosen)) : Optional.empty();
    }

    Optional<String> reference(Node node, String table, String path) {
        return text(node, "a name of " + table, path).filter(name -> known(node, name, table, path));
    }

    /** Number of a name in its table, counted from 0 in file order. */
    Optional<Double> number(Node node, String table, String path) {
        return reference(node, table, path).map(name -> (double) names(table).indexOf(name));
    }

    private List<String> names(String table) {
        return root.entries().get(table) instanceof Node.Table found
                ? List.copyOf(found.entries().keySet())
                : List.of();
    }

    private boolean known(Node node, String name, String table, String path) {
        List<String> names = names(table);
        if (names.contains(name)) {
            return true;
        }
        if (!findings.incomplete()) {
            String expected = names.isEmpty()
                    ? "a name of " + table + ", but the case has none"
                    : "one of " + table + ": " + String.join(", ", names);
            String remedy = suggestion(name, names, "Add [" + table + "." + name + "] or correct the name.");
            findings.error(node.place(), path, node.shown(), expected, remedy);
        }
        return false;
    }

    Optional<List<String>> couple(Node node, String table, String path) {
        if (!(node instanceof Node.Sequence list) || list.items().size() != 2) {
            String expected = TypeText.of(new ValueType.Couple(table));
            findings.error(node.place(), path, node.shown(), expected, "Write two names, which may be equal.");
            return Optional.empty();
        }
        Optional<String> first = reference(list.items().get(0), table, path + "[1]");
        Optional<String> second = reference(list.items().get(1), table, path + "[2]");
        return first.flatMap(one -> second.map(two -> List.of(one, two)));
    }

    Optional<Map<String, Double>> shares(Node node, String table, String path) {
        if (!(node instanceof Node.Table shares) || shares.entries().isEmpty()) {
            String expected = TypeText.of(new ValueType.Shares(table));
            findings.error(node.place(), path, node.shown(), expected, "Write it like {small = 0.3, large = 0.7}.");
            return Optional.empty();
        }
        Map<String, Double> read = new LinkedHashMap<>();
        ValueType.Quantity share = new ValueType.Quantity(Dimension.NUMBER, Range.above(0, 1));
        shares.entries().forEach((name, value) -> {
            String inner = ValueReader.join(path, name);
            Node nameNode = new Node.Scalar(value.place(), name);
            Optional<Double> number = numbers.quantity(value, share, inner);
            if (known(nameNode, name, table, inner)) {
                number.ifPresent(fraction -> read.put(name, fraction));
            }
        });
        boolean whole = read.size() == shares.entries().size();
        double sum = read.values().stream().mapToDouble(Double::doubleValue).sum();
        if (whole && Math.abs(sum - 1) > SHARE_TOLERANCE) {
            String got = "shares that add up to " + QuantityText.of(sum, Dimension.NUMBER);
            findings.error(node.place(), path, got, "a sum of 1", "Shares are fractions of the mass.");
            return Optional.empty();
        }
        return whole ? Optional.of(read) : Optional.empty();
    }

    static String suggestion(String word, List<String> known, String otherwise) {
        return Spelling.nearest(word, known)
                .map(near -> "Did you mean \"" + near + "\"?")
                .orElse(otherwise);
    }
}
