// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import reedling.parallel.Phase;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainStore;

/**
 * Phases of a step by the midpoint rule, between which stands the team's barrier: histories of contacts are kept, grains
 * are tried at the inner point of the step until they settle there, then they arrive at its end. A trial books nothing and
 * every trial starts from the histories that were kept. What a trial costs is memory too: a copy of all rows and histories.
 *
 * <p>For grains and walls; nothing that bends. Threads: phases are started by one thread; every task writes only what its
 * chunk owns, so the bits do not depend on the number of workers.
 */
public final class MidpointPasses {

    private final Interactions interactions;
    private final MidpointMotion motion;
    private final StepContext trial;
    private final List<KeptHistory> kept = new ArrayList<>();
    private final List<ContactTally> tallies = new ArrayList<>();
    private double[] speeds = new double[0];
    private boolean[] settled = new boolean[0];

    private final Phase keepPhase = this::keepTask;
    private final Phase openPhase = this::openTask;
    private final Phase predictPhase = this::predictTask;
    private final Phase trialPhase = this::trialTask;
    private final Phase correctPhase = this::correctTask;
    private final Phase arrivePhase = this::arriveTask;
    private final Phase closePhase = this::closeTask;

    private double now;
    private double span;
    private double step;
    private double theta;
    private double turning;
    private double accepted;
    private boolean energyDue;

    MidpointPasses(Interactions interactions, GrainStore grains, double stepsPerContact) {
        this.interactions = interactions;
        motion = new MidpointMotion(grains);
        trial = new StepContext(stepsPerContact);
    }

    /** Keeps the histories of all contacts; before the force phase that looks at the start of a step. */
    public void keep(WorkerTeam team) {
        int chunks = chunks();
        while (kept.size() < chunks) {
            kept.add(new KeptHistory());
            tallies.add(new ContactTally());
        }
        if (speeds.length < chunks) {
            speeds = new double[chunks];
            settled = new boolean[chunks];
        }
        motion.makeRoom();
        team.run(keepPhase, chunks);
    }

    private void keepTask(int task, int worker) {
        kept.get(task)
                .keep(
                        interactions.lists().chunks().get(task).segments(),
                        interactions.walls().segments(task));
    }

    /**
     * Remembers where grains stand and what pushes them there, after that force phase.
     *
     * @param turnTime time over which orientations are turned now, s; 0 for not now
     */
    public void open(double turnTime, WorkerTeam team) {
        turning = turnTime;
        team.run(openPhase, chunks());
    }

    private void openTask(int task, int worker) {
        var chunk = interactions.lists().chunks().get(task);
        MoveTally tally = interactions.moves().get(task);
        tally.clear();
        if (turning > 0) {
            GrainMotion.turn(chunk, interactions.grains(), turning);
        }
        motion.start(chunk, tally);
    }

    /**
     * First trial.
     *
     * @param thetaStep time from the start to the inner point, s
     * @return largest speed of a grain or of its surface by its spin, m/s
     */
    public double predict(double thetaStep, WorkerTeam team) {
        span = thetaStep;
        team.run(predictPhase, chunks());
        return Arrays.stream(speeds, 0, chunks()).max().orElse(0);
    }

    private void predictTask(int task, int worker) {
        speeds[task] = motion.predict(interactions.lists().chunks().get(task), span);
    }

    /**
     * Forces at the inner point, walls standing there too; then the next trial.
     *
     * @param time of the inner point, s
     * @param reach length the next step will not exceed (s), displacement since the last search (m), largest speed (m/s)
     * @param acceptedChange change of a velocity that counts as none, m/s
     * @return whether all grains have settled
     */
    public boolean improve(double time, Reach reach, double acceptedChange, WorkerTeam team) {
        now = time;
        accepted = acceptedChange;
        trial.open(span, reach.longest, reach.travel, reach.largestSpeed, false);
        team.run(trialPhase, chunks());
        team.run(correctPhase, chunks());
        for (int chunk = 0; chunk < chunks(); chunk++) {
            if (!settled[chunk]) {
                return false;
            }
        }
        return true;
    }

    /**
     * How far a trial looks for pairs that could touch.
     *
     * @param longest length the next step will not exceed, s
     * @param travel accumulated largest displacement since the last search, m
     * @param largestSpeed of any body, m/s
     */
    public record Reach(double longest, double travel, double largestSpeed) {}

    private void trialTask(int task, int worker) {
        kept.get(task).giveBack();
        ContactTally tally = tallies.get(task);
        tally.clear();
        interactions.contactForces(task, worker, trial, tally);
        interactions.fieldForces(task, now);
    }

    private void correctTask(int task, int worker) {
        settled[task] = motion.correct(interactions.lists().chunks().get(task), span, accepted);
    }

    /** Puts grains at the end of the step (s), their histories as they were at its start; a force phase follows. */
    public void arrive(double length, WorkerTeam team) {
        step = length;
        team.run(arrivePhase, chunks());
    }

    private void arriveTask(int task, int worker) {
        kept.get(task).giveBack();
        motion.arrive(
                interactions.lists().chunks().get(task),
                step,
                interactions.moves().get(task));
    }

    /**
     * Gives grains the velocities of the end of the step.
     *
     * @param inner theta
     * @param reportDue whether energies are wanted
     */
    public void close(double inner, boolean reportDue, WorkerTeam team) {
        theta = inner;
        energyDue = reportDue;
        team.run(closePhase, chunks());
    }

    private void closeTask(int task, int worker) {
        motion.close(
                interactions.lists().chunks().get(task),
                theta,
                energyDue,
                interactions.moves().get(task));
    }

    private int chunks() {
        return interactions.lists().chunks().size();
    }
}
