// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** What can be wrong in size distributions as laboratories give them, in probes and in funnels. */
class LaboratoryErrorsTest {

    /** Line of the header of a probe appended to the small case. */
    private static final long NEXT = Cases.small().lines().count() + 2;

    private static void expectOfSizes(String table, String... findings) {
        assertThat(Cases.findings(Cases.with("\"4 mm\"", table))).containsExactly(findings);
    }

    @Test
    void sieveTablesAreCompleteAndOrdered() {
        String table = "{distribution = \"sieve-table\", basis = \"mass\", sieves = [%s]%s}";
        String two = "{opening = \"3 mm\", retained = 20}, {opening = \"2 mm\", retained = 80}";
        expectOfSizes(
                table.formatted(two, ""),
                "deck.toml:27:1 lots.small.diameter.max: is missing, though something lies on the coarsest sieve, expected"
                        + " a size more than the coarsest opening, 3 mm. Say how far these grains reach.");
        expectOfSizes(
                table.formatted(two, ", pan = 5, min = \"2 mm\", max = \"4 mm\""),
                "deck.toml:27:149 lots.small.diameter.min: is 2 mm, expected less than the finest opening, 2 mm. "
                        + "Say how far these grains reach.");
        expectOfSizes(
                table.formatted("{opening = \"3 mm\", passing = 0.4}, {opening = \"2 mm\", passing = 0.6}", ""),
                "deck.toml:27:88 lots.small.diameter.sieves[1].passing: is 0.4, expected at least what passes the finer "
                        + "lots.small.diameter.sieves[2], 0.6. Exchange the two, or give what is retained.");
        expectOfSizes(
                table.formatted("{opening = \"3 mm\", passing = 1}, {opening = \"2 mm\", retained = 6}", ""),
                "deck.toml:27:88 lots.small.diameter.sieves[1].passing: is given where other sieves have retained, "
                        + "expected the same for all sieves. Convert one kind.");
        expectOfSizes(
                table.formatted("{opening = \"3 mm\", retained = 1}, {opening = \"3 mm\", retained = 6}", ""),
                "deck.toml:27:104 lots.small.diameter.sieves[2].opening: is 3 mm as in lots.small.diameter.sieves[1], "
                        + "expected each opening once. Remove one of the rows.");
    }

    @Test
    void cutsOfLaboratoryDistributionsKeepSomething() {
        expectOfSizes(
                "{distribution = \"rosin-rammler\", basis = \"mass\", characteristic_size = \"1 mm\", uniformity = 3, "
                        + "min = \"3 mm\", max = \"4 mm\"}",
                "deck.toml:27:61 lots.small.diameter.characteristic_size: is 1 mm, which leaves 1.87953e-12 of the "
                        + "distribution between min and max, expected at least 0.01. Move the cuts or the characteristic"
                        + " size.");
        expectOfSizes(
                "{distribution = \"gates-gaudin-schuhmann\", basis = \"mass\", size_modulus = \"3 mm\", "
                        + "distribution_modulus = 0.8, min = \"2 mm\", max = \"4 mm\"}",
                "deck.toml:27:135 lots.small.diameter.max: is 4 mm, expected at most size_modulus, 3 mm. "
                        + "No grain is larger: lower the cut.");
    }

    private static String probe(String keys) {
        return Cases.small() + "\n[probes.pile]\n" + keys;
    }

    @Test
    void probesAreSound() {
        assertThat(Cases.findings(probe("kind = \"heap\"\ncentre = [0, 0, 0]\nflank_from = 0.9\nflank_to = 0.5")))
                .containsExactly("deck.toml:" + (NEXT + 4)
                        + ":1 probes.pile.flank_to: is 0.5, expected more than flank_from, 0.9. Exchange the two.");
        String waves = "kind = \"layer-waves\"\nmin = [0, 0, 0]\nmax = [1, 1, 1]\ncell = \"5 mm\"\n";
        assertThat(Cases.findings(probe(waves + "motion = \"shake\"\nperiods = 12")))
                .containsExactly("deck.toml:" + (NEXT + 6) + ":1 probes.pile.periods: is 12, expected a multiple of 8. "
                        + "Only then do waves and background stay apart.");
        assertThat(Cases.findings(probe(waves + "motion = \"shak\"")))
                .singleElement()
                .asString()
                .contains("probes.pile.motion", "shake");
    }

    @Test
    void aConeHasARim() {
        String cone = "\n[walls.funnel]\nshape = \"cone\"\nmaterial = \"steel\"\ncentre = [0, 0, 0]\n"
                + "direction = [0, 0, 1]\nlength = 1\nlow_radius = 0\nhigh_radius = 0\n";
        assertThat(Cases.findings(Cases.small() + cone))
                .singleElement()
                .asString()
                .contains("walls.funnel.high_radius: is 0, as low_radius, expected one radius above 0");
    }
}
