// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import reedling.math.StepLadder;

/**
 * How long the next step may be so that bodies about to touch are not carried into a contact by a step that is too long
 * for it.
 *
 * <pre>limit = max(t_r, gap / v - 0.4 t_r),  t_r = rung below t_c(v) / N</pre>
 *
 * The step may be long until the touch point, but none that creates an overlap is longer than t_c / N; stopping 0.4 of a
 * contact step before the touch makes the error of the dashpot's start cancel.
 *
 * <p>Threads: one for a run; {@link #longestStep(double)} is set between phases.
 */
final class ApproachRule {

    /** Bodies farther apart than their closing speed covers in so many longest steps need no limit. */
    private static final double HORIZON = 1.4;

    private static final double BEFORE_TOUCH = 0.4;

    private final double stepsPerContact;
    private double longestStep;

    /**
     * @param stepsPerContact N
     */
    ApproachRule(double stepsPerContact) {
        this.stepsPerContact = stepsPerContact;
    }

    /** Sets the length that the next step will not exceed, s. */
    void longestStep(double seconds) {
        longestStep = seconds;
    }

    /** What is left of a gap, m, before the reach of the laws, m, or inside it before the touch. */
    static double ahead(double gap, double reach) {
        return gap > reach ? gap - reach : gap;
    }

    /** True when a gap (m) may close soon enough, at a closing speed (m/s), to limit the step. */
    boolean concerns(double gap, double closing) {
        return gap < HORIZON * longestStep * closing;
    }

    /** Longest step, s, for a gap (m), a closing speed (m/s) and the duration t_c (s) of the contact to come. */
    double limit(double gap, double closing, double duration) {
        double rung = StepLadder.floor(duration / stepsPerContact);
        return Math.max(rung, gap / closing - BEFORE_TOUCH * rung);
    }
}
