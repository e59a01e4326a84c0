// SPDX-License-Identifier: Apache-2.0
package reedling.run;

/**
 * Count and mass of grains by lot, and where they went: fed, and out through each exit (outlets in order, spilled last).
 *
 * <p>Threads: one, between phases.
 */
public final class Passage {

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

    long[] counts() {
        long[] all = new long[fedCount.length + outCount.length];
        System.arraycopy(fedCount, 0, all, 0, fedCount.length);
        System.arraycopy(outCount, 0, all, fedCount.length, outCount.length);
        return all;
    }

    double[] masses() {
        double[] all = new double[fedMass.length + outMass.length];
        System.arraycopy(fedMass, 0, all, 0, fedMass.length);
        System.arraycopy(outMass, 0, all, fedMass.length, outMass.length);
        return all;
    }

    void restore(long[] counts, double[] masses) {
        System.arraycopy(counts, 0, fedCount, 0, fedCount.length);
        System.arraycopy(counts, fedCount.length, outCount, 0, outCount.length);
        System.arraycopy(masses, 0, fedMass, 0, fedMass.length);
        System.arraycopy(masses, fedMass.length, outMass, 0, outMass.length);
    }
}
