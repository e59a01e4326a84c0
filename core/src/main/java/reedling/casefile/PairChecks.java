// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** One pair for every two materials that can touch: grain on grain, and grain on every wall and wire. */
final class PairChecks {

    private final Draft draft;
    private final Rules rules;
    private final Map<String, String> written = new HashMap<>();

    private PairChecks(Draft draft, Rules rules) {
        this.draft = draft;
        this.rules = rules;
    }

    static void run(Draft draft, Rules rules) {
        PairChecks checks = new PairChecks(draft, rules);
        checks.noneTwice();
        // a pair whose materials cannot be read might be the missing one
        if (draft.root.several("pairs").stream().allMatch(pair -> pair.has("materials"))) {
            checks.noneMissing();
        }
    }

    private static String key(String a, String b) {
        return a.compareTo(b) <= 0 ? a + " and " + b : b + " and " + a;
    }

    private void noneTwice() {
        for (Values pair : draft.root.several("pairs")) {
            if (pair.has("materials")) {
                List<String> names = pair.words("materials");
                String key = key(names.get(0), names.get(1));
                String first = written.putIfAbsent(key, pair.path());
                if (first != null) {
                    String remedy = "The first is " + first + " at " + rules.where(first) + "; remove one.";
                    rules.error(pair.path(), "a second entry for " + key, "one entry for every two materials", remedy);
                }
            }
        }
    }

    private void noneMissing() {
        Map<String, String> grains = users("lots", "lot ");
        Map<String, String> touched = new LinkedHashMap<>(grains);
        users("walls", "wall ").forEach(touched::putIfAbsent);
        users("wires", "wires ").forEach(touched::putIfAbsent);
        Map<String, String> reported = new HashMap<>();
        grains.forEach((grain, lot) -> touched.forEach((surface, user) -> {
            String key = key(grain, surface);
            if (!written.containsKey(key) && reported.putIfAbsent(key, lot) == null) {
                String who = lot.equals(user) ? "grains of " + lot + " touch each other" : lot + " touches " + user;
                String remedy = "Add [[pairs]] with materials = [\"" + grain + "\", \"" + surface + "\"]: " + who + ".";
                rules.error(
                        "pairs",
                        "without an entry for " + key,
                        "a pair for every two materials that can touch",
                        remedy);
            }
        }));
    }

    /** Materials with the first part that uses each. */
    private Map<String, String> users(String table, String noun) {
        Map<String, String> users = new LinkedHashMap<>();
        draft.root.<Values>named(table).forEach((name, values) -> {
            if (values.has("material")) {
                users.putIfAbsent(values.text("material"), noun + name);
            }
        });
        return users;
    }
}
