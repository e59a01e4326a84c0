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
 * Engine stage after {@link FirstForces}: force F and torque l2 f x n + M of the second body, likewise. Writes
 * over the gathered columns, which nobody reads any more.
 */
final class SecondForces implements RowStage {

    private static final int TO = ForceRows.SECOND;

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
            DoubleVector fx = load(c, Column.FRICTION, r);
            DoubleVector fy = load(c, Column.FRICTION + 1, r);
            DoubleVector fz = load(c, Column.FRICTION + 2, r);
            DoubleVector lever = load(c, Column.LEVER_SECOND, r);
            DoubleVector qx = fy.mul(nz).sub(fz.mul(ny)).mul(lever);
            DoubleVector qy = fz.mul(nx).sub(fx.mul(nz)).mul(lever);
            DoubleVector qz = fx.mul(ny).sub(fy.mul(nx)).mul(lever);
            store4(qx.add(load(c, Column.ROLLING_MOMENT, r)), load(c, ContactForce.TOTAL, r), c, 0, r);
            store4(qy.add(load(c, Column.ROLLING_MOMENT + 1, r)), load(c, ContactForce.TOTAL + 1, r), c, 1, r);
            store4(qz.add(load(c, Column.ROLLING_MOMENT + 2, r)), load(c, ContactForce.TOTAL + 2, r), c, 2, r);
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
            double lever = c[at(Column.LEVER_SECOND) + r];
            c[at(TO) + r] = (fy * nz - fz * ny) * lever + c[at(Column.ROLLING_MOMENT) + r];
            c[at(TO + 1) + r] = (fz * nx - fx * nz) * lever + c[at(Column.ROLLING_MOMENT + 1) + r];
            c[at(TO + 2) + r] = (fx * ny - fy * nx) * lever + c[at(Column.ROLLING_MOMENT + 2) + r];
            c[at(TO + 3) + r] = c[at(Column.STIFFNESS) + r];
            c[at(TO + 4) + r] = c[at(ContactForce.TOTAL) + r];
            c[at(TO + 5) + r] = c[at(ContactForce.TOTAL + 1) + r];
            c[at(TO + 6) + r] = c[at(ContactForce.TOTAL + 2) + r];
            c[at(TO + 7) + r] = c[at(Column.SLIDING_STIFFNESS) + r];
        }
    }
}
