// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class AxisTest {

    @ParameterizedTest
    @CsvSource({"0, 25", "-0.19, 0.19", "0.68, 0.72", "-1.4, 2.2", "3e-9, 8e-9", "1e6, 5e6", "-7, -2"})
    void marksAreAFewRoundNumbersInsideTheAxis(double least, double most) {
        Axis axis = Axis.around(least, most, 78, 544, false);
        assertThat(axis.marks()).hasSizeBetween(3, 9).allSatisfy(mark -> {
            assertThat(axis.pixel(mark)).isBetween(78 - 1e-6, 544 + 1e-6);
            assertThat(Double.parseDouble(axis.written(mark))).isCloseTo(mark, within(1e-9 * (most - least)));
        });
        assertThat(axis.marks().stream().map(axis::written)).doesNotHaveDuplicates();
    }

    @Test
    void logarithmicAxisMarksPowersOfTen() {
        Axis axis = Axis.around(0.01, 100, 0, 100, true);
        assertThat(axis.marks().stream().map(axis::written)).containsExactly("0.01", "0.1", "1", "10", "100");
        assertThat(axis.pixel(0.1) - axis.pixel(0.01)).isCloseTo(axis.pixel(10) - axis.pixel(1), within(1e-9));
    }
}
