// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.function.IntToDoubleFunction;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.math.StepLadder;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;

/**
 * One Hertz impact on a plane with a fixed step by the midpoint rule, through the whole step loop: n steps in the contact,
 * first touch at twenty fractions of a step.
 */
class MidpointImpactTest {

    private static final double RADIUS = 0.005;
    private static final double SPEED = 1;
    private static final double STEP = StepLadder.floor(1e-6);
    private static final int PHASES = 20;

    /** Rebound speed over speed for a first touch at a fraction of a step. */
    private static double rebound(int steps, double fraction, double restitution) {
        double density = 2500;
        double mass = density * 4 / 3 * Math.PI * RADIUS * RADIUS * RADIUS;
        // modulus for which the elastic contact lasts so many steps: t_c = 2.868266 (m^2 / (R E*^2 v))^(1/5)
        double modulus = mass / Math.sqrt(RADIUS * SPEED) * Math.pow(2.868266 / (steps * STEP), 2.5);
        Rig rig = new Rig()
                .material(new Material("ball", density, modulus, 0), restitution, 0, 0)
                .material(Impact.RIGID, restitution, 0, 0)
                .without(Stage.TANGENTIAL)
                .without(Stage.ROLLING)
                .stepsPerContact(2)
                .maximumStep(STEP * (1 + 1e-12))
                .midpoint(0.5, 1e-8);
        double gap = (3 + fraction) * STEP * SPEED;
        Impact impact = Impact.onPlane(rig, RADIUS, new double[] {SPEED, 0, 0}, Impact.REST, gap);
        try (WorkerTeam team = new WorkerTeam(1)) {
            impact.run(team);
        }
        return -rig.velocity(impact.first())[0] / SPEED;
    }

    private static double meanSquare(IntToDoubleFunction error) {
        double sum = 0;
        for (int phase = 0; phase < PHASES; phase++) {
            double one = error.applyAsDouble(phase);
            sum += one * one;
        }
        return Math.sqrt(sum / PHASES);
    }

    private static double elasticError(int steps) {
        return meanSquare(phase -> {
            double speed = rebound(steps, (double) phase / PHASES, 1);
            return speed * speed - 1;
        });
    }

    /** 1 %: the touch lands elsewhere in the step by round-off of positions, and iterations stop at 1e-8. */
    @ParameterizedTest
    @Tag("reference")
    @ValueSource(ints = {5, 10, 20, 40})
    void energyErrorIsThatOfAnIndependentIntegration(int steps) {
        double expected = meanSquare(phase -> MidpointHertz.energyError(steps, (double) phase / PHASES));
        assertThat(elasticError(steps)).isCloseTo(expected, within(0.01 * expected));
    }

    /** Between two and three: the force is not smooth at the touch. */
    @Test
    @Tag("convergence")
    void energyErrorFallsFasterThanTheSquareOfTheStep() {
        double order = Math.log(elasticError(10) / elasticError(80)) / Math.log(8);
        assertThat(order).isBetween(2.0, 3.0);
    }

    /** The scatter that the phase of the touch leaves, twice that of explicit steps at most, which are held to the same. */
    @ParameterizedTest
    @Tag("reference")
    @CsvSource({"0.9, 1e-3", "0.5, 4e-3", "0.1, 4e-3"})
    void restitutionIsTheOneAskedFor(double restitution, double band) {
        double coarse = meanSquare(phase -> rebound(20, (double) phase / PHASES, restitution) - restitution);
        double fine = meanSquare(phase -> rebound(80, (double) phase / PHASES, restitution) - restitution);
        assertThat(coarse).isLessThan(1.5 * band);
        assertThat(fine).isLessThan(coarse / 4);
    }
}
