// SPDX-License-Identifier: Apache-2.0
package reedling.time;

import reedling.material.Material;

/**
 * Time that a surface wave takes over half the girth of a grain, a measure of steps in common use:
 *
 * <pre>t_R = pi R sqrt(rho / G) / (0.1631 nu + 0.8766)</pre>
 *
 * <p>Where: R radius (m), rho density (kg/m3), G shear modulus (Pa), nu Poisson ratio. For comparison only: steps follow the
 * duration of contacts and their stability, for which t_R is neither necessary (light contacts) nor sufficient (fast
 * impacts). The denominator is a fit to the Rayleigh wave's speed over that of shear, 0.2 % off between nu of 0.25 and 0.3.
 * Source: Thornton and Randall, Applications of theoretical contact mechanics to solid particle system simulation, 1988
 * (from memory). Threads: stateless.
 */
public final class RayleighStep {

    private RayleighStep() {}

    /**
     * The time of one grain, s.
     *
     * @param radius m
     */
    public static double of(Material material, double radius) {
        double shearTime = radius * Math.sqrt(material.density() / material.shearModulus());
        return Math.PI * shearTime / (0.1631 * material.poissonRatio() + 0.8766);
    }
}
