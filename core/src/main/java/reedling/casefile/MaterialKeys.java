// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import reedling.material.Material;
import reedling.unit.Dimension;

/** Keys of materials and of material pairs. */
final class MaterialKeys {

    static final Section MATERIAL = Section.of(
            "A material of grains, walls or wires.",
            Key.required(
                    "density",
                    Key.quantity(Dimension.DENSITY, Range.above(0, 30_000)),
                    "Mass per volume of the solid, not of the bulk."),
            Key.required(
                    "youngs_modulus",
                    Key.quantity(Dimension.PRESSURE, Range.closed(1e3, 2e12)),
                    "Stiffness in tension. Grains may be softened to allow longer time steps; overlaps grow with it."),
            Key.required(
                    "poisson_ratio",
                    Key.quantity(
                            Dimension.NUMBER,
                            Range.below(0, 0.5).withAdvice("Use 0.49 for a nearly incompressible material.")),
                    "Lateral contraction over extension."));

    static final Section PAIR = Section.of(
            "What two touching materials do to each other; one entry for every two that can touch.",
            Key.required("materials", new ValueType.Couple("materials"), "The two materials, which may be the same."),
            Key.required(
                    "restitution",
                    Key.quantity(Dimension.NUMBER, Range.closed(0.05, 1)),
                    "Rebound speed over approach speed of a normal impact."),
            Key.required(
                    "friction", Key.quantity(Dimension.NUMBER, Range.closed(0, 5)), "Coulomb coefficient of sliding."),
            Key.preset(
                    "rolling_friction",
                    Key.quantity(Dimension.NUMBER, Range.closed(0, 2)),
                    0.0,
                    "Limit of the rolling torque over normal force times effective radius."));

    private MaterialKeys() {}

    static Material read(String name, Values values) {
        return new Material(
                name, values.number("density"), values.number("youngs_modulus"), values.number("poisson_ratio"));
    }
}
