// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import reedling.contact.ContactBlock;

/**
 * A law's kernel with a block as the engine handed it over in mid-contact, to be called again and again by a benchmark.
 *
 * <p>Threads: one.
 */
public final class KernelLoop {

    private final CapturedBlock captured;
    private final ContactBlock block = new ContactBlock();

    private KernelLoop(CapturedBlock captured) {
        this.captured = captured;
        captured.open(block);
    }

    /** Drives the law on trial through random contacts and keeps its busiest block. */
    public static KernelLoop of(Subject subject) {
        return new KernelLoop(
                CapturedBlock.of(subject.laws(), subject.provider().stage()));
    }

    /** Rows of the block. */
    public int rows() {
        return captured.rows();
    }

    /** Calls the kernel once; returns a number of its block, for the caller to keep. */
    public double call() {
        captured.kernel().apply(block);
        return block.columns()[ContactBlock.at(0)];
    }
}
