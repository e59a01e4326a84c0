// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.run.Simulation;

class NormalImpactTest {

    private static final double[] REST = {0, 0, 0};

    @ParameterizedTest
    @Tag("reference")
    @ValueSource(doubles = {0.9, 0.7, 0.5, 0.3, 0.1})
    void restitutionIsTheOneAskedFor(double restitution) {
        Rig rig = new Rig().material(new Material("steel", 7850, 2e8, 0.3), restitution, 0.3, 0.0).stepsPerContact(100);
        long a = rig.grain(0, 0.005, new double[] {-0.006, 0, 0}, new double[] {1, 0, 0}, REST);
        long b = rig.grain(0, 0.005, new double[] {0.006, 0, 0}, new double[] {-1, 0, 0}, REST);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 5e-3) {
                run.step();
            }
            System.out.println(restitution + " " + rig.velocity(a)[0] + " steps " + run.stepCount() + " res " + run.ledger().relativeResidual());
            assertThat(-rig.velocity(a)[0]).isCloseTo(restitution, within(2e-4));
            assertThat(rig.velocity(b)[0]).isEqualTo(-rig.velocity(a)[0]);
        }
    }
}
