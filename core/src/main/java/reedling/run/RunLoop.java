// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Locale;
import java.util.Map;
import reedling.checkpoint.CheckpointHeader;
import reedling.checkpoint.CheckpointReader;
import reedling.checkpoint.CheckpointWriter;
import reedling.checkpoint.Persistent;
import reedling.file.WholeFile;
import reedling.output.RunRecord;
import reedling.output.SnapshotFrame;
import reedling.output.SnapshotWriter;
import reedling.output.WriteQueue;
import reedling.probe.BulkProbe;

/**
 * The outer loop of a run: steps, looks, and writes what is due at the first step at or after its time; it never changes
 * a step. Everything written is copied here and written by the queue's thread. When a guard stops the run, or writing
 * fails, what was due before is still handed over, the record says what happened, and the last good checkpoint stays.
 *
 * <p>Use: make it when the simulation has begun or, for a resumed run, was made but not begun; then {@link #restore} for
 * a resumed run; then {@link #run}. Threads: one; {@link StopFlag} from any.
 */
public final class RunLoop implements AutoCloseable {

    /** Rows wait in memory at most so long, s of wall-clock time. */
    private static final double ROWS_WAIT = 2;

    private final Simulation simulation;
    private final RunPlan plan;
    private final RunOutput output;
    private final StateOwners owners;
    private final StopFlag stop;
    private final boolean resumed;
    private final RunProbes probes;
    private final RunTables tables;
    private final FrameCopy frames;
    private final Due snapshotDue;
    private final Due tableDue;
    private final Due checkpointDue;
    private RunClock clock;
    private double checkpointWall;
    private double rowsWall;
    private long snapshotStep = -1;
    private long tableStep = -1;
    private long checkpointStep = -1;
    private String summary = "";

    /** How a run ended. */
    public enum Outcome {
        /** It reached its end. */
        FINISHED,
        /** It was asked to stop; its last checkpoint is of its last step. */
        STOPPED
    }

    /**
     * @param owners state of the simulation, in the order in which it is restored
     * @param resumeTime time of the checkpoint a run is resumed from, s; not a number for a fresh run
     */
    public RunLoop(
            Simulation simulation, RunPlan plan, RunOutput output, StateOwners owners, StopFlag stop, double resumeTime)
            throws IOException {
        this.simulation = simulation;
        this.plan = plan;
        this.output = output;
        this.owners = owners;
        this.stop = stop;
        resumed = !Double.isNaN(resumeTime);
        double done = resumed ? resumeTime : 0;
        probes = new RunProbes(simulation, plan, done);
        tables = new RunTables(simulation, probes, output.folder(), resumeTime);
        frames = new FrameCopy(simulation, probes);
        snapshotDue = new Due(plan.intervals().snapshot(), done);
        tableDue = new Due(plan.intervals().table(), done);
        checkpointDue = new Due(plan.intervals().checkpoint(), done);
        clock = new RunClock(simulation);
    }

    /** Restores the simulation and what was measured; before {@link #run}. */
    public void restore(CheckpointReader checkpoint) throws IOException {
        for (Persistent owner : owners.persistents()) {
            checkpoint.restore(owner);
        }
        for (Persistent owner : probes.persistents()) {
            checkpoint.restore(owner);
        }
    }

    /** Runs to the plan's end or until it is asked to stop. */
    public Outcome run() {
        return run(plan.endTime());
    }

    /** Runs to a time (s) or until it is asked to stop. */
    public Outcome run(double until) {
        clock = new RunClock(simulation);
        checkpointWall = 0;
        rowsWall = 0;
        try {
            begin();
            while (simulation.time() < until && !stop.raised()) {
                turn(until);
            }
            Outcome outcome = simulation.time() < until ? Outcome.STOPPED : Outcome.FINISHED;
            finish(outcome);
            return outcome;
        } catch (RuntimeException | Error failure) {
            leaveReadable(failure);
            throw failure;
        } finally {
            output.progress().close();
        }
    }

    private void begin() {
        if (!resumed && simulation.stepCount() == 0) {
            probes.sample();
            rows();
            snapshot();
        } else {
            snapshotStep = simulation.stepCount();
            tableStep = simulation.stepCount();
        }
        submitRecord("running");
        log((resumed ? "resumed at " : "begun at ") + time());
    }

    private void turn(double until) {
        long begun = System.nanoTime();
        simulation.step();
        long stepped = System.nanoTime();
        probes.afterStep();
        long measured = System.nanoTime();
        writeWhatIsDue();
        clock.book(begun, stepped, measured, System.nanoTime());
        if (output.progress().wanted(simulation.time() / until)) {
            output.progress().show(status(until));
        }
    }

    private void writeWhatIsDue() {
        output.queue().checkFailure();
        double time = simulation.time();
        if (tableDue.take(time)) {
            rows();
        }
        if (snapshotDue.take(time)) {
            snapshot();
        }
        boolean wall = clock.elapsed() - checkpointWall >= plan.intervals().checkpointWall();
        if (checkpointDue.take(time) || wall) {
            checkpoint();
        }
    }

    private void rows() {
        tables.append();
        tableStep = simulation.stepCount();
        if (clock.elapsed() - rowsWall > ROWS_WAIT) {
            rowsWall = clock.elapsed();
            tables.submit(output.queue());
        }
    }

    private void snapshot() {
        snapshotStep = simulation.stepCount();
        if (!output.snapshots().isEmpty()) {
            SnapshotFrame frame = frames.take();
            for (SnapshotWriter writer : output.snapshots()) {
                output.queue().submit("snapshot at " + time(), () -> writer.write(frame));
            }
        }
    }

    private void checkpoint() {
        checkpointStep = simulation.stepCount();
        checkpointWall = clock.elapsed();
        tables.submit(output.queue());
        CheckpointWriter checkpoint = new CheckpointWriter(new CheckpointHeader(
                plan.identity().programVersion(),
                plan.identity().caseDigest(),
                simulation.stepCount(),
                simulation.time(),
                plan.identity().plugins()));
        try {
            for (Persistent owner : owners.persistents()) {
                checkpoint.save(owner);
            }
            for (Persistent owner : probes.persistents()) {
                checkpoint.save(owner);
            }
        } catch (IOException impossible) {
            throw new UncheckedIOException("sections are held in memory", impossible);
        }
        String when = time();
        output.queue().submit("checkpoint at " + when, () -> {
            var file = output.checkpoints().write(checkpoint);
            output.folder().log("checkpoint at " + when + ": " + file.getFileName());
        });
        submitRecord("running");
    }

    private void finish(Outcome outcome) {
        // before the last row, so that a resumed run goes on with the interval this row cuts short
        if (checkpointStep != simulation.stepCount()) {
            checkpoint();
        }
        if (tableStep != simulation.stepCount()) {
            rows();
        }
        if (snapshotStep != simulation.stepCount()) {
            snapshot();
        }
        tables.submit(output.queue());
        String word = outcome == Outcome.FINISHED ? "finished" : "stopped";
        submitRecord(word);
        plan.screen()
                .ifPresent(screen -> output.queue()
                        .submit("partition.csv", PartitionTable.saving(probes.sizes(), screen, output.folder())));
        for (BulkProbe probe : probes.bulk()) {
            String table =
                    String.join("\n", probe.closingTable(simulation.model().grains())) + "\n";
            String name = "probe-" + probe.name() + "-end.csv";
            output.queue()
                    .submit(name, () -> WholeFile.writeText(output.folder().resolve(name), table));
        }
        summary = summaryText(word);
        String text = summary;
        output.queue()
                .submit("summary.txt", () -> WholeFile.writeText(output.folder().resolve("summary.txt"), text));
        output.queue().drain();
        log(word + " at " + time());
    }

    /** Hands over what is known when a run fails; a second failure is added to the first. */
    private void leaveReadable(Throwable failure) {
        String status = "failed: " + failure.getMessage();
        try {
            log("failed at " + time() + ": " + failure.getMessage());
            tables.submit(output.queue());
            submitRecord(status);
            output.queue().drain();
        } catch (RuntimeException second) {
            failure.addSuppressed(second);
            recordDirectly(status, failure);
        }
    }

    /** A queue that failed drops its jobs: the record, which must say so, is then written on this thread. */
    private void recordDirectly(String status, Throwable failure) {
        try {
            recordJob(status).run();
        } catch (IOException | RuntimeException third) {
            failure.addSuppressed(third);
        }
    }

    private void submitRecord(String status) {
        output.queue().submit("run.json", recordJob(status));
    }

    private WriteQueue.Job recordJob(String status) {
        RunRecord record = RecordWriter.record(RunResult.of(simulation, probes, plan), clock, status);
        return record.saving(output.folder().resolve("run.json"));
    }

    private String summaryText(String word) {
        String heading = word + " at " + time() + " of simulated time, "
                + simulation.model().grains().count() + " grains in the run";
        return Summary.of(RunResult.of(simulation, probes, plan), heading, timing());
    }

    private String timing() {
        return String.format(
                Locale.ROOT,
                "%s on %d threads, %.3g million grain-steps a second; stepping %.1f %%, measuring %.1f %%, "
                        + "handing over what is written %.1f %%.",
                ProgressText.duration(clock.elapsed()),
                simulation.team().workers(),
                1e-6 * clock.grainStepsPerSecond(simulation),
                100 * clock.stepping() / clock.elapsed(),
                100 * clock.measuring() / clock.elapsed(),
                100 * clock.writing() / clock.elapsed());
    }

    private Progress.Status status(double until) {
        return new Progress.Status(
                simulation.time(),
                until,
                simulation.pastStep(),
                simulation.limits().binding(),
                clock.grainStepsPerSecond(simulation),
                clock.timeLeft(simulation.time(), until),
                simulation.passage().fedCount(),
                simulation.passage().outCount(),
                simulation.ledger().relativeResidual());
    }

    private void log(String line) {
        output.folder().log(line);
    }

    private String time() {
        return String.format(Locale.ROOT, "%.6g s", simulation.time());
    }

    /** The closing summary, also in {@code summary.txt}; empty before the run ended. */
    public String summary() {
        return summary;
    }

    /** The figures of the run by name, as they stand; {@code run.json} holds the same. */
    public Map<String, Double> results() {
        return Results.of(RunResult.of(simulation, probes, plan));
    }

    /** What was measured. */
    public RunProbes probes() {
        return probes;
    }

    /** Closes the tables; call when every job of the queue has run. */
    @Override
    public void close() throws IOException {
        tables.close();
    }
}
