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
    private double closingWork;
    private double openingWork;

    void clear() {
        kinetic = 0;
        closingWork = 0;
        openingWork = 0;
        largestSpeedSquared = 0;
        largestFrequencySquared = 0;
        check = 0;
    }

    void kinetic(double energy) {
        kinetic += energy;
    }

    void closingWork(double energy) {
        closingWork += energy;
    }

    void openingWork(double energy) {
        openingWork += energy;
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

    /** Work of motion forces in the kicks that closed the past step, J. */
    public double closingWork() {
        return closingWork;
    }

    /** Work of motion forces in the kicks that opened the next step, J. */
    public double openingWork() {
        return openingWork;
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
