// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.List;
import java.util.Optional;

/**
 * Eight rows at a time and one at a time give the same bits.
 *
 * @param other the law in a machine of the other width
 */
record SameWidths(Optional<OtherWidth> other) implements Check {

    static final String NAME = "same bits at every vector width";

    @Override
    public String name() {
        return NAME;
    }

    @Override
    public Outcome run(Subject subject) {
        if (other.isEmpty()) {
            return new Outcome(
                    List.of(), "Not asked: the provider is not public with a public constructor without arguments.");
        }
        boolean same = other.get().fingerprint() == Fingerprint.of(subject);
        return Outcome.of(
                same,
                "Eight rows at a time and one at a time give different forces: use fma in the same places and no"
                        + " sum across rows.",
                same ? "61 contacts, 300 steps: the same bits." : "The bits differ.");
    }
}
