// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * Flat arrays of the elements of one body that share a law.
 *
 * <p>Owned by {@link Structure}; a thread writes only the ranges it was given.
 */
public final class ElementSet {

    /** Numbers per element node in {@link #slots}: force (N) then moment (N m) on the node, world frame. */
    public static final int SLOT = 6;

    /** The law of every element here. */
    public final ElementLaw law;

    /** Node ids, {@code law.nodesPerElement()} per element. */
    public final int[] nodes;

    /** {@code law.constantCount()} per element. */
    public final double[] constants;

    /** {@code law.historyColumns().size()} per element. */
    public final double[] history;

    /** Slots of all elements of the structure; this set's start at {@link #slotStart}. */
    public final double[] slots;

    /** Index of this set's first number in {@link #slots}. */
    public final int slotStart;

    ElementSet(ElementLaw law, int[] nodes, double[] constants, double[] slots, int slotStart) {
        this.law = law;
        this.nodes = nodes;
        this.constants = constants;
        this.history = new double[count() * law.historyColumns().size()];
        this.slots = slots;
        this.slotStart = slotStart;
    }

    /** Number of elements. */
    public int count() {
        return nodes.length / law.nodesPerElement();
    }
}
