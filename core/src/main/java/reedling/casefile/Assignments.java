// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import reedling.unit.Spelling;

/**
 * Lays {@code KEY=VALUE} assignments of the command line over a case before it is checked.
 *
 * <p>A key is written as findings write it: {@code wires.deck.tension}, {@code pairs[2].friction} (counted from 1). The
 * value is TOML. The table a key stands in must exist, unless it is one of the top level.
 */
final class Assignments {

    private static final Pattern STEP = Pattern.compile("([A-Za-z0-9_-]+)(?:\\[([0-9]{1,4})])?");

    private final Findings findings;

    private Assignments(Findings findings) {
        this.findings = findings;
    }

    static void apply(Node.Table root, List<String> assignments, Findings findings) {
        Assignments reader = new Assignments(findings);
        assignments.forEach(assignment -> reader.apply(root, assignment));
    }

    private void apply(Node.Table root, String assignment) {
        int equals = assignment.indexOf('=');
        if (equals < 1) {
            error("", TomlText.quoted(assignment), "KEY=VALUE", "Write for example --set output.end_time='\"2 s\"'.");
            return;
        }
        String key = assignment.substring(0, equals).strip();
        String text = assignment.substring(equals + 1).strip();
        Optional<Node> value = TomlTree.value(text);
        if (value.isEmpty()) {
            String remedy = "Put text and values with a unit in double quotes inside single ones: --set " + key + "='"
                    + TomlText.quoted(text.replace("\"", "").replace("'", "")) + "'.";
            error(key, text.isEmpty() ? "empty" : text + ", which is no TOML value", "a TOML value", remedy);
            return;
        }
        assign(root, key, value.get());
    }

    private void assign(Node.Table root, String key, Node value) {
        List<Matcher> steps = new ArrayList<>();
        for (String part : key.split("\\.", -1)) {
            Matcher step = STEP.matcher(part);
            if (!step.matches()) {
                error(key, "no key", "names joined by points, like wires.deck.tension", "Correct the key.");
                return;
            }
            steps.add(step);
        }
        Node.Table table = root;
        for (int k = 0; k < steps.size() - 1 && table != null; k++) {
            table = inner(table, steps.get(k), k == 0, key);
        }
        if (table != null) {
            put(table, steps.getLast(), key, value);
        }
    }

    private Node.@Nullable Table inner(Node.Table table, Matcher step, boolean top, String key) {
        String name = step.group(1);
        Node found = table.entries().get(name);
        if (step.group(2) != null) {
            found = item(found, step, key);
            if (found == null) {
                return null;
            }
        } else if (found == null && top) {
            found = Node.Table.empty(Place.COMMAND_LINE);
            table.entries().put(name, found);
        }
        if (found instanceof Node.Table inner) {
            return inner;
        }
        if (found == null) {
            error(key, "inside " + name + ", which the case does not have", names(table), suggestion(name, table));
        } else {
            String got = "inside " + name + ", which is " + found.shown();
            error(key, got, "a table", "Set the whole value: --set " + upTo(key, step.group()) + "={...}.");
        }
        return null;
    }

    private static String upTo(String key, String part) {
        return key.substring(0, key.indexOf(part) + part.length());
    }

    private static String names(Node.Table table) {
        Map<String, Node> entries = table.entries();
        return entries.isEmpty() ? "nothing there yet" : "one of " + String.join(", ", entries.keySet());
    }

    private static String suggestion(String name, Node.Table table) {
        return Spelling.nearest(name, table.entries().keySet())
                .map(near -> "Did you mean " + near + "?")
                .orElse("Assignments change a case; add new parts in the file.");
    }

    private @Nullable Node item(@Nullable Node list, Matcher step, String key) {
        int size = list instanceof Node.Sequence sequence ? sequence.items().size() : 0;
        int index = Integer.parseInt(step.group(2));
        if (list instanceof Node.Sequence sequence && index >= 1 && index <= size) {
            return sequence.items().get(index - 1);
        }
        String expected = size == 0 ? "a list at " + step.group(1) : "an index from 1 to " + size;
        error(key, "without item " + step.group(), expected, "Items are counted from 1, in file order.");
        return null;
    }

    private void put(Node.Table table, Matcher step, String key, Node value) {
        if (step.group(2) == null) {
            table.entries().put(step.group(1), value);
            return;
        }
        Node list = table.entries().get(step.group(1));
        if (item(list, step, key) != null && list instanceof Node.Sequence sequence) {
            sequence.items().set(Integer.parseInt(step.group(2)) - 1, value);
        }
    }

    private void error(String key, String got, String expected, String remedy) {
        findings.error(Place.COMMAND_LINE, key, got, expected, remedy);
    }
}
