// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.Map;
import java.util.TreeMap;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;

/**
 * Looks at every number that a law writes into touching rows and notes those that are not finite. The engine may hide one:
 * a force that is no number can be clipped to zero.
 *
 * <p>Threads: one.
 */
final class WrittenNumbers implements LawTap.Watch {

    private static final double[] NONE = {};

    private final Map<String, Integer> faults = new TreeMap<>();
    private double[] columns = NONE;

    @Override
    public void before(ContactKernel kernel, ContactBlock block) {
        columns = block.columns().clone();
    }

    @Override
    public void after(ContactBlock block) {
        double[] now = block.columns();
        int historyColumns = (block.historyAt(8, 0) - block.historyAt(0, 0)) / 8;
        for (int r = 0; r < block.rows(); r++) {
            if (!(now[ContactBlock.at(Column.TOUCH) + r] > 0)) {
                continue;
            }
            for (int column = 0; column < Column.COUNT; column++) {
                int at = ContactBlock.at(column) + r;
                boolean written = Double.doubleToRawLongBits(now[at]) != Double.doubleToRawLongBits(columns[at]);
                if (written && !Double.isFinite(now[at])) {
                    faults.merge("column " + column, 1, Integer::sum);
                }
            }
            for (int column = 1; column < historyColumns; column++) {
                if (!Double.isFinite(block.history()[block.historyAtRow(r, column)])) {
                    faults.merge("history column " + column, 1, Integer::sum);
                }
            }
        }
    }

    /** How often something that is no finite number was written, by where. */
    Map<String, Integer> faults() {
        return faults;
    }
}
