// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

/**
 * The step that led to the present positions.
 *
 * @param coarse length of the step, s; 0 at the start of a run
 * @param fine length of its last fine step, s
 */
public record PastStep(double coarse, double fine) {}
