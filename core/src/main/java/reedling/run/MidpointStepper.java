// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.Optional;
import reedling.check.EnergyLedger;
import reedling.check.StateGuard;
import reedling.coupling.Interactions;
import reedling.coupling.MidpointPasses;
import reedling.coupling.PastStep;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.parallel.WorkerTeam;
import reedling.time.StepControl;
import reedling.wall.WallPose;

/**
 * Steps by the generalised midpoint rule, v_theta = v0 + theta h a(x0 + theta h v_theta, v_theta), solved by iterating over
 * all grains without a matrix. A reference mode: it contracts only where explicit steps are stable, and takes several force
 * passes a step. Grains and walls only.
 *
 * <p>A step that has not settled after {@link #MOST_ITERATIONS} iterations is halved and tried again. Velocities stand at
 * the end of the step between two steps, and contacts commit their history in a pass of their own there.
 *
 * <p>Threads: one; phases inside use the team.
 */
final class MidpointStepper implements Stepper {

    /** Half the stability limit: an undamped contact's error then falls by four or more an iteration. Measured, no source. */
    private static final double STABLE = 0.5;

    private static final int MOST_ITERATIONS = 12;
    private static final int MOST_HALVINGS = 30;

    private final MidpointRule rule;
    private final Interactions interactions;
    private final StepControl control;
    private final EnergyLedger ledger;
    private final WorkerTeam team;
    private final MidpointPasses passes;
    private final MidpointTally tally = new MidpointTally();
    private final Model model;

    private MidpointStepper(
            MidpointRule rule,
            Model model,
            Interactions interactions,
            StepControl control,
            EnergyLedger ledger,
            WorkerTeam team) {
        this.rule = rule;
        this.model = model;
        this.interactions = interactions;
        this.control = control;
        this.ledger = ledger;
        this.team = team;
        passes = interactions.midpointPasses(model.steps().stepsPerContact());
    }

    /**
     * The stepper of a model.
     *
     * @throws ReedlingException when something bends
     */
    static MidpointStepper of(
            MidpointRule rule,
            Model model,
            Interactions interactions,
            StepControl control,
            EnergyLedger ledger,
            WorkerTeam team) {
        if (!model.structure().bodies().isEmpty()) {
            throw new ReedlingException(
                    ExitCode.CASE,
                    new Finding(
                            "midpoint rule",
                            "structure",
                            model.structure().bodies().size() + " parts that bend",
                            "grains and walls only",
                            "Parts that bend take explicit fine steps of their own: use the explicit integrator."));
        }
        return new MidpointStepper(rule, model, interactions, control, ledger, team);
    }

    @Override
    public double stableShare() {
        return STABLE;
    }

    @Override
    public double unclosed(double past) {
        return 0;
    }

    @Override
    public void look(StepStart start) {
        passes.keep(team);
        force(start, start.time(), start.past(), false);
    }

    private void force(StepStart start, double time, PastStep past, boolean energies) {
        interactions.force(time, past, control.longestNext(), start.travel(), start.largestSpeed(), energies, team);
    }

    @Override
    public double move(StepStart start, double turnTime, double next, double fine) {
        passes.open(turnTime, team);
        double step = settle(start, next);
        passes.arrive(step, team);
        double end = start.time() + step;
        standWalls(start.time(), end, step);
        force(start, end, new PastStep(step, step), start.report());
        StateGuard.contacts(interactions.coarse(), interactions.lists().chunks(), model.grains(), start.step(), end);
        ledger.contacts(interactions.coarse());
        ledger.walls(interactions.walls().sumLoads(), interactions.facets(), step);
        passes.close(rule.theta(), start.report(), team);
        return step;
    }

    /** Iterates until all grains have settled; halves the step as often as that takes. Returns the step that settled, s. */
    private double settle(StepStart start, double next) {
        double step = next;
        long all = 0;
        for (int halvings = 0; halvings <= MOST_HALVINGS; halvings++) {
            int iterations = iterate(start, step);
            all += Math.abs(iterations);
            if (iterations > 0) {
                tally.take(all, iterations, halvings);
                return step;
            }
            step *= 0.5;
            control.halve();
        }
        throw StateGuard.stop(
                start.step(),
                start.time(),
                "midpoint rule",
                "step",
                step + " s, and velocities still did not settle",
                "A force jumps within the step: a law without a finite stiffness, or a tolerance below round-off.");
    }

    /** Iterations after which all grains settled; the negative number done if they did not. */
    private int iterate(StepStart start, double step) {
        double span = rule.theta() * step;
        double inner = start.time() + span;
        standWalls(start.time(), inner, span);
        double speed = Math.max(start.largestSpeed(), passes.predict(span, team));
        MidpointPasses.Reach reach =
                new MidpointPasses.Reach(control.longestNext(), start.travel(), start.largestSpeed());
        for (int iteration = 1; iteration <= MOST_ITERATIONS; iteration++) {
            if (passes.improve(inner, reach, rule.tolerance() * speed, team)) {
                return iteration;
            }
        }
        return -MOST_ITERATIONS;
    }

    private void standWalls(double before, double now, double step) {
        for (WallPose pose : interactions.facets().walls()) {
            pose.restore(before, now, step);
        }
    }

    @Override
    public Optional<MidpointTally> midpoint() {
        return Optional.of(tally);
    }
}
