// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;

import jdk.incubator.vector.DoubleVector;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.math.Lanes;
import reedling.math.Tile;

/**
 * Engine stage after {@link ContactForce}: force -F and torque l1 f x n - M of the first body, with f friction and M
 * rolling moment on the second. They stand, each with a stiffness, in the columns that {@link ForceRows} turns into rows;
 * with vectors the first round of that turn is done on the way.
 */
final class FirstForces implements RowStage {

    private static final int TO = ForceRows.FIRST;

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
        DoubleVector zero = DoubleVector.zero(Lanes.SPECIES);
        for (int r = 0; r < rows; r += Lanes.TILE) {
            DoubleVector nx = load(c, Column.NORMAL, r),
                    ny = load(c, Column.NORMAL + 1, r),
                    nz = load(c, Column.NORMAL + 2, r);
            DoubleVector fx = load(c, Column.FRICTION, r);
            DoubleVector fy = load(c, Column.FRICTION + 1, r);
            DoubleVector fz = load(c, Column.FRICTION + 2, r);
            DoubleVector lever = load(c, Column.LEVER_FIRST, r);
            DoubleVector qx = fy.mul(nz).sub(fz.mul(ny)).mul(lever);
            DoubleVector qy = fz.mul(nx).sub(fx.mul(nz)).mul(lever);
            DoubleVector qz = fx.mul(ny).sub(fy.mul(nx)).mul(lever);
            store4(qx.sub(load(c, Column.ROLLING_MOMENT, r)), zero.sub(load(c, ContactForce.TOTAL, r)), c, 0, r);
            store4(
                    qy.sub(load(c, Column.ROLLING_MOMENT + 1, r)),
                    zero.sub(load(c, ContactForce.TOTAL + 1, r)),
                    c,
                    1,
                    r);
            store4(
                    qz.sub(load(c, Column.ROLLING_MOMENT + 2, r)),
                    zero.sub(load(c, ContactForce.TOTAL + 2, r)),
                    c,
                    2,
                    r);
            store4(load(c, Column.STIFFNESS, r), load(c, Column.SLIDING_STIFFNESS, r), c, 3, r);
        }
    }

    private static void store4(DoubleVector torque, DoubleVector force, double[] c, int column, int row) {
        Tile.store4(torque, force, c, at(TO + column) + row, ForceRows.STRIDE);
    }

    private static void scalar(double[] c, int rows) {
        for (int r = 0; r < rows; r++) {
            double nx = c[at(Column.NORMAL) + r], ny = c[at(Column.NORMAL + 1) + r], nz = c[at(Column.NORMAL + 2) + r];
            double fx = c[at(Column.FRICTION) + r],
                    fy = c[at(Column.FRICTION + 1) + r],
                    fz = c[at(Column.FRICTION + 2) + r];
            double lever = c[at(Column.LEVER_FIRST) + r];
            c[at(TO) + r] = (fy * nz - fz * ny) * lever - c[at(Column.ROLLING_MOMENT) + r];
            c[at(TO + 1) + r] = (fz * nx - fx * nz) * lever - c[at(Column.ROLLING_MOMENT + 1) + r];
            c[at(TO + 2) + r] = (fx * ny - fy * nx) * lever - c[at(Column.ROLLING_MOMENT + 2) + r];
            c[at(TO + 3) + r] = c[at(Column.STIFFNESS) + r];
            c[at(TO + 4) + r] = 0 - c[at(ContactForce.TOTAL) + r];
            c[at(TO + 5) + r] = 0 - c[at(ContactForce.TOTAL + 1) + r];
            c[at(TO + 6) + r] = 0 - c[at(ContactForce.TOTAL + 2) + r];
            c[at(TO + 7) + r] = c[at(Column.SLIDING_STIFFNESS) + r];
        }
    }
}
