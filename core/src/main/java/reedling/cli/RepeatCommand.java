// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import reedling.casefile.CaseReading;
import reedling.error.ExitCode;
import reedling.file.WholeFile;
import reedling.plugin.PluginCatalogue;

/** Runs a case once for each seed, one after the other, and averages what {@code run.json} holds under "results". */
@Command(
        name = "repeat",
        description = "Runs a case with several seeds and averages the results.",
        mixinStandardHelpOptions = true)
final class RepeatCommand implements Callable<Integer> {

    @Mixin
    private final CaseOptions caseOptions = new CaseOptions();

    @Mixin
    private final RunOptions runOptions = new RunOptions();

    @Option(
            names = "--seeds",
            paramLabel = "SEEDS",
            required = true,
            description = "A range such as 1..5, or a list such as 3,7,20.")
    @SuppressWarnings("NullAway.Init") // set by the command line library before the command runs
    private String seeds;

    @Option(
            names = "--out",
            paramLabel = "FOLDER",
            description = "Folder for one run folder a seed, seed-N, and repeat.csv; new or empty"
                    + " (default: out/NAME-repeat, NAME from the case).")
    private @Nullable Path out;

    @Spec
    @SuppressWarnings("NullAway.Init") // set by the command line library before the command runs
    private CommandSpec spec;

    private final Ending ending;

    RepeatCommand(Ending ending) {
        this.ending = ending;
    }

    @Override
    public Integer call() {
        List<Long> all = SeedList.of(seeds);
        int threads = runOptions.threads();
        PluginCatalogue plugins = caseOptions.plugins();
        Path folder = out == null ? Path.of("out", caseOptions.name() + "-repeat") : out;
        CaseRun.refuseUsed(folder);
        RepeatedFigures figures = new RepeatedFigures();
        for (long seed : all) {
            CaseReading reading = caseOptions.readWithSeed(plugins, seed);
            double until = runOptions.until(reading.specification().output().endTime());
            RunSession.Ended ended = CaseRun.run(
                    reading,
                    folder.resolve("seed-" + seed),
                    until,
                    plugins,
                    threads,
                    new CaseRun.Surroundings(ending, spec.commandLine()));
            if (ended.code() != ExitCode.OK) {
                return ended.code().number();
            }
            figures.add(seed, ended.results());
            save(folder, figures);
        }
        spec.commandLine().getOut().print("\n" + figures.text());
        spec.commandLine().getOut().flush();
        return ExitCode.OK.number();
    }

    /** After each run, so that a signal loses nothing that is known. */
    private static void save(Path folder, RepeatedFigures figures) {
        try {
            Files.createDirectories(folder);
            WholeFile.writeText(folder.resolve("repeat.csv"), figures.table());
        } catch (IOException cause) {
            throw RunSession.unusable(folder, cause);
        }
    }
}
