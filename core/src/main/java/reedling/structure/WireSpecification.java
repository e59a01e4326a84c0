// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import java.util.Map;
import reedling.material.Material;

/**
 * A straight wire, rod or tube between two points.
 *
 * @param name as in the case file, such as {@code wire 3}
 * @param material density and moduli
 * @param section cross-section, m
 * @param ends where and how it is held
 * @param elements number of elements, >= 1
 * @param tension pull at the given span, N, >= 0
 * @param damping strain-rate and modal damping
 * @param elementType name of the {@link ElementType}
 * @param parameters values of the element type's parameters that differ from their defaults, SI
 * @param rigid whether it follows its support as one stiff piece: the comparison case of a bending wire
 */
public record WireSpecification(
        String name,
        Material material,
        CrossSection section,
        WireEnds ends,
        int elements,
        double tension,
        WireDamping damping,
        String elementType,
        Map<String, Double> parameters,
        boolean rigid) {

    public WireSpecification {
        parameters = Map.copyOf(parameters);
    }

    /** Stretch at the given span, T / (E A). */
    public double prestretch() {
        return tension / (material.youngsModulus() * section.area());
    }
}
