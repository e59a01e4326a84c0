// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.io.IOException;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.structure.Body;
import reedling.structure.NodeStore;
import reedling.structure.Structure;

/**
 * By how much the gaps of a deck open or close as its wires bend: change of the distance across the deck between
 * neighbouring wires, node by node over all samples, m. Wires with different numbers of nodes are compared over the
 * nodes both have. Threads: one, between steps.
 */
public final class DeckOpening implements Persistent {

    private final DeckFrame deck;
    private final Structure structure;
    private final LogHistogram changes = new LogHistogram(-10, 9);
    private final double[] first = new double[3];
    private final double[] second = new double[3];

    public DeckOpening(DeckFrame deck, Structure structure) {
        this.deck = deck;
        this.structure = structure;
    }

    /** Looks at all gaps. */
    public void sample() {
        deck.update();
        NodeStore nodes = structure.nodes();
        int[] bodies = deck.bodies();
        for (int k = 1; k < bodies.length; k++) {
            Body a = structure.bodies().get(bodies[k - 1]);
            Body b = structure.bodies().get(bodies[k]);
            int common = Math.min(a.nodeCount(), b.nodeCount());
            for (int n = 1; n < common - 1; n++) {
                WireShape.sag(nodes, a, a.firstNode() + n, first);
                WireShape.sag(nodes, b, b.firstNode() + n, second);
                double change = Math.abs(deck.across(second, 0) - deck.across(first, 0));
                if (change > 0) {
                    changes.add(change);
                }
            }
        }
    }

    /** Sizes of the changes, m. */
    public LogHistogram changes() {
        return changes;
    }

    @Override
    public String section() {
        return "deck opening";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        changes.save(out);
    }

    @Override
    public void restore(SectionReader in) {
        changes.restore(in);
    }
}
