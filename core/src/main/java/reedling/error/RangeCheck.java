// SPDX-License-Identifier: Apache-2.0
package reedling.error;

import java.util.ArrayList;
import java.util.List;

/**
 * Collects what is wrong with the numbers of one object, so that its user hears of all of them at once.
 *
 * <p>Use: {@code new RangeCheck("wall.deck").positive("radius", radius, "m").finish();}
 *
 * <p>Threads: confined to the constructor that uses it.
 */
public final class RangeCheck {

    private final String where;
    private final List<Finding> findings = new ArrayList<>();

    /**
     * @param where the object concerned, as its user names it
     */
    public RangeCheck(String where) {
        this.where = where;
    }

    /** Asks for a finite value above zero. */
    public RangeCheck positive(String what, double value, String unit) {
        return require(value > 0 && value < Double.POSITIVE_INFINITY, what, value, unit, "a finite value > 0");
    }

    /** Asks for a finite value of at least zero. */
    public RangeCheck notNegative(String what, double value, String unit) {
        return require(value >= 0 && value < Double.POSITIVE_INFINITY, what, value, unit, "a finite value >= 0");
    }

    /** Asks for a finite value of any sign. */
    public RangeCheck finite(String what, double value, String unit) {
        return require(Double.isFinite(value), what, value, unit, "a finite value");
    }

    /** Asks for {@code holds}; {@code expected} says in words what was asked. */
    public RangeCheck require(boolean holds, String what, double value, String unit, String expected) {
        return require(holds, what, (value + " " + unit).strip(), expected, "");
    }

    /** Asks for {@code holds}; {@code remedy} is a sentence or empty. */
    public RangeCheck require(boolean holds, String what, String got, String expected, String remedy) {
        if (!holds) {
            findings.add(new Finding(where, what, got, expected, remedy));
        }
        return this;
    }

    /**
     * Ends the check.
     *
     * @throws ReedlingException with {@link ExitCode#CASE} and every finding, if there is one
     */
    public void finish() {
        if (!findings.isEmpty()) {
            throw new ReedlingException(ExitCode.CASE, findings);
        }
    }
}
