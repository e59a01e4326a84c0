// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * Energy sums of node ranges, one row of 8 doubles (a cache line) per task, added in task order.
 *
 * <p>Work is the trapezoid 1/2 (F_old + F_new) . dx. The half with the old force is known at the opening kick, the half
 * with the new one only at the next closing kick, so the former waits in the pending columns.
 */
final class NodeSums {

    static final int ROW = 8;
    static final int KINETIC = 0;
    static final int GRAVITY = 1;
    static final int MODAL = 2;
    static final int SUPPORT = 3;
    static final int MODAL_PENDING = 4;
    static final int SUPPORT_PENDING = 5;

    final double[] rows;

    NodeSums(int tasks) {
        rows = new double[tasks * ROW];
    }

    double total(int column) {
        double sum = 0;
        for (int at = column; at < rows.length; at += ROW) {
            sum += rows[at];
        }
        return sum;
    }
}
