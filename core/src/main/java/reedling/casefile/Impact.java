// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/**
 * An elastic sphere that hits something at a speed, without damping.
 *
 * <p>Formula: largest overlap d = (15 m v^2 / (16 sqrt(R) E*))^(2/5); stiffness at an overlap 2 E* sqrt(R d). Source: H.
 * Hertz 1882; K. L. Johnson, Contact Mechanics, 1985.
 *
 * @param modulus contact modulus E*, Pa
 * @param radius effective radius R, m
 * @param mass effective mass m, kg
 */
record Impact(double modulus, double radius, double mass) {

    /** Largest overlap at a closing speed (m/s), m. */
    double overlap(double speed) {
        return StrictMath.pow(15 * mass * speed * speed / (16 * Math.sqrt(radius) * modulus), 0.4);
    }

    /** Stiffness at an overlap (m), N/m. */
    double stiffness(double overlap) {
        return 2 * modulus * Math.sqrt(radius * overlap);
    }
}
