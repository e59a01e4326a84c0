// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The conformance kit for contact laws. A test of a plugin runs it and asserts that there are no findings:
 *
 * <pre>assertThat(LawTrial.findings(Subject.of(new MyProvider(), Map.of(), LoadedLaws.onClassPath()))).isEmpty();</pre>
 *
 * <p>Threads: one; a trial takes a few seconds.
 */
public final class LawTrial {

    private static final List<Check> CHECKS = List.of(
            new ActionReaction(),
            new FrameIndifference(),
            new Passivity(),
            new RowIndependence(),
            new CarriedHistory(),
            new CheckpointReturn(),
            new HonestTimeScale(),
            new FiniteNumbers(),
            new NoAllocation());

    /**
     * Result of one check.
     *
     * @param check its name
     * @param outcome what it found
     */
    public record Result(String check, Outcome outcome) {

        public boolean passed() {
            return outcome.findings().isEmpty();
        }
    }

    private LawTrial() {}

    /** Runs every check; for one of them a second Java machine is started. */
    public static List<Result> run(Subject subject) {
        return run(subject, OtherWidth.of(subject));
    }

    static List<Result> run(Subject subject, Optional<OtherWidth> otherWidth) {
        List<Result> results = new ArrayList<>();
        for (Check check : CHECKS) {
            results.add(new Result(check.name(), outcome(check, subject)));
        }
        results.add(new Result(SameWidths.NAME, outcome(new SameWidths(otherWidth), subject)));
        return results;
    }

    /** Every finding of every check, with the check's name before it. */
    public static List<String> findings(Subject subject) {
        return run(subject).stream()
                .flatMap(result -> result.outcome().findings().stream().map(finding -> result.check() + ": " + finding))
                .toList();
    }

    /** A law may throw anything; that is what it is here for. */
    private static Outcome outcome(Check check, Subject subject) {
        try {
            return check.run(subject);
        } catch (RuntimeException | LinkageError thrown) {
            return Outcome.of(false, "The law throws " + thrown + ".", "Not measured: the law throws.");
        }
    }
}
