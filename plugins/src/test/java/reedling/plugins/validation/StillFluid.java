// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.validation;

import reedling.field.Field;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/**
 * A fluid at rest that takes the motion out of grains, F = -m rate v, where a packing is wanted that has come to rest.
 *
 * @param rate 1/s
 */
record StillFluid(double rate) implements Field {

    @Override
    public void apply(GrainStore grains, int from, int to, double time) {
        double[] rows = grains.rows();
        double[] forces = grains.forces();
        for (int g = from; g < to; g++) {
            int at = GrainRow.at(g);
            for (int axis = 0; axis < 3; axis++) {
                forces[GrainRow.forceAt(g) + GrainRow.FORCE + axis] -=
                        rate * rows[at + GrainRow.V + axis] / rows[at + GrainRow.INVERSE_MASS];
            }
        }
    }

    @Override
    public double potentialEnergy(GrainStore grains, int from, int to) {
        return 0;
    }

    @Override
    public double[] uniformAcceleration() {
        return new double[3];
    }
}
