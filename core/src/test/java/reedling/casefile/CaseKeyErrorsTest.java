// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** What can be wrong with a single key: each kind of message is asserted word by word once. */
class CaseKeyErrorsTest {

    private static void expect(String old, String replacement, String... findings) {
        assertThat(Cases.findings(Cases.with(old, replacement))).containsExactly(findings);
    }

    @Test
    void unknownKeySuggestsTheNearest() {
        expect(
                "tension = \"20 N\"",
                "tensoin = \"20 N\"",
                "deck.toml:104:1 wires.deck.tensoin: is an unknown key, expected one of material, section, start, end, "
                        + "count, pitch, elements, tension, start_support, end_support, motion, strain_damping, "
                        + "first_mode_damping, rigid, element. Did you mean tension?");
        expect(
                "[case]",
                "[case]\ncolour = 3",
                "deck.toml:2:1 case.colour: is an unknown key, expected one of title, notes, seed. "
                        + "Remove it or correct it.");
        expect(
                "[steps]",
                "[stpes]",
                "deck.toml:144:1 stpes: is an unknown key, expected one of case, materials, pairs, lots, feeds, walls, "
                        + "motions, wires, outlets, bounds, screen, probes, laws, fields, steps, output. Did you mean steps?");
    }

    @Test
    void wrongTypeSaysWhatIsThereAndWhatBelongsThere() {
        expect(
                "density = 7850",
                "density = true",
                "deck.toml:10:1 materials.steel.density: is true, expected a density (kg/m3), "
                        + "0 kg/m3 < value ≤ 30000 kg/m3. Write a number in kg/m3, or text with a unit.");
        expect(
                "title = \"Small\"",
                "title = 5",
                "deck.toml:2:1 case.title: is 5, expected text. Write it in double quotes.");
        expect(
                "elements = 30",
                "elements = 30.5",
                "deck.toml:103:1 wires.deck.elements: is 30.5, expected a whole number from 2 to 100000. "
                        + "Write it without point, unit and quotes.");
        expect(
                "pitch = [0, \"7 mm\", 0]",
                "pitch = \"7 mm\"",
                "deck.toml:102:1 wires.deck.pitch: is \"7 mm\", expected three components, each a length (m). "
                        + "Write three components, like [0, 0, 1].");
        expect(
                "motion = \"swirl\"",
                "motion = \"swirl\"\nrigid = \"yes\"",
                "deck.toml:116:1 wires.rod.rigid: is \"yes\", expected true or false. "
                        + "Write true or false without quotes.");
        expect(
                "section = {shape = \"round\", diameter = \"3 mm\"}",
                "section = \"3 mm\"",
                "deck.toml:111:1 wires.rod.section: is \"3 mm\", expected a table with shape = round or tube. "
                        + "Write it as a table of keys.");
        expect(
                "open_faces = [\"high-z\"]",
                "open_faces = \"high-z\"",
                "deck.toml:59:1 walls.hopper.open_faces: is \"high-z\", expected a list out of low-x, high-x, low-y, "
                        + "high-y, low-z, high-z. Write a list, like [\"low-x\"].");
        expect(
                "lots = {small = 0.25, large = 0.75}",
                "lots = [\"small\", \"large\"]",
                "deck.toml:42:1 feeds.shower.lots: is [\"small\", \"large\"], expected a table of names of lots and "
                        + "mass shares that add up to 1. Write it like {small = 0.3, large = 0.7}.");
    }

    @Test
    void wrongUnitNamesBothDimensions() {
        expect(
                "tension = \"20 N\"",
                "tension = \"20 mm\"",
                "deck.toml:104:1 wires.deck.tension: is \"20 mm\", a length (m), expected a force (N). "
                        + "Write a unit of that kind, or a bare number in N.");
        expect(
                "\"7 mm\"",
                "\"7 s\"",
                "deck.toml:102:13 wires.deck.pitch[2]: is \"7 s\", a time (s), expected a length (m). "
                        + "Write a unit of that kind, or a bare number in m.");
    }

    @Test
    void outOfRangeSaysTheRange() {
        expect(
                "youngs_modulus = \"5 GPa\"\npoisson_ratio = 0.3",
                "youngs_modulus = \"5 GPa\"\npoisson_ratio = 0.7",
                "deck.toml:7:1 materials.grain.poisson_ratio: is 0.7, expected 0 ≤ value < 0.5. "
                        + "Use 0.49 for a nearly incompressible material.");
        expect(
                "diameter = \"4 mm\"",
                "diameter = \"4 Mm\"",
                "deck.toml:27:1 lots.small.diameter: is \"4 Mm\", expected 1 µm ≤ value ≤ 1 m. "
                        + "Check the value and its unit.");
        expect(
                "count = 100",
                "count = 0",
                "deck.toml:37:1 feeds.block.count: is 0, expected a whole number from 1 to 1000000000. Check the"
                        + " value.");
        expect(
                "end_time = \"2 s\"",
                "end_time = 0",
                "deck.toml:149:1 output.end_time: is 0, expected 0 s < value ≤ 1e7 s. Check the value and its unit.");
        expect(
                "density = 7850",
                "density = nan",
                "deck.toml:10:1 materials.steel.density: is NaN, expected a finite number. "
                        + "Check the value and its unit.");
    }

    @Test
    void missingKeySaysWhatItMeans() {
        expect(
                "density = 7850\n",
                "",
                "deck.toml:9:1 materials.steel.density: is missing, expected a density (kg/m3), "
                        + "0 kg/m3 < value ≤ 30000 kg/m3. Mass per volume of the solid, not of the bulk.");
        expect(
                "kind = \"packed-block\"\n",
                "",
                "deck.toml:33:1 feeds.block.kind: is missing, expected one of packed-block, rain, jet. "
                        + "It decides which other keys belong here.");
        expect(
                "[bounds]\nmin = [-0.5, -0.5, -0.5]\nmax = [0.5, 0.5, 0.5]\n",
                "",
                "deck.toml:1:1 bounds: is missing, expected a table. Grains whose centre leaves this box are spilled.");
    }

    @Test
    void unknownWordSuggestsTheNearest() {
        expect(
                "end_support = \"pinned\"",
                "end_support = \"pined\"",
                "deck.toml:105:1 wires.deck.end_support: is \"pined\", expected one of clamped, pinned, free. "
                        + "Did you mean \"pinned\"?");
        expect(
                "open_faces = [\"high-z\"]",
                "open_faces = [\"high-z\", \"high-z\"]",
                "deck.toml:59:25 walls.hopper.open_faces[2]: is \"high-z\" again, expected each word once. Remove"
                        + " one.");
    }

    @Test
    void referenceToNothingListsTheNames() {
        expect(
                "motion = \"shake\"",
                "motion = \"shaek\"",
                "deck.toml:106:1 wires.deck.motion: is \"shaek\", expected one of motions: turn, shake, swirl. "
                        + "Did you mean \"shake\"?");
        expect(
                "material = \"grain\"\ndiameter = \"4 mm\"",
                "material = \"rubber\"\ndiameter = \"4 mm\"",
                "deck.toml:26:1 lots.small.material: is \"rubber\", expected one of materials: grain, steel. "
                        + "Add [materials.rubber] or correct the name.");
        expect(
                "materials = [\"steel\", \"grain\"]",
                "materials = [\"steel\"]",
                "deck.toml:20:1 pairs[2].materials: is [\"steel\"], expected two names of materials. "
                        + "Write two names, which may be equal.");
    }

    @Test
    void namesAreSafeForFiles() {
        expect(
                "[outlets.end]",
                "[outlets.\"../end\"]",
                "deck.toml:122:1 outlets.../end: is named \"../end\", expected letters, digits, _ and -, starting with"
                        + " a letter. The name becomes part of file names and table headers.",
                "deck.toml:135:1 screen.over: is \"end\", expected one of outlets: under, ../end. "
                        + "Add [outlets.end] or correct the name.");
    }

    @Test
    void pluginNamesAndParametersAreChecked() {
        expect(
                "law = \"gravity\"",
                "law = \"gravty\"",
                "deck.toml:141:1 fields.gravity: is \"gravty\", expected a field: drag, gravity. "
                        + "Did you mean \"gravity\"?");
        expect(
                "acceleration = 9.8",
                "accelaration = 9.8",
                "deck.toml:142:1 fields.gravity.accelaration: is an unknown key, expected one of law, acceleration. "
                        + "Did you mean acceleration?");
        expect(
                "shear = 0.8",
                "shear = 8",
                "deck.toml:116:30 wires.rod.element.shear: is 8, expected 0 ≤ value ≤ 1. Check the value and its"
                        + " unit.");
        expect(
                "[steps]",
                "[laws]\nnormal = \"linear\"\n\n[steps]",
                "deck.toml:145:1 laws.normal.stiffness: is missing, expected a stiffness (N/m), "
                        + "1 N/m ≤ value ≤ 1 GN/m. Force over overlap.");
        expect(
                "[steps]",
                "[laws]\nrolling = {parameter = 3}\ntangential = 4\n\n[steps]",
                "deck.toml:145:1 laws.rolling.law: is missing, expected the name of a rolling law. "
                        + "It decides which parameters belong here.",
                "deck.toml:146:1 laws.tangential: is 4, expected the name of a tangential law, or a table with it and"
                        + " its parameters. Write \"NAME\" or {law = \"NAME\", parameter = value}.");
    }

    @Test
    void sharesAddUpToOne() {
        expect(
                "large = 0.75",
                "large = 0.7",
                "deck.toml:42:1 feeds.shower.lots: is shares that add up to 0.95, expected a sum of 1. "
                        + "Shares are fractions of the mass.");
    }

    @Test
    void zeroDirectionIsRefused() {
        expect(
                "normal = [0, 0, 1]",
                "normal = [0, 0.0, 0]",
                "deck.toml:51:1 walls.floor.normal: is [0, 0, 0], expected three components, each a plain number, "
                        + "not all zero. Give it a direction.");
    }

    @Test
    void oneMistakeDoesNotHideAnother() {
        String text = Cases.small()
                .replace("density = 7850", "density = \"7850 kg\"")
                .replace("friction = 0.3\n", "friction = -1\n")
                .replace("\"4 mm\"", "\"4 mn\"")
                .replace("radius = \"0.5 m\"", "radus = \"0.5 m\"")
                .replace("passed = \"under\"", "passed = \"end\"");
        assertThat(Cases.findings(text))
                .extracting(finding -> finding.substring(0, finding.indexOf(": is")))
                .containsExactly(
                        "deck.toml:10:1 materials.steel.density",
                        "deck.toml:17:1 pairs[1].friction",
                        "deck.toml:27:1 lots.small.diameter",
                        "deck.toml:61:1 walls.drum.radius",
                        "deck.toml:66:1 walls.drum.radus",
                        "deck.toml:135:1 screen.over");
    }
}
