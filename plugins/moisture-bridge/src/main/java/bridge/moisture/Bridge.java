// SPDX-License-Identifier: Apache-2.0
package bridge.moisture;

/**
 * Shape of the bridges of one material pair and contact kind: force, energy and length.
 *
 * <pre>
 * F_0 = 4 pi R* g cos t,  b = sqrt(V / (pi R*))
 * F(s) = F_0 (1 - s / sqrt(s^2 + b^2))                   N, attraction, s >= 0; F_0 for s below 0
 * U(s) = F_0 (s + b - sqrt(s^2 + b^2)), or F_0 s below 0       J, 0 where the bodies touch
 * </pre>
 *
 * <p>R* effective radius (m), g surface tension (N/m), t contact angle, V liquid volume (m3), s gap (m); b is the height of
 * the liquid's edge between touching bodies.
 *
 * @param perRadius F_0 / R*, N/m
 * @param spread V / pi = b^2 R*, m3
 * @param rupture gap at which it breaks, m
 */
record Bridge(double perRadius, double spread, double rupture) {

    /** Part of the rupture distance beyond it that is watched, so that a step that breaks a bridge ends in reach. */
    private static final double OVERSHOOT = 0.25;

    /**
     * @param tension g, N/m
     * @param angle t, rad
     * @param volume V, m3
     */
    static Bridge of(double tension, double angle, double volume) {
        return new Bridge(
                4 * Math.PI * tension * StrictMath.cos(angle),
                volume / Math.PI,
                (1 + 0.5 * angle) * StrictMath.cbrt(volume));
    }

    /** Gap up to which rows are watched, m. */
    double reach() {
        return (1 + OVERSHOOT) * rupture;
    }

    /** F, N, of an unbroken bridge. */
    double force(double radius, double gap) {
        double pull = perRadius * radius;
        if (!(gap > 0)) {
            return pull;
        }
        double squared = spread / radius;
        double root = Math.sqrt(gap * gap + squared);
        return pull * (squared / (root * (root + gap)));
    }

    /** U, J, of an unbroken bridge. */
    double energy(double radius, double gap) {
        double pull = perRadius * radius;
        if (!(gap > 0)) {
            return pull * gap;
        }
        double squared = spread / radius;
        double root = Math.sqrt(gap * gap + squared);
        return pull * (Math.sqrt(squared) - squared / (root + gap));
    }
}
