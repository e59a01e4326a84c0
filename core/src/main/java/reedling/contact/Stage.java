// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

/** Stages of a contact law, in the order in which a step calls them. */
public enum Stage {
    /** Elastic normal force with its dashpot; every case has one. It overwrites what it writes, later ones add. */
    NORMAL,
    /** Attraction of bodies that touch. */
    ADHESION,
    /** Forces across a gap. */
    NEAR_FIELD,
    TANGENTIAL,
    ROLLING,
    /** Resistance to spin about the normal; adds to the rolling moment. */
    TWISTING
}
