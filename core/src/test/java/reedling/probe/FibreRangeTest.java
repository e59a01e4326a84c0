// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class FibreRangeTest {

    /** Axial stress 5, bending about an axis that turns by {@code turn} a sample; the worst of 360 fibres by search. */
    private static double[] lowerTrueUpper(double steady, double turn) {
        FibreRange range = new FibreRange(1);
        double[] high = new double[360];
        double[] low = new double[360];
        java.util.Arrays.fill(high, -1e9);
        java.util.Arrays.fill(low, 1e9);
        for (int sample = 0; sample < 200; sample++) {
            double bending = steady + 2 * Math.cos(0.3 * sample);
            double largest = -1e9;
            double smallest = 1e9;
            for (int fibre = 0; fibre < 360; fibre++) {
                double stress = 5 + bending * Math.cos(Math.toRadians(fibre) - turn * sample);
                high[fibre] = Math.max(high[fibre], stress);
                low[fibre] = Math.min(low[fibre], stress);
                largest = Math.max(largest, stress);
                smallest = Math.min(smallest, stress);
            }
            range.take(0, largest, smallest);
        }
        double worst = 0;
        for (int fibre = 0; fibre < 360; fibre++) {
            worst = Math.max(worst, high[fibre] - low[fibre]);
        }
        return new double[] {range.lower(0), worst, range.upper(0)};
    }

    @Test
    void boundsHoldTheRangeOfTheWorstFibre() {
        for (double steady : new double[] {0, 1, 3, 10}) {
            for (double turn : new double[] {0, 0.05, 1.1}) {
                double[] found = lowerTrueUpper(steady, turn);
                assertThat(found[0]).isLessThanOrEqualTo(found[1] + 1e-12);
                assertThat(found[2]).isGreaterThanOrEqualTo(found[1] - 1e-12);
            }
        }
    }

    @Test
    void upperBoundIsReachedByReversingAndLowerByPulsatingBending() {
        double[] reversing = lowerTrueUpper(0, 0);
        assertThat(reversing[2]).isCloseTo(reversing[1], within(1e-3));
        double[] pulsating = lowerTrueUpper(10, 0);
        assertThat(pulsating[0]).isCloseTo(pulsating[1], within(1e-3));
    }

    @Test
    void thereIsNoRangeWithoutASample() {
        assertThat(new FibreRange(1).upper(0)).isNaN();
        assertThat(new FibreRange(1).lower(0)).isNaN();
    }
}
