// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.validation;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Set;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.wall.BoxInside;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/**
 * Free cooling of a gas of smooth inelastic spheres, T = T0 / (1 + t/tau)^2 with tau = sqrt(pi) d / (4 (1 - e^2) phi chi
 * sqrt(T0)), chi = (1 - phi/2) / (1 - phi)^3. Haff, Grain flow as a fluid-mechanical phenomenon, 1983; dissipation after Lun,
 * Savage, Jeffrey and Chepurniy, Kinetic theories for granular flow, 1984; chi after Carnahan and Starling, Equation of
 * state for nonattracting rigid spheres, 1969 (all from memory; the closed form was confirmed by an independent stochastic
 * calculation of collisions).
 *
 * <p>The theory is for an endless gas; here the walls of a box throw grains back without loss. A grain nearer to a wall than
 * its diameter is hit from fewer sides, which in a thin gas acts as if the room of the centres were wider by half a
 * diameter: the box is given the side L for which phi = N pi d^3 / 6 / (L - d/2)^3. What is left is of the order phi d / L,
 * and a contact that lasts for 1 to 2 % of the time between collisions adds as much: 5 % on tau.
 */
@Tag("slow")
@Tag("reference")
class CoolingGasTest {

    private static final int GRAINS = 4000;
    private static final int SEEDS = 3;
    private static final double DIAMETER = 1e-3;
    private static final double TEMPERATURE = 0.01; // <v^2>/3, m2/s2

    @ParameterizedTest
    @CsvSource({"0.05, 0.9, 1.13719, 0.410164", "0.1, 0.95, 1.30316, 0.34875"})
    void temperatureFallsAsHaffSays(double fraction, double restitution, double chi, double expected) {
        assertThat((1 - 0.5 * fraction) / Math.pow(1 - fraction, 3)).isCloseTo(chi, within(1e-5));
        double tau = Math.sqrt(Math.PI)
                * DIAMETER
                / (4 * (1 - restitution * restitution) * fraction * chi * Math.sqrt(TEMPERATURE));
        assertThat(tau).isCloseTo(expected, within(1e-5));
        double[] measured = new double[SEEDS];
        for (int seed = 0; seed < SEEDS; seed++) {
            measured[seed] = cooling(fraction, restitution, tau, seed) / tau;
        }
        Spread spread = Spread.of(measured);
        spread.print("tau over Haff's at phi " + fraction + ", e " + restitution);
        assertThat(spread.mean()).as("%s", spread).isCloseTo(1, within(0.05));
        assertThat(spread.deviation()).isLessThan(0.02);
    }

    /** Cooling time, s, from the straight line of 1/sqrt(T) over two times tau. */
    private static double cooling(double fraction, double restitution, double tau, long seed) {
        double volume = GRAINS * Math.PI / 6 * DIAMETER * DIAMETER * DIAMETER / fraction;
        Rig rig = gas(restitution, Math.cbrt(volume) + 0.5 * DIAMETER, seed);
        StraightLine line = new StraightLine();
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = rig.start(team);
            double next = 0;
            while (run.time() < 2 * tau) {
                run.step();
                if (run.time() >= next) {
                    next += 0.02 * tau;
                    line.add(run.time(), Math.sqrt(TEMPERATURE / temperature(rig)));
                }
            }
        }
        return line.start() / line.slope();
    }

    private static Rig gas(double restitution, double side, long seed) {
        Rig rig = new Rig()
                .material(new Material("ball", 2500, 2e7, 0.3), restitution, 0, 0)
                .material(new Material("lossless", 2500, 2e7, 0.3), 1, 0, 0)
                .without(Stage.TANGENTIAL)
                .without(Stage.ROLLING)
                .margin(0.5 * DIAMETER)
                .reportEvery(1000);
        rig.wall(new Wall("room", 1, new BoxInside(side, side, side, Set.of()), Placement.world(), new Still()));
        double room = side - DIAMETER;
        double low = -0.5 * room;
        ScatteredSpheres places =
                new ScatteredSpheres(new double[] {low, low, low}, new double[] {room, room, room}, DIAMETER, seed);
        for (double[] velocity : velocities(seed + 100)) {
            rig.grain(0, 0.5 * DIAMETER, places.next(), velocity, new double[3]);
        }
        return rig;
    }

    /** Normally distributed velocities of mean zero and exactly the temperature wanted, m/s. */
    private static double[][] velocities(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        double[][] all = new double[GRAINS][3];
        double squared = 0;
        for (int axis = 0; axis < 3; axis++) {
            double sum = 0;
            for (double[] v : all) {
                v[axis] = random.nextGaussian();
                sum += v[axis];
            }
            for (double[] v : all) {
                v[axis] -= sum / GRAINS;
                squared += v[axis] * v[axis];
            }
        }
        double scale = Math.sqrt(3 * TEMPERATURE * GRAINS / squared);
        for (double[] v : all) {
            for (int axis = 0; axis < 3; axis++) {
                v[axis] *= scale;
            }
        }
        return all;
    }

    private static double temperature(Rig rig) {
        double[] rows = rig.grains().rows();
        double squared = 0;
        for (int g = 0; g < rig.grains().count(); g++) {
            int at = GrainRow.at(g) + GrainRow.V;
            squared += rows[at] * rows[at] + rows[at + 1] * rows[at + 1] + rows[at + 2] * rows[at + 2];
        }
        return squared / (3 * rig.grains().count());
    }
}
