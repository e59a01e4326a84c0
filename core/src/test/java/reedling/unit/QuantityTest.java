// SPDX-License-Identifier: Apache-2.0
package reedling.unit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class QuantityTest {

    @ParameterizedTest
    @CsvSource({
        "7 mm, LENGTH, 0.007",
        "7mm, LENGTH, 0.007",
        "'  7 mm ', LENGTH, 0.007",
        "4.4 mm, LENGTH, 0.0044",
        "+.5 cm, LENGTH, 0.005",
        "-2 m, LENGTH, -2",
        "300 µm, LENGTH, 3e-4",
        "300 um, LENGTH, 3e-4",
        "2 in, LENGTH, 0.0508",
        "1250 kg/m3, DENSITY, 1250",
        "1.25 g/cm3, DENSITY, 1250",
        "1.25 g cm^-3, DENSITY, 1250",
        "1.25 g·cm⁻³, DENSITY, 1250",
        "1.25 t/m³, DENSITY, 1250",
        "0.05 s, TIME, 0.05",
        "1e-5 s, TIME, 1e-5",
        "1E-5s, TIME, 1e-5",
        "1.5e+3 ms, TIME, 1.5",
        "2 min, TIME, 120",
        "8 N, FORCE, 8",
        "8 kg m/s2, FORCE, 8",
        "8 kg*m/s**2, FORCE, 8",
        "60 MPa, PRESSURE, 6e7",
        "2 bar, PRESSURE, 2e5",
        "5 mbar, PRESSURE, 500",
        "6 N/mm2, PRESSURE, 6e6",
        "0.12 kg/s, MASS_RATE, 0.12",
        "36 kg/h, MASS_RATE, 0.01",
        "3.6 t/h, MASS_RATE, 1",
        "20 Hz, FREQUENCY, 20",
        "1200 rpm, FREQUENCY, 20",
        "20 1/s, COUNT_RATE, 20",
        "20 s-1, COUNT_RATE, 20",
        "107 N/m, STIFFNESS, 107",
        "0.05 J/m2, SURFACE_ENERGY, 0.05",
        "50 mN/m, SURFACE_ENERGY, 0.05",
        "3 N m, MOMENT, 3",
        "3 Nm, MOMENT, 3",
        "1 mPa s, VISCOSITY, 1e-3",
        "2 kg/(m s), VISCOSITY, 2",
        "5 %, NUMBER, 0.05",
        "0.3, NUMBER, 0.3",
        "2 L, VOLUME, 2e-3",
        "1 (m/s)2/m, ACCELERATION, 1",
        "0 mm, LENGTH, 0",
    })
    void readsTheDoubleNearestToTheWrittenValue(String text, Dimension dimension, double si) {
        assertThat(Quantity.read(text, dimension)).isEqualTo(si);
    }

    /** Expected values from Math.PI; one unit in the last place is the rounding of that product. */
    @Test
    @Tag("reference")
    void readsAnglesAndRotations() {
        assertThat(Quantity.read("5 deg", Dimension.ANGLE)).isCloseTo(5 * Math.PI / 180, within(1e-17));
        assertThat(Quantity.read("180°", Dimension.ANGLE)).isEqualTo(Math.PI);
        assertThat(Quantity.read("1 turn", Dimension.ANGLE)).isEqualTo(2 * Math.PI);
        assertThat(Quantity.read("90 rpm", Dimension.ANGULAR_SPEED)).isCloseTo(3 * Math.PI, within(2e-15));
        assertThat(Quantity.read("3 turn/s", Dimension.ANGULAR_SPEED)).isCloseTo(6 * Math.PI, within(4e-15));
    }

    @ParameterizedTest
    @EnumSource(Dimension.class)
    void everySiUnitReadsAsOneOfItsOwnDimension(Dimension dimension) {
        String text = dimension == Dimension.NUMBER ? "1" : "1 " + dimension.siUnit();
        assertThat(Quantity.read(text, dimension)).isEqualTo(1);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                " ",
                "mm",
                "seven mm",
                "0x10 mm",
                "1_000 mm",
                "1 000 mm",
                "1.000.000 mm",
                "5. mm",
                "5 .mm",
                "--5 mm",
                "5 mm mm mm",
                "5 m m",
                "5 mm2",
                "5 kg",
                "5",
                "5 m0",
                "5 m10",
                "5 m^",
                "5 m-",
                "5 m/",
                "5 /m",
                "5 (m",
                "5 m)",
                "5 m^2.5",
                "5 m**",
                "5e mm",
                "5 e-3 m",
                "5e--3 m",
                "1 e-5 m",
                "inf m",
                "nan m",
                "Infinity m",
                "5 ± 0.4 mm",
                "4-5 mm",
                "5 MM",
                "5 M",
                "5 Meter",
                "5 kmm",
                "5 mmm",
                "7d",
                "7f",
                "7 mm;",
                "10^3 m",
                "5 m 2",
                "1/2 m",
                "1e400 m",
                "-1e400 m",
                "1e-400 m",
                "1e99999 m",
                "1e-999999999999 m",
                "5 m\nm",
                "5 m//s",
                "5 '",
                "5 µ",
                "5 °",
                "５ ft ft",
                "5 \" in",
                "-",
                "+",
                ".",
                "e5",
                "5 Pm",
                "5 m³³",
                "5 km/h",
                "5 1 m",
                "5 m*",
                "5 * m"
            })
    void refusesWhatIsNoLength(String text) {
        assertThatThrownBy(() -> Quantity.read(text, Dimension.LENGTH)).isInstanceOf(QuantityException.class);
    }

    @Test
    void refusesAHugeTextQuickly() {
        assertThatThrownBy(() -> Quantity.read("1".repeat(1_000_000) + " m", Dimension.LENGTH))
                .isInstanceOf(QuantityException.class)
                .hasMessageContaining("unreadable")
                .satisfies(e -> assertThat(e.getMessage()).hasSizeLessThan(300));
    }

    @Test
    void aWrongDimensionNamesBoth() {
        assertThatThrownBy(() -> Quantity.read("7 kg", Dimension.LENGTH))
                .hasMessage("is \"7 kg\", a mass (kg), expected a length (m). "
                        + "Write a unit of that kind, or a bare number in m.");
        assertThatThrownBy(() -> Quantity.read("7 mm", Dimension.NUMBER))
                .hasMessage("is \"7 mm\", a length (m), expected a plain number. Write the number without a unit.");
        assertThatThrownBy(() -> Quantity.read("7 m s", Dimension.LENGTH))
                .hasMessageContaining("a quantity in m s, expected a length (m)");
    }

    @Test
    void hertzIsNoAngularSpeed() {
        assertThatThrownBy(() -> Quantity.read("20 Hz", Dimension.ANGULAR_SPEED))
                .hasMessageContaining("\"20 Hz\", a frequency (Hz), expected an angular speed (rad/s)");
        assertThatThrownBy(() -> Quantity.read("5 deg", Dimension.NUMBER)).hasMessageContaining("an angle (rad)");
        assertThatThrownBy(() -> Quantity.read("20 rpm", Dimension.COUNT_RATE))
                .hasMessageContaining("an angular speed");
    }

    @Test
    void anUnknownUnitSuggestsTheNearest() {
        assertThatThrownBy(() -> Quantity.read("7 kpa", Dimension.PRESSURE))
                .hasMessage("is the unknown unit \"kpa\", expected a unit symbol this program knows. "
                        + "Did you mean \"kPa\"?");
        assertThatThrownBy(() -> Quantity.read("7 parsecs", Dimension.LENGTH)).hasMessageContaining("Use SI units");
    }

    @Test
    void aDecimalCommaIsNamed() {
        assertThatThrownBy(() -> Quantity.read("4,4 mm", Dimension.LENGTH))
                .hasMessage("is \"4,4 mm\", expected a length (m). Use a point as decimal sign and no thousands"
                        + " separators.");
    }

    @ParameterizedTest
    @ValueSource(strings = {"5 kg/m s", "5 kg/m/s", "5 kg/m s2", "5 J/kg m"})
    void aUnitWithTwoReadingsIsRefused(String text) {
        assertThatThrownBy(() -> Quantity.read(text, Dimension.VISCOSITY))
                .hasMessageContaining("more than one reading")
                .hasMessageContaining("Put all units of the denominator in brackets");
    }

    /** The first quotient after many products once met compiled code that lost a value. */
    @Test
    void aQuotientAfterManyProductsIsReadAlike() {
        for (int k = 0; k < 20_000; k++) {
            assertThat(Quantity.read("3 N m", Dimension.MOMENT)).isEqualTo(3);
        }
        assertThat(Quantity.read("3 turn/s", Dimension.ANGULAR_SPEED)).isCloseTo(6 * Math.PI, within(4e-15));
    }
}
