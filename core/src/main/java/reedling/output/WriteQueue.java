// SPDX-License-Identifier: Apache-2.0
package reedling.output;

import java.io.IOException;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.CountDownLatch;
import org.jspecify.annotations.Nullable;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;

/**
 * Runs writing jobs in order on one background thread, so that computing waits only when {@code capacity} jobs are
 * already waiting. A job owns a private copy of what it writes. After the first failure later jobs are dropped, and
 * every call reports that failure: what is on the disk is then a whole prefix of what was submitted.
 * Threads: one submits; the jobs run on the queue's own thread.
 */
public final class WriteQueue implements AutoCloseable {

    /** Writes something; it must not touch what the submitting thread still changes. */
    @FunctionalInterface
    public interface Job {
        void run() throws IOException;
    }

    private record Named(String what, Job job, boolean evenAfterFailure) {}

    private static final Named END = new Named("end", () -> {}, false);

    private final BlockingQueue<Named> waiting;
    private final Thread writer;
    private volatile @Nullable ReedlingException failure;
    private boolean closed;
    private long blockedNanoseconds;

    /** @param capacity jobs that may wait; 2 or 3 hide an uneven disk, more only holds memory */
    public WriteQueue(int capacity) {
        waiting = new ArrayBlockingQueue<>(capacity);
        writer = new Thread(this::runJobs, "reedling-writer");
        writer.setDaemon(true);
        writer.start();
    }

    /**
     * Hands over a job; waits while the queue is full.
     *
     * @param what named in the message if it fails, e.g. {@code snapshot at 0.1 s}
     * @throws ReedlingException the first failure of any job so far
     */
    public void submit(String what, Job job) {
        if (closed) {
            throw new IllegalStateException("write queue is closed: " + what);
        }
        checkFailure();
        put(new Named(what, job, false));
    }

    /** Throws the first failure of any job so far, if there was one; cheap enough for every step. */
    public void checkFailure() {
        ReedlingException first = failure;
        if (first != null) {
            // a new one each time: try-with-resources cannot suppress an exception by itself
            ReedlingException again = new ReedlingException(first.exitCode(), first.findings());
            again.initCause(first);
            throw again;
        }
    }

    /** Waits until everything submitted so far was run, then {@link #checkFailure}. */
    public void drain() {
        if (!closed) {
            CountDownLatch reached = new CountDownLatch(1);
            put(new Named("drain", reached::countDown, true));
            uninterrupted(reached::await);
        }
        checkFailure();
    }

    /** Time for which submitting waited on a full queue, s. */
    public double blockedTime() {
        return 1e-9 * blockedNanoseconds;
    }

    /** Runs what was submitted, ends the thread, then {@link #checkFailure}. A second call does nothing. */
    @Override
    public void close() {
        if (closed) {
            return;
        }
        closed = true;
        put(END);
        uninterrupted(writer::join);
        checkFailure();
    }

    private void put(Named job) {
        if (!waiting.offer(job)) {
            long start = System.nanoTime();
            uninterrupted(() -> waiting.put(job));
            blockedNanoseconds += System.nanoTime() - start;
        }
    }

    private void runJobs() {
        Named[] next = new Named[1];
        do {
            uninterrupted(() -> next[0] = waiting.take());
            if (failure == null || next[0].evenAfterFailure) {
                runOne(next[0]);
            }
        } while (next[0] != END);
    }

    private void runOne(Named named) {
        try {
            named.job.run();
        } catch (ReedlingException known) {
            failure = known;
        } catch (IOException cause) {
            failure = new ReedlingException(
                    ExitCode.INPUT_OUTPUT,
                    new Finding(
                            named.what,
                            "",
                            "not written: " + cause,
                            "",
                            "Check free space and permissions of the run folder, then resume."),
                    cause);
        } catch (RuntimeException | Error cause) {
            failure = new ReedlingException(
                    ExitCode.INTERNAL,
                    new Finding(named.what, "", "not written: " + cause, "", "Please report this fault."),
                    cause);
        }
    }

    private interface Waiting {
        void await() throws InterruptedException;
    }

    /** An interrupt must not tear the order of what is written; it is kept for the caller. */
    private static void uninterrupted(Waiting waiting) {
        boolean interrupted = false;
        while (true) {
            try {
                waiting.await();
                break;
            } catch (InterruptedException kept) {
                interrupted = true;
            }
        }
        if (interrupted) {
            Thread.currentThread().interrupt();
        }
    }
}
