// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import java.util.Optional;
import reedling.field.Field;
import reedling.field.MotionBlock;
import reedling.field.MotionForce;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.plugin.Parameter;

/**
 * Force of uniform, steady electric and magnetic fields on charged grains.
 *
 * <pre>
 * Formula: F = q (E + v x B),   q = charge + charge per mass times m
 * Where:   E electric field (V/m), B magnetic flux density (T), q charge (C), v velocity (m/s), m mass (kg)
 * Valid for / not for: speeds far below that of light; no image charges, no force between grains, no torque on a dipole.
 * Stable step: below a tenth of m / (q B), through the rates. The turn by q B h / m of a step is 2 atan(q B h / 2m), late
 *          by (q B h / m)^2 / 12 of itself; the speed does not change, whatever the step.
 * Source: H. A. Lorentz, 1895; velocity at the present time as Boris's rotation has it, see LinearResponse.
 * Threads: immutable
 * </pre>
 *
 * @param electric V/m
 * @param magnetic T
 * @param charge C
 * @param chargePerMass C/kg
 * @param lot number of the lot, or {@link Parameter#ALL_LOTS}
 */
record ChargedGrains(double[] electric, double[] magnetic, double charge, double chargePerMass, int lot)
        implements Field {

    private double chargeOf(GrainStore grains, int g) {
        boolean charged = lot == (int) Parameter.ALL_LOTS || grains.lot()[g] == lot;
        return charged ? charge + chargePerMass * grains.mass(g) : 0;
    }

    @Override
    public void apply(GrainStore grains, int from, int to, double time) {
        double[] forces = grains.forces();
        for (int g = from; g < to; g++) {
            double q = chargeOf(grains, g);
            int f = GrainRow.forceAt(g) + GrainRow.FORCE;
            forces[f] = Math.fma(q, electric[0], forces[f]);
            forces[f + 1] = Math.fma(q, electric[1], forces[f + 1]);
            forces[f + 2] = Math.fma(q, electric[2], forces[f + 2]);
        }
    }

    @Override
    public double potentialEnergy(GrainStore grains, int from, int to) {
        double energy = 0;
        double[] rows = grains.rows();
        for (int g = from; g < to; g++) {
            int at = GrainRow.at(g);
            double along = electric[0] * rows[at] + electric[1] * rows[at + 1] + electric[2] * rows[at + 2];
            energy -= chargeOf(grains, g) * along;
        }
        return energy;
    }

    @Override
    public double[] uniformAcceleration() {
        return new double[3]; // structures carry no charge, and grains may differ
    }

    @Override
    public Optional<MotionForce> motionForce() {
        boolean none = magnetic[0] == 0 && magnetic[1] == 0 && magnetic[2] == 0;
        return none ? Optional.empty() : Optional.of(this::turn);
    }

    private void turn(MotionBlock block) {
        GrainStore grains = block.grains();
        double[] rows = grains.rows();
        double[] forces = grains.forces();
        double[] v = block.spare();
        double[] out = block.own();
        double field = Math.sqrt(magnetic[0] * magnetic[0] + magnetic[1] * magnetic[1] + magnetic[2] * magnetic[2]);
        for (int g = block.from(); g < block.to(); g++) {
            int at = GrainRow.at(g);
            int f = GrainRow.forceAt(g) + GrainRow.FORCE;
            int o = block.ownAt(g) + GrainRow.FORCE;
            double inverseMass = rows[at + GrainRow.INVERSE_MASS];
            double kick = block.halfPast() * inverseMass;
            double q = chargeOf(grains, g);
            for (int axis = 0; axis < 3; axis++) {
                v[axis] = rows[at + GrainRow.V + axis] + kick * forces[f + axis];
            }
            double turn = -kick * q; // v x B = -B x v
            LinearResponse.solve(v, 0, 1, turn * magnetic[0], turn * magnetic[1], turn * magnetic[2]);
            out[o] = q * (v[1] * magnetic[2] - v[2] * magnetic[1]);
            out[o + 1] = q * (v[2] * magnetic[0] - v[0] * magnetic[2]);
            out[o + 2] = q * (v[0] * magnetic[1] - v[1] * magnetic[0]);
            block.rate(Math.abs(q) * field * inverseMass);
        }
    }
}
