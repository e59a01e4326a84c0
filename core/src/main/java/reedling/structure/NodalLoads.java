// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * External loads on nodes, such as contacts; called once per node range and step, by the thread that moves the range.
 */
@FunctionalInterface
public interface NodalLoads {

    /** No loads at all. */
    NodalLoads NONE = (firstNode, lastNode, force, moment) -> {};

    /**
     * Adds loads of the nodes {@code firstNode <= n < lastNode}; touches no other node. Additions must come in an order
     * that does not depend on threads.
     *
     * @param firstNode first node
     * @param lastNode end of the range, exclusive
     * @param force N, world frame, three per node at 3 n
     * @param moment N m, world frame, three per node at 3 n
     */
    void addTo(int firstNode, int lastNode, double[] force, double[] moment);
}
