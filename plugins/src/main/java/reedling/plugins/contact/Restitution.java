// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

/**
 * Damping ratio zeta that gives a contact the asked coefficient of restitution, for both ends that a contact can have.
 *
 * <p>A linear spring with a dashpot is a linear oscillator; so is the damped Hertz contact, in s = 4/5 d^(5/4). Restitution
 * therefore does not depend on speed, and one formula serves both laws. Where the force may not pull, it ends the impulse
 * at zero force: {@code e = exp(-2 zeta acos(zeta) / sqrt(1 - zeta^2))}, for zeta > 1 with acosh and sqrt(zeta^2 - 1).
 * Where the dashpot may pull until the overlap is used up: {@code e = exp(-pi zeta / sqrt(1 - zeta^2))}, which turned
 * round is {@code zeta = L / sqrt(L^2 + pi^2), L = -ln e}.
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

    /** Damping ratio of a restitution in 0.05..1 for an end of contact. */
    static double dampingRatio(double restitution, boolean dashpotMayPull) {
        return dashpotMayPull ? pullingDampingRatio(restitution) : dampingRatio(restitution);
    }

    private static double pullingDampingRatio(double restitution) {
        double loss = -StrictMath.log(Math.min(restitution, 1));
        return loss / StrictMath.sqrt(loss * loss + Math.PI * Math.PI);
    }

    /** Restitution of a damping ratio where the force may not pull. */
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

    /** Damping ratio of a restitution in 0.05..1 where the force may not pull, by bisection: restitution falls as damping rises. */
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
