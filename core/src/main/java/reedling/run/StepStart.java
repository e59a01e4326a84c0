// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import reedling.coupling.PastStep;

/**
 * Where a step starts.
 *
 * @param step its number
 * @param time of the present positions, s
 * @param past the step that led here, as far as the velocities still lack its closing half; zeros if they lack nothing
 * @param travel accumulated largest displacement since the last search, m
 * @param largestSpeed of any body, m/s
 * @param report whether the energy balance is closed in this step
 */
record StepStart(long step, double time, PastStep past, double travel, double largestSpeed, boolean report) {}
