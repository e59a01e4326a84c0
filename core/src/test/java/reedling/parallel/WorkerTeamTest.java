// SPDX-License-Identifier: Apache-2.0
package reedling.parallel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatIllegalStateException;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.util.Arrays;
import java.util.SplittableRandom;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.concurrent.atomic.AtomicIntegerArray;
import java.util.concurrent.locks.LockSupport;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

@Timeout(60)
class WorkerTeamTest {

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 5})
    void everyTaskOfEveryPhaseRunsExactlyOnce(int workers) {
        SplittableRandom random = new SplittableRandom(7);
        try (WorkerTeam team = new WorkerTeam(workers)) {
            for (int phase = 0; phase < 2_000; phase++) {
                int count = random.nextInt(40);
                AtomicIntegerArray runs = new AtomicIntegerArray(40);
                team.run((task, worker) -> runs.incrementAndGet(task), count);
                for (int task = 0; task < 40; task++) {
                    assertThat(runs.get(task)).isEqualTo(task < count ? 1 : 0);
                }
            }
        }
    }

    /** Plain memory only: a missing release or acquire would show as a stale value somewhere in 100,000 phases. */
    @ParameterizedTest
    @ValueSource(ints = {2, 3})
    void plainWritesOfOnePhaseAreSeenByTheNextWhoeverRunsIt(int workers) {
        int count = 16;
        long[][] values = new long[2][count * 8];
        try (WorkerTeam team = new WorkerTeam(workers)) {
            for (int phase = 0; phase < 100_000; phase++) {
                long[] old = values[phase & 1];
                long[] fresh = values[1 - (phase & 1)];
                team.run((task, worker) -> fresh[task * 8] = old[(task + 5) % count * 8] + 1, count);
            }
        }
        for (int task = 0; task < count; task++) {
            assertThat(values[0][task * 8]).isEqualTo(100_000);
        }
    }

    @Test
    void tasksOfOneWorkerNeverOverlap() {
        int workers = 3;
        AtomicIntegerArray inside = new AtomicIntegerArray(workers);
        AtomicBoolean overlapped = new AtomicBoolean();
        try (WorkerTeam team = new WorkerTeam(workers)) {
            for (int phase = 0; phase < 5_000; phase++) {
                team.run(
                        (task, worker) -> {
                            if (inside.incrementAndGet(worker) != 1) {
                                overlapped.set(true);
                            }
                            Thread.onSpinWait();
                            inside.decrementAndGet(worker);
                        },
                        20);
            }
        }
        assertThat(overlapped).isFalse();
    }

    @Test
    void twoWorkersShareOnePhase() {
        CountDownLatch both = new CountDownLatch(2);
        AtomicBoolean met = new AtomicBoolean(true);
        try (WorkerTeam team = new WorkerTeam(2)) {
            // Each of the two tasks waits for the other: one worker alone could never finish them.
            team.run((task, worker) -> met.compareAndSet(true, waitFor(both)), 2);
        }
        assertThat(met).isTrue();
    }

    private static boolean waitFor(CountDownLatch latch) {
        latch.countDown();
        try {
            return latch.await(30, TimeUnit.SECONDS);
        } catch (InterruptedException interrupted) {
            throw new IllegalStateException(interrupted);
        }
    }

    @Test
    void workerDoneWithItsShareHelpsTheOthers() {
        int[] workerOf = new int[8];
        try (WorkerTeam team = new WorkerTeam(2)) {
            CountDownLatch othersDone = new CountDownLatch(7);
            team.run(
                    (task, worker) -> {
                        workerOf[task] = worker;
                        if (task == 0) {
                            waitFor(othersDone, 30);
                        } else {
                            othersDone.countDown();
                        }
                    },
                    8);
        }
        // Task 0 blocks its worker until the other one has done everything else, its own share and the rest.
        int helper = 1 - workerOf[0];
        assertThat(Arrays.copyOfRange(workerOf, 1, 8)).containsOnly(helper);
    }

    private static void waitFor(CountDownLatch latch, int seconds) {
        try {
            assertThat(latch.await(seconds, TimeUnit.SECONDS)).isTrue();
        } catch (InterruptedException interrupted) {
            throw new IllegalStateException(interrupted);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3})
    void failureOfTheSmallestTaskNumberIsThrownAndTheTeamStaysUsable(int workers) {
        try (WorkerTeam team = new WorkerTeam(workers)) {
            for (int repeat = 0; repeat < 300; repeat++) {
                AtomicIntegerArray runs = new AtomicIntegerArray(20);
                Phase failing = (task, worker) -> {
                    runs.incrementAndGet(task);
                    if (task % 5 == 3) {
                        throw new ArithmeticException("task " + task);
                    }
                };
                assertThatThrownBy(() -> team.run(failing, 20))
                        .isInstanceOf(ArithmeticException.class)
                        .hasMessage("task 3");
                for (int task = 0; task < 20; task++) {
                    assertThat(runs.get(task)).isEqualTo(1);
                }
                team.run((task, worker) -> runs.incrementAndGet(task), 20);
                assertThat(runs.get(19)).isEqualTo(2);
            }
        }
    }

    @Test
    void errorsReachTheCallerAsTheyWereThrown() {
        StackOverflowError thrown = new StackOverflowError("deep");
        try (WorkerTeam team = new WorkerTeam(2)) {
            assertThatThrownBy(() -> team.run(
                            (task, worker) -> {
                                throw thrown;
                            },
                            4))
                    .isSameAs(thrown);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2})
    void taskThatStartsAPhaseIsRefused(int workers) {
        try (WorkerTeam team = new WorkerTeam(workers)) {
            assertThatIllegalStateException()
                    .isThrownBy(() -> team.run((task, worker) -> team.run((inner, same) -> {}, 1), 1))
                    .withMessageContaining("already runs a phase");
        }
    }

    @Test
    void followersThatFellAsleepJoinAgain() {
        try (WorkerTeam team = new WorkerTeam(2)) {
            team.run((task, worker) -> {}, 2);
            LockSupport.parkNanos(50_000_000);
            CountDownLatch both = new CountDownLatch(2);
            AtomicBoolean met = new AtomicBoolean(true);
            team.run((task, worker) -> met.compareAndSet(true, waitFor(both)), 2);
            assertThat(met).isTrue();
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 3})
    void closedTeamHasNoThreadsAndRefusesWork(int workers) {
        Thread[] threads = new Thread[workers];
        WorkerTeam team = new WorkerTeam(workers);
        CountDownLatch all = new CountDownLatch(workers);
        team.run(
                (task, worker) -> {
                    threads[worker] = Thread.currentThread();
                    waitFor(all);
                },
                workers);
        team.close();
        team.close();
        for (int worker = 1; worker < workers; worker++) {
            assertThat(threads[worker].getName()).startsWith("reedling-worker-");
            assertThat(joined(threads[worker])).isTrue();
        }
        assertThatIllegalStateException().isThrownBy(() -> team.run((task, worker) -> {}, 1));
    }

    private static boolean joined(Thread thread) {
        try {
            return thread.join(java.time.Duration.ofSeconds(10));
        } catch (InterruptedException interrupted) {
            throw new IllegalStateException(interrupted);
        }
    }

    @Test
    void phaseAllocatesNothing() {
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long[] sums = new long[8 * 16];
        Phase phase = (task, worker) -> sums[task * 16]++;
        try (WorkerTeam team = new WorkerTeam(2)) {
            for (int warm = 0; warm < 50_000; warm++) {
                team.run(phase, 8);
            }
            long before = threads.getTotalThreadAllocatedBytes();
            for (int k = 0; k < 50_000; k++) {
                team.run(phase, 8);
            }
            // One object of 64 bytes a phase would be 3.2 MB; other threads of the test machinery may allocate a
            // little.
            assertThat(threads.getTotalThreadAllocatedBytes() - before).isLessThan(500_000);
        }
        assertThat(sums[0]).isEqualTo(100_000);
    }

    @Test
    void teamOfNobodyIsRefused() {
        assertThatIllegalArgumentException().isThrownBy(() -> new WorkerTeam(0));
    }
}
