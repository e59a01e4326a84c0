// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import reedling.casefile.CaseReading;
import reedling.plugin.PluginCatalogue;

/** Runs a case from its start. Everything is checked, and the first grains placed, before the folder is made. */
@Command(
        name = "run",
        description = "Runs a case and writes its results into a folder.",
        mixinStandardHelpOptions = true)
final class RunCommand implements Callable<Integer> {

    @Mixin
    private final CaseOptions caseOptions = new CaseOptions();

    @Mixin
    private final RunOptions runOptions = new RunOptions();

    @Option(
            names = "--out",
            paramLabel = "FOLDER",
            description = "Folder for the results, new or empty (default: out/NAME, NAME from the case).")
    private @Nullable Path out;

    @Spec
    @SuppressWarnings("NullAway.Init") // set by the command line library before the command runs
    private CommandSpec spec;

    private final Ending ending;

    RunCommand(Ending ending) {
        this.ending = ending;
    }

    @Override
    public Integer call() {
        int threads = runOptions.threads();
        PluginCatalogue plugins = caseOptions.plugins();
        CaseReading reading = caseOptions.read(plugins);
        double until = runOptions.until(reading.specification().output().endTime());
        Path folder = out == null ? Path.of("out", caseOptions.name()) : out;
        CaseRun.refuseUsed(folder);
        return CaseRun.run(
                        reading, folder, until, plugins, threads, new CaseRun.Surroundings(ending, spec.commandLine()))
                .code()
                .number();
    }
}
