// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

import static reedling.contact.ContactBlock.at;

/**
 * Calls a {@link PerContactLaw} for every touching row of a block.
 *
 * @param law the law
 * @param stage of the law; decides which outputs are cleared
 * @param historyColumn its first history column
 * @param historyColumns how many it has
 */
record PerContactKernel(PerContactLaw law, Stage stage, int historyColumn, int historyColumns)
        implements ContactKernel {

    private static final double NO_AREA = 1e-20; // m, keeps the engine's quotient of contact radii finite

    @Override
    public void apply(ContactBlock block) {
        clearOutputs(block);
        double[] c = block.columns();
        ContactRow row = block.row();
        for (int r = 0; r < block.rows(); r++) {
            if (c[at(Column.TOUCH) + r] > 0) {
                row.moveTo(r, historyColumn);
                law.contact(row);
            } else {
                forget(block, r);
            }
        }
    }

    private void clearOutputs(ContactBlock block) {
        switch (stage) {
            case NORMAL -> {
                block.clear(Column.ELASTIC_FORCE, 3);
                java.util.Arrays.fill(
                        block.columns(), at(Column.CONTACT_RADIUS), at(Column.CONTACT_RADIUS) + block.rows(), NO_AREA);
                if (block.energyDue()) {
                    block.clear(Column.STORED_ENERGY, 1);
                }
            }
            case TANGENTIAL -> block.clear(Column.FRICTION, 4);
            case ROLLING -> block.clear(Column.ROLLING_MOMENT, 3);
            default -> {} // later stages add to what stands there
        }
    }

    private void forget(ContactBlock block, int row) {
        double[] history = block.history();
        for (int k = 0; k < historyColumns; k++) {
            history[block.historyAtRow(row, historyColumn + k)] = 0;
        }
    }

    @Override
    public double duration(double speed, double radius, double mass) {
        return law.duration(speed, radius, mass);
    }

    @Override
    public double dampingRatio() {
        return law.dampingRatio();
    }

    @Override
    public double reach(double largestRadius) {
        return law.reach(largestRadius);
    }

    @Override
    public boolean pulls() {
        return law.pulls();
    }

    @Override
    public boolean dashpotMayPull() {
        return law.dashpotMayPull();
    }
}
