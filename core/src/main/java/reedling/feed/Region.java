// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import reedling.particle.RandomStream;

/** Where grains are set in. Threads: immutable. */
public sealed interface Region permits BoxRegion, DiscRegion {

    /**
     * Draws the centre of a grain so that the whole grain lies inside; an extent too small for it puts the centre on
     * its middle.
     *
     * @param random owned by the caller
     * @param radius of the grain, m
     * @param centre filled in its first three places, m, world frame
     */
    void draw(RandomStream random, double radius, double[] centre);
}
