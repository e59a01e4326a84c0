// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class DueTest {

    @Test
    void isDueOnceAtTheFirstStepAtOrAfterEachMultiple() {
        Due due = new Due(0.1, 0);
        int count = 0;
        for (int step = 1; step <= 1000; step++) {
            count += due.take(step * 1e-3) ? 1 : 0;
        }
        assertThat(count).isEqualTo(10);
    }

    @Test
    void aStepAcrossSeveralMultiplesIsDueOnce() {
        Due due = new Due(0.1, 0);
        assertThat(due.take(0.35)).isTrue();
        assertThat(due.take(0.39)).isFalse();
        assertThat(due.take(0.4)).isTrue();
    }

    /** A run resumed at any time is due at the same times as one that never stopped. */
    @Test
    void whatComesNextFollowsFromTheTimeAlone() {
        for (int resumed = 0; resumed < 400; resumed++) {
            Due whole = new Due(0.07, 0);
            for (int step = 1; step <= resumed; step++) {
                whole.take(step * 0.01);
            }
            Due anew = new Due(0.07, resumed * 0.01);
            for (int step = resumed + 1; step < resumed + 20; step++) {
                assertThat(anew.take(step * 0.01)).isEqualTo(whole.take(step * 0.01));
            }
        }
    }

    @Test
    void anInfiniteIntervalIsNeverDue() {
        assertThat(new Due(Double.POSITIVE_INFINITY, 0).take(1e300)).isFalse();
    }
}
