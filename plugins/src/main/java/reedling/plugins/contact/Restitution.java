// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

/**
 * Damping ratio zeta that gives a Hertz contact, its total force clipped at zero, the asked coefficient of restitution.
 *
 * <p>With s = 4/5 d^(5/4) the damped Hertz contact is a linear oscillator in s, so restitution does not depend on speed.
 * Where the force may not pull, it ends the impulse at zero force:
 * {@code e = exp(-2 zeta acos(zeta) / sqrt(1 - zeta^2))}, for zeta > 1 with acosh and sqrt(zeta^2 - 1).
 *
 * <p>Source: Antypov and Elliott, On an analytical solution for the damped Hertzian spring, 2011 (map to the linear
 * oscillator); Schwager and Poeschel 2007 (end of contact at zero force); both from memory, the compact form is derived
 * from them.
 */
final class Restitution {

    /** Smallest restitution that can be asked for. */
    static final double SMALLEST = 0.05;

    private static final double TOLERANCE = 1e-14;

    private Restitution() {}

    /** Restitution of a damping ratio. */
    static double of(double zeta) {
        if (Math.abs(zeta - 1) < 1e-9) {
            return StrictMath.exp(-2);
        }
        double angle = zeta < 1
                ? StrictMath.acos(zeta) / StrictMath.sqrt(1 - zeta * zeta)
                : acosh(zeta) / StrictMath.sqrt(zeta * zeta - 1);
        return StrictMath.exp(-2 * zeta * angle);
    }

    private static double acosh(double x) {
        return StrictMath.log(x + StrictMath.sqrt(x * x - 1));
    }

    /** Damping ratio of a restitution in 0.05..1, by bisection: restitution falls as damping rises. */
    static double dampingRatio(double restitution) {
        double low = 0;
        double high = 4;
        while (high - low > TOLERANCE) {
            double middle = 0.5 * (low + high);
            if (of(middle) > restitution) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return restitution >= 1 ? 0 : 0.5 * (low + high);
    }
}
