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

/** Engine stage after the laws: the force F = F_n n + f on the second body, and the stiffest contact, k / m. */
final class ContactForce implements RowStage {

    /** First of the three columns of F, over those of the sliding velocity, which nobody reads any more. */
    static final int TOTAL = Column.SLIDING;

    @Override
    public void run(RowRange rows) {
        ContactBlock block = rows.block();
        rows.tally()
                .frequencySquared(
                        Lanes.VECTORISED
                                ? vector(block.columns(), block.rows())
                                : scalar(block.columns(), block.rows()));
    }

    private static double vector(double[] c, int rows) {
        DoubleVector stiffest = DoubleVector.zero(Lanes.SPECIES);
        for (int r = 0; r < rows; r += Lanes.TILE) {
            DoubleVector normal = load(c, Column.STIFFNESS, r).mul(load(c, Column.INVERSE_MASS, r));
            DoubleVector sliding = load(c, Column.SLIDING_STIFFNESS, r).mul(load(c, Column.INVERSE_MASS_SLIDING, r));
            stiffest = Lanes.larger(sliding, Lanes.larger(normal, stiffest));
            DoubleVector normalForce = load(c, Column.NORMAL_FORCE, r);
            store(load(c, Column.NORMAL, r).fma(normalForce, load(c, Column.FRICTION, r)), c, TOTAL, r);
            store(load(c, Column.NORMAL + 1, r).fma(normalForce, load(c, Column.FRICTION + 1, r)), c, TOTAL + 1, r);
            store(load(c, Column.NORMAL + 2, r).fma(normalForce, load(c, Column.FRICTION + 2, r)), c, TOTAL + 2, r);
        }
        return stiffest.reduceLanes(VectorOperators.MAX);
    }

    private static double scalar(double[] c, int rows) {
        double stiffest = 0;
        for (int r = 0; r < rows; r++) {
            double normal = c[at(Column.STIFFNESS) + r] * c[at(Column.INVERSE_MASS) + r];
            double sliding = c[at(Column.SLIDING_STIFFNESS) + r] * c[at(Column.INVERSE_MASS_SLIDING) + r];
            stiffest = normal > stiffest ? normal : stiffest;
            stiffest = sliding > stiffest ? sliding : stiffest;
            double normalForce = c[at(Column.NORMAL_FORCE) + r];
            for (int axis = 0; axis < 3; axis++) {
                c[at(TOTAL + axis) + r] =
                        Math.fma(c[at(Column.NORMAL + axis) + r], normalForce, c[at(Column.FRICTION + axis) + r]);
            }
        }
        return stiffest;
    }
}
