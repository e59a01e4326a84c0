// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import java.util.Arrays;

/**
 * Cells over a box, each with a chain of the spheres whose centres lie in it; a cell is at least as wide as the
 * reach, so that partners are found in the cell and its neighbours. Threads: confined to its owner.
 */
final class SphereGrid {

    private static final int END = -1;
    /** Finer grids than this many cells along one axis cost memory and save nothing. */
    private static final int MOST_CELLS = 160;

    private final Spheres spheres;
    private final int nx;
    private final int ny;
    private final int nz;
    private final double perX;
    private final double perY;
    private final double perZ;
    private final int[] head;
    private final int[] nextInCell;

    /** Receives a pair found, the lower number first. */
    @FunctionalInterface
    interface PairSink {
        void pair(int i, int j);
    }

    SphereGrid(Spheres spheres, double reach) {
        this.spheres = spheres;
        double width = spheres.box.high().x() - spheres.box.low().x();
        double depth = spheres.box.high().y() - spheres.box.low().y();
        double height = spheres.box.high().z() - spheres.box.low().z();
        nx = cells(width, reach);
        ny = cells(depth, reach);
        nz = cells(height, reach);
        perX = nx / width;
        perY = ny / depth;
        perZ = nz / height;
        head = new int[nx * ny * nz];
        nextInCell = new int[spheres.size()];
        clear();
    }

    void clear() {
        Arrays.fill(head, END);
    }

    void insert(int k) {
        int cell = (cellZ(spheres.z[k]) * ny + cellY(spheres.y[k])) * nx + cellX(spheres.x[k]);
        nextInCell[k] = head[cell];
        head[cell] = k;
    }

    /** Whether sphere k, not yet inserted, overlaps none of those inserted, all taken at {@code scale}. */
    boolean free(int k, double scale) {
        int cx = cellX(spheres.x[k]);
        int cy = cellY(spheres.y[k]);
        int cz = cellZ(spheres.z[k]);
        for (int c = Math.max(0, cz - 1); c <= Math.min(nz - 1, cz + 1); c++) {
            for (int b = Math.max(0, cy - 1); b <= Math.min(ny - 1, cy + 1); b++) {
                for (int a = Math.max(0, cx - 1); a <= Math.min(nx - 1, cx + 1); a++) {
                    if (!clearOf(k, head[(c * ny + b) * nx + a], scale)) {
                        return false;
                    }
                }
            }
        }
        return true;
    }

    /**
     * Hands over every pair of inserted spheres that may be closer than the reach, in an order that depends on places
     * only.
     */
    void forEachPair(PairSink sink) {
        for (int c = 0; c < nz; c++) {
            for (int b = 0; b < ny; b++) {
                for (int a = 0; a < nx; a++) {
                    pairsOfCell(a, b, c, sink);
                }
            }
        }
    }

    private void pairsOfCell(int a, int b, int c, PairSink sink) {
        int own = (c * ny + b) * nx + a;
        for (int i = head[own]; i != END; i = nextInCell[i]) {
            for (int j = nextInCell[i]; j != END; j = nextInCell[j]) {
                sink.pair(Math.min(i, j), Math.max(i, j));
            }
        }
        // the thirteen of the twenty-six neighbours that follow the cell, so that each pair of cells comes once
        for (int n = 14; n < 27; n++) {
            int na = a + n % 3 - 1;
            int nb = b + n / 3 % 3 - 1;
            int nc = c + n / 9 - 1;
            if (na < 0 || na >= nx || nb < 0 || nb >= ny || nc >= nz) {
                continue;
            }
            int other = (nc * ny + nb) * nx + na;
            for (int i = head[own]; i != END; i = nextInCell[i]) {
                for (int j = head[other]; j != END; j = nextInCell[j]) {
                    sink.pair(Math.min(i, j), Math.max(i, j));
                }
            }
        }
    }

    private boolean clearOf(int k, int first, double scale) {
        for (int j = first; j != END; j = nextInCell[j]) {
            double dx = spheres.x[k] - spheres.x[j];
            double dy = spheres.y[k] - spheres.y[j];
            double dz = spheres.z[k] - spheres.z[j];
            double contact = scale * (spheres.radius[k] + spheres.radius[j]);
            if (dx * dx + dy * dy + dz * dz < contact * contact) {
                return false;
            }
        }
        return true;
    }

    private int cellX(double x) {
        return Math.max(0, Math.min(nx - 1, (int) ((x - spheres.box.low().x()) * perX)));
    }

    private int cellY(double y) {
        return Math.max(0, Math.min(ny - 1, (int) ((y - spheres.box.low().y()) * perY)));
    }

    private int cellZ(double z) {
        return Math.max(0, Math.min(nz - 1, (int) ((z - spheres.box.low().z()) * perZ)));
    }

    private static int cells(double extent, double reach) {
        return Math.max(1, Math.min(MOST_CELLS, (int) (extent / reach)));
    }
}
