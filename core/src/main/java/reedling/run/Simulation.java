// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import reedling.check.EnergyLedger;
import reedling.check.LawBlame;
import reedling.check.StateGuard;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.contact.LawFault;
import reedling.coupling.Interactions;
import reedling.coupling.MoveTally;
import reedling.coupling.PastStep;
import reedling.coupling.RowFault;
import reedling.error.ReedlingException;
import reedling.parallel.WorkerTeam;
import reedling.probe.GrainWatch;
import reedling.time.StepControl;
import reedling.time.StepLimits;
import reedling.wall.WallPose;

/**
 * A run's state and its step: force, choose the step, move, bend, search. Read {@link #step} to follow a grain through
 * one time step.
 *
 * <p>Threads: all methods are called by one thread; phases inside use the team.
 */
public final class Simulation {

    /** Time over which walls and supports show their velocity before the first step, s. */
    private static final double GLIMPSE = 1e-6;

    private static final int MOST_FINE_STEPS = 10_000;

    /** Steps between two turns of the orientations. */
    private static final int TURN_EVERY = 32;

    /** Steps between two looks at the structure's own stable step, which tension changes slowly. */
    private static final int STRUCTURE_EVERY = 16;

    private final Model model;
    private final WorkerTeam team;
    private final Interactions interactions;
    private final StepControl control;
    private final Stepper stepper;
    private final StepSurvey survey;
    private final EnergyLedger ledger;
    private final Passage passage;
    private final GrainTraffic traffic;

    private long step;
    private double time;
    private double pastStep;
    private double pastFine;
    private double travel;
    private double turned;
    private double largestSpeed;
    private double moveFrequencySquared;
    private double structureStep = Double.POSITIVE_INFINITY;
    private int fineSteps = 1;
    private long searches;
    private long grainSteps;
    private StepLimits limits = new StepLimits(0, 0, 0, 0, 0, 0);

    public Simulation(Model model, WorkerTeam team) {
        this.model = model;
        this.team = team;
        interactions = new Interactions(
                model.grains(),
                model.structure(),
                model.materialOfBody(),
                model.walls(),
                model.fields(),
                model.laws(),
                model.materials(),
                model.steps().stepsPerContact(),
                0);
        control = new StepControl(model.steps().stepsPerContact(), model.steps().maximum());
        ledger = new EnergyLedger(model.walls().size());
        stepper = stepper();
        survey = new StepSurvey(model, interactions, stepper.stableShare());
        passage = new Passage(model.lots().size(), model.exits().outlets().size() + 1);
        traffic = new GrainTraffic(model, interactions, passage, ledger);
    }

    private Stepper stepper() {
        return model.steps()
                .midpoint()
                .<Stepper>map(rule -> MidpointStepper.of(rule, model, interactions, control, ledger, team))
                .orElseGet(() -> new KickDriftKick(interactions, control, team));
    }

    /**
     * Places the first grains, sets walls and supports in motion and lists all pairs; call once, before the first step of a
     * fresh run.
     */
    public void begin() {
        traffic.bookInitialGrains();
        for (WallPose pose : interactions.facets().walls()) {
            pose.restore(-GLIMPSE, 0, GLIMPSE);
        }
        model.structure().startWithSupports(0, GLIMPSE);
        structureStep = model.structure().stableStep();
        traffic.release(0, 0);
        search(new boolean[0]);
        largestSpeed = fastest();
        moveFrequencySquared = interactions.motionFrequencySquared(0);
    }

    /** Largest speed of any grain, wall or node as they are now, m/s. */
    private double fastest() {
        double largest = 0;
        for (int g = 0; g < model.grains().count(); g++) {
            largest = Math.max(largest, traffic.speed(g));
        }
        return Math.max(largest, surfaceSpeed());
    }

    /** One step. */
    public void step() {
        boolean report = step % model.steps().reportEvery() == 0;
        PastStep past = new PastStep(stepper.unclosed(pastStep), stepper.unclosed(pastFine));
        StepStart start = new StepStart(step, time, past, travel, largestSpeed, report);

        // force
        look(start);
        bookContacts(true);
        double strain = report ? model.structure().strainEnergy() : 0;
        ledger.walls(interactions.walls().sumLoads(), interactions.facets(), past.coarse());

        // choose the step
        double chosen = chooseStep();
        double fine = chosen / fineSteps;

        // move; the supports stand at the end of the first fine step
        model.structure().poseSupports(fineSteps == 1 ? time + chosen : time + fine, fine);
        double next = stepper.move(start, turnTime(), chosen, fine);
        if (interactions.hasMotionForces()) {
            ledger.fields(interactions.moves());
        }
        if (report) {
            ledger.report(interactions, model.structure(), strain);
        }

        fine = bend(next, fine);
        closeStep(next, fine);
    }

    private void look(StepStart start) {
        try {
            stepper.look(start);
        } catch (RowFault | LawFault fault) {
            throw blame().thrown(fault, step, time);
        }
    }

    private void fineForce(double past) {
        try {
            interactions.fineForce(past, team);
        } catch (RowFault | LawFault fault) {
            throw blame().thrown(fault, step, time);
        }
    }

    private LawBlame blame() {
        return new LawBlame(interactions, model.grains(), model.laws());
    }

    /**
     * Takes the further fine steps of the structure and the grains near it. What is left of the step is divided anew when a
     * contact that began, or is about to, needs shorter ones.
     *
     * @return length of the last fine step, s
     */
    private double bend(double next, double firstFine) {
        double fine = firstFine;
        double done = firstFine;
        int left = fineSteps - 1;
        while (left > 0) {
            fineForce(fine);
            bookContacts(false);
            double limit = survey.fine(structureStep);
            double coming = fine;
            if (limit < fine) {
                int parts = parts(next - done, limit);
                fineSteps += parts - left;
                left = parts;
                coming = (next - done) / parts;
            }
            done = left == 1 ? next : done + coming;
            model.structure().poseSupports(time + done, coming);
            interactions.fineMove(fine, coming, team);
            fine = coming;
            left--;
        }
        return fine;
    }

    /** Number of fine steps no longer than a limit, s, that a time, s, is divided into. */
    private int parts(double seconds, double limit) {
        double parts = Math.ceil(seconds / limit);
        if (!(parts <= MOST_FINE_STEPS)) {
            throw StateGuard.stop(
                    step,
                    time,
                    "structure",
                    "fine step",
                    limit + " s",
                    "More than " + MOST_FINE_STEPS + " fine steps would be needed in one step: use larger elements.");
        }
        return Math.max(1, (int) parts);
    }

    private void bookContacts(boolean coarseToo) {
        if (coarseToo) {
            StateGuard.contacts(interactions.coarse(), interactions.lists().chunks(), model.grains(), step, time);
            ledger.contacts(interactions.coarse());
        }
        StateGuard.contacts(interactions.fine(), interactions.lists().chunks(), model.grains(), step, time);
        ledger.contacts(interactions.fine());
    }

    /** Time since orientations were turned last when it is time again, s; else 0. */
    private double turnTime() {
        if (step % TURN_EVERY != 0) {
            return 0;
        }
        double since = time - turned;
        turned = time;
        return since;
    }

    private double chooseStep() {
        if (step % STRUCTURE_EVERY == 0) {
            structureStep = model.structure().stableStep();
        }
        double fineLimit = survey.fine(structureStep);
        limits = survey.coarse(time, moveFrequencySquared, largestSpeed);
        double smallest = limits.smallest();
        if (!(smallest > 0) || !(fineLimit > 0)) {
            throw StateGuard.stop(
                    step,
                    time,
                    "step control",
                    "step limit",
                    smallest + " s",
                    "A law reported a time that is not positive.");
        }
        double next = control.choose(smallest, survey.touching());
        fineSteps = parts(next, fineLimit);
        return next;
    }

    private void closeStep(double next, double fine) {
        try {
            StateGuard.motion(interactions, model.grains(), model.structure().nodes(), step, time);
        } catch (ReedlingException stop) {
            throw blame().refined(stop, step, time);
        }
        double begun = time;
        time += next;
        step++;
        grainSteps += model.grains().count();
        pastStep = next;
        pastFine = fine;
        for (WallPose pose : interactions.facets().walls()) {
            pose.restore(begun, time, next);
        }
        double speedSquared = 0;
        moveFrequencySquared = 0;
        for (MoveTally tally : interactions.moves()) {
            speedSquared = Math.max(speedSquared, tally.largestSpeedSquared());
            moveFrequencySquared = Math.max(moveFrequencySquared, tally.largestFrequencySquared());
        }
        largestSpeed = Math.max(Math.sqrt(speedSquared), surfaceSpeed());
        travel += largestSpeed * next;
        searchIfDue();
    }

    /** Largest speed of any wall or structure node, m/s. */
    private double surfaceSpeed() {
        double[] velocity = model.structure().nodes().velocity;
        double largest = 0;
        for (int k = 0; k < velocity.length; k += 3) {
            double squared =
                    velocity[k] * velocity[k] + velocity[k + 1] * velocity[k + 1] + velocity[k + 2] * velocity[k + 2];
            largest = squared > largest ? squared : largest;
        }
        return Math.max(Math.sqrt(largest), traffic.wallSpeed());
    }

    private void searchIfDue() {
        boolean released = traffic.releaseDue(time) && traffic.release(time, stepper.unclosed(pastStep)) > 0;
        if (released) {
            largestSpeed = Math.max(largestSpeed, fastest()); // new grains may be the fastest
            moveFrequencySquared = Math.max(moveFrequencySquared, interactions.motionFrequencySquared(time));
        }
        boolean used = 2 * (travel + largestSpeed * control.longestNext())
                > model.steps().margin();
        if (released || used) {
            search(traffic.leaving(time, stepper.unclosed(pastStep)));
        }
    }

    private void search(boolean[] removed) {
        interactions.search(model.steps().margin(), removed, team);
        travel = 0;
        searches++;
    }

    public Model model() {
        return model;
    }

    public Interactions interactions() {
        return interactions;
    }

    public EnergyLedger ledger() {
        return ledger;
    }

    public Passage passage() {
        return passage;
    }

    /** Has every grain that a feed gives or that leaves shown to a watcher. */
    public void watch(GrainWatch watcher) {
        traffic.watch(watcher);
    }

    public StepControl control() {
        return control;
    }

    /** What the midpoint rule took to settle; empty for explicit steps. */
    public Optional<MidpointTally> midpoint() {
        return stepper.midpoint();
    }

    /** Time of the present positions, s. */
    public double time() {
        return time;
    }

    /** Steps taken. */
    public long stepCount() {
        return step;
    }

    /** Length of the last step, s. */
    public double pastStep() {
        return pastStep;
    }

    /** Fine steps in the last step, those of the remainder divided anew included. */
    public int fineSteps() {
        return fineSteps;
    }

    /** What bounded the last step. */
    public StepLimits limits() {
        return limits;
    }

    /** Searches so far. */
    public long searches() {
        return searches;
    }

    /** Grains times steps so far. */
    public long grainSteps() {
        return grainSteps;
    }

    /** Workers of the team. */
    public WorkerTeam team() {
        return team;
    }

    /** Everything that decides the next bits, in the order in which it is restored. */
    public List<Persistent> persistents() {
        List<Persistent> owners = new ArrayList<>(List.of(
                model.grains(),
                interactions.lists(),
                interactions.walls(),
                interactions.wires(),
                new StructureSection(model.structure()),
                control,
                ledger,
                passage));
        for (Model.FeedLine line : model.feeds()) {
            owners.add(new FeedSection(line.feed()));
        }
        owners.addAll(stepper.persistents());
        owners.add(new StepClock());
        return owners;
    }

    /** Numbers of the step loop itself; restored last, when chunks and walls stand. */
    private final class StepClock implements Persistent {

        @Override
        public String section() {
            return "step";
        }

        @Override
        public void save(SectionWriter out) throws IOException {
            double[] clock = {
                time, pastStep, pastFine, travel, largestSpeed, moveFrequencySquared, structureStep, turned
            };
            out.writeLong(step);
            out.writeLong(searches);
            out.writeLong(grainSteps);
            out.writeInt(fineSteps);
            out.writeDoubles(clock, 0, clock.length);
            out.writeDouble(traffic.nextRelease());
        }

        @Override
        public void restore(SectionReader in) {
            step = in.readLong();
            searches = in.readLong();
            grainSteps = in.readLong();
            fineSteps = in.readInt();
            time = in.readDouble();
            pastStep = in.readDouble();
            pastFine = in.readDouble();
            travel = in.readDouble();
            largestSpeed = in.readDouble();
            moveFrequencySquared = in.readDouble();
            structureStep = in.readDouble();
            turned = in.readDouble();
            traffic.nextRelease(in.readDouble());
            interactions.makeRoom(team.workers());
            interactions.settleReach();
        }
    }

    GrainTraffic traffic() {
        return traffic;
    }
}
