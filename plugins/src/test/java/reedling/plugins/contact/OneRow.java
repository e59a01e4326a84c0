// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;

/** A normal kernel with a tile of eight equal rows, whose first is led along a path of overlaps with its history kept. */
final class OneRow {

    private static final int HISTORY = 8; // columns, enough for any law

    private final ContactKernel kernel;
    private final ContactBlock block = new ContactBlock();
    private final double[] history = new double[8 * HISTORY];
    private final double radius;
    private final double mass;
    private final double reach;

    /**
     * @param radius R*, m
     * @param mass m*, kg
     */
    OneRow(ContactKernel kernel, double radius, double mass) {
        this.kernel = kernel;
        this.radius = radius;
        this.mass = mass;
        reach = kernel.reach(radius);
    }

    /** Leads the row to an overlap, m, at rest, and returns the elastic force there, N. */
    double to(double overlap) {
        return to(overlap, 0, 0);
    }

    /** Leads the row to an overlap, m, with a closing speed, m/s, over a step, s, and returns the elastic force, N. */
    double to(double overlap, double closing, double step) {
        double[] c = block.columns();
        block.open(8, step, history, 0, HISTORY, true);
        block.clear(0, Column.COUNT);
        for (int r = 0; r < 8; r++) {
            c[ContactBlock.at(Column.OVERLAP) + r] = overlap;
            c[ContactBlock.at(Column.CLOSING) + r] = closing;
            c[ContactBlock.at(Column.EFFECTIVE_RADIUS) + r] = radius;
            c[ContactBlock.at(Column.EFFECTIVE_MASS) + r] = mass;
            c[ContactBlock.at(Column.TOUCH) + r] = overlap > -reach ? 1 : 0;
        }
        kernel.apply(block);
        return get(Column.ELASTIC_FORCE);
    }

    double get(int column) {
        return block.columns()[ContactBlock.at(column)];
    }

    double shortestDuration() {
        return block.shortestDuration();
    }
}
