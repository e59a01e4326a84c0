// SPDX-License-Identifier: Apache-2.0
package bridge.moisture;

import java.util.List;
import java.util.Locale;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.contact.HistoryColumn;
import reedling.material.MaterialPair;

/**
 * Attraction by a bridge of liquid of fixed volume, added to the elastic force of the normal law. The bridge forms where
 * the bodies touch and holds across the gap until it breaks.
 *
 * <pre>
 * F = 4 pi R* g cos t (1 - s / sqrt(s^2 + V / (pi R*)))    N, s gap; without the bracket where the bodies overlap
 * s_c = (1 + t/2) V^(1/3)                                   m, the gap at which the bridge breaks
 * lost there: F_0 (s_c + b - sqrt(s_c^2 + b^2)),  F_0 = 4 pi R* g cos t,  b = sqrt(V / (pi R*))      J
 * </pre>
 *
 * <p>Where: g surface tension (N/m); t contact angle (rad), the same on both bodies; V liquid volume of one bridge (m3),
 * the same for all of a contact kind; R* effective radius R1 R2 / (R1 + R2) (m). The published force is that of two equal
 * spheres of radius R, 2 pi R g cos t (1 - s / sqrt(s^2 + 2 V / (pi R))), here in the algebraic form without its thickness
 * d; other bodies count as equal spheres of R = 2 R* (Derjaguin's approximation). A flat wall thus has R* = R of the grain,
 * 4 pi R g cos t; at a wire R* is the engine's effective radius of the crossing. Surface tension along the edge of the
 * liquid, of order sqrt(b/R) of F, and viscosity are left out; so are the weight and the supply of liquid: a bridge that
 * breaks is there again at the next touch.
 *
 * <p>Energy: U is 0 where the bodies touch; what a new bridge sets free is flow of the liquid and no part of U. What is in
 * the bridge at s_c is booked as lost when it breaks. Limits of friction, rolling and twisting come from F_n + F, the
 * elastic pressure in the contact, 0 across a gap. A step that holds a jump of the force gets the force whose impulse is
 * that of the jump inside the step.
 *
 * <p>Shapes: a block; history 1 double: wet (0 or 1). Valid for: V below about 1 % of R^3, capillary pressure above weight,
 * slow against the liquid. Stable step: from {@link BridgePace}. Source: Rabinovich, Esayanur and Moudgil, Capillary forces
 * between two spheres with a fixed volume liquid bridge: theory and experiment, 2005; rupture: Lian, Thornton and Adams, A
 * theoretical study of the liquid bridge forces between two rigid spherical bodies, 1993 (both from memory); energy,
 * impulses and time scale are derived here. Threads: immutable.
 *
 * @param tension g, N/m
 * @param angle t, rad
 * @param volume V between grains, m3
 * @param onWalls volume of a bridge to a wall over that between grains; 0 for none
 * @param onWires volume of a bridge to a wire over that between grains; 0 for none
 */
record LiquidBridgeLaw(double tension, double angle, double volume, double onWalls, double onWires)
        implements ContactLaw {

    private static final double MOST_LIQUID = 0.01; // V / R^3

    @Override
    public List<HistoryColumn> history() {
        return List.of(HistoryColumn.scalar("wet"));
    }

    @Override
    public List<String> cautions(MaterialPair pair, double radius) {
        double share = volume / (8 * radius * radius * radius);
        return share <= MOST_LIQUID
                ? List.of()
                : List.of(String.format(
                        Locale.ROOT,
                        "law liquid-bridge between %s and %s: a bridge holds %.2g of the cube of the radius, above %.2g,"
                                + " so its force is only roughly right; take less liquid.",
                        pair.first().name(),
                        pair.second().name(),
                        share,
                        MOST_LIQUID));
    }

    @Override
    public ContactKernel bind(MaterialPair pair, ContactKind kind, int historyColumn) {
        double share = switch (kind) {
            case GRAIN_GRAIN -> 1;
            case GRAIN_WALL -> onWalls;
            case GRAIN_WIRE -> onWires;
        };
        if (!(share > 0)) {
            return block -> {}; // no liquid: nothing to add and no reach
        }
        Bridge bridge = Bridge.of(tension, angle, share * volume);
        return ContactKernel.inOrder(
                new BridgeForce(bridge, historyColumn), BridgePace.of(bridge, historyColumn, pair.contactModulus()));
    }
}
