// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;
import java.util.Map;
import reedling.unit.Dimension;

/** What a key may hold; validation, JSON Schema and key reference are all made from these declarations. */
sealed interface ValueType {

    /** Bare number in SI, or text with a unit. Read as Double. */
    record Quantity(Dimension dimension, Range range) implements ValueType {}

    /** Three quantities. Read as Vector3dc. @param zero whether the zero vector is accepted */
    record Vector(Dimension dimension, boolean zero) implements ValueType {}

    /** Whole number. Read as Long. */
    record Whole(long minimum, long maximum) implements ValueType {}

    /** true or false. Read as Boolean. */
    record Flag() implements ValueType {}

    /** Any text. Read as String. */
    record Text() implements ValueType {}

    /** One of some words. Read as String. */
    record Choice(List<String> words) implements ValueType {}

    /** Different words out of some. Read as a list of String. */
    record Choices(List<String> words) implements ValueType {}

    /** Name of an entry of a top-level table. Read as String. */
    record Reference(String table) implements ValueType {}

    /** Two names of entries of a top-level table, may be equal. Read as a list of String. */
    record Couple(String table) implements ValueType {}

    /** Entry names with positive shares that add up to 1. Read as a map of String to Double. */
    record Shares(String table) implements ValueType {}

    /** Bare number as a fraction, or text with a unit of length. Read as {@link SearchMargin}. */
    record Margin(Range fraction, Range length) implements ValueType {}

    /** Name of a plugin, or a table with its name and parameters. Read as {@link PluginChoice}. */
    record Plugin(ProviderKind kind, String nameKey) implements ValueType {}

    /** A table. Read as {@link Values}. */
    record Part(Section section) implements ValueType {}

    /** A table whose keys depend on one word in it. Read as {@link Values} that hold the word too. */
    record Variants(String wordKey, Map<String, Section> sections) implements ValueType {}

    /** A quantity, or a table in its place. Read as Double or {@link Values}. */
    record QuantityOr(Quantity quantity, Variants table) implements ValueType {}

    /** Tables by a name the user chooses. Read as a map of String to what the entry type is read as. */
    record Named(ValueType entry, String noun) implements ValueType {}

    /** List of tables. Read as a list of {@link Values}. */
    record Several(Section section) implements ValueType {}
}
