// SPDX-License-Identifier: Apache-2.0
package reedling.material;

/**
 * An isotropic elastic material.
 *
 * @param name as in the case file
 * @param density kg/m3, > 0
 * @param youngsModulus Pa, > 0
 * @param poissonRatio 0 <= value < 0.5
 */
public record Material(String name, double density, double youngsModulus, double poissonRatio) {

    /** Shear modulus G = E / (2 (1 + nu)), Pa. */
    public double shearModulus() {
        return youngsModulus / (2 * (1 + poissonRatio));
    }
}
