// SPDX-License-Identifier: Apache-2.0
package reedling.unit;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.EnumMap;
import java.util.Map;

/** Writes SI values for people: 0.007 m as "7 mm", 5e7 Pa as "50 MPa". Six digits at most. Threads: stateless. */
public final class QuantityText {

    private static final MathContext DIGITS = new MathContext(6, RoundingMode.HALF_EVEN);

    /** A way to write a value: used if its size is at least {@code from} of SI. */
    private record Scale(String symbol, double from, String factor) {}

    private static final Map<Dimension, Scale[]> SCALES = new EnumMap<>(Dimension.class);

    static {
        SCALES.put(Dimension.LENGTH, scales("m", 0, -3, -6, -9));
        SCALES.put(Dimension.TIME, scales("s", 0, -3, -6, -9));
        SCALES.put(Dimension.FREQUENCY, scales("Hz", 9, 6, 3, 0));
        SCALES.put(Dimension.FORCE, scales("N", 6, 3, 0, -3, -6, -9));
        SCALES.put(Dimension.PRESSURE, scales("Pa", 9, 6, 3, 0));
        SCALES.put(Dimension.ENERGY, scales("J", 6, 3, 0, -3, -6, -9));
        SCALES.put(Dimension.POWER, scales("W", 6, 3, 0, -3, -6));
        SCALES.put(Dimension.STIFFNESS, scales("N/m", 9, 6, 3, 0));
        SCALES.put(Dimension.MASS, new Scale[] {
            new Scale("t", 1e3, "1e-3"), new Scale("kg", 1, "1"), new Scale("g", 1e-3, "1e3"), new Scale("mg", 0, "1e6")
        });
        SCALES.put(Dimension.SPEED, new Scale[] {new Scale("m/s", 0.1, "1"), new Scale("mm/s", 0, "1e3")});
    }

    private QuantityText() {}

    private static Scale[] scales(String symbol, int... powers) {
        Scale[] scales = new Scale[powers.length];
        for (int k = 0; k < powers.length; k++) {
            double from = k == powers.length - 1 ? 0 : Double.parseDouble("1e" + powers[k]);
            scales[k] = new Scale(prefix(powers[k]) + symbol, from, "1e" + -powers[k]);
        }
        return scales;
    }

    private static String prefix(int power) {
        return switch (power) {
            case 9 -> "G";
            case 6 -> "M";
            case 3 -> "k";
            case -3 -> "m";
            case -6 -> "µ";
            case -9 -> "n";
            default -> "";
        };
    }

    /** A value with the fitting prefix; angles in degrees; pure numbers without unit. */
    public static String of(double si, Dimension dimension) {
        if (Double.isNaN(si) || Double.isInfinite(si)) {
            return Double.isNaN(si) ? "not a number" : si > 0 ? "infinity" : "-infinity";
        }
        if (dimension == Dimension.ANGLE) {
            return digits(new BigDecimal(Math.toDegrees(si))) + " deg";
        }
        BigDecimal exact = new BigDecimal(Double.toString(si));
        Scale[] scales = SCALES.get(dimension);
        if (scales == null || si == 0) {
            String unit = dimension == Dimension.NUMBER ? "" : " " + dimension.siUnit();
            return digits(exact) + unit;
        }
        int k = 0;
        while (k < scales.length - 1 && Math.abs(si) < scales[k].from()) {
            k++;
        }
        return digits(exact.multiply(new BigDecimal(scales[k].factor()))) + " " + scales[k].symbol();
    }

    private static String digits(BigDecimal value) {
        BigDecimal rounded = value.round(DIGITS);
        if (rounded.signum() == 0) {
            return "0";
        }
        int leading = rounded.precision() - rounded.scale();
        BigDecimal stripped = rounded.stripTrailingZeros();
        return leading > 7 || leading < -3
                ? stripped.toString().replace("E+", "e").replace('E', 'e')
                : stripped.toPlainString();
    }
}
