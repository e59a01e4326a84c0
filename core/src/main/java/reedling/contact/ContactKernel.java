// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

/**
 * A law bound to one material pair and contact kind: reads and writes the columns of a block, nothing else.
 *
 * <p>Contract: a row's result depends on that row only; stored history is multiplied by TOUCH; no allocation; a
 * tangential or rolling kernel leaves 0 in its output where TOUCH is 0.
 *
 * <p>Threads: immutable, called by many workers at once, each with a block of its own.
 */
public interface ContactKernel {

    /** Works through all rows of a block. */
    void apply(ContactBlock block);

    /**
     * Time an impact would last, s, for the step limit of bodies about to touch; asked of normal kernels only.
     *
     * @param speed closing speed, m/s, > 0
     * @param radius effective radius, m
     * @param mass effective mass, kg
     */
    default double duration(double speed, double radius, double mass) {
        return Double.POSITIVE_INFINITY;
    }

    /**
     * Largest ratio of the dashpot to the critical one, c / (2 sqrt(k m*)), over all overlaps; asked of normal kernels
     * only, for the limit of persistent contacts.
     */
    default double dampingRatio() {
        return 0;
    }

    /**
     * Whether the dashpot may pull until the overlap is used up; asked of normal kernels only, once, when the stages of a
     * case are put together. Where it may not, the total force ends at zero unless the elastic force itself pulls.
     */
    default boolean dashpotMayPull() {
        return false;
    }

    /**
     * Largest gap, m, across which the bodies may act on each other, or must be watched; asked of normal kernels only.
     * Rows are given to the laws with TOUCH = 1 while the overlap is above minus the reach of their contact kind and
     * material pair; a law with a reach keeps its own state of touching in its history.
     *
     * @param largestRadius largest effective radius R* of the rows, m
     */
    default double reach(double largestRadius) {
        return 0;
    }

    /** Whether the normal force may pull, or a change of state may lose energy; asked of normal kernels only, once. */
    default boolean pulls() {
        return dashpotMayPull();
    }

    /**
     * Several kernels as one, called in order; what is asked of them is answered for all. A vector kernel must stay
     * small (some seventy vector operations) to keep
     * its vectors in registers; a longer law is cut into kernels and put together here.
     */
    static ContactKernel inOrder(ContactKernel first, ContactKernel... others) {
        return new KernelSequence(first, others);
    }
}
