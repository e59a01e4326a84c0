// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * First lateral frequency of a uniform beam under tension.
 *
 * <p>Formula: EI w'''' - T w'' = mu omega^2 w gives w of sin, cos (k1 x) and sinh, cosh (k2 x) with
 * k2^2 = k1^2 + T/EI and omega^2 = EI k1^2 k2^2 / mu. The ends give
 *
 * <ul>
 *   <li>pinned, pinned: k1 L = pi;
 *   <li>clamped, pinned: k1 tanh(k2 L) = k2 tan(k1 L);
 *   <li>clamped, clamped: 2 k1 k2 (1/cosh(k2 L) - cos(k1 L)) + (k2^2 - k1^2) sin(k1 L) tanh(k2 L) = 0;
 *   <li>clamped, free without tension: cos cosh = -1, k1 L = 1.8751.
 * </ul>
 *
 * <p>Where: EI (N m2); T tension (N, >= 0); mu mass per length (kg/m); L (m). Solved by bisection for k1 L, which lies
 * between pi and its value without tension. Shear and rotary inertia are left out, which is within 1 % for
 * length / thickness > 20.
 *
 * <p>Source: derived here from the Bernoulli-Euler equation with tension; limits agree with the tables of beam
 * eigenvalues in textbooks (4.7300, 3.9266, 1.8751) and with the taut string.
 */
public final class LateralMode {

    private static final double CLAMPED_CLAMPED = 4.730040744862704;
    private static final double CLAMPED_PINNED = 3.9266023120479188;
    private static final double CLAMPED_FREE = 1.8751040687119611;

    private final double bendingStiffness;
    private final double tension;
    private final double massPerLength;
    private final double length;

    /**
     * @param bendingStiffness EI, N m2, > 0
     * @param tension N, >= 0
     * @param massPerLength kg/m
     * @param length m
     */
    public LateralMode(double bendingStiffness, double tension, double massPerLength, double length) {
        this.bendingStiffness = bendingStiffness;
        this.tension = tension;
        this.massPerLength = massPerLength;
        this.length = length;
    }

    /** First angular frequency, rad/s; 0 where the body can move freely (an end free and the other not clamped). */
    public double angularFrequency(EndCondition start, EndCondition end) {
        int clamps = (start == EndCondition.CLAMPED ? 1 : 0) + (end == EndCondition.CLAMPED ? 1 : 0);
        if (start == EndCondition.FREE || end == EndCondition.FREE) {
            return clamps == 1 ? frequency(CLAMPED_FREE) : 0;
        }
        return switch (clamps) {
            case 0 -> frequency(Math.PI);
            case 1 -> frequency(bisect(CLAMPED_PINNED, false));
            default -> frequency(bisect(CLAMPED_CLAMPED, true));
        };
    }

    private double frequency(double angle) {
        double k1 = angle / length;
        return k1 * Math.sqrt((bendingStiffness * k1 * k1 + tension) / massPerLength);
    }

    private double bisect(double withoutTension, boolean bothClamped) {
        double low = Math.PI;
        double high = withoutTension + 1e-9;
        for (int i = 0; i < 60; i++) {
            double middle = 0.5 * (low + high);
            if (residual(middle, bothClamped) > 0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    /** Positive below the root. */
    private double residual(double angle1, boolean bothClamped) {
        double angle2 = Math.sqrt(angle1 * angle1 + tension * length * length / bendingStiffness);
        double tanh = StrictMath.tanh(angle2);
        double sine = StrictMath.sin(angle1);
        double cosine = StrictMath.cos(angle1);
        if (bothClamped) {
            return 2 * angle1 * angle2 * (1 / StrictMath.cosh(angle2) - cosine)
                    + (angle2 * angle2 - angle1 * angle1) * sine * tanh;
        }
        return angle1 * tanh - angle2 * sine / cosine;
    }
}
