// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/** Cross-section of a wire; lengths in m. */
public sealed interface WireSection {

    /** What a grain feels, m. */
    double outerDiameter();

    /** Solid and round. */
    record Round(double outerDiameter) implements WireSection {}

    /** Round and hollow; the inner diameter is below the outer. */
    record Tube(double outerDiameter, double innerDiameter) implements WireSection {}
}
