// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import reedling.plugin.Parameter;
import reedling.plugin.Provider;

/**
 * Makes the paths of files that fields and contact laws read whole, before the case is resolved: relative ones start at the
 * folder of the case file. So the resolved case in a run folder finds the same files when the run is resumed.
 */
final class FileAnchors {

    private static final String NAME_KEY = "law";

    private static final Map<String, ProviderKind> LAWS = Map.of(
            "normal", ProviderKind.NORMAL,
            "tangential", ProviderKind.TANGENTIAL,
            "rolling", ProviderKind.ROLLING);

    private final Path folder;
    private final ProviderLookup lookup;

    FileAnchors(Path folder, ProviderLookup lookup) {
        this.folder = folder;
        this.lookup = lookup;
    }

    void apply(Node.Table root) {
        if (root.entries().get("fields") instanceof Node.Table fields) {
            fields.entries().values().forEach(field -> plugin(field, ProviderKind.FIELD));
        }
        if (root.entries().get("laws") instanceof Node.Table laws) {
            LAWS.forEach((stage, kind) -> {
                Node law = laws.entries().get(stage);
                if (law != null) {
                    plugin(law, kind);
                }
            });
        }
    }

    private void plugin(Node node, ProviderKind kind) {
        if (!(node instanceof Node.Table table) || !(table.entries().get(NAME_KEY) instanceof Node.Scalar name)) {
            return; // the reader says what is wrong
        }
        List<? extends Provider> providers = lookup.providers(kind);
        for (Provider provider : providers) {
            if (provider.name().equals(name.value())) {
                provider.parameters().stream()
                        .filter(parameter -> parameter.kind() == Parameter.Kind.FILE)
                        .forEach(parameter -> table.entries().computeIfPresent(parameter.name(), this::anchored));
            }
        }
    }

    private Node anchored(String key, Node node) {
        if (node instanceof Node.Scalar scalar && scalar.value() instanceof String text && !text.isEmpty()) {
            try {
                String whole = folder.resolve(text).normalize().toString();
                return new Node.Scalar(node.place(), whole);
            } catch (InvalidPathException e) {
                return node; // opening it will fail with its name
            }
        }
        return node;
    }
}
