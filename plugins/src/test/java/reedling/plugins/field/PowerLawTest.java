// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The quick power against the library's. */
class PowerLawTest {

    @ParameterizedTest
    @ValueSource(doubles = {0.687, 0.6459, 0.1, 0.95})
    void agreesWithTheLibrary(double p) {
        PowerLaw law = new PowerLaw(p);
        SplittableRandom random = new SplittableRandom(17);
        for (int k = 0; k < 20_000; k++) {
            double x = StrictMath.pow(10, random.nextDouble(-30, 30));
            double expected = StrictMath.pow(x, p);
            assertThat(law.of(x)).as("seed 17, %s^%s", x, p).isCloseTo(expected, within(1e-12 * expected));
        }
        for (double x : new double[] {1, 2, 0.5, Math.nextDown(1.0), Math.nextDown(2.0), 1024, 1e300}) {
            double expected = StrictMath.pow(x, p);
            assertThat(law.of(x)).as("%s^%s", x, p).isCloseTo(expected, within(1e-12 * expected));
        }
    }

    @Test
    void smallestAndImproperNumbers() {
        PowerLaw law = new PowerLaw(0.687);
        assertThat(law.of(0)).isZero();
        assertThat(law.of(Double.MIN_VALUE)).isZero();
        assertThat(law.of(Double.NaN)).isNaN();
        assertThat(law.of(Double.POSITIVE_INFINITY)).isInfinite();
    }
}
