// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;
import static reedling.contact.ContactBlock.store;

import java.util.List;
import jdk.incubator.vector.DoubleVector;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.contact.HistoryColumn;
import reedling.material.MaterialPair;
import reedling.math.Lanes;

/**
 * Resistance to relative spin about the normal: a torsional spring that remembers its angle, a dashpot taken at the end of
 * the step, and a limit moment on their sum.
 *
 * <pre>
 * k_w = 2.25 mu_w^2 k_n R*^2                                N m/rad
 * th* = th min(1, a_old / a) + w_n h                        rad, w_n = w . n relative spin about the normal
 * M   = (k_w th* + c_w w_n) / (1 + h c_w w_I / 2),  c_w = 2 eta sqrt(k_w / w_I)
 * q   = min(1, mu_w R* F_n / |M|),  M = q M n,  th = q th*
 * </pre>
 *
 * <p>Where: mu_w twisting friction of the case; k_n normal stiffness (N/m); R* effective radius (m); w_I sum of inverse
 * inertias (1/(kg m2)); eta damping ratio; h step (s); F_n normal force that limits come from (N). The angle is a number that
 * exchange of the bodies leaves alone: spin and normal turn their signs together.
 *
 * <p>A size for mu_w: a Hertz contact of friction mu that slides all over resists with 3 pi / 16 mu a F_n, so mu_w is
 * 0.59 mu a / R*, of the order of 0.01. Shapes: a block of rows; history 1 double a row: angle (rad). Not for: twisting that
 * wears out friction along the surface, or the reverse; both limits stand apart. Stable step: inside that of the tangential
 * spring. Source: form as rolling resistance, Iwashita and Oda, Rolling resistance at contacts in simulation of shear band
 * development, 1998; stiffness by analogy with {@link RollingLaw}, no source; sliding disc under Hertz's pressure:
 * Deresiewicz, Contact of elastic spheres under an oscillating torsional couple, 1954 (from memory). Threads: immutable.
 */
final class TwistingLaw implements ContactLaw {

    private static final double TINY = 1e-300; // N m, keeps a quotient finite where nothing twists
    private static final double SHAPE = 2.25;

    private final double friction;
    private final double dampingRatio;

    /**
     * @param friction mu_w
     * @param dampingRatio eta
     */
    TwistingLaw(double friction, double dampingRatio) {
        this.friction = friction;
        this.dampingRatio = dampingRatio;
    }

    @Override
    public List<HistoryColumn> history() {
        return List.of(HistoryColumn.scalar("twist"));
    }

    @Override
    public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
        return new Kernel(friction, SHAPE * friction * friction, 2 * dampingRatio, historyColumn);
    }

    /**
     * @param friction mu_w
     * @param stiffness k_w over k_n R*^2
     * @param damping 2 eta
     * @param column its history column
     */
    private record Kernel(double friction, double stiffness, double damping, int column) implements ContactKernel {

        @Override
        public void apply(ContactBlock block) {
            if (Lanes.VECTORISED) {
                vector(block);
            } else {
                scalar(block);
            }
            if (block.energyDue()) {
                addStoredEnergy(block);
            }
        }

        private void vector(ContactBlock block) {
            double[] c = block.columns();
            double[] history = block.history();
            DoubleVector one = DoubleVector.broadcast(Lanes.SPECIES, 1.0);
            DoubleVector tiny = DoubleVector.broadcast(Lanes.SPECIES, TINY);
            DoubleVector shape = DoubleVector.broadcast(Lanes.SPECIES, stiffness);
            DoubleVector twiceEta = DoubleVector.broadcast(Lanes.SPECIES, damping);
            DoubleVector mu = DoubleVector.broadcast(Lanes.SPECIES, friction);
            DoubleVector step = DoubleVector.broadcast(Lanes.SPECIES, block.step());
            DoubleVector halfStep = DoubleVector.broadcast(Lanes.SPECIES, 0.5 * block.step());
            for (int r = 0; r < block.rows(); r += Lanes.TILE) {
                int at = block.historyAt(r, column);

                // 1 angle
                DoubleVector spin = load(c, Column.TWIST, r);
                DoubleVector keep = Lanes.smaller(load(c, Column.RADIUS_RATIO, r), one);
                DoubleVector angle = spin.fma(
                        step, DoubleVector.fromArray(Lanes.SPECIES, history, at).mul(keep));

                // 2 spring and dashpot
                DoubleVector radius = load(c, Column.EFFECTIVE_RADIUS, r);
                DoubleVector inverseInertia = load(c, Column.INVERSE_INERTIA, r);
                DoubleVector k =
                        load(c, Column.STIFFNESS, r).mul(radius).mul(radius).mul(shape);
                DoubleVector dashpot = k.div(inverseInertia).sqrt().mul(twiceEta);
                DoubleVector g = k.fma(angle, dashpot.mul(spin));
                DoubleVector den = halfStep.mul(dashpot).fma(inverseInertia, one);

                // 3 the limit moment; one division serves both quotients
                DoubleVector size = Lanes.larger(g.abs(), tiny);
                DoubleVector limit =
                        load(c, Column.NORMAL_FORCE, r).mul(radius).mul(mu).mul(den);
                DoubleVector share =
                        Lanes.smaller(size, limit).mul(load(c, Column.TOUCH, r)).div(size.mul(den));
                DoubleVector moment = g.mul(share);
                for (int axis = 0; axis < 3; axis++) {
                    DoubleVector rolling = load(c, Column.ROLLING_MOMENT + axis, r);
                    store(moment.fma(load(c, Column.NORMAL + axis, r), rolling), c, Column.ROLLING_MOMENT + axis, r);
                }
                angle.mul(share.mul(den)).intoArray(history, at);
            }
        }

        private void scalar(ContactBlock block) {
            double[] c = block.columns();
            double[] history = block.history();
            double step = block.step();
            for (int r = 0; r < block.rows(); r++) {
                int at = block.historyAtRow(r, column);

                // 1 angle
                double spin = c[at(Column.TWIST) + r];
                double ratio = c[at(Column.RADIUS_RATIO) + r];
                double angle = Math.fma(spin, step, history[at] * (ratio < 1.0 ? ratio : 1.0));

                // 2 spring and dashpot
                double radius = c[at(Column.EFFECTIVE_RADIUS) + r];
                double inverseInertia = c[at(Column.INVERSE_INERTIA) + r];
                double k = c[at(Column.STIFFNESS) + r] * radius * radius * stiffness;
                double dashpot = Math.sqrt(k / inverseInertia) * damping;
                double g = Math.fma(k, angle, dashpot * spin);
                double den = Math.fma(0.5 * step * dashpot, inverseInertia, 1.0);

                // 3 the limit moment; one division serves both quotients
                double raw = Math.abs(g);
                double size = raw > TINY ? raw : TINY;
                double limit = c[at(Column.NORMAL_FORCE) + r] * radius * friction * den;
                double share = (size < limit ? size : limit) * c[at(Column.TOUCH) + r] / (size * den);
                double moment = g * share;
                for (int axis = 0; axis < 3; axis++) {
                    int m = at(Column.ROLLING_MOMENT + axis) + r;
                    c[m] = Math.fma(moment, c[at(Column.NORMAL + axis) + r], c[m]);
                }
                history[at] = angle * (share * den);
            }
        }

        private void addStoredEnergy(ContactBlock block) {
            double[] c = block.columns();
            double[] history = block.history();
            for (int r = 0; r < block.rows(); r++) {
                double angle = history[block.historyAtRow(r, column)];
                double radius = c[at(Column.EFFECTIVE_RADIUS) + r];
                double k = c[at(Column.STIFFNESS) + r] * radius * radius * stiffness;
                c[at(Column.STORED_ENERGY) + r] += 0.5 * k * (angle * angle);
            }
        }
    }
}
