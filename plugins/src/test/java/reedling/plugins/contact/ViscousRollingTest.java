// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.joml.Vector3d;
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
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/**
 * A sphere rolls on a plane without slip against the moment M = tau R F_n w. About the point of contact, where friction and
 * normal force have no lever, 7/5 m R^2 w' = -tau R m g w, so w = w0 exp(-t/T) with T = 7 R / (5 tau g), and the way is
 * R w0 T (1 - exp(-t/T)). On a slope the spin tends to g sin T / (7/5 R) = tan / tau.
 */
@Tag("reference")
class ViscousRollingTest {

    private static final double RADIUS = 0.01;
    private static final double G = 9.81;
    private static final Material GRAIN = new Material("grain", 2500, 1e8, 0.3);
    private static final double MASS = 2500 * 4.0 / 3 * Math.PI * RADIUS * RADIUS * RADIUS;

    private static final class Roller {
        final Rig rig = new Rig().material(GRAIN, 0.3, 0.5, 0).material(Impact.RIGID, 0.3, 0.5, 0);
        final long grain;

        Roller(double time, double slope, double spin) {
            ViscousRollingProvider provider = new ViscousRollingProvider();
            rig.law(Stage.ROLLING, provider.create(ParameterValues.of(provider, Map.of("rolling_time", time))))
                    .gravity(G * Math.sin(slope), 0, -G * Math.cos(slope))
                    .wall(new Wall("plane", 1, new HalfSpace(), Placement.at(new Vector3d()), new Still()));
            double stiffness = 4.0 / 3 * 1e8 / (1 - 0.3 * 0.3) * Math.sqrt(RADIUS);
            double height = RADIUS - Math.pow(MASS * G * Math.cos(slope) / stiffness, 2.0 / 3);
            grain = rig.grain(
                    0, RADIUS, new double[] {0, 0, height}, new double[] {spin * RADIUS, 0, 0}, new double[] {0, spin, 0
                    });
        }
    }

    /** 0.2 %: the overlap shortens the lever by 0.04 %, and the tangential spring rings a little at the start. */
    @ParameterizedTest
    @ValueSource(doubles = {1e-3, 4e-3})
    void spinDecaysExponentially(double time) {
        double spin = 20;
        Roller roller = new Roller(time, 0, spin);
        double decay = 7 * RADIUS / (5 * time * G);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = roller.rig.start(team);
            while (run.time() < decay) {
                run.step();
            }
            double left = Math.exp(-run.time() / decay);
            assertThat(roller.rig.spin(roller.grain)[1]).isCloseTo(spin * left, within(2e-3 * spin * left));
            double way = RADIUS * spin * decay * (1 - left);
            assertThat(roller.rig.centre(roller.grain)[0]).isCloseTo(way, within(2e-3 * way));
            double share = run.ledger().residual() / (0.7 * MASS * RADIUS * RADIUS * spin * spin);
            assertThat(Math.abs(share)).as("left over in the ledger").isLessThan(1e-4);
        }
    }

    /** 0.2 % for the same reasons. */
    @Test
    void slopeGivesASteadySpin() {
        double slope = 0.05;
        double time = 5e-3;
        double steady = Math.tan(slope) / time;
        Roller roller = new Roller(time, slope, 0);
        double decay = 7 * RADIUS / (5 * time * G * Math.cos(slope));
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = roller.rig.start(team);
            while (run.time() < 8 * decay) {
                run.step();
            }
            assertThat(roller.rig.spin(roller.grain)[1]).isCloseTo(steady, within(2e-3 * steady));
        }
    }

    /** Twisting about the normal is not rolling: such a spin stays to the last bit. */
    @Test
    void twistIsNotResisted() {
        Roller roller = new Roller(1e-2, 0, 0);
        roller.rig.grains().spin(roller.rig.row(roller.grain), 0, 0, 7);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = roller.rig.start(team);
            while (run.time() < 0.05) {
                run.step();
            }
            assertThat(roller.rig.spin(roller.grain)[2]).isEqualTo(7);
        }
    }
}
