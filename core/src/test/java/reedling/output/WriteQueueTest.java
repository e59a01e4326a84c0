// SPDX-License-Identifier: Apache-2.0
package reedling.output;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import reedling.error.ExitCode;
import reedling.error.ReedlingException;

@Timeout(30)
class WriteQueueTest {

    @Test
    void jobsRunInOrderAndCloseWaitsForThem() {
        List<Integer> done = new ArrayList<>();
        try (WriteQueue queue = new WriteQueue(3)) {
            for (int i = 0; i < 100; i++) {
                int number = i;
                queue.submit("job " + i, () -> done.add(number));
            }
        }
        assertThat(done).isEqualTo(IntStream.range(0, 100).boxed().toList());
    }

    @Test
    void submittingWaitsOnlyWhenTheQueueIsFull() throws InterruptedException {
        CountDownLatch gate = new CountDownLatch(1);
        try (WriteQueue queue = new WriteQueue(2)) {
            CountDownLatch running = new CountDownLatch(1);
            queue.submit("slow", () -> {
                running.countDown();
                await(gate);
            });
            running.await();
            queue.submit("second", () -> {});
            queue.submit("third", () -> {});
            assertThat(queue.blockedTime()).isZero();
            Thread fourth = new Thread(() -> queue.submit("fourth", () -> {}));
            fourth.start();
            assertThat(fourth.join(java.time.Duration.ofMillis(100))).isFalse();
            gate.countDown();
            assertThat(fourth.join(java.time.Duration.ofSeconds(10))).isTrue();
            assertThat(queue.blockedTime()).isGreaterThan(0.05);
        }
    }

    @Test
    void firstFailureIsReportedAndLaterJobsAreDropped() {
        List<String> done = new ArrayList<>();
        WriteQueue queue = new WriteQueue(2);
        queue.submit("snapshot at 0.1 s", () -> {
            throw new IOException("No space left on device");
        });
        assertThatThrownBy(queue::drain)
                .isInstanceOfSatisfying(
                        ReedlingException.class,
                        failure -> assertThat(failure.exitCode()).isEqualTo(ExitCode.INPUT_OUTPUT))
                .hasMessageContaining("snapshot at 0.1 s: is not written", "No space left on device");
        assertThatThrownBy(() -> queue.submit("later", () -> done.add("later")))
                .hasMessageContaining("snapshot at 0.1 s");
        assertThatThrownBy(queue::checkFailure).hasMessageContaining("snapshot at 0.1 s");
        assertThatThrownBy(queue::close).hasMessageContaining("snapshot at 0.1 s");
        assertThat(done).isEmpty();
    }

    @Test
    void failureReportedInsideTheBlockAndByItsCloseIsOneException() {
        assertThatThrownBy(() -> {
                    try (WriteQueue queue = new WriteQueue(2)) {
                        queue.submit("table", () -> {
                            throw new IOException("No space left on device");
                        });
                        queue.drain();
                    }
                })
                .isInstanceOf(ReedlingException.class)
                .hasMessageContaining("No space left on device");
    }

    @Test
    void failureOfTheProgramNeverHangsTheSubmitter() {
        WriteQueue queue = new WriteQueue(1);
        queue.submit("broken", () -> {
            throw new IllegalStateException("broken");
        });
        assertThatThrownBy(() -> {
                    for (int i = 0; i < 1000; i++) {
                        queue.submit("next", Thread::onSpinWait);
                        queue.drain();
                    }
                })
                .isInstanceOfSatisfying(
                        ReedlingException.class,
                        failure -> assertThat(failure.exitCode()).isEqualTo(ExitCode.INTERNAL));
        assertThatThrownBy(queue::close).isInstanceOf(ReedlingException.class);
        queue.close();
    }

    @Test
    void interruptIsKeptAndEverythingIsStillWritten() {
        List<Integer> done = new ArrayList<>();
        WriteQueue queue = new WriteQueue(1);
        Thread.currentThread().interrupt();
        for (int i = 0; i < 10; i++) {
            int number = i;
            queue.submit("job", () -> done.add(number));
        }
        queue.close();
        assertThat(Thread.interrupted()).isTrue();
        assertThat(done).hasSize(10);
    }

    private static void await(CountDownLatch gate) {
        try {
            gate.await();
        } catch (InterruptedException interrupted) {
            throw new IllegalStateException(interrupted);
        }
    }
}
