// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

/**
 * A law for a single contact, bound to a material pair, as the convenient way to write one; {@link #asKernel} makes a
 * {@link ContactKernel} of it. It is not vectorised: {@code reedling certify} prints what that costs.
 *
 * <p>It is called for rows in reach only: with reach 0, those that touch. For the others, and before each call, the outputs of its stage stand at 0 (the
 * contact radius at a value that keeps quotients finite) and what it remembers is forgotten when the contact ends.
 *
 * <p>Threads: immutable, called by many workers at once, each with a row of its own.
 */
public interface PerContactLaw {

    /** Reads and writes the row of one touching contact. */
    void contact(ContactRow row);

    /** As {@link ContactKernel#duration}; asked of normal laws only. */
    default double duration(double speed, double radius, double mass) {
        return Double.POSITIVE_INFINITY;
    }

    /** As {@link ContactKernel#dampingRatio}; asked of normal laws only. */
    default double dampingRatio() {
        return 0;
    }

    /** As {@link ContactKernel#reach}; asked of normal laws only. */
    default double reach(double largestRadius) {
        return 0;
    }

    /** As {@link ContactKernel#pulls}; asked of normal laws only. */
    default boolean pulls() {
        return dashpotMayPull();
    }

    /** As {@link ContactKernel#dashpotMayPull}; asked of normal laws only. */
    default boolean dashpotMayPull() {
        return false;
    }

    /**
     * This law as a kernel.
     *
     * @param stage of the law
     * @param historyColumn number of its first history column, as given to {@link ContactLaw#bind}
     * @param historyColumns how many doubles it remembers
     */
    default ContactKernel asKernel(Stage stage, int historyColumn, int historyColumns) {
        return new PerContactKernel(this, stage, historyColumn, historyColumns);
    }
}
