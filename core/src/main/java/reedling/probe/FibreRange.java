// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.io.IOException;
import java.util.Arrays;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;

/**
 * Bounds of the stress range that the worst fibre of each element goes through. Element laws report the largest and the
 * smallest stress of all fibres, not which fibre bears it; with M(t) the largest and m(t) the smallest,
 *
 * <p>max(M's range, m's range) <= range of the worst fibre <= max M - min m.
 *
 * <p>The lower bound holds because the fibre with M at its highest is nowhere above M; the upper one is reached when
 * bending reverses in one plane, and is too wide by twice the steady bending stress where bending never reverses.
 *
 * <p>Threads: one.
 */
public final class FibreRange {

    private final double[] highestMax;
    private final double[] lowestMax;
    private final double[] highestMin;
    private final double[] lowestMin;

    FibreRange(int elements) {
        highestMax = new double[elements];
        lowestMax = new double[elements];
        highestMin = new double[elements];
        lowestMin = new double[elements];
        clear();
    }

    void clear() {
        Arrays.fill(highestMax, Double.NEGATIVE_INFINITY);
        Arrays.fill(highestMin, Double.NEGATIVE_INFINITY);
        Arrays.fill(lowestMax, Double.POSITIVE_INFINITY);
        Arrays.fill(lowestMin, Double.POSITIVE_INFINITY);
    }

    void take(int element, double largest, double smallest) {
        highestMax[element] = Math.max(highestMax[element], largest);
        lowestMax[element] = Math.min(lowestMax[element], largest);
        highestMin[element] = Math.max(highestMin[element], smallest);
        lowestMin[element] = Math.min(lowestMin[element], smallest);
    }

    /** No fibre of the element went through more, Pa; not a number without a sample. */
    public double upper(int element) {
        return finite(highestMax[element] - lowestMin[element]);
    }

    /** Some fibre of the element went through at least so much, Pa; not a number without a sample. */
    public double lower(int element) {
        return finite(Math.max(highestMax[element] - lowestMax[element], highestMin[element] - lowestMin[element]));
    }

    private static double finite(double value) {
        return Double.isInfinite(value) ? Double.NaN : value;
    }

    void save(SectionWriter out) throws IOException {
        for (double[] column : columns()) {
            out.writeDoubles(column, 0, column.length);
        }
    }

    void restore(SectionReader in) {
        for (double[] column : columns()) {
            in.readDoubles(column, 0, column.length);
        }
    }

    private double[][] columns() {
        return new double[][] {highestMax, lowestMax, highestMin, lowestMin};
    }
}
