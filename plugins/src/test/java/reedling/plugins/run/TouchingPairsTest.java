// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.check.OverlapSearch;
import reedling.material.Material;
import reedling.neighbour.Chunk;
import reedling.neighbour.PairSegment;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.plugins.Rig;
import reedling.run.Simulation;

/** Between two searches only candidates that could touch are looked at; all pairs by brute force must agree with that. */
class TouchingPairsTest {

    private static final double MODULUS = 1e9;
    private static final double DENSITY = 2000;

    private record Pair(long low, long high) {}

    private static Rig jet(long seed, double margin) {
        SplittableRandom random = new SplittableRandom(seed);
        Rig rig = new Rig()
                .material(new Material("grain", DENSITY, MODULUS, 0), 0.7, 0.3, 0.02)
                .margin(margin);
        for (int k = 0; k < 343; k++) {
            double[] centre = {k % 7 * 0.005, k / 7 % 7 * 0.005, k / 49 * 0.005};
            double speed = k % 40 == 0 ? 8 : 0.2; // few fast grains among slow ones
            double[] velocity = {
                random.nextDouble(-speed, speed), random.nextDouble(-speed, speed), random.nextDouble(-speed, speed)
            };
            rig.grain(0, random.nextDouble(0.001, 0.002), centre, velocity, new double[3]);
        }
        return rig;
    }

    private static Pair pair(GrainStore grains, int i, int j) {
        long a = grains.id()[i];
        long b = grains.id()[j];
        return new Pair(Math.min(a, b), Math.max(a, b));
    }

    private static Set<Pair> overlapping(GrainStore grains) {
        Set<Pair> pairs = new HashSet<>();
        for (int i = 0; i < grains.count(); i++) {
            for (int j = 0; j < i; j++) {
                if (OverlapSearch.relativeOverlap(grains.rows(), i, j) > 1e-12) {
                    pairs.add(pair(grains, i, j));
                }
            }
        }
        return pairs;
    }

    private static Set<Pair> active(Simulation run) {
        GrainStore grains = run.model().grains();
        Set<Pair> pairs = new HashSet<>();
        for (Chunk chunk : run.interactions().lists().chunks()) {
            for (PairSegment segment : chunk.segments()) {
                for (int row = 0; row < segment.activeCount(); row++) {
                    assertThat(pairs.add(pair(grains, segment.first()[row], segment.second()[row])))
                            .isTrue();
                }
            }
        }
        return pairs;
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-4, 2e-3})
    void everyTouchingPairIsActive(double margin) {
        for (long seed = 1; seed <= 2; seed++) {
            Rig rig = jet(seed, margin);
            try (WorkerTeam team = new WorkerTeam(1)) {
                Simulation run = rig.start(team);
                int seen = 0;
                while (run.stepCount() < 400) {
                    Set<Pair> touching = overlapping(rig.grains());
                    run.step();
                    seen += touching.size();
                    assertThat(active(run))
                            .as("seed %d, step %d", seed, run.stepCount())
                            .containsAll(touching);
                }
                assertThat(seen).isGreaterThan(150);
            }
        }
    }

    /** No step that creates an overlap is longer than t_c / N of the impact that begins with it. */
    @Test
    void noStepRunsIntoAContactThatIsTooShortForIt() {
        Rig rig = jet(3, 1e-3);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            int begun = 0;
            Set<Pair> before = overlapping(rig.grains());
            while (run.stepCount() < 1200) {
                run.step();
                Set<Pair> now = overlapping(rig.grains());
                for (Pair pair : now) {
                    if (!before.contains(pair)) {
                        begun++;
                        // 2 %: the rule saw the closing speed a step earlier, before other contacts changed it
                        assertThat(run.pastStep()).isLessThan(1.02 * duration(rig, pair) / 20);
                    }
                }
                before = now;
            }
            assertThat(begun).isGreaterThan(50);
        }
    }

    private static double duration(Rig rig, Pair pair) {
        List<Integer> bodies = new ArrayList<>(List.of(rig.row(pair.low), rig.row(pair.high)));
        double[] rows = rig.grains().rows();
        int a = GrainRow.at(bodies.get(0));
        int b = GrainRow.at(bodies.get(1));
        double closing = 0;
        double distance = 0;
        for (int axis = 0; axis < 3; axis++) {
            double across = rows[b + axis] - rows[a + axis];
            closing += across * (rows[a + GrainRow.V + axis] - rows[b + GrainRow.V + axis]);
            distance += across * across;
        }
        double speed = closing / Math.sqrt(distance);
        double mass = 1 / (rows[a + GrainRow.INVERSE_MASS] + rows[b + GrainRow.INVERSE_MASS]);
        double ra = rows[a + GrainRow.RADIUS];
        double rb = rows[b + GrainRow.RADIUS];
        double radius = ra * rb / (ra + rb);
        double modulus = 0.5 * MODULUS;
        return 2.868266 * Math.pow(mass * mass / (radius * modulus * modulus * speed), 0.2);
    }
}
