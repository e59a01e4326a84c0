// SPDX-License-Identifier: Apache-2.0
package reedling.perf;

import reedling.particle.RandomStream;

/**
 * Makes a jammed bed: spheres of radius 0.4 to 0.6 mm thrown at random into a cube of solid fraction 0.634 and pushed out
 * of each other in sweeps until contacts are shallow; about six contacts a grain.
 */
final class JammedBed {

    private static final double SMALLEST = 0.4e-3; // m
    private static final double LARGEST = 0.6e-3; // m
    private static final double FRACTION = 0.634;
    private static final int SWEEPS = 1200;
    private static final double SHARE = 0.45; // of an overlap that each of two grains gives way in a sweep
    private static final double SPEED = 0.05; // m/s, so that the bed is alive

    private JammedBed() {}

    static DenseBed make(int count) {
        RandomStream random = new RandomStream(20_260_101L);
        double[] rows = new double[DenseBed.ROW * count];
        double volume = 0;
        for (int g = 0; g < count; g++) {
            double radius = random.uniform(SMALLEST, LARGEST);
            rows[DenseBed.ROW * g + 3] = radius;
            volume += 4.0 / 3 * Math.PI * radius * radius * radius;
        }
        double edge = Math.cbrt(volume / FRACTION);
        for (int g = 0; g < count; g++) {
            int at = DenseBed.ROW * g;
            for (int axis = 0; axis < 3; axis++) {
                rows[at + axis] = random.uniform(0, edge);
                rows[at + 4 + axis] = SPEED * random.normal();
            }
        }
        OverlapSweep sweep = new OverlapSweep(count, edge, 2 * LARGEST);
        for (int k = 0; k < SWEEPS; k++) {
            sweep.run(rows, SHARE);
        }
        return new DenseBed(new double[] {edge, edge, edge}, rows);
    }
}
