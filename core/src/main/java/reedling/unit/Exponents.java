// SPDX-License-Identifier: Apache-2.0
package reedling.unit;

/**
 * Powers of the base units in a product of units.
 *
 * @param metre power of m
 * @param kilogram power of kg
 * @param second power of s
 * @param ampere power of A
 * @param radian power of rad, kept as a base unit on purpose, see {@link Dimension}
 */
record Exponents(int metre, int kilogram, int second, int ampere, int radian) {

    static final Exponents NONE = new Exponents(0, 0, 0, 0, 0);

    /** This times the other raised to a power. */
    Exponents plus(Exponents other, int power) {
        return new Exponents(
                metre + power * other.metre,
                kilogram + power * other.kilogram,
                second + power * other.second,
                ampere + power * other.ampere,
                radian + power * other.radian);
    }

    @Override
    public String toString() {
        StringBuilder text = new StringBuilder();
        append(text, "kg", kilogram);
        append(text, "m", metre);
        append(text, "s", second);
        append(text, "A", ampere);
        append(text, "rad", radian);
        return text.isEmpty() ? "1" : text.toString();
    }

    private static void append(StringBuilder text, String symbol, int power) {
        if (power != 0) {
            text.append(text.isEmpty() ? "" : " ").append(symbol).append(power == 1 ? "" : String.valueOf(power));
        }
    }
}
