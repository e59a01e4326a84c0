// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import java.util.List;
import reedling.error.RangeCheck;
import reedling.material.MaterialTable;
import reedling.particle.Lot;

/**
 * Several lots mixed by mass.
 *
 * <p>The next grain comes from the lot that is furthest behind its share of the mass drawn so far, so that every
 * stretch of a feed holds the shares to within a grain or two; sizes inside a lot are random.
 * <p>Formula: deficit of lot i = s_i sum_k m_k - m_i, s_i share, m_i mass drawn (kg); ties go to the earlier lot.
 * <p>Errors: no lot; a material number outside the table. Threads: immutable.
 */
public final class LotMix {

    private static final double SPHERE = Math.PI / 6;

    private final List<LotShare> lots;
    private final double[] share;
    private final double[] density;

    public LotMix(List<LotShare> lots, MaterialTable materials) {
        new RangeCheck("mix")
                .require(!lots.isEmpty(), "lots", "none", "at least one lot", "")
                .finish();
        this.lots = List.copyOf(lots);
        int known = materials.materials().size();
        RangeCheck check = new RangeCheck("mix");
        double sum = 0;
        for (LotShare each : lots) {
            int material = each.lot().material();
            String what = "material number of " + each.lot().name();
            check.require(material < known, what, material, "", "less than " + known);
            sum += each.massPart();
        }
        check.finish();
        share = new double[lots.size()];
        density = new double[lots.size()];
        for (int k = 0; k < share.length; k++) {
            share[k] = lots.get(k).massPart() / sum;
            density[k] = materials.materials().get(lot(k).material()).density();
        }
    }

    public int size() {
        return share.length;
    }

    public Lot lot(int number) {
        return lots.get(number).lot();
    }

    /** Share by mass of a lot, 0 to 1. */
    public double share(int number) {
        return share[number];
    }

    /** Mass of a grain, kg. */
    public double grainMass(int number, double radius) {
        return density[number] * SPHERE * 8 * radius * radius * radius;
    }

    /** Mean mass of the grains of the mix, by number, kg: 1 / sum of s_i / (density_i pi/6 mean d_i^3). */
    public double meanGrainMass() {
        double grainsPerMass = 0;
        for (int k = 0; k < share.length; k++) {
            grainsPerMass += share[k] / meanGrainMass(k);
        }
        return 1 / grainsPerMass;
    }

    /** Mean part of the grains of the mix that come from a lot, by number, 0 to 1. */
    public double numberShare(int number) {
        return share[number] * meanGrainMass() / meanGrainMass(number);
    }

    /** Mean mass of the grains of a lot, by number, kg. */
    public double meanGrainMass(int number) {
        return density[number] * SPHERE * lot(number).sizes().meanCube();
    }

    /** Largest radius that may be drawn, m. */
    public double largestRadius() {
        double largest = 0;
        for (LotShare each : lots) {
            largest = Math.max(largest, 0.5 * each.lot().sizes().largest());
        }
        return largest;
    }

    /** The lot of the next grain, given the mass (kg) drawn so far from each. */
    int neediest(double[] drawnMass) {
        double total = 0;
        for (double mass : drawnMass) {
            total += mass;
        }
        int best = 0;
        double largest = Double.NEGATIVE_INFINITY;
        for (int k = 0; k < share.length; k++) {
            double deficit = share[k] * total - drawnMass[k];
            if (deficit > largest) {
                largest = deficit;
                best = k;
            }
        }
        return best;
    }
}
