// SPDX-License-Identifier: Apache-2.0
package reedling.unit;

import java.util.Optional;

/**
 * Reads products, quotients and powers of unit symbols: {@code kg/m3}, {@code N m}, {@code J/(kg m)}, {@code s^-1}.
 *
 * <p>Anything with two readings is refused: a second slash, and a product after a slash without brackets.
 */
final class UnitExpression {

    private static final int LARGEST_POWER = 9;
    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    private final String text;
    private int at;

    private UnitExpression(String text) {
        this.text = text;
    }

    /** The unit written in a text. @throws QuantityException if it is unknown, malformed or has two readings */
    static UnitFactor read(String written) {
        UnitExpression expression = new UnitExpression(plainSigns(written.strip()));
        if (expression.text.isEmpty()) {
            return UnitFactor.ONE;
        }
        UnitFactor unit = expression.quotient();
        if (expression.at < expression.text.length()) {
            throw expression.malformed(expression.text.substring(expression.at));
        }
        return unit;
    }

    private static String plainSigns(String written) {
        StringBuilder plain = new StringBuilder();
        for (char sign : written.toCharArray()) {
            int raised = RAISED.indexOf(sign);
            switch (sign) {
                case 'µ', 'μ' -> plain.append('u');
                case '°' -> plain.append("deg");
                case '·', '⋅' -> plain.append('*');
                case '\u00a0', '\u2009', '\u202f', '\t' -> plain.append(' ');
                case '⁻' -> plain.append('-');
                default -> plain.append(raised >= 0 ? (char) ('0' + raised) : sign);
            }
        }
        return plain.toString().replace("**", "^");
    }

    private UnitFactor quotient() {
        UnitFactor above = product();
        skipBlanks();
        if (!taken('/')) {
            return above;
        }
        skipBlanks();
        UnitFactor unit = above.times(factor(), -1);
        skipBlanks();
        if (at < text.length() && text.charAt(at) != ')') {
            throw new QuantityException(
                    "the unit \"" + text + "\", which has more than one reading",
                    "one / with at most one unit or bracket after it",
                    "Put all units of the denominator in brackets, as in \"J/(kg m)\".");
        }
        return unit;
    }

    private UnitFactor product() {
        UnitFactor unit = UnitFactor.ONE.times(factor(), 1);
        while (true) {
            int before = at;
            skipBlanks();
            boolean star = taken('*');
            skipBlanks();
            if (!star && (before == at || at >= text.length() || text.charAt(at) == '/' || text.charAt(at) == ')')) {
                return unit;
            }
            unit = unit.times(factor(), 1);
        }
    }

    private UnitFactor factor() {
        if (taken('(')) {
            UnitFactor inner = quotient();
            skipBlanks();
            if (!taken(')')) {
                throw malformed(text.substring(at));
            }
            return UnitFactor.ONE.times(inner, power());
        }
        if (at == 0 && taken('1')) {
            return UnitFactor.ONE;
        }
        String symbol = symbol();
        Optional<UnitFactor> unit = UnitTable.find(symbol);
        if (unit.isEmpty()) {
            throw unknown(symbol);
        }
        return UnitFactor.ONE.times(unit.get(), power());
    }

    private String symbol() {
        int start = at;
        while (at < text.length() && (Character.isLetter(text.charAt(at)) || text.charAt(at) == '%')) {
            at++;
        }
        if (at == start) {
            throw malformed(text.substring(at));
        }
        return text.substring(start, at);
    }

    private int power() {
        boolean caret = taken('^');
        int sign = taken('-') ? -1 : 1;
        int start = at;
        while (at < text.length() && text.charAt(at) >= '0' && text.charAt(at) <= '9') {
            at++;
        }
        if (at == start) {
            if (caret || sign < 0) {
                throw malformed(text.substring(at));
            }
            return 1;
        }
        int power = at - start > 1 ? 0 : Integer.parseInt(text.substring(start, at));
        if (power < 1 || power > LARGEST_POWER) {
            throw new QuantityException(
                    "the unit \"" + text + "\" with the power " + text.substring(start, at),
                    "powers from 1 to " + LARGEST_POWER + ", with or without a minus sign",
                    "Check the unit.");
        }
        return sign * power;
    }

    private boolean taken(char sign) {
        if (at < text.length() && text.charAt(at) == sign) {
            at++;
            return true;
        }
        return false;
    }

    private void skipBlanks() {
        while (at < text.length() && text.charAt(at) == ' ') {
            at++;
        }
    }

    private QuantityException malformed(String rest) {
        return new QuantityException(
                "the unit \"" + text + "\", unreadable " + (rest.isEmpty() ? "at its end" : "at \"" + rest + "\""),
                "unit symbols with powers, products and one quotient",
                "Write it like \"kg/m3\", \"N m\" or \"1/s\".");
    }

    private static QuantityException unknown(String symbol) {
        String remedy = Spelling.nearest(symbol, UnitTable.common())
                .map(near -> "Did you mean \"" + near + "\"?")
                .orElse("Use SI units with prefixes, or min, h, t, deg, turn, rpm, %, bar, in, ft, lb.");
        return new QuantityException("the unknown unit \"" + symbol + "\"", "a unit symbol this program knows", remedy);
    }
}
