// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import reedling.error.ReedlingException;

class SizeDistributionTest {

    static List<SizeDistribution> all() {
        return List.of(
                new SingleSize(0.005),
                new UniformSize(0.002, 0.006),
                new NormalSize(0.0044, 0.0004, 0.0036, 0.0052),
                new NormalSize(0.004, 0.002, 0.0045, 0.012),
                new RosinRammlerSize(Basis.MASS, 0.004, 1.2, 0.001, 0.01),
                new RosinRammlerSize(Basis.NUMBER, 0.004, 4, 0.001, 0.007),
                new SchuhmannSize(Basis.MASS, 0.006, 0.8, 0.001, 0.005),
                new SieveSize(Basis.MASS, new double[] {0.002, 0.003, 0.005}, new double[] {0, 0.3, 1}));
    }

    @ParameterizedTest
    @MethodSource("all")
    void meanCubeAgreesWithTheDraws(SizeDistribution sizes) {
        RandomStream random = new RandomStream(5);
        int count = 400_000;
        double sum = 0;
        double sumOfSquares = 0;
        for (int k = 0; k < count; k++) {
            double d = sizes.diameter(random);
            assertThat(d >= sizes.smallest() && d <= sizes.largest()).isTrue();
            double cube = d * d * d;
            sum += cube;
            sumOfSquares += cube * cube;
        }
        double mean = sum / count;
        double variance = Math.max(0, sumOfSquares / count - mean * mean);
        double standardError = Math.sqrt(variance / count);
        assertThat(mean).isEqualTo(sizes.meanCube(), within(5 * standardError + 1e-10 * mean));
    }

    @Test
    void wideCutLeavesTheMomentOfTheNormalDistribution() {
        double m = 0.005;
        double s = 0.0004;
        // E[d^3] = m^3 + 3 m s^2
        assertThat(new NormalSize(m, s, 0.0001, 0.0099).meanCube()).isEqualTo(m * m * m + 3 * m * s * s, within(1e-18));
    }

    @Test
    void uniformMeanCubeIsTheIntegral() {
        assertThat(new UniformSize(1, 2).meanCube()).isEqualTo(15.0 / 4);
        assertThat(new UniformSize(2, 2).meanCube()).isEqualTo(8);
    }

    @Test
    void boundsThatKeepNothingAreRefused() {
        assertThatThrownBy(() -> new NormalSize(0.004, 0.0001, 0.006, 0.007))
                .isInstanceOf(ReedlingException.class)
                .hasMessageContaining("share of the distribution");
        assertThatThrownBy(() -> new NormalSize(0.004, 0.0001, 0.9, 1.0)).hasMessageContaining("share");
    }

    @Test
    void allWrongNumbersAreReported() {
        assertThatThrownBy(() -> new UniformSize(-1, -2))
                .isInstanceOfSatisfying(
                        ReedlingException.class, e -> assertThat(e.findings()).hasSize(3));
        assertThatThrownBy(() -> new SingleSize(Double.NaN)).hasMessageContaining("diameter");
        assertThatThrownBy(() -> new Lot("", -1, new SingleSize(1)))
                .isInstanceOfSatisfying(
                        ReedlingException.class, e -> assertThat(e.findings()).hasSize(2));
    }
}
