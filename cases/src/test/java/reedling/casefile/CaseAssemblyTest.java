// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import reedling.contact.ContactKind;
import reedling.probe.HeapPlan;
import reedling.probe.WavePlan;
import reedling.run.Model;
import reedling.run.RunPlan;
import reedling.structure.Body;
import reedling.wall.Oscillating;

class CaseAssemblyTest {

    private final CaseAssembly assembly = Shipped.assemble("wire-deck");
    private final Model model = assembly.model();

    @Test
    void deckHasItsWiresElementsAndNodes() {
        assertThat(model.structure().bodies())
                .hasSize(15)
                .extracting(Body::name)
                .startsWith("deck 1")
                .endsWith("deck 15");
        assertThat(model.structure().bodies()).allSatisfy(body -> {
            assertThat(body.elementCount()).isEqualTo(60);
            assertThat(body.rigid()).isFalse();
        });
        assertThat(model.structure().nodes().count).isEqualTo(15 * 61);
        assertThat(model.materialOfBody())
                .hasSize(15)
                .containsOnly(model.materials().indexOf("polyurethane"));
    }

    @Test
    void nodesStandOnStraightWiresOneBesideTheOther() {
        double[] reference = model.structure().nodes().reference;
        int last = 3 * (14 * 61 + 60);
        assertThat(Arrays.copyOfRange(reference, 0, 3)).containsExactly(0, -0.0518, 0);
        assertThat(Arrays.copyOfRange(reference, last, last + 3))
                .containsExactly(new double[] {0.298858, -0.0518 + 14 * 0.0074, -0.026147}, within(1e-15));
    }

    /** Mass of a wire: density times section over stretch times span; all but the masses of the nodes is closed form. */
    @Test
    void massOfTheDeckIsThatOfItsStretchedWires() {
        double[] mass = model.structure().nodes().mass;
        double area = Math.PI * 1e-6;
        double wire = 1200 * area * 0.3 / (1 + 8 / (60e6 * area));
        assertThat(Arrays.stream(mass).sum()).isCloseTo(15 * wire, Percentage.withPercentage(0.001));
    }

    @Test
    void wallsSupportsAndStepsFollowTheThrow() {
        assertThat(model.walls()).hasSize(3).allSatisfy(wall -> {
            assertThat(wall.motion()).isInstanceOf(Oscillating.class);
            assertThat(((Oscillating) wall.motion()).first().amplitude()).isEqualTo(2.5e-3);
        });
        assertThat(model.steps().drivenPeriod()).isEqualTo(0.05);
        assertThat(model.steps().margin()).isCloseTo(0.3 * 1.8e-3, within(1e-12));
        assertThat(model.steps().stepsPerContact()).isEqualTo(20);
    }

    @Test
    void feedOwesTheMassOfTheDuty() {
        assertThat(model.grains().count()).isZero();
        assertThat(model.feeds()).hasSize(1);
        Model.FeedLine line = model.feeds().getFirst();
        assertThat(line.feed().plan().rate().owed(5)).isCloseTo(0.6, within(1e-12));
        assertThat(line.lotNumbers()).containsExactly(0, 1);
        assertThat(line.feed().plan().mix().share(0)).isCloseTo(0.3, within(1e-12));
    }

    @Test
    void planNamesScreenPluginsAndTimes() {
        RunPlan plan = assembly.plan("1.2.3", "abc");
        assertThat(plan.endTime()).isEqualTo(5);
        assertThat(plan.intervals()).isEqualTo(new RunPlan.Intervals(0.02, 0.05, Double.POSITIVE_INFINITY, 600));
        assertThat(plan.screen()).hasValueSatisfying(screen -> {
            assertThat(screen.bodies()).hasSize(15).startsWith(0).endsWith(14);
            assertThat(screen.undersizeLot()).isZero();
            assertThat(screen.productLot()).isEqualTo(1);
            assertThat(screen.passedOutlet()).isZero();
            assertThat(screen.overOutlet()).isEqualTo(1);
        });
        assertThat(plan.identity().plugins())
                .containsOnlyKeys("hertz", "mindlin", "elastic-plastic", "gravity", "beam");
        assertThat(plan.identity().seed()).isEqualTo(20260101);
        assertThat(plan.identity().caseDigest()).isEqualTo("abc");
    }

    @Test
    void rigidWiresAreOneAssignmentAway() {
        Model rigid = Shipped.assemble("wire-deck", "wires.deck.rigid=true").model();
        assertThat(rigid.structure().bodies()).allMatch(Body::rigid);
        assertThat(rigid.structure().stableStep()).isInfinite();
    }

    @Test
    void lawsOfFurtherStagesAreBoundAndNamed() {
        CaseAssembly sticky = Shipped.assemble(
                "first-look",
                "laws.normal={law = \"jkr\", work_of_adhesion = \"50 mJ/m2\"}",
                "laws.near_field={law = \"lennard-jones\", depth = 1e-9, zero_distance = \"0.1 mm\","
                        + " contact_distance = \"0.11 mm\", cutoff = \"0.5 mm\"}");
        assertThat(sticky.plugins())
                .containsOnlyKeys("jkr", "lennard-jones", "mindlin", "elastic-plastic", "gravity", "beam");
        assertThat(sticky.model().laws().reach(ContactKind.GRAIN_WIRE, 1e-3)).isCloseTo(0.39e-3, within(1e-12));
    }

    @Test
    void firstLookIsAssembledToo() {
        Model first = Shipped.assemble("first-look").model();
        assertThat(first.structure().bodies()).hasSize(7);
        assertThat(first.structure().nodes().count).isEqualTo(7 * 25);
        assertThat(first.exits().outlets()).hasSize(2);
    }

    @Test
    void laboratoryCasesAreAssembledWithTheirProbes() {
        CaseAssembly heap = Shipped.assemble("heap");
        assertThat(heap.model().grains().count()).isEqualTo(5000);
        assertThat(heap.plan("1", "2").probes()).singleElement().isInstanceOf(HeapPlan.class);
        CaseAssembly bed = Shipped.assemble("shaken-bed");
        assertThat(bed.plan("1", "2").probes()).singleElement().isInstanceOfSatisfying(WavePlan.class, plan -> {
            assertThat(plan.frequency()).isEqualTo(18);
            assertThat(plan.area().columns()).isEqualTo(30);
            assertThat(plan.area().rows()).isEqualTo(4);
        });
    }

    @Test
    void wavesNeedAVibration() {
        assertThatThrownBy(() -> Shipped.assemble(
                        "shaken-bed", "motions.shake={kind=\"constant-velocity\", velocity=[0, 0, 1]}"))
                .hasMessageContaining("probes.waves.motion")
                .hasMessageContaining("a vibration");
    }

    @Test
    void blockOfGrainsIsThereAtTheStart() {
        String block =
                "{kind = \"packed-block\", lots = {vetch = 0.5, pea = 0.5}, count = 40, velocity = [0, 0, -0.25],"
                        + " region = {shape = \"box\", min = [0.01, -0.017, 0.06], max = [0.04, 0.017, 0.1]}}";
        Model model = Shipped.assemble("first-look", "feeds.block=" + block).model();
        assertThat(model.grains().count()).isEqualTo(40);
        assertThat(Arrays.stream(model.grains().lot()).limit(40).distinct()).containsExactlyInAnyOrder(0, 1);
        for (int g = 0; g < 40; g++) {
            double radius = model.grains().radius(g);
            assertThat(model.grains().position(g, 2)).isBetween(0.06 + radius - 1e-12, 0.1 - radius + 1e-12);
            assertThat(model.grains().rows()[reedling.particle.GrainRow.at(g) + reedling.particle.GrainRow.V + 2])
                    .isEqualTo(-0.25);
        }
    }
}
