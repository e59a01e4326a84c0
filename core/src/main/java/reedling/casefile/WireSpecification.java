// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.Optional;
import org.joml.Vector3d;
import org.joml.Vector3dc;

/**
 * A row of equal, parallel, straight wires, rods or tubes.
 *
 * @param name as in the case file
 * @param material name of one of the case's materials
 * @param section cross-section
 * @param start start of the first wire, m
 * @param end end of the first wire, m
 * @param count number of wires
 * @param pitch from one wire to the next, m; zero for a single wire
 * @param elements number of elements of each wire
 * @param tension pulling force in each wire at rest, N
 * @param startSupport how the start is held
 * @param endSupport how the end is held
 * @param motion name of the motion of the supports; empty for supports at rest
 * @param strainDamping beta of stress = C (strain + beta strain rate), s
 * @param firstModeDamping damping ratio of the first lateral mode, relative to the supports
 * @param rigid whether the wires follow their supports without bending
 * @param element element type
 */
public record WireSpecification(
        String name,
        String material,
        WireSection section,
        Vector3dc start,
        Vector3dc end,
        int count,
        Vector3dc pitch,
        int elements,
        double tension,
        WireSupport startSupport,
        WireSupport endSupport,
        Optional<String> motion,
        double strainDamping,
        double firstModeDamping,
        boolean rigid,
        PluginChoice element) {

    /** Distance between the supports, m. */
    public double length() {
        return start.distance(end);
    }

    /** Length of one element, m. */
    public double elementLength() {
        return length() / elements;
    }

    /** Distance between the axes of neighbouring wires, at right angles to them, m. */
    public double spacing() {
        Vector3d along = new Vector3d(end).sub(start).normalize();
        return new Vector3d(pitch).cross(along).length();
    }
}
