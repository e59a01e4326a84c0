// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.joml.Vector3d;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.material.MaterialPair;
import reedling.parallel.WorkerTeam;
import reedling.plugin.ParameterValues;
import reedling.plugins.Rig;
import reedling.plugins.contact.JkrProvider;
import reedling.plugins.element.BeamElement;
import reedling.run.Simulation;
import reedling.structure.CrossSection;
import reedling.structure.EndCondition;
import reedling.structure.Position;
import reedling.structure.StructureBuilder;
import reedling.structure.WireDamping;
import reedling.structure.WireEnds;
import reedling.structure.WireMesh;
import reedling.structure.WireSpecification;
import reedling.wall.HalfSpace;
import reedling.wall.HertzLine;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/**
 * A sticky grain below a wall or a wire, let go where the contact is without load. It falls when its weight does the work
 * of tearing on the way there: m g (d_0 - d_tear) = 11.69459 (w^5 R*^4/E*^2)^(1/3), which for every radius and modulus is
 * a weight of 0.6976 of the pull-off force 3/2 pi w R* (Johnson, Kendall and Roberts, 1971; the work by quadrature, apart
 * from this project). 3 % to either side decide.
 */
@Tag("reference")
class HangingGrainTest {

    private static final double RADIUS = 1e-3;
    private static final double WIRE_RADIUS = 1e-3;
    private static final double WORK = 0.05;
    private static final Material SOFT = new Material("soft", 1000, 1e7, 0.3);
    private static final double MASS = 1000 * 4.0 / 3 * Math.PI * RADIUS * RADIUS * RADIUS;

    @ParameterizedTest
    @ValueSource(doubles = {0.3, 0.68})
    void lighterGrainHangs(double share) {
        assertThat(fall(rig(share, RADIUS, false), -RADIUS)).isLessThan(2e-6);
        double onWire = HertzLine.outside(RADIUS, WIRE_RADIUS);
        assertThat(fall(rig(share, onWire, true), -RADIUS - WIRE_RADIUS)).isLessThan(2e-6);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.72, 1.5})
    void heavierGrainFalls(double share) {
        assertThat(fall(rig(share, RADIUS, false), -RADIUS)).isGreaterThan(1e-4);
        double onWire = HertzLine.outside(RADIUS, WIRE_RADIUS);
        assertThat(fall(rig(share, onWire, true), -RADIUS - WIRE_RADIUS)).isGreaterThan(1e-4);
    }

    /** How far the grain sinks in 0.1 s, m. */
    private static double fall(Rig rig, double touching) {
        long grain = rig.grains().id()[0];
        double start = rig.centre(grain)[2];
        assertThat(start).isCloseTo(touching, within(1e-6));
        try (WorkerTeam team = new WorkerTeam(1)) {
            Simulation run = rig.start(team);
            while (run.time() < 0.1) {
                run.step();
            }
        }
        return start - rig.centre(grain)[2];
    }

    private static Rig rig(double share, double effectiveRadius, boolean onWire) {
        double pullOff = 1.5 * Math.PI * WORK * effectiveRadius;
        JkrProvider jkr = new JkrProvider();
        Rig rig = new Rig()
                .material(SOFT, 0.5, 0.3, 0)
                .law(Stage.NORMAL, jkr.create(ParameterValues.of(jkr, Map.of("work_of_adhesion", WORK))))
                .gravity(0, 0, -share * pullOff / MASS)
                .maximumStep(1e-5);
        if (onWire) {
            rig.structure(wire(), 0);
        } else {
            Placement below = Placement.facing(new Vector3d(), new Vector3d(0, 0, -1));
            rig.wall(new Wall("ceiling", 0, new HalfSpace(), below, new Still()));
        }
        double[] still = {0, 0, 0};
        double place = -RADIUS - (onWire ? WIRE_RADIUS : 0) + unloaded(effectiveRadius);
        rig.grain(0, RADIUS, new double[] {0.05, 0, place}, still, still);
        return rig;
    }

    /** Overlap of a contact without load, m. */
    private static double unloaded(double radius) {
        double modulus = new MaterialPair(SOFT, SOFT, 1, 0, 0).contactModulus();
        double a = Math.cbrt(9 * Math.PI * WORK * radius * radius / (2 * modulus));
        return a * a / radius - Math.sqrt(2 * Math.PI * WORK * a / modulus);
    }

    private static reedling.structure.Structure wire() {
        StructureBuilder builder = new StructureBuilder();
        WireEnds ends = new WireEnds(
                new Position(0, 0, 0),
                new Position(0.1, 0, 0),
                EndCondition.CLAMPED,
                EndCondition.CLAMPED,
                WireEnds.AT_REST);
        WireMesh.add(
                builder,
                new WireSpecification(
                        "wire",
                        SOFT,
                        new CrossSection.SolidCircle(2 * WIRE_RADIUS),
                        ends,
                        8,
                        8,
                        WireDamping.NONE,
                        "beam",
                        Map.of(),
                        true),
                new BeamElement());
        return builder.build();
    }
}
