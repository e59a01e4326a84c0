// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import reedling.error.ExitCode;
import reedling.error.ReedlingException;

/** From a tree to a checked case: keys, then records, then the checks that need several parts. */
final class CaseReader {

    private final Node.Table root;
    private final ProviderLookup lookup;
    private final Findings findings;

    CaseReader(Node.Table root, ProviderLookup lookup, Findings findings) {
        this.root = root;
        this.lookup = lookup;
        this.findings = findings;
    }

    CaseReading read() {
        String resolved = TomlText.write(root);
        // these two may be left out: all of their keys have defaults
        root.entries().putIfAbsent("laws", Node.Table.empty(root.place()));
        root.entries().putIfAbsent("steps", Node.Table.empty(root.place()));
        Values values = new ValueReader(root, lookup, findings).section(root, CaseKeys.ROOT, "");
        Places places = new Places(root);
        Rules rules = new Rules(places, findings);
        Draft draft = new Draft(values, rules);
        if (!findings.incomplete()) {
            PairChecks.run(draft, rules);
            FeedChecks.run(draft, rules);
            WireChecks.run(draft, rules);
            OutputChecks.run(draft, rules);
            StepChecks.run(draft, rules);
        }
        if (!findings.none()) {
            throw new ReedlingException(ExitCode.CASE, findings.errors());
        }
        return new CaseReading(draft.complete(), findings.cautions(), resolved, places);
    }
}
