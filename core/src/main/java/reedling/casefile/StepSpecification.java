// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.OptionalDouble;

/**
 * Limits of the time step.
 *
 * @param stepsPerContact time steps in the shortest contact
 * @param maximum longest step, s; empty if only stability limits it
 * @param searchMargin how far beyond touch the neighbour search looks
 */
public record StepSpecification(int stepsPerContact, OptionalDouble maximum, SearchMargin searchMargin) {}
