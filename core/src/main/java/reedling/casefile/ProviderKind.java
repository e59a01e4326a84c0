// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/** Places of a case file that name a plugin. */
public enum ProviderKind {
    /** Normal stage of the contact law. */
    NORMAL("a normal law"),
    /** Adhesion stage of the contact law. */
    ADHESION("an adhesion law"),
    /** Near-field stage of the contact law. */
    NEAR_FIELD("a near-field law"),
    /** Tangential stage of the contact law. */
    TANGENTIAL("a tangential law"),
    /** Rolling stage of the contact law. */
    ROLLING("a rolling law"),
    /** Twisting stage of the contact law. */
    TWISTING("a twisting law"),
    /** Force on single grains. */
    FIELD("a field"),
    /** Element type of wires. */
    ELEMENT("an element type");

    private final String noun;

    ProviderKind(String noun) {
        this.noun = noun;
    }

    /** For messages, with article. */
    public String noun() {
        return noun;
    }
}
