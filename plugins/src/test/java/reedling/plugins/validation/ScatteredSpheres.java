// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.validation;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;

/** Centres of equal spheres put one after the other at random places of a box where they touch no earlier one. */
final class ScatteredSpheres {

    private final double[] low;
    private final double[] size;
    private final double distance;
    private final int[] cells = new int[3];
    private final List<List<double[]>> grid = new ArrayList<>();
    private final SplittableRandom random;

    /**
     * @param low lower corner of the room for centres, m
     * @param size of that room, m
     * @param distance least between two centres, m
     */
    ScatteredSpheres(double[] low, double[] size, double distance, long seed) {
        this.low = low;
        this.size = size;
        this.distance = distance;
        random = new SplittableRandom(seed);
        int all = 1;
        for (int axis = 0; axis < 3; axis++) {
            cells[axis] = Math.max(1, (int) (size[axis] / distance));
            all *= cells[axis];
        }
        for (int cell = 0; cell < all; cell++) {
            grid.add(new ArrayList<>());
        }
    }

    /** Next centre, m. */
    double[] next() {
        while (true) {
            double[] centre = new double[3];
            for (int axis = 0; axis < 3; axis++) {
                centre[axis] = low[axis] + size[axis] * random.nextDouble();
            }
            if (free(centre)) {
                grid.get(cell(place(centre, 0), place(centre, 1), place(centre, 2)))
                        .add(centre);
                return centre;
            }
        }
    }

    private int place(double[] centre, int axis) {
        return Math.min(cells[axis] - 1, (int) ((centre[axis] - low[axis]) / size[axis] * cells[axis]));
    }

    private int cell(int x, int y, int z) {
        return (x * cells[1] + y) * cells[2] + z;
    }

    private boolean free(double[] centre) {
        int x = place(centre, 0);
        int y = place(centre, 1);
        int z = place(centre, 2);
        for (int i = Math.max(0, x - 1); i < Math.min(cells[0], x + 2); i++) {
            for (int j = Math.max(0, y - 1); j < Math.min(cells[1], y + 2); j++) {
                for (int k = Math.max(0, z - 1); k < Math.min(cells[2], z + 2); k++) {
                    for (double[] other : grid.get(cell(i, j, k))) {
                        double dx = other[0] - centre[0], dy = other[1] - centre[1], dz = other[2] - centre[2];
                        if (dx * dx + dy * dy + dz * dz < distance * distance) {
                            return false;
                        }
                    }
                }
            }
        }
        return true;
    }
}
