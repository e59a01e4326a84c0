// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.io.IOException;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;

/** What the midpoint rule took to settle, over the whole run. Threads: one. */
public final class MidpointTally implements Persistent {

    private static final int OTHER_PASSES = 2; // where a step starts and where it ends

    private long steps;
    private long iterations;
    private long most;
    private long halvings;

    /** One step, with the iterations of all its attempts and those of the last, and the halvings between them. */
    void take(long all, long last, long halved) {
        steps++;
        iterations += all;
        most = Math.max(most, last);
        halvings += halved;
    }

    public long steps() {
        return steps;
    }

    /** Iterations in a step on average, those of attempts with too long a step included. */
    public double meanIterations() {
        return steps == 0 ? 0 : (double) iterations / steps;
    }

    /** Most iterations after which a step had settled. */
    public long mostIterations() {
        return most;
    }

    /** How often a step was halved because it did not settle. */
    public long halvings() {
        return halvings;
    }

    /** Force passes in a step on average; an explicit step takes one. */
    public double meanPasses() {
        return steps == 0 ? 0 : OTHER_PASSES + meanIterations();
    }

    @Override
    public String section() {
        return "midpoint";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        out.writeLong(steps);
        out.writeLong(iterations);
        out.writeLong(most);
        out.writeLong(halvings);
    }

    @Override
    public void restore(SectionReader in) {
        steps = in.readLong();
        iterations = in.readLong();
        most = in.readLong();
        halvings = in.readLong();
    }
}
