// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

/**
 * A damped Hertz impact in numbers without unit, integrated with the classical Runge-Kutta method: d'' = -max(0, d^(3/2)
 * + alpha d^(1/4) d') from d = 0, d' = 1 until d = 0. An oracle that shares no line with the engine: the damping number
 * that gives a restitution is found by bisection of the integration itself.
 *
 * @param restitution speed at the end
 * @param peakOverlap largest d
 * @param peakForce largest force
 * @param duration until d = 0
 */
record DampedHertz(double restitution, double peakOverlap, double peakForce, double duration) {

    private static final double STEP = 2e-4;

    static DampedHertz withRestitution(double restitution) {
        double low = 0;
        double high = 8;
        for (int k = 0; k < 40; k++) {
            double middle = 0.5 * (low + high);
            if (integrate(middle).restitution > restitution) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return integrate(0.5 * (low + high));
    }

    /** Unit of length, m, for a mass (kg), a Hertz stiffness (N/m^1.5) and a speed (m/s). */
    double length(double mass, double stiffness, double speed) {
        return Math.pow(mass * speed * speed / stiffness, 0.4);
    }

    private static double force(double alpha, double d, double v) {
        double root = Math.sqrt(Math.max(d, 0));
        return Math.max(0, Math.max(d, 0) * root + alpha * Math.sqrt(root) * v);
    }

    private static DampedHertz integrate(double alpha) {
        double d = 0;
        double v = 1;
        double deepest = 0;
        double strongest = 0;
        double time = 0;
        while (true) {
            double f1 = force(alpha, d, v);
            double v2 = v - 0.5 * STEP * f1;
            double f2 = force(alpha, d + 0.5 * STEP * v, v2);
            double v3 = v - 0.5 * STEP * f2;
            double f3 = force(alpha, d + 0.5 * STEP * v2, v3);
            double v4 = v - STEP * f3;
            double f4 = force(alpha, d + STEP * v3, v4);
            double next = d + STEP / 6 * (v + 2 * v2 + 2 * v3 + v4);
            if (next <= 0) {
                return new DampedHertz(-v, deepest, strongest, time + STEP * d / (d - next));
            }
            d = next;
            v -= STEP / 6 * (f1 + 2 * f2 + 2 * f3 + f4);
            time += STEP;
            deepest = Math.max(deepest, d);
            strongest = Math.max(strongest, f1);
        }
    }
}
