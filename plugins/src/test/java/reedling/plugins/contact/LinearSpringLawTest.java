// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.contact.Column;
import reedling.contact.ContactKernel;
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
 * Impacts on the linear spring against the linear oscillator (textbook): with w = sqrt(k/m), zeta the damping ratio and
 * s = sqrt(1 - zeta^2), a contact whose dashpot may pull lasts pi / (w s), reaches the overlap
 * v/w exp(-zeta/s acos zeta) and leaves with e = exp(-pi zeta / s). Where the force is clipped, it ends at the time
 * acos(2 zeta^2 - 1) / (w s), and e = exp(-2 zeta/s acos zeta) (T. Schwager and T. Poeschel, 2007, from memory).
 */
@Tag("reference")
class LinearSpringLawTest {

    private static final Material GRAIN = new Material("grain", 2500, 1e8, 0.3);
    private static final double RADIUS = 0.005;
    private static final double MASS = 2500 * 4.0 / 3 * Math.PI * RADIUS * RADIUS * RADIUS;
    private static final double STIFFNESS = 2e4;

    private static ContactLaw law(Map<String, Double> given) {
        LinearSpringProvider provider = new LinearSpringProvider();
        return provider.create(ParameterValues.of(provider, given));
    }

    private record Bounce(double restitution, Impact.Seen seen) {}

    private static Bounce bounce(ContactLaw law, double restitution, double speed, int stepsPerContact) {
        Rig rig = new Rig()
                .material(GRAIN, restitution, 0, 0)
                .material(Impact.RIGID, restitution, 0, 0)
                .law(Stage.NORMAL, law)
                .stepsPerContact(stepsPerContact);
        Impact impact = Impact.onPlane(rig, RADIUS, new double[] {speed, 0, 0}, Impact.REST, 1e-5 * speed);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Impact.Seen seen = impact.run(team);
            return new Bounce(-rig.velocity(impact.first())[0] / speed, seen);
        }
    }

    /** 2e-3 on all numbers: the dashpot starts with full force between two of 2000 steps. */
    @ParameterizedTest
    @ValueSource(doubles = {0.9, 0.7, 0.5, 0.3, 0.1})
    void pullingDashpotGivesTheDampedOscillator(double restitution) {
        ContactLaw law = law(Map.of("stiffness", STIFFNESS, "dashpot_pulls", 1.0));
        double loss = -Math.log(restitution);
        double zeta = loss / Math.sqrt(loss * loss + Math.PI * Math.PI);
        double root = Math.sqrt(1 - zeta * zeta);
        double frequency = Math.sqrt(STIFFNESS / MASS);
        for (double speed : new double[] {0.1, 2}) {
            Bounce bounce = bounce(law, restitution, speed, 2000);
            assertThat(bounce.restitution).isCloseTo(restitution, within(2e-3 * restitution));
            double overlap = speed / frequency * Math.exp(-zeta / root * Math.acos(zeta));
            assertThat(bounce.seen.overlap()).isCloseTo(overlap, within(2e-3 * overlap));
            double duration = Math.PI / (frequency * root);
            assertThat(bounce.seen.duration()).isCloseTo(duration, within(2e-3 * duration));
        }
    }

    /** After the force has ended the sphere still has to leave the overlap at its final speed: part of the duration. */
    @ParameterizedTest
    @ValueSource(doubles = {0.9, 0.7, 0.5, 0.3})
    void clippedForceGivesTheAskedRestitutionAndOneDuration(double restitution) {
        ContactLaw law = law(Map.of("stiffness", STIFFNESS));
        double zeta = Restitution.dampingRatio(restitution, false);
        double root = Math.sqrt(1 - zeta * zeta);
        double frequency = Math.sqrt(STIFFNESS / MASS);
        double pushed = Math.acos(2 * zeta * zeta - 1) / root; // w times the time of positive force
        double left = Math.exp(-zeta * pushed) * Math.sin(root * pushed) / root; // overlap then, over v/w
        double duration = (pushed + left / restitution) / frequency;
        for (double speed : new double[] {0.1, 2}) {
            Bounce bounce = bounce(law, restitution, speed, 2000);
            assertThat(bounce.restitution).isCloseTo(restitution, within(2e-3 * restitution));
            assertThat(bounce.seen.duration()).isCloseTo(duration, within(2e-3 * duration));
        }
    }

    /** Over 11 speeds, so over many places of the touch between two steps; first order asks for 1/8, half of it is given. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 1})
    @Tag("convergence")
    void restitutionErrorFallsWithTheStep(double pulls) {
        double coarse = worst(pulls, 20);
        double fine = worst(pulls, 160);
        assertThat(coarse).isLessThan(0.02);
        assertThat(fine).isLessThan(coarse / 4);
    }

    private static double worst(double pulls, int stepsPerContact) {
        ContactLaw law = law(Map.of("stiffness", STIFFNESS, "dashpot_pulls", pulls));
        double largest = 0;
        for (double speed = 1; speed < 2.05; speed += 0.1) {
            largest = Math.max(largest, Math.abs(bounce(law, 0.5, speed, stepsPerContact).restitution - 0.5));
        }
        return largest;
    }

    /** The reference impact itself: undamped peak overlap q R*, duration pi q R* / v. 1e-4: peak between two steps. */
    @ParameterizedTest
    @CsvSource({"1, 0.01", "4, 0.02"})
    void referenceImpactReachesTheReferenceOverlap(double speed, double fraction) {
        ContactLaw law = law(Map.of("reference_speed", speed, "reference_overlap", fraction));
        Bounce bounce = bounce(law, 1, speed, 500);
        assertThat(bounce.seen.overlap()).isCloseTo(fraction * RADIUS, within(1e-4 * fraction * RADIUS));
        double duration = Math.PI * fraction * RADIUS / speed;
        assertThat(bounce.seen.duration()).isCloseTo(duration, within(1e-4 * duration));
        assertThat(bounce.restitution).isCloseTo(1, within(1e-5));
    }

    /** What the step control asks for: pi sqrt(m/k), at any speed. */
    @Test
    void durationDoesNotDependOnSpeed() {
        MaterialPair pair = new MaterialPair(GRAIN, GRAIN, 0.5, 0, 0);
        var kernel = law(Map.of("stiffness", STIFFNESS)).bind(pair, ContactKind.GRAIN_GRAIN, 1);
        double expected = Math.PI * Math.sqrt(MASS / STIFFNESS);
        assertThat(kernel.duration(0.01, RADIUS, MASS)).isCloseTo(expected, within(1e-12 * expected));
        assertThat(kernel.duration(10, RADIUS, MASS)).isCloseTo(expected, within(1e-12 * expected));
        assertThat(kernel.dampingRatio()).isEqualTo(Restitution.dampingRatio(0.5, false));
    }

    /** The stiffest row limits the step: a row with a gap, such as one that only fills a tile, must not be it. */
    @Test
    void rowsApartHaveNoStiffness() {
        MaterialPair pair = new MaterialPair(GRAIN, GRAIN, 0.5, 0.3, 0);
        ContactKernel normal = law(Map.of()).bind(pair, ContactKind.GRAIN_GRAIN, 1);
        ContactKernel friction = new MindlinLaw(StretchRule.PASSIVE).bind(pair, ContactKind.GRAIN_GRAIN, 1);
        RowTile tile = new RowTile(4)
                .set(Column.EFFECTIVE_RADIUS, 1e-30)
                .set(Column.OVERLAP, -1e-3)
                .set(Column.TOUCH, 0);
        assertThat(tile.apply(normal, 0)).isZero();
        tile.apply(friction, 0);
        assertThat(tile.get(Column.STIFFNESS)).isBetween(0.0, 1e-9);
        assertThat(tile.get(Column.SLIDING_STIFFNESS)).isBetween(0.0, 1e-9);
        assertThat(tile.get(Column.ELASTIC_FORCE)).isZero();
        assertThat(tile.get(Column.CONTACT_RADIUS)).isPositive();
        assertThat(tile.duration()).isInfinite();
    }

    /** Oblique and lossy, with the tangential spring of the Mindlin ratio: what is left over falls with the step. */
    @Test
    @Tag("convergence")
    void ledgerClosesWithTheStep() {
        assertThat(residual(160)).isLessThan(residual(20) / 4);
        assertThat(residual(20)).isLessThan(0.02);
    }

    private static double residual(int stepsPerContact) {
        Rig rig = new Rig()
                .material(GRAIN, 0.5, 0.4, 0)
                .material(Impact.RIGID, 0.5, 0.4, 0)
                .law(Stage.NORMAL, law(Map.of("stiffness", STIFFNESS)))
                .stepsPerContact(stepsPerContact);
        Impact impact = Impact.onPlane(rig, RADIUS, new double[] {1, 0.7, 0}, Impact.REST, 1e-5);
        double before = 0.5 * MASS * (1 + 0.49);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 0.003) {
                run.step();
            }
            assertThat(rig.velocity(impact.first())[0]).isNegative();
            return Math.abs(run.ledger().residual()) / before;
        }
    }

    @Test
    void faultsOfTheParametersAreAllReported() {
        assertThatThrownBy(() -> law(Map.of("stiffness", 1e4, "reference_speed", 2.0, "dashpot_pulls", 0.5)))
                .isInstanceOf(ReedlingException.class)
                .hasMessageContaining("stiffness")
                .hasMessageContaining("10000.0 N/m")
                .hasMessageContaining("dashpot_pulls");
    }
}
