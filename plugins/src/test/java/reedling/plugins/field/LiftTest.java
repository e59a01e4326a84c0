// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.field.Field;

/** Spinning grains in a gas: circles and spirals in closed form. */
class LiftTest {

    private static final double[] SPIN = {0, 0, 300};

    private static Field gas(String lift, String drag, double viscosity) {
        return FreeFlight.gas(
                Map.of("density", 1.2, "viscosity", viscosity, "lift_coefficient", 0.2),
                Map.of("lift", lift, "drag", drag));
    }

    /**
     * Force of Rubinow and Keller, 1961: the velocity turns at 3/4 (rho / rho_p) w = 3 rad/s, so 20 m/s go round a circle of
     * 6.66667 m in 2.0944 s. 0.05 %: half a step of 1 ms in the quarter turn.
     */
    @ParameterizedTest
    @Tag("reference")
    @ValueSource(doubles = {0.002, 0.02})
    void rubinowKellerLiftDrawsACircle(double radius) {
        double[] start = {20, 0, 0};
        try (FreeFlight flight = new FreeFlight(radius, 90, 1e-3, start, SPIN, gas("rubinow-keller", "none", 1.8e-5))) {
            flight.until(2.0944 / 2);
            assertThat(flight.x(1)).isCloseTo(2 * 6.66667, within(5e-4 * 6.66667));
            flight.until(2.0944);
            assertThat(flight.x(0)).isCloseTo(0, within(5e-4 * 2 * Math.PI * 6.66667));
            assertThat(flight.x(1)).isCloseTo(0, within(5e-4 * 6.66667));
            assertThat(flight.speed()).isCloseTo(20, within(20 * 1e-4));
        }
    }

    /**
     * With a drag of v / tau, tau = 0.5 s, the path ends at x = v0 tau / (1 + (W tau)^2), y = v0 W tau^2 / (1 + (W tau)^2)
     * (complex velocity); 0.1 %.
     */
    @Test
    @Tag("reference")
    void liftAndLinearDragDrawASpiral() {
        double radius = 0.01;
        double viscosity = 2 * 90 * radius * radius / (9 * 0.5); // tau = 2 rho_p R^2 / (9 eta)
        double[] start = {20, 0, 0};
        try (FreeFlight flight =
                new FreeFlight(radius, 90, 1e-3, start, SPIN, gas("rubinow-keller", "stokes", viscosity)).until(8)) {
            assertThat(flight.x(0)).isCloseTo(3.07692, within(1e-3 * 3.07692));
            assertThat(flight.x(1)).isCloseTo(4.61538, within(1e-3 * 4.61538));
        }
    }

    /** |F| = 1/2 rho pi R^2 C_L v^2 across the path: radius 8 rho_p R / (3 rho C_L) = 20 m at any speed; 0.05 %. */
    @ParameterizedTest
    @Tag("reference")
    @ValueSource(doubles = {5, 40})
    void constantLiftDrawsTheSameCircleAtAnySpeed(double speed) {
        double[] start = {speed, 0, 0};
        try (FreeFlight flight = new FreeFlight(0.02, 90, 1e-3, start, SPIN, gas("constant", "none", 1.8e-5))) {
            flight.until(Math.PI * 20 / speed);
            assertThat(flight.x(1)).isCloseTo(40, within(5e-4 * 20));
            assertThat(flight.speed()).isCloseTo(speed, within(1e-4 * speed));
        }
    }

    /** A grain that turns and moves with the gas feels nothing. */
    @Test
    void liftKnowsTheGasOnlyRelatively() {
        Field gas = FreeFlight.gas(
                Map.of("density", 1.2, "viscosity", 1.8e-5, "velocity_y", 7.0), Map.of("lift", "rubinow-keller"));
        double[] start = {0, 7, 0};
        try (FreeFlight flight = new FreeFlight(0.01, 90, 1e-3, start, SPIN, gas).until(0.5)) {
            assertThat(flight.v(0)).isZero();
            assertThat(flight.x(1)).isCloseTo(7 * flight.time(), within(1e-9));
        }
    }
}
