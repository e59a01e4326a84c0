// SPDX-License-Identifier: Apache-2.0
package reedling.time;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import reedling.math.StepLadder;

class StepControlTest {

    private static final int N = 20;
    private static final double RUNG = StepLadder.floor(1e-5);

    private final StepControl control = new StepControl(N, 1e-3);

    @Test
    void freeStepIsTheLimitButAtMostTwiceTheLast() {
        assertThat(control.longestNext()).isEqualTo(1e-3);
        assertThat(control.choose(1e-5, false)).isEqualTo(1e-5);
        assertThat(control.choose(3e-5, false)).isEqualTo(2e-5);
        assertThat(control.choose(2.5e-5, false)).isEqualTo(2.5e-5);
        assertThat(control.choose(1e-7, false)).isEqualTo(1e-7);
        assertThat(control.longestNext()).isEqualTo(2e-7);
    }

    @Test
    void touchingStepDropsAtOnceByAnyNumberOfRungs() {
        assertThat(control.choose(RUNG * 1.1, true)).isEqualTo(RUNG);
        assertThat(control.choose(RUNG * 1.05, true)).isEqualTo(RUNG);
        double low = StepLadder.floor(RUNG / 10);
        assertThat(control.choose(RUNG / 10, true)).isEqualTo(low);
    }

    @Test
    void touchingStepRisesOneRungAfterAContactOfPermittingSteps() {
        control.choose(RUNG * 1.1, true);
        for (int k = 1; k < N; k++) {
            assertThat(control.choose(RUNG * 8, true)).isEqualTo(RUNG);
        }
        double next = control.choose(RUNG * 8, true);
        assertThat(next / RUNG).isBetween(1.189, 1.190);
        for (int k = 1; k < N; k++) {
            assertThat(control.choose(RUNG * 8, true)).isEqualTo(next);
        }
        assertThat(control.choose(RUNG * 8, true) / RUNG).isBetween(1.414, 1.415);
    }

    @Test
    void oneForbiddingStepStartsTheCountAnew() {
        control.choose(RUNG * 1.1, true);
        for (int k = 1; k < N; k++) {
            control.choose(RUNG * 2, true);
        }
        assertThat(control.choose(RUNG * 1.19, true)).isEqualTo(RUNG);
        for (int k = 1; k < N; k++) {
            assertThat(control.choose(RUNG * 2, true)).isEqualTo(RUNG);
        }
        assertThat(control.choose(RUNG * 2, true)).isGreaterThan(RUNG);
    }
}
