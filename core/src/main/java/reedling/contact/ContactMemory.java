// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;

import jdk.incubator.vector.DoubleVector;
import reedling.math.Lanes;

/**
 * Advances a stretch or angle that a law stores for each contact:
 *
 * <pre>x' = (x - (x . n) n_mean) min(1, a_old / a) + v h</pre>
 *
 * The stored vector turns with the contact, keeping its length to fourth order in the angle of a step because n_mean is
 * the normal half-way; a growing contact keeps the force (the stretch shrinks as the stiffness grows with the contact
 * radius a), a shrinking one keeps the stretch, so that a spring never creates energy. {@link #ofStretch} and
 * {@link #ofForce} keep one of both whatever the contact does; a spring of such a law can create energy.
 *
 * <p>Put it before the law's own kernel with {@link ContactKernel#inOrder}. Where: n normal, v the motion of a column (m/s or rad/s), h the past step (s). Source: the rule for changing stiffness
 * after Thornton and Randall, Applications of theoretical contact mechanics to solid particle system simulation, 1988 (from
 * memory). Threads: immutable.
 *
 * @param column first of the three history columns that hold the vector
 * @param motion first of the three block columns that hold its rate
 * @param ratio block column of the number that the old vector is multiplied by
 * @param most largest factor
 */
public record ContactMemory(int column, int motion, int ratio, double most) implements ContactKernel {

    /** The rule above. */
    public ContactMemory(int column, int motion) {
        this(column, motion, Column.RADIUS_RATIO, 1);
    }

    /** x' = (x - (x . n) n_mean) + v h. */
    public static ContactMemory ofStretch(int column, int motion) {
        return new ContactMemory(column, motion, Column.TOUCH, 1);
    }

    /** x' = (x - (x . n) n_mean) a_old / a + v h: stiffness times x, with a stiffness that goes with a, is not changed. */
    public static ContactMemory ofForce(int column, int motion) {
        return new ContactMemory(column, motion, Column.RADIUS_RATIO, Double.POSITIVE_INFINITY);
    }

    @Override
    public void apply(ContactBlock block) {
        if (Lanes.VECTORISED) {
            vector(block);
        } else {
            scalar(block);
        }
    }

    private void vector(ContactBlock block) {
        double[] c = block.columns();
        double[] history = block.history();
        DoubleVector largest = DoubleVector.broadcast(Lanes.SPECIES, most);
        DoubleVector step = DoubleVector.broadcast(Lanes.SPECIES, block.step());
        for (int r = 0; r < block.rows(); r += Lanes.TILE) {
            int at = block.historyAt(r, column);
            DoubleVector x = DoubleVector.fromArray(Lanes.SPECIES, history, at);
            DoubleVector y = DoubleVector.fromArray(Lanes.SPECIES, history, at + Lanes.TILE);
            DoubleVector z = DoubleVector.fromArray(Lanes.SPECIES, history, at + 2 * Lanes.TILE);
            DoubleVector nx = load(c, Column.NORMAL, r),
                    ny = load(c, Column.NORMAL + 1, r),
                    nz = load(c, Column.NORMAL + 2, r);
            DoubleVector along = x.fma(nx, y.fma(ny, z.mul(nz))).neg();
            DoubleVector keep = Lanes.smaller(load(c, ratio, r), largest);
            x = along.fma(load(c, Column.MEAN_NORMAL, r), x).mul(keep);
            y = along.fma(load(c, Column.MEAN_NORMAL + 1, r), y).mul(keep);
            z = along.fma(load(c, Column.MEAN_NORMAL + 2, r), z).mul(keep);
            load(c, motion, r).fma(step, x).intoArray(history, at);
            load(c, motion + 1, r).fma(step, y).intoArray(history, at + Lanes.TILE);
            load(c, motion + 2, r).fma(step, z).intoArray(history, at + 2 * Lanes.TILE);
        }
    }

    private void scalar(ContactBlock block) {
        double[] c = block.columns();
        double[] history = block.history();
        double step = block.step();
        for (int r = 0; r < block.rows(); r++) {
            int h = block.historyAtRow(r, column);
            double x = history[h], y = history[h + Lanes.TILE], z = history[h + 2 * Lanes.TILE];
            double nx = c[at(Column.NORMAL) + r], ny = c[at(Column.NORMAL + 1) + r], nz = c[at(Column.NORMAL + 2) + r];
            double along = -Math.fma(x, nx, Math.fma(y, ny, z * nz));
            double factor = c[at(ratio) + r];
            double keep = factor < most ? factor : most;
            x = Math.fma(along, c[at(Column.MEAN_NORMAL) + r], x) * keep;
            y = Math.fma(along, c[at(Column.MEAN_NORMAL + 1) + r], y) * keep;
            z = Math.fma(along, c[at(Column.MEAN_NORMAL + 2) + r], z) * keep;
            history[h] = Math.fma(c[at(motion) + r], step, x);
            history[h + Lanes.TILE] = Math.fma(c[at(motion + 1) + r], step, y);
            history[h + 2 * Lanes.TILE] = Math.fma(c[at(motion + 2) + r], step, z);
        }
    }
}
