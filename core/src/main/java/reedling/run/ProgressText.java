// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.io.PrintStream;
import java.util.Locale;
import java.util.function.LongSupplier;

/**
 * Progress as text in plain ASCII: on a terminal one line that is written over, into a file or pipe a line at most every
 * 10 s and at each tenth of the run. Threads: one.
 */
public final class ProgressText implements Progress {

    private static final long LIVE_EVERY = 200_000_000L; // ns
    private static final long LINE_EVERY = 10_000_000_000L; // ns

    private final PrintStream out;
    private final boolean terminal;
    private final int width;
    private final LongSupplier clock;
    private long last;
    private int lastTenth;
    private int shown;

    /**
     * @param terminal whether a line can be written over
     * @param width columns of the terminal; lines are cut to one less
     * @param clock ns, such as {@link System#nanoTime}
     */
    public ProgressText(PrintStream out, boolean terminal, int width, LongSupplier clock) {
        this.out = out;
        this.terminal = terminal;
        this.width = width;
        this.clock = clock;
        last = clock.getAsLong();
    }

    @Override
    public boolean wanted(double fraction) {
        long waited = clock.getAsLong() - last;
        if (terminal) {
            return waited >= LIVE_EVERY;
        }
        return waited >= LINE_EVERY || (int) (10 * fraction) > lastTenth;
    }

    @Override
    public void show(Status status) {
        last = clock.getAsLong();
        lastTenth = Math.max(lastTenth, (int) (10 * status.time() / status.endTime()));
        String line = line(status);
        if (terminal) {
            String cut = line.length() < width ? line : line.substring(0, width - 1);
            out.print("\r" + cut + " ".repeat(Math.max(0, shown - cut.length())));
            shown = cut.length();
        } else {
            out.println(line);
        }
        out.flush();
    }

    @Override
    public void close() {
        if (terminal && shown > 0) {
            out.println();
            out.flush();
            shown = 0;
        }
    }

    /** The line for a status; the last parts are the ones a narrow terminal may lose. */
    static String line(Status status) {
        return String.format(
                Locale.ROOT,
                "%.4g of %.4g s, %s left, step %.3g us (%s), %.3g M grain-steps/s, %d in, %d out, residual %.1e",
                status.time(),
                status.endTime(),
                duration(status.timeLeft()),
                1e6 * status.step(),
                status.limit(),
                1e-6 * status.grainSteps(),
                status.fed(),
                status.gone(),
                status.residual());
    }

    /** A duration (s) for reading. */
    static String duration(double seconds) {
        if (!(seconds < 1e8)) {
            return "?";
        }
        long whole = Math.round(seconds);
        long hours = whole / 3600;
        return hours > 0
                ? String.format(Locale.ROOT, "%d h %02d min", hours, whole / 60 % 60)
                : String.format(Locale.ROOT, "%d min %02d s", whole / 60, whole % 60);
    }
}
