// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;
import static reedling.contact.ContactBlock.store;

import jdk.incubator.vector.DoubleVector;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.material.MaterialPair;
import reedling.math.Lanes;

/**
 * Rolling resistance in proportion to the rolling speed, as of bodies whose material is viscous in the contact.
 *
 * <pre>
 * w_t = w - (w . n) n                                  rad/s
 * M   = c w_t / (1 + h c w_I / 2),  c = tau R* F_n     N m, N m s
 * </pre>
 *
 * <p>Where: w relative spin (rad/s); n normal; tau a time (s): rolling at w_t resists as much as a rolling friction
 * coefficient of tau |w_t| would; R* effective radius (m); F_n normal force with its dashpot (N); h step (s); w_I sum of
 * inverse inertias (1/(kg m2)). The speed is that at the end of the step.
 *
 * <p>Shapes: a block of rows; no history, nothing stored. Not for: holding a grain at rest on a slope; resistance to twisting
 * about the normal. The rolling friction of the material pair is not read. Stable step: any. Source: Brilliantov and
 * Poeschel, Rolling friction of a viscous sphere on a hard plane, 1998 (form, from memory); speed at the end of the step as
 * in all dashpots of this project. Threads: immutable.
 */
final class ViscousRollingLaw implements ContactLaw {

    private final double time;

    /**
     * @param time tau, s
     */
    ViscousRollingLaw(double time) {
        this.time = time;
    }

    @Override
    public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
        return new Kernel(time);
    }

    /**
     * @param time tau, s
     */
    private record Kernel(double time) implements ContactKernel {

        @Override
        public void apply(ContactBlock block) {
            if (Lanes.VECTORISED) {
                vector(block.columns(), block.rows(), 0.5 * block.step());
            } else {
                scalar(block.columns(), block.rows(), 0.5 * block.step());
            }
        }

        private void vector(double[] c, int rows, double half) {
            DoubleVector one = DoubleVector.broadcast(Lanes.SPECIES, 1.0);
            DoubleVector tau = DoubleVector.broadcast(Lanes.SPECIES, time);
            DoubleVector halfStep = DoubleVector.broadcast(Lanes.SPECIES, half);
            for (int r = 0; r < rows; r += Lanes.TILE) {
                DoubleVector nx = load(c, Column.NORMAL, r),
                        ny = load(c, Column.NORMAL + 1, r),
                        nz = load(c, Column.NORMAL + 2, r);
                DoubleVector wx = load(c, Column.SPIN, r),
                        wy = load(c, Column.SPIN + 1, r),
                        wz = load(c, Column.SPIN + 2, r);
                DoubleVector twist = wx.fma(nx, wy.fma(ny, wz.mul(nz))).neg();
                DoubleVector dashpot = load(c, Column.NORMAL_FORCE, r)
                        .mul(load(c, Column.EFFECTIVE_RADIUS, r))
                        .mul(tau)
                        .mul(load(c, Column.TOUCH, r));
                DoubleVector den = halfStep.mul(dashpot).fma(load(c, Column.INVERSE_INERTIA, r), one);
                DoubleVector share = dashpot.div(den);
                store(twist.fma(nx, wx).mul(share), c, Column.ROLLING_MOMENT, r);
                store(twist.fma(ny, wy).mul(share), c, Column.ROLLING_MOMENT + 1, r);
                store(twist.fma(nz, wz).mul(share), c, Column.ROLLING_MOMENT + 2, r);
            }
        }

        private void scalar(double[] c, int rows, double half) {
            for (int r = 0; r < rows; r++) {
                double nx = c[at(Column.NORMAL) + r],
                        ny = c[at(Column.NORMAL + 1) + r],
                        nz = c[at(Column.NORMAL + 2) + r];
                double wx = c[at(Column.SPIN) + r], wy = c[at(Column.SPIN + 1) + r], wz = c[at(Column.SPIN + 2) + r];
                double twist = -Math.fma(wx, nx, Math.fma(wy, ny, wz * nz));
                double dashpot = c[at(Column.NORMAL_FORCE) + r]
                        * c[at(Column.EFFECTIVE_RADIUS) + r]
                        * time
                        * c[at(Column.TOUCH) + r];
                double share = dashpot / Math.fma(half * dashpot, c[at(Column.INVERSE_INERTIA) + r], 1.0);
                c[at(Column.ROLLING_MOMENT) + r] = Math.fma(twist, nx, wx) * share;
                c[at(Column.ROLLING_MOMENT + 1) + r] = Math.fma(twist, ny, wy) * share;
                c[at(Column.ROLLING_MOMENT + 2) + r] = Math.fma(twist, nz, wz) * share;
            }
        }
    }
}
