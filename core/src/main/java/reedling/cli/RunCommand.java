// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import reedling.casefile.CaseAssembly;
import reedling.casefile.CasePlugins;
import reedling.casefile.CaseReading;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.file.WholeFile;
import reedling.output.RunFolder;
import reedling.parallel.WorkerTeam;
import reedling.plugin.PluginCatalogue;
import reedling.run.RunPlan;
import reedling.run.Simulation;

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
        refuseUsed(folder);
        CaseAssembly assembly = CaseAssembly.make(reading, new CasePlugins(plugins));
        RunPlan plan = assembly.plan(ProgramVersion.number(), CaseDigest.of(reading.resolvedText()));
        reading.cautions().forEach(caution -> spec.commandLine().getErr().println("caution: " + caution));
        try (WorkerTeam team = new WorkerTeam(threads)) {
            Simulation simulation = new Simulation(assembly.model(), team);
            simulation.begin();
            RunSession session = new RunSession(
                    simulation, plan, until, plugins, ending, spec.commandLine().getOut());
            return runIn(folder, session, reading.resolvedText()).number();
        }
    }

    private static ExitCode runIn(Path path, RunSession session, String resolvedCase) {
        try (RunFolder folder = RunFolder.create(path)) {
            WholeFile.writeText(folder.resolve(CaseOptions.CASE_FILE), resolvedCase);
            return session.run(folder, null);
        } catch (IOException cause) {
            throw RunSession.unusable(path, cause);
        }
    }

    private static void refuseUsed(Path folder) {
        if (!Files.isDirectory(folder)) {
            return; // missing is right; a file is refused when the folder is made
        }
        try (Stream<Path> inside = Files.list(folder)) {
            if (inside.findAny().isPresent()) {
                throw new ReedlingException(
                        ExitCode.OUTPUT,
                        new Finding(
                                folder.toString(),
                                "",
                                "a folder that is not empty",
                                "a new or empty folder",
                                "Choose another with --out, remove it, or go on with the run in it: reedling resume "
                                        + folder));
            }
        } catch (IOException cause) {
            throw RunSession.unusable(folder, cause);
        }
    }
}
