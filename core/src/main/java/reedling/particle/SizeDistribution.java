// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

/**
 * Distribution of grain diameters, m. Whatever it was given by, diameters are drawn by number: each grain drawn is one
 * grain, so that the mass of many draws is distributed as {@link #massPassing} says.
 *
 * <p>Threads: immutable; the random stream belongs to the caller.
 */
public sealed interface SizeDistribution
        permits SingleSize, UniformSize, NormalSize, SieveSize, RosinRammlerSize, SchuhmannSize {

    /** Draws a diameter, m. */
    double diameter(RandomStream random);

    /** Mean of d^3 over the grains, m3: mean grain mass = density pi/6 meanCube. */
    double meanCube();

    /** Lower bound of every diameter drawn, m. */
    double smallest();

    /** Upper bound of every diameter drawn, m. */
    double largest();

    /** Part of the mass in grains smaller than a diameter (m), 0 to 1. */
    double massPassing(double diameter);

    /** Diameter (m) that a part of the mass is smaller than, by bisection: 0.5 gives the d50. */
    default double diameterPassing(double part) {
        double low = smallest();
        double high = largest();
        while (high - low > 1e-13 * high) {
            double middle = 0.5 * (low + high);
            if (massPassing(middle) < part) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return 0.5 * (low + high);
    }
}
