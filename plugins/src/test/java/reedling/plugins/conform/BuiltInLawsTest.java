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

    static List<String> names() {
        return LAWS.stream().map(ContactLawProvider::name).toList();
    }

    @ParameterizedTest
    @MethodSource("names")
    void lawKeepsTheContract(String name) {
        ContactLawProvider provider =
                LAWS.stream().filter(law -> law.name().equals(name)).findFirst().orElseThrow();
        List<LawTrial.Result> results = LawTrial.run(Subject.of(provider, Map.of(), LAWS));
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
