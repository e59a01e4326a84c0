// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/** Where a feed puts its grains. */
public sealed interface Region permits BoxRegion, DiscRegion {

    /** Smallest box along the world axes that holds it; flat for a disc across an axis. */
    BoxRegion surroundings();
}
