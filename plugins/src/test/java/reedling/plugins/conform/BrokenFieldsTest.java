// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.conform;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import reedling.conform.ElementTrial;
import reedling.conform.FieldTrial;
import reedling.conform.LawTrial;
import reedling.field.Field;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.plugin.ParameterValues;
import reedling.plugins.element.BeamElement;
import reedling.plugins.field.GravityProvider;

/** The kits for fields and elements pass sound ones and find what is broken. */
class BrokenFieldsTest {

    /** A spring to the origin that can be broken in several ways. */
    private record Spring(double energyShare, int stray, double pole) implements Field {
        @Override
        public void apply(GrainStore grains, int from, int to, double time) {
            for (int g = from; g < to; g++) {
                for (int axis = 0; axis < 3; axis++) {
                    int f = GrainRow.forceAt(g + stray) + GrainRow.FORCE + axis;
                    double x = grains.position(g, axis);
                    grains.forces()[f] -= 2 * x + (pole == 0 ? 0 : pole / x);
                }
            }
        }

        @Override
        public double potentialEnergy(GrainStore grains, int from, int to) {
            double energy = 0;
            for (int g = from; g < to; g++) {
                for (int axis = 0; axis < 3; axis++) {
                    energy += energyShare * grains.position(g, axis) * grains.position(g, axis);
                }
            }
            return energy;
        }

        @Override
        public double[] uniformAcceleration() {
            return new double[3];
        }
    }

    private static List<String> failed(List<LawTrial.Result> results) {
        return results.stream()
                .filter(result -> !result.passed())
                .map(LawTrial.Result::check)
                .toList();
    }

    @Test
    void soundFieldsPass() {
        GravityProvider gravity = new GravityProvider();
        Field field = gravity.create(ParameterValues.of(gravity, Map.of("z", -9.81)));
        assertThat(failed(FieldTrial.run(field))).isEmpty();
        assertThat(failed(FieldTrial.run(new Spring(1, 0, 0)))).isEmpty();
    }

    @Test
    void energyThatIsNotTheForcesIsFound() {
        assertThat(failed(FieldTrial.run(new Spring(2, 0, 0))))
                .containsExactly("the force is the slope of the potential");
    }

    @Test
    void writingBesideTheRangeIsFound() {
        assertThat(failed(FieldTrial.run(new Spring(0, 1, 0)))).containsExactly("a range of grains is a range");
    }

    @Test
    void poleIsFound() {
        assertThat(failed(FieldTrial.run(new Spring(0, 0, 1)))).containsExactly("finite numbers");
    }

    @Test
    void beamElementPasses() {
        List<LawTrial.Result> results = ElementTrial.run(new BeamElement(), Map.of());
        assertThat(results)
                .hasSize(5)
                .allSatisfy(result -> assertThat(result.outcome().findings()).isEmpty());
    }
}
