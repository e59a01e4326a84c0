// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;

/** Collects what the parts of a run refuse while they are made from a case, and says where in the case that was written. */
final class PartFaults {

    private final CaseReading reading;
    private final List<Finding> findings = new ArrayList<>();

    PartFaults(CaseReading reading) {
        this.reading = reading;
    }

    /**
     * Makes a part; empty if it was refused.
     *
     * @param path of the part in the case, such as {@code wires.deck}
     */
    <T> Optional<T> make(String path, Supplier<T> maker) {
        try {
            return Optional.of(maker.get());
        } catch (ReedlingException refused) {
            if (refused.exitCode() != ExitCode.CASE) {
                throw refused;
            }
            refused.findings().forEach(finding -> add(path, finding));
            return Optional.empty();
        }
    }

    /** A fault of one key. */
    void add(String path, String got, String expected, String remedy) {
        findings.add(new Finding(reading.where(path), path, got, expected, remedy));
    }

    /** The place of the key whose words a finding uses, or of the part if there is none. */
    private void add(String path, Finding finding) {
        String key = path + "." + finding.what().replace(' ', '_');
        String what = finding.what().isEmpty() ? path : path + ", " + finding.what();
        findings.add(new Finding(reading.where(key), what, finding.got(), finding.expected(), finding.remedy()));
    }

    /** Throws everything collected, if there is anything. */
    void finish() {
        if (!findings.isEmpty()) {
            throw new ReedlingException(
                    ExitCode.CASE, findings.stream().distinct().toList());
        }
    }
}
