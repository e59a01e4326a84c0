// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.util.Arrays;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.LongStream;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;

/** Seeds as written on the command line: {@code 1..5} or {@code 3,7,20}. */
final class SeedList {

    private static final int MOST = 1000;
    private static final Pattern RANGE = Pattern.compile("(\\d{1,15})\\.\\.(\\d{1,15})");
    private static final Pattern LIST = Pattern.compile("\\d{1,15}(,\\d{1,15})*");

    private SeedList() {}

    /**
     * The seeds of a text, at least two and all different.
     *
     * @throws ReedlingException with {@link ExitCode#USAGE} for any other text
     */
    static List<Long> of(String text) {
        List<Long> seeds = List.of();
        Matcher range = RANGE.matcher(text);
        if (range.matches()) {
            long first = Long.parseLong(range.group(1));
            long last = Long.parseLong(range.group(2));
            if (last - first < MOST) {
                seeds = LongStream.rangeClosed(first, last).boxed().toList();
            }
        } else if (LIST.matcher(text).matches()) {
            seeds = Arrays.stream(text.split(",")).map(Long::valueOf).distinct().toList();
        }
        if (seeds.size() < 2 || seeds.size() > MOST) {
            throw new ReedlingException(
                    ExitCode.USAGE,
                    new Finding(
                            "command line",
                            "--seeds",
                            '"' + text + '"',
                            "2 to " + MOST + " different seeds",
                            "Write a range such as 1..5 or a list such as 3,7,20."));
        }
        return seeds;
    }
}
