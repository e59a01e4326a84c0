// SPDX-License-Identifier: Apache-2.0
package bridge.moisture;

import static reedling.contact.ContactBlock.at;

import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;

/**
 * First kernel of {@link LiquidBridgeLaw}: state, force, load and energies. In the step of a jump the force is set so that
 * half of it times the step, which is what that step gets, and as much for the next step of equal length, make the impulse
 * of the jump at its place:
 *
 * <pre>
 * formed at the touch, overlap d now:    F' = F (1/2 + d / u),              u = v h, the approach in the step
 * broken at s_c, gap s now:              F' = F_c (1/2 - (s - s_c) / u),    u = -v h
 * </pre>
 *
 * @param bridge shape of the bridges
 * @param wet history column: 1 where there is a bridge, else 0
 */
record BridgeForce(Bridge bridge, int wet) implements ContactKernel {

    @Override
    public void apply(ContactBlock block) {
        double[] c = block.columns();
        double[] history = block.history();
        for (int r = 0; r < block.rows(); r++) {
            int wetAt = block.historyAtRow(r, wet);
            boolean before = history[wetAt] > 0;
            double gap = -c[at(Column.OVERLAP) + r];
            boolean now = c[at(Column.TOUCH) + r] > 0 && (gap < 0 || before && gap < bridge.rupture());
            history[wetAt] = now ? 1 : 0;
            if (now) {
                double early = before ? 1 : sinceTouch(-gap, c[at(Column.CLOSING) + r] * block.step());
                pull(c, r, early * bridge.force(c[at(Column.EFFECTIVE_RADIUS) + r], gap));
                if (block.energyDue()) {
                    c[at(Column.STORED_ENERGY) + r] += bridge.energy(c[at(Column.EFFECTIVE_RADIUS) + r], gap);
                }
            } else if (before) {
                tear(c, r, gap, -c[at(Column.CLOSING) + r] * block.step());
            }
        }
    }

    /** Adds an attraction, N; the limits of friction keep the elastic pressure. */
    private static void pull(double[] c, int r, double force) {
        c[at(Column.ELASTIC_FORCE) + r] -= force;
        c[at(Column.ADHESIVE_LOAD) + r] += force;
    }

    /** Share of the force in the step in which the bodies touch; overlap and approach in m. */
    private static double sinceTouch(double overlap, double approach) {
        return approach > overlap ? 0.5 + overlap / approach : 1;
    }

    private void tear(double[] c, int r, double gap, double apart) {
        double radius = c[at(Column.EFFECTIVE_RADIUS) + r];
        double beyond = gap - bridge.rupture();
        if (beyond >= 0 && gap < bridge.reach() && apart > beyond) {
            pull(c, r, bridge.force(radius, bridge.rupture()) * (0.5 - beyond / apart));
        }
        c[at(Column.LOST_ENERGY) + r] += bridge.energy(radius, bridge.rupture());
    }

    @Override
    public double reach(double largestRadius) {
        return bridge.reach();
    }

    @Override
    public boolean pulls() {
        return true;
    }
}
