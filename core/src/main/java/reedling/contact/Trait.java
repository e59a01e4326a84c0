// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

/** What a contact law brings to a contact; only one law of a case may bring each. */
public enum Trait {
    /** Column STIFFNESS, that of the bodies themselves. */
    STIFFNESS("a normal stiffness"),
    /** Column CONTACT_RADIUS, that of a round area of contact. */
    CONTACT_RADIUS("a contact radius"),
    /** Force and area of Hertz, not changed by attraction. */
    HERTZ_CONTACT("an unchanged contact of Hertz"),
    /** Attraction of bodies that touch. */
    ADHESION("adhesion");

    private final String noun;

    Trait(String noun) {
        this.noun = noun;
    }

    /** For messages, with article. */
    public String noun() {
        return noun;
    }
}
