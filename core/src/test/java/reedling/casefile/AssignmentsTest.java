// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import org.joml.Vector3d;
import org.junit.jupiter.api.Test;

class AssignmentsTest {

    private static void expect(String assignment, String... findings) {
        assertThat(Cases.findings(Cases.small(), assignment)).containsExactly(findings);
    }

    @Test
    void assignmentsReplaceAndAddKeys() {
        CaseSpecification spec = Cases.read(
                        Cases.small(),
                        "wires.deck.rigid=true",
                        "output.checkpoint_every=\"0.01 s\"",
                        "wires.deck.pitch = [0, \"8 mm\", 0]",
                        "pairs[2].friction=0.45",
                        "laws.normal={law = \"linear\", stiffness = \"2 kN/m\"}",
                        "lots.small.diameter={distribution=\"uniform\", min=\"1 mm\", max=\"2 mm\"}",
                        "lots.small.diameter.max=0.003")
                .specification();
        assertThat(spec.wires().get("deck").rigid()).isTrue();
        assertThat(spec.output().checkpointEvery()).hasValue(0.01);
        assertThat(spec.wires().get("deck").pitch()).isEqualTo(new Vector3d(0, 0.008, 0));
        assertThat(spec.pairs().get(1).friction()).isEqualTo(0.45);
        assertThat(spec.laws().normal().parameters().get("stiffness")).isEqualTo(2000);
        assertThat(spec.lots().get("small").diameter()).isEqualTo(new DiameterSpecification.Uniform(0.001, 0.003));
    }

    @Test
    void aWrongKeyIsFoundLikeInTheFile() {
        expect(
                "output.end_tiem=3",
                "--set output.end_tiem: is an unknown key, expected one of end_time, snapshot_every, table_every, "
                        + "checkpoint_every, checkpoint_every_wall, ledger. Did you mean end_time?");
        expect(
                "wires.deck.tension=\"3 kg\"",
                "--set wires.deck.tension: is \"3 kg\", a mass (kg), expected a force (N). "
                        + "Write a unit of that kind, or a bare number in N.");
        expect(
                "pairs[1].friction=9",
                "--set pairs[1].friction: is 9, expected 0 ≤ value ≤ 5. Check the value and its unit.");
    }

    @Test
    void aWrongNameOnTheWaySuggestsTheNearest() {
        expect(
                "wires.dekc.rigid=true",
                "--set wires.dekc.rigid: is inside dekc, which the case does not have, expected one of deck, rod. "
                        + "Did you mean deck?");
        expect(
                "lots.small.diameter.max=3",
                "--set lots.small.diameter.max: is inside diameter, which is \"4 mm\", expected a table. "
                        + "Set the whole value: --set lots.small.diameter={...}.");
        expect(
                "pairs[3].friction=0.1",
                "--set pairs[3].friction: is without item pairs[3], expected an index from 1 to 2. "
                        + "Items are counted from 1, in file order.");
    }

    @Test
    void aValueThatIsNoTomlShowsTheQuotes() {
        expect(
                "output.end_time=0.5 s",
                "--set output.end_time: is 0.5 s, which is no TOML value, expected a TOML value. Put text and values "
                        + "with a unit in double quotes inside single ones: --set output.end_time='\"0.5 s\"'.");
        expect(
                "case.seed=1\nx = 2",
                "--set case.seed: is 1\nx = 2, which is no TOML value, expected a TOML value. Put text and values "
                        + "with a unit in double quotes inside single ones: --set case.seed='\"1\\nx = 2\"'.");
    }

    @Test
    void anAssignmentNeedsKeyAndValue() {
        expect("rigid", "--set: is \"rigid\", expected KEY=VALUE. Write for example --set output.end_time='\"2 s\"'.");
        expect(
                "wires..rigid=true",
                "--set wires..rigid: is no key, expected names joined by points, like wires.deck.tension. "
                        + "Correct the key.");
        expect(
                "case.seed=",
                "--set case.seed: is empty, expected a TOML value. Put text and values with a unit in double quotes "
                        + "inside single ones: --set case.seed='\"\"'.");
    }
}
