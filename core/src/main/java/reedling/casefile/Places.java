// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.HashMap;
import java.util.Map;

/** Where each key of a case was written, by its dotted path. */
final class Places {

    private final Map<String, Place> byPath = new HashMap<>();

    Places(Node.Table root) {
        add("", root);
    }

    private void add(String path, Node node) {
        byPath.put(path, node.place());
        switch (node) {
            case Node.Table table -> table.entries().forEach((name, inner) -> add(ValueReader.join(path, name), inner));
            case Node.Sequence list -> {
                for (int k = 0; k < list.items().size(); k++) {
                    add(path + "[" + (k + 1) + "]", list.items().get(k));
                }
            }
            case Node.Scalar scalar -> {}
        }
    }

    /** Place of a path, or of the nearest table around it that was written. */
    Place of(String path) {
        String inner = path;
        Place place = byPath.get(inner);
        while (place == null) {
            int cut = Math.max(inner.lastIndexOf('.'), inner.lastIndexOf('['));
            inner = cut < 0 ? "" : inner.substring(0, cut);
            place = byPath.get(inner);
        }
        return place;
    }
}
