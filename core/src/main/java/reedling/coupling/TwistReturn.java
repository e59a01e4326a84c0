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
 * Engine stage after the twisting law: gives the relative spin the part about the normal back that a rolling law may have
 * taken off, w' = w + (t - w . n) n with t from {@link TwistRate}, so that the ledger books the twisting moment's work.
 */
final class TwistReturn implements RowStage {

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
            DoubleVector nx = load(c, Column.NORMAL, r),
                    ny = load(c, Column.NORMAL + 1, r),
                    nz = load(c, Column.NORMAL + 2, r);
            DoubleVector wx = load(c, Column.SPIN, r),
                    wy = load(c, Column.SPIN + 1, r),
                    wz = load(c, Column.SPIN + 2, r);
            DoubleVector missing = load(c, Column.TWIST, r).sub(wx.fma(nx, wy.fma(ny, wz.mul(nz))));
            store(missing.fma(nx, wx), c, Column.SPIN, r);
            store(missing.fma(ny, wy), c, Column.SPIN + 1, r);
            store(missing.fma(nz, wz), c, Column.SPIN + 2, r);
        }
    }

    private static void scalar(double[] c, int rows) {
        for (int r = 0; r < rows; r++) {
            double missing = c[at(Column.TWIST) + r] - TwistRate.along(c, Column.SPIN, r);
            for (int axis = 0; axis < 3; axis++) {
                int w = at(Column.SPIN + axis) + r;
                c[w] = Math.fma(missing, c[at(Column.NORMAL + axis) + r], c[w]);
            }
        }
    }
}
