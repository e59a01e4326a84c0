// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.HashMap;
import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import reedling.contact.Column;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.contact.Stage;
import reedling.error.ReedlingException;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.parallel.WorkerTeam;
import reedling.plugin.ParameterValues;
import reedling.plugins.Rig;
import reedling.run.Simulation;

/**
 * Two particles in the well against the textbook: minimum at 2^(1/6) s, stiffness 72 e / (2^(1/3) s^2), escape speed
 * sqrt(2 e / m_r), largest pull 2.39643 e / s at (26/7)^(1/6) s. 0.1 %, as the numbers below have six digits and the
 * cut-off at 20 s takes some 1e-6 of the depth.
 */
class LennardJonesLawTest {

    private static final double CUTOFF = 20; // times s

    private enum Pair {
        ARGON(1.65e-21, 3.405e-10, 6.63e-26, 3.82198e-10, 0.813278, 1.26853e-12, 315.512, 1.16127e-11, 4.23737e-10),
        DUST(1e-9, 1e-4, 1e-8, 0.000112246, 5.71464, 0.000185853, 0.632456, 2.39643e-05, 0.000124446);

        final double depth;
        final double zero;
        final double mass;
        final double rest;
        final double stiffness;
        final double period;
        final double escape;
        final double pull;
        final double pullDistance;

        Pair(
                double depth,
                double zero,
                double mass,
                double rest,
                double stiffness,
                double period,
                double escape,
                double pull,
                double pullDistance) {
            this.depth = depth;
            this.zero = zero;
            this.mass = mass;
            this.rest = rest;
            this.stiffness = stiffness;
            this.period = period;
            this.escape = escape;
            this.pull = pull;
            this.pullDistance = pullDistance;
        }

        /** Small enough that the bodies themselves never touch. */
        double radius() {
            return 0.05 * zero;
        }

        ContactLaw law() {
            return near(Map.of(
                    "depth", depth, "zero_distance", zero, "contact_distance", 2 * radius(), "cutoff", CUTOFF * zero));
        }

        /** The law's kernel alone; its overlap is {@code 2 radius - distance}. */
        OneRow row() {
            return new OneRow(law().bind(pair(), ContactKind.GRAIN_GRAIN, 1), 0.5 * radius(), 0.5 * mass);
        }

        /** Two particles at a distance, m, moving apart at a relative speed, m/s. */
        Rig rig(double distance, double speed) {
            double volume = 4.0 / 3 * Math.PI * radius() * radius() * radius();
            Rig rig = new Rig()
                    .material(new Material("particle", mass / volume, 1e9, 0), 1, 0, 0)
                    .law(Stage.NEAR_FIELD, law())
                    .margin(zero)
                    .maximumStep(period / 100)
                    .stepsPerContact(100);
            double[] still = {0, 0, 0};
            rig.grain(0, radius(), new double[] {-0.5 * distance, 0, 0}, new double[] {-0.5 * speed, 0, 0}, still);
            rig.grain(0, radius(), new double[] {0.5 * distance, 0, 0}, new double[] {0.5 * speed, 0, 0}, still);
            return rig;
        }
    }

    private static MaterialPair pair() {
        Material any = new Material("any", 1000, 1e7, 0.3);
        return new MaterialPair(any, any, 1, 0, 0);
    }

    static ContactLaw near(Map<String, Double> values) {
        LennardJonesProvider provider = new LennardJonesProvider();
        return provider.create(ParameterValues.of(provider, values));
    }

    private static double distance(Rig rig) {
        return Math.abs(
                rig.centre(rig.grains().id()[0])[0] - rig.centre(rig.grains().id()[1])[0]);
    }

    @ParameterizedTest
    @Tag("reference")
    @EnumSource
    void wellHasItsPlaceDepthAndStiffness(Pair pair) {
        OneRow row = pair.row();
        double touch = 2 * pair.radius();
        assertThat(row.to(touch - pair.rest)).isCloseTo(0, within(1e-3 * pair.pull));
        assertThat(row.get(Column.STORED_ENERGY)).isCloseTo(-pair.depth, within(1e-3 * pair.depth));
        assertThat(row.get(Column.STIFFNESS)).isCloseTo(pair.stiffness, within(1e-3 * pair.stiffness));
        assertThat(row.to(touch - pair.pullDistance)).isCloseTo(-pair.pull, within(1e-3 * pair.pull));
        assertThat(row.get(Column.ADHESIVE_LOAD)).isCloseTo(pair.pull, within(1e-3 * pair.pull));
    }

    @ParameterizedTest
    @EnumSource
    void forceIsTheSlopeOfTheStoredEnergyAndEndsAtTheCutoff(Pair pair) {
        OneRow row = pair.row();
        double touch = 2 * pair.radius();
        for (double x = 0.2; x < 25; x *= 1.1) {
            double h = 1e-5 * x * pair.zero;
            row.to(touch - x * pair.zero + h);
            double nearer = row.get(Column.STORED_ENERGY);
            row.to(touch - x * pair.zero - h);
            double slope = (nearer - row.get(Column.STORED_ENERGY)) / (2 * h);
            double force = row.to(touch - x * pair.zero);
            assertThat(force).isCloseTo(slope, within(1e-5 * (Math.abs(force) + pair.pull)));
            assertThat(x > CUTOFF).isEqualTo(force == 0);
        }
    }

    /** 0.5 %: small swings of 1e-3 of the distance, 100 steps a period. */
    @ParameterizedTest
    @Tag("reference")
    @EnumSource
    void smallSwingsHaveTheirPeriod(Pair pair) {
        Rig rig = pair.rig(pair.rest * (1 + 1e-3), 0);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            double before = distance(rig) - pair.rest;
            double first = Double.NaN;
            double last = Double.NaN;
            int crossings = 0;
            while (crossings < 21) {
                run.step();
                double now = distance(rig) - pair.rest;
                if (before > 0 != now > 0) {
                    last = run.time() - run.pastStep() * now / (now - before);
                    first = crossings++ == 0 ? last : first;
                }
                before = now;
            }
            assertThat((last - first) / 10).isCloseTo(pair.period, within(5e-3 * pair.period));
        }
    }

    @ParameterizedTest
    @Tag("reference")
    @EnumSource
    void onlyFasterParticlesEscape(Pair pair) {
        assertThat(farthest(pair, 1.005)).isGreaterThan(CUTOFF * pair.zero);
        assertThat(farthest(pair, 0.995)).isLessThan(4 * pair.zero);
    }

    private static double farthest(Pair pair, double share) {
        Rig rig = pair.rig(pair.rest, share * pair.escape);
        double largest = 0;
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            double before = 0;
            double now = distance(rig);
            while (now > before && now < 1.1 * CUTOFF * pair.zero) {
                run.step();
                before = now;
                now = distance(rig);
                largest = Math.max(largest, now);
            }
            assertThat(Math.abs(run.ledger().residual())).isLessThan(2e-3 * pair.depth);
        }
        return largest;
    }

    /** 1/2 m* v^2 = K q^2 (1/r - 1/r_0), textbook; the force is shifted by 1e-4 of its value at the start. */
    @Test
    @Tag("reference")
    void chargesTurnBackWhereTheirEnergyIsSpent() {
        double radius = 1e-3;
        ContactLaw charges = near(Map.of(
                "depth", 0.0, "zero_distance", 1e-3, "contact_distance", 2 * radius, "cutoff", 10.0, "charge", 1e-9));
        double density = 1e-6 / (4.0 / 3 * Math.PI * radius * radius * radius);
        Rig rig = new Rig()
                .material(new Material("particle", density, 1e7, 0), 1, 0, 0)
                .law(Stage.NEAR_FIELD, charges)
                .maximumStep(1e-4);
        double[] still = {0, 0, 0};
        rig.grain(0, radius, new double[] {-0.05, 0, 0}, new double[] {0.5, 0, 0}, still);
        rig.grain(0, radius, new double[] {0.05, 0, 0}, new double[] {-0.5, 0, 0}, still);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            double nearest = distance(rig);
            while (run.time() < 0.2) {
                run.step();
                nearest = Math.min(nearest, distance(rig));
            }
            assertThat(nearest).isCloseTo(0.0264437, within(1e-3 * 0.0264437));
        }
    }

    @Test
    void screenedChargeStoresItsWork() {
        Map<String, Double> values = new HashMap<>(
                Map.of("depth", 0.0, "zero_distance", 1e-4, "contact_distance", 2e-3, "cutoff", 0.02, "charge", 1e-9));
        values.put("screening_length", 1e-3);
        OneRow row = new OneRow(near(values).bind(pair(), ContactKind.GRAIN_GRAIN, 1), 1e-3, 1e-6);
        row.to(-1e-3 + 1e-8);
        double nearer = row.get(Column.STORED_ENERGY);
        row.to(-1e-3 - 1e-8);
        double slope = (nearer - row.get(Column.STORED_ENERGY)) / 2e-8;
        double bare = 8.9875517923e9 * 1e-18 * Math.exp(-3) / 3e-3;
        assertThat(row.to(-1e-3)).isCloseTo(slope, within(1e-6 * slope));
        assertThat(row.to(-1e-3)).isCloseTo(bare * (1 / 3e-3 + 1 / 1e-3), within(1e-5 * slope));
    }

    @Test
    void cutoffInsideTheContactIsRefused() {
        assertThatThrownBy(() ->
                        near(Map.of("depth", 1e-9, "zero_distance", 1e-4, "contact_distance", 2e-3, "cutoff", 1e-3)))
                .isInstanceOf(ReedlingException.class)
                .hasMessageContaining("more than contact_distance");
    }
}
