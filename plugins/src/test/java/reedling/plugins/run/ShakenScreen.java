// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.run;

import java.nio.ByteBuffer;
import java.util.Arrays;
import java.util.Comparator;
import java.util.Map;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.joml.Vector3d;
import reedling.material.Material;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;
import reedling.plugins.Rig;
import reedling.plugins.element.BeamElement;
import reedling.run.Simulation;
import reedling.structure.CrossSection;
import reedling.structure.EndCondition;
import reedling.structure.NodeStore;
import reedling.structure.Position;
import reedling.structure.StructureBuilder;
import reedling.structure.SupportMotion;
import reedling.structure.WireDamping;
import reedling.structure.WireEnds;
import reedling.structure.WireMesh;
import reedling.structure.WireSpecification;
import reedling.wall.BoxInside;
import reedling.wall.CylinderOutside;
import reedling.wall.Oscillating;
import reedling.wall.Placement;
import reedling.wall.Stroke;
import reedling.wall.Timing;
import reedling.wall.Turning;
import reedling.wall.Wall;

/**
 * A box with everything in it: 432 grains of two materials and many sizes rain on shaken wires, a shaken floor and a turning
 * roller. Three chunks, several searches in a few thousand steps.
 *
 * <p>As a program it prints the digest of the state after some steps, so that a test can run it in another virtual machine.
 */
public final class ShakenScreen {

    private static final double WIDTH = 0.05;
    private static final Material WIRE = new Material("polyurethane", 1200, 6e7, 0.45);

    private static final SupportMotion SHAKER = (time, pose) -> {
        double s = 0.001 * StrictMath.sin(2 * Math.PI * 25 * time);
        pose[0] = s;
        pose[1] = 0;
        pose[2] = s;
        pose[3] = 1;
        pose[4] = 0;
        pose[5] = 0;
        pose[6] = 0;
    };

    private ShakenScreen() {}

    /** The scene for a seed of the grains. */
    static Rig scene(long seed) {
        Rig rig = new Rig()
                .material(new Material("seed", 1200, 1e7, 0.3), 0.6, 0.4, 0.03)
                .material(new Material("stone", 2500, 3e7, 0.25), 0.8, 0.5, 0.01)
                .material(WIRE, 0.5, 0.5, 0.02)
                .gravity(0, 0, -9.81)
                .structure(wires(), 2, 2, 2, 2, 2);
        Stroke stroke = new Stroke(new Vector3d(0, 1, 1), 0.001, 0);
        rig.wall(new Wall(
                "box",
                1,
                new BoxInside(WIDTH, WIDTH, 0.08, Set.of(BoxInside.Face.HIGH_Z)),
                Placement.world(),
                Oscillating.harmonic(stroke, 20, Timing.always())));
        rig.wall(new Wall(
                "roller",
                1,
                new CylinderOutside(0.006, 0.04),
                Placement.along(new Vector3d(-0.02, 0, -0.0105), new Vector3d(0.02, 0, -0.0105)),
                new Turning(new Vector3d(0, 0, -0.0105), new Vector3d(1, 0, 0), 20, Timing.always())));
        SplittableRandom random = new SplittableRandom(seed);
        for (int k = 0; k < 432; k++) {
            double[] centre = {
                (k % 6 - 2.5) * 0.0062 + random.nextDouble(-3e-4, 3e-4),
                (k / 6 % 6 - 2.5) * 0.0062 + random.nextDouble(-3e-4, 3e-4),
                0.0075 + k / 36 * 0.0055
            };
            double[] spin = {random.nextDouble(-50, 50), random.nextDouble(-50, 50), random.nextDouble(-50, 50)};
            rig.grain(k % 2, random.nextDouble(0.0012, 0.0024), centre, new double[] {0, 0, -0.3}, spin);
        }
        return rig;
    }

    private static reedling.structure.Structure wires() {
        StructureBuilder builder = new StructureBuilder().gravity(new Position(0, 0, -9.81));
        int motion = builder.motion(SHAKER);
        for (int i = 0; i < 5; i++) {
            double y = (i - 2) * 0.008;
            WireEnds ends = new WireEnds(
                    new Position(-0.022, y, 0),
                    new Position(0.022, y, 0),
                    EndCondition.CLAMPED,
                    EndCondition.CLAMPED,
                    motion);
            WireMesh.add(
                    builder,
                    new WireSpecification(
                            "wire " + i,
                            WIRE,
                            new CrossSection.SolidCircle(0.002),
                            ends,
                            16,
                            4,
                            new WireDamping(0, 0.02, 0.02),
                            "beam",
                            Map.of(),
                            false),
                    new BeamElement());
        }
        return builder.build();
    }

    /** FNV-1a over the bits of everything that decides the next step, grains in the order of their ids. */
    static long digest(Simulation run) {
        GrainStore grains = run.model().grains();
        long hash = 0xcbf29ce484222325L;
        int[] byId = IntStream.range(0, grains.count())
                .boxed()
                .sorted(Comparator.comparingLong(g -> grains.id()[g]))
                .mapToInt(Integer::intValue)
                .toArray();
        for (int g : byId) {
            int at = GrainRow.at(g);
            hash = mix(hash, Arrays.copyOfRange(grains.rows(), at, at + GrainRow.LENGTH));
        }
        NodeStore nodes = run.model().structure().nodes();
        for (double[] values : new double[][] {nodes.position, nodes.velocity, nodes.orientation, nodes.spin}) {
            hash = mix(hash, values);
        }
        return mix(hash, new double[] {run.time(), run.pastStep(), run.searches()});
    }

    private static long mix(long start, double[] values) {
        ByteBuffer bytes = ByteBuffer.allocate(8 * values.length);
        bytes.asDoubleBuffer().put(values);
        long hash = start;
        for (byte b : bytes.array()) {
            hash = (hash ^ (b & 0xff)) * 0x100000001b3L;
        }
        return hash;
    }

    /** Digest after so many steps on so many threads. */
    static long digest(int threads, int steps, int reportEvery) {
        Rig rig = scene(11).reportEvery(reportEvery);
        try (WorkerTeam team = new WorkerTeam(threads)) {
            Simulation run = rig.start(team);
            for (int k = 0; k < steps; k++) {
                run.step();
            }
            return digest(run);
        }
    }

    /** Arguments: number of steps. */
    public static void main(String[] arguments) {
        System.out.println(Long.toHexString(digest(1, Integer.parseInt(arguments[0]), 1000)));
    }
}
