// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

/** Is shown every grain that comes from a feed or leaves. Threads: called by the thread of the step loop. */
public interface GrainWatch {

    /** Looks at nothing. */
    GrainWatch NONE = new GrainWatch() {
        @Override
        public void fed(int lot, double mass, double time) {}

        @Override
        public void left(int exit, int lot, double diameter, double mass, double time) {}
    };

    /** A grain (mass in kg) was fed at a time (s). */
    void fed(int lot, double mass, double time);

    /**
     * A grain left.
     *
     * @param exit number of the outlet, or the number of outlets if it was spilled
     * @param diameter m
     * @param mass kg
     * @param time s
     */
    void left(int exit, int lot, double diameter, double mass, double time);
}
