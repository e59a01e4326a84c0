// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.Optional;
import java.util.OptionalDouble;
import reedling.run.MidpointRule;

/**
 * Limits of the time step.
 *
 * @param stepsPerContact time steps in the shortest contact
 * @param maximum longest step, s; empty if only stability limits it
 * @param searchMargin how far beyond touch the neighbour search looks
 * @param midpoint the midpoint rule in place of explicit steps
 */
public record StepSpecification(
        int stepsPerContact, OptionalDouble maximum, SearchMargin searchMargin, Optional<MidpointRule> midpoint) {}
