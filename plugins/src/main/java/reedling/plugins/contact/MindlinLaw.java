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
 * Friction between bodies in round contact: a spring of Mindlin's stiffness that remembers its stretch, a dashpot taken
 * at the end of the step, and Coulomb's limit on their sum.
 *
 * <pre>
 * k_t = 8 G* a                                        N/m
 * xi' = (xi - (xi . n) n_mean) b                      m, turned with the contact; b by the {@link StretchRule}
 * xi* = xi' + v_t h                                   m
 * f   = (k_t xi* + c_t v_t) / (1 + h c_t w / 2),      c_t = c sqrt(k_t / k_n)
 * q   = min(1, mu F_n / |f|),   f = q f,   xi = q xi* spring and dashpot shrink alike at the limit
 * </pre>
 *
 * <p>Where: a radius of contact (m); n normal; n_mean mean normal of the step; v_t sliding speed (m/s); h step (s); c
 * normal dashpot (N s/m); w inverse mass along the surface (1/kg); mu friction of the pair; F_n normal force with its
 * dashpot (N).
 *
 * <p>Shapes: a block of rows; history 3 doubles a row: stretch (m, world axes). Not for: partial slip in the contact
 * area. What that costs in an oblique elastic impact, psi2 = kappa s' / (mu v_n) with s' the speed of the contact point
 * after it, nu = 0.3, against the theory with partial slip: up to 0.42 with the default rule, 0.47 with the incremental
 * one (both near psi1 = 1), 0.58 with the secant (near psi1 = 0.75); nothing from psi1 = 4.76 on, where the contact slides
 * all the time (secant: 0.006 at 5). Stable step: 2 / sqrt(k_t w). Source: Mindlin, Compliance of elastic bodies in
 * contact, 1949; the limit on spring and dashpot together is this project's. Threads: immutable.
 */
final class MindlinLaw implements ContactLaw {

    private static final double TINY = 1e-300; // N, keeps a quotient finite where nothing slides

    private final StretchRule rule;

    MindlinLaw(StretchRule rule) {
        this.rule = rule;
    }

    @Override
    public List<HistoryColumn> history() {
        return List.of(HistoryColumn.vector("stretch"));
    }

    @Override
    public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
        double sliding = 8 * pair.contactShearModulus();
        double normal = 2 * pair.contactModulus();
        return ContactKernel.inOrder(
                rule.memory(historyColumn),
                new Kernel(sliding, StrictMath.sqrt(sliding / normal), pair.friction(), historyColumn));
    }

    /**
     * @param stiffness k_t over contact radius, Pa
     * @param dampingShare c_t / c
     * @param friction mu
     * @param column first history column
     */
    private record Kernel(double stiffness, double dampingShare, double friction, int column) implements ContactKernel {

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
            DoubleVector perRadius = DoubleVector.broadcast(Lanes.SPECIES, stiffness);
            DoubleVector shareOfDashpot = DoubleVector.broadcast(Lanes.SPECIES, dampingShare);
            DoubleVector mu = DoubleVector.broadcast(Lanes.SPECIES, friction);
            DoubleVector halfStep = DoubleVector.broadcast(Lanes.SPECIES, 0.5 * block.step());
            for (int r = 0; r < block.rows(); r += Lanes.TILE) {
                int at = block.historyAt(r, column);
                DoubleVector touch = load(c, Column.TOUCH, r);
                DoubleVector vx = load(c, Column.SLIDING, r);
                DoubleVector vy = load(c, Column.SLIDING + 1, r);
                DoubleVector vz = load(c, Column.SLIDING + 2, r);

                // 1 stretch, already advanced
                DoubleVector x = DoubleVector.fromArray(Lanes.SPECIES, history, at);
                DoubleVector y = DoubleVector.fromArray(Lanes.SPECIES, history, at + Lanes.TILE);
                DoubleVector z = DoubleVector.fromArray(Lanes.SPECIES, history, at + 2 * Lanes.TILE);

                // 2 spring and dashpot
                DoubleVector k = load(c, Column.CONTACT_RADIUS, r).mul(perRadius);
                DoubleVector dashpot = load(c, Column.DAMPING, r).mul(shareOfDashpot);
                DoubleVector gx = k.fma(x, dashpot.mul(vx));
                DoubleVector gy = k.fma(y, dashpot.mul(vy));
                DoubleVector gz = k.fma(z, dashpot.mul(vz));
                DoubleVector den = halfStep.mul(dashpot).fma(load(c, Column.INVERSE_MASS_SLIDING, r), one);

                // 3 Coulomb's limit; one division serves both quotients
                DoubleVector size =
                        Lanes.larger(gx.fma(gx, gy.fma(gy, gz.mul(gz))).sqrt(), tiny);
                DoubleVector limit = load(c, Column.NORMAL_FORCE, r).mul(mu).mul(den);
                DoubleVector share = Lanes.smaller(size, limit).mul(touch).div(size.mul(den));
                DoubleVector keepStretch = share.mul(den);
                store(gx.mul(share), c, Column.FRICTION, r);
                store(gy.mul(share), c, Column.FRICTION + 1, r);
                store(gz.mul(share), c, Column.FRICTION + 2, r);
                store(k, c, Column.SLIDING_STIFFNESS, r);
                x.mul(keepStretch).intoArray(history, at);
                y.mul(keepStretch).intoArray(history, at + Lanes.TILE);
                z.mul(keepStretch).intoArray(history, at + 2 * Lanes.TILE);
            }
        }

        private void scalar(ContactBlock block) {
            double[] c = block.columns();
            double[] history = block.history();
            double step = block.step();
            for (int r = 0; r < block.rows(); r++) {
                int at = block.historyAtRow(r, column);
                double touch = c[at(Column.TOUCH) + r];
                double vx = c[at(Column.SLIDING) + r];
                double vy = c[at(Column.SLIDING + 1) + r];
                double vz = c[at(Column.SLIDING + 2) + r];

                // 1 stretch, already advanced
                double x = history[at], y = history[at + Lanes.TILE], z = history[at + 2 * Lanes.TILE];

                // 2 spring and dashpot
                double k = c[at(Column.CONTACT_RADIUS) + r] * stiffness;
                double dashpot = c[at(Column.DAMPING) + r] * dampingShare;
                double gx = Math.fma(k, x, dashpot * vx);
                double gy = Math.fma(k, y, dashpot * vy);
                double gz = Math.fma(k, z, dashpot * vz);
                double den = Math.fma(0.5 * step * dashpot, c[at(Column.INVERSE_MASS_SLIDING) + r], 1.0);

                // 3 Coulomb's limit; one division serves both quotients
                double raw = Math.sqrt(Math.fma(gx, gx, Math.fma(gy, gy, gz * gz)));
                double size = raw > TINY ? raw : TINY;
                double limit = c[at(Column.NORMAL_FORCE) + r] * friction * den;
                double share = (size < limit ? size : limit) * touch / (size * den);
                double keepStretch = share * den;
                c[at(Column.FRICTION) + r] = gx * share;
                c[at(Column.FRICTION + 1) + r] = gy * share;
                c[at(Column.FRICTION + 2) + r] = gz * share;
                c[at(Column.SLIDING_STIFFNESS) + r] = k;
                history[at] = x * keepStretch;
                history[at + Lanes.TILE] = y * keepStretch;
                history[at + 2 * Lanes.TILE] = z * keepStretch;
            }
        }

        private void addStoredEnergy(ContactBlock block) {
            double[] c = block.columns();
            double[] history = block.history();
            for (int r = 0; r < block.rows(); r++) {
                int at = block.historyAtRow(r, column);
                double x = history[at], y = history[at + Lanes.TILE], z = history[at + 2 * Lanes.TILE];
                c[at(Column.STORED_ENERGY) + r] += 0.5 * c[at(Column.SLIDING_STIFFNESS) + r] * (x * x + y * y + z * z);
            }
        }
    }
}
