// SPDX-License-Identifier: Apache-2.0
package reedling.parallel;

/** Work that a {@link WorkerTeam} does in numbered tasks. */
@FunctionalInterface
public interface Phase {

    /**
     * Does one task; called once for each task number, by any worker, while other tasks run on other workers. Bits stay
     * the same for any number of workers as long as a task writes only places of its own, chosen by its number.
     *
     * @param task number from 0
     * @param worker number from 0 of the worker that runs it, for scratch memory; two tasks of one worker never overlap
     */
    void run(int task, int worker);
}
