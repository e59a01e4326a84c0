// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import reedling.particle.Lot;
import reedling.particle.UniformSize;

class SizePassageTest {

    private final SizePassage sizes = new SizePassage(
            new MeasuredWindow(1, 2, 4),
            List.of(new Lot("a", 0, new UniformSize(2e-3, 4e-3)), new Lot("b", 0, new UniformSize(3e-3, 8e-3))),
            3);

    @Test
    void grainsCountInTheBatchLotExitAndClassTheyBelongTo() {
        sizes.left(1, 0, 2.05e-3, 1e-3, 1.3);
        sizes.left(1, 1, 7.95e-3, 2e-3, 1.3);
        sizes.left(2, 1, 7.95e-3, 4e-3, 1.99);
        sizes.fed(1, 8e-3, 2.0);
        assertThat(sizes.leftMass(1, 1, 0)).isEqualTo(1e-3);
        assertThat(sizes.leftMass(1, 1, 1)).isEqualTo(2e-3);
        assertThat(sizes.leftMass(3, 2, 1)).isEqualTo(4e-3);
        assertThat(sizes.fedMass(3, 1)).isEqualTo(8e-3);
        assertThat(sizes.count(1, 0, 0, 4)).isEqualTo(1);
        assertThat(sizes.count(1, SizePassage.CLASSES - 1, 1, 2)).isEqualTo(1);
        assertThat(sizes.count(1, SizePassage.CLASSES - 1, 2, 4)).isZero();
        assertThat(sizes.diameter(0)).isBetween(2.0e-3, 2.1e-3);
    }

    @Test
    void whatLeavesOutsideTheWindowDoesNotCount() {
        sizes.left(0, 0, 3e-3, 1e-3, 0.999);
        sizes.left(0, 0, 3e-3, 1e-3, 2.001);
        sizes.fed(0, 1e-3, 0.5);
        for (int batch = 0; batch < 4; batch++) {
            assertThat(sizes.leftMass(batch, 0, 0)).isZero();
            assertThat(sizes.fedMass(batch, 0)).isZero();
        }
    }

    @Test
    void batchesAreFinishedOneAfterTheOther() {
        MeasuredWindow window = sizes.window();
        assertThat(window.finished(0.5)).isZero();
        assertThat(window.finished(1.2)).isZero();
        assertThat(window.finished(1.51)).isEqualTo(2);
        assertThat(window.finished(7)).isEqualTo(4);
        assertThat(window.batchOf(2)).isEqualTo(3);
        assertThat(window.batchOf(2.1)).isEqualTo(MeasuredWindow.OUTSIDE);
    }
}
