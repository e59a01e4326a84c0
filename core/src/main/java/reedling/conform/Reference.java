// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import reedling.material.Material;
import reedling.material.MaterialPair;

/** Grains that laws are tried on: plastic pellets, made up. */
final class Reference {

    /** Radius, m. */
    static final double RADIUS = 0.005;

    /** Overlap of a firm contact over the effective radius. */
    static final double DEPTH = 0.01;

    private static final Material PELLET = new Material("pellet", 1250, 1e8, 0.3);

    private Reference() {}

    /** A pair of pellets that dissipates in every way. */
    static MaterialPair lossy() {
        return pair(0.7, 0.4, 0.1);
    }

    /** A pair of pellets without dashpot. */
    static MaterialPair elastic(double friction, double rollingFriction) {
        return pair(1, friction, rollingFriction);
    }

    static MaterialPair pair(double restitution, double friction, double rollingFriction) {
        return pair(PELLET, restitution, friction, rollingFriction);
    }

    static MaterialPair pair(Material material, double restitution, double friction, double rollingFriction) {
        return new MaterialPair(material, material, restitution, friction, rollingFriction);
    }

    static Couple equal() {
        return new Couple(RADIUS, RADIUS);
    }

    /** Mass that two grains move with when they push each other off, kg. */
    static double effectiveMass(Couple couple, MaterialPair pair) {
        double first = mass(couple.firstRadius(), pair.first());
        double second = mass(couple.secondRadius(), pair.second());
        return first * second / (first + second);
    }

    private static double mass(double radius, Material material) {
        return material.density() * 4 / 3 * Math.PI * radius * radius * radius;
    }

    /** Speed, m/s, at which an elastic impact of round bodies reaches an overlap (m): m v^2 / 2 = 8/15 E* sqrt(R* d^5). */
    static double speed(Couple couple, MaterialPair pair, double overlap) {
        double energy =
                8.0 / 15 * pair.contactModulus() * Math.sqrt(couple.effectiveRadius() * overlap) * overlap * overlap;
        return Math.sqrt(2 * energy / effectiveMass(couple, pair));
    }

    /** Duration, s, of an elastic impact of round bodies that reaches an overlap, m (Hertz 1882). */
    static double duration(Couple couple, MaterialPair pair, double overlap) {
        return 2.943275 * overlap / speed(couple, pair, overlap);
    }
}
