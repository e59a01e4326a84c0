// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;

/** Turning and measuring turns are inverse to each other. */
class SpatialRotationTest {

    @Test
    void turnIsMeasuredBackAtAnyAngle() {
        Random random = new Random(3);
        double[] out = new double[3];
        for (double size : new double[] {1e-8, 0.011, 0.0199, 0.0201, 0.5, 3.0}) {
            double[] q = {1, 0, 0, 0};
            SpatialRotation.turn(q, 0, random.nextGaussian(), random.nextGaussian(), random.nextGaussian());
            double[] from = q.clone();
            SpatialRotation.turn(q, 0, 0.6 * size, 0, -0.8 * size);
            SpatialRotation.between(from, 0, q, 0, out);
            assertThat(out[0]).isCloseTo(0.6 * size, within(1e-14 + 4e-15 * size));
            assertThat(out[1]).isCloseTo(0, within(1e-14));
            assertThat(out[2]).isCloseTo(-0.8 * size, within(1e-14 + 4e-15 * size));
        }
    }

    @Test
    void normStaysOneOverManyTurns() {
        double[] q = {1, 0, 0, 0};
        for (int i = 0; i < 100_000; i++) {
            SpatialRotation.turn(q, 0, 0.013, -0.007, 0.004);
        }
        assertThat(q[0] * q[0] + q[1] * q[1] + q[2] * q[2] + q[3] * q[3]).isCloseTo(1, within(1e-14));
    }
}
