// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.unit.Spelling;

/** All plugins of a run, by service and name; immutable. */
public final class PluginCatalogue {

    private final List<LoadedPlugin> plugins;

    PluginCatalogue(List<LoadedPlugin> plugins) {
        this.plugins = List.copyOf(plugins);
    }

    /** Provider of a name, if there is one. */
    public <P extends Provider> Optional<P> find(PluginService<P> service, String name) {
        return plugins.stream()
                .filter(plugin ->
                        plugin.service().equals(service) && plugin.name().equals(name))
                .map(plugin -> service.type().cast(plugin.provider()))
                .findFirst();
    }

    /**
     * Provider of a name that must exist.
     *
     * @param where what asks for it, e.g. a case file and line
     * @throws ReedlingException with {@link ExitCode#PLUGIN}, naming the alternatives and the nearest of them
     */
    public <P extends Provider> P require(PluginService<P> service, String name, String where) {
        return find(service, name)
                .orElseThrow(() -> new ReedlingException(ExitCode.PLUGIN, missing(service, name, where)));
    }

    /** The finding for a name that no plugin of the service has; for callers that collect findings. */
    public Finding missing(PluginService<?> service, String name, String where) {
        List<String> known = names(service);
        String suggestion = Spelling.nearest(name, known)
                .map(nearest -> "Did you mean " + nearest + "?")
                .orElse("Choose one of these, or name the folder of the jar that has it.");
        return new Finding(
                where,
                service.kind() + " plugin",
                '"' + name + '"',
                known.isEmpty() ? "a plugin, but none of this kind is installed" : String.join(", ", known),
                suggestion);
    }

    /** Names of a service's plugins, alphabetical. */
    public List<String> names(PluginService<?> service) {
        return plugins.stream()
                .filter(plugin -> plugin.service().equals(service))
                .map(LoadedPlugin::name)
                .sorted()
                .toList();
    }

    /** Every plugin in words, by kind, then name. */
    public List<PluginDescription> descriptions() {
        return plugins.stream()
                .map(LoadedPlugin::description)
                .sorted(Comparator.comparing(PluginDescription::kind).thenComparing(PluginDescription::name))
                .toList();
    }
}
