// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Checks that the laws of a case stand together: nothing is brought twice, and nothing that a law needs is missing. */
public final class LawCombination {

    /**
     * Why a law cannot stand beside the others.
     *
     * @param stage of the refused law
     * @param got what the case has
     * @param expected what would be right
     * @param remedy a sentence
     */
    public record Refusal(Stage stage, String got, String expected, String remedy) {}

    private LawCombination() {}

    /** Everything that speaks against a combination, in the order of the stages. */
    public static List<Refusal> refusals(Map<Stage, ContactLawProvider> laws) {
        List<Refusal> all = new ArrayList<>();
        for (Stage stage : Stage.values()) {
            ContactLawProvider law = laws.get(stage);
            if (law != null) {
                refuseSecond(stage, law, laws, all);
                refuseLacking(stage, law, laws, all);
            }
        }
        return all;
    }

    private static void refuseSecond(
            Stage stage, ContactLawProvider law, Map<Stage, ContactLawProvider> laws, List<Refusal> all) {
        laws.forEach((other, brought) -> {
            if (other.compareTo(stage) < 0) {
                for (Trait trait : law.brings()) {
                    if (brought.brings().contains(trait)) {
                        all.add(new Refusal(
                                stage,
                                law.name() + " beside " + brought.name(),
                                "one law that brings " + trait.noun(),
                                "Both bring it: remove one of the two."));
                    }
                }
            }
        });
    }

    private static void refuseLacking(
            Stage stage, ContactLawProvider law, Map<Stage, ContactLawProvider> laws, List<Refusal> all) {
        for (Trait trait : law.needs()) {
            boolean there = laws.entrySet().stream()
                    .anyMatch(entry ->
                            entry.getKey() != stage && entry.getValue().brings().contains(trait));
            if (!there) {
                all.add(new Refusal(
                        stage,
                        law.name() + " without " + trait.noun(),
                        "a law beside it that brings " + trait.noun(),
                        law.name() + " is made for it: choose another law for one of the stages."));
            }
        }
    }
}
