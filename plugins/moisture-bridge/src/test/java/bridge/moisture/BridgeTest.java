// SPDX-License-Identifier: Apache-2.0
package bridge.moisture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Force, energy and length of one bridge against the published forms. */
class BridgeTest {

    private static final double RADIUS = 2e-3; // m, of both spheres
    private static final double EFFECTIVE = RADIUS / 2;
    private static final double TENSION = 0.072; // N/m
    private static final double ANGLE = Math.PI / 6;
    private static final double VOLUME = 8e-12; // m3, a thousandth of R^3
    private static final Bridge BRIDGE = Bridge.of(TENSION, ANGLE, VOLUME);

    /** 2 pi R g cos t for equal spheres: 0.072 * 2e-3 * 2 pi * 0.8660254 = 7.8357e-4 N; any amount of liquid. */
    @ParameterizedTest
    @Tag("reference")
    @ValueSource(doubles = {1e-20, 1e-15, 1e-11})
    void forceOfTouchingSpheresDoesNotDependOnTheVolume(double volume) {
        Bridge bridge = Bridge.of(TENSION, ANGLE, volume);
        assertThat(bridge.force(EFFECTIVE, 0)).isCloseTo(7.8357e-4, within(1e-8));
        assertThat(bridge.force(EFFECTIVE, -1e-6)).isEqualTo(bridge.force(EFFECTIVE, 0));
    }

    /** A wall has R* = R: twice the force of two equal spheres, 4 pi R g cos t (textbook, sphere on a plate). */
    @Test
    @Tag("reference")
    void wallPullsTwiceAsMuchAsAnEqualSphere() {
        assertThat(BRIDGE.force(RADIUS, 0)).isCloseTo(2 * 7.8357e-4, within(2e-8));
    }

    /** The same formula in another algebraic form, so to rounding of the published one, which cancels at small gaps. */
    @ParameterizedTest
    @Tag("reference")
    @ValueSource(doubles = {1e-6, 1e-5, 1e-4, 2e-4})
    void forceAcrossAGapIsThePublishedOne(double gap) {
        double expected = Published.force(RADIUS, TENSION, ANGLE, VOLUME, gap);
        assertThat(BRIDGE.force(EFFECTIVE, gap)).isCloseTo(expected, within(1e-9 * expected));
    }

    /** Two approximations of one exact curve, each said to be good to some percent: 8 % up to a scaled gap of 2. */
    @ParameterizedTest
    @Tag("reference")
    @ValueSource(doubles = {0.01, 0.1, 0.2, 0.5, 1, 2})
    void forceIsNearTheFitOfWillett(double scaled) {
        double gap = scaled * Math.sqrt(VOLUME / RADIUS);
        double expected = Published.fitted(RADIUS, TENSION, ANGLE, VOLUME, gap);
        assertThat(BRIDGE.force(EFFECTIVE, gap)).isCloseTo(expected, within(0.08 * expected));
    }

    /** (1 + t/2) V^(1/3) = (1 + 0.261799) * 2e-4 m. */
    @Test
    @Tag("reference")
    void ruptureDistanceIsThatOfLianThorntonAndAdams() {
        assertThat(BRIDGE.rupture()).isCloseTo(2.523599e-4, within(1e-10));
    }

    /** Midpoint rule with 20,000 strips: 1e-8 of the work. */
    @ParameterizedTest
    @Tag("reference")
    @ValueSource(doubles = {1e-5, 1e-4, 2.5e-4})
    void energyIsTheWorkOfTheForce(double gap) {
        double expected = Published.work(RADIUS, TENSION, ANGLE, VOLUME, gap);
        assertThat(BRIDGE.energy(EFFECTIVE, gap)).isCloseTo(expected, within(1e-6 * expected));
    }

    /** The constant pull of a touching bridge does work F_0 d on the way in. */
    @Test
    void energyFallsInTheOverlap() {
        assertThat(BRIDGE.energy(EFFECTIVE, 0)).isZero();
        assertThat(BRIDGE.energy(EFFECTIVE, -1e-6)).isCloseTo(-7.8357e-10, within(1e-14));
    }
}
