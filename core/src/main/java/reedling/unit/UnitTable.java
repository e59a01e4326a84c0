// SPDX-License-Identifier: Apache-2.0
package reedling.unit;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The unit symbols a case file may use, and the SI prefixes. Exact definitions: The International System of Units, 2019. */
final class UnitTable {

    /** Pi to 50 digits: the double nearest to a converted angle needs about 20. */
    private static final String PI = "3.1415926535897932384626433832795028841971693993751";

    /** Symbols that take prefixes; a tonne, a minute or a degree takes none, so "min" and "ft" have one reading. */
    private static final Map<String, UnitFactor> PREFIXED = new LinkedHashMap<>();

    private static final Map<String, UnitFactor> PLAIN = new LinkedHashMap<>();

    private static final Map<String, Integer> PREFIXES = new LinkedHashMap<>();

    static {
        String[] names = {"G", "M", "k", "h", "d", "c", "m", "u", "n", "p"};
        int[] powers = {9, 6, 3, 2, -1, -2, -3, -6, -9, -12};
        for (int k = 0; k < names.length; k++) {
            PREFIXES.put(names[k], powers[k]);
        }
        prefixed("m", "1", "1", 1, 0, 0, 0, 0);
        prefixed("g", "1", "1000", 0, 1, 0, 0, 0);
        prefixed("s", "1", "1", 0, 0, 1, 0, 0);
        prefixed("A", "1", "1", 0, 0, 0, 1, 0);
        prefixed("rad", "1", "1", 0, 0, 0, 0, 1);
        prefixed("Hz", "1", "1", 0, 0, -1, 0, 0);
        prefixed("N", "1", "1", 1, 1, -2, 0, 0);
        prefixed("Nm", "1", "1", 2, 1, -2, 0, 0);
        prefixed("Pa", "1", "1", -1, 1, -2, 0, 0);
        prefixed("J", "1", "1", 2, 1, -2, 0, 0);
        prefixed("W", "1", "1", 2, 1, -3, 0, 0);
        prefixed("C", "1", "1", 0, 0, 1, 1, 0);
        prefixed("V", "1", "1", 2, 1, -3, -1, 0);
        prefixed("T", "1", "1", 0, 1, -2, -1, 0);
        prefixed("bar", "100000", "1", -1, 1, -2, 0, 0);
        prefixed("L", "1", "1000", 3, 0, 0, 0, 0);
        prefixed("l", "1", "1000", 3, 0, 0, 0, 0);
        plain("min", "60", "1", 0, 0, 1, 0, 0);
        plain("h", "3600", "1", 0, 0, 1, 0, 0);
        plain("d", "86400", "1", 0, 0, 1, 0, 0);
        plain("t", "1000", "1", 0, 1, 0, 0, 0);
        plain("deg", PI, "180", 0, 0, 0, 0, 1);
        plain("turn", "2", "1", PI, 0, 0, 0, 0, 1);
        plain("rpm", "2", "60", PI, 0, 0, -1, 0, 1);
        plain("%", "1", "100", 0, 0, 0, 0, 0);
        plain("in", "0.0254", "1", 1, 0, 0, 0, 0);
        plain("ft", "0.3048", "1", 1, 0, 0, 0, 0);
        plain("lb", "0.45359237", "1", 0, 1, 0, 0, 0);
    }

    private UnitTable() {}

    private static UnitFactor factor(String up, String down, int m, int kg, int s, int a, int rad) {
        return new UnitFactor(new BigDecimal(up), new BigDecimal(down), new Exponents(m, kg, s, a, rad));
    }

    private static void prefixed(String symbol, String up, String down, int m, int kg, int s, int a, int rad) {
        PREFIXED.put(symbol, factor(up, down, m, kg, s, a, rad));
    }

    private static void plain(String symbol, String up, String down, int m, int kg, int s, int a, int rad) {
        PLAIN.put(symbol, factor(up, down, m, kg, s, a, rad));
    }

    private static void plain(
            String symbol, String up, String down, String times, int m, int kg, int s, int a, int rad) {
        BigDecimal product = new BigDecimal(up).multiply(new BigDecimal(times));
        PLAIN.put(symbol, new UnitFactor(product, new BigDecimal(down), new Exponents(m, kg, s, a, rad)));
    }

    /** The unit of a symbol, with or without a prefix; whole symbols win over prefixed ones ("min" is a minute). */
    static Optional<UnitFactor> find(String symbol) {
        UnitFactor whole = PLAIN.getOrDefault(symbol, PREFIXED.get(symbol));
        if (whole != null) {
            return Optional.of(whole);
        }
        for (Map.Entry<String, Integer> prefix : PREFIXES.entrySet()) {
            UnitFactor base = symbol.startsWith(prefix.getKey())
                    ? PREFIXED.get(symbol.substring(prefix.getKey().length()))
                    : null;
            if (base != null) {
                BigDecimal scale = BigDecimal.ONE.scaleByPowerOfTen(prefix.getValue());
                return Optional.of(
                        new UnitFactor(base.numerator().multiply(scale), base.denominator(), base.exponents()));
            }
        }
        return Optional.empty();
    }

    /** Symbols without prefixes, and the prefixed ones in daily use: what a wrong spelling is compared with. */
    static List<String> common() {
        List<String> symbols = new ArrayList<>(PLAIN.keySet());
        symbols.addAll(PREFIXED.keySet());
        Collections.addAll(symbols, "mm", "cm", "km", "um", "kg", "mg", "ms", "us", "kN", "mN");
        Collections.addAll(symbols, "kPa", "MPa", "GPa", "kHz", "kJ", "mJ", "mbar", "kW", "mrad", "mL");
        return symbols;
    }
}
