// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.io.IOException;
import java.util.List;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.particle.Lot;

/**
 * Which lots and sizes left through which exit in the measured window, batch by batch, and what was fed meanwhile.
 * Threads: the thread of the step loop.
 */
public final class SizePassage implements GrainWatch, Persistent {

    /** Size classes between the smallest and the largest diameter of all lots. */
    public static final int CLASSES = 60;

    private final MeasuredWindow window;
    private final int lots;
    private final int exits;
    private final double smallest;
    private final double width;
    private final long[] counts;
    private final double[] masses;
    private final double[] fed;

    /**
     * @param lots lots of the run, by number
     * @param exits number of exits: the outlets, and one for what is spilled
     */
    public SizePassage(MeasuredWindow window, List<Lot> lots, int exits) {
        this.window = window;
        this.lots = lots.size();
        this.exits = exits;
        smallest =
                lots.stream().mapToDouble(lot -> lot.sizes().smallest()).min().orElse(0);
        double largest =
                lots.stream().mapToDouble(lot -> lot.sizes().largest()).max().orElse(1e-3);
        width = Math.max(largest - smallest, 1e-6 * largest) / CLASSES;
        counts = new long[window.batches() * exits * this.lots * CLASSES];
        masses = new double[window.batches() * exits * this.lots];
        fed = new double[window.batches() * this.lots];
    }

    @Override
    public void fed(int lot, double mass, double time) {
        int batch = window.batchOf(time);
        if (batch != MeasuredWindow.OUTSIDE) {
            fed[batch * lots + lot] += mass;
        }
    }

    @Override
    public void left(int exit, int lot, double diameter, double mass, double time) {
        int batch = window.batchOf(time);
        if (batch != MeasuredWindow.OUTSIDE) {
            int row = (batch * exits + exit) * lots + lot;
            masses[row] += mass;
            counts[row * CLASSES + classOf(diameter)]++;
        }
    }

    private int classOf(double diameter) {
        return Math.max(0, Math.min(CLASSES - 1, (int) ((diameter - smallest) / width)));
    }

    /** Middle of a size class, m. */
    public double diameter(int sizeClass) {
        return smallest + (sizeClass + 0.5) * width;
    }

    public MeasuredWindow window() {
        return window;
    }

    /** Mass of a lot fed in a batch, kg. */
    public double fedMass(int batch, int lot) {
        return fed[batch * lots + lot];
    }

    /** Mass of a lot that left through an exit in a batch, kg. */
    public double leftMass(int batch, int exit, int lot) {
        return masses[(batch * exits + exit) * lots + lot];
    }

    /** Grains of all lots of a size class that left through an exit in the batches from one (inclusive) to another. */
    public long count(int exit, int sizeClass, int fromBatch, int toBatch) {
        long sum = 0;
        for (int batch = fromBatch; batch < toBatch; batch++) {
            for (int lot = 0; lot < lots; lot++) {
                sum += counts[((batch * exits + exit) * lots + lot) * CLASSES + sizeClass];
            }
        }
        return sum;
    }

    @Override
    public String section() {
        return "size passage";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        out.writeLongs(counts, 0, counts.length);
        out.writeDoubles(masses, 0, masses.length);
        out.writeDoubles(fed, 0, fed.length);
    }

    @Override
    public void restore(SectionReader in) {
        in.readLongs(counts, 0, counts.length);
        in.readDoubles(masses, 0, masses.length);
        in.readDoubles(fed, 0, fed.length);
    }
}
