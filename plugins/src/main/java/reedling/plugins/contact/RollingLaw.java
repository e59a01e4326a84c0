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
import reedling.contact.ContactMemory;
import reedling.contact.HistoryColumn;
import reedling.material.MaterialPair;
import reedling.math.Lanes;

/**
 * Rolling resistance between bodies in round contact: a rotational spring that remembers its angle, a dashpot taken at
 * the end of the step, and a limit moment on their sum.
 *
 * <pre>
 * k_r = 2.25 mu_r^2 k_n R*^2                                   N m/rad
 * th* = (th - (th . n) n_mean) min(1, a_old / a) + w_t h       rad, w_t relative spin without its part along n
 * M   = (k_r th* + c_r w_t) / (1 + h c_r w_I / 2),  c_r = 2 eta sqrt(k_r / w_I)
 * q   = min(1, mu_r R* F_n / |M|),  M = q M,  th = q th*
 * </pre>
 *
 * <p>Where: mu_r rolling friction of the pair; k_n normal stiffness (N/m); R* effective radius (m); w_I sum of inverse
 * inertias (1/(kg m2)); eta damping ratio; h step (s); F_n normal force with its dashpot (N).
 *
 * <p>Shapes: a block of rows; history 3 doubles a row: angle (rad, world axes). Not for: resistance to twisting about
 * the normal. Stable step: inside that of the tangential spring. Source: Iwashita and Oda, Rolling resistance at
 * contacts in simulation of shear band development, 1998; Ai, Chen, Rotter and Ooi, Assessment of rolling resistance
 * models, 2011, type C with the stiffness above; the common limit is this project's. Threads: immutable.
 */
final class RollingLaw implements ContactLaw {

    private static final double TINY = 1e-300; // N m, keeps a quotient finite where nothing rolls
    private static final double SHAPE = 2.25;

    private final double dampingRatio;

    RollingLaw(double dampingRatio) {
        this.dampingRatio = dampingRatio;
    }

    @Override
    public List<HistoryColumn> history() {
        return List.of(HistoryColumn.vector("angle"));
    }

    @Override
    public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
        double friction = pair.rollingFriction();
        return ContactKernel.inOrder(
                RollingLaw::dropTwist,
                new ContactMemory(historyColumn, Column.SPIN),
                new Kernel(friction, SHAPE * friction * friction, 2 * dampingRatio, historyColumn));
    }

    /** Takes the part along the normal off the relative spin; no other stage needs it. */
    private static void dropTwist(ContactBlock block) {
        if (Lanes.VECTORISED) {
            dropTwistVector(block);
        } else {
            dropTwistScalar(block);
        }
    }

    private static void dropTwistVector(ContactBlock block) {
        double[] c = block.columns();
        for (int r = 0; r < block.rows(); r += Lanes.TILE) {
            DoubleVector nx = load(c, Column.NORMAL, r),
                    ny = load(c, Column.NORMAL + 1, r),
                    nz = load(c, Column.NORMAL + 2, r);
            DoubleVector wx = load(c, Column.SPIN, r),
                    wy = load(c, Column.SPIN + 1, r),
                    wz = load(c, Column.SPIN + 2, r);
            DoubleVector twist = wx.fma(nx, wy.fma(ny, wz.mul(nz))).neg();
            store(twist.fma(nx, wx), c, Column.SPIN, r);
            store(twist.fma(ny, wy), c, Column.SPIN + 1, r);
            store(twist.fma(nz, wz), c, Column.SPIN + 2, r);
        }
    }

    private static void dropTwistScalar(ContactBlock block) {
        double[] c = block.columns();
        for (int r = 0; r < block.rows(); r++) {
            double nx = c[at(Column.NORMAL) + r], ny = c[at(Column.NORMAL + 1) + r], nz = c[at(Column.NORMAL + 2) + r];
            double wx = c[at(Column.SPIN) + r], wy = c[at(Column.SPIN + 1) + r], wz = c[at(Column.SPIN + 2) + r];
            double twist = -Math.fma(wx, nx, Math.fma(wy, ny, wz * nz));
            c[at(Column.SPIN) + r] = Math.fma(twist, nx, wx);
            c[at(Column.SPIN + 1) + r] = Math.fma(twist, ny, wy);
            c[at(Column.SPIN + 2) + r] = Math.fma(twist, nz, wz);
        }
    }

    /**
     * @param friction mu_r
     * @param stiffness k_r over k_n R*^2
     * @param damping 2 eta
     * @param column first history column
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
            DoubleVector halfStep = DoubleVector.broadcast(Lanes.SPECIES, 0.5 * block.step());
            for (int r = 0; r < block.rows(); r += Lanes.TILE) {
                int at = block.historyAt(r, column);
                DoubleVector touch = load(c, Column.TOUCH, r);
                DoubleVector wx = load(c, Column.SPIN, r),
                        wy = load(c, Column.SPIN + 1, r),
                        wz = load(c, Column.SPIN + 2, r);

                // 1 angle, already advanced
                DoubleVector x = DoubleVector.fromArray(Lanes.SPECIES, history, at);
                DoubleVector y = DoubleVector.fromArray(Lanes.SPECIES, history, at + Lanes.TILE);
                DoubleVector z = DoubleVector.fromArray(Lanes.SPECIES, history, at + 2 * Lanes.TILE);

                // 2 spring and dashpot
                DoubleVector radius = load(c, Column.EFFECTIVE_RADIUS, r);
                DoubleVector inverseInertia = load(c, Column.INVERSE_INERTIA, r);
                DoubleVector k =
                        load(c, Column.STIFFNESS, r).mul(radius).mul(radius).mul(shape);
                DoubleVector dashpot = k.div(inverseInertia).sqrt().mul(twiceEta);
                DoubleVector gx = k.fma(x, dashpot.mul(wx));
                DoubleVector gy = k.fma(y, dashpot.mul(wy));
                DoubleVector gz = k.fma(z, dashpot.mul(wz));
                DoubleVector den = halfStep.mul(dashpot).fma(inverseInertia, one);

                // 3 the limit moment; one division serves both quotients
                DoubleVector size =
                        Lanes.larger(gx.fma(gx, gy.fma(gy, gz.mul(gz))).sqrt(), tiny);
                DoubleVector limit =
                        load(c, Column.NORMAL_FORCE, r).mul(radius).mul(mu).mul(den);
                DoubleVector share = Lanes.smaller(size, limit).mul(touch).div(size.mul(den));
                DoubleVector keepAngle = share.mul(den);
                store(gx.mul(share), c, Column.ROLLING_MOMENT, r);
                store(gy.mul(share), c, Column.ROLLING_MOMENT + 1, r);
                store(gz.mul(share), c, Column.ROLLING_MOMENT + 2, r);
                x.mul(keepAngle).intoArray(history, at);
                y.mul(keepAngle).intoArray(history, at + Lanes.TILE);
                z.mul(keepAngle).intoArray(history, at + 2 * Lanes.TILE);
            }
        }

        private void scalar(ContactBlock block) {
            double[] c = block.columns();
            double[] history = block.history();
            double step = block.step();
            for (int r = 0; r < block.rows(); r++) {
                int at = block.historyAtRow(r, column);
                double touch = c[at(Column.TOUCH) + r];
                double wx = c[at(Column.SPIN) + r], wy = c[at(Column.SPIN + 1) + r], wz = c[at(Column.SPIN + 2) + r];

                // 1 angle, already advanced
                double x = history[at], y = history[at + Lanes.TILE], z = history[at + 2 * Lanes.TILE];

                // 2 spring and dashpot
                double radius = c[at(Column.EFFECTIVE_RADIUS) + r];
                double inverseInertia = c[at(Column.INVERSE_INERTIA) + r];
                double k = c[at(Column.STIFFNESS) + r] * radius * radius * stiffness;
                double dashpot = Math.sqrt(k / inverseInertia) * damping;
                double gx = Math.fma(k, x, dashpot * wx);
                double gy = Math.fma(k, y, dashpot * wy);
                double gz = Math.fma(k, z, dashpot * wz);
                double den = Math.fma(0.5 * step * dashpot, inverseInertia, 1.0);

                // 3 the limit moment; one division serves both quotients
                double raw = Math.sqrt(Math.fma(gx, gx, Math.fma(gy, gy, gz * gz)));
                double size = raw > TINY ? raw : TINY;
                double limit = c[at(Column.NORMAL_FORCE) + r] * radius * friction * den;
                double share = (size < limit ? size : limit) * touch / (size * den);
                double keepAngle = share * den;
                c[at(Column.ROLLING_MOMENT) + r] = gx * share;
                c[at(Column.ROLLING_MOMENT + 1) + r] = gy * share;
                c[at(Column.ROLLING_MOMENT + 2) + r] = gz * share;
                history[at] = x * keepAngle;
                history[at + Lanes.TILE] = y * keepAngle;
                history[at + 2 * Lanes.TILE] = z * keepAngle;
            }
        }

        private void addStoredEnergy(ContactBlock block) {
            double[] c = block.columns();
            double[] history = block.history();
            for (int r = 0; r < block.rows(); r++) {
                int at = block.historyAtRow(r, column);
                double radius = c[at(Column.EFFECTIVE_RADIUS) + r];
                double k = c[at(Column.STIFFNESS) + r] * radius * radius * stiffness;
                double x = history[at], y = history[at + Lanes.TILE], z = history[at + 2 * Lanes.TILE];
                c[at(Column.STORED_ENERGY) + r] += 0.5 * k * (x * x + y * y + z * z);
            }
        }
    }
}
