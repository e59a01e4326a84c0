// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.field.Field;

/** A charged grain of m = 1e-6 kg and q = 1e-6 C in B = 0.5 T along z: textbook motions. */
class ChargedGrainsTest {

    private static final double RADIUS = 5e-4;
    private static final double DENSITY = 1e-6 / (4.0 / 3 * Math.PI * RADIUS * RADIUS * RADIUS);
    private static final double PERIOD = 12.5664;
    private static final double[] REST = new double[3];

    /** The same field by a charge, and by a charge per mass. */
    private static final Field MAGNETIC = FreeFlight.charged(Map.of("magnetic_z", 0.5, "charge", 1e-6));

    private static final Field CROSSED =
            FreeFlight.charged(Map.of("magnetic_z", 0.5, "electric_y", 0.2, "charge_per_mass", 1.0));

    /** Radius m v / q B = 2 m, pitch 3.76991 m, clockwise about +z; 1e-4 of the radius: the steps do not end on a period. */
    @Test
    @Tag("reference")
    void magneticFieldDrawsAHelix() {
        double[] start = {1, 0, 0.3};
        try (FreeFlight flight = new FreeFlight(RADIUS, DENSITY, 1e-3, start, REST, MAGNETIC)) {
            flight.until(PERIOD / 4);
            assertThat(flight.x(0)).isCloseTo(2, within(1e-3));
            assertThat(flight.x(1)).isCloseTo(-2, within(1e-3));
            flight.until(PERIOD);
            assertThat(flight.x(0)).isCloseTo(0, within(1e-3));
            assertThat(flight.x(1)).isCloseTo(0, within(1e-3));
            assertThat(flight.x(2)).isCloseTo(3.76991, within(1e-3));
        }
    }

    /** A magnetic force does no work. Steps of a fiftieth of a turn (0.1 rad is the limit), 100 turns: 1e-12 is rounding. */
    @Test
    @Tag("conservation")
    void speedStaysOverAHundredTurns() {
        double[] start = {1, 0, 0.3};
        try (FreeFlight flight = new FreeFlight(RADIUS, DENSITY, PERIOD / 50, start, REST, MAGNETIC)) {
            flight.step();
            flight.step();
            assertThat(flight.run().pastStep()).isCloseTo(0.2, within(1e-9)); // 0.1 rad over 0.5 rad/s
            double early = flight.speed();
            flight.until(100 * PERIOD);
            assertThat(flight.speed()).isCloseTo(early, within(1e-12));
            assertThat(Math.abs(flight.run().ledger().fieldWork())).isLessThan(1e-18);
            assertThat(Math.abs(flight.run().ledger().relativeResidual())).isLessThan(1e-12);
            assertThat(flight.run().ledger().holdings().kinetic()).isCloseTo(0.5e-6 * 1.09, within(1e-18));
        }
    }

    /** Late by (Omega h)^2 / 12 of a turn: at the longest step, after 100 turns, 0.52 rad. */
    @Test
    @Tag("convergence")
    void phaseLagsByASquareOfTheStep() {
        double[] start = {1, 0, 0};
        double[] lag = new double[2];
        for (int k = 0; k < 2; k++) {
            try (FreeFlight flight = new FreeFlight(RADIUS, DENSITY, 0.2 / (1 << k), start, REST, MAGNETIC)) {
                flight.until(10 * PERIOD);
                double exact = 0.5 * flight.middle();
                double angle = Math.atan2(-flight.v(1), flight.v(0));
                lag[k] = Math.IEEEremainder(exact - angle, 2 * Math.PI) / exact;
            }
        }
        assertThat(lag[0]).isCloseTo(0.1 * 0.1 / 12, within(0.02 * 0.1 * 0.1 / 12));
        assertThat(lag[0] / lag[1]).isBetween(3.8, 4.2);
    }

    /** Cycloid: drift E/B = 0.4 m/s along +x, up to 2 m E / (q B^2) = 1.6 m towards +y, at most 0.8 m/s; 0.1 %. */
    @Test
    @Tag("reference")
    void crossedFieldsDrawACycloid() {
        double highest = 0;
        double fastest = 0;
        try (FreeFlight flight = new FreeFlight(RADIUS, DENSITY, 1e-3, REST, REST, CROSSED)) {
            while (flight.time() < PERIOD) {
                flight.step();
                highest = Math.max(highest, flight.x(1));
                fastest = Math.max(fastest, flight.speed());
            }
            assertThat(flight.x(0)).isCloseTo(5.02655, within(1e-3 * 5.02655));
            assertThat(highest).isCloseTo(1.6, within(1.6e-3));
            assertThat(fastest).isCloseTo(0.8, within(0.8e-3));
            assertThat(flight.x(1)).isCloseTo(0, within(1e-3));
            // kinetic energy and potential belong to velocities that differ by (Omega h)^2 / 8 = 3e-8 in energy
            assertThat(Math.abs(flight.run().ledger().relativeResidual())).isLessThan(2e-7);
        }
    }

    /** A lot's field leaves other lots alone: the rig's grains are of lot 0. */
    @Test
    void fieldOfAnotherLotIsNotFelt() {
        Field other = FreeFlight.charged(Map.of("electric_x", 1e3, "magnetic_z", 1.0, "charge", 1e-6, "lot", 1.0));
        Field own = FreeFlight.charged(Map.of("electric_x", 1e3, "charge", 1e-6, "lot", 0.0));
        double[] start = {1, 0, 0};
        try (FreeFlight flight = new FreeFlight(RADIUS, DENSITY, 1e-3, start, REST, other).until(0.1)) {
            assertThat(flight.v(0)).isEqualTo(1);
            assertThat(flight.v(1)).isZero();
        }
        try (FreeFlight flight = new FreeFlight(RADIUS, DENSITY, 1e-3, start, REST, own).until(0.1)) {
            assertThat(flight.v(0)).isCloseTo(1 + 1e3 * flight.middle(), within(1e-6));
        }
    }
}
