// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.math.StepLadder;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;

/**
 * Error of one elastic Hertz impact with a fixed step, through the whole step loop: n steps in the contact, first touch at
 * twenty fractions of a step. The reference values were computed independently with velocity Verlet in numbers without
 * unit; the error does not depend on material or speed.
 */
class SteppedImpactTest {

    private static final double RADIUS = 0.005;
    private static final double SPEED = 1;
    private static final double STEP = StepLadder.floor(1e-6);
    private static final int PHASES = 20;

    /** Relative error of the rebound speed for a first touch at a fraction of a step. */
    private static double reboundError(int steps, double fraction) {
        double density = 2500;
        double mass = density * 4 / 3 * Math.PI * RADIUS * RADIUS * RADIUS;
        // modulus for which the contact lasts so many steps: t_c = 2.868266 (m^2 / (R E*^2 v))^(1/5)
        double modulus = mass / Math.sqrt(RADIUS * SPEED) * Math.pow(2.868266 / (steps * STEP), 2.5);
        Rig rig = new Rig()
                .material(new Material("elastic", density, modulus, 0), 1, 0, 0)
                .material(Impact.RIGID, 1, 0, 0)
                .without(Stage.TANGENTIAL)
                .without(Stage.ROLLING)
                .stepsPerContact(2)
                .maximumStep(STEP * (1 + 1e-12));
        double gap = (3 + fraction) * STEP * SPEED;
        Impact impact = Impact.onPlane(rig, RADIUS, new double[] {SPEED, 0, 0}, Impact.REST, gap);
        try (WorkerTeam team = new WorkerTeam(1)) {
            impact.run(team);
        }
        return -rig.velocity(impact.first())[0] / SPEED - 1;
    }

    private static double worst(int steps) {
        double largest = 0;
        for (int phase = 0; phase < PHASES; phase++) {
            largest = Math.max(largest, Math.abs(reboundError(steps, (double) phase / PHASES)));
        }
        return largest;
    }

    /** Within 1.5 times the largest error of the independent experiment, in percent. */
    @ParameterizedTest
    @Tag("reference")
    @CsvSource({
        "10, 0.261",
        "15, 0.0893",
        "20, 0.0424",
        "30, 0.0150",
        "40, 0.00723",
        "60, 0.00259",
        "80, 0.00125",
        "160, 0.00022"
    })
    void errorOfReboundStaysInItsBand(int steps, double percent) {
        assertThat(worst(steps)).isBetween(0.5 * percent / 100, 1.5 * percent / 100);
    }

    /** Worst case about 2.5: the force is not smooth at the touch, so it lies between second and fourth order. */
    @Test
    @Tag("convergence")
    void errorFallsFasterThanTheSquareOfTheStep() {
        double order = Math.log(worst(10) / worst(160)) / Math.log(16);
        assertThat(order).isBetween(2.0, 3.6);
    }
}
