// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;

/** Reports what no single key is to blame for, at the place of the key or table concerned. */
final class Rules {

    private final Places places;
    private final Findings findings;

    Rules(Places places, Findings findings) {
        this.places = places;
        this.findings = findings;
    }

    void error(String path, String got, String expected, String remedy) {
        findings.error(places.of(path), path, got, expected, remedy);
    }

    void caution(String path, String got, String expected, String remedy) {
        findings.caution(places.of(path), path, got, expected, remedy);
    }

    String where(String path) {
        return places.of(path).where();
    }

    /** An absence; silent if the syntax reader dropped parts of the file. */
    void missing(String path, String got, String expected, String remedy) {
        if (!findings.incomplete()) {
            error(path, got, expected, remedy);
        }
    }

    /** Whether exactly one of the keys is there; reports it otherwise. */
    boolean exactlyOne(Values values, String... keys) {
        List<String> present = present(values, keys);
        if (present.isEmpty() && !findings.incomplete()) {
            error(values.path(), "without " + String.join(" and ", keys), "exactly one of them", "Add one.");
        }
        return !present.isEmpty() && alone(values, present, "exactly one");
    }

    /** Whether at most one of the keys is there; reports it otherwise. */
    boolean atMostOne(Values values, String... keys) {
        return alone(values, present(values, keys), "at most one");
    }

    private boolean alone(Values values, List<String> present, String expected) {
        if (present.size() > 1) {
            String path = ValueReader.join(values.path(), present.getLast());
            List<String> others = present.subList(0, present.size() - 1);
            error(path, "given together with " + String.join(", ", others), expected + " of them", "Remove one.");
        }
        return present.size() <= 1;
    }

    private static List<String> present(Values values, String... keys) {
        return List.of(keys).stream().filter(values::has).toList();
    }
}
