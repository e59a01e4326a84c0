// SPDX-License-Identifier: Apache-2.0
package reedling.neighbour;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.HashMap;
import java.util.Map;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import reedling.material.MaterialTable;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/** The lists against a search of all pairs by brute force, on random states. */
class NeighbourListsTest {

    private static final double MARGIN = 0.3;

    /** How grains are spread. */
    enum Spread {
        DENSE(4),
        POLYDISPERSE(6),
        DILUTE(3000),
        PLANE(12),
        LINE(200),
        ONE_CELL(0.2);

        private final double width;

        Spread(double width) {
            this.width = width;
        }

        void fill(GrainStore grains, int count, SplittableRandom random) {
            for (int k = 0; k < count; k++) {
                double z = this == PLANE || this == LINE ? 1 : random.nextDouble(-width, width);
                double y = this == LINE ? -2 : random.nextDouble(-width, width);
                double radius = this == POLYDISPERSE ? Math.exp(random.nextDouble(-4, 0)) : random.nextDouble(0.2, 0.4);
                grains.add(random.nextDouble(-width, width), y, z, radius, 1000, random.nextInt(3), 0);
            }
        }
    }

    private record Pair(long low, long high) {

        static Pair of(long a, long b) {
            return new Pair(Math.min(a, b), Math.max(a, b));
        }
    }

    private static Map<Pair, Double> byBruteForce(GrainStore grains) {
        Map<Pair, Double> pairs = new HashMap<>();
        for (int i = 0; i < grains.count(); i++) {
            for (int j = 0; j < i; j++) {
                double gap = gap(grains, i, j);
                if (gap < MARGIN) {
                    pairs.put(Pair.of(grains.id()[i], grains.id()[j]), gap);
                }
            }
        }
        return pairs;
    }

    private static double gap(GrainStore grains, int i, int j) {
        double squared = 0;
        for (int axis = 0; axis < 3; axis++) {
            double across = grains.position(i, axis) - grains.position(j, axis);
            squared += across * across;
        }
        return Math.sqrt(squared) - grains.radius(i) - grains.radius(j);
    }

    /** All listed pairs with what each list must promise: places, materials, gaps, links. */
    private static Map<Pair, Double> listed(NeighbourLists lists, GrainStore grains) {
        Map<Pair, Double> pairs = new HashMap<>();
        int next = 0;
        int linked = 0;
        int across = 0;
        for (Chunk chunk : lists.chunks()) {
            assertThat(chunk.from()).isEqualTo(next);
            next = chunk.to();
            PairSegment[] segments = chunk.segments();
            for (int s = 0; s < segments.length; s++) {
                PairSegment segment = segments[s];
                for (int k = 0; k < segment.activeCount(); k++) {
                    put(pairs, chunk, s, segment.first()[k], segment.second()[k], grains, true);
                }
                for (int k = 0; k < segment.candidateCount(); k++) {
                    int i = segment.candidateFirst()[k];
                    int j = segment.candidateSecond()[k];
                    put(pairs, chunk, s, i, j, grains, false);
                    double least = segment.blockGap()[k / PairSegment.CANDIDATE_BLOCK];
                    assertThat(least).as("gap of a block").isLessThanOrEqualTo(gap(grains, i, j));
                }
                for (int k = segment.activeCount(); k < segment.paddedCount(); k++) {
                    assertThat(segment.first()[k]).isEqualTo(grains.ghost());
                    assertThat(segment.second()[k]).isEqualTo(grains.ghost() + 1);
                }
                across += segment.cross() ? segment.activeCount() : 0;
            }
            for (CrossLink link : chunk.incoming()) {
                for (int r = 0; r < link.count(); r++) {
                    int second = link.segment().second()[link.rows()[r]];
                    assertThat(second).isBetween(chunk.from(), chunk.to() - 1);
                    linked++;
                }
            }
        }
        assertThat(next).isEqualTo(grains.count());
        assertThat(linked).as("rows exported to other chunks").isEqualTo(across);
        return pairs;
    }

    private static void put(
            Map<Pair, Double> pairs, Chunk chunk, int s, int i, int j, GrainStore grains, boolean active) {
        assertThat(i).isBetween(chunk.from(), chunk.to() - 1).isLessThan(j);
        assertThat(s / 2).isEqualTo(MaterialTable.pairIndex(grains.material()[i], grains.material()[j]));
        assertThat(s % 2 == 1).isEqualTo(j >= chunk.to());
        double gap = gap(grains, i, j);
        if (!active) {
            assertThat(gap).isGreaterThan(-1e-12);
        }
        assertThat(pairs.put(Pair.of(grains.id()[i], grains.id()[j]), gap))
                .as("listed twice")
                .isNull();
    }

    private static NeighbourLists lists() {
        return new NeighbourLists(3, new boolean[] {false, true, false});
    }

    private static void assertComplete(NeighbourLists lists, GrainStore grains) {
        Map<Pair, Double> expected = byBruteForce(grains);
        Map<Pair, Double> found = listed(lists, grains);
        assertThat(found.keySet()).isEqualTo(expected.keySet());
    }

    @ParameterizedTest
    @EnumSource(Spread.class)
    void everyNearPairIsListedOnce(Spread spread) {
        try (WorkerTeam team = new WorkerTeam(2)) {
            for (long seed = 1; seed <= 4; seed++) {
                SplittableRandom random = new SplittableRandom(seed);
                for (int count : new int[] {0, 1, 2, 159, 700}) {
                    GrainStore grains = new GrainStore();
                    spread.fill(grains, spread == Spread.ONE_CELL ? count / 4 : count, random);
                    NeighbourLists lists = lists();
                    lists.search(grains, MARGIN, new boolean[0], team);
                    try {
                        assertComplete(lists, grains);
                    } catch (AssertionError wrong) {
                        throw new AssertionError(spread + ", " + count + " grains, seed " + seed, wrong);
                    }
                }
            }
        }
    }

    /** History a test gives a row: a number of the pair, signed for a vector by which id comes first. */
    private static double mark(long first, long second) {
        double size = 1 + Math.min(first, second) + 1e-4 * Math.max(first, second);
        return first < second ? size : -size;
    }

    private static void markAll(NeighbourLists lists, GrainStore grains) {
        for (Chunk chunk : lists.chunks()) {
            for (PairSegment segment : chunk.segments()) {
                for (int k = 0; k < segment.activeCount(); k++) {
                    double mark = mark(grains.id()[segment.first()[k]], grains.id()[segment.second()[k]]);
                    int tile = k & -8;
                    int at = segment.historyAt(tile) + k - tile;
                    segment.history()[at] = 1;
                    segment.history()[at + 8] = mark;
                    segment.history()[at + 16] = Math.abs(mark);
                    int ledger = PairSegment.ledgerAt(tile) + k - tile;
                    segment.ledgerHistory()[ledger] = (float) Math.abs(mark);
                    segment.ledgerHistory()[ledger + 8 * 3] = (float) mark;
                }
            }
        }
    }

    private static int assertMarks(NeighbourLists lists, GrainStore grains) {
        int rows = 0;
        for (Chunk chunk : lists.chunks()) {
            for (PairSegment segment : chunk.segments()) {
                for (int k = 0; k < segment.activeCount(); k++) {
                    double mark = mark(grains.id()[segment.first()[k]], grains.id()[segment.second()[k]]);
                    int tile = k & -8;
                    int at = segment.historyAt(tile) + k - tile;
                    if (segment.history()[at] > 0) {
                        rows++;
                        assertThat(segment.history()[at + 8]).isEqualTo(mark);
                        assertThat(segment.history()[at + 16]).isEqualTo(Math.abs(mark));
                        int ledger = PairSegment.ledgerAt(tile) + k - tile;
                        assertThat(segment.ledgerHistory()[ledger]).isEqualTo((float) Math.abs(mark));
                        assertThat(segment.ledgerHistory()[ledger + 8 * 3]).isEqualTo((float) mark);
                    }
                }
            }
        }
        return rows;
    }

    private static void jostle(GrainStore grains, SplittableRandom random) {
        for (int g = 0; g < grains.count(); g++) {
            int at = GrainRow.at(g);
            for (int axis = 0; axis < 3; axis++) {
                grains.rows()[at + axis] += random.nextDouble(-0.02, 0.02);
            }
        }
    }

    /** Vectors turn their sign when the two grains of a pair change places in memory; all living rows are found again. */
    @Test
    void historyFollowsItsPairOverSearches() {
        try (WorkerTeam team = new WorkerTeam(2)) {
            for (long seed = 1; seed <= 3; seed++) {
                SplittableRandom random = new SplittableRandom(seed);
                GrainStore grains = new GrainStore();
                Spread.DENSE.fill(grains, 600, random);
                NeighbourLists lists = lists();
                lists.search(grains, MARGIN, new boolean[0], team);
                markAll(lists, grains);
                int living = assertMarks(lists, grains);
                assertThat(living).isGreaterThan(100);
                for (int round = 0; round < 5; round++) {
                    jostle(grains, random);
                    lists.search(grains, MARGIN, new boolean[0], team);
                    assertThat(assertMarks(lists, grains))
                            .as("seed %d, round %d", seed, round)
                            .isEqualTo(living);
                    assertComplete(lists, grains);
                }
            }
        }
    }

    @Test
    void removedGrainsLeaveWithTheirPairs() {
        try (WorkerTeam team = new WorkerTeam(2)) {
            SplittableRandom random = new SplittableRandom(5);
            GrainStore grains = new GrainStore();
            Spread.POLYDISPERSE.fill(grains, 800, random);
            NeighbourLists lists = lists();
            lists.search(grains, MARGIN, new boolean[0], team);
            assertThat(rowsThatStay(lists, new boolean[800])).isGreaterThan(50);
            while (grains.count() > 0) {
                markAll(lists, grains);
                boolean[] removed = new boolean[grains.count()];
                int leaving = 0;
                for (int g = 0; g < removed.length; g++) {
                    removed[g] = random.nextInt(3) == 0 || removed.length < 5;
                    leaving += removed[g] ? 1 : 0;
                }
                int before = grains.count();
                int staying = rowsThatStay(lists, removed);
                lists.search(grains, MARGIN, removed, team);
                assertThat(grains.count()).isEqualTo(before - leaving);
                assertThat(assertMarks(lists, grains)).isEqualTo(staying);
                assertComplete(lists, grains);
            }
        }
    }

    private static int rowsThatStay(NeighbourLists lists, boolean[] removed) {
        int rows = 0;
        for (Chunk chunk : lists.chunks()) {
            for (PairSegment segment : chunk.segments()) {
                for (int k = 0; k < segment.activeCount(); k++) {
                    rows += removed[segment.first()[k]] || removed[segment.second()[k]] ? 0 : 1;
                }
            }
        }
        return rows;
    }

    /** Rows, materials and ids move together when grains are sorted. */
    @Test
    void grainsKeepWhatIsTheirs() {
        try (WorkerTeam team = new WorkerTeam(1)) {
            SplittableRandom random = new SplittableRandom(9);
            GrainStore grains = new GrainStore();
            for (int k = 0; k < 500; k++) {
                double x = random.nextDouble(-5, 5);
                grains.add(x, random.nextDouble(-5, 5), random.nextDouble(-5, 5), 0.1 + 1e-3 * k, 1000, k % 3, k % 7);
            }
            lists().search(grains, MARGIN, new boolean[0], team);
            for (int g = 0; g < 500; g++) {
                long id = grains.id()[g];
                assertThat(grains.radius(g)).isCloseTo(0.1 + 1e-3 * id, within(1e-15));
                assertThat(grains.material()[g]).isEqualTo((int) (id % 3));
                assertThat(grains.lot()[g]).isEqualTo((int) (id % 7));
            }
        }
    }
}
