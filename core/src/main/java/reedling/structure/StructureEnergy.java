// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * Energies of a structure at the last closed step, J. Held nodes count as part of their support: neither their kinetic
 * energy nor their weight is in here.
 *
 * @param kinetic 1/2 m v^2 + 1/2 J w^2 with centred velocities
 * @param gravity -m g.x
 * @param strain elastic energy of the elements
 * @param strainDissipation taken so far by strain-rate damping
 * @param modalDissipation taken so far by modal damping
 * @param supportWork done so far by driven supports on the structure
 */
public record StructureEnergy(
        double kinetic,
        double gravity,
        double strain,
        double strainDissipation,
        double modalDissipation,
        double supportWork) {

    /** Constant but for loads and the O(h^2) error of the integrator, J. */
    public double balance() {
        return kinetic + gravity + strain + strainDissipation + modalDissipation - supportWork;
    }
}
