// SPDX-License-Identifier: Apache-2.0
package reedling.run;

/** Tells a user how a run is getting on. Threads: the thread of the step loop. */
public interface Progress {

    /** Says nothing. */
    Progress SILENT = new Progress() {
        @Override
        public boolean wanted(double fraction) {
            return false;
        }

        @Override
        public void show(Status status) {}

        @Override
        public void close() {}
    };

    /**
     * How a run is getting on.
     *
     * @param time simulated time, s
     * @param endTime s
     * @param step size of the last step, s
     * @param limit what bounds it
     * @param grainSteps grains times steps a second of wall-clock time
     * @param timeLeft estimate of the wall-clock time left, s
     * @param fed grains fed so far
     * @param gone grains that left so far
     * @param residual relative residual of the energy ledger
     */
    record Status(
            double time,
            double endTime,
            double step,
            String limit,
            double grainSteps,
            double timeLeft,
            long fed,
            long gone,
            double residual) {}

    /** Whether a status is wanted now; cheap enough for every step. */
    boolean wanted(double fraction);

    /** Shows a status that was wanted. */
    void show(Status status);

    /** Ends the showing, so that other output starts on a line of its own. */
    void close();
}
