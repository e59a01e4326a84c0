// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import java.util.List;

/**
 * Nodes, elements and their connection, fixed for a run.
 *
 * @param nodes node arrays
 * @param bodies in order of their nodes
 * @param sets elements with forces, in order of their bodies (rigid bodies have none)
 * @param slots 6 numbers per element node
 * @param slotStart start of each node's entries in {@code slotOffset}, length nodes + 1
 * @param slotOffset index into {@code slots} of each element end of a node, ascending element id
 */
record Mesh(
        NodeStore nodes, List<Body> bodies, List<ElementSet> sets, double[] slots, int[] slotStart, int[] slotOffset) {

    /** Connects nodes to the slots of their elements by a stable counting sort. */
    static Mesh connect(NodeStore nodes, List<Body> bodies, List<ElementSet> sets, double[] slots) {
        int[] start = new int[nodes.count + 1];
        for (ElementSet set : sets) {
            for (int node : set.nodes) {
                start[node + 1]++;
            }
        }
        for (int n = 0; n < nodes.count; n++) {
            start[n + 1] += start[n];
        }
        int[] cursor = start.clone();
        int[] offset = new int[start[nodes.count]];
        for (ElementSet set : sets) {
            for (int end = 0; end < set.nodes.length; end++) {
                offset[cursor[set.nodes[end]]++] = set.slotStart + ElementSet.SLOT * end;
            }
        }
        return new Mesh(nodes, List.copyOf(bodies), List.copyOf(sets), slots, start, offset);
    }
}
