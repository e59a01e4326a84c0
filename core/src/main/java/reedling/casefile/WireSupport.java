// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/** How an end of a wire is held. */
public enum WireSupport {
    /** Position and direction follow the support. */
    CLAMPED,
    /** Position follows the support, direction is free. */
    PINNED,
    /** Not held. */
    FREE
}
