// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import picocli.CommandLine;
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

/** A case run from its start in a folder of its own. Threads: one. */
final class CaseRun {

    /**
     * What a run belongs to.
     *
     * @param ending what a signal does
     * @param commandLine where messages and the summary go
     */
    record Surroundings(Ending ending, CommandLine commandLine) {}

    private CaseRun() {}

    /**
     * Runs a case; everything is checked, and the first grains placed, before the folder is made.
     *
     * @param until time to stop at, s
     */
    static RunSession.Ended run(
            CaseReading reading,
            Path folder,
            double until,
            PluginCatalogue plugins,
            int threads,
            Surroundings surroundings) {
        CaseAssembly assembly = CaseAssembly.make(reading, new CasePlugins(plugins));
        RunPlan plan = assembly.plan(ProgramVersion.number(), CaseDigest.of(reading.resolvedText()));
        CommandLine line = surroundings.commandLine();
        reading.cautions().forEach(caution -> line.getErr().println("caution: " + caution));
        try (WorkerTeam team = new WorkerTeam(threads)) {
            Simulation simulation = new Simulation(assembly.model(), team);
            simulation.begin();
            RunSession session = new RunSession(simulation, plan, until, plugins, surroundings.ending(), line.getOut());
            return runIn(folder, session, reading.resolvedText());
        }
    }

    private static RunSession.Ended runIn(Path path, RunSession session, String resolvedCase) {
        try (RunFolder folder = RunFolder.create(path)) {
            WholeFile.writeText(folder.resolve(CaseOptions.CASE_FILE), resolvedCase);
            return session.run(folder, null);
        } catch (IOException cause) {
            throw RunSession.unusable(path, cause);
        }
    }

    static void refuseUsed(Path folder) {
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
