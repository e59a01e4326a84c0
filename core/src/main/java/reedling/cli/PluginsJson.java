// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import reedling.plugin.Parameter;
import reedling.plugin.PluginDescription;

/** Plugins as a JSON list (RFC 8259), the same facts as the text list. */
final class PluginsJson {

    private PluginsJson() {}

    /**
     * @param stages stage of each contact law by its name
     */
    static String of(List<PluginDescription> plugins, Map<String, String> stages) {
        return plugins.stream()
                .map(plugin -> plugin(plugin, plugin.kind().equals("contact") ? stages.get(plugin.name()) : null))
                .collect(Collectors.joining(",\n ", "[", "]"));
    }

    private static String plugin(PluginDescription plugin, @Nullable String stage) {
        String parameters =
                plugin.parameters().stream().map(PluginsJson::parameter).collect(Collectors.joining(", "));
        return "{" + member("name", plugin.name()) + ", " + member("kind", plugin.kind()) + ", "
                + (stage == null ? "" : member("stage", stage) + ", ")
                + member("version", plugin.version()) + ", " + member("jar", plugin.jar()) + ", "
                + member("summary", plugin.summary()) + ", " + member("source", plugin.source())
                + ", \"parameters\": [" + parameters + "]}";
    }

    private static String parameter(Parameter parameter) {
        return parameter.kind() == Parameter.Kind.NUMBER ? number(parameter) : word(parameter);
    }

    private static String word(Parameter parameter) {
        String choices = parameter.wording().choices().stream()
                .map(PluginsJson::quoted)
                .collect(Collectors.joining(", ", "[", "]"));
        String kind = parameter.kind().name().toLowerCase(Locale.ROOT);
        return "{" + member("name", parameter.name()) + ", " + member("kind", kind) + ", \"choices\": " + choices + ", "
                + member("default", parameter.wording().fallback()) + ", " + member("meaning", parameter.meaning())
                + "}";
    }

    private static String number(Parameter parameter) {
        return "{" + member("name", parameter.name()) + ", "
                + member("unit", parameter.dimension().siUnit()) + ", \"minimum\": "
                + number(parameter.minimum()) + ", \"maximum\": " + number(parameter.maximum()) + ", \"default\": "
                + number(parameter.defaultValue()) + ", " + member("meaning", parameter.meaning()) + "}";
    }

    private static String member(String key, String value) {
        return quoted(key) + ": " + quoted(value);
    }

    /** JSON has no NaN or infinity: no default and no bound are null. */
    private static String number(double value) {
        return Double.isFinite(value) ? Double.toString(value) : "null";
    }

    private static String quoted(String text) {
        StringBuilder escaped = new StringBuilder("\"");
        for (char letter : text.toCharArray()) {
            if (letter == '"' || letter == '\\') {
                escaped.append('\\').append(letter);
            } else if (letter < ' ') {
                escaped.append(String.format("\\u%04x", (int) letter));
            } else {
                escaped.append(letter);
            }
        }
        return escaped.append('"').toString();
    }
}
