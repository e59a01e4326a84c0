// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/** A piece of a case file with its place; tables are filled while reading and left alone afterwards. */
sealed interface Node {

    Place place();

    /** As messages quote it. */
    String shown();

    /** Text that TOML reads as the same value. */
    String toml();

    /**
     * Text, whole number, number, flag or date.
     *
     * @param value String, Long, Double, Boolean or a java.time value
     */
    record Scalar(Place place, Object value) implements Node {

        @Override
        public String shown() {
            return value instanceof String text ? TomlText.quoted(text) : value.toString();
        }

        @Override
        public String toml() {
            return shown();
        }
    }

    /** Array of values, or of tables. */
    record Sequence(Place place, List<Node> items) implements Node {

        @Override
        public String shown() {
            boolean plain = items.size() <= 6 && items.stream().allMatch(Scalar.class::isInstance);
            return plain ? toml() : "a list of " + items.size();
        }

        @Override
        public String toml() {
            return items.stream().map(Node::toml).collect(Collectors.joining(", ", "[", "]"));
        }
    }

    /** Table; entries in file order. */
    record Table(Place place, Map<String, Node> entries) implements Node {

        static Table empty(Place place) {
            return new Table(place, new LinkedHashMap<>());
        }

        @Override
        public String shown() {
            return "a table";
        }

        @Override
        public String toml() {
            return entries.entrySet().stream()
                    .map(entry -> TomlText.key(entry.getKey()) + " = "
                            + entry.getValue().toml())
                    .collect(Collectors.joining(", ", "{", "}"));
        }
    }
}
