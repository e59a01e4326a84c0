// SPDX-License-Identifier: Apache-2.0
package reedling.unit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class QuantityTextTest {

    @ParameterizedTest
    @CsvSource({
        "0.007, LENGTH, 7 mm",
        "0.0044, LENGTH, 4.4 mm",
        "1e-5, LENGTH, 10 µm",
        "1e-12, LENGTH, 0.001 nm",
        "12.5, LENGTH, 12.5 m",
        "1e9, LENGTH, 1e9 m",
        "-0.002, LENGTH, -2 mm",
        "0, LENGTH, 0 m",
        "5e7, PRESSURE, 50 MPa",
        "2.5e8, PRESSURE, 250 MPa",
        "1e-6, PRESSURE, 0.000001 Pa",
        "1e-5, TIME, 10 µs",
        "20, FREQUENCY, 20 Hz",
        "0.08726646259971647, ANGLE, 5 deg",
        "1250, DENSITY, 1250 kg/m3",
        "0.12, MASS_RATE, 0.12 kg/s",
        "5.7e-5, MASS, 57 mg",
        "0.49, NUMBER, 0.49",
        "1e-8, NUMBER, 1e-8",
        "2e10, NUMBER, 2e10",
        "0.3333333333333333, NUMBER, 0.333333",
        "NaN, LENGTH, not a number",
        "-Infinity, LENGTH, -infinity",
    })
    void picksAFittingPrefix(double si, Dimension dimension, String text) {
        assertThat(QuantityText.of(si, dimension)).isEqualTo(text);
    }

    /** Six digits are printed, so what is read back differs by half a unit of the sixth digit at most. */
    @ParameterizedTest
    @EnumSource(Dimension.class)
    void whatIsPrintedReadsBack(Dimension dimension) {
        for (double si = 1.23456e-9; si < 1e9; si *= 7.7) {
            String text = QuantityText.of(si, dimension);
            assertThat(Quantity.read(text, dimension)).as(text).isCloseTo(si, within(si * 5.1e-6));
        }
    }
}
