// SPDX-License-Identifier: Apache-2.0
package reedling.run;

/**
 * Settings of the generalised midpoint rule, the reference mode of stepping.
 *
 * @param theta where in the step forces are taken, 0.5 (second order) to 1 (first order, damps)
 * @param tolerance largest change of a velocity in the last iteration, as a fraction of the largest speed
 */
public record MidpointRule(double theta, double tolerance) {

    /** Where forces are taken unless the case says otherwise: the middle. */
    public static final double MIDDLE = 0.5;

    /** Tolerance unless the case says otherwise. */
    public static final double TOLERANCE = 1e-8;
}
