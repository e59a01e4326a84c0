// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import reedling.particle.RandomStream;

/**
 * Random sequential placement: one sphere after the other at a random place, drawn again while it overlaps one placed
 * before. Spheres are placed in the order of their columns; put large ones first.
 *
 * <p>Equal spheres jam at a solid fraction of about 0.38 in endless space. Source: common practice; the jamming value
 * from memory. Threads: stateless.
 */
final class SequentialPlacement {

    private static final int TRIES = 5000;

    private SequentialPlacement() {}

    /** Places all spheres at {@code scale} times their radius; returns how many found room. */
    static int place(Spheres spheres, double scale, RandomStream random) {
        SphereGrid grid = new SphereGrid(spheres, 2 * scale * spheres.largest);
        double[] centre = new double[3];
        for (int k = 0; k < spheres.size(); k++) {
            if (!placeOne(spheres, k, scale, random, grid, centre)) {
                return k;
            }
            grid.insert(k);
        }
        return spheres.size();
    }

    private static boolean placeOne(
            Spheres spheres, int k, double scale, RandomStream random, SphereGrid grid, double[] centre) {
        for (int attempt = 0; attempt < TRIES; attempt++) {
            spheres.box.draw(random, scale * spheres.radius[k], centre);
            spheres.x[k] = centre[0];
            spheres.y[k] = centre[1];
            spheres.z[k] = centre[2];
            if (grid.free(k, scale)) {
                return true;
            }
        }
        return false;
    }
}
