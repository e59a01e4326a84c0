// SPDX-License-Identifier: Apache-2.0
package reedling.material;

import java.util.List;

/**
 * All materials of a case and the pair for every two of them; immutable.
 *
 * @param materials index in this list is the material number stored with each grain
 * @param pairs row-major triangle: pair of materials a >= b stands at a (a + 1) / 2 + b
 */
public record MaterialTable(List<Material> materials, List<MaterialPair> pairs) {

    public MaterialTable {
        materials = List.copyOf(materials);
        pairs = List.copyOf(pairs);
        if (pairs.size() != materials.size() * (materials.size() + 1) / 2) {
            throw new IllegalArgumentException("one pair for every two materials is needed, got " + pairs.size());
        }
    }

    /** Number of the pair of two material numbers, whatever their order. */
    public static int pairIndex(int a, int b) {
        return a >= b ? a * (a + 1) / 2 + b : b * (b + 1) / 2 + a;
    }

    public MaterialPair pair(int a, int b) {
        return pairs.get(pairIndex(a, b));
    }

    public int indexOf(String name) {
        for (int k = 0; k < materials.size(); k++) {
            if (materials.get(k).name().equals(name)) {
                return k;
            }
        }
        throw new IllegalArgumentException("no material named " + name);
    }
}
