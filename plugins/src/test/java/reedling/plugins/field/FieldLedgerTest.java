// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import java.util.Set;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import reedling.field.Field;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.wall.BoxInside;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/** Work of fields without potential in the energy balance. */
class FieldLedgerTest {

    private static final double[] START = {3, -1, 2};
    private static final double[] SPIN = {50, 400, -200};

    private static final Field WIND = FreeFlight.gas(
            Map.of("vortex_spin", 40.0, "velocity_z", 6.0, "swing", 0.5, "swing_frequency", 30.0, "gravity_z", -9.81),
            Map.of("flow", "vortex", "lift", "rubinow-keller", "spin_damping", "stokes"));

    private static final Field MAGNETIC = FreeFlight.charged(Map.of("magnetic_x", 3.0, "charge_per_mass", 2.0));

    /** Alone, the work of a motion force closes the balance to rounding, at any step. */
    @Test
    @Tag("conservation")
    void balanceOfAFreeGrainClosesToRounding() {
        Field wind = FreeFlight.gas(
                Map.of("vortex_spin", 40.0, "velocity_z", 6.0, "swing", 0.5, "swing_frequency", 30.0),
                Map.of("flow", "vortex", "lift", "rubinow-keller", "spin_damping", "stokes"));
        for (double step : new double[] {1e-3, 7e-3}) {
            try (FreeFlight flight = new FreeFlight(1e-3, 300, step, START, SPIN, wind, MAGNETIC).until(0.7)) {
                assertThat(Math.abs(flight.run().ledger().fieldWork())).isGreaterThan(1e-6);
                assertThat(Math.abs(flight.run().ledger().relativeResidual())).isLessThan(1e-12);
            }
        }
    }

    /** With weight beside it a gap of m h^2 g a / 8 comes and goes with the acceleration a: of second order, not growing. */
    @Test
    @Tag("convergence")
    void gapBesideAPotentialIsOfSecondOrder() {
        double[] gap = new double[2];
        for (int k = 0; k < 2; k++) {
            try (FreeFlight flight = new FreeFlight(
                            1e-3, 300, 4e-3 / (1 << k), START, SPIN, FreeFlight.gravity(0, 0, -9.81), WIND)
                    .until(0.6)) {
                gap[k] = Math.abs(flight.run().ledger().relativeResidual());
            }
        }
        assertThat(gap[0]).isLessThan(1e-7);
        assertThat(gap[0] / gap[1]).isBetween(3.0, 5.0);
    }

    /** Drag brings a fall to its end: at terminal speed the gas takes m g v each second. */
    @Test
    @Tag("reference")
    void gasTakesWhatWeightGivesAtTerminalSpeed() {
        Field gas = FreeFlight.gas(Map.of("viscosity", 0.1), Map.of("drag", "stokes"));
        double mass = 1000 * 4.0 / 3 * Math.PI * 1e-9;
        double speed = mass * 9.81 / (6 * Math.PI * 0.1 * 1e-3);
        try (FreeFlight flight = new FreeFlight(
                        1e-3, 1000, 1e-4, new double[3], new double[3], FreeFlight.gravity(0, 0, -9.81), gas)
                .until(0.5)) {
            double before = flight.run().ledger().fieldWork();
            double from = flight.time();
            flight.until(1);
            double power = (flight.run().ledger().fieldWork() - before) / (flight.time() - from);
            assertThat(power).isCloseTo(-mass * 9.81 * speed, within(1e-9 * mass * 9.81 * speed));
        }
    }

    private static double residual(int number, int threads) {
        SplittableRandom random = new SplittableRandom(3);
        Rig rig = new Rig()
                .material(new Material("seed", 1200, 1e7, 0.3), 0.7, 0.5, 0.05)
                .gravity(0, 0, -9.81)
                .field(WIND)
                .field(MAGNETIC)
                .wall(new Wall(
                        "box",
                        0,
                        new BoxInside(0.04, 0.04, 0.04, Set.of(BoxInside.Face.HIGH_Z)),
                        Placement.world(),
                        new Still()))
                .stepsPerContact(number)
                .reportEvery(5);
        for (int k = 0; k < 216; k++) {
            double[] centre = {
                (k % 6 - 2.5) * 0.0065 + random.nextDouble(-2e-4, 2e-4),
                (k / 6 % 6 - 2.5) * 0.0065 + random.nextDouble(-2e-4, 2e-4),
                k / 36 * 0.0065 - 0.016
            };
            rig.grain(0, random.nextDouble(0.0025, 0.003), centre, new double[3], new double[3]);
        }
        try (WorkerTeam team = new WorkerTeam(threads)) {
            Simulation run = rig.start(team);
            while (run.time() < 0.15 || run.stepCount() % 5 != 1) {
                run.step();
            }
            assertThat(Math.abs(run.ledger().fieldWork()))
                    .isGreaterThan(0.01 * run.ledger().throughput());
            return run.ledger().relativeResidual();
        }
    }

    /** A bed that settles in a gusty vortex and a magnetic field: the gap is that of the contacts, C / N^2 with C about 1. */
    @Test
    @Tag("convergence")
    void gapOfABedInAWindFallsByFourWhenStepsDouble() {
        double[] gap = new double[3];
        for (int k = 0; k < 3; k++) {
            int number = 10 << k;
            gap[k] = residual(number, 2);
            assertThat(Math.abs(gap[k])).isLessThan(2.0 / (number * number));
        }
        assertThat(gap[0] / gap[1]).isBetween(2.5, 6.5);
        assertThat(gap[1] / gap[2]).isBetween(2.5, 6.5);
    }

    @Test
    @Tag("conservation")
    void threadsDoNotChangeTheBooks() {
        assertThat(residual(12, 3)).isEqualTo(residual(12, 1));
    }
}
