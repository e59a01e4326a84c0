// SPDX-License-Identifier: Apache-2.0
package reedling.unit;

import java.math.BigDecimal;
import java.math.MathContext;

/**
 * A unit as an exact ratio to SI base units, so that a converted value is the double nearest to what was written:
 * "4.4 mm" is the same bits as 0.0044.
 *
 * @param numerator numerator of the factor to SI
 * @param denominator its denominator
 * @param exponents powers of the base units
 */
record UnitFactor(BigDecimal numerator, BigDecimal denominator, Exponents exponents) {

    static final UnitFactor ONE = new UnitFactor(BigDecimal.ONE, BigDecimal.ONE, Exponents.NONE);

    /** Digits enough to round any quotient correctly to a double for all practical inputs. */
    private static final MathContext DIGITS = new MathContext(60);

    /** This times the other raised to a power, which may be negative. */
    UnitFactor times(UnitFactor other, int power) {
        // A choice between two fresh values (power > 0 ? up : down) came out null here: JDK 25.0.3, C2 with escape
        // analysis, 64-byte object alignment, at the first negative power after many positive ones.
        if (power < 0) {
            return times(other.inverse(), -power);
        }
        return new UnitFactor(
                numerator.multiply(other.numerator.pow(power)),
                denominator.multiply(other.denominator.pow(power)),
                exponents.plus(other.exponents, power));
    }

    private UnitFactor inverse() {
        return new UnitFactor(denominator, numerator, Exponents.NONE.plus(exponents, -1));
    }

    /** A number in this unit, in SI; rounded once. */
    double toSi(BigDecimal number) {
        return number.multiply(numerator).divide(denominator, DIGITS).doubleValue();
    }
}
