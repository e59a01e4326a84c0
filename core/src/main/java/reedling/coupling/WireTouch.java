// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import reedling.contact.ContactKind;
import reedling.contact.LawSet;
import reedling.material.MaterialTable;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.structure.NodeStore;
import reedling.wall.HertzLine;

/**
 * Finds where the near grains of a chunk touch wires, or have them in reach of the laws. All elements of one wire that a
 * grain overlaps, or has in reach, and that follow one another form a run; the deepest point of a run is the contact (ties: the lower element), which is the exact gradient of
 * a potential of the deepest overlap, with no double count at nodes. Two runs are two contacts. A run takes over the row
 * of the same grain and wire whose normal is nearest to its own.
 *
 * <p>Threads: one for each worker.
 */
final class WireTouch {

    private final WireElements elements;
    private final LawSet laws;
    private final double[] best = new double[WireRows.GEOMETRY];
    private final double[] trial = new double[WireRows.GEOMETRY];

    WireTouch(WireElements elements, LawSet laws) {
        this.elements = elements;
        this.laws = laws;
    }

    /**
     * Updates the rows of a chunk.
     *
     * @param pass number of this pass; rows found touching are marked with it
     */
    void update(WireChunk chunk, GrainStore grains, long pass, ApproachRule rule, ContactTally tally) {
        for (int number = 0; number < chunk.near().count(); number++) {
            int end = chunk.candidateEnd(number);
            int k = chunk.candidateStart(number);
            while (k < end) {
                int wire = elements.body(chunk.candidate(k));
                int last = k + 1;
                while (last < end && elements.body(chunk.candidate(last)) == wire) {
                    last++;
                }
                touchWire(chunk, number, wire, k, last, grains, pass, rule, tally);
                k = last;
            }
        }
    }

    private void touchWire(
            WireChunk chunk,
            int number,
            int wire,
            int from,
            int to,
            GrainStore grains,
            long pass,
            ApproachRule rule,
            ContactTally tally) {
        int grain = chunk.near().grain(number);
        int at = GrainRow.at(grain);
        double[] rows = grains.rows();
        int pair = MaterialTable.pairIndex(grains.material()[grain], elements.material(wire));
        double reach = chunk.rows()[pair].segment().reach();
        int bestElement = -1;
        int previous = -2;
        double nearest = Double.NEGATIVE_INFINITY;
        int nearestElement = -1;
        for (int k = from; k < to; k++) {
            int element = chunk.candidate(k);
            measure(element, wire, rows, at, trial);
            double overlap = trial[WireRows.OVERLAP];
            if (overlap > nearest) {
                nearest = overlap;
                nearestElement = element;
            }
            boolean inReach = overlap > -reach;
            boolean continues = bestElement >= 0 && element == previous + 1;
            if (bestElement >= 0 && !(continues && inReach)) {
                claimRow(chunk, number, wire, bestElement, grains, pass);
                bestElement = -1;
            }
            if (inReach) {
                if (bestElement < 0 || overlap > best[WireRows.OVERLAP]) {
                    System.arraycopy(trial, 0, best, 0, WireRows.GEOMETRY);
                    bestElement = element;
                }
                previous = element;
            }
        }
        if (bestElement >= 0) {
            claimRow(chunk, number, wire, bestElement, grains, pass);
        }
        if (nearest <= 0) {
            approach(nearestElement, wire, reach, grains, grain, rule, tally);
        }
    }

    /** Fills normal, overlap, place along the element and distance for a grain and an element. */
    private void measure(int element, int wire, double[] rows, int at, double[] out) {
        double px = rows[at], py = rows[at + 1], pz = rows[at + 2];
        double along = elements.nearest(element, px, py, pz);
        double[] x = elements.nodes().position;
        int a = 3 * elements.firstNode(element);
        int b = 3 * elements.secondNode(element);
        double nx = Math.fma(along, x[b] - x[a], x[a]) - px;
        double ny = Math.fma(along, x[b + 1] - x[a + 1], x[a + 1]) - py;
        double nz = Math.fma(along, x[b + 2] - x[a + 2], x[a + 2]) - pz;
        double distance = Math.sqrt(Math.fma(nx, nx, Math.fma(ny, ny, nz * nz)));
        double inverse = 1 / distance;
        out[0] = nx * inverse;
        out[1] = ny * inverse;
        out[2] = nz * inverse;
        out[WireRows.OVERLAP] = rows[at + GrainRow.RADIUS] + elements.radius(wire) - distance;
        out[WireRows.ALONG] = along;
        out[WireRows.DISTANCE] = distance;
    }

    private void claimRow(WireChunk chunk, int number, int wire, int element, GrainStore grains, long pass) {
        int grain = chunk.near().grain(number);
        int pair = MaterialTable.pairIndex(grains.material()[grain], elements.material(wire));
        WireRows rows = chunk.rows()[pair];
        int row = matching(rows, chunk.lastRow(pair, number), wire, pass);
        if (row < 0) {
            double effective = HertzLine.outside(grains.radius(grain), elements.radius(wire));
            row = chunk.addRow(pair, number, wire, effective, grains.ghost());
        }
        rows.element()[row] = element;
        rows.seen()[row] = pass;
        int at = WireRows.GEOMETRY * row;
        System.arraycopy(best, 0, rows.geometry(), at, WireRows.EFFECTIVE_RADIUS);
    }

    /** Row of the same wire, not yet taken in this pass, with the nearest old normal; -1 if there is none. */
    private int matching(WireRows rows, int last, int wire, long pass) {
        int found = -1;
        double closest = Double.NEGATIVE_INFINITY;
        for (int row = last; row >= 0; row = rows.nextOfGrain()[row]) {
            if (rows.segment().second()[row] == wire && rows.seen()[row] != pass) {
                int at = WireRows.GEOMETRY * row;
                double[] g = rows.geometry();
                double cosine = best[0] * g[at] + best[1] * g[at + 1] + best[2] * g[at + 2];
                if (cosine > closest) {
                    closest = cosine;
                    found = row;
                }
            }
        }
        return found;
    }

    private void approach(
            int element, int wire, double reach, GrainStore grains, int grain, ApproachRule rule, ContactTally tally) {
        double[] rows = grains.rows();
        int at = GrainRow.at(grain);
        measure(element, wire, rows, at, trial);
        NodeStore nodes = elements.nodes();
        int a = 3 * elements.firstNode(element);
        int b = 3 * elements.secondNode(element);
        double along = trial[WireRows.ALONG];
        double closing = 0;
        for (int axis = 0; axis < 3; axis++) {
            double va = nodes.velocity[a + axis];
            double speed = rows[at + GrainRow.V + axis] - Math.fma(along, nodes.velocity[b + axis] - va, va);
            closing = Math.fma(speed, trial[axis], closing);
        }
        double gap = ApproachRule.ahead(-trial[WireRows.OVERLAP], reach);
        if (rule.concerns(gap, closing)) {
            int pair = MaterialTable.pairIndex(grains.material()[grain], elements.material(wire));
            double effective = HertzLine.outside(grains.radius(grain), elements.radius(wire));
            double duration =
                    laws.bound(ContactKind.GRAIN_WIRE, pair).normal().duration(closing, effective, grains.mass(grain));
            tally.approach(rule.limit(gap, closing, duration));
        }
    }
}
