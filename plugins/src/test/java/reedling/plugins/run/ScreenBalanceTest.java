// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.run.Simulation;

/** Energy balance with all there is: bending wires on driven supports, moving walls, friction, rolling resistance. */
class ScreenBalanceTest {

    /** 2 / N^2 of the throughput. The structure's own share, of the square of its step, is far smaller here. */
    @ParameterizedTest
    @Tag("conservation")
    @ValueSource(ints = {12, 20, 40})
    void gapOfAScreenStaysInItsBand(int number) {
        Rig rig = ShakenScreen.scene(5).stepsPerContact(number).reportEvery(20);
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = rig.start(team);
            double largest = 0;
            while (run.time() < 0.08) {
                run.step();
                if (run.time() > 0.02) {
                    largest = Math.max(largest, Math.abs(run.ledger().relativeResidual()));
                }
            }
            assertThat(run.ledger().dissipated()).isPositive();
            assertThat(largest).isLessThan(2.0 / (number * number));
        }
    }
}
