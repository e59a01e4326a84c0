// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import java.util.Set;
import org.joml.Vector3d;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.error.ExitCode;
import reedling.error.ReedlingException;
import reedling.material.Material;

class CaseFileTest {

    private final CaseSpecification small = Cases.read(Cases.small()).specification();

    @Test
    void materialsAndPairsAreInSi() {
        assertThat(small.materials().keySet()).containsExactly("grain", "steel");
        assertThat(small.materials().get("grain")).isEqualTo(new Material("grain", 1250, 5e9, 0.3));
        assertThat(small.pairs()).hasSize(2);
        assertThat(small.pairs().get(0).rollingFriction()).isZero();
        assertThat(small.pairs().get(1).first().name()).isEqualTo("steel");
        assertThat(small.pairs().get(1).restitution()).isEqualTo(0.6);
    }

    @Test
    void lotsKeepTheirSizes() {
        assertThat(small.lots().get("small").diameter()).isEqualTo(new DiameterSpecification.Single(0.004));
        assertThat(small.lots().get("large").diameter()).isEqualTo(new DiameterSpecification.Uniform(0.005, 0.006));
        String normal = "{distribution = \"truncated-normal\", mean = \"4.4 mm\", deviation = \"0.4 mm\", "
                + "min = \"3.6 mm\", max = \"5.2 mm\"}";
        assertThat(Cases.read(Cases.with("\"4 mm\"", normal))
                        .specification()
                        .lots()
                        .get("small")
                        .diameter())
                .isEqualTo(new DiameterSpecification.TruncatedNormal(0.0044, 0.0004, 0.0036, 0.0052));
    }

    /** 80 g between 2 and 3 mm, 20 g between 3 and 4 mm: 0.8 of the mass passes 3 mm. */
    @Test
    void sieveTablesAreReadInAnyOrder() {
        String table =
                "{distribution = \"sieve-table\", basis = \"mass\", sieves = [{opening = \"4 mm\", retained = 0}, "
                        + "{opening = \"2 mm\", retained = 80}, {opening = \"3 mm\", retained = 20}]}";
        DiameterSpecification read = Cases.read(Cases.with("\"4 mm\"", table))
                .specification()
                .lots()
                .get("small")
                .diameter();
        assertThat(read.smallest()).isEqualTo(2e-3);
        assertThat(read.largest()).isEqualTo(4e-3);
        assertThat(read).isInstanceOfSatisfying(DiameterSpecification.Graded.class, graded -> {
            assertThat(graded.sizes().massPassing(3e-3)).isCloseTo(0.8, within(1e-12));
            assertThat(graded.typical()).isBetween(2e-3, 3e-3);
        });
    }

    @Test
    void panAndCoarsestSieveReachAsFarAsTheCaseSays() {
        String table = "{distribution = \"sieve-table\", basis = \"number\", pan = 1, min = \"1 mm\", max = \"5 mm\", "
                + "sieves = [{opening = \"2 mm\", retained = 3}]}";
        DiameterSpecification read = Cases.read(Cases.with("\"4 mm\"", table))
                .specification()
                .lots()
                .get("small")
                .diameter();
        assertThat(read.smallest()).isEqualTo(1e-3);
        assertThat(read.largest()).isEqualTo(5e-3);
    }

    @Test
    void feedsAreRead() {
        FeedSpecification.PackedBlock block =
                (FeedSpecification.PackedBlock) small.feeds().get("block");
        assertThat(block.shares()).containsExactly(Map.entry("small", 1.0));
        assertThat(block.count()).isEqualTo(OptionalLong.of(100));
        assertThat(block.solidFraction()).isEmpty();
        assertThat(block.velocity()).isEqualTo(new Vector3d());
        FeedSpecification.Stream shower =
                (FeedSpecification.Stream) small.feeds().get("shower");
        assertThat(shower.kind()).isEqualTo(FeedSpecification.StreamKind.RAIN);
        assertThat(shower.massRate()).isEqualTo(OptionalDouble.of(0.01));
        assertThat(shower.stop()).isEqualTo(OptionalDouble.of(0.5));
        assertThat(shower.velocity()).isEqualTo(new Vector3d(0, 0, -0.2));
        assertThat(shower.shares()).containsEntry("small", 0.25).containsEntry("large", 0.75);
        assertThat(shower.region()).isInstanceOf(DiscRegion.class);
    }

    @Test
    void wallsAreRead() {
        assertThat(small.walls().get("floor").shape())
                .isEqualTo(new WallShape.Plane(new Vector3d(), new Vector3d(0, 0, 1), Optional.empty()));
        WallShape.Box hopper = (WallShape.Box) small.walls().get("hopper").shape();
        assertThat(hopper.openFaces()).containsExactly(WallShape.Face.HIGH_Z);
        assertThat(hopper.side()).isEqualTo(WallShape.Side.INSIDE);
        WallShape.Cylinder drum = (WallShape.Cylinder) small.walls().get("drum").shape();
        assertThat(drum.closedEnds()).isEqualTo(Set.of(WallShape.End.LOW, WallShape.End.HIGH));
        assertThat(small.walls().get("drum").motion()).contains("turn");
        String sheet = "normal = [0, 0, 1]\nalong = [1, 0, 0]\nwidth = \"20 cm\"\ndepth = \"10 cm\"";
        WallShape floor = Cases.read(Cases.with("normal = [0, 0, 1]", sheet))
                .specification()
                .walls()
                .get("floor")
                .shape();
        assertThat(((WallShape.Plane) floor).sheet()).contains(new WallShape.Sheet(new Vector3d(1, 0, 0), 0.2, 0.1));
    }

    @Test
    void motionsAreRead() {
        MotionSpecification turn = small.motions().get("turn");
        assertThat(((MotionSpecification.Rotation) turn.path()).speed()).isCloseTo(3 * Math.PI, within(1e-14));
        assertThat(turn.stop()).isEmpty();
        MotionSpecification shake = small.motions().get("shake");
        assertThat(shake.path())
                .isEqualTo(new MotionSpecification.Harmonic(new Vector3d(1, 0, 1), 0.0025, 20, Math.PI));
        assertThat(shake.rampDown()).isEqualTo(0.2);
        assertThat(small.motions().get("swirl").path())
                .isEqualTo(new MotionSpecification.Elliptic(
                        new Vector3d(1, 0, 0), 0.001, new Vector3d(0, 1, 0), 0.001, 20, 0));
    }

    @Test
    void wiresAreRead() {
        WireSpecification deck = small.wires().get("deck");
        assertThat(deck.section()).isEqualTo(new WireSection.Tube(0.002, 0.001));
        assertThat(deck.count()).isEqualTo(5);
        assertThat(deck.spacing()).isCloseTo(0.007, within(1e-15));
        assertThat(deck.elementLength()).isCloseTo(0.01, within(1e-15));
        assertThat(deck.startSupport()).isEqualTo(WireSupport.CLAMPED);
        assertThat(deck.endSupport()).isEqualTo(WireSupport.PINNED);
        assertThat(deck.firstModeDamping()).isEqualTo(0.02);
        assertThat(deck.rigid()).isFalse();
        assertThat(deck.element().name()).isEqualTo("beam");
        assertThat(deck.element().parameters().get("shear")).isEqualTo(0.9);
        assertThat(small.wires().get("rod").element().parameters().get("shear")).isEqualTo(0.8);
    }

    @Test
    void lawsFieldsStepsAndOutputAreRead() {
        assertThat(small.laws().normal().name()).isEqualTo("hertz");
        assertThat(small.fields().get("gravity").parameters().get("acceleration"))
                .isEqualTo(9.8);
        assertThat(small.steps().stepsPerContact()).isEqualTo(20);
        assertThat(small.steps().maximum()).isEqualTo(OptionalDouble.of(1e-5));
        assertThat(small.steps().searchMargin()).isEqualTo(new SearchMargin(0.0005, false));
        assertThat(small.output().checkpointEveryWall()).isEqualTo(OptionalDouble.of(600));
        assertThat(small.output().ledger()).isEqualTo(OutputSpecification.Ledger.TOTAL);
        assertThat(small.screen().orElseThrow().measureFrom()).isEqualTo(0.5);
        assertThat(small.seed()).isEqualTo(1);
    }

    @Test
    void stepsAndLawsMayBeLeftOut() {
        String text = Cases.with("[steps]\nmaximum = \"10 us\"\nsearch_margin = \"0.5 mm\"\n", "");
        assertThat(Cases.read(text).specification().steps())
                .isEqualTo(new StepSpecification(
                        20, OptionalDouble.empty(), new SearchMargin(0.3, true), Optional.empty()));
        assertThat(new SearchMargin(0.3, true).length(0.002)).isEqualTo(0.0006);
    }

    @Test
    void aSoundCaseHasNoCautions() {
        assertThat(Cases.cautions(Cases.small())).isEmpty();
    }

    @Test
    void theResolvedTextReadsBackTheSame() {
        CaseReading changed =
                Cases.read(Cases.small(), "wires.deck.rigid=true", "pairs[2].friction=0.45", "case.notes='a \"b\"'");
        CaseReading again = CaseFile.read(changed.resolvedText(), "resolved.toml", List.of(), Cases::providers);
        assertThat(again.resolvedText()).isEqualTo(changed.resolvedText());
        assertThat(again.specification().wires())
                .isEqualTo(changed.specification().wires());
        assertThat(again.specification().pairs())
                .isEqualTo(changed.specification().pairs());
        assertThat(again.specification().feeds())
                .isEqualTo(changed.specification().feeds());
        assertThat(again.specification().notes()).isEqualTo("a \"b\"");
    }

    @Test
    void placesOfPathsAreKnown() {
        CaseReading reading = Cases.read(Cases.small(), "wires.deck.rigid=true");
        assertThat(reading.where("case.title")).isEqualTo("deck.toml:2:1");
        assertThat(reading.where("case.seed")).isEqualTo("deck.toml:1:1");
        assertThat(reading.where("wires.deck.rigid")).isEqualTo("--set");
    }

    @Test
    void aMissingFileIsNamed(@TempDir Path folder) {
        Path file = folder.resolve("none.toml");
        assertThatThrownBy(() -> CaseFile.read(file, List.of(), Cases::providers))
                .isInstanceOfSatisfying(
                        ReedlingException.class, e -> assertThat(e.exitCode()).isEqualTo(ExitCode.NO_INPUT))
                .hasMessage(file + ": is missing, expected a readable case file. "
                        + "Check the path; it is taken from the current folder.");
    }

    @Test
    void aFileOfAnotherEncodingIsNamed(@TempDir Path folder) throws IOException {
        Path file = Files.write(folder.resolve("latin.toml"), new byte[] {'#', (byte) 0xe4, '\n'});
        assertThatThrownBy(() -> CaseFile.read(file, List.of(), Cases::providers))
                .hasMessage(file + ": is not UTF-8 text, expected a readable case file. Save it as UTF-8.");
    }

    @ParameterizedTest
    @ValueSource(strings = {"wire-deck", "first-look"})
    void shippedCasesAreSound(String name) {
        Path file = Path.of("..", "cases", name, "case.toml");
        CaseReading reading = CaseFile.read(file, List.of(), Cases::providers);
        assertThat(reading.cautions()).isEmpty();
        CaseReading again = CaseFile.read(reading.resolvedText(), "resolved", List.of(), Cases::providers);
        assertThat(again.specification()).isEqualTo(reading.specification());
        CaseReading rigid = CaseFile.read(file, List.of("wires.deck.rigid=true"), Cases::providers);
        assertThat(rigid.specification().wires().get("deck").rigid()).isTrue();
    }
}
