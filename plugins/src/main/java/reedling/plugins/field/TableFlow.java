// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

/**
 * Velocities on a regular grid, linear along each axis in every cell. Outside the grid the gas moves as at the nearest
 * point of its surface.
 *
 * @param grid where the nodes are
 * @param values velocity, m/s, three numbers a node; x runs fastest, then y
 */
record TableFlow(Grid grid, double[] values) implements GasFlow {

    /**
     * Nodes of a regular grid.
     *
     * @param origin first node, m
     * @param spacing m; any number > 0 where an axis has one node only
     * @param count nodes along each axis
     */
    record Grid(double[] origin, double[] spacing, int[] count) {}

    @Override
    public void at(double x, double y, double z, double[] out) {
        int i = cell(0, x), j = cell(1, y), k = cell(2, z);
        double fx = share(0, i, x), fy = share(1, j, y), fz = share(2, k, z);
        int stepX = grid.count[0] > 1 ? 3 : 0;
        int stepY = grid.count[1] > 1 ? 3 * grid.count[0] : 0;
        int stepZ = grid.count[2] > 1 ? 3 * grid.count[0] * grid.count[1] : 0;
        int node = 3 * (i + grid.count[0] * (j + grid.count[1] * k));
        out[3] = 0;
        out[4] = 0;
        out[5] = 0;
        for (int c = 0; c < 3; c++) {
            int n = node + c;
            double v00 = mix(values[n], values[n + stepX], fx);
            double v10 = mix(values[n + stepY], values[n + stepY + stepX], fx);
            double v01 = mix(values[n + stepZ], values[n + stepZ + stepX], fx);
            double v11 = mix(values[n + stepZ + stepY], values[n + stepZ + stepY + stepX], fx);
            double near = mix(v00, v10, fy);
            double far = mix(v01, v11, fy);
            out[c] = mix(near, far, fz);
            double front = mix(
                    mix(values[n], values[n + stepY], fy), mix(values[n + stepZ], values[n + stepZ + stepY], fy), fz);
            double back = mix(
                    mix(values[n + stepX], values[n + stepX + stepY], fy),
                    mix(values[n + stepX + stepZ], values[n + stepX + stepY + stepZ], fy),
                    fz);
            turn(c, 0, inside(0, x) * (back - front) / grid.spacing[0], out);
            turn(c, 1, inside(1, y) * mix(v10 - v00, v11 - v01, fz) / grid.spacing[1], out);
            turn(c, 2, inside(2, z) * (far - near) / grid.spacing[2], out);
        }
    }

    /** Adds the part that the slope of velocity c along an axis has in half the curl. */
    private static void turn(int c, int axis, double slope, double[] out) {
        if (c != axis) {
            boolean cyclic = (axis + 1) % 3 == c; // d u_y / dx adds to the turn about z
            out[3 + 3 - c - axis] += cyclic ? 0.5 * slope : -0.5 * slope;
        }
    }

    private int cell(int axis, double at) {
        int last = Math.max(0, grid.count[axis] - 2);
        double cells = Math.floor((at - grid.origin[axis]) / grid.spacing[axis]);
        return (int) Math.max(0, Math.min(last, cells));
    }

    private double share(int axis, int cell, double at) {
        double share = (at - grid.origin[axis]) / grid.spacing[axis] - cell;
        return Math.max(0, Math.min(1, share));
    }

    /** 1 between the first and the last node of an axis, else 0. */
    private double inside(int axis, double at) {
        double cells = (at - grid.origin[axis]) / grid.spacing[axis];
        return cells >= 0 && cells <= grid.count[axis] - 1 ? 1 : 0;
    }

    private static double mix(double a, double b, double share) {
        return a + share * (b - a);
    }
}
