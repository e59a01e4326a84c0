// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static reedling.structure.EndCondition.CLAMPED;
import static reedling.structure.EndCondition.FREE;
import static reedling.structure.EndCondition.PINNED;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Limits of the tensioned frequency that are known in closed form. */
@Tag("reference")
class LateralModeTest {

    private static double hertz(double tension, EndCondition start, EndCondition end) {
        return new LateralMode(2.1e11 * 1.66667e-9, tension, 7850 * 0.0002, 1).angularFrequency(start, end)
                / (2 * Math.PI);
    }

    /** Without tension: textbook frequencies of a Bernoulli-Euler bar to their six digits. */
    @Test
    void withoutTensionItIsTheBar() {
        assertThat(hertz(0, CLAMPED, FREE)).isCloseTo(8.35517, within(1e-4));
        assertThat(hertz(0, CLAMPED, CLAMPED)).isCloseTo(53.166, within(1e-3));
        assertThat(hertz(0, PINNED, PINNED)).isCloseTo(23.4533, within(1e-4));
        assertThat(hertz(0, PINNED, CLAMPED)).isCloseTo(36.6385, within(1e-4));
    }

    /** Under strong tension a string shortened by the boundary layer sqrt(EI/T) at each clamp. */
    @Test
    void underStrongTensionItIsAShorterString() {
        double tension = 3.5e6;
        double layer = Math.sqrt(2.1e11 * 1.66667e-9 / tension);
        double string = 0.5 * Math.sqrt(tension / 1.57);
        assertThat(hertz(tension, PINNED, PINNED)).isCloseTo(string, within(1e-3 * string));
        assertThat(hertz(tension, CLAMPED, PINNED)).isCloseTo(string / (1 - layer), within(1e-3 * string));
        assertThat(hertz(tension, CLAMPED, CLAMPED)).isCloseTo(string / (1 - 2 * layer), within(1e-3 * string));
    }

    @Test
    void looseBodyHasNoLateralMode() {
        assertThat(hertz(0, PINNED, FREE)).isZero();
        assertThat(hertz(0, FREE, FREE)).isZero();
    }
}
