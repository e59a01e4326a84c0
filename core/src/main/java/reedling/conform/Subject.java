// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.Stage;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;

/**
 * A contact law on trial, with the laws of earlier stages that stand under it and one of its own stage to compare with.
 *
 * @param provider of the law
 * @param law the law
 * @param values its parameters, SI
 * @param laws all laws of the trial by stage, the law included
 * @param yardstick a built-in law of the same stage, if there is another
 */
public record Subject(
        ContactLawProvider provider,
        ContactLaw law,
        Map<String, Double> values,
        Map<Stage, ContactLaw> laws,
        Optional<ContactLawProvider> yardstick) {

    private static final Map<Stage, String> USUAL =
            Map.of(Stage.NORMAL, "hertz", Stage.TANGENTIAL, "mindlin", Stage.ROLLING, "elastic-plastic");

    public Subject {
        values = Map.copyOf(values);
        laws = Map.copyOf(laws);
    }

    /**
     * Puts a law on trial. Under it stand the built-in normal law and, for stages after friction, the built-in friction
     * law, where the loaded plugins have them.
     *
     * @param provider of the law
     * @param given parameters, SI; those left out take their defaults
     * @param loaded laws there are, for the earlier stages and to compare with
     */
    public static Subject of(ContactLawProvider provider, Map<String, Double> given, List<ContactLawProvider> loaded) {
        ParameterValues values = ParameterValues.of(provider, given);
        ContactLaw law = provider.create(values);
        Map<Stage, ContactLaw> laws = new EnumMap<>(Stage.class);
        for (Stage stage : List.of(Stage.NORMAL, Stage.TANGENTIAL)) {
            if (stage.ordinal() < provider.stage().ordinal()) {
                usual(stage, loaded).ifPresent(under -> laws.put(stage, withDefaults(under)));
            }
        }
        laws.put(provider.stage(), law);
        Optional<ContactLawProvider> yardstick = usual(provider.stage(), loaded)
                .or(() -> another(provider, loaded))
                .filter(other -> !other.name().equals(provider.name()));
        return new Subject(provider, law, values.values(), laws, yardstick);
    }

    private static Optional<ContactLawProvider> usual(Stage stage, List<ContactLawProvider> loaded) {
        return loaded.stream()
                .filter(other -> other.stage() == stage && other.name().equals(USUAL.get(stage)))
                .findFirst();
    }

    private static Optional<ContactLawProvider> another(ContactLawProvider provider, List<ContactLawProvider> loaded) {
        return loaded.stream()
                .filter(other -> other.stage() == provider.stage()
                        && other.getClass().getName().startsWith("reedling.")
                        && other.parameters().stream().noneMatch(Parameter::obligatory))
                .findFirst();
    }

    private static ContactLaw withDefaults(ContactLawProvider provider) {
        return provider.create(ParameterValues.of(provider, Map.of()));
    }

    /** The same trial with the built-in law in place of the law, if there is one. */
    Optional<Map<Stage, ContactLaw>> yardstickLaws() {
        return yardstick.map(other -> {
            Map<Stage, ContactLaw> changed = new EnumMap<>(laws);
            changed.put(stage(), withDefaults(other));
            return changed;
        });
    }

    /** The laws of the trial with another in place of the law itself. */
    Map<Stage, ContactLaw> lawsWith(ContactLaw other) {
        Map<Stage, ContactLaw> changed = new EnumMap<>(laws);
        changed.put(stage(), other);
        return changed;
    }

    public String name() {
        return provider.name();
    }

    public Stage stage() {
        return provider.stage();
    }
}
