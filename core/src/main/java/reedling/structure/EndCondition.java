// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/** How a node is held. */
public enum EndCondition {
    /** Not held. */
    FREE,
    /** Position follows the support, orientation is free. */
    PINNED,
    /** Position and orientation follow the support. */
    CLAMPED;

    boolean holdsPosition() {
        return this != FREE;
    }

    boolean holdsOrientation() {
        return this == CLAMPED;
    }
}
