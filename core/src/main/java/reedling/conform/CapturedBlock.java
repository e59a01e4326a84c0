// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.Arrays;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.contact.ContactLaw;
import reedling.contact.Stage;
import reedling.material.MaterialPair;

/**
 * A block as the engine handed it to one law in mid-contact, to be handed to a kernel of that law again and again.
 *
 * <p>Threads: one.
 *
 * @param kernel the law bound to the pair of the block
 * @param columns all columns of all rows
 * @param history history of the rows, from 0
 * @param historyColumns doubles a row
 * @param rows number of rows
 * @param touching rows that touch
 * @param step past step, s
 */
record CapturedBlock(
        ContactKernel kernel,
        double[] columns,
        double[] history,
        int historyColumns,
        int rows,
        int touching,
        double step) {

    private static final int STEPS = 200;

    /** Drives random contacts through the laws and keeps the block in which most rows touch. */
    static CapturedBlock of(Map<Stage, ContactLaw> laws, Stage stage) {
        MaterialPair pair = Reference.lossy();
        Cycles cycles = Cycles.of(PairBench.MOST_COUPLES, pair);
        Busiest busiest = new Busiest();
        Map<Stage, ContactLaw> tapped = LawTap.at(stage, laws, busiest);
        try (PairBench bench = new PairBench(tapped, pair, cycles.couples(), PairBench.ONE_CELL)) {
            new Drive(bench, cycles.motions(), cycles.duration() / STEPS).run(0, STEPS, (step, drive) -> {});
        }
        CapturedBlock best = busiest.best;
        if (best == null) {
            throw new IllegalStateException("the engine never called the stage " + stage);
        }
        return best;
    }

    /** Opens a block over copies of everything. */
    void open(ContactBlock block) {
        System.arraycopy(columns, 0, block.columns(), 0, columns.length);
        block.open(rows, step, history.clone(), 0, historyColumns, false);
    }

    private static final class Busiest implements LawTap.Watch {
        private @Nullable CapturedBlock best;

        @Override
        public void before(ContactKernel kernel, ContactBlock block) {
            int touching = 0;
            for (int r = 0; r < block.rows(); r++) {
                touching += block.columns()[ContactBlock.at(Column.TOUCH) + r] > 0 ? 1 : 0;
            }
            if (best == null || touching > best.touching) {
                int from = block.historyAt(0, 0);
                int columns = (block.historyAt(8, 0) - from) / 8;
                best = new CapturedBlock(
                        kernel,
                        block.columns().clone(),
                        Arrays.copyOfRange(block.history(), from, from + columns * block.rows()),
                        columns,
                        block.rows(),
                        touching,
                        block.step());
            }
        }
    }
}
