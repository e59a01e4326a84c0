// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.util.SplittableRandom;
import java.util.function.DoubleSupplier;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

class RandomStreamTest {

    /** Oracle: the JDK's own generators of both names, filled with the same words; integers, so no tolerance. */
    @Tag("reference")
    @Test
    void bitsAreThoseOfXoshiroFilledBySplitMix() {
        SplittableRandom filler = new SplittableRandom(2026);
        ByteBuffer words = ByteBuffer.allocate(32);
        for (int k = 0; k < 4; k++) {
            words.putLong(filler.nextLong());
        }
        RandomGenerator oracle = RandomGeneratorFactory.of("Xoshiro256PlusPlus").create(words.array());
        RandomStream stream = new RandomStream(2026);
        for (int k = 0; k < 1000; k++) {
            assertThat(stream.bits()).isEqualTo(oracle.nextLong());
        }
    }

    @Test
    void uniformHasItsMoments() {
        double[] moments = moments(new RandomStream(1)::uniform);
        // five standard errors of 1e6 draws
        assertThat(moments[0]).isEqualTo(0.5, within(5 * 0.2887e-3));
        assertThat(moments[1]).isEqualTo(1 / 12.0, within(5 * 0.0745e-3));
    }

    @Test
    void normalHasItsMoments() {
        double[] moments = moments(new RandomStream(2)::normal);
        // five standard errors of 1e6 draws: sqrt(1, 2, 6, 24) / 1000
        assertThat(moments[0]).isEqualTo(0, within(5e-3));
        assertThat(moments[1]).isEqualTo(1, within(5 * 1.42e-3));
        assertThat(moments[2]).isEqualTo(0, within(5 * 2.45e-3));
        assertThat(moments[3]).isEqualTo(3, within(5 * 9.8e-3));
    }

    @Test
    void uniformStaysBetweenItsBounds() {
        RandomStream stream = new RandomStream(3);
        for (int k = 0; k < 10_000; k++) {
            assertThat(stream.uniform(-2, 5)).isBetween(-2.0, 5.0);
        }
    }

    @Test
    void splitDependsOnNameAndSeedButNotOnUse() {
        RandomStream parent = new RandomStream(7);
        long first = parent.split("feed").bits();
        parent.bits();
        assertThat(parent.split("feed").bits()).isEqualTo(first);
        assertThat(parent.split("feeds").bits()).isNotEqualTo(first);
        assertThat(new RandomStream(8).split("feed").bits()).isNotEqualTo(first);
        assertThat(parent.split("a").split("b").bits())
                .isNotEqualTo(parent.split("b").split("a").bits());
    }

    @Test
    void splitStreamsAreNotCorrelated() {
        RandomStream root = new RandomStream(0);
        RandomStream one = root.split("0");
        RandomStream two = root.split("1");
        double sum = 0;
        for (int k = 0; k < 100_000; k++) {
            sum += (one.uniform() - 0.5) * (two.uniform() - 0.5);
        }
        // five standard errors: (1/12) / sqrt(1e5) * 5
        assertThat(sum / 100_000).isEqualTo(0, within(1.32e-3));
    }

    @Test
    void restoredStreamContinuesAndSplitsAlike() throws IOException {
        RandomStream stream = new RandomStream(11);
        stream.normal();
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        stream.save(new DataOutputStream(bytes));
        RandomStream restored = new RandomStream(99);
        restored.restore(new DataInputStream(new ByteArrayInputStream(bytes.toByteArray())));
        assertThat(restored.split("x").bits()).isEqualTo(stream.split("x").bits());
        for (int k = 0; k < 10; k++) {
            assertThat(restored.bits()).isEqualTo(stream.bits());
        }
    }

    private static double[] moments(DoubleSupplier draw) {
        int count = 1_000_000;
        double[] values = new double[count];
        double mean = 0;
        for (int k = 0; k < count; k++) {
            values[k] = draw.getAsDouble();
            mean += values[k] / count;
        }
        double[] moments = {mean, 0, 0, 0};
        for (double value : values) {
            double d = value - mean;
            moments[1] += d * d / count;
            moments[2] += d * d * d / count;
            moments[3] += d * d * d * d / count;
        }
        return moments;
    }
}
