// SPDX-License-Identifier: Apache-2.0
package reedling.unit;

/** Physical dimension of a case-file key or plugin parameter, with the SI unit its value is held in. */
public enum Dimension {
    NUMBER("1"),
    LENGTH("m"),
    AREA("m2"),
    VOLUME("m3"),
    MASS("kg"),
    TIME("s"),
    ANGLE("rad"),
    FREQUENCY("Hz"),
    SPEED("m/s"),
    ACCELERATION("m/s2"),
    ANGULAR_SPEED("rad/s"),
    DENSITY("kg/m3"),
    FORCE("N"),
    MOMENT("N m"),
    PRESSURE("Pa"),
    ENERGY("J"),
    SURFACE_ENERGY("J/m2"),
    STIFFNESS("N/m"),
    MASS_RATE("kg/s"),
    COUNT_RATE("1/s"),
    VISCOSITY("Pa s"),
    CHARGE("C");

    private final String siUnit;

    Dimension(String siUnit) {
        this.siUnit = siUnit;
    }

    public String siUnit() {
        return siUnit;
    }
}
