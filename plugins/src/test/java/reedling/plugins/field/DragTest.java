// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import reedling.field.Field;

/** Single grains slowed by a gas, against closed forms and balances of force. */
class DragTest {

    private static final double G = 9.81;
    private static final double[] REST = new double[3];

    private static Field still(String drag, double density, double viscosity, double gravity) {
        return FreeFlight.gas(
                Map.of("density", density, "viscosity", viscosity, "gravity_z", gravity), Map.of("drag", drag));
    }

    /** Longest step that keeps a Stokes grain's answer resolved, s. */
    private static double step(double diameter) {
        return Math.min(1e-3, 0.02 * 2650 * diameter * diameter / (18 * 1.82e-5));
    }

    private static double fall(String drag, double diameter) {
        Field gas = still(drag, 1.204, 1.82e-5, -G);
        Field gravity = FreeFlight.gravity(0, 0, -G);
        try (FreeFlight flight = new FreeFlight(0.5 * diameter, 2650, step(diameter), REST, REST, gravity, gas)) {
            double before = -1;
            for (int k = 0; Math.abs(flight.v(2) - before) > 1e-7 * Math.abs(before) || k < 100; k++) {
                before = flight.v(2);
                flight.until(flight.time() + 20 * step(diameter));
                assertThat(k).isLessThan(10_000);
            }
            return -flight.v(2);
        }
    }

    /**
     * Quartz in air of 20 C, buoyancy included: root of 1/2 rho v^2 C_D pi d^2/4 = (rho_p - rho) g pi d^3/6 with the curve of
     * Schiller and Naumann, 1933. 0.05 %: five digits of the root, and the approach to it.
     */
    @ParameterizedTest
    @Tag("reference")
    @CsvSource({
        "20e-6, 0.0312033",
        "50e-6, 0.17948",
        "100e-6, 0.576361",
        "200e-6, 1.473",
        "500e-6, 3.83113",
        "1e-3, 7.06129",
        "2e-3, 11.4368"
    })
    void quartzFallsAtItsTerminalSpeed(double diameter, double expected) {
        assertThat(fall("schiller-naumann", diameter)).isCloseTo(expected, within(5e-4 * expected));
    }

    /** The same with the curve of Haider and Levenspiel, 1989; 0.1 %: four digits given. */
    @ParameterizedTest
    @Tag("reference")
    @CsvSource({
        "20e-6, 0.03102",
        "50e-6, 0.1759",
        "100e-6, 0.5585",
        "200e-6, 1.435",
        "500e-6, 3.838",
        "1e-3, 7.114",
        "2e-3, 11.78"
    })
    void terminalSpeedsOfTheOtherCurve(double diameter, double expected) {
        assertThat(fall("haider-levenspiel", diameter)).isCloseTo(expected, within(1e-3 * expected));
    }

    /** Textbook: v = v_t tanh(g t / v_t), s = v_t^2 / g ln cosh(g t / v_t); 0.1 % as the digits allow, reached to 1e-5. */
    @Test
    @Tag("reference")
    void fallWithConstantCoefficient() {
        double density = 0.01 / (4.0 / 3 * Math.PI * 1e-6);
        Field gas = still("constant", 1.2, 1.8e-5, 0);
        try (FreeFlight flight =
                new FreeFlight(0.01, density, 1e-3, REST, REST, FreeFlight.gravity(0, 0, -G), gas).until(3)) {
            double terminal = 34.392;
            assertThat(-flight.x(2)).isCloseTo(39.6201, within(1e-3 * 39.6201));
            double expected = terminal * Math.tanh(G * flight.middle() / terminal);
            assertThat(-flight.v(2)).isCloseTo(expected, within(2e-5 * expected));
            assertThat(terminal * Math.tanh(G * 3 / terminal)).isCloseTo(23.8697, within(1e-3));
        }
    }

    /** Textbook: stops after v0 tau = 0.0123457 m, v(2 tau) = v0 exp(-2); 0.1 % at a hundredth of tau a step. */
    @Test
    @Tag("reference")
    void stokesGrainStopsAfterItsRelaxationLength() {
        double tau = 0.0123457;
        Field gas = still("stokes", 1.2, 1.8e-5, 0);
        double[] start = {1, 0, 0};
        try (FreeFlight flight = new FreeFlight(2e-5, 2500, tau / 100, start, REST, gas).until(2 * tau)) {
            assertThat(flight.v(0)).isCloseTo(Math.exp(-flight.middle() / tau), within(1e-3 * 0.135335));
            flight.until(20 * tau);
            assertThat(flight.x(0)).isCloseTo(0.0123457, within(1e-3 * 0.0123457));
        }
    }

    /** H. Lamb, Hydrodynamics: torque 8 pi eta R^3 w, so w = w0 exp(-t / tau), tau = rho R^2 / (15 eta); 0.1 %. */
    @Test
    @Tag("reference")
    void viscousTorqueSlowsSpin() {
        double tau = 0.0231481;
        Field gas = FreeFlight.gas(
                Map.of("density", 1.2, "viscosity", 1.8e-5), Map.of("drag", "none", "spin_damping", "stokes"));
        double[] spin = {600, 0, -800};
        try (FreeFlight flight = new FreeFlight(5e-5, 2500, tau / 100, REST, spin, gas).until(tau)) {
            double expected = 1000 * Math.exp(-flight.middle() / tau);
            assertThat(Math.hypot(flight.spin(0), flight.spin(2))).isCloseTo(expected, within(1e-3 * expected));
            assertThat(flight.spin(0) / flight.spin(2)).isCloseTo(-0.75, within(1e-12));
            assertThat(1000 * Math.exp(-1)).isCloseTo(367.879, within(1e-3));
        }
    }

    private static double errorAt(double step) {
        Field gas = still("schiller-naumann", 1.2, 1.8e-5, 0);
        try (FreeFlight flight =
                new FreeFlight(1e-4, 2500, step, new double[] {5, 0, 0}, REST, FreeFlight.gravity(0, 0, -G), gas)) {
            flight.until(0.1);
            return flight.x(0) + flight.x(2);
        }
    }

    /** Halving the step divides the error of a path under a drag that is not linear by four. */
    @Test
    @Tag("convergence")
    void pathConvergesWithOrderTwo() {
        double fine = errorAt(1e-3 / 16);
        double coarse = errorAt(1e-3) - fine;
        double half = errorAt(5e-4) - fine;
        assertThat(coarse / half).isBetween(3.4, 4.6);
    }

    /** A step much longer than the time of answer is cut at once, from the first step on. */
    @Test
    void firstStepAlreadyKnowsTheRelaxationTime() {
        double tau = 2500 * 4e-12 / (18 * 1.8e-5); // diameter 2 um
        Field gas = still("stokes", 1.2, 1.8e-5, 0);
        try (FreeFlight flight = new FreeFlight(1e-6, 2500, 1e-3, new double[] {1, 0, 0}, REST, gas)) {
            flight.step();
            assertThat(flight.run().pastStep()).isCloseTo(0.1 * tau, within(1e-3 * tau));
            flight.until(5 * tau);
            assertThat(flight.v(0)).isCloseTo(Math.exp(-flight.middle() / tau), within(1e-3));
        }
    }
}
