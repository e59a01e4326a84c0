// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;
import static reedling.contact.ContactBlock.store;

import jdk.incubator.vector.DoubleVector;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.math.Lanes;

/**
 * Engine stage before the rolling law, only where a twisting law follows: keeps the relative spin about the normal,
 * w . n, which a rolling law may take off the relative spin.
 */
final class TwistRate implements RowStage {

    @Override
    public void run(RowRange rows) {
        ContactBlock block = rows.block();
        if (Lanes.VECTORISED) {
            vector(block.columns(), block.rows());
        } else {
            scalar(block.columns(), block.rows());
        }
    }

    private static void vector(double[] c, int rows) {
        for (int r = 0; r < rows; r += Lanes.TILE) {
            DoubleVector z = load(c, Column.SPIN + 2, r).mul(load(c, Column.NORMAL + 2, r));
            DoubleVector yz = load(c, Column.SPIN + 1, r).fma(load(c, Column.NORMAL + 1, r), z);
            store(load(c, Column.SPIN, r).fma(load(c, Column.NORMAL, r), yz), c, Column.TWIST, r);
        }
    }

    private static void scalar(double[] c, int rows) {
        for (int r = 0; r < rows; r++) {
            c[at(Column.TWIST) + r] = along(c, Column.SPIN, r);
        }
    }

    /** Part of a vector column along the normal. */
    static double along(double[] c, int column, int r) {
        double z = c[at(column + 2) + r] * c[at(Column.NORMAL + 2) + r];
        double yz = Math.fma(c[at(column + 1) + r], c[at(Column.NORMAL + 1) + r], z);
        return Math.fma(c[at(column) + r], c[at(Column.NORMAL) + r], yz);
    }
}
