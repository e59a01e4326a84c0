// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.conform;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import reedling.conform.LawTrial;
import reedling.conform.LoadedLaws;
import reedling.conform.Subject;
import reedling.contact.ContactLawProvider;

/** Every law that the class path offers keeps the contract. */
class BuiltInLawsTest {

    private static final List<ContactLawProvider> LAWS = LoadedLaws.onClassPath();

    /** Values, SI, for the parameters that a case must give. */
    private static final Map<String, Map<String, Double>> GIVEN = Map.of(
            "dmt-adhesion", Map.of("work_of_adhesion", 0.05),
            "jkr", Map.of("work_of_adhesion", 0.05),
            "lennard-jones", Map.of("depth", 1e-9, "zero_distance", 1e-4, "contact_distance", 1e-4, "cutoff", 5e-4));

    static List<String> names() {
        return LAWS.stream().map(ContactLawProvider::name).toList();
    }

    @ParameterizedTest
    @MethodSource("names")
    void lawKeepsTheContract(String name) {
        ContactLawProvider provider =
                LAWS.stream().filter(law -> law.name().equals(name)).findFirst().orElseThrow();
        List<LawTrial.Result> results = LawTrial.run(Subject.of(provider, GIVEN.getOrDefault(name, Map.of()), LAWS));
        assertThat(results)
                .allSatisfy(result -> assertThat(result.outcome().findings())
                        .as(result.check())
                        .isEmpty());
    }

    @Test
    void classPathOffersALawOfEveryUsualStage() {
        assertThat(names()).contains("hertz", "mindlin", "elastic-plastic");
    }
}
