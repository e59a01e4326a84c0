// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import java.util.ArrayList;
import java.util.List;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;
import reedling.plugin.ParameterValues;

/** Turns wire specifications into nodes, elements, supports and damping. Stateless. */
public final class WireMesh {

    private WireMesh() {}

    /**
     * Adds a wire to a structure and returns its body index.
     *
     * <p>The stress-free length is L0 = span / (1 + T/(EA)), so that the wire carries the asked tension at its span.
     *
     * @throws ReedlingException with every fault of the specification
     */
    public static int add(StructureBuilder builder, WireSpecification wire, ElementType type) {
        List<Finding> findings = WireCheck.findings(wire);
        if (!findings.isEmpty()) {
            throw new ReedlingException(ExitCode.CASE, findings);
        }
        WireEnds ends = wire.ends();
        List<Integer> ids = new ArrayList<>();
        for (int i = 0; i <= wire.elements(); i++) {
            ids.add(builder.node(ends.start().towards(ends.end(), (double) i / wire.elements())));
        }
        int[] pairs = new int[2 * wire.elements()];
        for (int e = 0; e < wire.elements(); e++) {
            pairs[2 * e] = ids.get(e);
            pairs[2 * e + 1] = ids.get(e + 1);
        }
        ElementLaw law = law(wire, type);
        if (wire.rigid()) {
            return builder.rigidBody(wire.name(), law, pairs, ends.motion());
        }
        int body = builder.body(wire.name(), law, pairs, up(ends), wire.prestretch());
        builder.support(ids.getFirst(), ends.startCondition(), ends.motion());
        builder.support(ids.getLast(), ends.endCondition(), ends.motion());
        builder.modalDamping(body, 2 * wire.damping().firstModeRatio() * firstAngularFrequency(wire));
        return body;
    }

    /**
     * First lateral angular frequency of the bare wire under its tension, rad/s. Stretching makes the wire lighter and,
     * per length, stiffer in bending by 1 + T/(EA).
     */
    public static double firstAngularFrequency(WireSpecification wire) {
        CrossSection section = wire.section();
        double stretch = 1 + wire.prestretch();
        double smallest = Math.min(section.secondMoment2(), section.secondMoment3());
        return new LateralMode(
                        wire.material().youngsModulus() * smallest * stretch,
                        wire.tension(),
                        wire.material().density() * section.area() / stretch,
                        wire.ends().span())
                .angularFrequency(wire.ends().startCondition(), wire.ends().endCondition());
    }

    private static ElementLaw law(WireSpecification wire, ElementType type) {
        ElementProperties undamped =
                new ElementProperties(wire.section(), wire.material(), 0, ParameterValues.of(type, wire.parameters()));
        double time = wire.damping().strainDampingTime();
        if (wire.damping().highestModeRatio() > 0) {
            time = 2 * wire.damping().highestModeRatio() / highestFrequency(wire, type.law(undamped));
        }
        return type.law(undamped.withDampingTime(time));
    }

    /** Highest angular frequency of one element under the wire's tension, rad/s. */
    private static double highestFrequency(WireSpecification wire, ElementLaw law) {
        StructureBuilder single = new StructureBuilder();
        WireEnds ends = wire.ends();
        int a = single.node(ends.start());
        int b = single.node(ends.start().towards(ends.end(), 1.0 / wire.elements()));
        single.body(wire.name(), law, new int[] {a, b}, up(ends), wire.prestretch());
        Structure structure = single.build();
        return Math.sqrt(structure.squaredFrequency());
    }

    /** Vertical, unless the wire itself is nearly so. */
    private static Position up(WireEnds ends) {
        double rise = Math.abs(ends.end().z() - ends.start().z());
        return rise > 0.95 * ends.span() ? new Position(1, 0, 0) : new Position(0, 0, 1);
    }
}
