// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** What can be wrong between keys and between parts, and what is only doubtful. */
class CaseCheckErrorsTest {

    private static void expect(String old, String replacement, String... findings) {
        assertThat(Cases.findings(Cases.with(old, replacement))).containsExactly(findings);
    }

    private static void expectCaution(String old, String replacement, String... cautions) {
        assertThat(Cases.cautions(Cases.with(old, replacement))).containsExactly(cautions);
    }

    @Test
    void missingPairNamesBothMaterialsAndWhoTouches() {
        expect(
                "materials = [\"steel\", \"grain\"]",
                "materials = [\"steel\", \"steel\"]",
                "deck.toml:14:1 pairs: is without an entry for grain and steel, expected a pair for every two"
                        + " materials that can touch. Add [[pairs]] with materials = [\"grain\", \"steel\"]: lot small"
                        + " touches wall floor.");
        expect(
                "materials = [\"grain\", \"grain\"]",
                "materials = [\"steel\", \"steel\"]",
                "deck.toml:14:1 pairs: is without an entry for grain and grain, expected a pair for every two"
                        + " materials that can touch. Add [[pairs]] with materials = [\"grain\", \"grain\"]: grains of lot"
                        + " small touch each other.");
    }

    @Test
    void aPairWrittenTwicePointsAtTheFirst() {
        expect(
                "[lots.small]",
                "[[pairs]]\nmaterials = [\"grain\", \"steel\"]\nrestitution = 1\nfriction = 0\n\n[lots.small]",
                "deck.toml:25:1 pairs[3]: is a second entry for grain and steel, expected one entry for every two "
                        + "materials. The first is pairs[2] at deck.toml:19:1; remove one.");
    }

    @Test
    void overlappingBlocksNameEachOther() {
        String second = "[feeds.other]\nkind = \"packed-block\"\nlot = \"large\"\nsolid_fraction = 0.4\n"
                + "region = {shape = \"box\", min = [0.05, 0.05, 0.05], max = [0.15, 0.1, 0.1]}\n\n[walls.floor]";
        expect(
                "[walls.floor]",
                second,
                "deck.toml:51:1 feeds.other.region: is overlapping the packed block feeds.block, expected blocks that "
                        + "share no volume. Their grains would start inside each other: move feeds.other or "
                        + "feeds.block.");
        String touching = second.replace("[0.05, 0.05, 0.05]", "[0.1, 0.05, 0.05]");
        assertThat(Cases.read(Cases.with("[walls.floor]", touching))
                        .specification()
                        .feeds())
                .hasSize(3);
    }

    @Test
    void feedsMustLieInsideTheBounds() {
        expect(
                "centre = [0.05, 0.05, 0.15]",
                "centre = [0.47, 0.05, 0.15]",
                "deck.toml:41:1 feeds.shower.region: is partly outside of the bounds, expected a region inside of"
                        + " them. Grains put in out there would be spilled at once: move the region or widen [bounds].");
    }

    @Test
    void blocksMustHoldTheirGrains() {
        expect(
                "max = [0.1, 0.1, 0.1]",
                "max = [0.1, 0.1, 0.053]",
                "deck.toml:35:1 feeds.block.region: is a box of shortest side 3 mm, expected room for the largest"
                        + " grain, 4 mm. Widen the box or cut the sizes.");
        expect(
                "count = 100",
                "count = 12000",
                "deck.toml:37:1 feeds.block.count: is 12000, a solid fraction of 0.804248, expected a solid fraction "
                        + "≤ 0.64. Put in fewer grains or widen the box.");
    }

    @Test
    void alternativesExcludeEachOther() {
        expect(
                "count = 100",
                "count = 100\nsolid_fraction = 0.3",
                "deck.toml:38:1 feeds.block.solid_fraction: is given together with count, expected exactly one of"
                        + " them. Remove one.");
        expect(
                "mass_rate = \"36 kg/h\"\n",
                "",
                "deck.toml:39:1 feeds.shower: is without mass_rate and count_rate, expected exactly one of them. "
                        + "Add one.");
        expect(
                "stop = \"0.5 s\"",
                "stop = \"0.5 s\"\ntotal_count = 5\ntotal_mass = 3",
                "deck.toml:45:1 feeds.shower.total_count: is given together with stop, total_mass, expected at most"
                        + " one of them. Remove one.");
    }

    @Test
    void stopsComeAfterStarts() {
        expect(
                "stop = \"0.5 s\"",
                "stop = \"0.5 s\"\nstart = \"0.7 s\"",
                "deck.toml:44:1 feeds.shower.stop: is 500 ms, expected more than start, 700 ms. "
                        + "Stop later or start earlier.");
        expect(
                "stop = \"1 s\"",
                "stop = \"0.3 s\"",
                "deck.toml:86:1 motions.shake.stop: is 300 ms, expected more than start and both ramps, 400 ms. "
                        + "Stop later or start earlier.");
    }

    @Test
    void boxesHaveExtent() {
        expect(
                "max = [0.2, 0.2, -0.05]",
                "max = [0.2, 0.2, -0.1]",
                "deck.toml:120:1 outlets.under.max: is -100 mm along z, expected more than min, -100 mm. "
                        + "Exchange the two.");
    }

    @Test
    void sizesAreOrdered() {
        expect(
                "min = \"5 mm\"",
                "min = \"7 mm\"",
                "deck.toml:31:53 lots.large.diameter.max: is 6 mm, expected more than min, 7 mm. "
                        + "Exchange the two, or give one diameter for all grains.");
        expect(
                "\"4 mm\"",
                "{distribution = \"truncated-normal\", mean = \"9 mm\", deviation = \"1 mm\", min = \"3 mm\", "
                        + "max = \"5 mm\"}",
                "deck.toml:27:48 lots.small.diameter.mean: is 9 mm, expected 3 mm < value < 5 mm, between min and max. "
                        + "Move the mean or the cuts.");
    }

    @Test
    void shapesOfWallsAreChecked() {
        expect(
                "normal = [0, 0, 1]",
                "normal = [0, 0, 1]\nwidth = 1",
                "deck.toml:47:1 walls.floor: is a sheet with 1 of along, width and depth, expected all three or none. "
                        + "Add the others, or remove them for an endless wall.");
        expect(
                "normal = [0, 0, 1]",
                "normal = [0, 0, 1]\nwidth = 1\ndepth = 1\nalong = [1, 0, 1]",
                "deck.toml:54:1 walls.floor.along: is not in the plane, expected a direction at right angles to"
                        + " normal. The scalar product of the two must be zero.");
        expect(
                "side = \"inside\"\nopen_faces",
                "side = \"outside\"\nopen_faces",
                "deck.toml:59:1 walls.hopper.open_faces: is given for side = \"outside\", expected none. "
                        + "Only a box with grains inside has open faces.");
        expect(
                "[\"high-z\"]",
                "[\"low-x\", \"high-x\", \"low-y\", \"high-y\", \"low-z\", \"high-z\"]",
                "deck.toml:59:1 walls.hopper.open_faces: is all six faces, expected at most five. "
                        + "Remove the wall instead.");
    }

    @Test
    void axesOfMotionsAreAtRightAngles() {
        expect(
                "second_axis = [0, 1, 0]",
                "second_axis = [1, 1, 0]",
                "deck.toml:92:1 motions.swirl.second_axis: is not at right angles to first_axis, expected a direction"
                        + " at right angles to it. The scalar product of the two must be zero.");
    }

    @Test
    void wiresAreLongerThanThickAndApart() {
        expect(
                "end = [0.3, 0, 0.02]",
                "end = [0.001, 0, 0.02]",
                "deck.toml:100:1 wires.deck.end: is 1 mm from start, expected at least the diameter, 2 mm. "
                        + "A part shorter than thick is no wire: model it as a wall.");
        expect(
                "end = [0.3, 0, 0.02]",
                "end = [0, 0, 0.02]",
                "deck.toml:100:1 wires.deck.end: is the same point as start, expected another point. "
                        + "Give the wire a length.");
        expect(
                "pitch = [0, \"7 mm\", 0]",
                "pitch = [1, \"1.5 mm\", 0]",
                "deck.toml:102:1 wires.deck.pitch: is 1.5 mm across the wires, expected at least the diameter, 2 mm. "
                        + "Neighbouring wires would overlap: widen the pitch.");
        expect(
                "pitch = [0, \"7 mm\", 0]\n",
                "",
                "deck.toml:96:1 wires.deck.pitch: is missing, expected the way from one wire to the next, as there are "
                        + "several. Add pitch, for example [0, \"7.4 mm\", 0].");
        expect(
                "inner = \"1 mm\"",
                "inner = \"2 mm\"",
                "deck.toml:98:44 wires.deck.section.inner: is not smaller than outer, expected inner < outer. "
                        + "Exchange the two.");
        expect(
                "end_support = \"pinned\"",
                "end_support = \"free\"",
                "deck.toml:104:1 wires.deck.tension: is above zero with a free end, expected 0 N. "
                        + "A free end holds no tension: clamp or pin it.");
    }

    @Test
    void outletsAreApartAndReachable() {
        expect(
                "min = [0.2, -0.1, -0.1]",
                "min = [0.1, -0.1, -0.1]",
                "deck.toml:122:1 outlets.end: is overlapping outlets.under, expected outlets that share no volume. "
                        + "A grain in both could be counted in either: move one.");
        expect(
                "min = [0.2, -0.1, -0.1]\nmax = [0.3,",
                "min = [2.2, -0.1, -0.1]\nmax = [2.3,",
                "deck.toml:122:1 outlets.end: is outside of the bounds, expected a box that shares a volume with them. "
                        + "No grain would ever reach it.");
    }

    @Test
    void screenPartsDifferAndTheMeasuredPartExists() {
        expect(
                "over = \"end\"",
                "over = \"under\"",
                "deck.toml:135:1 screen.over: is \"under\", which is the outlet passed too, expected another outlet. "
                        + "Correct one of them.");
        expect(
                "product_lot = \"large\"",
                "product_lot = \"small\"",
                "deck.toml:133:1 screen.product_lot: is \"small\", which is the undersize_lot too, expected another"
                        + " lot. Correct one of them.");
        expect(
                "measure_from = \"0.5 s\"",
                "measure_from = \"2 s\"",
                "deck.toml:138:1 screen.measure_from: is 2 s, expected less than output.end_time, 2 s. "
                        + "Run longer or measure earlier.");
    }

    @Test
    void thickElementsAreDoubtful() {
        expectCaution(
                "elements = 30",
                "elements = 150",
                "deck.toml:103:1 wires.deck.elements: is 150, each 2 mm long, expected elements longer than the"
                        + " diameter, 2 mm. Short elements cost small steps and bend no better: use fewer.");
    }

    @Test
    void softGrainsAndOverstretchedWiresAreDoubtful() {
        expectCaution(
                "youngs_modulus = 210e9",
                "youngs_modulus = \"50 MPa\"",
                "deck.toml:104:1 wires.deck.tension: is 20 N, a strain of 16.9765 %, expected a strain below 10 %. "
                        + "Check tension, diameter and Young's modulus.");
        String soft = Cases.with("youngs_modulus = \"5 GPa\"", "youngs_modulus = \"50 MPa\"");
        assertThat(Cases.cautions(soft))
                .hasSize(3)
                .first()
                .isEqualTo("deck.toml:6:1 materials.grain.youngs_modulus: is soft: grains of lot small resist with "
                        + "21.9728 kN/m, wires deck with 1.36622 kN/m, expected at least 20 times the wires. "
                        + "Raise it: softened grains squeeze through gaps that real ones do not pass.");
        assertThat(Cases.read(soft, "wires.deck.rigid=true", "wires.rod.rigid=true")
                        .cautions())
                .isEmpty();
    }

    @Test
    void unusedPartsAreDoubtful() {
        expectCaution(
                "motion = \"swirl\"\n",
                "",
                "deck.toml:89:1 motions.swirl: is used by nothing, expected a wall or row of wires that names it. "
                        + "Add motion = \"swirl\" to what should move.");
        expectCaution(
                "lots = {small = 0.25, large = 0.75}",
                "lot = \"small\"",
                "deck.toml:29:1 lots.large: is in no feed, expected a feed that names it. Remove it, or feed it.");
        expectCaution(
                "[fields.gravity]\nlaw = \"gravity\"\nacceleration = 9.8\n",
                "",
                "deck.toml:1:1 fields: is missing, expected gravity or another field. "
                        + "Without a field grains only fly straight on.");
    }

    @Test
    void timesBeyondTheEndAreDoubtful() {
        expectCaution(
                "snapshot_every = \"20 ms\"",
                "snapshot_every = \"3 s\"",
                "deck.toml:150:1 output.snapshot_every: is 3 s, expected at most end_time, 2 s. "
                        + "Nothing would be written between start and end.");
        expectCaution(
                "peg_time = \"0.2 s\"",
                "peg_time = \"1.5 s\"",
                "deck.toml:136:1 screen.peg_time: is 1.5 s, expected less than the measured part of the run, 1.5 s. "
                        + "No grain could count as pegged.");
        expectCaution(
                "stop = \"0.5 s\"",
                "start = \"2 s\"",
                "deck.toml:44:1 feeds.shower.start: is 2 s, expected less than output.end_time, 2 s. "
                        + "It would never start.");
    }

    @Test
    void midpointRuleAndWiresExcludeEachOther() {
        expect(
                "[steps]\n",
                "[steps]\nintegrator = \"midpoint\"\n",
                "deck.toml:145:1 steps.integrator: is \"midpoint\" in a case with wires.deck, expected \"explicit\". The"
                        + " midpoint rule iterates over grains and walls only; wires take explicit fine steps of their"
                        + " own. Leave the wires out of a reference run.");
    }

    @Test
    void keysOfTheMidpointRuleNeedIt() {
        expect(
                "[steps]\n",
                "[steps]\ntheta = 0.5\ntolerance = 1e-9\n",
                "deck.toml:145:1 steps.theta: is given for the explicit integrator, expected integrator = \"midpoint\""
                        + " beside it. Remove it, or choose the midpoint rule.",
                "deck.toml:146:1 steps.tolerance: is given for the explicit integrator, expected integrator ="
                        + " \"midpoint\" beside it. Remove it, or choose the midpoint rule.");
    }
}
