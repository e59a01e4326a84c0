// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.Optional;

/**
 * How a run steps.
 *
 * @param stepsPerContact steps in the duration of an impact, at least 10
 * @param maximum longest step, s
 * @param drivenPeriod period of the fastest prescribed motion, s; infinite without one
 * @param margin search margin: gaps below it are listed, m
 * @param reportEvery steps between two closings of the energy balance
 * @param midpoint the midpoint rule in place of kick-drift-kick, for references; empty as a rule
 */
public record StepSettings(
        int stepsPerContact,
        double maximum,
        double drivenPeriod,
        double margin,
        int reportEvery,
        Optional<MidpointRule> midpoint) {

    /** Explicit steps. */
    public StepSettings(int stepsPerContact, double maximum, double drivenPeriod, double margin, int reportEvery) {
        this(stepsPerContact, maximum, drivenPeriod, margin, reportEvery, Optional.empty());
    }

    /** The same steps by the midpoint rule. */
    public StepSettings by(MidpointRule rule) {
        return new StepSettings(stepsPerContact, maximum, drivenPeriod, margin, reportEvery, Optional.of(rule));
    }
}
