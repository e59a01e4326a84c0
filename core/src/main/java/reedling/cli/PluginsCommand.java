// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.io.PrintWriter;
import java.util.List;
import java.util.Map;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import reedling.conform.LoadedLaws;
import reedling.plugin.Parameter;
import reedling.plugin.PluginCatalogue;
import reedling.plugin.PluginDescription;

/** Lists every plugin with where it came from and what it takes. */
@Command(
        name = "plugins",
        description = "Lists the plugins found, where each came from and which parameters it takes.",
        mixinStandardHelpOptions = true)
final class PluginsCommand implements Runnable {

    @Mixin
    private final PluginFolder pluginFolder = new PluginFolder();

    @Option(names = "--json", description = "Print a JSON list.")
    private boolean json;

    @Spec
    @SuppressWarnings("NullAway.Init") // set by the command line library before the command runs
    private CommandSpec spec;

    @Override
    public void run() {
        PluginCatalogue catalogue = pluginFolder.load();
        List<PluginDescription> plugins = catalogue.descriptions();
        Map<String, String> stages = LoadedLaws.stages(catalogue);
        PrintWriter out = spec.commandLine().getOut();
        if (json) {
            out.println(PluginsJson.of(plugins, stages));
        } else if (plugins.isEmpty()) {
            out.println("No plugins were found.");
        } else {
            plugins.forEach(plugin -> print(out, plugin, stages));
        }
        out.flush();
    }

    private static void print(PrintWriter out, PluginDescription plugin, Map<String, String> stages) {
        String stage = plugin.kind().equals("contact") ? ", stage " + stages.get(plugin.name()) : "";
        out.printf("%-9s %s %s%s%n", plugin.kind(), plugin.name(), plugin.version(), stage);
        out.printf("          %s%n", plugin.summary());
        out.printf("          Source: %s%n", plugin.source());
        out.printf("          Jar: %s%n", plugin.jar());
        for (Parameter parameter : plugin.parameters()) {
            out.printf("          %s (%s): %s%n", parameter.name(), accepted(parameter), parameter.meaning());
        }
    }

    private static String accepted(Parameter parameter) {
        String fallback = parameter.wording().fallback();
        return switch (parameter.kind()) {
            case NUMBER ->
                parameter.dimension().siUnit() + ", " + parameter.minimum() + " .. " + parameter.maximum() + ", "
                        + (parameter.obligatory() ? "no default" : "default " + parameter.defaultValue());
            case CHOICE -> String.join(" | ", parameter.wording().choices()) + ", default " + fallback;
            case FILE -> "path of a file, optional";
            case LOT -> "name of a lot, default all";
        };
    }
}
