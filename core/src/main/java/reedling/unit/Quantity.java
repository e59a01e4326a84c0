// SPDX-License-Identifier: Apache-2.0
package reedling.unit;

import java.math.BigDecimal;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads a number with a unit written as text, as case files hold them: {@code "7 mm"}, {@code "1250 kg/m3"},
 * {@code "90 rpm"}, {@code "1e-5 s"}. Threads: stateless.
 */
public final class Quantity {

    private static final Pattern NUMBER_THEN_UNIT =
            Pattern.compile("([+-]?(?:[0-9]+(?:\\.[0-9]+)?|\\.[0-9]+)(?:[eE][+-]?[0-9]+)?)(.*)", Pattern.DOTALL);

    /** Longest accepted text; longer ones are no quantities and only cost time. */
    private static final int LONGEST = 100;

    /** A turn is 2 pi radians: lets a drive's frequency be written in rpm. */
    private static final BigDecimal TURN = new BigDecimal("6.2831853071795864769252867665590057683943387987502");

    private Quantity() {}

    /**
     * Value in SI, the double nearest to what is written.
     *
     * <p>A frequency may also be written as an angular speed ("1200 rpm" is 20 Hz). The reverse is refused, since "20 Hz"
     * for an angular speed could mean turns or radians.
     *
     * @param text number, then unit; the space between them may be left out
     * @param dimension what the value must be
     * @throws QuantityException if the text is malformed, the unit unknown or of another dimension, or the value is too
     *     large or too small for a double
     */
    public static double read(String text, Dimension dimension) {
        Matcher parts = NUMBER_THEN_UNIT.matcher(text.strip());
        if (text.length() > LONGEST || !parts.matches()) {
            throw malformed(text, dimension);
        }
        String rest = parts.group(2);
        if (rest.stripLeading().startsWith(",")) {
            throw new QuantityException(
                    quoted(text), dimension.phrase(), "Use a point as decimal sign and no thousands separators.");
        }
        if (secondNumber(rest)) {
            throw malformed(text, dimension);
        }
        UnitFactor unit = UnitExpression.read(rest);
        BigDecimal number = number(parts.group(1), text, dimension);
        double value = (turnsPerSecond(unit, dimension) ? perTurn(unit) : checked(unit, text, dimension)).toSi(number);
        if (Double.isInfinite(value) || (value == 0 && number.signum() != 0)) {
            throw tooExtreme(text, dimension);
        }
        return value;
    }

    /** "1 000 mm" is refused, "5 1/s" is five per second. */
    private static boolean secondNumber(String rest) {
        String unit = rest.strip();
        boolean digit = !unit.isEmpty() && (Character.isDigit(unit.charAt(0)) || unit.charAt(0) == '.');
        return digit && !(rest.startsWith(" ") && unit.startsWith("1/"));
    }

    private static BigDecimal number(String digits, String text, Dimension dimension) {
        int exponent = Math.max(digits.indexOf('e'), digits.indexOf('E'));
        if (exponent >= 0 && digits.length() - exponent > 5) {
            throw tooExtreme(text, dimension);
        }
        return new BigDecimal(digits);
    }

    private static boolean turnsPerSecond(UnitFactor unit, Dimension dimension) {
        return dimension == Dimension.FREQUENCY && unit.exponents().equals(Dimension.ANGULAR_SPEED.exponents());
    }

    private static UnitFactor perTurn(UnitFactor unit) {
        return new UnitFactor(unit.numerator(), unit.denominator().multiply(TURN), unit.exponents());
    }

    private static UnitFactor checked(UnitFactor unit, String text, Dimension dimension) {
        if (!unit.exponents().equals(dimension.exponents())) {
            throw new QuantityException(
                    quoted(text) + ", " + Dimension.phraseOf(unit.exponents()), dimension.phrase(), remedy(dimension));
        }
        return unit;
    }

    private static String remedy(Dimension dimension) {
        return dimension == Dimension.NUMBER
                ? "Write the number without a unit."
                : "Write a unit of that kind, or a bare number in " + dimension.siUnit() + ".";
    }

    private static QuantityException malformed(String text, Dimension dimension) {
        String shown = text.length() > LONGEST ? text.substring(0, LONGEST) + "..." : text;
        return new QuantityException(
                quoted(shown) + ", unreadable as a number with a unit",
                dimension.phrase(),
                "Write it like \"1.5 " + dimension.siUnit() + "\", or as a bare number in SI.");
    }

    private static QuantityException tooExtreme(String text, Dimension dimension) {
        return new QuantityException(
                quoted(text) + ", beyond what a double can hold", dimension.phrase(), "Check the exponent.");
    }

    private static String quoted(String text) {
        return '"' + text + '"';
    }
}
