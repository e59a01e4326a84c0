// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class TimingTest {

    @Test
    void motionWithoutStartNeverLimitsTheStep() {
        assertThat(Timing.always().longestStep(0)).isInfinite();
        assertThat(Timing.always().longestStep(1e6)).isInfinite();
    }

    /** Following the limit, steps end at the start, take a few short ones there, and are then free until the stop. */
    @Test
    void stepsEndWhereAMotionStartsAndStops() {
        Timing timing = new Timing(0.5, 0.9, 0);
        assertThat(timing.longestStep(0.2)).isCloseTo(0.3, within(1e-15));
        assertThat(timing.longestStep(0.5)).isLessThan(1e-6);
        assertThat(timing.longestStep(0.500001)).isCloseTo(0.399999, within(1e-12));
        assertThat(timing.longestStep(0.9)).isLessThan(1e-6);
        assertThat(timing.longestStep(0.91)).isInfinite();
    }

    @Test
    void noStepSpansAChangeOfStrengthAboveAFewPercent() {
        for (double ramp : new double[] {0.02, 1e-3, 1e-5}) {
            Timing timing = new Timing(0.1, 0.3, ramp);
            double time = 0;
            int steps = 0;
            while (time < 0.4) {
                double step = Math.min(timing.longestStep(time), 0.01);
                double change = Math.abs(timing.strength(time + step) - timing.strength(time));
                assertThat(change).as("at %s s", time).isLessThan(0.05);
                time += step;
                steps++;
            }
            assertThat(steps).isLessThan(400);
        }
    }
}
