// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;
import reedling.plugin.Provider;

/** Reads the name of a plugin with its parameters and checks them against what the plugin declares. */
final class PluginReader {

    private final ProviderLookup lookup;
    private final NumberReader numbers;
    private final NameReader names;
    private final Findings findings;

    PluginReader(ProviderLookup lookup, NumberReader numbers, NameReader names, Findings findings) {
        this.lookup = lookup;
        this.numbers = numbers;
        this.names = names;
        this.findings = findings;
    }

    Optional<PluginChoice> read(Node node, ValueType.Plugin type, String path) {
        Node.Table table;
        if (node instanceof Node.Table given) {
            table = given;
        } else if (node instanceof Node.Scalar scalar && scalar.value() instanceof String) {
            table = Node.Table.empty(node.place());
            table.entries().put(type.nameKey(), node);
        } else {
            String remedy = "Write \"NAME\" or {" + type.nameKey() + " = \"NAME\", parameter = value}.";
            findings.error(node.place(), path, node.shown(), TypeText.of(type), remedy);
            return Optional.empty();
        }
        return provider(table, type, path).flatMap(provider -> parameters(table, provider, type.nameKey(), path));
    }

    private Optional<? extends Provider> provider(Node.Table table, ValueType.Plugin type, String path) {
        String noun = type.kind().noun();
        Node node = table.entries().get(type.nameKey());
        if (node == null) {
            String inner = ValueReader.join(path, type.nameKey());
            findings.missing(table.place(), inner, "the name of " + noun, "It decides which parameters belong here.");
            return Optional.empty();
        }
        if (!(node instanceof Node.Scalar scalar) || !(scalar.value() instanceof String name)) {
            findings.error(node.place(), path, node.shown(), "the name of " + noun, "Write it in double quotes.");
            return Optional.empty();
        }
        List<? extends Provider> providers = lookup.providers(type.kind());
        Optional<? extends Provider> found = providers.stream()
                .filter(provider -> provider.name().equals(name))
                .findFirst();
        if (found.isEmpty()) {
            List<String> names = providers.stream().map(Provider::name).sorted().toList();
            String expected =
                    names.isEmpty() ? noun + ", but none is installed" : noun + ": " + String.join(", ", names);
            String remedy = NameReader.suggestion(name, names, "Correct the name, or add the plugin that has it.");
            findings.error(node.place(), path, node.shown(), expected, remedy);
        }
        return found;
    }

    private Optional<PluginChoice> parameters(Node.Table table, Provider provider, String nameKey, String path) {
        Map<String, Double> numbersGiven = new LinkedHashMap<>();
        Map<String, String> wordsGiven = new LinkedHashMap<>();
        boolean sound = noOthers(table, provider, nameKey, path);
        for (Parameter parameter : provider.parameters()) {
            String inner = ValueReader.join(path, parameter.name());
            Node node = table.entries().get(parameter.name());
            if (node == null && parameter.obligatory()) {
                findings.missing(table.place(), inner, TypeText.of(quantity(parameter)), parameter.meaning());
                sound = false;
            } else if (node != null) {
                sound &= switch (parameter.kind()) {
                    case NUMBER -> kept(numbers.quantity(node, quantity(parameter), inner), parameter, numbersGiven);
                    case LOT -> kept(names.number(node, "lots", inner), parameter, numbersGiven);
                    case FILE -> kept(names.text(node, "the path of a file", inner), parameter, wordsGiven);
                    case CHOICE ->
                        kept(names.choice(node, parameter.wording().choices(), inner), parameter, wordsGiven);
                };
            }
        }
        ParameterValues values = ParameterValues.of(provider, numbersGiven, wordsGiven);
        return sound ? Optional.of(new PluginChoice(provider.name(), values)) : Optional.empty();
    }

    private static ValueType.Quantity quantity(Parameter parameter) {
        return new ValueType.Quantity(parameter.dimension(), Range.closed(parameter.minimum(), parameter.maximum()));
    }

    private static <T> boolean kept(Optional<T> value, Parameter parameter, Map<String, T> given) {
        value.ifPresent(read -> given.put(parameter.name(), read));
        return value.isPresent();
    }

    private boolean noOthers(Node.Table table, Provider provider, String nameKey, String path) {
        List<String> known = new ArrayList<>(List.of(nameKey));
        provider.parameters().forEach(parameter -> known.add(parameter.name()));
        boolean sound = true;
        for (Map.Entry<String, Node> entry : table.entries().entrySet()) {
            if (!known.contains(entry.getKey())) {
                findings.unknown(
                        entry.getValue().place(), ValueReader.join(path, entry.getKey()), entry.getKey(), known);
                sound = false;
            }
        }
        return sound;
    }
}
