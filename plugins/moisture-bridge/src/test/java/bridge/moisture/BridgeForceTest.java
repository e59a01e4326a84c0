// SPDX-License-Identifier: Apache-2.0
package bridge.moisture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static reedling.contact.ContactBlock.at;

import org.junit.jupiter.api.Test;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.material.Material;
import reedling.material.MaterialPair;

/** One row led by hand through the life of a bridge. */
class BridgeForceTest {

    private static final int TILE = 8;
    private static final double RADIUS = 1e-3; // R*, m
    private static final double VOLUME = 8e-12; // m3: breaks at 0.2 mm
    private static final double PULL = 4 * Math.PI * RADIUS * 0.072;
    private static final MaterialPair PAIR = pair();

    private final ContactBlock block = new ContactBlock();
    private final double[] history = new double[2 * TILE];

    private static MaterialPair pair() {
        Material grain = new Material("grain", 1280, 5e7, 0.3);
        return new MaterialPair(grain, grain, 1, 0, 0);
    }

    private static ContactKernel kernel(ContactKind kind) {
        return new LiquidBridgeLaw(0.072, 0, VOLUME, 0.125, 0).bind(PAIR, kind, 1);
    }

    /** Force, N, positive for a pull, at a gap that is reached slowly; other outputs are left in the block. */
    private double pullAt(ContactKernel kernel, double gap) {
        block.open(TILE, 1e-6, history, 0, 2, true);
        block.clear(0, Column.COUNT);
        for (int r = 0; r < TILE; r++) {
            set(Column.OVERLAP, r, -gap);
            set(Column.EFFECTIVE_RADIUS, r, RADIUS);
            set(Column.EFFECTIVE_MASS, r, 1e-6);
            set(Column.TOUCH, r, gap < kernel.reach(RADIUS) ? 1 : 0);
        }
        kernel.apply(block);
        assertThat(get(Column.ADHESIVE_LOAD)).isEqualTo(-get(Column.ELASTIC_FORCE));
        return -get(Column.ELASTIC_FORCE);
    }

    private void set(int column, int row, double value) {
        block.columns()[at(column) + row] = value;
    }

    private double get(int column) {
        return block.columns()[at(column) + TILE - 1];
    }

    @Test
    void bridgeFormsAtTheTouchAndBreaksAtItsLength() {
        ContactKernel kernel = kernel(ContactKind.GRAIN_GRAIN);
        assertThat(pullAt(kernel, 1e-4)).isZero();
        assertThat(pullAt(kernel, -1e-7)).isCloseTo(PULL, within(1e-12));
        assertThat(pullAt(kernel, 1.999e-4)).isPositive().isLessThan(0.1 * PULL);
        assertThat(get(Column.LOST_ENERGY)).isZero();
        double stored = get(Column.STORED_ENERGY);
        assertThat(pullAt(kernel, 2.001e-4)).isZero();
        assertThat(get(Column.LOST_ENERGY)).isCloseTo(stored, within(1e-3 * stored));
        assertThat(get(Column.STORED_ENERGY)).isZero();
        assertThat(pullAt(kernel, 1e-4)).isZero();
        assertThat(get(Column.LOST_ENERGY)).isZero();
        assertThat(pullAt(kernel, -1e-7)).isPositive();
    }

    /** A body that is flung out of reach within a step breaks its bridge too. */
    @Test
    void bridgeThatLeavesTheReachIsLost() {
        ContactKernel kernel = kernel(ContactKind.GRAIN_GRAIN);
        pullAt(kernel, -1e-7);
        assertThat(pullAt(kernel, 1e-3)).isZero();
        assertThat(get(Column.LOST_ENERGY)).isPositive();
        assertThat(history[TILE]).isZero();
    }

    /** An eighth of the liquid at a wall: half the length. None at wires: no reach, no pull. */
    @Test
    void wallsAndWiresHaveTheirOwnShareOfLiquid() {
        ContactKernel wall = kernel(ContactKind.GRAIN_WALL);
        pullAt(wall, -1e-7);
        assertThat(pullAt(wall, 0.999e-4)).isPositive();
        assertThat(pullAt(wall, 1.001e-4)).isZero();
        ContactKernel wire = kernel(ContactKind.GRAIN_WIRE);
        assertThat(wire.reach(RADIUS)).isZero();
        assertThat(pullAt(wire, -1e-7)).isZero();
    }
}
