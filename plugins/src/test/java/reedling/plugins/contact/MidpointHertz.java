// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

/**
 * One elastic Hertz impact by the midpoint rule, in numbers without unit and in one dimension: d'' = -max(0, d)^(3/2), speed
 * 1 before. Shares no line with the engine.
 */
final class MidpointHertz {

    /** Contact time 2.943275 d_max / v with d_max = (5/4)^(2/5). */
    private static final double DURATION = 2.943275 * Math.pow(1.25, 0.4);

    private MidpointHertz() {}

    /**
     * Relative error of the kinetic energy after the impact.
     *
     * @param perContact steps in the contact
     * @param fraction of a step at which the bodies touch first, after three whole ones
     */
    static double energyError(int perContact, double fraction) {
        double h = DURATION / perContact;
        double d = -(3 + fraction) * h;
        double v = 1;
        do {
            double inner = v;
            double before;
            do {
                before = inner;
                inner = v - 0.5 * h * Math.pow(Math.max(0, d + 0.5 * h * before), 1.5);
            } while (Math.abs(inner - before) > 1e-14);
            d += h * inner;
            v = 2 * inner - v;
        } while (d > 0 || v > 0);
        return v * v - 1;
    }
}
