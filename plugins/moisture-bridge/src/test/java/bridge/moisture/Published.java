// SPDX-License-Identifier: Apache-2.0
package bridge.moisture;

/** Formulas as published for two equal spheres, from memory; written apart from the law, to compare it with. */
final class Published {

    private static final int STRIPS = 20_000;

    private Published() {}

    /**
     * Rabinovich, Esayanur and Moudgil 2005, without the term of the liquid's edge: 2 pi R g cos t / (1 + s / (2 d)),
     * d = s/2 (-1 + sqrt(1 + 2 V / (pi R s^2))).
     */
    static double force(double radius, double tension, double angle, double volume, double gap) {
        double thickness = 0.5 * gap * (-1 + Math.sqrt(1 + 2 * volume / (Math.PI * radius * gap * gap)));
        return 2 * Math.PI * radius * tension * Math.cos(angle) / (1 + gap / (2 * thickness));
    }

    /** Willett, Adams, Johnson and Seville 2000, the closed form for little liquid. */
    static double fitted(double radius, double tension, double angle, double volume, double gap) {
        double scaled = gap * Math.sqrt(radius / volume);
        return 2 * Math.PI * radius * tension * Math.cos(angle) / (1 + 1.05 * scaled + 2.5 * scaled * scaled);
    }

    /** Work to draw two equal spheres from the touch to a gap, J, by the midpoint rule over {@link #force}. */
    static double work(double radius, double tension, double angle, double volume, double gap) {
        double sum = 0;
        for (int k = 0; k < STRIPS; k++) {
            sum += force(radius, tension, angle, volume, gap * (k + 0.5) / STRIPS);
        }
        return sum * gap / STRIPS;
    }
}
