// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;

/**
 * Drag of a sphere over the Reynolds number Re = density d |u - v| / viscosity, as the factor f = C_D Re / 24 on the drag of
 * Stokes: F = 3 pi viscosity d f (u - v). It is finite at Re = 0.
 */
enum DragCurve {
    /** No drag. */
    NONE {
        @Override
        double factor(double re, double constant) {
            return 0;
        }

        @Override
        double slope(double re, double factor) {
            return 0;
        }
    },

    /** C_D = 24 / Re, for Re below about 0.1. Source: Stokes, On the effect of the internal friction of fluids on the motion of pendulums, 1851. */
    STOKES {
        @Override
        double factor(double re, double constant) {
            return 1;
        }

        @Override
        double slope(double re, double factor) {
            return 0;
        }
    },

    /**
     * C_D = 24 / Re (1 + 0.15 Re^0.687) below Re = 1000 and 0.44 above, where it jumps by 0.4 %; to Re = 2e5. Source: Schiller
     * and Naumann, Ueber die grundlegenden Berechnungen bei der Schwerkraftaufbereitung, 1933.
     */
    SCHILLER_NAUMANN {
        @Override
        double factor(double re, double constant) {
            return re < SWITCH ? 1 + 0.15 * SCHILLER_POWER.of(re) : 0.44 / 24 * re;
        }

        @Override
        double slope(double re, double factor) {
            return re < SWITCH ? 0.687 * (factor - 1) : factor;
        }
    },

    /**
     * C_D = 24 / Re (1 + A Re^B) + C / (1 + D / Re) with the numbers of a sphere; to Re = 2.6e5. Source: Haider and
     * Levenspiel, Drag coefficient and terminal velocity of spherical and nonspherical particles, 1989.
     */
    HAIDER_LEVENSPIEL {
        @Override
        double factor(double re, double constant) {
            return 1 + 0.1806 * HAIDER_POWER.of(re) + inertial(re);
        }

        @Override
        double slope(double re, double factor) {
            double inertial = inertial(re);
            return 0.6459 * (factor - 1 - inertial) + inertial * (2 - re / (re + 6880.95));
        }

        private double inertial(double re) {
            return 0.4251 / 24 * re * re / (re + 6880.95);
        }
    },

    /** A drag coefficient that the case gives. */
    CONSTANT {
        @Override
        double factor(double re, double constant) {
            return constant / 24 * re;
        }

        @Override
        double slope(double re, double factor) {
            return factor;
        }
    };

    /** Reynolds number from which the constant part of Schiller and Naumann holds. */
    private static final double SWITCH = 1000;

    private static final PowerLaw SCHILLER_POWER = new PowerLaw(0.687);
    private static final PowerLaw HAIDER_POWER = new PowerLaw(0.6459);

    /**
     * Factor f on the drag of Stokes.
     *
     * @param re Reynolds number, >= 0
     * @param constant drag coefficient of {@link #CONSTANT}
     */
    abstract double factor(double re, double constant);

    /**
     * Re df/dRe.
     *
     * @param factor f at this Re
     */
    abstract double slope(double re, double factor);

    /** As a case writes it. */
    String word() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    static List<String> words() {
        return Arrays.stream(values()).map(DragCurve::word).toList();
    }

    static DragCurve of(String word) {
        return valueOf(word.toUpperCase(Locale.ROOT).replace('-', '_'));
    }
}
