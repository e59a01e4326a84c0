// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

/**
 * Two solid spheres that are looked at together.
 *
 * @param firstRadius m
 * @param secondRadius m
 */
record Couple(double firstRadius, double secondRadius) {

    double effectiveRadius() {
        return firstRadius * secondRadius / (firstRadius + secondRadius);
    }

    /** Radius of one of the two (0 or 1), m. */
    double radius(int body) {
        return body == 0 ? firstRadius : secondRadius;
    }

    /** The same two with their names exchanged. */
    Couple exchanged() {
        return new Couple(secondRadius, firstRadius);
    }
}
