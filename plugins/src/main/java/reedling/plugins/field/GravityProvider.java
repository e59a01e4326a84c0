// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import java.util.List;
import reedling.field.Field;
import reedling.field.FieldProvider;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;
import reedling.unit.Dimension;

/** Offers uniform gravity under the name {@code gravity}: F = m g. */
public final class GravityProvider implements FieldProvider {

    private static final double LARGEST = 1e4; // m/s2, far beyond any centrifuge a bulk test uses

    @Override
    public String name() {
        return "gravity";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Weight in a uniform field of any direction.";
    }

    @Override
    public String source() {
        return "Standard acceleration 9.80665 m/s2: 3rd General Conference on Weights and Measures, 1901";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(component("x", 0), component("y", 0), component("z", -9.80665));
    }

    private static Parameter component(String axis, double value) {
        String meaning = "Acceleration along " + axis + ".";
        return new Parameter(axis, Dimension.ACCELERATION, -LARGEST, LARGEST, value, meaning);
    }

    @Override
    public Field create(ParameterValues values) {
        return new Gravity(values.get("x"), values.get("y"), values.get("z"));
    }

    private record Gravity(double x, double y, double z) implements Field {

        @Override
        public void apply(GrainStore grains, int from, int to, double time) {
            double[] rows = grains.rows();
            double[] forces = grains.forces();
            for (int g = from; g < to; g++) {
                double mass = 1 / rows[GrainRow.at(g) + GrainRow.INVERSE_MASS];
                int f = GrainRow.forceAt(g) + GrainRow.FORCE;
                forces[f] = Math.fma(mass, x, forces[f]);
                forces[f + 1] = Math.fma(mass, y, forces[f + 1]);
                forces[f + 2] = Math.fma(mass, z, forces[f + 2]);
            }
        }

        @Override
        public double potentialEnergy(GrainStore grains, int from, int to) {
            double energy = 0;
            for (int g = from; g < to; g++) {
                int at = GrainRow.at(g);
                double[] rows = grains.rows();
                energy -= (x * rows[at] + y * rows[at + 1] + z * rows[at + 2]) / rows[at + GrainRow.INVERSE_MASS];
            }
            return energy;
        }

        @Override
        public double[] uniformAcceleration() {
            return new double[] {x, y, z};
        }
    }
}
