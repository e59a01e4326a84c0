// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.Map;
import reedling.contact.ContactBlock;
import reedling.contact.ContactLaw;
import reedling.contact.Stage;

/** Time that a law's kernel takes for a contact and step, without the engine around it. */
final class Cost {

    private static final long WARM_UP = 400_000_000L; // ns
    private static final int ROUNDS = 25;
    private static final int CALLS = 2000;

    private Cost() {}

    /** Nanoseconds a row, the best of several rounds on one thread, after the compiler has had its turn. */
    static double nanoseconds(Map<Stage, ContactLaw> laws, Stage stage) {
        CapturedBlock captured = CapturedBlock.of(laws, stage);
        long end = System.nanoTime() + WARM_UP;
        while (System.nanoTime() < end) {
            round(captured);
        }
        double best = Double.POSITIVE_INFINITY;
        for (int k = 0; k < ROUNDS; k++) {
            best = Math.min(best, round(captured));
        }
        return best / captured.rows();
    }

    private static double round(CapturedBlock captured) {
        ContactBlock block = new ContactBlock();
        captured.open(block);
        long begin = System.nanoTime();
        for (int k = 0; k < CALLS; k++) {
            captured.kernel().apply(block);
        }
        return (System.nanoTime() - begin) / (double) CALLS;
    }
}
