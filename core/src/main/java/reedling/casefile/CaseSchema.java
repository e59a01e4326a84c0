// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.joml.Vector3dc;
import reedling.unit.Dimension;

/** The declarations of {@link CaseKeys} as JSON Schema, draft 2020-12, which TOML editors read. */
final class CaseSchema {

    private static final String NAMES = "^[A-Za-z][A-Za-z0-9_-]*$";

    String write() {
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("$schema", "https://json-schema.org/draft/2020-12/schema");
        schema.put("title", "Reedling case");
        schema.putAll(table(CaseKeys.ROOT, "", ""));
        return JsonText.write(schema);
    }

    /** A table; with a word key, that key is fixed to one word. */
    private Map<String, Object> table(Section section, String wordKey, String word) {
        Map<String, Object> properties = new LinkedHashMap<>();
        List<Object> required = new ArrayList<>();
        if (!wordKey.isEmpty()) {
            properties.put(wordKey, map("const", word));
            required.add(wordKey);
        }
        for (Key key : section.keys()) {
            properties.put(key.name(), described(key));
            if (key.required()) {
                required.add(key.name());
            }
        }
        Map<String, Object> schema = map("type", "object");
        schema.put("description", section.meaning());
        schema.put("properties", properties);
        if (!required.isEmpty()) {
            schema.put("required", required);
        }
        schema.put("additionalProperties", false);
        return schema;
    }

    private Map<String, Object> described(Key key) {
        Map<String, Object> schema = new LinkedHashMap<>(of(key.type()));
        schema.put("description", key.meaning() + " (" + TypeText.of(key.type()) + ")");
        key.fallback().ifPresent(value -> schema.put("default", json(value)));
        return schema;
    }

    private static Object json(Object value) {
        return switch (value) {
            case Vector3dc vector -> List.of(vector.x(), vector.y(), vector.z());
            case SearchMargin margin -> margin.value();
            default -> value;
        };
    }

    private Map<String, Object> of(ValueType type) {
        return switch (type) {
            case ValueType.Quantity quantity -> quantity(quantity);
            case ValueType.Vector vector -> list(quantity(new ValueType.Quantity(vector.dimension(), Range.ANY)), 3, 3);
            case ValueType.Whole whole -> {
                Map<String, Object> schema = map("type", "integer");
                schema.put("minimum", whole.minimum());
                if (whole.maximum() < Long.MAX_VALUE) {
                    schema.put("maximum", whole.maximum());
                }
                yield schema;
            }
            case ValueType.Flag flag -> map("type", "boolean");
            case ValueType.Text text -> map("type", "string");
            case ValueType.Reference reference -> map("type", "string");
            case ValueType.Choice choice -> map("enum", choice.words());
            case ValueType.Choices choices -> {
                Map<String, Object> schema =
                        list(map("enum", choices.words()), 0, choices.words().size());
                schema.put("uniqueItems", true);
                yield schema;
            }
            case ValueType.Couple couple -> list(map("type", "string"), 2, 2);
            case ValueType.Shares shares ->
                byName(quantity(new ValueType.Quantity(Dimension.NUMBER, Range.above(0, 1))));
            case ValueType.Margin margin -> map("type", List.of("number", "string"));
            case ValueType.Plugin plugin -> plugin(plugin.nameKey());
            case ValueType.Part part -> table(part.section(), "", "");
            case ValueType.Variants variants -> variants(variants);
            case ValueType.QuantityOr either ->
                map("anyOf", List.of(quantity(either.quantity()), variants(either.table())));
            case ValueType.Named named -> byName(of(named.entry()));
            case ValueType.Several several -> map("type", "array", "items", table(several.section(), "", ""));
        };
    }

    private static Map<String, Object> quantity(ValueType.Quantity type) {
        Map<String, Object> number = map("type", "number");
        Range range = type.range();
        if (range.minimum() != Double.NEGATIVE_INFINITY) {
            number.put(range.minimumOpen() ? "exclusiveMinimum" : "minimum", range.minimum());
        }
        if (range.maximum() != Double.POSITIVE_INFINITY) {
            number.put(range.maximumOpen() ? "exclusiveMaximum" : "maximum", range.maximum());
        }
        Map<String, Object> text = map("type", "string", "pattern", "^\\s*[+-]?[0-9.]");
        return map("anyOf", List.of(number, text));
    }

    private static Map<String, Object> plugin(String nameKey) {
        Map<String, Object> table = map("type", "object", "properties", map(nameKey, map("type", "string")));
        table.put("required", List.of(nameKey));
        return map("anyOf", List.of(map("type", "string"), table));
    }

    private Map<String, Object> variants(ValueType.Variants type) {
        List<Object> all = new ArrayList<>();
        type.sections().forEach((word, section) -> all.add(table(section, type.wordKey(), word)));
        return map("oneOf", all);
    }

    private static Map<String, Object> byName(Map<String, Object> entry) {
        Map<String, Object> schema = map("type", "object", "patternProperties", map(NAMES, entry));
        schema.put("additionalProperties", false);
        return schema;
    }

    private static Map<String, Object> list(Map<String, Object> item, int least, int most) {
        Map<String, Object> schema = map("type", "array", "items", item);
        schema.put("minItems", least);
        schema.put("maxItems", most);
        return schema;
    }

    private static Map<String, Object> map(Object... keysAndValues) {
        Map<String, Object> map = new LinkedHashMap<>();
        for (int k = 0; k < keysAndValues.length; k += 2) {
            map.put((String) keysAndValues[k], keysAndValues[k + 1]);
        }
        return map;
    }
}
