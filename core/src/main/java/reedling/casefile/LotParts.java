// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.List;
import reedling.material.MaterialTable;
import reedling.particle.Lot;
import reedling.particle.NormalSize;
import reedling.particle.SingleSize;
import reedling.particle.SizeDistribution;
import reedling.particle.UniformSize;

/** Lots of a case, in the order of the file. */
final class LotParts {

    private LotParts() {}

    static List<Lot> lots(CaseSpecification specification, MaterialTable table, PartFaults faults) {
        List<Lot> lots = new ArrayList<>();
        specification
                .lots()
                .forEach((name, lot) ->
                        faults.make("lots." + name, () -> lot(lot, table)).ifPresent(lots::add));
        return lots;
    }

    private static Lot lot(LotSpecification lot, MaterialTable table) {
        return new Lot(lot.name(), table.indexOf(lot.material()), sizes(lot.diameter()));
    }

    private static SizeDistribution sizes(DiameterSpecification diameter) {
        return switch (diameter) {
            case DiameterSpecification.Single single -> new SingleSize(single.diameter());
            case DiameterSpecification.Uniform uniform -> new UniformSize(uniform.smallest(), uniform.largest());
            case DiameterSpecification.TruncatedNormal normal ->
                new NormalSize(normal.mean(), normal.deviation(), normal.smallest(), normal.largest());
            case DiameterSpecification.Graded graded -> graded.sizes();
        };
    }

    /** Number of a lot in a list. */
    static int number(List<Lot> lots, String name) {
        for (int k = 0; k < lots.size(); k++) {
            if (lots.get(k).name().equals(name)) {
                return k;
            }
        }
        throw new IllegalArgumentException("no lot named " + name);
    }
}
