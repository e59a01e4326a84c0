// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import java.util.Arrays;

/**
 * Size classes side by side, inside each of which the density follows a power of the diameter.
 *
 * <p>Formula: q(d) = s_k d^(p-1) / I(a, b, p) in class k from a to b, I(a, b, p) = integral of d^(p-1) from a to b; p = 0
 * is evenly spread over the logarithm. Density by mass q d^e, by number q d^(e-3), e of {@link Basis#massPower}; so every
 * moment and the inverse of the distribution function are closed forms.
 * <p>Threads: immutable.
 */
final class PowerClasses {

    /** Below this change of d^p over a class its series is used, because 1/p is lost to rounding. */
    private static final double FLAT = 1e-8;

    private final double[] edge;
    private final double[] share;
    private final double power;
    private final int massPower;
    /** Grains up to each edge, of all grains. */
    private final double[] numberBelow;
    /** Mass up to each edge, of all mass. */
    private final double[] massBelow;

    private final double meanCube;

    /**
     * @param edge class bounds, rising, m
     * @param share part of each class, by the basis; one less than edges
     * @param power p
     */
    PowerClasses(Basis basis, double[] edge, double[] share, double power) {
        this.edge = edge.clone();
        this.share = share.clone();
        this.power = power;
        massPower = basis.massPower();
        double[] number = running(massPower - 3);
        double[] mass = running(massPower);
        meanCube = mass[share.length] / number[share.length];
        numberBelow = wholeIsOne(number);
        massBelow = wholeIsOne(mass);
    }

    private double[] running(int weight) {
        double[] below = new double[edge.length];
        for (int k = 0; k < share.length; k++) {
            below[k + 1] = below[k] + amount(k, edge[k + 1], weight);
        }
        return below;
    }

    private static double[] wholeIsOne(double[] below) {
        double whole = below[below.length - 1];
        double[] part = new double[below.length];
        Arrays.setAll(part, k -> below[k] / whole);
        return part;
    }

    /** Amount of class k up to a diameter, weighted with d^weight. */
    private double amount(int k, double to, int weight) {
        return share[k] == 0
                ? 0
                : share[k] * integral(edge[k], to, power + weight) / integral(edge[k], edge[k + 1], power);
    }

    double meanCube() {
        return meanCube;
    }

    double smallest() {
        return edge[0];
    }

    double largest() {
        return edge[edge.length - 1];
    }

    double massPassing(double diameter) {
        if (diameter <= smallest()) {
            return 0;
        }
        if (diameter >= largest()) {
            return 1;
        }
        int k = classOf(edge, diameter);
        double whole = amount(k, edge[k + 1], massPower);
        double part = whole == 0 ? 0 : amount(k, diameter, massPower) / whole;
        return massBelow[k] + part * (massBelow[k + 1] - massBelow[k]);
    }

    /** The diameter below which a part u of the grains lies, by number. */
    double diameter(double u) {
        int k = classOf(numberBelow, u);
        double inside = (u - numberBelow[k]) / (numberBelow[k + 1] - numberBelow[k]);
        return drawn(edge[k], edge[k + 1], power + massPower - 3, inside);
    }

    /** The class whose bounds hold a value: its last, not empty one if several do. */
    private static int classOf(double[] bounds, double value) {
        int found = Arrays.binarySearch(bounds, value);
        int k = found >= 0 ? found : -found - 2;
        while (k + 1 < bounds.length && bounds[k + 1] <= value) {
            k++;
        }
        return Math.min(k, bounds.length - 2);
    }

    /** Integral of d^(p-1) from a to b. */
    static double integral(double a, double b, double p) {
        double width = StrictMath.log(b / a);
        double s = p * width;
        double mean = Math.abs(s) < FLAT ? 1 + 0.5 * s : StrictMath.expm1(s) / s;
        return StrictMath.exp(p * StrictMath.log(a)) * width * mean;
    }

    /** The d between a and b up to which a part u of that integral reaches. */
    private static double drawn(double a, double b, double p, double u) {
        double width = StrictMath.log(b / a);
        double s = p * width;
        double exponent = Math.abs(s) < FLAT ? u * width : StrictMath.log1p(u * StrictMath.expm1(s)) / p;
        return Math.clamp(a * StrictMath.exp(exponent), a, b);
    }
}
