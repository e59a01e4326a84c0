// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import reedling.particle.Lot;
import reedling.particle.RandomStream;
import reedling.particle.UniformSize;

class PartitionTest {

    private static final double[] SIZES = {4e-3, 5e-3, 6e-3, 7e-3};

    @Test
    void cutSizeLiesWhereARisingCurveCrossesOneHalf() {
        Partition partition = new Partition(SIZES, new long[] {10, 8, 2, 0}, new long[] {0, 2, 8, 10});
        assertThat(partition.partOver(1)).isEqualTo(0.2);
        assertThat(partition.cutSize()).isCloseTo(5.5e-3, within(1e-12));
    }

    /** 0.4 and 0.3 fall: pooled with 10 and 30 grains to 0.325 at 4.75 mm; then half-way to 0.825 at 6 mm is 35 %. */
    @Test
    void fallingNeighboursArePooledByTheirGrains() {
        Partition partition = new Partition(SIZES, new long[] {6, 21, 7, 0}, new long[] {4, 9, 33, 10});
        assertThat(partition.cutSize()).isCloseTo(4.75e-3 + 0.35 * 1.25e-3, within(1e-12));
    }

    @Test
    void thereIsNoCutSizeWhereEverythingPassesOrNothingCame() {
        assertThat(new Partition(SIZES, new long[] {5, 5, 5, 5}, new long[4]).cutSize())
                .isNaN();
        assertThat(new Partition(SIZES, new long[4], new long[4]).cutSize()).isNaN();
    }

    /**
     * Grains go over with the chance p of a logistic curve of scale 0.2 mm. Near its middle a class of 0.05 mm holds 1000
     * grains, so one cut size scatters by sqrt(p (1 - p) / 1000) / slope = 0.016 / (1.25 / mm) = 0.013 mm; three times
     * that over sqrt(10) is allowed for the mean of ten.
     */
    @Test
    void cutSizeOfADrawnLogisticCurveComesBack() {
        double sum = 0;
        for (int seed = 1; seed <= 10; seed++) {
            sum += drawnCutSize(new RandomStream(seed));
        }
        assertThat(sum / 10).isCloseTo(5.4e-3, within(0.0125e-3));
    }

    private static double drawnCutSize(RandomStream random) {
        MeasuredWindow window = new MeasuredWindow(0, 1, 5);
        SizePassage sizes = new SizePassage(window, List.of(new Lot("all", 0, new UniformSize(4e-3, 7e-3))), 3);
        for (int k = 0; k < 60_000; k++) {
            double diameter = random.uniform(4e-3, 7e-3);
            boolean over = random.uniform() < 1 / (1 + Math.exp(-(diameter - 5.4e-3) / 0.2e-3));
            sizes.left(over ? 1 : 0, 0, diameter, 1e-4, random.uniform());
        }
        return Partition.of(sizes, 0, 1, 0, 5).cutSize();
    }
}
