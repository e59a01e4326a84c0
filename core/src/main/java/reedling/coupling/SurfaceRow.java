// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;

import reedling.contact.Column;
import reedling.particle.GrainRow;

/**
 * One row of a grain on a wall facet or a wire, as the gather stages of both fill it; scratch of one worker.
 *
 * <p>Where a sphere formula needs the second body's rotation, levers run along the normal on both sides.
 */
final class SurfaceRow {

    /** Unit normal from the grain to the surface. */
    final double[] normal = new double[3];

    /** Velocity of the second body at its axis or at the contact point, m/s. */
    final double[] velocity = new double[3];

    /** Spin of the second body, rad/s. */
    final double[] spin = new double[3];

    /** Rate at which the normal turns, 1/s, as a vector d normal / dt. */
    final double[] normalRate = new double[3];

    /** Signed overlap, m. */
    double overlap;

    /** Lever on the second body, m; 0 where {@link #velocity} is that of the contact point. */
    double leverSecond;

    /** What the second body adds to the inverse mass along the normal, across it, and to the inverse inertia. */
    double inverseMass;

    double inverseMassSliding;
    double inverseInertia;

    /** Effective radius, m. */
    double effectiveRadius;

    /** Reach of the laws over gaps, m. */
    double reach;

    /** Relative velocity of the centres, m/s, as {@link #write} found it. */
    final double[] relative = new double[3];

    /** Takes the relative velocity of the grain at a row index and the second body. */
    void relativeTo(double[] rows, int grainAt) {
        for (int axis = 0; axis < 3; axis++) {
            relative[axis] = rows[grainAt + GrainRow.V + axis] - velocity[axis];
        }
    }

    /** Writes the gather columns of row r of a block. */
    void write(double[] c, int r, double[] rows, int grainAt, double halfStep) {
        double nx = normal[0], ny = normal[1], nz = normal[2];
        double lever = rows[grainAt + GrainRow.RADIUS] - 0.5 * overlap;
        double inverseMassGrain = rows[grainAt + GrainRow.INVERSE_MASS];
        double inverseInertiaGrain = rows[grainAt + GrainRow.INVERSE_INERTIA];
        double closing = Math.fma(relative[0], nx, Math.fma(relative[1], ny, relative[2] * nz));
        // surface speed from spins: (l1 w1 + l2 w2) x n
        double sx = Math.fma(lever, rows[grainAt + GrainRow.W], leverSecond * spin[0]);
        double sy = Math.fma(lever, rows[grainAt + GrainRow.W + 1], leverSecond * spin[1]);
        double sz = Math.fma(lever, rows[grainAt + GrainRow.W + 2], leverSecond * spin[2]);
        c[at(Column.NORMAL) + r] = nx;
        c[at(Column.NORMAL + 1) + r] = ny;
        c[at(Column.NORMAL + 2) + r] = nz;
        c[at(Column.OVERLAP) + r] = overlap;
        c[at(Column.SLIDING) + r] = Math.fma(-closing, nx, relative[0]) + (sy * nz - sz * ny);
        c[at(Column.SLIDING + 1) + r] = Math.fma(-closing, ny, relative[1]) + (sz * nx - sx * nz);
        c[at(Column.SLIDING + 2) + r] = Math.fma(-closing, nz, relative[2]) + (sx * ny - sy * nx);
        c[at(Column.INVERSE_MASS) + r] = inverseMassGrain + inverseMass;
        c[at(Column.INVERSE_MASS_SLIDING) + r] =
                Math.fma(lever * lever, inverseInertiaGrain, inverseMassGrain) + inverseMassSliding;
        c[at(Column.INVERSE_INERTIA) + r] = inverseInertiaGrain + inverseInertia;
        for (int axis = 0; axis < 3; axis++) {
            c[at(Column.SPIN + axis) + r] = rows[grainAt + GrainRow.W + axis] - spin[axis];
            c[at(Column.MEAN_NORMAL + axis) + r] = Math.fma(-halfStep, normalRate[axis], normal[axis]);
        }
        c[at(Column.LEVER_FIRST) + r] = lever;
        c[at(Column.LEVER_SECOND) + r] = leverSecond;
        c[at(Column.TOUCH) + r] = overlap > -reach ? 1.0 : 0.0;
        c[at(Column.EFFECTIVE_RADIUS) + r] = effectiveRadius;
        c[at(Column.EFFECTIVE_MASS) + r] = 1 / inverseMassGrain;
        c[at(Column.CLOSING) + r] = closing;
    }

    /** Writes a row that fills up a tile: far apart, at rest, finite everywhere. */
    static void writeIdle(double[] c, int r) {
        for (int column = 0; column <= Column.INVERSE_MASS_SLIDING; column++) {
            c[at(column) + r] = 0;
        }
        c[at(Column.NORMAL + 2) + r] = 1;
        c[at(Column.MEAN_NORMAL + 2) + r] = 1;
        c[at(Column.OVERLAP) + r] = -1;
        c[at(Column.INVERSE_MASS) + r] = 1;
        c[at(Column.INVERSE_MASS_SLIDING) + r] = 1;
        c[at(Column.INVERSE_INERTIA) + r] = 1;
        c[at(Column.EFFECTIVE_RADIUS) + r] = 1;
        c[at(Column.EFFECTIVE_MASS) + r] = 1;
    }
}
