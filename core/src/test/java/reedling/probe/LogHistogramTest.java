// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import reedling.particle.RandomStream;

class LogHistogramTest {

    @Test
    void percentilesAreAtMostFourPerCentAboveThoseOfTheSortedNumbers() {
        RandomStream random = new RandomStream(5);
        LogHistogram histogram = new LogHistogram(-6, 7);
        double[] values = new double[5000];
        for (int k = 0; k < values.length; k++) {
            values[k] = Math.exp(-5 + 1.5 * random.normal());
            histogram.add(values[k]);
        }
        java.util.Arrays.sort(values);
        assertThat(histogram.percentile(0.5)).isBetween(values[2499], 1.04 * values[2499]);
        assertThat(histogram.percentile(0.99)).isBetween(values[4949], 1.04 * values[4949]);
        assertThat(histogram.percentile(0.999)).isBetween(values[4994], 1.04 * values[4994]);
    }

    @Test
    void nothingCountedHasNoPercentile() {
        assertThat(new LogHistogram(-3, 3).percentile(0.99)).isNaN();
    }
}
