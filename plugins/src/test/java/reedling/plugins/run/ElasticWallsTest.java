// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Set;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.wall.BoxInside;
import reedling.wall.BoxOutside;
import reedling.wall.ConeSheet;
import reedling.wall.CylinderInside;
import reedling.wall.CylinderOutside;
import reedling.wall.Placement;
import reedling.wall.Rectangle;
import reedling.wall.Still;
import reedling.wall.Surface;
import reedling.wall.Wall;

/**
 * Elastic grains without friction rattle in a closed box around an obstacle: over edges, rims and corners, where one facet
 * hands a grain to the next, the force must stay the gradient of an energy. Nothing dissipates, so the balance is plain
 * kinetic and stored energy.
 */
class ElasticWallsTest {

    static Stream<Arguments> obstacles() {
        return Stream.of(
                Arguments.of("plate", new Rectangle(0.03, 0.02)),
                Arguments.of("block", new BoxOutside(0.02, 0.025, 0.015)),
                Arguments.of("tray", new BoxInside(0.022, 0.02, 0.018, Set.of(BoxInside.Face.HIGH_Z))),
                Arguments.of(
                        "sleeve",
                        new BoxInside(0.022, 0.02, 0.018, Set.of(BoxInside.Face.HIGH_Z, BoxInside.Face.LOW_Z))),
                Arguments.of("roller", new CylinderOutside(0.008, 0.03)),
                Arguments.of("pipe", new CylinderInside(0.014, 0.03)),
                Arguments.of("funnel", new ConeSheet(0.004, 0.016, 0.02)),
                Arguments.of("cup", new CylinderInside(0.014, 0.03, true, false)));
    }

    /** 1e-3 of the energy: 60 steps a contact leave 2 / N^2 = 6e-4 at worst. */
    @ParameterizedTest(name = "{0}")
    @Tag("conservation")
    @MethodSource("obstacles")
    void edgesNeitherMakeNorTakeEnergy(String name, Surface obstacle) {
        Rig rig = new Rig()
                .material(new Material("elastic", 2000, 2e8, 0.3), 1, 0, 0)
                .without(Stage.TANGENTIAL)
                .without(Stage.ROLLING)
                .stepsPerContact(60)
                .reportEvery(10);
        rig.wall(new Wall("room", 0, new BoxInside(0.05, 0.05, 0.05, Set.of()), Placement.world(), new Still()));
        rig.wall(new Wall(
                name,
                0,
                obstacle,
                Placement.axes(
                        new Vector3d(0.001, -0.0007, 0.0004), new Vector3d(1, 0.3, -0.2), new Vector3d(0.1, 0.2, 1)),
                new Still()));
        SplittableRandom random = new SplittableRandom(23);
        try (WorkerTeam team = new WorkerTeam(1)) {
            fill(rig, random, obstacle);
            Simulation run = rig.start(team);
            double worst = 0;
            while (run.time() < 0.06) {
                run.step();
                worst = Math.max(worst, Math.abs(run.ledger().relativeResidual()));
            }
            assertThat(rig.grains().count()).isGreaterThan(25);
            assertThat(worst).isLessThan(1e-3);
        }
    }

    /** Grains at the corners of the room, away from the obstacle, flying in all directions at 2 m/s. */
    private static void fill(Rig rig, SplittableRandom random, Surface obstacle) {
        for (int k = 0; k < 64; k++) {
            double[] centre = {(k % 4 - 1.5) * 0.0135, (k / 4 % 4 - 1.5) * 0.0135, (k / 16 - 1.5) * 0.0135};
            double farthest = Math.max(Math.abs(centre[0]), Math.max(Math.abs(centre[1]), Math.abs(centre[2])));
            double[] velocity = new double[3];
            double squared = 0;
            for (int axis = 0; axis < 3; axis++) {
                velocity[axis] = random.nextDouble(-1, 1);
                squared += velocity[axis] * velocity[axis];
            }
            for (int axis = 0; axis < 3; axis++) {
                velocity[axis] *= 2 / Math.sqrt(squared);
            }
            if (farthest > 0.02) {
                rig.grain(0, random.nextDouble(0.001, 0.002), centre, velocity, new double[3]);
            }
        }
    }
}
