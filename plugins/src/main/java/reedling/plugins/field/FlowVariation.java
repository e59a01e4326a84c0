// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

/**
 * Factor on a flow over time: min(t / ramp, 1) (1 + amplitude sin(2 pi frequency t)).
 *
 * @param ramp time to full flow, s; 0 for full flow from the start
 * @param amplitude share of the flow, 0 to 1
 * @param frequency Hz
 */
record FlowVariation(double ramp, double amplitude, double frequency) {

    /** Factor at a time, s, >= 0. */
    double factor(double time) {
        double grown = time < ramp ? time / ramp : 1;
        return amplitude == 0 ? grown : grown * (1 + amplitude * StrictMath.sin(2 * Math.PI * frequency * time));
    }
}
