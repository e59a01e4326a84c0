// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * A connected run of nodes and elements with a name: one wire, one rod, one plate.
 *
 * @param name as in the case file, such as {@code wire 3}
 * @param firstNode id of its first node; its nodes are contiguous
 * @param nodeCount number of nodes
 * @param firstElement id of its first element; its elements are contiguous
 * @param elementCount number of elements
 * @param nodesPerElement 2 for lines
 * @param elementNodes node ids of its elements, {@code nodesPerElement} each; not to be changed
 * @param section cross-section, m
 * @param rigid whether all its nodes follow the support and no element force acts
 */
public record Body(
        String name,
        int firstNode,
        int nodeCount,
        int firstElement,
        int elementCount,
        int nodesPerElement,
        int[] elementNodes,
        Section section,
        boolean rigid) {}
