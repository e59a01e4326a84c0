// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.nio.file.Path;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;
import reedling.plugin.PluginCatalogue;
import reedling.plugin.PluginLoader;

/** The option that names a folder of plugin jars, shared by all commands that need plugins. */
final class PluginFolder {

    @Option(names = "--plugins", paramLabel = "FOLDER", description = "Folder of further plugin jars.")
    private @Nullable Path folder;

    PluginCatalogue load() {
        return PluginLoader.load(PluginServices.ALL, Optional.ofNullable(folder));
    }
}
