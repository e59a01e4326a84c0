// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;
import static reedling.contact.ContactBlock.store;

import jdk.incubator.vector.DoubleVector;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.math.Lanes;

/**
 * Gather stage: normal, overlap, touch, levers, effective radius and mass of grain-grain rows. The inverse distance waits
 * in column ELASTIC_FORCE and the ratio of distance to radii in DAMPING for {@link PairSliding}.
 */
final class PairNormals implements RowStage {

    static final int INVERSE_DISTANCE = Column.ELASTIC_FORCE;
    static final int SHORTENING = Column.DAMPING;

    /** Column of the difference of radii, first less second; the lever then stands there. */
    private static final int RADIUS_DIFFERENCE = Column.LEVER_FIRST;

    /** r^2 / I = 2.5 / m for a solid sphere: what a lever adds to the inverse mass along the surface. */
    private static final double SPHERE = 2.5;

    @Override
    public void run(RowRange rows) {
        ContactBlock block = rows.block();
        if (Lanes.VECTORISED) {
            vector(block.columns(), block.rows(), block.reach());
        } else {
            scalar(block.columns(), block.rows(), block.reach());
        }
    }

    private static void vector(double[] c, int rows, double reach) {
        DoubleVector beyond = DoubleVector.broadcast(Lanes.SPECIES, -reach);
        DoubleVector zero = DoubleVector.zero(Lanes.SPECIES);
        DoubleVector one = DoubleVector.broadcast(Lanes.SPECIES, 1.0);
        DoubleVector half = DoubleVector.broadcast(Lanes.SPECIES, 0.5);
        DoubleVector sphere = DoubleVector.broadcast(Lanes.SPECIES, SPHERE);
        for (int r = 0; r < rows; r += Lanes.TILE) {
            // 1 distance, normal, overlap
            DoubleVector dx = load(c, Column.NORMAL, r),
                    dy = load(c, Column.NORMAL + 1, r),
                    dz = load(c, Column.NORMAL + 2, r);
            DoubleVector radii = load(c, Column.OVERLAP, r);
            DoubleVector distance = dx.fma(dx, dy.fma(dy, dz.mul(dz))).sqrt();
            DoubleVector inverse = one.div(distance);
            DoubleVector overlap = radii.sub(distance);
            store(dx.mul(inverse), c, Column.NORMAL, r);
            store(dy.mul(inverse), c, Column.NORMAL + 1, r);
            store(dz.mul(inverse), c, Column.NORMAL + 2, r);
            store(inverse, c, INVERSE_DISTANCE, r);
            store(overlap, c, Column.OVERLAP, r);
            store(zero.blend(one, beyond.lt(overlap)), c, Column.TOUCH, r);

            // 2 levers, effective radius and mass
            DoubleVector inverseRadii = one.div(radii);
            DoubleVector shortening = distance.mul(inverseRadii);
            DoubleVector difference = load(c, RADIUS_DIFFERENCE, r);
            DoubleVector first = radii.add(difference).mul(half);
            DoubleVector second = radii.sub(difference).mul(half);
            DoubleVector inverseMass = load(c, Column.INVERSE_MASS, r);
            store(first.mul(second).mul(inverseRadii), c, Column.EFFECTIVE_RADIUS, r);
            store(one.div(inverseMass), c, Column.EFFECTIVE_MASS, r);
            store(
                    shortening.mul(shortening).mul(sphere).fma(inverseMass, inverseMass),
                    c,
                    Column.INVERSE_MASS_SLIDING,
                    r);
            store(shortening.mul(first), c, Column.LEVER_FIRST, r);
            store(shortening.mul(second), c, Column.LEVER_SECOND, r);
            store(shortening, c, SHORTENING, r);
        }
    }

    private static void scalar(double[] c, int rows, double reach) {
        for (int r = 0; r < rows; r++) {
            // 1 distance, normal, overlap
            double dx = c[at(Column.NORMAL) + r], dy = c[at(Column.NORMAL + 1) + r], dz = c[at(Column.NORMAL + 2) + r];
            double radii = c[at(Column.OVERLAP) + r];
            double distance = Math.sqrt(Math.fma(dx, dx, Math.fma(dy, dy, dz * dz)));
            double inverse = 1.0 / distance;
            double overlap = radii - distance;
            c[at(Column.NORMAL) + r] = dx * inverse;
            c[at(Column.NORMAL + 1) + r] = dy * inverse;
            c[at(Column.NORMAL + 2) + r] = dz * inverse;
            c[at(INVERSE_DISTANCE) + r] = inverse;
            c[at(Column.OVERLAP) + r] = overlap;
            c[at(Column.TOUCH) + r] = -reach < overlap ? 1.0 : 0.0;

            // 2 levers, effective radius and mass
            double inverseRadii = 1.0 / radii;
            double shortening = distance * inverseRadii;
            double difference = c[at(RADIUS_DIFFERENCE) + r];
            double first = (radii + difference) * 0.5;
            double second = (radii - difference) * 0.5;
            double inverseMass = c[at(Column.INVERSE_MASS) + r];
            c[at(Column.EFFECTIVE_RADIUS) + r] = first * second * inverseRadii;
            c[at(Column.EFFECTIVE_MASS) + r] = 1.0 / inverseMass;
            c[at(Column.INVERSE_MASS_SLIDING) + r] =
                    Math.fma(shortening * shortening * SPHERE, inverseMass, inverseMass);
            c[at(Column.LEVER_FIRST) + r] = shortening * first;
            c[at(Column.LEVER_SECOND) + r] = shortening * second;
            c[at(SHORTENING) + r] = shortening;
        }
    }
}
