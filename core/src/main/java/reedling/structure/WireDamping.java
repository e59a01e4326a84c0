// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * Damping of a wire. Strain-rate damping hardly reaches the lateral modes of a taut wire, whose stiffness is tension:
 * those need a modal ratio.
 *
 * @param strainDampingTime beta of strain-rate damping, s, >= 0
 * @param highestModeRatio instead of a time: damping ratio of strain-rate damping at the highest element frequency,
 *     0 <= value < 1; 0 to use the time. 0.05 silences mesh noise without costing step
 * @param firstModeRatio damping ratio of the first lateral mode, relative to the supports, 0 <= value < 1
 */
public record WireDamping(double strainDampingTime, double highestModeRatio, double firstModeRatio) {

    /** No damping. */
    public static final WireDamping NONE = new WireDamping(0, 0, 0);
}
