// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import reedling.coupling.ContactTally;
import reedling.coupling.Interactions;
import reedling.time.StepLimits;
import reedling.wall.WallPose;

/**
 * What the chunks' tallies, the walls and the case say of the length of the next step.
 *
 * <p>Threads: one, between phases.
 */
final class StepSurvey {

    /** A fine step may take so much of the stability limit of contacts with structure nodes. */
    private static final double FINE_STABLE = 0.4;

    /**
     * A contact with a wire takes so many times fewer coarse steps than a contact between grains: its own force is found
     * on the fine step, but what else pushes the grain reaches it once a coarse step.
     */
    private static final double COARSE_SHARE = 4;

    /** Steps in the fastest prescribed period. */
    private static final double PER_PERIOD = 100;

    /** Share of the search margin that one step may use up. */
    private static final double MARGIN_SHARE = 0.2;

    private final Model model;
    private final Interactions interactions;
    private final double stableShare;

    /**
     * @param stableShare part of the stability limit of lasting contacts that a coarse step may take
     */
    StepSurvey(Model model, Interactions interactions, double stableShare) {
        this.model = model;
        this.interactions = interactions;
        this.stableShare = stableShare;
    }

    /**
     * Limits of the coarse step.
     *
     * @param time of the present positions, s
     * @param moveFrequencySquared largest squared frequency of a grain in its contacts at the last move, 1/s2
     * @param largestSpeed of any body, m/s
     */
    StepLimits coarse(double time, double moveFrequencySquared, double largestSpeed) {
        double duration = Double.POSITIVE_INFINITY;
        double approach = Double.POSITIVE_INFINITY;
        double frequencySquared = moveFrequencySquared;
        for (ContactTally tally : interactions.coarse()) {
            duration = Math.min(duration, tally.shortestDuration());
            approach = Math.min(approach, tally.approachLimit());
            frequencySquared = Math.max(frequencySquared, tally.largestFrequencySquared());
        }
        for (ContactTally tally : interactions.fine()) {
            duration = Math.min(duration, COARSE_SHARE * tally.shortestDuration());
        }
        return new StepLimits(
                duration / model.steps().stepsPerContact(),
                approach,
                persistent(frequencySquared),
                MARGIN_SHARE * model.steps().margin() / largestSpeed,
                driven(time),
                model.steps().maximum());
    }

    private double driven(double time) {
        double limit = model.steps().drivenPeriod() / PER_PERIOD;
        for (WallPose pose : interactions.facets().walls()) {
            limit = Math.min(limit, pose.wall().motion().longestStep(time));
        }
        return limit;
    }

    private double persistent(double frequencySquared) {
        double xi = 2 * model.laws().largestDampingRatio(); // densest packing: its mode has twice a pair's frequency
        return stableShare * 2 / Math.sqrt(frequencySquared) * (Math.sqrt(1 + xi * xi) - xi);
    }

    /**
     * Longest fine step that the structure and its contacts allow, as the last fine pass found them, s.
     *
     * @param structureStep stable step of the structure's elements, s
     */
    double fine(double structureStep) {
        double limit = structureStep;
        double frequencySquared = 0;
        for (ContactTally tally : interactions.fine()) {
            limit = Math.min(limit, tally.shortestDuration() / model.steps().stepsPerContact());
            limit = Math.min(limit, tally.approachLimit());
            frequencySquared = Math.max(frequencySquared, tally.largestFrequencySquared());
        }
        return Math.min(limit, FINE_STABLE * 2 / Math.sqrt(frequencySquared));
    }

    /** Whether any bodies overlap. */
    boolean touching() {
        for (ContactTally tally : interactions.coarse()) {
            if (tally.touching()) {
                return true;
            }
        }
        for (ContactTally tally : interactions.fine()) {
            if (tally.touching()) {
                return true;
            }
        }
        return false;
    }
}
