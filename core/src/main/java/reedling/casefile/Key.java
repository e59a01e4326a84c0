// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.Optional;
import reedling.unit.Dimension;

/**
 * Declaration of one key.
 *
 * @param name snake_case, as written
 * @param type what it may hold
 * @param required whether it must be there
 * @param fallback value when it is absent, as its type is read (SI); empty if its absence means something itself
 * @param meaning one or two sentences for the reference, the schema and messages
 */
record Key(String name, ValueType type, boolean required, Optional<Object> fallback, String meaning) {

    static Key required(String name, ValueType type, String meaning) {
        return new Key(name, type, true, Optional.empty(), meaning);
    }

    static Key optional(String name, ValueType type, String meaning) {
        return new Key(name, type, false, Optional.empty(), meaning);
    }

    static Key preset(String name, ValueType type, Object fallback, String meaning) {
        return new Key(name, type, false, Optional.of(fallback), meaning);
    }

    static ValueType quantity(Dimension dimension, Range range) {
        return new ValueType.Quantity(dimension, range);
    }

    static ValueType vector(Dimension dimension) {
        return new ValueType.Vector(dimension, true);
    }

    static ValueType direction() {
        return new ValueType.Vector(Dimension.NUMBER, false);
    }
}
