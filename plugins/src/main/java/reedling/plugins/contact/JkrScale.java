// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

/**
 * Constants of {@link JkrLaw} for one work of adhesion and contact modulus, with q the third root of R*.
 *
 * @param modulus E*, Pa
 * @param length k = (2 pi w / E*)^(1/3), m^(1/3)
 * @param overlap 1 / k^2: scaled overlap for d / q = 1 SI
 * @param force 4/3 E* k^3, N/m: force for R* = 1
 * @param energy E* k^5: energy for q = 1
 * @param load 3 pi w, N/m: twice the pull-off force for R* = 1
 * @param column first history column
 */
record JkrScale(double modulus, double length, double overlap, double force, double energy, double load, int column) {

    static JkrScale of(double work, double modulus, int column) {
        double cube = 2 * Math.PI * work / modulus;
        double length = StrictMath.cbrt(cube);
        return new JkrScale(
                modulus,
                length,
                1 / (length * length),
                4.0 / 3 * modulus * cube,
                modulus * cube * length * length,
                3 * Math.PI * work,
                column);
    }

    int joined() {
        return column;
    }

    int root() {
        return column + 1;
    }
}
