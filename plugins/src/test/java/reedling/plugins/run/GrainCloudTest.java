// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Momentum;
import reedling.plugins.Rig;
import reedling.run.Simulation;

/** Free clouds of colliding, spinning grains of two materials: nothing but themselves to push against. */
class GrainCloudTest {

    private static final int SIDE = 8; // 512 grains: more than three chunks, so many pairs reach across chunks

    /** Grains of two sizes near the points of a lattice, flying and spinning at random. */
    static Rig cloud(long seed, double restitution) {
        SplittableRandom random = new SplittableRandom(seed);
        Rig rig = new Rig()
                .material(new Material("soft", 1500, 5e6, 0.3), restitution, 0.5, 0.05)
                .material(new Material("hard", 2500, 2e7, 0.2), restitution, 0.3, 0.02)
                .margin(5e-4);
        for (int k = 0; k < SIDE * SIDE * SIDE; k++) {
            double[] centre = {k % SIDE * 0.0042, k / SIDE % SIDE * 0.0042, k / (SIDE * SIDE) * 0.0042};
            double[] velocity = new double[3];
            double[] spin = new double[3];
            for (int axis = 0; axis < 3; axis++) {
                centre[axis] += random.nextDouble(-1e-4, 1e-4);
                velocity[axis] = random.nextDouble(-1, 1);
                spin[axis] = random.nextDouble(-300, 300);
            }
            rig.grain(k & 1, random.nextDouble(0.001, 0.002), centre, velocity, spin);
        }
        return rig;
    }

    /** Pairs push and turn each other with opposite rows, so what is left is round-off: 1e-12 of the sum of magnitudes. */
    @ParameterizedTest
    @Tag("conservation")
    @ValueSource(longs = {1, 20_260_701})
    void momentumAndAngularMomentumStay(long seed) {
        Rig rig = cloud(seed, 0.6);
        Momentum before = Momentum.of(rig.grains());
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = rig.start(team);
            while (run.stepCount() < 1500) {
                run.step();
            }
            assertThat(run.interactions().lists().chunks().size()).isGreaterThan(2);
            assertThat(run.searches()).isGreaterThan(3);
            assertThat(run.ledger().dissipated()).isPositive();
            assertThat(Momentum.of(rig.grains()).largestChange(before))
                    .as("seed %d", seed)
                    .isLessThan(1e-12);
        }
    }

    /**
     * Residual of the energy balance over the throughput at N steps a contact, summed over four clouds, and its fall by
     * four when N doubles. Four within a band: collisions scatter chaotically, so each run meets other impacts, and a dashpot
     * that starts as the fourth root of the overlap leaves a small part of lower order.
     */
    @ParameterizedTest
    @Tag("convergence")
    @ValueSource(doubles = {0.3, 0.7})
    void ledgerGapFallsByFourWhenStepsDouble(double restitution) {
        double[] gap = new double[3];
        for (int k = 0; k < 3; k++) {
            int number = 15 << k;
            for (long seed = 7; seed < 11; seed++) {
                double one = residual(seed, restitution, number);
                assertThat(Math.abs(one)).as("seed %d", seed).isLessThan(2.0 / (number * number));
                gap[k] += one;
            }
        }
        assertThat(gap[0] / gap[1]).isBetween(2.8, 5.5);
        assertThat(gap[1] / gap[2]).isBetween(2.8, 5.5);
    }

    private static double residual(long seed, double restitution, int stepsPerContact) {
        Rig rig = cloud(seed, restitution).stepsPerContact(stepsPerContact).reportEvery(10);
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = rig.start(team);
            while (run.time() < 3e-3 || run.stepCount() % 10 != 1) {
                run.step();
            }
            return run.ledger().relativeResidual();
        }
    }

    /** Friction and rolling resistance alone, no dashpot: what they took never comes back. */
    @ParameterizedTest
    @Tag("conservation")
    @ValueSource(longs = {1, 2})
    void dissipationNeverFalls(long seed) {
        Rig rig = cloud(seed, 1).stepsPerContact(40);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            double before = 0;
            double fallen = 0;
            while (run.time() < 4e-3) {
                run.step();
                double now = run.ledger().dissipated();
                fallen += Math.max(0, before - now);
                before = now;
            }
            assertThat(before).isGreaterThan(0.05 * run.ledger().throughput());
            assertThat(fallen).isLessThan(1e-9 * before);
        }
    }
}
