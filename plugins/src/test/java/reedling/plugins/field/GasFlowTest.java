// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import reedling.field.Field;

/** Prescribed flows: their rotation, and grains carried by them on closed-form paths. */
class GasFlowTest {

    private static final double[] NO_FLOW = new double[3];
    private static final double VISCOSITY = 1.8e-5;

    private static Stream<GasFlow> flows() {
        double[] velocity = {1, -2, 3};
        double[] centre = {0.1, 0.2, -0.3};
        return Stream.of(
                new LinearFlow(velocity, 0, 0, 1, centre),
                new LinearFlow(velocity, 5, 0, 2, centre),
                new LinearFlow(velocity, 5, 2, 0, centre),
                new LinearFlow(velocity, -4, 1, 0, centre),
                new LinearFlow(velocity, -4, 1, 2, centre),
                new VortexFlow(velocity, 7, 2, 1e6, centre),
                new VortexFlow(velocity, 7, 0, 0.05, centre),
                new VortexFlow(velocity, -7, 1, 10, centre),
                table());
    }

    /** A table of 3 x 2 x 4 nodes with numbers of no pattern. */
    private static TableFlow table() {
        double[] values = new double[3 * 24];
        for (int k = 0; k < values.length; k++) {
            values[k] = Math.sin(11.0 * k) + 0.1 * (k % 5);
        }
        TableFlow.Grid grid =
                new TableFlow.Grid(new double[] {-1, -1, -1}, new double[] {1.1, 2.3, 0.8}, new int[] {3, 2, 4});
        return new TableFlow(grid, values);
    }

    /** Half the curl by central differences, inside a cell. */
    @ParameterizedTest
    @MethodSource("flows")
    void rotationIsHalfTheCurl(GasFlow flow) {
        double h = 1e-5;
        double[] at = {0.27, -0.38, 0.33};
        double[][] slope = new double[3][3]; // d u[c] / d x[axis]
        double[] up = new double[6];
        double[] down = new double[6];
        for (int axis = 0; axis < 3; axis++) {
            double[] step = new double[3];
            step[axis] = h;
            flow.at(at[0] + step[0], at[1] + step[1], at[2] + step[2], up);
            flow.at(at[0] - step[0], at[1] - step[1], at[2] - step[2], down);
            for (int c = 0; c < 3; c++) {
                slope[c][axis] = (up[c] - down[c]) / (2 * h);
            }
        }
        double[] out = new double[6];
        flow.at(at[0], at[1], at[2], out);
        assertThat(out[3]).isCloseTo(0.5 * (slope[2][1] - slope[1][2]), within(1e-6));
        assertThat(out[4]).isCloseTo(0.5 * (slope[0][2] - slope[2][0]), within(1e-6));
        assertThat(out[5]).isCloseTo(0.5 * (slope[1][0] - slope[0][1]), within(1e-6));
    }

    /** Linear flows are met exactly between nodes; outside, the nearest point of the grid counts. */
    @Test
    void tableIsLinearInsideAndClampedOutside() {
        TableFlow.Grid grid =
                new TableFlow.Grid(new double[] {0, 1, 2}, new double[] {0.5, 0.25, 1}, new int[] {3, 5, 1});
        double[] values = new double[3 * 15];
        for (int j = 0; j < 5; j++) {
            for (int i = 0; i < 3; i++) {
                values[3 * (i + 3 * j)] = 2 * (0.5 * i) - 3 * (1 + 0.25 * j);
                values[3 * (i + 3 * j) + 1] = 7;
            }
        }
        TableFlow flow = new TableFlow(grid, values);
        double[] out = new double[6];
        flow.at(0.63, 1.41, 99, out);
        assertThat(out).containsExactly(new double[] {2 * 0.63 - 3 * 1.41, 7, 0, 0, 0, 1.5}, within(1e-12));
        flow.at(-5, 8, 2, out);
        assertThat(out).containsExactly(new double[] {-6, 7, 0, 0, 0, 0}, within(1e-12));
    }

    @Test
    void vortexFallsOffOutsideItsCore() {
        VortexFlow flow = new VortexFlow(NO_FLOW, 100, 2, 0.02, NO_FLOW);
        double[] out = new double[6];
        flow.at(0.01, 0, 5, out);
        assertThat(out).containsExactly(new double[] {0, 1, 0, 0, 0, 100}, within(1e-12));
        flow.at(0, 0.04, 5, out);
        assertThat(out).containsExactly(new double[] {-1, 0, 0, 0, 0, 0}, within(1e-12));
    }

    /** Time in which a Stokes grain of a diameter of 0.1 mm answers, s: 2500 d^2 / (18 eta). */
    private static double tau() {
        return 2500 * 1e-8 / (18 * VISCOSITY);
    }

    private static Field gas(Map<String, Double> numbers, String flow) {
        Map<String, Double> all = new java.util.HashMap<>(numbers);
        all.put("viscosity", VISCOSITY);
        return FreeFlight.gas(all, Map.of("drag", "stokes", "flow", flow));
    }

    /**
     * In a gas that turns as a rigid body, z'' = -(z' - i w z) / tau with z = x + i y; a grain started on the growing root
     * L^2 + L / tau - i w / tau = 0 stays on z0 exp(L t). 1e-4 of the radius.
     */
    @Test
    @Tag("reference")
    void grainSpiralsOutOfARigidVortex() {
        double spin = 20;
        double a = 1 / (2 * tau());
        // sqrt(a^2 + i spin / tau) = p + i q
        double size = Math.hypot(a * a, spin / tau());
        double p = Math.sqrt(0.5 * (size + a * a));
        double q = Math.sqrt(0.5 * (size - a * a));
        double growth = p - a;
        double[] centre = {0.01, 0, 0};
        double[] start = {0.01 * growth, 0.01 * q, 0};
        Field vortex = gas(Map.of("vortex_spin", spin), "vortex");
        try (FreeFlight flight = new FreeFlight(5e-5, 2500, tau() / 100, centre, start, NO_FLOW, vortex)) {
            flight.until(0.3);
            double r = 0.01 * Math.exp(growth * flight.time());
            assertThat(r).isGreaterThan(0.03);
            assertThat(flight.x(0)).isCloseTo(r * Math.cos(q * flight.time()), within(1e-4 * r));
            assertThat(flight.x(1)).isCloseTo(r * Math.sin(q * flight.time()), within(1e-4 * r));
        }
    }

    /** u = U t / T: v = U / T (t - tau + tau exp(-t / tau)) up to T; 1e-4 of U. */
    @Test
    @Tag("reference")
    void grainFollowsAGrowingWind() {
        double ramp = 3 * tau();
        Field wind = gas(Map.of("velocity_x", 2.0, "ramp", ramp), "uniform");
        try (FreeFlight flight = new FreeFlight(5e-5, 2500, tau() / 100, NO_FLOW, NO_FLOW, wind).until(2.5 * tau())) {
            double t = flight.middle();
            double expected = 2 / ramp * (t - tau() + tau() * Math.exp(-t / tau()));
            assertThat(flight.v(0)).isCloseTo(expected, within(2e-4));
        }
    }

    /** u = U (1 + a sin W t): v = U (1 - e) + U a (sin W t - W tau cos W t + W tau e) / (1 + (W tau)^2), e = exp(-t/tau). */
    @Test
    @Tag("reference")
    void grainFollowsASwingingWind() {
        double frequency = 0.5 / tau();
        Field wind = gas(Map.of("velocity_y", 2.0, "swing", 0.4, "swing_frequency", frequency), "uniform");
        try (FreeFlight flight = new FreeFlight(5e-5, 2500, tau() / 100, NO_FLOW, NO_FLOW, wind).until(4.3 * tau())) {
            double t = flight.middle();
            double e = Math.exp(-t / tau());
            double wt = 2 * Math.PI * frequency * tau();
            double phase = 2 * Math.PI * frequency * t;
            double swing = (Math.sin(phase) - wt * Math.cos(phase) + wt * e) / (1 + wt * wt);
            assertThat(flight.v(1)).isCloseTo(2 * (1 - e) + 2 * 0.4 * swing, within(1e-3));
        }
    }

    /** In a shear u_x = rate z at rest in z the grain ends at u(z), and its spin at half the curl, rate / 2 about y. */
    @Test
    @Tag("reference")
    void grainTakesSpeedAndSpinOfAShear() {
        Field shear = FreeFlight.gas(
                Map.of("viscosity", VISCOSITY, "shear_rate", 30.0, "centre_z", -0.1),
                Map.of("drag", "stokes", "flow", "shear", "spin_damping", "stokes"));
        try (FreeFlight flight = new FreeFlight(5e-5, 2500, tau() / 30, NO_FLOW, NO_FLOW, shear).until(20 * tau())) {
            assertThat(flight.v(0)).isCloseTo(3, within(1e-6));
            assertThat(flight.spin(1)).isCloseTo(15, within(1e-6));
        }
    }
}
