// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.Arrays;
import reedling.neighbour.CellGrid;
import reedling.particle.GrainRow;
import reedling.structure.Body;
import reedling.structure.NodeStore;
import reedling.structure.Structure;

/**
 * Line elements of all bodies, numbered through in body order, and the grid cells each may be touched from.
 *
 * <p>Threads: entered by one thread at a search, read by many.
 */
final class WireElements {

    private final NodeStore nodes;
    private final int[] firstNode;
    private final int[] secondNode;
    private final int[] body;
    private final double[] radiusOfBody;
    private final int[] materialOfBody;
    private int[] cellStart = new int[1];
    private int[] cellElements = new int[0];
    private CellGrid grid = new CellGrid();

    /**
     * @param materialOfBody material number of each body
     */
    WireElements(Structure structure, int[] materialOfBody) {
        nodes = structure.nodes();
        this.materialOfBody = materialOfBody.clone();
        int count = structure.bodies().stream().mapToInt(Body::elementCount).sum();
        firstNode = new int[count];
        secondNode = new int[count];
        body = new int[count];
        radiusOfBody = new double[structure.bodies().size()];
        int next = 0;
        for (int b = 0; b < structure.bodies().size(); b++) {
            Body one = structure.bodies().get(b);
            radiusOfBody[b] = one.section().contactRadius();
            for (int e = 0; e < one.elementCount(); e++) {
                firstNode[next] = one.elementNodes()[2 * e];
                secondNode[next] = one.elementNodes()[2 * e + 1];
                body[next++] = b;
            }
        }
    }

    int count() {
        return body.length;
    }

    int body(int element) {
        return body[element];
    }

    /** Contact radius of a body's section, m. */
    double radius(int bodyNumber) {
        return radiusOfBody[bodyNumber];
    }

    int material(int bodyNumber) {
        return materialOfBody[bodyNumber];
    }

    int firstNode(int element) {
        return firstNode[element];
    }

    int secondNode(int element) {
        return secondNode[element];
    }

    NodeStore nodes() {
        return nodes;
    }

    /**
     * Enters every element into the cells from which a grain could touch it before the next search.
     *
     * @param reach largest grain radius and search margin together, m
     */
    void enter(CellGrid cells, double reach) {
        grid = cells;
        int cellCount = cells.countX() * cells.countY() * cells.countZ();
        if (cellStart.length < cellCount + 2) {
            cellStart = new int[cellCount + 2];
        }
        Arrays.fill(cellStart, 0);
        visit(reach, true);
        for (int cell = 0; cell < cellCount; cell++) {
            cellStart[cell + 2] += cellStart[cell + 1];
        }
        int entries = cellStart[cellCount + 1];
        if (cellElements.length < entries) {
            cellElements = new int[entries + entries / 4];
        }
        visit(reach, false);
    }

    /** Goes through all cells of all elements, first to count the entries of a cell, then to write them. */
    private void visit(double reach, boolean counting) {
        double[] x = nodes.position;
        for (int e = 0; e < count(); e++) {
            int a = 3 * firstNode[e];
            int b = 3 * secondNode[e];
            double far = reach + radiusOfBody[body[e]];
            int x0 = grid.cellX(Math.min(x[a], x[b]) - far), x1 = grid.cellX(Math.max(x[a], x[b]) + far);
            int y0 = grid.cellY(Math.min(x[a + 1], x[b + 1]) - far),
                    y1 = grid.cellY(Math.max(x[a + 1], x[b + 1]) + far);
            int z0 = grid.cellZ(Math.min(x[a + 2], x[b + 2]) - far),
                    z1 = grid.cellZ(Math.max(x[a + 2], x[b + 2]) + far);
            for (int cz = z0; cz <= z1; cz++) {
                for (int cy = y0; cy <= y1; cy++) {
                    for (int cx = x0; cx <= x1; cx++) {
                        int cell = grid.index(cx, cy, cz);
                        if (counting) {
                            cellStart[cell + 2]++;
                        } else {
                            cellElements[cellStart[cell + 1]++] = e;
                        }
                    }
                }
            }
        }
    }

    /** Place in {@link #entries} of the first element entered into the cell of a point. */
    int cellOf(double x, double y, double z) {
        return grid.index(grid.cellX(x), grid.cellY(y), grid.cellZ(z));
    }

    int entriesStart(int cell) {
        return cellStart[cell];
    }

    int entriesEnd(int cell) {
        return cellStart[cell + 1];
    }

    /** Elements by cell, ascending in each. */
    int[] entries() {
        return cellElements;
    }

    /**
     * Place 0..1 along an element of the point nearest to a given point, after Ericson, Real-Time Collision Detection,
     * 2005.
     */
    double nearest(int element, double px, double py, double pz) {
        double[] x = nodes.position;
        int a = 3 * firstNode[element];
        int b = 3 * secondNode[element];
        double dx = x[b] - x[a], dy = x[b + 1] - x[a + 1], dz = x[b + 2] - x[a + 2];
        double dot = Math.fma(px - x[a], dx, Math.fma(py - x[a + 1], dy, (pz - x[a + 2]) * dz));
        double along = dot / Math.fma(dx, dx, Math.fma(dy, dy, dz * dz));
        return along > 0 ? Math.min(along, 1) : 0;
    }

    /** Overlap of an element and the grain whose row starts at a place, m; negative for a gap. */
    double overlap(int element, double[] rows, int at) {
        double along = nearest(element, rows[at], rows[at + 1], rows[at + 2]);
        double[] x = nodes.position;
        int a = 3 * firstNode[element];
        int b = 3 * secondNode[element];
        double dx = Math.fma(along, x[b] - x[a], x[a]) - rows[at];
        double dy = Math.fma(along, x[b + 1] - x[a + 1], x[a + 1]) - rows[at + 1];
        double dz = Math.fma(along, x[b + 2] - x[a + 2], x[a + 2]) - rows[at + 2];
        double distance = Math.sqrt(Math.fma(dx, dx, Math.fma(dy, dy, dz * dz)));
        return rows[at + GrainRow.RADIUS] + radiusOfBody[body[element]] - distance;
    }

    /** Gap between a point and the nearest element, m; infinite where there is none. */
    double gap(double px, double py, double pz) {
        double[] x = nodes.position;
        double nearest = Double.POSITIVE_INFINITY;
        for (int e = 0; e < count(); e++) {
            double along = nearest(e, px, py, pz);
            int a = 3 * firstNode[e];
            int b = 3 * secondNode[e];
            double dx = Math.fma(along, x[b] - x[a], x[a]) - px;
            double dy = Math.fma(along, x[b + 1] - x[a + 1], x[a + 1]) - py;
            double dz = Math.fma(along, x[b + 2] - x[a + 2], x[a + 2]) - pz;
            nearest = Math.min(nearest, Math.sqrt(dx * dx + dy * dy + dz * dz) - radiusOfBody[body[e]]);
        }
        return nearest;
    }
}
