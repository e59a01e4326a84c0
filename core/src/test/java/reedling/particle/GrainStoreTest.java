// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class GrainStoreTest {

    private static final int COUNT = 20_000;
    private static final long SEED = 71;

    private static GrainStore filled() {
        GrainStore grains = new GrainStore();
        for (int g = 0; g < COUNT; g++) {
            grains.add(g, 2.0 * g, 3.0 * g, 1e-3 + 1e-9 * g, 1000, g % 3, g % 2);
            grains.velocity(g, 4.0 * g, 0, 0);
            grains.spin(g, 0, 5.0 * g, 0);
        }
        return grains;
    }

    private static void assertWhole(GrainStore grains, String when) {
        for (int g = 0; g < grains.count(); g++) {
            long id = grains.id()[g];
            int at = GrainRow.at(g);
            assertThat(grains.position(g, 0)).as("x of grain %d %s", id, when).isEqualTo(id);
            assertThat(grains.position(g, 2)).as("z of grain %d %s", id, when).isEqualTo(3.0 * id);
            assertThat(grains.rows()[at + GrainRow.V]).as("velocity %s", when).isEqualTo(4.0 * id);
            assertThat(grains.rows()[at + GrainRow.W + 1]).as("spin %s", when).isEqualTo(5.0 * id);
            assertThat(grains.material()[g]).as("material %s", when).isEqualTo((int) (id % 3));
            assertThat(grains.lot()[g]).as("lot %s", when).isEqualTo((int) (id % 2));
        }
    }

    /** Permutations near the identity, as a sort after a small motion gives, until the compiler has had its say. */
    @Test
    void reorderMovesEveryGrainWhole() {
        GrainStore grains = filled();
        SplittableRandom random = new SplittableRandom(SEED);
        for (int round = 0; round < 40; round++) {
            int[] order = IntStream.range(0, COUNT).toArray();
            for (int k = 0; k < COUNT / 3; k++) {
                int i = random.nextInt(COUNT);
                int j = Math.min(COUNT - 1, i + random.nextInt(200));
                int kept = order[i];
                order[i] = order[j];
                order[j] = kept;
            }
            grains.reorder(order, COUNT);
            if (round % 13 == 0) {
                assertWhole(grains, "in round " + round + ", seed " + SEED);
            }
        }
        assertWhole(grains, "at the end, seed " + SEED);
    }

    @Test
    void reorderDropsTheLast() {
        GrainStore grains = filled();
        int[] order = IntStream.range(0, COUNT).map(k -> COUNT - 1 - k).toArray();
        grains.reorder(order, 100);
        assertThat(grains.count()).isEqualTo(100);
        assertThat(grains.id()[0]).isEqualTo(COUNT - 1);
        assertWhole(grains, "after dropping");
    }
}
