// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Throws in gravity of any direction. */
class GravityTest {

    /** Closed form x = v t + g t^2 / 2, which kick-drift-kick meets exactly: 1e-9 is for rounding. */
    @ParameterizedTest
    @Tag("reference")
    @CsvSource({"0, 0, -9.81", "1.7, -4.2, 8.1", "0, 9.81, 0", "-30, 0, 0"})
    void grainFliesAlongTheParabola(double gx, double gy, double gz) {
        double[] g = {gx, gy, gz};
        double[] v = {3, -2, 5};
        try (FreeFlight flight =
                new FreeFlight(0.003, 1200, 1e-3, v, new double[3], FreeFlight.gravity(gx, gy, gz)).until(0.8)) {
            double t = flight.time();
            for (int axis = 0; axis < 3; axis++) {
                assertThat(flight.x(axis)).isCloseTo(v[axis] * t + 0.5 * g[axis] * t * t, within(1e-9));
                assertThat(flight.v(axis)).isCloseTo(v[axis] + g[axis] * flight.middle(), within(1e-9));
            }
            assertThat(Math.abs(flight.run().ledger().relativeResidual())).isLessThan(1e-10);
        }
    }
}
