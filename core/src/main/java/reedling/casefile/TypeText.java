// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/** Says in words what a key may hold, for messages and the key reference. */
final class TypeText {

    private TypeText() {}

    static String of(ValueType type) {
        return switch (type) {
            case ValueType.Quantity q ->
                ranged(q.dimension().phrase(), q.range().text(q.dimension()));
            case ValueType.Vector v ->
                "three components, each " + v.dimension().phrase() + (v.zero() ? "" : ", not all zero");
            case ValueType.Whole w ->
                w.maximum() == Long.MAX_VALUE
                        ? "a whole number ≥ " + w.minimum()
                        : "a whole number from " + w.minimum() + " to " + w.maximum();
            case ValueType.Flag f -> "true or false";
            case ValueType.Text t -> "text";
            case ValueType.Choice c -> "one of " + String.join(", ", c.words());
            case ValueType.Choices c -> "a list out of " + String.join(", ", c.words());
            case ValueType.Reference r -> "a name of " + r.table();
            case ValueType.Couple c -> "two names of " + c.table();
            case ValueType.Shares s -> "a table of names of " + s.table() + " and mass shares that add up to 1";
            case ValueType.Margin m -> "a number (fraction of the smallest radius), or text with a length";
            case ValueType.Plugin p -> "the name of " + p.kind().noun() + ", or a table with it and its parameters";
            case ValueType.Part p -> "a table";
            case ValueType.Variants v ->
                "a table with " + v.wordKey() + " = "
                        + String.join(" or ", v.sections().keySet());
            case ValueType.QuantityOr q -> of(q.quantity()) + ", or " + of(q.table());
            case ValueType.Named n -> "tables by name";
            case ValueType.Several s -> "a list of tables";
        };
    }

    private static String ranged(String phrase, String range) {
        return range.isEmpty() ? phrase : phrase + ", " + range;
    }
}
