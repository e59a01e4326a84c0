// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.contact;

import reedling.contact.Column;
import reedling.contact.ContactMemory;

/**
 * What a tangential spring does when the normal load changes and its stiffness k_t with it. With a the radius of contact,
 * to which k_t is proportional, the stretch of the step before is multiplied by a factor b.
 */
enum StretchRule {
    /**
     * Growing load keeps the force, shrinking load the stretch: b = min(1, a_old / a). The spring never creates energy.
     * After Thornton and Randall, Applications of theoretical contact mechanics to solid particle system simulation, 1988
     * (from memory).
     */
    PASSIVE,

    /**
     * The force is k_t of now times all the stretch: b = 1. Pressing a sheared contact harder raises its friction without
     * motion, and the energy of the spring with it.
     */
    SECANT,

    /**
     * The force changes by k_t times sliding, and not with the load: b = a_old / a. Letting go of a sheared contact raises
     * the energy of its softening spring; round a closed path the law can create energy (Elata and Berryman, Contact
     * force-displacement laws and the mechanical behavior of random packs of identical spheres, 1996, from memory).
     */
    INCREMENTAL;

    /** Kernel that advances the stretch. */
    ContactMemory memory(int historyColumn) {
        return switch (this) {
            case PASSIVE -> new ContactMemory(historyColumn, Column.SLIDING);
            case SECANT -> ContactMemory.ofStretch(historyColumn, Column.SLIDING);
            case INCREMENTAL -> ContactMemory.ofForce(historyColumn, Column.SLIDING);
        };
    }
}
