// SPDX-License-Identifier: Apache-2.0
package reedling.run;

/** Asks a run to end after the present step, with a checkpoint. Threads: raised from any, such as a signal's. */
public final class StopFlag {

    private volatile boolean raised;

    public void raise() {
        raised = true;
    }

    public boolean raised() {
        return raised;
    }
}
