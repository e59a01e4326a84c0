// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import java.util.Arrays;

/**
 * Grows spheres from a loose start to full size and pushes overlapping ones apart.
 *
 * <p>A sweep visits the pairs in list order and moves both spheres of an overlapping pair by half of the overlap,
 * then puts every sphere back between the faces of the box. Growth goes in steps; each step is swept until overlaps
 * are small, the last until they are gone. Below random close packing (0.64 for equal spheres in endless space) this
 * ends.
 * <p>Source: common practice, no source. Threads: confined to its owner; one thread, hence the same bits every time.
 */
final class OverlapRemoval {

    /** Largest overlap left, as a fraction of the smaller radius. */
    static final double TOLERANCE = 1e-3;

    /** Overlap, as a fraction of the radius, below which growth goes on. */
    private static final double LOOSE = 0.01;

    private static final double GROWTH = 1.01;
    private static final int MOST_SWEEPS = 6000;
    /** Contacts are opened by this fraction of their length, so that the sweeps end in a finite number. */
    private static final double OPENING = 1 + 2e-4;

    private final Spheres spheres;
    private final SphereGrid grid;
    private final double margin;
    private final double[] listX;
    private final double[] listY;
    private final double[] listZ;
    private int[] first = new int[1024];
    private int[] second = new int[1024];
    private int pairs;

    OverlapRemoval(Spheres spheres) {
        this.spheres = spheres;
        margin = 0.3 * spheres.largest;
        grid = new SphereGrid(spheres, 2 * OPENING * spheres.largest + margin);
        listX = new double[spheres.size()];
        listY = new double[spheres.size()];
        listZ = new double[spheres.size()];
        buildList();
    }

    /**
     * Grows from {@code scale} to 1; returns the largest scale at which the overlaps were removed, 1 when all went
     * well.
     */
    double grow(double scale) {
        double reached = scale;
        while (reached < 1) {
            double next = Math.min(1, reached * GROWTH);
            if (!relax(next, next < 1 ? LOOSE : TOLERANCE)) {
                return reached;
            }
            reached = next;
        }
        return relax(1, TOLERANCE) ? 1 : reached;
    }

    /** Largest overlap at full size, as a fraction of the smaller radius of its pair; 0 if none. */
    double worstOverlap() {
        buildList();
        double worst = 0;
        for (int p = 0; p < pairs; p++) {
            int i = first[p];
            int j = second[p];
            double overlap = spheres.radius[i] + spheres.radius[j] - Math.sqrt(distanceSquared(i, j));
            worst = Math.max(worst, overlap / Math.min(spheres.radius[i], spheres.radius[j]));
        }
        return worst;
    }

    private boolean relax(double scale, double tolerance) {
        for (int sweep = 0; sweep < MOST_SWEEPS; sweep++) {
            double worst = sweep(scale);
            for (int k = 0; k < spheres.size(); k++) {
                spheres.confine(k, scale);
            }
            if (movedTooFar()) {
                buildList();
            }
            // the sweep saw overlaps of opened contacts, before its own corrections: at full size look again
            if (worst < tolerance && (scale < 1 || worstOverlap() < tolerance)) {
                return true;
            }
        }
        return false;
    }

    /** One sweep; returns the largest overlap met, as a fraction of the smaller radius. */
    private double sweep(double scale) {
        double[] x = spheres.x;
        double[] y = spheres.y;
        double[] z = spheres.z;
        double worst = 0;
        for (int p = 0; p < pairs; p++) {
            int i = first[p];
            int j = second[p];
            double contact = OPENING * scale * (spheres.radius[i] + spheres.radius[j]);
            double square = distanceSquared(i, j);
            if (square >= contact * contact || square == 0) {
                continue;
            }
            double distance = Math.sqrt(square);
            double push = 0.5 * (contact - distance) / distance;
            double dx = push * (x[j] - x[i]);
            double dy = push * (y[j] - y[i]);
            double dz = push * (z[j] - z[i]);
            x[i] -= dx;
            y[i] -= dy;
            z[i] -= dz;
            x[j] += dx;
            y[j] += dy;
            z[j] += dz;
            worst = Math.max(worst, (contact - distance) / (scale * Math.min(spheres.radius[i], spheres.radius[j])));
        }
        return worst;
    }

    private double distanceSquared(int i, int j) {
        double dx = spheres.x[j] - spheres.x[i];
        double dy = spheres.y[j] - spheres.y[i];
        double dz = spheres.z[j] - spheres.z[i];
        return dx * dx + dy * dy + dz * dz;
    }

    private boolean movedTooFar() {
        double most = 0.25 * margin * margin;
        for (int k = 0; k < spheres.size(); k++) {
            double dx = spheres.x[k] - listX[k];
            double dy = spheres.y[k] - listY[k];
            double dz = spheres.z[k] - listZ[k];
            if (dx * dx + dy * dy + dz * dz > most) {
                return true;
            }
        }
        return false;
    }

    private void buildList() {
        pairs = 0;
        grid.clear();
        for (int k = 0; k < spheres.size(); k++) {
            listX[k] = spheres.x[k];
            listY[k] = spheres.y[k];
            listZ[k] = spheres.z[k];
            grid.insert(k);
        }
        grid.forEachPair(this::list);
    }

    private void list(int i, int j) {
        double reach = OPENING * (spheres.radius[i] + spheres.radius[j]) + margin;
        if (distanceSquared(i, j) >= reach * reach) {
            return;
        }
        if (pairs == first.length) {
            first = Arrays.copyOf(first, 2 * pairs);
            second = Arrays.copyOf(second, 2 * pairs);
        }
        first[pairs] = i;
        second[pairs] = j;
        pairs++;
    }
}
