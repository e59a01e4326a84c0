// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import reedling.particle.RandomStream;

/**
 * Another frame of reference: turned, moved and in uniform motion.
 *
 * @param matrix rotation, row by row
 * @param offset m
 * @param velocity m/s
 */
record Frame(double[] matrix, double[] offset, double[] velocity) {

    /** A random rotation with an offset and a velocity of the given sizes in every direction. */
    static Frame random(long seed, double offset, double velocity) {
        RandomStream random = new RandomStream(seed);
        double[] q = new double[4];
        double size = 0;
        for (int k = 0; k < 4; k++) {
            q[k] = random.normal();
            size += q[k] * q[k];
        }
        for (int k = 0; k < 4; k++) {
            q[k] /= Math.sqrt(size);
        }
        double w = q[0], x = q[1], y = q[2], z = q[3];
        double[] matrix = {
            1 - 2 * (y * y + z * z),
            2 * (x * y - w * z),
            2 * (x * z + w * y),
            2 * (x * y + w * z),
            1 - 2 * (x * x + z * z),
            2 * (y * z - w * x),
            2 * (x * z - w * y),
            2 * (y * z + w * x),
            1 - 2 * (x * x + y * y)
        };
        double[] away = {offset, -offset, offset};
        double[] fast = {velocity, velocity, -velocity};
        return new Frame(matrix, away, fast);
    }

    /** A motion as it looks from here. */
    PairMotion of(PairMotion motion) {
        return (time, pose) -> {
            motion.at(time, pose);
            turn(pose, 0);
            for (int k = 0; k < PairMotion.ANGLES; k++) {
                pose[k] += offset[k % 3] + velocity[k % 3] * time;
            }
        };
    }

    /** Turns twelve numbers, four vectors, from an index. */
    void turn(double[] values, int from) {
        for (int k = from; k < from + PairMotion.LENGTH; k += 3) {
            double x = values[k], y = values[k + 1], z = values[k + 2];
            for (int row = 0; row < 3; row++) {
                values[k + row] = matrix[3 * row] * x + matrix[3 * row + 1] * y + matrix[3 * row + 2] * z;
            }
        }
    }

    /** The rotation as a vector: its axis times the angle, rad. */
    double[] axis() {
        double c = 0.5 * (matrix[0] + matrix[4] + matrix[8] - 1);
        double x = matrix[7] - matrix[5], y = matrix[2] - matrix[6], z = matrix[3] - matrix[1];
        double s = 0.5 * Math.sqrt(x * x + y * y + z * z);
        double angle = Math.atan2(s, c);
        double scale = s > 0 ? angle / (2 * s) : 0;
        return new double[] {scale * x, scale * y, scale * z};
    }
}
