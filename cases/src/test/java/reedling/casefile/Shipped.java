// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import reedling.plugin.PluginLoader;

/** The shipped cases, read with the built-in plugins. */
final class Shipped {

    static final CasePlugins PLUGINS = new CasePlugins(PluginLoader.load(CasePlugins.SERVICES, Optional.empty()));

    private Shipped() {}

    /** Tests run in the folder of this module. */
    static Path file(String name) {
        return Path.of(name, "case.toml");
    }

    static CaseAssembly assemble(String name, String... assignments) {
        return CaseAssembly.make(CaseFile.read(file(name), List.of(assignments), PLUGINS), PLUGINS);
    }
}
