// SPDX-License-Identifier: Apache-2.0
package reedling.time;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import reedling.material.Material;

@Tag("reference")
class RayleighStepTest {

    /** Formula of Thornton and Randall 1988 (from memory), evaluated by hand with another program; 1e-5 for its six digits. */
    @ParameterizedTest
    @CsvSource({"0.001, 2500, 1e8, 0.25, 2.70734e-05", "0.005, 7850, 2.1e11, 0.3, 5.29104e-06"})
    void timeOfASurfaceWaveIsThePublishedOne(
            double radius, double density, double modulus, double poisson, double expected) {
        Material material = new Material("stone", density, modulus, poisson);
        assertThat(RayleighStep.of(material, radius)).isCloseTo(expected, within(1e-5 * expected));
    }

    /**
     * Against the root of the Rayleigh equation (c/c_s)^6 - 8 (c/c_s)^4 + (24 - 16 q) (c/c_s)^2 - 16 (1 - q) = 0, q = (1 - 2
     * nu) / (2 - 2 nu) (Rayleigh 1885, textbook), found by bisection: the fit is within 0.25 %.
     */
    @ParameterizedTest
    @CsvSource({"0.2", "0.25", "0.3", "0.35"})
    void fitIsNearTheRootOfTheRayleighEquation(double poisson) {
        double q = (1 - 2 * poisson) / (2 - 2 * poisson);
        double low = 0.5;
        double high = 0.999;
        for (int k = 0; k < 60; k++) {
            double middle = 0.5 * (low + high);
            double s = middle * middle;
            double value = s * s * s - 8 * s * s + (24 - 16 * q) * s - 16 * (1 - q);
            if (value < 0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        Material material = new Material("stone", 2500, 1e8, poisson);
        double shearSpeed = Math.sqrt(0.5e8 / (1 + poisson) / 2500);
        double exact = Math.PI * 0.001 / (low * shearSpeed);
        assertThat(RayleighStep.of(material, 0.001)).isCloseTo(exact, within(2.5e-3 * exact));
    }
}
