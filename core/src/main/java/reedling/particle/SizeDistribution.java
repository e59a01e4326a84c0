// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

/**
 * Distribution of grain diameters by number (not by mass), m.
 *
 * <p>Threads: immutable; the random stream belongs to the caller.
 */
public sealed interface SizeDistribution permits SingleSize, UniformSize, NormalSize {

    /** Draws a diameter, m. */
    double diameter(RandomStream random);

    /** Mean of d^3 over the grains, m3: mean grain mass = density pi/6 meanCube. */
    double meanCube();

    /** Lower bound of every diameter drawn, m. */
    double smallest();

    /** Upper bound of every diameter drawn, m. */
    double largest();
}
