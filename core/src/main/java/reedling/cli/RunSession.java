// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import reedling.checkpoint.CheckpointFolder;
import reedling.checkpoint.CheckpointReader;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.output.RunFolder;
import reedling.output.SnapshotWriter;
import reedling.output.WriteQueue;
import reedling.plugin.PluginCatalogue;
import reedling.run.Progress;
import reedling.run.ProgressText;
import reedling.run.RunLoop;
import reedling.run.RunOutput;
import reedling.run.RunPlan;
import reedling.run.Simulation;
import reedling.run.StopFlag;

/**
 * One stretch of a run, from its start or a checkpoint to an end. Threads: one.
 *
 * @param simulation begun, or made and to be restored
 * @param plan of the run
 * @param until time to stop at, s
 * @param plugins writers of snapshots
 * @param ending what a signal does
 * @param out where the summary goes
 */
record RunSession(
        Simulation simulation, RunPlan plan, double until, PluginCatalogue plugins, Ending ending, PrintWriter out) {

    private static final int WAITING_JOBS = 3;
    private static final int COLUMNS = 80;

    /**
     * How a run went.
     *
     * @param code exit code
     * @param results figures by name
     */
    record Ended(ExitCode code, Map<String, Double> results) {}

    /** Runs in a held folder; from a checkpoint, if one is given. */
    Ended run(RunFolder folder, @Nullable CheckpointReader checkpoint) throws IOException {
        StopFlag stop = new StopFlag();
        double resumeTime =
                checkpoint == null ? Double.NaN : checkpoint.header().time();
        CheckpointFolder checkpoints = checkpoint == null
                ? CheckpointFolder.create(folder.path())
                : CheckpointFolder.resume(folder.path(), checkpoint.file());
        try (WriteQueue queue = new WriteQueue(WAITING_JOBS)) {
            RunOutput output =
                    new RunOutput(folder, queue, writers(folder.path(), resumeTime), checkpoints, progress());
            try (RunLoop loop = new RunLoop(simulation, plan, output, simulation::persistents, stop, resumeTime)) {
                if (checkpoint != null) {
                    loop.restore(checkpoint);
                }
                ending.stopOnSignal(stop);
                RunLoop.Outcome outcome = loop.run(until);
                return new Ended(report(folder.path(), outcome, loop.summary()), loop.results());
            }
        }
    }

    private List<SnapshotWriter> writers(Path folder, double resumeTime) throws IOException {
        List<SnapshotWriter> writers = new ArrayList<>();
        for (String name : plugins.names(PluginServices.SNAPSHOT)) {
            writers.add(plugins.require(PluginServices.SNAPSHOT, name, "run").open(folder, resumeTime));
        }
        return writers;
    }

    private static Progress progress() {
        boolean terminal = System.console() != null && System.console().isTerminal();
        return new ProgressText(System.err, terminal, COLUMNS, System::nanoTime);
    }

    private ExitCode report(Path folder, RunLoop.Outcome outcome, String summary) {
        out.print(summary);
        out.println();
        out.println("Results: " + folder);
        if (outcome == RunLoop.Outcome.STOPPED) {
            out.println("Stopped by a signal; go on with: reedling resume " + folder);
        } else if (until < plan.endTime()) {
            out.println("Stopped as asked; go on with: reedling resume " + folder);
        }
        out.flush();
        return outcome == RunLoop.Outcome.STOPPED ? ExitCode.STOPPED : ExitCode.OK;
    }

    /** What the user is told when a folder cannot be read or written. */
    static ReedlingException unusable(Path folder, IOException cause) {
        return new ReedlingException(
                ExitCode.INPUT_OUTPUT,
                new Finding(
                        folder.toString(),
                        "",
                        "not readable or not writable: " + cause,
                        "a folder that can be read and written",
                        "Check its permissions and free space, then resume."),
                cause);
    }
}
