// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import java.util.ServiceLoader;
import org.junit.jupiter.api.Test;
import reedling.error.ReedlingException;
import reedling.structure.CrossSection;
import reedling.structure.ElementSet;
import reedling.structure.ElementType;
import reedling.structure.EndCondition;
import reedling.structure.Position;
import reedling.structure.Structure;
import reedling.structure.StructureBuilder;
import reedling.structure.WireDamping;
import reedling.structure.WireEnds;
import reedling.structure.WireMesh;
import reedling.structure.WireSpecification;

/** Wires come out with the tension, masses and frequency they were asked for; faulty ones are refused with reasons. */
class WireMeshTest {

    @Test
    void beamIsFoundAsAService() {
        assertThat(ServiceLoader.load(ElementType.class))
                .extracting(ElementType::name)
                .contains("beam");
    }

    @Test
    void wireCarriesItsTensionAndWeight() {
        StructureBuilder builder = new StructureBuilder();
        WireSpecification wire = Deck.wire(3, -1, new WireDamping(0, 0.05, 0), false);
        WireMesh.add(builder, wire, new BeamElement());
        Structure structure = builder.build();
        structure.evaluateForces();
        ElementSet set = structure.elementSets().getFirst();
        double[] rows = new double[6 * 60];
        set.law.results(set, 0, 60, rows);
        for (int e = 0; e < 60; e++) {
            assertThat(rows[6 * e]).isCloseTo(8, within(1e-9));
        }
        double length = wire.ends().span() / (1 + wire.prestretch());
        double mass = java.util.Arrays.stream(structure.nodes().mass).sum();
        assertThat(mass).isCloseTo(1200 * Math.PI * 1e-6 * length, within(1e-15));
        assertThat(structure.bodies().getFirst().name()).isEqualTo("wire 3");
        assertThat(structure.bodies().getFirst().elementCount()).isEqualTo(60);
        // ratio at the highest element frequency: step shrinks by sqrt(1 + x^2) - x
        double frequency = Math.sqrt(set.law.squaredFrequency(set, 0, 60));
        assertThat(0.5 * set.law.dampingTime() * frequency).isCloseTo(0.05, within(1e-9));
    }

    /**
     * The closed frequency of the tensioned wire against the mesh's own eigenvalue. At 0.5 N the boundary layer at the
     * clamps, sqrt(EI/T) = 10 mm, spans two elements of 60 and the error is of second order; at 8 N it is 2.4 mm, half
     * an element, and 60 elements are 0.3 % low.
     */
    @Test
    void firstFrequencyIsThatOfTheMesh() {
        double coarse = frequencyError(60, 0.5);
        double fine = frequencyError(120, 0.5);
        assertThat(coarse).isBetween(-0.003, 0.0);
        assertThat(fine / coarse).isBetween(0.2, 0.35);
        assertThat(frequencyError(60, 8)).isBetween(-0.004, 0.0);
        assertThat(frequencyError(120, 8)).isBetween(-0.002, 0.0);
    }

    private static double frequencyError(int elements, double tension) {
        StructureBuilder builder = new StructureBuilder();
        WireSpecification wire = with(elements, tension);
        WireMesh.add(builder, wire, new BeamElement());
        StaticSolver solver = new StaticSolver(builder.build(), 1e-6);
        double hertz = new StaticSolver(solver, d -> d == 1 || d == 5).frequencies()[0];
        return hertz / (WireMesh.firstAngularFrequency(wire) / (2 * Math.PI)) - 1;
    }

    private static WireSpecification with(int elements, double tension) {
        WireSpecification wire = Deck.wire(0, -1, WireDamping.NONE, false);
        return new WireSpecification(
                wire.name(),
                wire.material(),
                wire.section(),
                wire.ends(),
                elements,
                tension,
                wire.damping(),
                "beam",
                Map.of(),
                false);
    }

    @Test
    void everyFaultOfAWireIsNamedAtOnce() {
        WireEnds ends = new WireEnds(
                new Position(0, 0, 0), new Position(0.001, 0, 0), EndCondition.CLAMPED, EndCondition.FREE, -1);
        WireSpecification wire = new WireSpecification(
                "wire 9",
                Deck.POLYURETHANE,
                new CrossSection.SolidCircle(0.002),
                ends,
                0,
                5,
                new WireDamping(-1, 0, 1.5),
                "beam",
                Map.of(),
                false);
        assertThatThrownBy(() -> WireMesh.add(new StructureBuilder(), wire, new BeamElement()))
                .isInstanceOfSatisfying(
                        ReedlingException.class,
                        failure -> assertThat(failure.findings())
                                .extracting(finding -> finding.what())
                                .containsExactly(
                                        "span", "tension", "strain damping time", "damping ratio of the first mode"))
                .hasMessageContaining("0.001 m")
                .hasMessageContaining("wire 9");
    }

    @Test
    void elementsShorterThanThickAreRefused() {
        WireSpecification fine = with(400, 8);
        assertThatThrownBy(() -> WireMesh.add(new StructureBuilder(), fine, new BeamElement()))
                .isInstanceOf(ReedlingException.class)
                .hasMessageContaining("at most 150");
    }

    @Test
    void fullyFreeWireCannotHaveModalDamping() {
        WireEnds ends =
                new WireEnds(new Position(0, 0, 0), new Position(0.3, 0, 0), EndCondition.FREE, EndCondition.FREE, -1);
        WireSpecification wire = new WireSpecification(
                "rod",
                Deck.POLYURETHANE,
                new CrossSection.SolidCircle(0.002),
                ends,
                20,
                0,
                new WireDamping(0, 0, 0.05),
                "beam",
                Map.of(),
                false);
        assertThatThrownBy(() -> WireMesh.add(new StructureBuilder(), wire, new BeamElement()))
                .isInstanceOf(ReedlingException.class)
                .hasMessageContaining("relative to the supports");
    }
}
