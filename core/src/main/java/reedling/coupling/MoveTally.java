// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

/**
 * What the grains of one chunk add up to while they move: energies at the end of the past step, the largest speed and
 * the highest frequency estimate. Sums run in grain order; maxima do not depend on any.
 *
 * <p>Threads: written by the task of its chunk, read between phases.
 */
public final class MoveTally {

    private double kinetic;
    private double largestSpeedSquared;
    private double largestFrequencySquared;
    private double check;

    void clear() {
        kinetic = 0;
        largestSpeedSquared = 0;
        largestFrequencySquared = 0;
        check = 0;
    }

    void kinetic(double energy) {
        kinetic += energy;
    }

    void speedSquared(double value) {
        largestSpeedSquared = value > largestSpeedSquared ? value : largestSpeedSquared;
        check += value * 0.0;
    }

    void frequencySquared(double value) {
        largestFrequencySquared = value > largestFrequencySquared ? value : largestFrequencySquared;
    }

    /** Kinetic energy at the end of the past step, J. */
    public double kinetic() {
        return kinetic;
    }

    /** Largest squared speed after the opening kick, m2/s2. */
    public double largestSpeedSquared() {
        return largestSpeedSquared;
    }

    /** Largest squared frequency estimate of a grain in its contacts, 1/s2. */
    public double largestFrequencySquared() {
        return largestFrequencySquared;
    }

    /** False when a velocity is not a finite number. */
    public boolean finite() {
        return check == 0;
    }
}
