// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.List;

/**
 * What a check found.
 *
 * @param findings sentences on what breaks the contract; empty if nothing does
 * @param measured what was measured, a sentence
 */
public record Outcome(List<String> findings, String measured) {

    public Outcome {
        findings = List.copyOf(findings);
    }

    /** A measurement without findings where it holds, else with one. */
    static Outcome of(boolean holds, String finding, String measured) {
        return new Outcome(holds ? List.of() : List.of(finding), measured);
    }
}
