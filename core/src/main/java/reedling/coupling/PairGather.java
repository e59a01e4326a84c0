// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;
import static reedling.contact.ContactBlock.store;

import jdk.incubator.vector.DoubleVector;
import jdk.incubator.vector.VectorOperators;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.math.Lanes;
import reedling.math.Tile;
import reedling.neighbour.PairSegment;
import reedling.particle.GrainRow;

/**
 * Gather stage of grain-grain rows: from the two grains' rows to normal, overlap, sliding, spin, levers and effective
 * values. The eight-lane and the plain version give the same bits.
 *
 * <p>After the rows are combined and turned, columns 0-15 hold: centre difference 3, sum of radii, velocity difference
 * (second less first) 3, sum of inverse masses, spin difference (second less first) 3, sum of inverse inertias, sum of
 * radius times spin 3, difference of radii. The geometry then writes the named columns over them.
 */
final class PairGather {

    private static final double[] FIRST_LINE = {-1, -1, -1, 1, -1, -1, -1, 1};
    private static final double[] SECOND_LINE = {-1, -1, -1, 1, 1, 1, 1, -1};
    private static final int RADIUS_DIFFERENCE = 15;
    private static final int RADIUS_SPIN = 12;
    private static final int STRIDE = at(1) - at(0);
    private static final int LINE = 8;

    /** r^2 / I = 2.5 / m for a solid sphere: what a lever adds to the inverse mass along the surface. */
    private static final double SPHERE = 2.5;

    private PairGather() {}

    /** Fills the gather columns for the block's rows, which are rows {@code from ..} of a segment. */
    static void gather(ContactBlock block, double[] grainRows, PairSegment segment, int from) {
        int[] first = segment.first();
        int[] second = segment.second();
        double[] c = block.columns();
        int rows = block.rows();
        int line0 = GrainRow.PAD;
        int line1 = GrainRow.PAD + LINE;
        if (Lanes.VECTORISED) {
            for (int r = 0; r < rows; r += Lanes.TILE) {
                Tile.combine(grainRows, line0, GrainRow.LENGTH, first, second, from + r, FIRST_LINE, c, at(0) + r, STRIDE);
                Tile.combine(grainRows, line1, GrainRow.LENGTH, first, second, from + r, SECOND_LINE, c, at(LINE) + r, STRIDE);
            }
            geometry(c, rows, 0.5 * block.step());
        } else {
            for (int r = 0; r < rows; r += Lanes.TILE) {
                Tile.combineScalar(grainRows, line0, GrainRow.LENGTH, first, second, from + r, FIRST_LINE, c, at(0) + r, STRIDE);
                Tile.combineScalar(grainRows, line1, GrainRow.LENGTH, first, second, from + r, SECOND_LINE, c, at(LINE) + r, STRIDE);
            }
            geometryScalar(c, rows, 0.5 * block.step());
        }
    }

    private static void geometry(double[] c, int rows, double halfStep) {
        DoubleVector zero = DoubleVector.zero(Lanes.SPECIES);
        DoubleVector one = DoubleVector.broadcast(Lanes.SPECIES, 1.0);
        for (int r = 0; r < rows; r += Lanes.TILE) {
            // 1 distance, normal, overlap
            DoubleVector dx = load(c, Column.NORMAL, r), dy = load(c, Column.NORMAL + 1, r), dz = load(c, Column.NORMAL + 2, r);
            DoubleVector radii = load(c, Column.OVERLAP, r);
            DoubleVector distance = dx.fma(dx, dy.fma(dy, dz.mul(dz))).sqrt();
            DoubleVector inverse = one.div(distance);
            DoubleVector nx = dx.mul(inverse), ny = dy.mul(inverse), nz = dz.mul(inverse);
            DoubleVector overlap = radii.sub(distance);
            store(nx, c, Column.NORMAL, r);
            store(ny, c, Column.NORMAL + 1, r);
            store(nz, c, Column.NORMAL + 2, r);
            store(overlap, c, Column.OVERLAP, r);
            store(zero.blend(one, overlap.compare(VectorOperators.GT, zero)), c, Column.TOUCH, r);

            // 2 levers, effective radius and mass
            DoubleVector inverseRadii = one.div(radii);
            DoubleVector shortening = distance.mul(inverseRadii);
            DoubleVector difference = load(c, RADIUS_DIFFERENCE, r);
            DoubleVector radiusFirst = radii.sub(difference).mul(0.5);
            DoubleVector radiusSecond = radii.add(difference).mul(0.5);
            DoubleVector inverseMass = load(c, Column.INVERSE_MASS, r);
            store(radiusFirst.mul(radiusSecond).mul(inverseRadii), c, Column.EFFECTIVE_RADIUS, r);
            store(one.div(inverseMass), c, Column.EFFECTIVE_MASS, r);
            store(shortening.mul(shortening).mul(SPHERE).fma(inverseMass, inverseMass), c, Column.INVERSE_MASS_SLIDING, r);

            // 3 closing speed, sliding of the surfaces, mean normal of the past step
            DoubleVector vx = load(c, Column.SLIDING, r).neg();
            DoubleVector vy = load(c, Column.SLIDING + 1, r).neg();
            DoubleVector vz = load(c, Column.SLIDING + 2, r).neg();
            DoubleVector closing = vx.fma(nx, vy.fma(ny, vz.mul(nz)));
            DoubleVector tx = nx.neg().fma(closing, vx), ty = ny.neg().fma(closing, vy), tz = nz.neg().fma(closing, vz);
            DoubleVector sx = load(c, RADIUS_SPIN, r).mul(shortening);
            DoubleVector sy = load(c, RADIUS_SPIN + 1, r).mul(shortening);
            DoubleVector sz = load(c, RADIUS_SPIN + 2, r).mul(shortening);
            store(closing, c, Column.CLOSING, r);
            store(sy.fma(nz, sz.neg().fma(ny, tx)), c, Column.SLIDING, r);
            store(sz.fma(nx, sx.neg().fma(nz, ty)), c, Column.SLIDING + 1, r);
            store(sx.fma(ny, sy.neg().fma(nx, tz)), c, Column.SLIDING + 2, r);
            DoubleVector turn = inverse.mul(halfStep);
            store(tx.fma(turn, nx), c, Column.MEAN_NORMAL, r);
            store(ty.fma(turn, ny), c, Column.MEAN_NORMAL + 1, r);
            store(tz.fma(turn, nz), c, Column.MEAN_NORMAL + 2, r);
            store(shortening.mul(radiusFirst), c, Column.LEVER_FIRST, r);
            store(shortening.mul(radiusSecond), c, Column.LEVER_SECOND, r);

            // 4 spin of the first relative to the second
            store(load(c, Column.SPIN, r).neg(), c, Column.SPIN, r);
            store(load(c, Column.SPIN + 1, r).neg(), c, Column.SPIN + 1, r);
            store(load(c, Column.SPIN + 2, r).neg(), c, Column.SPIN + 2, r);
        }
    }

    private static void geometryScalar(double[] c, int rows, double halfStep) {
        for (int r = 0; r < rows; r++) {
            // 1 distance, normal, overlap
            double dx = c[at(Column.NORMAL) + r], dy = c[at(Column.NORMAL + 1) + r], dz = c[at(Column.NORMAL + 2) + r];
            double radii = c[at(Column.OVERLAP) + r];
            double distance = Math.sqrt(Math.fma(dx, dx, Math.fma(dy, dy, dz * dz)));
            double inverse = 1.0 / distance;
            double nx = dx * inverse, ny = dy * inverse, nz = dz * inverse;
            double overlap = radii - distance;
            c[at(Column.NORMAL) + r] = nx;
            c[at(Column.NORMAL + 1) + r] = ny;
            c[at(Column.NORMAL + 2) + r] = nz;
            c[at(Column.OVERLAP) + r] = overlap;
            c[at(Column.TOUCH) + r] = overlap > 0 ? 1.0 : 0.0;

            // 2 levers, effective radius and mass
            double inverseRadii = 1.0 / radii;
            double shortening = distance * inverseRadii;
            double difference = c[at(RADIUS_DIFFERENCE) + r];
            double radiusFirst = (radii - difference) * 0.5;
            double radiusSecond = (radii + difference) * 0.5;
            double inverseMass = c[at(Column.INVERSE_MASS) + r];
            c[at(Column.EFFECTIVE_RADIUS) + r] = radiusFirst * radiusSecond * inverseRadii;
            c[at(Column.EFFECTIVE_MASS) + r] = 1.0 / inverseMass;
            c[at(Column.INVERSE_MASS_SLIDING) + r] =
                    Math.fma(shortening * shortening * SPHERE, inverseMass, inverseMass);

            // 3 closing speed, sliding of the surfaces, mean normal of the past step
            double vx = -c[at(Column.SLIDING) + r], vy = -c[at(Column.SLIDING + 1) + r], vz = -c[at(Column.SLIDING + 2) + r];
            double closing = Math.fma(vx, nx, Math.fma(vy, ny, vz * nz));
            double tx = Math.fma(-nx, closing, vx), ty = Math.fma(-ny, closing, vy), tz = Math.fma(-nz, closing, vz);
            double sx = c[at(RADIUS_SPIN) + r] * shortening;
            double sy = c[at(RADIUS_SPIN + 1) + r] * shortening;
            double sz = c[at(RADIUS_SPIN + 2) + r] * shortening;
            c[at(Column.CLOSING) + r] = closing;
            c[at(Column.SLIDING) + r] = Math.fma(sy, nz, Math.fma(-sz, ny, tx));
            c[at(Column.SLIDING + 1) + r] = Math.fma(sz, nx, Math.fma(-sx, nz, ty));
            c[at(Column.SLIDING + 2) + r] = Math.fma(sx, ny, Math.fma(-sy, nx, tz));
            double turn = inverse * halfStep;
            c[at(Column.MEAN_NORMAL) + r] = Math.fma(tx, turn, nx);
            c[at(Column.MEAN_NORMAL + 1) + r] = Math.fma(ty, turn, ny);
            c[at(Column.MEAN_NORMAL + 2) + r] = Math.fma(tz, turn, nz);
            c[at(Column.LEVER_FIRST) + r] = shortening * radiusFirst;
            c[at(Column.LEVER_SECOND) + r] = shortening * radiusSecond;

            // 4 spin of the first relative to the second
            c[at(Column.SPIN) + r] = -c[at(Column.SPIN) + r];
            c[at(Column.SPIN + 1) + r] = -c[at(Column.SPIN + 1) + r];
            c[at(Column.SPIN + 2) + r] = -c[at(Column.SPIN + 2) + r];
        }
    }
}
