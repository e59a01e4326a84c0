// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import java.io.IOException;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;

/** Mean of a sampled number in each batch of the measured window. Threads: one. */
public final class BatchMean implements Persistent {

    private final String name;
    private final MeasuredWindow window;
    private final double[] sums;
    private final long[] samples;

    /** @param name of its section in checkpoints, unique in a run */
    public BatchMean(String name, MeasuredWindow window) {
        this.name = name;
        this.window = window;
        sums = new double[window.batches()];
        samples = new long[window.batches()];
    }

    /** Takes a value at a time, s. */
    public void add(double time, double value) {
        int batch = window.batchOf(time);
        if (batch != MeasuredWindow.OUTSIDE) {
            sums[batch] += value;
            samples[batch]++;
        }
    }

    /** Means of the first so many batches; not a number where there was no sample. */
    public double[] means(int batches) {
        double[] means = new double[batches];
        for (int k = 0; k < batches; k++) {
            means[k] = sums[k] / samples[k];
        }
        return means;
    }

    @Override
    public String section() {
        return name;
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        out.writeDoubles(sums, 0, sums.length);
        out.writeLongs(samples, 0, samples.length);
    }

    @Override
    public void restore(SectionReader in) {
        in.readDoubles(sums, 0, sums.length);
        in.readLongs(samples, 0, samples.length);
    }
}
