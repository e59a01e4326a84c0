// SPDX-License-Identifier: Apache-2.0
package reedling.parallel;

import org.jspecify.annotations.Nullable;

/** Of all tasks of a phase that failed, the one of the smallest number: the same for any number of workers. */
final class FirstFailure {

    private @Nullable Throwable failure;
    private int task;

    synchronized void record(int failedTask, Throwable thrown) {
        if (failure == null || failedTask < task) {
            failure = thrown;
            task = failedTask;
        }
    }

    /** Throws the recorded failure as it was thrown, and forgets it. */
    synchronized void throwAndForget() {
        Throwable thrown = failure;
        failure = null;
        if (thrown instanceof RuntimeException unchecked) {
            throw unchecked;
        }
        if (thrown instanceof Error error) {
            throw error;
        }
        if (thrown != null) {
            throw new IllegalStateException("task " + task + " threw a checked exception", thrown);
        }
    }
}
