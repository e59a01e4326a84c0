// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.io.IOException;
import java.util.List;
import reedling.checkpoint.Persistent;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;

/** How long the steps were and what bounded them, over the whole run. Threads: one. */
public final class StepTally implements Persistent {

    /** What can bound a step, by number, as {@link reedling.time.StepLimits#binding} names it. */
    public static final List<String> LIMITS = List.of("contact", "approach", "stability", "margin", "drive", "maximum");

    private final long[] bound = new long[LIMITS.size()];
    private long steps;
    private double duration;
    private double shortest = Double.POSITIVE_INFINITY;
    private double longest;
    private long fineSteps;

    void take(Simulation simulation) {
        double step = simulation.pastStep();
        steps++;
        duration += step;
        shortest = Math.min(shortest, step);
        longest = Math.max(longest, step);
        fineSteps += simulation.fineSteps();
        bound[limit(simulation)]++;
    }

    /** Number of what bounded the last step. */
    static int limit(Simulation simulation) {
        return LIMITS.indexOf(simulation.limits().binding());
    }

    public long steps() {
        return steps;
    }

    /** Mean step, s. */
    public double mean() {
        return duration / steps;
    }

    /** Shortest step, s. */
    public double shortest() {
        return shortest;
    }

    /** Longest step, s. */
    public double longest() {
        return longest;
    }

    /** Fine steps in a step, on average. */
    public double meanFineSteps() {
        return (double) fineSteps / steps;
    }

    /** Part of the steps that one of {@link #LIMITS} bounded. */
    public double part(int limit) {
        return (double) bound[limit] / steps;
    }

    @Override
    public String section() {
        return "step tally";
    }

    @Override
    public void save(SectionWriter out) throws IOException {
        out.writeLong(steps);
        out.writeDouble(duration);
        out.writeDouble(shortest);
        out.writeDouble(longest);
        out.writeLong(fineSteps);
        out.writeLongs(bound, 0, bound.length);
    }

    @Override
    public void restore(SectionReader in) {
        steps = in.readLong();
        duration = in.readDouble();
        shortest = in.readDouble();
        longest = in.readDouble();
        fineSteps = in.readLong();
        in.readLongs(bound, 0, bound.length);
    }
}
