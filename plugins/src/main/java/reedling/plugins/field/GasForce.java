// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import reedling.field.MotionBlock;
import reedling.field.MotionForce;
import reedling.particle.GrainRow;

/**
 * Drag, lift and spin damping of spheres in a gas whose motion is given.
 *
 * <pre>
 * Formula: F = 3 pi eta d f(Re) (u - v) + L x (v - u),   T = -8 pi eta R^3 (w - W)
 *          Rubinow-Keller  L = pi R^3 rho (w - W);   constant  L = 1/2 rho pi R^2 C_L |v - u| (w - W) / |w - W|
 * Where:   u gas velocity (m/s) and W its rate of rotation, half the curl (rad/s), at the centre; v, w velocity (m/s) and
 *          spin (rad/s); R, d radius and diameter (m); rho, eta density (kg/m3) and viscosity (Pa s) of the gas;
 *          Re = rho d |u - v| / eta; f = C_D Re / 24 of the drag curve
 * Valid for / not for: spheres far apart (no crowding), gas that the grains do not slow; neither added mass nor the force
 *          of a pressure gradient in moving gas nor history force, all small in a gas. The torque is Stokes's: up to
 *          rho d^2 |w - W| / eta of about 32. Rubinow and Keller derived their lift for Re far below 1; measured lift of
 *          faster spheres is smaller. Lift by shear without spin is not in it.
 * Stable step: below a tenth of m / (c + Re dc/dRe + |L|) and of I / (8 pi eta R^3), through the rates.
 * Source: drag, see DragCurve. S. I. Rubinow and J. B. Keller, The transverse force on a spinning sphere moving in a viscous
 *          fluid, 1961. Constant lift coefficient and torque: C. T. Crowe, M. Sommerfeld and Y. Tsuji, Multiphase flows with
 *          droplets and particles, 1998 (from memory); torque first in H. Lamb, Hydrodynamics.
 * Threads: immutable
 * </pre>
 *
 * <p>Spin is solved first, then the velocity at the present time. Drag is not linear in v: one Newton step along the path
 * from the velocity without the gas, c' = c / (1 + k Re dc/dRe) with k = h / 2m, leaves an error of second order in h.
 */
record GasForce(Gas gas, Choices choices, GasFlow flow, FlowVariation variation) implements MotionForce {

    /**
     * Properties of the gas.
     *
     * @param density kg/m3
     * @param viscosity Pa s
     */
    record Gas(double density, double viscosity) {}

    /**
     * What the gas does to a grain.
     *
     * @param drag curve
     * @param dragCoefficient of the constant curve
     * @param lift law
     * @param liftCoefficient of the constant lift
     * @param spinDamping whether spin is slowed
     */
    record Choices(DragCurve drag, double dragCoefficient, LiftLaw lift, double liftCoefficient, boolean spinDamping) {}

    @Override
    public void push(MotionBlock block) {
        double[] rows = block.grains().rows();
        double share = variation.factor(block.time());
        double[] u = block.spare();
        for (int g = block.from(); g < block.to(); g++) {
            int at = GrainRow.at(g);
            flow.at(rows[at], rows[at + 1], rows[at + 2], u);
            for (int k = 0; k < 6; k++) {
                u[k] *= share;
            }
            int own = block.ownAt(g);
            turn(block, g, own + GrainRow.TORQUE, u);
            push(block, g, own, u);
        }
    }

    /** Writes the torque and leaves the spin relative to the gas, rad/s, in 3 to 5 of u. */
    private void turn(MotionBlock block, int g, int out, double[] u) {
        double[] rows = block.grains().rows();
        double[] forces = block.grains().forces();
        int at = GrainRow.at(g);
        int f = GrainRow.forceAt(g) + GrainRow.TORQUE;
        double kick = block.halfPast() * rows[at + GrainRow.INVERSE_INERTIA];
        double radius = rows[at + GrainRow.RADIUS];
        double damping = choices.spinDamping ? 8 * Math.PI * gas.viscosity * radius * radius * radius : 0;
        double scale = 1 / (1 + kick * damping);
        for (int axis = 0; axis < 3; axis++) {
            double free = rows[at + GrainRow.W + axis] + kick * forces[f + axis] - u[3 + axis];
            u[3 + axis] = scale * free;
            block.own()[out + axis] = -damping * u[3 + axis];
        }
        block.rate(damping * rows[at + GrainRow.INVERSE_INERTIA]);
    }

    /** Writes the force of drag and lift; u holds the gas velocity and the spin relative to the gas. */
    private void push(MotionBlock block, int g, int own, double[] u) {
        double[] rows = block.grains().rows();
        double[] forces = block.grains().forces();
        int at = GrainRow.at(g);
        int f = GrainRow.forceAt(g) + GrainRow.FORCE;
        double inverseMass = rows[at + GrainRow.INVERSE_MASS];
        double kick = block.halfPast() * inverseMass;
        double radius = rows[at + GrainRow.RADIUS];

        // 1. velocity relative to the gas as it would be without it
        double speedSquared = 0;
        for (int axis = 0; axis < 3; axis++) {
            u[axis] = rows[at + GrainRow.V + axis] + kick * forces[f + axis] - u[axis];
            speedSquared += u[axis] * u[axis];
        }
        double speed = Math.sqrt(speedSquared);

        // 2. drag, one Newton step
        double stokes = 6 * Math.PI * gas.viscosity * radius;
        double reynolds = 2 * gas.density * radius * speed / gas.viscosity;
        double factor = choices.drag.factor(reynolds, choices.dragCoefficient);
        double slope = choices.drag.slope(reynolds, factor);
        double drag = stokes * factor / (1 + kick * stokes * slope);
        double a = 1 + kick * drag;

        // 3. lift
        double lift = lift(radius, speed / a, Math.sqrt(u[3] * u[3] + u[4] * u[4] + u[5] * u[5]));
        LinearResponse.solve(u, 0, a, kick * lift * u[3], kick * lift * u[4], kick * lift * u[5]);

        // 4. force at the present velocity
        double[] out = block.own();
        int o = own + GrainRow.FORCE;
        out[o] = lift * (u[4] * u[2] - u[5] * u[1]) - drag * u[0];
        out[o + 1] = lift * (u[5] * u[0] - u[3] * u[2]) - drag * u[1];
        out[o + 2] = lift * (u[3] * u[1] - u[4] * u[0]) - drag * u[2];
        double turning = lift * Math.sqrt(u[3] * u[3] + u[4] * u[4] + u[5] * u[5]);
        block.rate((stokes * (factor + slope) + turning) * inverseMass);
    }

    /** L over the relative spin, kg. */
    private double lift(double radius, double speed, double spin) {
        return switch (choices.lift) {
            case NONE -> 0;
            case RUBINOW_KELLER -> Math.PI * radius * radius * radius * gas.density;
            case CONSTANT ->
                spin > 0 ? 0.5 * gas.density * Math.PI * radius * radius * choices.liftCoefficient * speed / spin : 0;
        };
    }
}
