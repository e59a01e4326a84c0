// SPDX-License-Identifier: Apache-2.0
package reedling.unit;

/**
 * Physical dimension of a case-file key or plugin parameter, with the SI unit its value is held in.
 *
 * <p>Angle counts as a base dimension here although SI calls it a pure number: a rotation in Hz and one in rad/s differ
 * by 2 pi, and a reader that takes one for the other is wrong without a word.
 */
public enum Dimension {
    NUMBER("1", "a plain number"),
    LENGTH("m", "a length"),
    AREA("m2", "an area"),
    VOLUME("m3", "a volume"),
    MASS("kg", "a mass"),
    TIME("s", "a time"),
    ANGLE("rad", "an angle"),
    FREQUENCY("Hz", "a frequency"),
    SPEED("m/s", "a speed"),
    ACCELERATION("m/s2", "an acceleration"),
    ANGULAR_SPEED("rad/s", "an angular speed"),
    DENSITY("kg/m3", "a density"),
    FORCE("N", "a force"),
    MOMENT("N m", "a moment"),
    PRESSURE("Pa", "a pressure"),
    ENERGY("J", "an energy"),
    SURFACE_ENERGY("J/m2", "a surface energy"),
    STIFFNESS("N/m", "a stiffness"),
    MASS_RATE("kg/s", "a mass rate"),
    COUNT_RATE("1/s", "a count rate"),
    VISCOSITY("Pa s", "a viscosity"),
    CHARGE("C", "a charge"),
    DAMPING("N s/m", "a damping coefficient"),
    LINE_DENSITY("kg/m", "a mass per length"),
    AREA_DENSITY("kg/m2", "a mass per area"),
    POWER("W", "a power"),
    ELECTRIC_FIELD("V/m", "an electric field"),
    MAGNETIC_FIELD("T", "a magnetic flux density"),
    CHARGE_PER_MASS("C/kg", "a charge per mass"),
    SHEAR_RATE("1/s", "a velocity per length");

    private final String siUnit;
    private final String phrase;
    private final Exponents exponents;

    Dimension(String siUnit, String phrase) {
        this.siUnit = siUnit;
        this.phrase = phrase;
        this.exponents = UnitExpression.read(siUnit).exponents();
    }

    public String siUnit() {
        return siUnit;
    }

    /** With article and unit, as messages print it: "a length (m)". */
    public String phrase() {
        return this == NUMBER ? phrase : phrase + " (" + siUnit + ")";
    }

    Exponents exponents() {
        return exponents;
    }

    /** Phrase for any exponents: that of the first dimension that has them, else the product of base units. */
    static String phraseOf(Exponents exponents) {
        for (Dimension dimension : values()) {
            if (dimension.exponents.equals(exponents)) {
                return dimension.phrase();
            }
        }
        return "a quantity in " + exponents;
    }
}
