// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import java.util.List;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.material.MaterialTable;
import reedling.particle.Lot;
import reedling.particle.NormalSize;
import reedling.particle.SingleSize;

/** Mixes shared by the tests of this package. */
final class Mixes {

    static final double VETCH_DENSITY = 1250;
    static final double PEA_DENSITY = 1300;

    private Mixes() {}

    /** One lot of grains of 5 mm and 1250 kg/m3. */
    static LotMix single() {
        return new LotMix(List.of(new LotShare(new Lot("bead", 0, new SingleSize(0.005)), 1)), materials());
    }

    /** Three parts of vetch, seven parts of pea by mass. */
    static LotMix vetchAndPea() {
        Lot vetch = new Lot("vetch", 0, new NormalSize(0.0044, 0.0004, 0.0036, 0.0052));
        Lot pea = new Lot("pea", 1, new NormalSize(0.0062, 0.00045, 0.0050, 0.0076));
        return new LotMix(List.of(new LotShare(vetch, 3), new LotShare(pea, 7)), materials());
    }

    private static MaterialTable materials() {
        Material one = new Material("vetch", VETCH_DENSITY, 5e7, 0.3);
        Material two = new Material("pea", PEA_DENSITY, 5e7, 0.3);
        List<MaterialPair> pairs = List.of(pair(one, one), pair(two, one), pair(two, two));
        return new MaterialTable(List.of(one, two), pairs);
    }

    private static MaterialPair pair(Material first, Material second) {
        return new MaterialPair(first, second, 0.5, 0.3, 0.03);
    }
}
