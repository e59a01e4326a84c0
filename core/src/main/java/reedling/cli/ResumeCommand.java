// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import reedling.casefile.CaseAssembly;
import reedling.casefile.CaseFile;
import reedling.casefile.CasePlugins;
import reedling.casefile.CaseReading;
import reedling.checkpoint.CheckpointFolder;
import reedling.checkpoint.CheckpointHeader;
import reedling.checkpoint.CheckpointReader;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.output.RunFolder;
import reedling.parallel.WorkerTeam;
import reedling.plugin.PluginCatalogue;
import reedling.run.RunPlan;
import reedling.run.Simulation;

/** Goes on with a run from its newest good checkpoint, with the case that lies in its folder. */
@Command(
        name = "resume",
        description = "Goes on with a run that was stopped, from its newest checkpoint.",
        mixinStandardHelpOptions = true)
final class ResumeCommand implements Callable<Integer> {

    private static final String END_TIME = "output.end_time";

    /** Keys that change no bit of the simulation. */
    private static final Set<String> HARMLESS = Set.of(
            END_TIME,
            "output.snapshot_every",
            "output.table_every",
            "output.checkpoint_every",
            "output.checkpoint_every_wall");

    @Parameters(paramLabel = "FOLDER", description = "Folder of the run.")
    @SuppressWarnings("NullAway.Init") // set by the command line library before the command runs
    private Path path;

    @Option(
            names = "--set",
            paramLabel = "KEY=VALUE",
            description = "Sets output.end_time or an interval of [output] for this stretch. Repeatable.")
    private List<String> assignments = new ArrayList<>();

    @Mixin
    private final PluginFolder pluginFolder = new PluginFolder();

    @Mixin
    private final RunOptions runOptions = new RunOptions();

    @Spec
    @SuppressWarnings("NullAway.Init") // set by the command line library before the command runs
    private CommandSpec spec;

    private final Ending ending;

    ResumeCommand(Ending ending) {
        this.ending = ending;
    }

    @Override
    public Integer call() {
        int threads = runOptions.threads();
        requireHarmless();
        PluginCatalogue plugins = pluginFolder.load();
        try (RunFolder folder = RunFolder.resume(path);
                CheckpointReader checkpoint = newestCheckpoint();
                WorkerTeam team = new WorkerTeam(threads)) {
            CheckpointHeader header = checkpoint.header();
            CaseReading reading = readCase(header, plugins);
            double until = runOptions.until(reading.specification().output().endTime());
            if (header.time() >= until) {
                spec.commandLine()
                        .getOut()
                        .println(path + " has reached " + header.time() + " s; nothing is left to do.");
                return ExitCode.OK.number();
            }
            CaseAssembly assembly = CaseAssembly.make(reading, new CasePlugins(plugins));
            requireSamePlugins(header, assembly);
            RunPlan plan = assembly.plan(ProgramVersion.number(), header.caseDigest());
            requireSameWindow(header, plan);
            RunSession session = new RunSession(
                    new Simulation(assembly.model(), team),
                    plan,
                    until,
                    plugins,
                    ending,
                    spec.commandLine().getOut());
            return session.run(folder, checkpoint).code().number();
        } catch (IOException cause) {
            throw RunSession.unusable(path, cause);
        }
    }

    private static String key(String assignment) {
        int equals = assignment.indexOf('=');
        return (equals < 0 ? assignment : assignment.substring(0, equals)).strip();
    }

    private void requireHarmless() {
        List<Finding> findings = assignments.stream()
                .map(ResumeCommand::key)
                .filter(key -> !HARMLESS.contains(key))
                .map(key -> new Finding(
                        "--set " + key,
                        "",
                        "a key that changes the simulation",
                        String.join(", ", HARMLESS.stream().sorted().toList()),
                        "A resumed run goes on with its case: start a new run for another one."))
                .toList();
        if (!findings.isEmpty()) {
            throw new ReedlingException(ExitCode.USAGE, findings);
        }
    }

    private CheckpointReader newestCheckpoint() throws IOException {
        CheckpointFolder.Latest latest = CheckpointFolder.latest(path);
        latest.passedOver().forEach(finding -> spec.commandLine().getErr().println("passed over: " + finding));
        return latest.reader();
    }

    private CaseReading readCase(CheckpointHeader header, PluginCatalogue plugins) throws IOException {
        Path file = path.resolve(CaseOptions.CASE_FILE);
        String digest;
        try {
            digest = CaseDigest.of(Files.readString(file));
        } catch (NoSuchFileException missing) {
            throw refused(file, "", "missing", "the case of the run", "Start the run anew.");
        }
        if (!digest.equals(header.caseDigest())) {
            throw refused(
                    file,
                    "",
                    "changed since the run began",
                    "the case as the run wrote it",
                    "Put the old text back, or start a new run with the new one.");
        }
        return CaseFile.read(file, assignments, new CasePlugins(plugins));
    }

    private void requireSamePlugins(CheckpointHeader header, CaseAssembly assembly) {
        if (!header.plugins().equals(assembly.plugins())) {
            throw refused(
                    path,
                    "plugins with the version of their history",
                    assembly.plugins().toString(),
                    header.plugins().toString(),
                    "Resume with the plugins that the run began with.");
        }
    }

    /** Batches of the measured part are fixed by its end: once it has begun, another end would mix them up. */
    private void requireSameWindow(CheckpointHeader header, RunPlan plan) {
        boolean another =
                assignments.stream().anyMatch(assignment -> key(assignment).equals(END_TIME));
        plan.screen()
                .filter(screen -> another && header.time() > screen.measureFrom())
                .ifPresent(screen -> {
                    throw refused(
                            path,
                            END_TIME,
                            "set anew at " + header.time() + " s",
                            "the end it began with, as measuring began at " + screen.measureFrom() + " s",
                            "Stop earlier with --until, or start a new run.");
                });
    }

    private static ReedlingException refused(Path where, String what, String got, String expected, String remedy) {
        return new ReedlingException(ExitCode.CHECKPOINT, new Finding(where.toString(), what, got, expected, remedy));
    }
}
