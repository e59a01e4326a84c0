// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.io.IOException;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;

/**
 * Counts of positive numbers in bins of equal ratio, 64 a factor of ten, so that a percentile is at most 4 % too high. Numbers
 * below or above all bins count in the first or last. Threads: one.
 */
public final class LogHistogram {

    private static final int PER_DECADE = 64;

    private final int lowestExponent;
    private final long[] counts;
    private long total;

    /**
     * @param lowestExponent power of ten where the first bin starts
     * @param decades factors of ten covered
     */
    public LogHistogram(int lowestExponent, int decades) {
        this.lowestExponent = lowestExponent;
        counts = new long[PER_DECADE * decades];
    }

    /** Counts a positive number. */
    public void add(double value) {
        int bin = (int) Math.floor((StrictMath.log10(value) - lowestExponent) * PER_DECADE);
        counts[Math.max(0, Math.min(counts.length - 1, bin))]++;
        total++;
    }

    /** How many were counted. */
    public long total() {
        return total;
    }

    /**
     * Number below which a fraction of all lies: the upper edge of the bin that reaches it. Not a number if nothing was
     * counted.
     */
    public double percentile(double fraction) {
        if (total == 0) {
            return Double.NaN;
        }
        long wanted = (long) Math.ceil(fraction * total);
        long seen = 0;
        int bin = 0;
        while (bin < counts.length - 1 && seen + counts[bin] < wanted) {
            seen += counts[bin++];
        }
        return StrictMath.pow(10, lowestExponent + (bin + 1.0) / PER_DECADE);
    }

    void save(SectionWriter out) throws IOException {
        out.writeLong(total);
        out.writeLongs(counts, 0, counts.length);
    }

    void restore(SectionReader in) {
        total = in.readLong();
        in.readLongs(counts, 0, counts.length);
    }
}
