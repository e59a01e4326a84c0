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
 * Engine stage after {@link ContactForces}: torques l1 f x n - M of the first and l2 f x n + M of the second body, with f
 * friction and M rolling moment on the second. After it the force rows stand complete in columns 0-7 (first) and 8-15
 * (second): torque 3, normal stiffness, force 3, tangential stiffness.
 */
final class ContactTorques implements RowStage {

    private static final int FIRST = 0;
    private static final int SECOND = 8;

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
            DoubleVector mx = load(c, Column.ROLLING_MOMENT, r);
            DoubleVector my = load(c, Column.ROLLING_MOMENT + 1, r);
            DoubleVector mz = load(c, Column.ROLLING_MOMENT + 2, r);
            DoubleVector leverFirst = load(c, Column.LEVER_FIRST, r), leverSecond = load(c, Column.LEVER_SECOND, r);
            DoubleVector kn = load(c, Column.STIFFNESS, r);
            DoubleVector qx = fy.mul(nz).sub(fz.mul(ny)),
                    qy = fz.mul(nx).sub(fx.mul(nz)),
                    qz = fx.mul(ny).sub(fy.mul(nx));
            store(qx.mul(leverFirst).sub(mx), c, FIRST, r);
            store(qy.mul(leverFirst).sub(my), c, FIRST + 1, r);
            store(qz.mul(leverFirst).sub(mz), c, FIRST + 2, r);
            store(kn, c, FIRST + 3, r);
            store(qx.mul(leverSecond).add(mx), c, SECOND, r);
            store(qy.mul(leverSecond).add(my), c, SECOND + 1, r);
            store(qz.mul(leverSecond).add(mz), c, SECOND + 2, r);
            store(kn, c, SECOND + 3, r);
            store(load(c, Column.SLIDING_STIFFNESS, r), c, ContactForces.SECOND + 3, r); // over LEVER_FIRST, read above
        }
    }

    private static void scalar(double[] c, int rows) {
        for (int r = 0; r < rows; r++) {
            double nx = c[at(Column.NORMAL) + r], ny = c[at(Column.NORMAL + 1) + r], nz = c[at(Column.NORMAL + 2) + r];
            double fx = c[at(Column.FRICTION) + r],
                    fy = c[at(Column.FRICTION + 1) + r],
                    fz = c[at(Column.FRICTION + 2) + r];
            double mx = c[at(Column.ROLLING_MOMENT) + r];
            double my = c[at(Column.ROLLING_MOMENT + 1) + r];
            double mz = c[at(Column.ROLLING_MOMENT + 2) + r];
            double leverFirst = c[at(Column.LEVER_FIRST) + r], leverSecond = c[at(Column.LEVER_SECOND) + r];
            double kn = c[at(Column.STIFFNESS) + r];
            double qx = fy * nz - fz * ny, qy = fz * nx - fx * nz, qz = fx * ny - fy * nx;
            c[at(FIRST) + r] = qx * leverFirst - mx;
            c[at(FIRST + 1) + r] = qy * leverFirst - my;
            c[at(FIRST + 2) + r] = qz * leverFirst - mz;
            c[at(FIRST + 3) + r] = kn;
            c[at(SECOND) + r] = qx * leverSecond + mx;
            c[at(SECOND + 1) + r] = qy * leverSecond + my;
            c[at(SECOND + 2) + r] = qz * leverSecond + mz;
            c[at(SECOND + 3) + r] = kn;
            c[at(ContactForces.SECOND + 3) + r] = c[at(Column.SLIDING_STIFFNESS) + r];
        }
    }
}
