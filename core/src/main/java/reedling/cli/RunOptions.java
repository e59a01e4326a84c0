// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.unit.Dimension;
import reedling.unit.Quantity;
import reedling.unit.QuantityException;

/** Options of commands that step a simulation. */
final class RunOptions {

    private static final int MOST_THREADS = 1024;

    @Option(names = "--threads", paramLabel = "N", description = "Threads to compute with (default: all processors).")
    private @Nullable Integer threads;

    @Option(
            names = "--until",
            paramLabel = "TIME",
            description = "Simulated time to stop at, e.g. \"0.5 s\" (default: the case's end_time).")
    private @Nullable String until;

    int threads() {
        int number = threads == null ? Runtime.getRuntime().availableProcessors() : threads;
        if (number < 1 || number > MOST_THREADS) {
            throw usage(
                    "--threads",
                    Integer.toString(number),
                    "1 to " + MOST_THREADS,
                    "Leave it out to use all processors.");
        }
        return number;
    }

    /** Time to stop at, s; absent if the case's end counts. */
    OptionalDouble until() {
        if (until == null) {
            return OptionalDouble.empty();
        }
        double time;
        try {
            time = Quantity.read(until, Dimension.TIME);
        } catch (QuantityException fault) {
            throw new ReedlingException(ExitCode.USAGE, fault.at("command line", "--until"));
        }
        if (!(time > 0)) {
            throw usage(
                    "--until", '"' + until + '"', "a time above 0", "Write a number and a unit, such as \"0.5 s\".");
        }
        return OptionalDouble.of(time);
    }

    /** Time to stop at, s, which must not lie behind the case's end. */
    double until(double endTime) {
        double time = until().orElse(endTime);
        if (time > endTime) {
            throw usage(
                    "--until",
                    '"' + until + '"',
                    "at most output.end_time, " + endTime + " s",
                    "Give a longer run with --set 'output.end_time=\"" + until + "\"'.");
        }
        return time;
    }

    private static ReedlingException usage(String what, String got, String expected, String remedy) {
        return new ReedlingException(ExitCode.USAGE, new Finding("command line", what, got, expected, remedy));
    }
}
