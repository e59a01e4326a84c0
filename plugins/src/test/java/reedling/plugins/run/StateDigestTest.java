// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.run.Model;
import reedling.run.Simulation;
import reedling.run.StateDigest;

class StateDigestTest {

    private static Simulation after(double time, Model model, WorkerTeam team) {
        Simulation run = new Simulation(model, team);
        run.begin();
        while (run.time() < time) {
            run.step();
        }
        return run;
    }

    private static String digest(int threads) {
        try (WorkerTeam team = new WorkerTeam(threads)) {
            return StateDigest.of(after(0.06, RainDeck.shaken().model(), team));
        }
    }

    @Test
    void digestDoesNotDependOnTheNumberOfThreads() {
        assertThat(digest(1)).hasSize(64).isEqualTo(digest(2)).isEqualTo(digest(3));
    }

    @Test
    void theLastBitOfAnyStateArrayChangesTheDigest() {
        try (WorkerTeam team = new WorkerTeam(1)) {
            Model model = RainDeck.shaken().model();
            Simulation run = after(0.06, model, team);
            assertThat(model.grains().count()).isGreaterThan(20);
            String before = StateDigest.of(run);
            double[][] arrays = {
                model.grains().rows(),
                model.grains().orientation(),
                model.structure().nodes().velocity,
                model.structure().elementSets().getFirst().history
            };
            int[] places = {GrainRow.at(3) + GrainRow.W, 5, 40, 1};
            for (int k = 0; k < arrays.length; k++) {
                double value = arrays[k][places[k]];
                arrays[k][places[k]] = Math.nextUp(value);
                assertThat(StateDigest.of(run)).as("array " + k).isNotEqualTo(before);
                arrays[k][places[k]] = value;
            }
            assertThat(StateDigest.of(run)).isEqualTo(before);
            run.step();
            assertThat(StateDigest.of(run)).isNotEqualTo(before);
        }
    }
}
