// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.util.Arrays;
import reedling.particle.GrainStore;

/**
 * Height of a heap over the distance from its axis, and the cone fitted to its flank.
 *
 * <p>Formula: rings of equal width around the axis are cut into cells about as long as wide. The height of a cell is that
 * of the highest point of all grains whose centre is in it, 0 if there is none; that of a ring is the mean of its cells.
 * The foot radius R is where the heights, from the axis outwards, first fall below the mean diameter of the grains. A
 * line through the rings whose middle lies between {@code from} R and {@code to} R, by least squares with the number of
 * cells as weight, falls with the tangent of the angle of repose.
 * <p>Grains that rolled away alone do not count: the cells around them are empty. The top, rounded off, and the toe, of
 * single grains, are outside the fit.
 * <p>Source: common practice, no source. Threads: confined to its owner.
 */
final class HeapProfile {

    private static final double DEGREES = 180 / Math.PI;
    private static final int FEWEST_RINGS = 3;

    private final HeapPlan plan;
    private final double[] height;
    private final int[] cells;
    private final double footRadius;
    private double intercept = Double.NaN;
    private double slope = Double.NaN;
    private double deviation = Double.NaN;
    private int flankRings;

    HeapProfile(HeapPlan plan, GrainStore grains) {
        this.plan = plan;
        int rings = 1;
        double diameters = 0;
        for (int g = 0; g < grains.count(); g++) {
            rings = Math.max(rings, 1 + ringOf(grains, g));
            diameters += 2 * grains.radius(g);
        }
        height = new double[rings];
        cells = new int[rings];
        measure(grains);
        footRadius = foot(diameters / Math.max(1, grains.count()));
        fit();
    }

    private int ringOf(GrainStore grains, int g) {
        double x = grains.position(g, 0) - plan.centreX();
        double y = grains.position(g, 1) - plan.centreY();
        return (int) (Math.sqrt(x * x + y * y) / plan.ringWidth());
    }

    private void measure(GrainStore grains) {
        int[] first = new int[height.length + 1];
        for (int ring = 0; ring < height.length; ring++) {
            cells[ring] = (int) Math.max(1, Math.rint(2 * Math.PI * (ring + 0.5)));
            first[ring + 1] = first[ring] + cells[ring];
        }
        double[] top = new double[first[height.length]];
        for (int g = 0; g < grains.count(); g++) {
            int ring = ringOf(grains, g);
            double angle =
                    StrictMath.atan2(grains.position(g, 1) - plan.centreY(), grains.position(g, 0) - plan.centreX());
            int cell = (int) ((angle / (2 * Math.PI) + 0.5) * cells[ring]);
            int at = first[ring] + Math.min(cell, cells[ring] - 1);
            top[at] = Math.max(top[at], grains.position(g, 2) + grains.radius(g) - plan.floor());
        }
        for (int ring = 0; ring < height.length; ring++) {
            height[ring] = Arrays.stream(top, first[ring], first[ring + 1]).sum() / cells[ring];
        }
    }

    private double foot(double least) {
        for (int ring = 0; ring < height.length; ring++) {
            if (height[ring] < least) {
                double above = ring == 0 ? least : height[ring - 1];
                double part = above == height[ring] ? 0 : (above - least) / (above - height[ring]);
                return ring == 0 ? 0 : middle(ring - 1) + part * plan.ringWidth();
            }
        }
        return height.length * plan.ringWidth();
    }

    private void fit() {
        double weight = 0;
        double r = 0;
        double h = 0;
        double rr = 0;
        double rh = 0;
        for (int ring = 0; ring < height.length; ring++) {
            if (inFlank(ring)) {
                flankRings++;
                weight += cells[ring];
                r += cells[ring] * middle(ring);
                h += cells[ring] * height[ring];
                rr += cells[ring] * middle(ring) * middle(ring);
                rh += cells[ring] * middle(ring) * height[ring];
            }
        }
        if (flankRings < FEWEST_RINGS) {
            return;
        }
        slope = (weight * rh - r * h) / (weight * rr - r * r);
        intercept = (h - slope * r) / weight;
        double squares = 0;
        for (int ring = 0; ring < height.length; ring++) {
            double miss = height[ring] - intercept - slope * middle(ring);
            squares += inFlank(ring) ? cells[ring] * miss * miss : 0;
        }
        deviation = Math.sqrt(squares / weight);
    }

    boolean inFlank(int ring) {
        return middle(ring) >= plan.flankFrom() * footRadius && middle(ring) <= plan.flankTo() * footRadius;
    }

    int rings() {
        return height.length;
    }

    /** Distance of a ring's middle from the axis, m. */
    double middle(int ring) {
        return (ring + 0.5) * plan.ringWidth();
    }

    /** Mean height of a ring above the plate, m. */
    double height(int ring) {
        return height[ring];
    }

    /** Height of the fitted cone at a ring, m. */
    double fitted(int ring) {
        return intercept + slope * middle(ring);
    }

    /** Angle of repose, degrees; not a number with fewer than three rings on the flank. */
    double angle() {
        return DEGREES * StrictMath.atan(-slope);
    }

    /** m. */
    double footRadius() {
        return footRadius;
    }

    /** Largest mean height of a ring, m. */
    double topHeight() {
        return Arrays.stream(height).max().orElse(0);
    }

    /** Root mean square distance of the flank from the fitted line, m. */
    double deviation() {
        return deviation;
    }

    int flankRings() {
        return flankRings;
    }
}
