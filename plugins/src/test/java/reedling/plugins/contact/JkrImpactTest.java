// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugin.ParameterValues;
import reedling.plugins.Rig;
import reedling.run.Simulation;

/** Head-on impacts of two adhesive, otherwise elastic grains. */
class JkrImpactTest {

    private static final double WORK = 0.05; // J/m2
    private static final double RADIUS = 2e-3; // m, so that R* = 1 mm
    private static final double DENSITY = 2e-6 / (4.0 / 3 * Math.PI * RADIUS * RADIUS * RADIUS); // m* = 1 mg
    private static final double MODULUS = 2e7; // Pa, so that E* = 10 MPa

    /** Speed below which grains stick, m/s: v_s = sqrt(2 W_0 / m*), W_0 = 1.03689e-10 J. */
    private static final double STICKING = 0.0144006;

    private static final double APART = 2e-5; // m

    /**
     * What became of an impact.
     *
     * @param speed of separation, m/s; 0 where the grains stick
     * @param lost energy that left the motion, J, by the ledger
     * @param residual of the ledger, J
     */
    private record Outcome(double speed, double lost, double residual) {}

    private static Outcome impact(double speed, double gap, int stepsPerContact) {
        JkrProvider jkr = new JkrProvider();
        Rig rig = new Rig()
                .material(new Material("sticky", DENSITY, MODULUS, 0), 1, 0.5, 0.02)
                .law(Stage.NORMAL, jkr.create(ParameterValues.of(jkr, Map.of("work_of_adhesion", WORK))))
                .stepsPerContact(stepsPerContact)
                .margin(1e-4);
        double[] still = {0, 0, 0};
        long one = rig.grain(0, RADIUS, new double[] {-RADIUS - gap, 0, 0}, new double[] {speed, 0, 0}, still);
        long two = rig.grain(0, RADIUS, new double[] {RADIUS, 0, 0}, still, still);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 0.02) {
                run.step();
                double separation = rig.centre(two)[0] - rig.centre(one)[0] - 2 * RADIUS;
                double leaving = rig.velocity(two)[0] - rig.velocity(one)[0];
                if (separation > APART && leaving > 0) {
                    run.step();
                    return new Outcome(
                            leaving, run.ledger().dissipated(), run.ledger().residual());
                }
            }
            return new Outcome(0, run.ledger().dissipated(), run.ledger().residual());
        }
    }

    /** Energy balance; the number as in JkrLawTest. Thornton and Ning 1998 have the same speed (from memory). */
    @ParameterizedTest
    @Tag("reference")
    @ValueSource(doubles = {0.3, 0.8, 0.95})
    void slowGrainsStick(double share) {
        assertThat(impact(share * STICKING, 1e-6, 200).speed).isZero();
    }

    /** 1 % of the speed; next to the sticking speed that is 0.2 % of the energy, so 200 steps a contact. */
    @ParameterizedTest
    @Tag("reference")
    @ValueSource(doubles = {1.05, 1.2, 2, 10})
    void fasterGrainsLoseTheEnergyOfTheTear(double share) {
        double speed = share * STICKING;
        double expected = Math.sqrt(speed * speed - STICKING * STICKING);
        assertThat(impact(speed, 1e-6, 200).speed).isCloseTo(expected, within(0.01 * expected));
    }

    /** Mean over starts and largest error of the restitution at the usual step, 0.553 near sticking. */
    @Test
    void restitutionNearStickingIsRightAtTheUsualStep() {
        double speed = 1.2 * STICKING;
        double expected = Math.sqrt(1 - 1 / 1.44);
        double sum = 0;
        double worst = 0;
        for (int k = 0; k < 20; k++) {
            double error = impact(speed, 1e-6 * (1 + k * 0.037), 20).speed / speed - expected;
            sum += error;
            worst = Math.max(worst, Math.abs(error));
        }
        assertThat(sum / 20).isCloseTo(0, within(0.01));
        assertThat(worst).isLessThan(0.02);
    }

    /** The residual falls with the square of the step, 64-fold here; 15 leaves room for where steps fall in the tear. */
    @Test
    @Tag("convergence")
    void ledgerClosesOverTheTear() {
        assertThat(largestResidual(20)).isLessThan(0.02);
        assertThat(largestResidual(160)).isLessThan(largestResidual(20) / 15);
    }

    /** Over several starts, as a part of what the tear takes. */
    private static double largestResidual(int stepsPerContact) {
        double tear = 0.5e-6 * STICKING * STICKING;
        double largest = 0;
        for (int k = 0; k < 16; k++) {
            Outcome one = impact(1.5 * STICKING, 1e-6 * (1 + k * 0.0171), stepsPerContact);
            assertThat(one.lost).isCloseTo(tear, within(1e-3 * tear));
            largest = Math.max(largest, Math.abs(one.residual) / tear);
        }
        return largest;
    }
}
