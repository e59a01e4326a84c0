// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;
import static reedling.contact.ContactBlock.store;

import jdk.incubator.vector.DoubleVector;
import jdk.incubator.vector.VectorOperators;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.math.Lanes;

/**
 * Engine stage after the laws: notes the stiffest contact and turns normal force and friction into the forces of both
 * bodies, F = F_n n + f on the second and -F on the first. They stand, each with the tangential stiffness behind it, over
 * columns that nobody reads any more; {@link ContactTorques} completes the force rows.
 */
final class ContactForces implements RowStage {

    static final int FIRST = 4;
    static final int SECOND = 12;

    @Override
    public void run(RowRange rows) {
        ContactBlock block = rows.block();
        double stiffest =
                Lanes.VECTORISED ? vector(block.columns(), block.rows()) : scalar(block.columns(), block.rows());
        rows.tally().frequencySquared(stiffest);
    }

    private static double vector(double[] c, int rows) {
        DoubleVector stiffest = DoubleVector.zero(Lanes.SPECIES);
        for (int r = 0; r < rows; r += Lanes.TILE) {
            DoubleVector kt = load(c, Column.SLIDING_STIFFNESS, r);
            DoubleVector normal = load(c, Column.STIFFNESS, r).mul(load(c, Column.INVERSE_MASS, r));
            DoubleVector sliding = kt.mul(load(c, Column.INVERSE_MASS_SLIDING, r));
            stiffest = Lanes.larger(sliding, Lanes.larger(normal, stiffest));
            DoubleVector normalForce = load(c, Column.NORMAL_FORCE, r);
            DoubleVector fx = load(c, Column.NORMAL, r).fma(normalForce, load(c, Column.FRICTION, r));
            DoubleVector fy = load(c, Column.NORMAL + 1, r).fma(normalForce, load(c, Column.FRICTION + 1, r));
            DoubleVector fz = load(c, Column.NORMAL + 2, r).fma(normalForce, load(c, Column.FRICTION + 2, r));
            store(fx.neg(), c, FIRST, r);
            store(fy.neg(), c, FIRST + 1, r);
            store(fz.neg(), c, FIRST + 2, r);
            store(kt, c, FIRST + 3, r);
            store(fx, c, SECOND, r);
            store(fy, c, SECOND + 1, r);
            store(fz, c, SECOND + 2, r);
        }
        return stiffest.reduceLanes(VectorOperators.MAX);
    }

    private static double scalar(double[] c, int rows) {
        double stiffest = 0;
        for (int r = 0; r < rows; r++) {
            double kt = c[at(Column.SLIDING_STIFFNESS) + r];
            double normal = c[at(Column.STIFFNESS) + r] * c[at(Column.INVERSE_MASS) + r];
            double sliding = kt * c[at(Column.INVERSE_MASS_SLIDING) + r];
            stiffest = normal > stiffest ? normal : stiffest;
            stiffest = sliding > stiffest ? sliding : stiffest;
            double normalForce = c[at(Column.NORMAL_FORCE) + r];
            double fx = Math.fma(c[at(Column.NORMAL) + r], normalForce, c[at(Column.FRICTION) + r]);
            double fy = Math.fma(c[at(Column.NORMAL + 1) + r], normalForce, c[at(Column.FRICTION + 1) + r]);
            double fz = Math.fma(c[at(Column.NORMAL + 2) + r], normalForce, c[at(Column.FRICTION + 2) + r]);
            c[at(FIRST) + r] = -fx;
            c[at(FIRST + 1) + r] = -fy;
            c[at(FIRST + 2) + r] = -fz;
            c[at(FIRST + 3) + r] = kt;
            c[at(SECOND) + r] = fx;
            c[at(SECOND + 1) + r] = fy;
            c[at(SECOND + 2) + r] = fz;
        }
        return stiffest;
    }
}
