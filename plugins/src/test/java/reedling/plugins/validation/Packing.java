// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.validation;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.joml.Vector3d;
import reedling.contact.Stage;
import reedling.material.Material;
import reedling.neighbour.PairSegment;
import reedling.parallel.WorkerTeam;
import reedling.particle.GrainStore;
import reedling.plugins.Rig;
import reedling.run.Simulation;
import reedling.wall.BoxInside;
import reedling.wall.Placement;
import reedling.wall.Still;
import reedling.wall.Wall;

/** A packing of 4000 equal spheres that fell as scattered ones into a box of sixteen diameters' width, and what is in it. */
final class Packing {

    /** Diameter of the spheres, m. */
    static final double DIAMETER = 0.01;

    private static final double SIDE = 16 * DIAMETER;
    private static final double BELOW = 3 * DIAMETER; // below the surface, where it is still loose
    private static final int GRAINS = 4000;

    private final GrainStore grains;
    private final List<int[]> contacts;
    private final double surface;

    private Packing(GrainStore grains, List<int[]> contacts) {
        this.grains = grains;
        this.contacts = contacts;
        double[] heights = new double[grains.count()];
        Arrays.setAll(heights, g -> grains.position(g, 2));
        Arrays.sort(heights);
        surface = heights[(int) (0.98 * heights.length)];
    }

    /**
     * How it is poured.
     *
     * @param friction between all; 0 for smooth spheres
     * @param restitution of all impacts
     * @param modulus Young's modulus, Pa
     * @param scattered solid fraction before the fall
     * @param drag rate at which the fluid around slows a sphere down, 1/s; 0 for none
     * @param end when it is measured, s
     */
    record Pouring(double friction, double restitution, double modulus, double scattered, double drag, double end) {}

    static Packing pour(Pouring pouring, long seed) {
        Rig rig = new Rig()
                .material(new Material("ball", 2500, pouring.modulus, 0.3), pouring.restitution, pouring.friction, 0)
                .without(Stage.ROLLING)
                .gravity(0, 0, -9.81)
                .margin(0.15 * DIAMETER)
                .reportEvery(1000);
        if (pouring.friction == 0) {
            rig.without(Stage.TANGENTIAL);
        }
        if (pouring.drag > 0) {
            rig.field(new StillFluid(pouring.drag));
        }
        double height = GRAINS * Math.PI / 6 * Math.pow(DIAMETER, 3) / pouring.scattered / (SIDE * SIDE);
        rig.wall(new Wall(
                "box",
                0,
                new BoxInside(SIDE, SIDE, height, Set.of(BoxInside.Face.HIGH_Z)),
                Placement.at(new Vector3d(0, 0, 0.5 * height)),
                new Still()));
        double room = SIDE - DIAMETER;
        ScatteredSpheres places = new ScatteredSpheres(
                new double[] {-0.5 * room, -0.5 * room, 0.5 * DIAMETER},
                new double[] {room, room, height - DIAMETER},
                DIAMETER,
                seed);
        for (int k = 0; k < GRAINS; k++) {
            rig.grain(0, 0.5 * DIAMETER, places.next(), new double[3], new double[3]);
        }
        try (WorkerTeam team = new WorkerTeam(2)) {
            Simulation run = rig.start(team);
            while (run.time() < pouring.end) {
                run.step();
            }
            return new Packing(rig.grains(), touching(run));
        }
    }

    private static List<int[]> touching(Simulation run) {
        GrainStore grains = run.model().grains();
        List<int[]> pairs = new ArrayList<>();
        for (PairSegment segment : run.interactions().pairRows()) {
            for (int row = 0; row < segment.activeCount(); row++) {
                int i = segment.first()[row];
                int j = segment.second()[row];
                double squared = 0;
                for (int axis = 0; axis < 3; axis++) {
                    double across = grains.position(i, axis) - grains.position(j, axis);
                    squared += across * across;
                }
                if (squared < DIAMETER * DIAMETER) {
                    pairs.add(new int[] {i, j});
                }
            }
        }
        return pairs;
    }

    private boolean inside(int g, double away) {
        return Math.abs(grains.position(g, 0)) < 0.5 * SIDE - away
                && Math.abs(grains.position(g, 1)) < 0.5 * SIDE - away
                && grains.position(g, 2) > away
                && grains.position(g, 2) < surface - BELOW;
    }

    /** Solid fraction of what is so far (m) from walls and floor, and below the surface. */
    double solidFraction(double away) {
        double half = 0.5 * SIDE - away;
        BoxFill fill = new BoxFill(new double[] {-half, -half, away}, new double[] {half, half, surface - BELOW});
        for (int g = 0; g < grains.count(); g++) {
            fill.add(grains.position(g, 0), grains.position(g, 1), grains.position(g, 2), 0.5 * DIAMETER);
        }
        return fill.fraction();
    }

    /**
     * Mean number of contacts of the spheres so far (m) from walls and floor, and below the surface, when those with too few
     * contacts to bear anything are taken out again and again until none is left.
     *
     * @param fewest contacts with which a sphere may stay
     */
    double coordination(double away, int fewest) {
        boolean[] out = new boolean[grains.count()];
        int[] count = counts(out);
        boolean changed = true;
        while (changed) {
            changed = false;
            for (int g = 0; g < out.length; g++) {
                // walls bear too: spheres near them are never taken out
                if (!out[g] && count[g] < fewest && inside(g, DIAMETER)) {
                    out[g] = true;
                    changed = true;
                }
            }
            count = counts(out);
        }
        int[] last = count;
        return IntStream.range(0, out.length)
                .filter(g -> !out[g] && inside(g, away))
                .map(g -> last[g])
                .average()
                .orElseThrow();
    }

    private int[] counts(boolean[] out) {
        int[] count = new int[out.length];
        for (int[] pair : contacts) {
            if (!out[pair[0]] && !out[pair[1]]) {
                count[pair[0]]++;
                count[pair[1]]++;
            }
        }
        return count;
    }
}
