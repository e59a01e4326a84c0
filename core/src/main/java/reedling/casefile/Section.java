// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Declaration of a table.
 *
 * @param meaning what the table describes, one sentence
 * @param keys its keys, in the order the reference lists them
 */
record Section(String meaning, List<Key> keys) {

    Section {
        keys = List.copyOf(keys);
    }

    static Section of(String meaning, Key... keys) {
        return new Section(meaning, List.of(keys));
    }

    /** The same with more keys in front. */
    Section after(List<Key> first) {
        List<Key> all = new ArrayList<>(first);
        all.addAll(keys);
        return new Section(meaning, all);
    }

    Optional<Key> key(String name) {
        return keys.stream().filter(key -> key.name().equals(name)).findFirst();
    }

    List<String> names() {
        return keys.stream().map(Key::name).toList();
    }
}
