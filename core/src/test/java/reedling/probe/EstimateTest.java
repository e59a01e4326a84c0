// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.particle.RandomStream;

class EstimateTest {

    /** By hand: mean 3, standard deviation sqrt(2.5), t of 4 degrees of freedom 2.776. */
    @Test
    void intervalOfFiveBatchesIsTheOneByHand() {
        Estimate estimate = Estimate.of(new double[] {2, 5, 1, 4, 3});
        assertThat(estimate.value()).isEqualTo(3);
        assertThat(estimate.halfWidth()).isCloseTo(2.776 * Math.sqrt(2.5 / 5), within(1e-12));
        assertThat(estimate.tooShort()).isFalse();
        assertThat(estimate.drifts()).isFalse();
    }

    /** Least squares by hand: slope 0.9, residuals -0.1 0.3 -0.3 -0.1... give t = 0.9 / sqrt(s2 / 10). */
    @Test
    void trendIsTheStudentValueOfTheSlope() {
        double[] batches = {1, 2, 3, 4, 4.5};
        double slope = 0.9;
        double left = 0;
        for (int k = 0; k < 5; k++) {
            double miss = batches[k] - 2.9 - slope * (k - 2);
            left += miss * miss;
        }
        Estimate estimate = Estimate.of(batches);
        assertThat(estimate.trend()).isCloseTo(slope / Math.sqrt(left / 3 / 10), within(1e-10));
        assertThat(estimate.drifts()).isTrue();
        assertThat(Estimate.of(new double[] {3, 3, 3, 3, 3}).drifts()).isFalse();
    }

    /**
     * Of 2000 sets of ten independent normal batches with mean 7, 95 % of the intervals must hold 7; the share scatters
     * by 0.5 %, four of which are allowed.
     */
    @Test
    @Tag("reference")
    void intervalsOfIndependentBatchesHoldTheMeanInNinetyFiveCasesOfAHundred() {
        RandomStream random = new RandomStream(11);
        int held = 0;
        for (int trial = 0; trial < 2000; trial++) {
            double[] batches = new double[10];
            for (int k = 0; k < batches.length; k++) {
                batches[k] = 7 + 2 * random.normal();
            }
            Estimate estimate = Estimate.of(batches);
            held += Math.abs(estimate.value() - 7) < estimate.halfWidth() ? 1 : 0;
        }
        assertThat(held / 2000.0).isBetween(0.93, 0.97);
    }

    /** 97.5 % points for 40, 60 and 120 degrees of freedom in the usual tables: 2.021, 2.000, 1.980. */
    @Test
    @Tag("reference")
    void studentBeyondTheTableAgreesWithPrintedValues() {
        assertThat(Estimate.student(40)).isCloseTo(2.021, within(2e-3));
        assertThat(Estimate.student(60)).isCloseTo(2.000, within(2e-3));
        assertThat(Estimate.student(120)).isCloseTo(1.980, within(2e-3));
    }

    @Test
    void batchesWithoutANumberAreLeftOut() {
        double none = Double.NaN;
        Estimate estimate = Estimate.around(0.4, new double[] {none, 0.3, none, 0.5, none});
        assertThat(estimate.value()).isEqualTo(0.4);
        assertThat(estimate.batches()).isEqualTo(2);
        assertThat(estimate.tooShort()).isTrue();
        assertThat(estimate.halfWidth()).isCloseTo(12.706 * 0.1, within(1e-3));
        assertThat(Estimate.of(new double[0]).value()).isNaN();
    }
}
