// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import reedling.plugin.ParameterValues;

class LawCombinationTest {

    private record Named(String name, Stage stage, Set<Trait> brings, Set<Trait> needs) implements ContactLawProvider {

        @Override
        public int apiLevel() {
            return API_LEVEL;
        }

        @Override
        public String summary() {
            return "for tests";
        }

        @Override
        public String source() {
            return "none";
        }

        @Override
        public ContactLaw create(ParameterValues values) {
            throw new IllegalStateException("not asked for");
        }
    }

    private static final Named ROUND = new Named(
            "round", Stage.NORMAL, Set.of(Trait.STIFFNESS, Trait.CONTACT_RADIUS, Trait.HERTZ_CONTACT), Set.of());
    private static final Named STICKY =
            new Named("sticky", Stage.NORMAL, Set.of(Trait.STIFFNESS, Trait.CONTACT_RADIUS, Trait.ADHESION), Set.of());
    private static final Named FORCE_ONLY = new Named("force-only", Stage.NORMAL, Set.of(), Set.of());
    private static final Named PULL =
            new Named("pull", Stage.ADHESION, Set.of(Trait.ADHESION), Set.of(Trait.HERTZ_CONTACT));
    private static final Named ROLLING = new Named("roll", Stage.ROLLING, Set.of(), Set.of(Trait.STIFFNESS));

    private static List<String> refusals(Named... laws) {
        Map<Stage, ContactLawProvider> byStage = new EnumMap<>(Stage.class);
        for (Named law : laws) {
            byStage.put(law.stage(), law);
        }
        return LawCombination.refusals(byStage).stream()
                .map(one -> one.stage() + " " + one.got() + ", " + one.expected())
                .toList();
    }

    @Test
    void lawsThatCompleteEachOtherStandTogether() {
        assertThat(refusals(ROUND, PULL, ROLLING)).isEmpty();
        assertThat(refusals(STICKY, ROLLING)).isEmpty();
        assertThat(refusals(FORCE_ONLY)).isEmpty();
    }

    @Test
    void secondAdhesionIsRefusedAndSoIsTheContactItWasNotMadeFor() {
        assertThat(refusals(STICKY, PULL))
                .containsExactly(
                        "ADHESION pull beside sticky, one law that brings adhesion",
                        "ADHESION pull without an unchanged contact of Hertz,"
                                + " a law beside it that brings an unchanged contact of Hertz");
    }

    @Test
    void rollingNeedsANormalStiffness() {
        assertThat(refusals(FORCE_ONLY, ROLLING))
                .containsExactly(
                        "ROLLING roll without a normal stiffness, a law beside it that brings a normal stiffness");
    }

    @Test
    void whatALawOfAStageBringsByItself() {
        ContactLawProvider plain = new ContactLawProvider() {
            @Override
            public Stage stage() {
                return Stage.ADHESION;
            }

            @Override
            public String name() {
                return "plain";
            }

            @Override
            public int apiLevel() {
                return API_LEVEL;
            }

            @Override
            public String summary() {
                return "for tests";
            }

            @Override
            public String source() {
                return "none";
            }

            @Override
            public ContactLaw create(ParameterValues values) {
                throw new IllegalStateException("not asked for");
            }
        };
        assertThat(plain.brings()).containsExactly(Trait.ADHESION);
        assertThat(plain.needs()).isEmpty();
    }
}
