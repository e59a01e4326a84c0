// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.run.Simulation;

/**
 * A grain that turns freely at 100 rad/s about (1, 2, 3)/sqrt(14) for a million steps of 10 us. Its orientation is advanced
 * every 32nd step by the exponential of the spin, which is exact for a constant spin; a first-order update would be wrong by
 * 8e-5 rad in such steps, and by 0.085 rad in steps 32 times as long.
 */
class ConstantSpinTest {

    private static final double SPEED = 100;
    private static final long TURNS = 31_250; // turns of the orientation, 32 steps apart
    private static final double[] AXIS = {1 / Math.sqrt(14), 2 / Math.sqrt(14), 3 / Math.sqrt(14)};

    /** Closed form: angle = speed times time. 1e-8 rad and 1e-12 of length: rounding of 31,250 products stays far below. */
    @Test
    @Tag("reference")
    void orientationFollowsTheClosedForm() {
        Rig rig = new Rig()
                .material(new Material("grain", 1000, 1e9, 0.3), 1, 0, 0)
                .maximumStep(1e-5)
                .margin(1);
        double[] spin = {SPEED * AXIS[0], SPEED * AXIS[1], SPEED * AXIS[2]};
        rig.grain(0, 0.005, new double[3], new double[3], spin);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.stepCount() < 32 * TURNS) {
                run.step();
            }
            double time = run.time();
            run.step(); // number 1,000,000 turns the orientation up to its own beginning
            assertThat(time).isCloseTo(10, within(1e-8));
            double[] q = rig.grains().orientation();
            double length = Math.sqrt(q[0] * q[0] + q[1] * q[1] + q[2] * q[2] + q[3] * q[3]);
            assertThat(length).isCloseTo(1, within(1e-12));
            double half = Math.IEEEremainder(0.5 * SPEED * time, 2 * Math.PI);
            assertThat(q[0]).isCloseTo(Math.cos(half), within(5e-9));
            for (int axis = 0; axis < 3; axis++) {
                assertThat(q[1 + axis]).isCloseTo(Math.sin(half) * AXIS[axis], within(5e-9));
            }
            assertThat(rig.spin(0)).containsExactly(spin);
        }
    }
}
