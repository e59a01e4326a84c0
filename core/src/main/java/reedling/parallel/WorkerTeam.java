// SPDX-License-Identifier: Apache-2.0
package reedling.parallel;

import java.util.concurrent.ForkJoinPool;
import java.util.concurrent.ForkJoinWorkerThread;
import java.util.concurrent.TimeUnit;
import org.jspecify.annotations.Nullable;

/**
 * A team of worker threads that runs phase after phase, each phase split into numbered tasks.
 *
 * <p>A team of T workers is the calling thread, the leader, and T - 1 followers: long-lived Fork/Join tasks that wait
 * for phases. Each worker first takes tasks of its own contiguous share, so that memory stays near the core that used
 * it last, then helps with the shares of the others.
 *
 * <p>The leader never waits for a follower that has not joined the phase, only for those at work: when no task is left
 * it closes the phase to late followers. A follower that sleeps, or whose core another program took, then costs nothing.
 *
 * <p>Threads: one phase at a time. Everything the caller wrote before {@link #run} is seen by the tasks, and everything
 * the tasks wrote is seen by the caller afterwards. A phase allocates nothing.
 */
public final class WorkerTeam implements AutoCloseable {

    // Layout of the shared values for T workers: the number of the phase published last; whether a phase is running;
    // how far each worker got; the next unclaimed task of each worker's share.
    private static final int PUBLISHED = 0;
    private static final int BUSY = 1;
    private static final int FIRST_PROGRESS = 2;

    private static final long CLOSED = Long.MAX_VALUE;
    private static final int WORKING = 1;

    private static final long LEADER_SLEEP = 50_000; // ns
    private static final long FOLLOWER_SLEEP = 1_000_000; // ns

    private final int workers;
    private final int firstClaim;
    private final PaddedLongs shared;
    private final FirstFailure firstFailure = new FirstFailure();
    private final Patience leaderPatience = new Patience(LEADER_SLEEP);
    private final @Nullable ForkJoinPool pool;

    private volatile boolean failed;
    private boolean closed;

    // Written by the leader before it publishes a phase, read by followers that joined it.
    private Phase phase = (task, worker) -> {};
    private int tasks;

    /**
     * Starts the followers.
     *
     * @param workers number of threads including the caller, at least 1; 1 runs everything in the calling thread
     */
    public WorkerTeam(int workers) {
        if (workers < 1) {
            throw new IllegalArgumentException("a team needs at least 1 worker, got " + workers);
        }
        this.workers = workers;
        firstClaim = FIRST_PROGRESS + workers;
        shared = new PaddedLongs(firstClaim + workers);
        pool = workers == 1 ? null : startFollowers();
    }

    private ForkJoinPool startFollowers() {
        ForkJoinPool followers = new ForkJoinPool(workers - 1, WorkerTeam::namedThread, null, true);
        for (int worker = 1; worker < workers; worker++) {
            int number = worker;
            followers.execute(() -> follow(number));
        }
        return followers;
    }

    private static ForkJoinWorkerThread namedThread(ForkJoinPool pool) {
        ForkJoinWorkerThread thread = ForkJoinPool.defaultForkJoinWorkerThreadFactory.newThread(pool);
        thread.setName("reedling-worker-" + (thread.getPoolIndex() + 1));
        return thread;
    }

    /** Number of threads including the caller's. */
    public int workers() {
        return workers;
    }

    /**
     * Runs tasks 0 to {@code count - 1} of a phase and returns when all are done.
     *
     * <p>A task that throws does not keep the others from running. Afterwards the exception of the failed task of the
     * smallest number is thrown, as it was thrown there, and the team stays usable.
     *
     * @throws IllegalStateException when the team is closed, or a phase is running (a task must not start another)
     */
    public void run(Phase next, int count) {
        if (!shared.compareAndSet(BUSY, 0, 1)) {
            throw new IllegalStateException("the team is closed or already runs a phase");
        }
        try {
            if (workers == 1) {
                runShare(next, 0, count);
            } else {
                runTogether(next, count);
            }
        } finally {
            shared.setRelease(BUSY, 0);
        }
        if (failed) {
            failed = false;
            firstFailure.throwAndForget();
        }
    }

    private void runShare(Phase next, int worker, int count) {
        for (int task = 0; task < count; task++) {
            runTask(next, task, worker);
        }
    }

    private void runTogether(Phase next, int count) {
        phase = next;
        tasks = count;
        for (int worker = 0; worker < workers; worker++) {
            shared.setPlain(firstClaim + worker, shareStart(worker, count));
        }
        long sequence = shared.getPlain(PUBLISHED) + 1;
        shared.setRelease(PUBLISHED, sequence);
        claimTasks(next, count, 0);
        for (int worker = 1; worker < workers; worker++) {
            closeOrAwait(worker, sequence);
        }
    }

    private long shareStart(int worker, int count) {
        return (long) worker * count / workers;
    }

    /** Progress of a follower: twice the number of the last phase it has left or missed, or that plus 1 inside one. */
    private static long left(long sequence) {
        return 2 * sequence;
    }

    private static long inside(long sequence) {
        return 2 * sequence + WORKING;
    }

    private void closeOrAwait(int worker, long sequence) {
        int slot = FIRST_PROGRESS + worker;
        if (shared.getAcquire(slot) == left(sequence - 1)
                && shared.compareAndSet(slot, left(sequence - 1), left(sequence))) {
            return;
        }
        leaderPatience.reset();
        while (shared.getAcquire(slot) != left(sequence)) {
            leaderPatience.await();
        }
    }

    private void follow(int worker) {
        Patience patience = new Patience(FOLLOWER_SLEEP);
        int slot = FIRST_PROGRESS + worker;
        long seen = 0;
        while (seen != CLOSED) {
            long published = shared.getAcquire(PUBLISHED);
            if (published == seen) {
                patience.await();
                continue;
            }
            seen = published;
            patience.reset();
            // Joining fails when the leader has closed the phase; then its fields may already belong to the next one.
            if (seen != CLOSED && shared.compareAndSet(slot, left(seen - 1), inside(seen))) {
                claimTasks(phase, tasks, worker);
                shared.setRelease(slot, left(seen));
            }
        }
    }

    private void claimTasks(Phase current, int count, int worker) {
        for (int k = 0; k < workers; k++) {
            int owner = worker + k < workers ? worker + k : worker + k - workers;
            int slot = firstClaim + owner;
            long end = shareStart(owner + 1, count);
            while (shared.getOpaque(slot) < end) {
                long task = shared.getAndIncrement(slot);
                if (task < end) {
                    runTask(current, (int) task, worker);
                }
            }
        }
    }

    private void runTask(Phase current, int task, int worker) {
        try {
            current.run(task, worker);
        } catch (Throwable thrown) {
            // Kept for the caller: the worker itself must live on, whatever a task throws.
            firstFailure.record(task, thrown);
            failed = true;
        }
    }

    /** Ends the followers; waits until they have ended. A second call does nothing. */
    @Override
    public void close() {
        if (closed) {
            return;
        }
        if (!shared.compareAndSet(BUSY, 0, 1)) {
            throw new IllegalStateException("a running phase cannot close its team");
        }
        closed = true;
        if (pool != null) {
            shared.setRelease(PUBLISHED, CLOSED);
            endFollowers(pool);
        }
    }

    private static void endFollowers(ForkJoinPool pool) {
        pool.shutdown();
        try {
            if (!pool.awaitTermination(1, TimeUnit.MINUTES)) {
                throw new IllegalStateException("the workers did not end within a minute");
            }
        } catch (InterruptedException interrupted) {
            // The followers end by themselves; only the wait for them is cut short.
            Thread.currentThread().interrupt();
        }
    }
}
