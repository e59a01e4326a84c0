// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import reedling.error.RangeCheck;

/**
 * Angle of repose of a heap on a level plate, z up. Errors: a ring width not positive; flank bounds not 0 <= from < to <=
 * 1. Threads: immutable.
 *
 * @param name as in the case file
 * @param centreX middle of the plate, m
 * @param centreY m
 * @param floor height of the plate, m
 * @param ringWidth m
 * @param flankFrom where the flank begins, part of the foot radius
 * @param flankTo where it ends, part of the foot radius
 */
public record HeapPlan(
        String name, double centreX, double centreY, double floor, double ringWidth, double flankFrom, double flankTo)
        implements ProbePlan {

    public HeapPlan {
        new RangeCheck("probe." + name)
                .positive("ring width", ringWidth, "m")
                .notNegative("flank from", flankFrom, "")
                .require(flankTo > flankFrom && flankTo <= 1, "flank to", flankTo, "", "above flank from, at most 1")
                .finish();
    }

    @Override
    public BulkProbe open() {
        return new HeapProbe(this);
    }
}
