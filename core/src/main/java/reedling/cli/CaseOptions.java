// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import reedling.casefile.CaseFile;
import reedling.casefile.CasePlugins;
import reedling.casefile.CaseReading;
import reedling.plugin.PluginCatalogue;

/** What names a case on the command line, shared by the commands that read one. */
final class CaseOptions {

    /** Name of a case file in its folder, and of the resolved case in a run folder. */
    static final String CASE_FILE = "case.toml";

    @Parameters(paramLabel = "CASE", description = "Case file, or the folder that holds its case.toml.")
    @SuppressWarnings("NullAway.Init") // set by the command line library before the command runs
    private Path given;

    @Option(
            names = "--set",
            paramLabel = "KEY=VALUE",
            description = "Sets a key of the case, the value in TOML: --set 'output.end_time=\"2 s\"'. Repeatable.")
    private List<String> assignments = new ArrayList<>();

    @Mixin
    private final PluginFolder pluginFolder = new PluginFolder();

    PluginCatalogue plugins() {
        return pluginFolder.load();
    }

    Path file() {
        return Files.isDirectory(given) ? given.resolve(CASE_FILE) : given;
    }

    CaseReading read(PluginCatalogue plugins) {
        return CaseFile.read(file(), assignments, new CasePlugins(plugins));
    }

    /** The case with another seed, whatever the command line sets. */
    CaseReading readWithSeed(PluginCatalogue plugins, long seed) {
        List<String> all = new ArrayList<>(assignments);
        all.add("case.seed=" + seed);
        return CaseFile.read(file(), all, new CasePlugins(plugins));
    }

    /** Name for the results: that of the folder of a file case.toml, otherwise that of the file without its ending. */
    String name() {
        Path file = file().toAbsolutePath().normalize();
        String name = String.valueOf(file.getFileName());
        Path folder = file.getParent();
        Path folderName = folder == null ? null : folder.getFileName();
        if (name.equals(CASE_FILE) && folderName != null) {
            return folderName.toString();
        }
        return name.endsWith(".toml") ? name.substring(0, name.length() - ".toml".length()) : name;
    }
}
