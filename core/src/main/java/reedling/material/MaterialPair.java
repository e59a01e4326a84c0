// SPDX-License-Identifier: Apache-2.0
package reedling.material;

/**
 * What two touching materials do to each other; symmetric in its two materials.
 *
 * @param first one material
 * @param second the other, may equal the first
 * @param restitution normal coefficient of restitution, 0.05..1
 * @param friction Coulomb coefficient, >= 0
 * @param rollingFriction rolling-resistance coefficient mu_r (limit torque mu_r R* F_n), >= 0
 */
public record MaterialPair(
        Material first, Material second, double restitution, double friction, double rollingFriction) {

    /** Contact modulus E*, Pa: 1/E* = (1 - nu1^2)/E1 + (1 - nu2^2)/E2 (Hertz 1882; Johnson, Contact Mechanics, 1985). */
    public double contactModulus() {
        double nu1 = first.poissonRatio();
        double nu2 = second.poissonRatio();
        return 1 / ((1 - nu1 * nu1) / first.youngsModulus() + (1 - nu2 * nu2) / second.youngsModulus());
    }

    /** Contact shear modulus G*, Pa: 1/G* = (2 - nu1)/G1 + (2 - nu2)/G2 (Mindlin 1949). */
    public double contactShearModulus() {
        return 1
                / ((2 - first.poissonRatio()) / first.shearModulus()
                        + (2 - second.poissonRatio()) / second.shearModulus());
    }
}
