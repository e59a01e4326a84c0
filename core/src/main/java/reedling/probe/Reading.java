// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

/**
 * One figure that a probe gives. Threads: immutable.
 *
 * @param name in plain words, always the same for a probe
 * @param unit of the value, plain ASCII; empty for a pure number
 * @param value not a number if it is not known
 */
public record Reading(String name, String unit, double value) {

    /** Name and unit in one word, for a record: {@code foot_radius_m}. */
    public String key() {
        return (unit.isEmpty() ? name : name + " " + unit).replace("/", " per ").replace(' ', '_');
    }
}
