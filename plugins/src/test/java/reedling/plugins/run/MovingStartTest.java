// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.plugins.Rig;
import reedling.plugins.element.BeamElement;
import reedling.run.Simulation;
import reedling.structure.CrossSection;
import reedling.structure.EndCondition;
import reedling.structure.NodeStore;
import reedling.structure.Position;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;
import reedling.structure.WireDamping;
import reedling.structure.WireEnds;
import reedling.structure.WireMesh;
import reedling.structure.WireSpecification;
import reedling.wall.Gliding;
import reedling.wall.HalfSpace;
import reedling.wall.Placement;
import reedling.wall.Timing;
import reedling.wall.Wall;

/** Runs that begin in motion: the first step must know how fast walls and supports are. */
class MovingStartTest {

    /** An elastic wall at 2 m/s throws a resting grain off at 4 m/s; 1e-4: 40 steps a contact. */
    @Test
    @Tag("reference")
    void movingWallIsSeenComingInTheFirstStep() {
        Rig rig = new Rig()
                .material(new Material("grain", 2500, 1e8, 0.3), 1, 0, 0)
                .margin(5e-3)
                .stepsPerContact(40);
        rig.wall(new Wall(
                "ram",
                0,
                new HalfSpace(),
                Placement.facing(new Vector3d(), new Vector3d(1, 0, 0)),
                new Gliding(new Vector3d(2, 0, 0), Timing.always())));
        long grain = rig.grain(0, 0.004, new double[] {0.0043, 0, 0}, new double[3], new double[3]);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 2e-3) {
                run.step();
            }
            assertThat(rig.velocity(grain)[0]).isCloseTo(4, within(4e-4));
            assertThat(run.ledger().wallWork()).isCloseTo(0.5 * rig.grains().mass(0) * 16, within(1e-3 * 4e-3));
        }
    }

    /** A wall that starts at once, or in a few microseconds, while nothing limits the step: same throw as above. */
    @ParameterizedTest
    @Tag("reference")
    @CsvSource({"0, 0", "0.0051, 0", "0.0203, 1e-5", "0.0203, 1e-3"})
    void wallThatStartsAtOnceIsSeenComing(double start, double ramp) {
        Rig rig = new Rig()
                .material(new Material("grain", 2500, 1e8, 0.3), 1, 0, 0)
                .margin(5e-3)
                .stepsPerContact(40);
        rig.wall(new Wall(
                "ram",
                0,
                new HalfSpace(),
                Placement.facing(new Vector3d(), new Vector3d(1, 0, 0)),
                new Gliding(new Vector3d(2, 0, 0), Timing.from(start, ramp))));
        long grain = rig.grain(0, 0.004, new double[] {0.0053, 0, 0}, new double[3], new double[3]);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < start + 3e-3) {
                run.step();
            }
            assertThat(rig.velocity(grain)[0]).isCloseTo(4, within(4e-4));
        }
    }

    /** Supports that travel at constant velocity carry their wire along as it is: no jolt, nothing rings. */
    @Test
    void travellingWireStaysStraight() {
        StructureBuilder builder = new StructureBuilder();
        int motion = builder.motion((time, pose) -> {
            pose[0] = 0.7 * time;
            pose[1] = 0.2 * time;
            pose[2] = -0.5 * time;
            pose[3] = 1;
            pose[4] = 0;
            pose[5] = 0;
            pose[6] = 0;
        });
        WireEnds ends = new WireEnds(
                new Position(0, 0, 0), new Position(0.1, 0, 0), EndCondition.CLAMPED, EndCondition.CLAMPED, motion);
        Material soft = new Material("polyurethane", 1200, 6e7, 0.45);
        WireMesh.add(
                builder,
                new WireSpecification(
                        "wire",
                        soft,
                        new CrossSection.SolidCircle(0.002),
                        ends,
                        20,
                        8,
                        WireDamping.NONE,
                        "beam",
                        Map.of(),
                        false),
                new BeamElement());
        Structure structure = builder.build();
        Rig rig = new Rig().material(soft, 0.5, 0.3, 0).structure(structure, 0).maximumStep(1e-4);
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 5e-3) {
                run.step();
            }
            NodeStore nodes = structure.nodes();
            for (int n = 0; n < nodes.count; n++) {
                assertThat(nodes.velocity[3 * n]).isCloseTo(0.7, within(1e-6));
                assertThat(nodes.velocity[3 * n + 1]).isCloseTo(0.2, within(1e-6));
                assertThat(nodes.velocity[3 * n + 2]).isCloseTo(-0.5, within(1e-6));
            }
        }
    }
}
