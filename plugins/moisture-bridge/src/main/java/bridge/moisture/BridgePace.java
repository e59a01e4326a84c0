// SPDX-License-Identifier: Apache-2.0
package bridge.moisture;

import static reedling.contact.ContactBlock.at;

import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;

/**
 * Second kernel of {@link LiquidBridgeLaw}: the time scale, the shortest of
 *
 * <pre>
 * t_a = 2.868266 (m*^2 / (R* E*^2 v_a))^(1/5),  v_a^2 = 4/5 F_0 d_0 / m*,  d_0 = (F_0 / (4/3 E* sqrt(R*)))^(2/3)
 * t_b = pi sqrt(m* b / F_0)                 the steepest slope of the force, at a gap of 0
 * t_v = 4 b / |v|,  b = sqrt(V / (pi R*))   s, the force falls over lengths of b; across a gap only
 * </pre>
 *
 * <p>d_0 (m) is the overlap of a Hertz contact that only the bridge loads, and t_a the impact time with its frequency.
 * Where: m* effective mass (kg), E* contact modulus (Pa), v closing speed (m/s), the rest as in {@link Bridge}.
 *
 * @param bridge shape of the bridges
 * @param wet history column
 * @param touch t_a for m* = 1 kg and R* = 1 m, s; it goes with m*^(1/2) R*^(-1/3)
 * @param swing t_b for m* = 1 kg and R* = 1 m, s; it goes with m*^(1/2) R*^(-3/4)
 */
record BridgePace(Bridge bridge, int wet, double touch, double swing) implements ContactKernel {

    private static final double DURATION = 2.868266; // of a Hertz impact
    private static final double TRAVEL = 4;

    static BridgePace of(Bridge bridge, int wet, double modulus) {
        double perRadius = bridge.perRadius();
        double overlap = StrictMath.pow(perRadius / (4.0 / 3 * modulus), 2.0 / 3);
        return new BridgePace(
                bridge,
                wet,
                DURATION * StrictMath.pow(modulus, -0.4) * StrictMath.pow(0.8 * perRadius * overlap, -0.1),
                Math.PI * Math.sqrt(Math.sqrt(bridge.spread()) / perRadius));
    }

    @Override
    public void apply(ContactBlock block) {
        double[] c = block.columns();
        double[] history = block.history();
        double touching = Double.POSITIVE_INFINITY; // m*^3 / R*^2
        double swinging = Double.POSITIVE_INFINITY; // m*^2 / R*^3
        double fastest = 0; // v^2 R*
        for (int r = 0; r < block.rows(); r++) {
            if (!(history[block.historyAtRow(r, wet)] > 0)) {
                continue;
            }
            double radius = c[at(Column.EFFECTIVE_RADIUS) + r];
            double mass = c[at(Column.EFFECTIVE_MASS) + r];
            double closing = c[at(Column.CLOSING) + r];
            touching = Math.min(touching, mass * mass * mass / (radius * radius));
            swinging = Math.min(swinging, mass * mass / (radius * radius * radius));
            boolean apart = c[at(Column.OVERLAP) + r] < 0;
            fastest = Math.max(fastest, apart ? closing * closing * radius : 0);
        }
        if (!(touching == Double.POSITIVE_INFINITY)) {
            double shortest =
                    Math.min(touch * StrictMath.cbrt(Math.sqrt(touching)), swing * Math.sqrt(Math.sqrt(swinging)));
            block.reportDuration(Math.min(shortest, TRAVEL * Math.sqrt(bridge.spread() / fastest)));
        }
    }

    @Override
    public double duration(double speed, double radius, double mass) {
        return Math.min(
                touch * StrictMath.cbrt(Math.sqrt(mass * mass * mass / (radius * radius))),
                swing * Math.sqrt(Math.sqrt(mass * mass / (radius * radius * radius))));
    }
}
