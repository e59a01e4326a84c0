// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

/**
 * What every task of a force phase must know of the step; one for a run, set between phases.
 *
 * <p>Threads: written by the step loop before a phase, read by the tasks.
 */
public final class StepContext {

    private final ApproachRule approach;
    private double pastStep;
    private double travel;
    private double reach;
    private boolean energyDue;

    /**
     * @param stepsPerContact steps in the duration of an impact
     */
    public StepContext(double stepsPerContact) {
        approach = new ApproachRule(stepsPerContact);
    }

    /**
     * Opens a force phase.
     *
     * @param past length of the step that led to the present positions, s; 0 at the start
     * @param longest length the next step will not exceed, s
     * @param travelled accumulated largest displacement of any body since the last search, m
     * @param largestSpeed speed of the fastest body, m/s
     * @param energyIsDue true when stored energies are wanted for a ledger report
     */
    public void open(double past, double longest, double travelled, double largestSpeed, boolean energyIsDue) {
        pastStep = past;
        travel = travelled;
        reach = 3 * largestSpeed * longest; // two bodies closing for 1.4 steps, rounded up
        energyDue = energyIsDue;
        approach.longestStep(longest);
    }

    double pastStep() {
        return pastStep;
    }

    void pastStep(double seconds) {
        pastStep = seconds;
    }

    double travel() {
        return travel;
    }

    double reach() {
        return reach;
    }

    boolean energyDue() {
        return energyDue;
    }

    ApproachRule approach() {
        return approach;
    }
}
