// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;
import java.util.Map;
import reedling.error.Finding;

/** A case that was read without error. Immutable. */
public final class CaseReading {

    private final CaseSpecification specification;
    private final List<Finding> cautions;
    private final String resolvedText;
    private final Places places;

    CaseReading(CaseSpecification specification, List<Finding> cautions, String resolvedText, Places places) {
        this.specification = specification;
        this.cautions = List.copyOf(cautions);
        this.resolvedText = resolvedText;
        this.places = places;
    }

    /** The same case with other feeds, for a trial. */
    CaseReading withFeeds(Map<String, FeedSpecification> feeds) {
        CaseSpecification s = specification;
        CaseSpecification other = new CaseSpecification(
                s.title(),
                s.notes(),
                s.seed(),
                s.materials(),
                s.pairs(),
                s.lots(),
                feeds,
                s.walls(),
                s.motions(),
                s.wires(),
                s.outlets(),
                s.bounds(),
                s.screen(),
                s.probes(),
                s.laws(),
                s.fields(),
                s.steps(),
                s.output());
        return new CaseReading(other, cautions, resolvedText, places);
    }

    public CaseSpecification specification() {
        return specification;
    }

    /** What may be meant but rarely is, in file order. */
    public List<Finding> cautions() {
        return cautions;
    }

    /** The case as TOML with all assignments of the command line in it; reading it gives the same specification. */
    public String resolvedText() {
        return resolvedText;
    }

    /** File, line and column of a dotted path such as {@code wires.deck.tension}, or of the nearest table around it. */
    public String where(String path) {
        return places.of(path).where();
    }
}
