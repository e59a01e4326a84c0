// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import reedling.structure.ElementSet;

/**
 * Flat-array kernel of {@link BeamLaw}, in the symbols used there. Checks nothing, allocates nothing.
 *
 * <p>Only +, -, *, / and square roots, so that all machines give the same bits.
 */
final class BeamKernel {

    /** Doubles per element and their order: L, 1/L, six stiffnesses, frame quaternion, nodal mass and inertia. */
    static final int CONSTANTS = 14;

    static final int LENGTH = 0;
    static final int INVERSE_LENGTH = 1;

    /** EA, GA2, GA3 (N), GJ, EI2, EI3 (N m2). */
    static final int STIFFNESS = 2;

    static final int FRAME = 8;
    static final int NODE_MASS = 12;
    static final int NODE_INERTIA = 13;

    /** Doubles per element: six strains, six dashpot forces. */
    static final int HISTORY = 12;

    /** Below this sin^2 the series of the half angle over its sine is exact to the last bit. */
    private static final double SERIES_LIMIT = 2e-3;

    private BeamKernel() {}

    /**
     * Forces and moments on the end nodes of elements {@code first <= e < last}. One long straight line on purpose: cut
     * into methods, its forty intermediate values would have to travel through memory.
     *
     * @param x positions, m, 3 per node
     * @param q orientations, 4 per node
     * @param rate beta / h of the strain-rate damping; 0 for none
     * @return energy taken by damping since the last call, J
     */
    static double forces(ElementSet set, double[] x, double[] q, int first, int last, double rate) {
        double[] constants = set.constants;
        double[] history = set.history;
        double[] slots = set.slots;
        int[] pairs = set.nodes;
        double dissipated = 0;
        for (int e = first; e < last; e++) {
            int n1 = pairs[2 * e];
            int n2 = pairs[2 * e + 1];
            int p = 4 * n1;
            int r = 4 * n2;
            double aw = q[p];
            double ax = q[p + 1];
            double ay = q[p + 2];
            double az = q[p + 3];
            double bw = q[r];
            double bx = q[r + 1];
            double by = q[r + 2];
            double bz = q[r + 3];

            // 1. relative rotation: c = cos(th/2), u = n sin(th/2); q and -q are the same orientation
            double c = aw * bw + ax * bx + ay * by + az * bz;
            double sign = c < 0 ? -1 : 1;
            c *= sign;
            bw *= sign;
            bx *= sign;
            by *= sign;
            bz *= sign;
            double ux = aw * bx - bw * ax + ay * bz - az * by;
            double uy = aw * by - bw * ay + az * bx - ax * bz;
            double uz = aw * bz - bw * az + ax * by - ay * bx;

            // 2. mid frame Rm = matrix(qm q0), qm half-way between the nodes
            double half = 1 / Math.sqrt(2 + 2 * c);
            double mw = (aw + bw) * half;
            double mx = (ax + bx) * half;
            double my = (ay + by) * half;
            double mz = (az + bz) * half;
            int k = CONSTANTS * e;
            double fw = constants[k + FRAME];
            double fx = constants[k + FRAME + 1];
            double fy = constants[k + FRAME + 2];
            double fz = constants[k + FRAME + 3];
            double w = mw * fw - mx * fx - my * fy - mz * fz;
            double i = mw * fx + mx * fw + my * fz - mz * fy;
            double j = mw * fy + my * fw + mz * fx - mx * fz;
            double l = mw * fz + mz * fw + mx * fy - my * fx;
            double r11 = 1 - 2 * (j * j + l * l);
            double r21 = 2 * (i * j + w * l);
            double r31 = 2 * (i * l - w * j);
            double r12 = 2 * (i * j - w * l);
            double r22 = 1 - 2 * (i * i + l * l);
            double r32 = 2 * (j * l + w * i);
            double r13 = 2 * (i * l + w * j);
            double r23 = 2 * (j * l - w * i);
            double r33 = 1 - 2 * (i * i + j * j);

            // 3. chord g and half-angle vector ub in the mid frame
            double dx = x[3 * n2] - x[3 * n1];
            double dy = x[3 * n2 + 1] - x[3 * n1 + 1];
            double dz = x[3 * n2 + 2] - x[3 * n1 + 2];
            double g1 = r11 * dx + r21 * dy + r31 * dz;
            double g2 = r12 * dx + r22 * dy + r32 * dz;
            double g3 = r13 * dx + r23 * dy + r33 * dz;
            double u1 = r11 * ux + r21 * uy + r31 * uz;
            double u2 = r12 * ux + r22 * uy + r32 * uz;
            double u3 = r13 * ux + r23 * uy + r33 * uz;
            double s2 = u1 * u1 + u2 * u2 + u3 * u3;
            double angle = s2 < SERIES_LIMIT ? series(s2) : halfAngleOverSine(s2, c);

            // 4. strains; f = s + beta (s - s_old)/h is what the stiffness acts on
            double inverse = constants[k + INVERSE_LENGTH];
            double length = Math.sqrt(dx * dx + dy * dy + dz * dz);
            double bend = 2 * angle * inverse;
            double e0 = length * inverse - 1;
            double e1 = g2 * inverse;
            double e2 = g3 * inverse;
            double e3 = bend * u1;
            double e4 = bend * u2;
            double e5 = bend * u3;
            int h = HISTORY * e;
            double f0 = e0;
            double f1 = e1;
            double f2 = e2;
            double f3 = e3;
            double f4 = e4;
            double f5 = e5;
            if (rate > 0) {
                double d0 = e0 - history[h];
                double d1 = e1 - history[h + 1];
                double d2 = e2 - history[h + 2];
                double d3 = e3 - history[h + 3];
                double d4 = e4 - history[h + 4];
                double d5 = e5 - history[h + 5];
                f0 += rate * d0;
                f1 += rate * d1;
                f2 += rate * d2;
                f3 += rate * d3;
                f4 += rate * d4;
                f5 += rate * d5;
                dissipated += constants[k + LENGTH]
                        * dashpot(constants, k + STIFFNESS, history, h, rate, d0, d1, d2, d3, d4, d5);
            }
            history[h] = e0;
            history[h + 1] = e1;
            history[h + 2] = e2;
            history[h + 3] = e3;
            history[h + 4] = e4;
            history[h + 5] = e5;

            // 5. force Nv along chord and shear, moment M, all in mid-frame components
            double pull = constants[k + STIFFNESS] * f0 / length;
            double v1 = pull * g1;
            double v2 = pull * g2 + constants[k + STIFFNESS + 1] * f1;
            double v3 = pull * g3 + constants[k + STIFFNESS + 2] * f2;
            double m1 = constants[k + STIFFNESS + 3] * f3;
            double m2 = constants[k + STIFFNESS + 4] * f4;
            double m3 = constants[k + STIFFNESS + 5] * f5;

            // 6. SM = k M + (1-k)/s2 ub (ub.M); h = Nv x g; hc = (h x ub) / (2 (1+c))
            double part = s2 < SERIES_LIMIT ? seriesPart(s2) : (1 - angle) / s2;
            double along = part * (u1 * m1 + u2 * m2 + u3 * m3);
            double t1 = angle * m1 + along * u1;
            double t2 = angle * m2 + along * u2;
            double t3 = angle * m3 + along * u3;
            double h1 = 0.5 * (v2 * g3 - v3 * g2);
            double h2 = 0.5 * (v3 * g1 - v1 * g3);
            double h3 = 0.5 * (v1 * g2 - v2 * g1);
            double turn = 1 / (1 + c);
            double a1 = t1 - turn * (h2 * u3 - h3 * u2);
            double a2 = t2 - turn * (h3 * u1 - h1 * u3);
            double a3 = t3 - turn * (h1 * u2 - h2 * u1);

            // 7. to the world: f1 = Rm Nv, m1 = -Rm G1 with G1 = h/2 - a; f2 = -f1, m2 = -Rm G2 with G2 = h/2 + a
            double px = r11 * v1 + r12 * v2 + r13 * v3;
            double py = r21 * v1 + r22 * v2 + r23 * v3;
            double pz = r31 * v1 + r32 * v2 + r33 * v3;
            double hx = r11 * h1 + r12 * h2 + r13 * h3;
            double hy = r21 * h1 + r22 * h2 + r23 * h3;
            double hz = r31 * h1 + r32 * h2 + r33 * h3;
            double qx = r11 * a1 + r12 * a2 + r13 * a3;
            double qy = r21 * a1 + r22 * a2 + r23 * a3;
            double qz = r31 * a1 + r32 * a2 + r33 * a3;
            int s = set.slotStart + 12 * e;
            slots[s] = px;
            slots[s + 1] = py;
            slots[s + 2] = pz;
            slots[s + 3] = qx - hx;
            slots[s + 4] = qy - hy;
            slots[s + 5] = qz - hz;
            slots[s + 6] = -px;
            slots[s + 7] = -py;
            slots[s + 8] = -pz;
            slots[s + 9] = -qx - hx;
            slots[s + 10] = -qy - hy;
            slots[s + 11] = -qz - hz;
        }
        return dissipated;
    }

    /** Stores the new dashpot forces C beta ds/h and returns sum of 1/2 (old + new) ds, J/m. */
    private static double dashpot(
            double[] stiffness,
            int c,
            double[] history,
            int h,
            double rate,
            double d0,
            double d1,
            double d2,
            double d3,
            double d4,
            double d5) {
        double n0 = rate * stiffness[c] * d0;
        double n1 = rate * stiffness[c + 1] * d1;
        double n2 = rate * stiffness[c + 2] * d2;
        double n3 = rate * stiffness[c + 3] * d3;
        double n4 = rate * stiffness[c + 4] * d4;
        double n5 = rate * stiffness[c + 5] * d5;
        double work = (history[h + 6] + n0) * d0
                + (history[h + 7] + n1) * d1
                + (history[h + 8] + n2) * d2
                + (history[h + 9] + n3) * d3
                + (history[h + 10] + n4) * d4
                + (history[h + 11] + n5) * d5;
        history[h + 6] = n0;
        history[h + 7] = n1;
        history[h + 8] = n2;
        history[h + 9] = n3;
        history[h + 10] = n4;
        history[h + 11] = n5;
        return 0.5 * work;
    }

    /** arcsin(s)/s for small s^2. */
    private static double series(double s2) {
        return 1 + s2 * (1.0 / 6 + s2 * (3.0 / 40 + s2 * (5.0 / 112 + s2 * (35.0 / 1152))));
    }

    /** (1 - arcsin(s)/s) / s^2 for small s^2. */
    private static double seriesPart(double s2) {
        return -(1.0 / 6 + s2 * (3.0 / 40 + s2 * (5.0 / 112 + s2 * (35.0 / 1152))));
    }

    /** phi / sin(phi) from sin^2 and cos by halving: phi/sin(phi) = (phi/2)/sin(phi/2) / cos(phi/2). */
    private static double halfAngleOverSine(double sineSquared, double cosine) {
        double s2 = sineSquared;
        double c = cosine;
        double factor = 1;
        while (s2 >= SERIES_LIMIT) {
            s2 = s2 / (2 * (1 + c));
            c = Math.sqrt(0.5 * (1 + c));
            factor /= c;
        }
        return factor * series(s2);
    }

    /** Largest squared frequency (1/s2) of one free element with its own share of mass, at its present axial force. */
    static double squaredFrequency(ElementSet set, int e) {
        double[] constants = set.constants;
        int k = CONSTANTS * e;
        double length = constants[k + LENGTH];
        double mass = constants[k + NODE_MASS];
        double inertia = constants[k + NODE_INERTIA];
        double axial = constants[k + STIFFNESS];
        double tension = Math.max(axial * set.history[HISTORY * e], 0);
        double shear = Math.max(constants[k + STIFFNESS + 1], constants[k + STIFFNESS + 2]);
        double bending = Math.max(constants[k + STIFFNESS + 4], constants[k + STIFFNESS + 5]);
        double stretch = 2 * axial / (mass * length);
        double lateral =
                shear * length * (2 / (length * length * mass) + 1 / (2 * inertia)) + 2 * tension / (mass * length);
        double rotary = 2 * Math.max(bending, constants[k + STIFFNESS + 3]) / (length * inertia);
        return Math.max(stretch, Math.max(lateral, rotary));
    }
}
