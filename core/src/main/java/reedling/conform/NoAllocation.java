// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.List;
import java.util.Locale;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;

/** Once compiled, a kernel allocates nothing. */
final class NoAllocation implements Check {

    private static final int CALLS = 2000;
    private static final int ROUNDS = 60;

    @Override
    public String name() {
        return "no allocation";
    }

    @Override
    public Outcome run(Subject subject) {
        CapturedBlock captured = CapturedBlock.of(subject.laws(), subject.stage());
        ContactBlock block = new ContactBlock();
        captured.open(block);
        ContactKernel kernel = captured.kernel();
        double bytes = Allocation.leastBytes(() -> kernel.apply(block), CALLS, ROUNDS);
        if (Double.isNaN(bytes)) {
            return new Outcome(List.of(), "This Java machine cannot count allocated bytes.");
        }
        return Outcome.of(
                bytes < 1,
                String.format(
                        Locale.ROOT,
                        "The kernel allocates %.0f bytes a block of %d rows, in every round: keep arrays and objects"
                                + " out of apply.",
                        bytes,
                        captured.rows()),
                String.format(Locale.ROOT, "%.3g bytes a contact and step.", bytes / captured.rows()));
    }
}
