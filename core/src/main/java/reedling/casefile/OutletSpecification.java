// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/**
 * A counting outlet: a grain whose centre is inside is counted by lot and removed.
 *
 * @param name as in the case file
 * @param box where it counts
 */
public record OutletSpecification(String name, BoxRegion box) {}
