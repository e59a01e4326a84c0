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
 * Gather stage: closing speed, sliding of the surfaces and mean normal of grain-grain rows.
 *
 * <pre>
 * v_n = (v_i - v_j) . n        u = (v_j - v_i) + v_n n, the tangential velocity of the centres, reversed
 * v_t = (l_i w_i + l_j w_j) x n - u        n_mean = n - h/(2 d) u
 * </pre>
 */
final class PairSliding implements RowStage {

    /** Column of the sum of radius times spin; the mean normal then stands there. */
    private static final int RADIUS_SPIN = Column.MEAN_NORMAL;

    @Override
    public void run(RowRange rows) {
        ContactBlock block = rows.block();
        if (Lanes.VECTORISED) {
            vector(block.columns(), block.rows(), -0.5 * block.step());
        } else {
            scalar(block.columns(), block.rows(), -0.5 * block.step());
        }
    }

    private static void vector(double[] c, int rows, double minusHalfStep) {
        DoubleVector back = DoubleVector.broadcast(Lanes.SPECIES, minusHalfStep);
        for (int r = 0; r < rows; r += Lanes.TILE) {
            DoubleVector nx = load(c, Column.NORMAL, r),
                    ny = load(c, Column.NORMAL + 1, r),
                    nz = load(c, Column.NORMAL + 2, r);
            DoubleVector dx = load(c, Column.SLIDING, r),
                    dy = load(c, Column.SLIDING + 1, r),
                    dz = load(c, Column.SLIDING + 2, r);
            DoubleVector closing = dx.fma(nx, dy.fma(ny, dz.mul(nz))).neg();
            DoubleVector ux = closing.fma(nx, dx), uy = closing.fma(ny, dy), uz = closing.fma(nz, dz);
            store(closing, c, Column.CLOSING, r);
            DoubleVector shortening = load(c, PairNormals.SHORTENING, r);
            DoubleVector sx = load(c, RADIUS_SPIN, r).mul(shortening);
            DoubleVector sy = load(c, RADIUS_SPIN + 1, r).mul(shortening);
            DoubleVector sz = load(c, RADIUS_SPIN + 2, r).mul(shortening);
            store(sy.mul(nz).sub(sz.fma(ny, ux)), c, Column.SLIDING, r);
            store(sz.mul(nx).sub(sx.fma(nz, uy)), c, Column.SLIDING + 1, r);
            store(sx.mul(ny).sub(sy.fma(nx, uz)), c, Column.SLIDING + 2, r);
            DoubleVector turn = load(c, PairNormals.INVERSE_DISTANCE, r).mul(back);
            store(ux.fma(turn, nx), c, Column.MEAN_NORMAL, r);
            store(uy.fma(turn, ny), c, Column.MEAN_NORMAL + 1, r);
            store(uz.fma(turn, nz), c, Column.MEAN_NORMAL + 2, r);
        }
    }

    private static void scalar(double[] c, int rows, double minusHalfStep) {
        for (int r = 0; r < rows; r++) {
            double nx = c[at(Column.NORMAL) + r], ny = c[at(Column.NORMAL + 1) + r], nz = c[at(Column.NORMAL + 2) + r];
            double dx = c[at(Column.SLIDING) + r],
                    dy = c[at(Column.SLIDING + 1) + r],
                    dz = c[at(Column.SLIDING + 2) + r];
            double closing = -Math.fma(dx, nx, Math.fma(dy, ny, dz * nz));
            double ux = Math.fma(closing, nx, dx), uy = Math.fma(closing, ny, dy), uz = Math.fma(closing, nz, dz);
            c[at(Column.CLOSING) + r] = closing;
            double shortening = c[at(PairNormals.SHORTENING) + r];
            double sx = c[at(RADIUS_SPIN) + r] * shortening;
            double sy = c[at(RADIUS_SPIN + 1) + r] * shortening;
            double sz = c[at(RADIUS_SPIN + 2) + r] * shortening;
            c[at(Column.SLIDING) + r] = sy * nz - Math.fma(sz, ny, ux);
            c[at(Column.SLIDING + 1) + r] = sz * nx - Math.fma(sx, nz, uy);
            c[at(Column.SLIDING + 2) + r] = sx * ny - Math.fma(sy, nx, uz);
            double turn = c[at(PairNormals.INVERSE_DISTANCE) + r] * minusHalfStep;
            c[at(Column.MEAN_NORMAL) + r] = Math.fma(ux, turn, nx);
            c[at(Column.MEAN_NORMAL + 1) + r] = Math.fma(uy, turn, ny);
            c[at(Column.MEAN_NORMAL + 2) + r] = Math.fma(uz, turn, nz);
        }
    }
}
