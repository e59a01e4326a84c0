// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import reedling.material.Material;
import reedling.plugin.ParameterValues;

/**
 * What an element law is made from.
 *
 * @param section cross-section, m
 * @param material density and moduli
 * @param dampingTime beta of stiffness-proportional strain-rate damping, s, >= 0: stress = C (strain + beta rate)
 * @param parameters checked values of the parameters the element type declares
 */
public record ElementProperties(Section section, Material material, double dampingTime, ParameterValues parameters) {

    /** The same with another damping time, s. */
    public ElementProperties withDampingTime(double time) {
        return new ElementProperties(section, material, time, parameters);
    }
}
