// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Tag;
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

    /**
     * T = 1/(1 + (d/d50)^-8), d50 = 2 mm: d25 and d75 are d50 3^(-1/8) and d50 3^(1/8). Definitions of K. F. Tromp 1937;
     * numbers to six digits, and straight lines between classes of ratio 1.0003 are as near.
     */
    @Tag("reference")
    @Test
    void sharpnessOfALogisticCurveIsItsClosedForm() {
        int classes = 4000;
        double[] size = new double[classes];
        long[] passed = new long[classes];
        long[] over = new long[classes];
        for (int k = 0; k < classes; k++) {
            size[k] = 1.2e-3 * Math.pow(1.0003, k);
            over[k] = Math.round(1e12 / (1 + Math.pow(size[k] / 2e-3, -8)));
            passed[k] = 1_000_000_000_000L - over[k];
        }
        Partition partition = new Partition(size, passed, over);
        assertThat(partition.cutSize()).isCloseTo(2e-3, within(2e-9));
        assertThat(partition.sizeAt(0.25)).isCloseTo(1.74337e-3, within(5e-9));
        assertThat(partition.sizeAt(0.75)).isCloseTo(2.29441e-3, within(5e-9));
        assertThat(partition.probableError()).isCloseTo(0.275517e-3, within(1e-9));
        assertThat(partition.probableError() / partition.cutSize()).isCloseTo(0.137759, within(1e-6));
        assertThat(partition.sharpness()).isCloseTo(0.759836, within(1e-6));
    }

    /** A measured table with straight lines between its sizes: arithmetic, to the digits given. */
    @Tag("reference")
    @Test
    void partitionTableIsReadBetweenItsSizes() {
        double[] size = {1e-3, 1.4e-3, 1.8e-3, 2.2e-3, 2.6e-3, 3e-3};
        long[] over = {2, 10, 38, 66, 92, 100};
        long[] passed = {98, 90, 62, 34, 8, 0};
        Partition partition = new Partition(size, passed, over);
        assertThat(partition.sizeAt(0.25)).isCloseTo(1.61429e-3, within(5e-9));
        assertThat(partition.cutSize()).isCloseTo(1.97143e-3, within(5e-9));
        assertThat(partition.sizeAt(0.75)).isCloseTo(2.33846e-3, within(5e-9));
        assertThat(partition.probableError()).isCloseTo(0.362088e-3, within(1e-9));
    }

    /** Feed of 20, 30, 30, 20 kg from fine to coarse, of which 5, 30, 90, 100 % go over; undersize: the first two. */
    @Tag("reference")
    @Test
    void separationIsTheMassBalance() {
        Separation separation = new Separation(20 * 0.95 + 30 * 0.7, 30 * 0.1, 20 * 0.05 + 30 * 0.3, 30 * 0.9 + 20);
        assertThat(separation.undersizeOver() + separation.productOver()).isCloseTo(57, within(1e-9));
        assertThat(separation.undersizeRecovery()).isCloseTo(0.8, within(1e-6));
        assertThat(separation.productLoss()).isCloseTo(0.06, within(1e-6));
        assertThat(separation.undersizeInOver()).isCloseTo(0.175439, within(1e-6));
        assertThat(separation.productInPassed()).isCloseTo(0.0697674, within(1e-6));
    }
}
