// SPDX-License-Identifier: Apache-2.0
package reedling.perf;

import java.util.Arrays;

/** One sweep after another that moves overlapping spheres apart, in cells as wide as the largest sphere. */
final class OverlapSweep {

    private final int count;
    private final double edge;
    private final int cells;
    private final int[] start;
    private final int[] order;
    private final double[] push;

    OverlapSweep(int count, double edge, double cell) {
        this.count = count;
        this.edge = edge;
        cells = Math.max(1, (int) (edge / cell));
        start = new int[cells * cells * cells + 2];
        order = new int[count];
        push = new double[3 * count];
    }

    private int cell(double x) {
        return Math.clamp((int) (x * cells / edge), 0, cells - 1);
    }

    private int cellOf(double[] rows, int g) {
        int at = DenseBed.ROW * g;
        return (cell(rows[at + 2]) * cells + cell(rows[at + 1])) * cells + cell(rows[at]);
    }

    void run(double[] rows, double share) {
        sort(rows);
        Arrays.fill(push, 0);
        for (int g = 0; g < count; g++) {
            pushFrom(rows, g, share);
        }
        for (int g = 0; g < count; g++) {
            int at = DenseBed.ROW * g;
            double radius = rows[at + 3];
            for (int axis = 0; axis < 3; axis++) {
                double moved = rows[at + axis] + push[3 * g + axis];
                rows[at + axis] = Math.clamp(moved, radius, edge - radius);
            }
        }
    }

    private void sort(double[] rows) {
        Arrays.fill(start, 0);
        for (int g = 0; g < count; g++) {
            start[cellOf(rows, g) + 2]++;
        }
        for (int c = 2; c < start.length; c++) {
            start[c] += start[c - 1];
        }
        for (int g = 0; g < count; g++) {
            order[start[cellOf(rows, g) + 1]++] = g;
        }
    }

    private void pushFrom(double[] rows, int g, double share) {
        int at = DenseBed.ROW * g;
        int cx = cell(rows[at]), cy = cell(rows[at + 1]), cz = cell(rows[at + 2]);
        for (int z = Math.max(0, cz - 1); z <= Math.min(cells - 1, cz + 1); z++) {
            for (int y = Math.max(0, cy - 1); y <= Math.min(cells - 1, cy + 1); y++) {
                int row = (z * cells + y) * cells;
                int end = start[row + Math.min(cells - 1, cx + 1) + 1];
                for (int k = start[row + Math.max(0, cx - 1)]; k < end; k++) {
                    if (order[k] > g) {
                        pushPair(rows, g, order[k], share);
                    }
                }
            }
        }
    }

    private void pushPair(double[] rows, int g, int other, double share) {
        int a = DenseBed.ROW * g;
        int b = DenseBed.ROW * other;
        double dx = rows[b] - rows[a], dy = rows[b + 1] - rows[a + 1], dz = rows[b + 2] - rows[a + 2];
        double radii = rows[a + 3] + rows[b + 3];
        double squared = dx * dx + dy * dy + dz * dz;
        if (squared < radii * radii && squared > 0) {
            double distance = Math.sqrt(squared);
            double scale = share * (radii - distance) / distance;
            push[3 * g] -= scale * dx;
            push[3 * g + 1] -= scale * dy;
            push[3 * g + 2] -= scale * dz;
            push[3 * other] += scale * dx;
            push[3 * other + 1] += scale * dy;
            push[3 * other + 2] += scale * dz;
        }
    }
}
