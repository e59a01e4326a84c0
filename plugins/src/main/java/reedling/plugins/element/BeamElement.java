// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.element;

import java.util.List;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.plugin.Parameter;
import reedling.structure.CrossSection;
import reedling.structure.ElementLaw;
import reedling.structure.ElementProperties;
import reedling.structure.ElementType;
import reedling.unit.Dimension;

/** Two-node beam for wires, rods and tubes that may bend and turn through any angle. See {@link BeamLaw}. */
public final class BeamElement implements ElementType {

    /** Share of the physical polar inertia given to the nodes. */
    static final String INERTIA_FACTOR = "inertia_factor";

    @Override
    public String name() {
        return "beam";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Geometrically exact beam with stretch, shear, torsion and bending between two nodes.";
    }

    @Override
    public String source() {
        return "J. C. Simo, A finite strain beam formulation, 1985; R. H. MacNeal, A simple quadrilateral shell "
                + "element, 1978 (residual bending flexibility); from memory";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(new Parameter(
                INERTIA_FACTOR,
                Dimension.NUMBER,
                0.5,
                1.5,
                1,
                "Nodal rotary inertia over the polar inertia of the section. 1: torsion exact; 1.5: step longer and "
                        + "torsional frequencies lower by a fifth; 0.5: bending of stout round and square beams exact, "
                        + "torsional frequencies 1.41 times too high."));
    }

    @Override
    public ElementLaw law(ElementProperties properties) {
        if (!(properties.section() instanceof CrossSection section)) {
            throw new ReedlingException(
                    ExitCode.CASE,
                    new Finding(
                            "element beam",
                            "section",
                            properties.section().getClass().getSimpleName(),
                            "a cross-section of a line",
                            "Use a round, tube or rectangular section."));
        }
        return new BeamLaw(
                section,
                properties.material(),
                properties.dampingTime(),
                properties.parameters().get(INERTIA_FACTOR));
    }
}
