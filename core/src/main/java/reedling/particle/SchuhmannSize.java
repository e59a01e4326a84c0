// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import reedling.error.RangeCheck;

/**
 * Gates-Gaudin-Schuhmann distribution between two cuts; what lies outside is left out and the rest counts as the whole.
 *
 * <p>Formula: Y = (d/k)^m is the part smaller than d, for d <= k.
 * <p>Errors: a number not positive; the cuts in the wrong order; the upper cut above k. Source: R. Schuhmann, Principles
 * of comminution I, 1940 (from memory). Threads: immutable.
 */
public final class SchuhmannSize implements SizeDistribution {

    private final double modulus;
    private final double exponent;
    private final PowerClasses classes;

    /**
     * @param basis what Y is a part of
     * @param modulus k, size that all grains pass, m
     * @param exponent m
     * @param smallest lower cut, m
     * @param largest upper cut, at most k, m
     */
    public SchuhmannSize(Basis basis, double modulus, double exponent, double smallest, double largest) {
        new RangeCheck("size")
                .positive("size modulus", modulus, "m")
                .positive("distribution modulus", exponent, "")
                .positive("smallest", smallest, "m")
                .require(largest > smallest, "largest", largest, "m", "above the smallest, " + smallest + " m")
                .require(largest <= modulus, "largest", largest, "m", "at most the size modulus, " + modulus + " m")
                .finish();
        this.modulus = modulus;
        this.exponent = exponent;
        classes = new PowerClasses(basis, new double[] {smallest, largest}, new double[] {1}, exponent);
    }

    /** Part smaller than a diameter (m) before the cuts, by the basis. */
    public double uncutPassing(double diameter) {
        return diameter >= modulus ? 1 : StrictMath.pow(diameter / modulus, exponent);
    }

    /** Diameter (m) that a part is smaller than, before the cuts, by the basis. */
    public double uncutDiameter(double part) {
        return modulus * StrictMath.pow(part, 1 / exponent);
    }

    @Override
    public double diameter(RandomStream random) {
        return classes.diameter(random.uniform());
    }

    @Override
    public double meanCube() {
        return classes.meanCube();
    }

    @Override
    public double smallest() {
        return classes.smallest();
    }

    @Override
    public double largest() {
        return classes.largest();
    }

    @Override
    public double massPassing(double diameter) {
        return classes.massPassing(diameter);
    }
}
