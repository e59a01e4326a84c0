// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.io.IOException;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;

/**
 * Count and mass of grains by lot, and where they went: fed, and out through each exit (outlets in order, spilled last).
 *
 * <p>Threads: one, between phases.
 */
public final class Passage implements Persistent {

    private final int lots;
    private final long[] fedCount;
    private final double[] fedMass;
    private final long[] outCount;
    private final double[] outMass;

    Passage(int lots, int exits) {
        this.lots = lots;
        fedCount = new long[lots];
        fedMass = new double[lots];
        outCount = new long[lots * exits];
        outMass = new double[lots * exits];
    }

    void fed(int lot, double mass) {
        fedCount[lot]++;
        fedMass[lot] += mass;
    }

    void left(int exit, int lot, double mass) {
        outCount[exit * lots + lot]++;
        outMass[exit * lots + lot] += mass;
    }

    public long fedCount(int lot) {
        return fedCount[lot];
    }

    /** Mass fed, kg. */
    public double fedMass(int lot) {
        return fedMass[lot];
    }

    public long outCount(int exit, int lot) {
        return outCount[exit * lots + lot];
    }

    /** Mass that left through an exit, kg. */
    public double outMass(int exit, int lot) {
        return outMass[exit * lots + lot];
    }

    /** Grains of all lots fed so far. */
    public long fedCount() {
        long total = 0;
        for (long count : fedCount) {
            total += count;
        }
        return total;
    }

    /** Grains of all lots that left through any exit. */
    public long outCount() {
        long total = 0;
        for (long count : outCount) {
            total += count;
        }
        return total;
    }

    @Override
    public String section() {
        return "passage";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        out.writeLongs(fedCount, 0, fedCount.length);
        out.writeDoubles(fedMass, 0, fedMass.length);
        out.writeLongs(outCount, 0, outCount.length);
        out.writeDoubles(outMass, 0, outMass.length);
    }

    @Override
    public void restore(SectionReader in) {
        in.readLongs(fedCount, 0, fedCount.length);
        in.readDoubles(fedMass, 0, fedMass.length);
        in.readLongs(outCount, 0, outCount.length);
        in.readDoubles(outMass, 0, outMass.length);
    }
}
