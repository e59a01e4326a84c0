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
import reedling.contact.ContactLaw;
import reedling.contact.Stage;
import reedling.error.ReedlingException;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugin.ParameterValues;
import reedling.plugins.Rig;

/**
 * Both ends of a damped Hertz contact, for the impact of the restitution sweep of Y. C. Chung and J. Y. Ooi, Benchmark
 * tests for verifying discrete element modelling codes at particle impact level, 2011 (test 3, as remembered): a sphere of
 * aluminium oxide on a rigid plane.
 *
 * <p>The numbers come from the map to a linear oscillator, u = d^(5/4) with dt scaled by d^(1/4):
 * u'' + sqrt(5) zeta u' + 5/4 u = 0 (Antypov and Elliott, On an analytical solution for the damped Hertzian
 * spring, 2011), zeta = L / sqrt(L^2 + pi^2), L = -ln e. Where the same dashpot ends at zero force, restitution is e_F.
 */
@Tag("reference")
class EndOfContactTest {

    private static final Material ALUMINA = new Material("alumina", 4000, 3.8e11, 0.23);
    private static final double RADIUS = 0.0025;

    private static ContactLaw hertz(double pulls) {
        HertzProvider provider = new HertzProvider();
        return provider.create(ParameterValues.of(provider, Map.of("dashpot_pulls", pulls)));
    }

    private record Bounce(double restitution, Impact.Seen seen) {}

    private static Bounce bounce(double restitution, double speed, double pulls, int stepsPerContact) {
        Rig rig = new Rig()
                .material(ALUMINA, restitution, 0.3, 0)
                .material(Impact.RIGID, restitution, 0.3, 0)
                .law(Stage.NORMAL, hertz(pulls))
                .stepsPerContact(stepsPerContact);
        Impact impact = Impact.onPlane(rig, RADIUS, new double[] {speed, 0, 0}, Impact.REST, 1e-6 * speed);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Impact.Seen seen = impact.run(team);
            return new Bounce(-rig.velocity(impact.first())[0] / speed, seen);
        }
    }

    /** 1e-3 on restitution and 0.3 % on the rest: what 500 steps leave of touch and peak between two steps. */
    @ParameterizedTest
    @CsvSource({
        "1, 8.0888e-06, 615.35, 6.1045e-06",
        "0.9, 7.762e-06, 579.52, 6.1721e-06",
        "0.8, 7.428e-06, 546.06, 6.2554e-06",
        "0.6, 6.7337e-06, 488.03, 6.4952e-06",
        "0.4, 5.9905e-06, 448.02, 6.9237e-06",
        "0.2, 5.159e-06, 447.57, 7.9108e-06"
    })
    void pullingDashpotGivesTheClosedFormImpact(double restitution, double overlap, double force, double duration) {
        Bounce bounce = bounce(restitution, 3.9, 1, 500);
        assertThat(bounce.restitution).isCloseTo(restitution, within(1e-3));
        assertThat(bounce.seen.overlap()).isCloseTo(overlap, within(3e-3 * overlap));
        assertThat(bounce.seen.force()).isCloseTo(force, within(3e-3 * force));
        assertThat(bounce.seen.duration()).isCloseTo(duration, within(3e-3 * duration));
    }

    /** The printed overlaps and forces were integrated with another method; the clipped end, calibrated for it. */
    @ParameterizedTest
    @CsvSource({
        "0.9, 7.755e-06, 578.8",
        "0.8, 7.398e-06, 543.2",
        "0.6, 6.594e-06, 478.5",
        "0.4, 5.607e-06, 440.2",
        "0.2, 4.249e-06, 536.7"
    })
    void clippedForceGivesTheAskedRestitutionToo(double restitution, double overlap, double force) {
        Bounce bounce = bounce(restitution, 3.9, 0, 500);
        assertThat(bounce.restitution).isCloseTo(restitution, within(1e-3));
        assertThat(bounce.seen.overlap()).isCloseTo(overlap, within(3e-3 * overlap));
        assertThat(bounce.seen.force()).isCloseTo(force, within(3e-3 * force));
    }

    /** The dashpot calibrated for pulling, clipped: six printed digits. */
    @ParameterizedTest
    @CsvSource({
        "0.9, 0.0335184, 0.902026",
        "0.8, 0.0708503, 0.808099",
        "0.6, 0.160493, 0.632291",
        "0.4, 0.279998, 0.472014",
        "0.2, 0.45595, 0.324863"
    })
    void clippingADashpotMadeForPullingRaisesRestitution(double asked, double zeta, double clipped) {
        double ratio = Restitution.dampingRatio(asked, true);
        assertThat(ratio).isCloseTo(zeta, within(1e-6));
        assertThat(Restitution.of(ratio)).isCloseTo(clipped, within(1e-6));
        assertThat(Restitution.of(Restitution.dampingRatio(asked, false))).isCloseTo(asked, within(1e-12));
    }

    /** Scaling of the equation of motion; 1e-4: the steps are scaled with it, up to a rung of the step ladder. */
    @ParameterizedTest
    @CsvSource({"0", "1"})
    void restitutionDoesNotDependOnSpeed(double pulls) {
        for (double speed : new double[] {0.01, 0.1, 1, 10}) {
            assertThat(bounce(0.6, speed, pulls, 500).restitution).isCloseTo(0.6, within(1e-4));
        }
    }

    /**
     * A sphere that slides all the time is rubbed only while it is pressed: until zero force the normal impulse is that of
     * the clipped contact, m v (1 + e_F), in all m v (1 + e). 0.2 %: what 500 steps leave.
     */
    @ParameterizedTest
    @CsvSource({"0.8, 0.808099", "0.4, 0.472014", "0.2, 0.324863"})
    void pullingDashpotDoesNotRub(double restitution, double clipped) {
        double friction = 0.05;
        Rig rig = new Rig()
                .material(ALUMINA, restitution, friction, 0)
                .material(Impact.RIGID, restitution, friction, 0)
                .law(Stage.NORMAL, hertz(1))
                .stepsPerContact(500);
        Impact impact = Impact.onPlane(rig, RADIUS, new double[] {1, 3, 0}, Impact.REST, 1e-6);
        try (WorkerTeam team = new WorkerTeam(1)) {
            impact.run(team);
        }
        double[] v = rig.velocity(impact.first());
        double ratio = (3 - v[1]) / (friction * (1 - v[0]));
        double expected = (1 + clipped) / (1 + restitution);
        assertThat(ratio).isCloseTo(expected, within(2e-3 * expected));
    }

    /** From 40 to 320 steps second order gives 1/64; where the touch falls between two steps scatters, so 1/8 is asked. */
    @Test
    @Tag("convergence")
    void restitutionErrorFallsWithTheStep() {
        double coarse = Math.abs(worst(40));
        double fine = Math.abs(worst(320));
        assertThat(coarse).isLessThan(5e-3);
        assertThat(fine).isLessThan(coarse / 8);
    }

    private static double worst(int stepsPerContact) {
        double largest = 0;
        for (double speed : new double[] {1, 1.3, 1.7, 2.2, 2.9}) {
            largest = Math.max(largest, Math.abs(bounce(0.5, speed, 1, stepsPerContact).restitution - 0.5));
        }
        return largest;
    }

    @Test
    void choiceIsZeroOrOne() {
        assertThatThrownBy(() -> hertz(0.5))
                .isInstanceOf(ReedlingException.class)
                .hasMessageContaining("dashpot_pulls")
                .hasMessageContaining("0.5");
    }
}
