// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

import java.util.Set;
import reedling.plugin.ParameterValues;
import reedling.plugin.Provider;

/** A contact stage as a plugin; found by ServiceLoader. */
public interface ContactLawProvider extends Provider {

    /** The stage it serves. */
    Stage stage();

    /** What it brings to a contact; a second law that brings the same is refused. */
    default Set<Trait> brings() {
        return switch (stage()) {
            case NORMAL -> Set.of(Trait.STIFFNESS, Trait.CONTACT_RADIUS);
            case ADHESION -> Set.of(Trait.ADHESION);
            default -> Set.of();
        };
    }

    /** What another law of the case must bring for this one to make sense. */
    default Set<Trait> needs() {
        return Set.of();
    }

    /** Makes the law from checked values. */
    ContactLaw create(ParameterValues values);
}
