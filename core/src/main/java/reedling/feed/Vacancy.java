// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

/** Asks the run whether there is room. */
@FunctionalInterface
public interface Vacancy {

    /** Whether a sphere (centre and radius in m, world frame) overlaps no grain, wall or structure of the run. */
    boolean free(double x, double y, double z, double radius);
}
