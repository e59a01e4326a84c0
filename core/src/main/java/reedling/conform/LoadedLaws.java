// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import reedling.contact.ContactLawProvider;
import reedling.plugin.PluginCatalogue;
import reedling.plugin.PluginLoader;
import reedling.plugin.PluginService;

/** Contact laws that are installed. */
public final class LoadedLaws {

    private static final PluginService<ContactLawProvider> CONTACT =
            new PluginService<>("contact", ContactLawProvider.class);

    private LoadedLaws() {}

    /** All laws of the class path. */
    public static List<ContactLawProvider> onClassPath() {
        return in(Optional.empty());
    }

    /** All laws of the class path and of the jars of a folder. */
    static List<ContactLawProvider> in(Optional<Path> folder) {
        return of(PluginLoader.load(List.of(CONTACT), folder));
    }

    /** All laws of a catalogue. */
    public static List<ContactLawProvider> of(PluginCatalogue plugins) {
        return plugins.names(CONTACT).stream()
                .map(name -> plugins.require(CONTACT, name, "conform"))
                .toList();
    }

    /** Stage of each law by its name, as written in cases. */
    public static Map<String, String> stages(PluginCatalogue plugins) {
        return of(plugins).stream()
                .collect(Collectors.toMap(
                        ContactLawProvider::name, law -> law.stage().name().toLowerCase(Locale.ROOT)));
    }
}
