// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

class CircleTest {

    /**
     * Oracle: StrictMath (fdlibm). Tolerance: rounding of 2 pi times the turns, up to 3 turns, plus two units in the
     * last place.
     */
    @Tag("reference")
    @Test
    void sineAndCosineAreThoseOfTheStandardLibrary() {
        for (int k = -3000; k <= 3000; k++) {
            double turns = k * 1.0001e-3;
            double angle = 2 * Math.PI * turns;
            assertThat(Circle.sine(turns)).isEqualTo(StrictMath.sin(angle), within(2.5e-15));
            assertThat(Circle.cosine(turns)).isEqualTo(StrictMath.cos(angle), within(2.5e-15));
        }
    }

    @Test
    void quarterTurnsAreExact() {
        assertThat(Circle.sine(0.25)).isEqualTo(1);
        assertThat(Circle.cosine(0.5)).isEqualTo(-1);
        assertThat(Circle.sine(-0.25)).isEqualTo(-1);
        assertThat(Circle.sine(1e9 + 0.5)).isZero();
        assertThat(Circle.cosine(1e9 + 0.75)).isZero();
    }

    @Test
    void squaresAddUpToOne() {
        for (int k = 0; k < 1000; k++) {
            double s = Circle.sine(k * 0.37);
            double c = Circle.cosine(k * 0.37);
            assertThat(s * s + c * c).isEqualTo(1, within(5e-16));
        }
    }
}
