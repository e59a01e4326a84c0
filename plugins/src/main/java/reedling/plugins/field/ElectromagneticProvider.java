// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import java.util.List;
import reedling.field.Field;
import reedling.field.FieldProvider;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;
import reedling.unit.Dimension;

/**
 * Offers uniform electric and magnetic fields under the name {@code electromagnetic}, on the grains of one lot or of all;
 * lots of different charge take one field entry each.
 */
public final class ElectromagneticProvider implements FieldProvider {

    private static final double STRONGEST_ELECTRIC = 1e9; // V/m, far beyond breakdown in any gas
    private static final double STRONGEST_MAGNETIC = 1e3; // T
    private static final double LARGEST_CHARGE = 1; // C
    private static final double LARGEST_RATIO = 1e6; // C/kg

    @Override
    public String name() {
        return "electromagnetic";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Force of uniform electric and magnetic fields on charged grains.";
    }

    @Override
    public String source() {
        return "Force: H. A. Lorentz 1895. Turn of the velocity: J. P. Boris, Relativistic plasma simulation -"
                + " optimization of a hybrid code, 1970 (from memory)";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(
                electric("x"),
                electric("y"),
                electric("z"),
                magnetic("x"),
                magnetic("y"),
                magnetic("z"),
                new Parameter(
                        "charge",
                        Dimension.CHARGE,
                        -LARGEST_CHARGE,
                        LARGEST_CHARGE,
                        0,
                        "Charge of every grain, added to that by mass."),
                new Parameter(
                        "charge_per_mass",
                        Dimension.CHARGE_PER_MASS,
                        -LARGEST_RATIO,
                        LARGEST_RATIO,
                        0,
                        "Charge of a grain over its mass."),
                Parameter.lot("lot", "The lot whose grains carry this charge."));
    }

    private static Parameter electric(String axis) {
        double most = STRONGEST_ELECTRIC;
        return new Parameter(
                "electric_" + axis, Dimension.ELECTRIC_FIELD, -most, most, 0, "Electric field along " + axis + ".");
    }

    private static Parameter magnetic(String axis) {
        double most = STRONGEST_MAGNETIC;
        return new Parameter(
                "magnetic_" + axis, Dimension.MAGNETIC_FIELD, -most, most, 0, "Magnetic field along " + axis + ".");
    }

    @Override
    public Field create(ParameterValues values) {
        return new ChargedGrains(
                new double[] {values.get("electric_x"), values.get("electric_y"), values.get("electric_z")},
                new double[] {values.get("magnetic_x"), values.get("magnetic_y"), values.get("magnetic_z")},
                values.get("charge"),
                values.get("charge_per_mass"),
                (int) values.get("lot"));
    }
}
