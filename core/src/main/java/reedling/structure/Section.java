// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/** Cross-section of a thin part: of a line (a {@link CrossSection}) or of a surface. */
public interface Section {

    /** Smallest distance from the axis or mid-surface to the outside, m; used by contact. */
    double contactRadius();
}
