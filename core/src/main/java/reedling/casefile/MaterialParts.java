// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.material.MaterialTable;

/** Material table of a case, in the order of the file. */
final class MaterialParts {

    private MaterialParts() {}

    static MaterialTable table(CaseSpecification specification) {
        List<Material> materials = new ArrayList<>(specification.materials().values());
        List<MaterialPair> pairs = new ArrayList<>();
        for (int a = 0; a < materials.size(); a++) {
            for (int b = 0; b <= a; b++) {
                Material first = materials.get(a);
                Material second = materials.get(b);
                pairs.add(written(specification, first, second).orElseGet(() -> neverTouching(first, second)));
            }
        }
        return new MaterialTable(materials, pairs);
    }

    private static Optional<MaterialPair> written(CaseSpecification specification, Material a, Material b) {
        return specification.pairs().stream()
                .filter(pair -> pair.first().equals(a) && pair.second().equals(b)
                        || pair.first().equals(b) && pair.second().equals(a))
                .findFirst();
    }

    /** The table wants a pair for every two materials; these two belong to parts that no contact joins. */
    private static MaterialPair neverTouching(Material a, Material b) {
        return new MaterialPair(a, b, 1, 0, 0);
    }
}
