// SPDX-License-Identifier: Apache-2.0
package reedling.math;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class StepLadderTest {

    @Test
    void floorIsTheRungJustBelow() {
        long seed = 17;
        SplittableRandom random = new SplittableRandom(seed);
        for (int k = 0; k < 100_000; k++) {
            double limit = Math.exp(random.nextDouble(Math.log(1e-12), Math.log(1)));
            double rung = StepLadder.floor(limit);
            assertThat(rung).as("seed %d, limit %s", seed, limit).isLessThanOrEqualTo(limit * (1 + 1e-15));
            assertThat(rung * StepLadder.RATIO).isGreaterThanOrEqualTo(limit * (1 - 1e-15));
        }
    }

    /** A step that stands on a rung must not slip to the one below when it is asked again. */
    @Test
    void rungsStayWhereTheyAre() {
        for (int exponent = -10; exponent < 30; exponent++) {
            for (int quarter = 0; quarter < 4; quarter++) {
                double rung = StepLadder.floor(1e-9 * Math.pow(2, exponent + 0.25 * quarter) * (1 + 1e-9));
                assertThat(StepLadder.floor(rung))
                        .as("2^(%d + %d/4) ns", exponent, quarter)
                        .isEqualTo(rung);
            }
        }
    }
}
