// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.joml.Vector3d;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.error.ReedlingException;
import reedling.particle.RandomStream;

class PackedBlockTest {

    private static final BoxRegion BOX = new BoxRegion(new Vector3d(-0.03, 0, 1), new Vector3d(0.03, 0.05, 1.07));
    private static final double SMALL = 4 * Math.PI / 3 * Math.pow(0.0025, 3);

    @ParameterizedTest
    @ValueSource(doubles = {0.05, 0.3, 0.45, 0.55, 0.58})
    void equalGrainsFillToTheFractionWithoutOverlap(double fraction) {
        GrainSeeds seeds =
                block(Mixes.single(), PackedBlock.Amount.fraction(fraction)).fill(new RandomStream(1));
        assertThat(seeds.size() * SMALL).isEqualTo(fraction * BOX.volume(), within(0.51 * SMALL));
        assertSoundPacking(seeds);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.3, 0.55, 0.58})
    void mixedGrainsFillToTheFractionWithoutOverlap(double fraction) {
        LotMix mix = Mixes.vetchAndPea();
        GrainSeeds seeds = block(mix, PackedBlock.Amount.fraction(fraction)).fill(new RandomStream(2));
        assertSoundPacking(seeds);
        double[] mass = new double[2];
        for (int k = 0; k < seeds.size(); k++) {
            mass[seeds.lot(k)] += mix.grainMass(seeds.lot(k), seeds.radius(k));
        }
        double heaviest = mix.grainMass(1, mix.largestRadius());
        assertThat(mass[0]).isEqualTo(0.3 * (mass[0] + mass[1]), within(heaviest));
    }

    @Test
    void countIsMetAndVelocityIsGiven() {
        GrainSeeds seeds =
                block(Mixes.vetchAndPea(), PackedBlock.Amount.grains(321)).fill(new RandomStream(3));
        assertThat(seeds.size()).isEqualTo(321);
        assertThat(seeds.velocityZ(320)).isEqualTo(-2);
        assertSoundPacking(seeds);
    }

    @Test
    void sameSeedGivesTheSameBitsAndAnotherSeedDoesNot() {
        PackedBlock block = block(Mixes.vetchAndPea(), PackedBlock.Amount.fraction(0.5));
        GrainSeeds one = block.fill(new RandomStream(3));
        RandomStream used = new RandomStream(3);
        used.bits();
        GrainSeeds two = block.fill(used);
        GrainSeeds other = block.fill(new RandomStream(4));
        assertThat(two.size()).isEqualTo(one.size());
        for (int k = 0; k < one.size(); k++) {
            assertThat(two.x(k)).isEqualTo(one.x(k));
            assertThat(two.y(k)).isEqualTo(one.y(k));
            assertThat(two.z(k)).isEqualTo(one.z(k));
        }
        assertThat(other.x(0)).isNotEqualTo(one.x(0));
    }

    @Test
    void grainsFillTheBoxEvenly() {
        GrainSeeds seeds =
                block(Mixes.single(), PackedBlock.Amount.fraction(0.55)).fill(new RandomStream(6));
        int[] halves = new int[3];
        for (int k = 0; k < seeds.size(); k++) {
            halves[0] += seeds.x(k) < 0 ? 1 : 0;
            halves[1] += seeds.y(k) < 0.025 ? 1 : 0;
            halves[2] += seeds.z(k) < 1.035 ? 1 : 0;
        }
        for (int half : halves) {
            assertThat(half).isBetween((int) (0.46 * seeds.size()), (int) (0.54 * seeds.size()));
        }
    }

    @Test
    void packingThatCannotSettleSaysWhatItReached() {
        // a single row of grains in a box hardly wider than they are: at most pi/6 of it can be filled
        BoxRegion slot = new BoxRegion(new Vector3d(), new Vector3d(0.0055, 0.0055, 0.05));
        PackedBlock block =
                new PackedBlock("slot", Mixes.single(), slot, PackedBlock.Amount.fraction(0.62), new Vector3d());
        assertThatThrownBy(() -> block.fill(new RandomStream(1)))
                .isInstanceOf(ReedlingException.class)
                .hasMessageContaining("slot")
                .hasMessageContaining("settled up to 0.");
    }

    @Test
    void impossibleAmountsAreRefused() {
        assertThatThrownBy(() -> PackedBlock.Amount.fraction(0.7)).hasMessageContaining("at most 0.64");
        assertThatThrownBy(() -> new PackedBlock.Amount(3, 0.2)).hasMessageContaining("either");
        PackedBlock tooMany = block(Mixes.single(), PackedBlock.Amount.grains(100_000_000));
        assertThatThrownBy(() -> tooMany.fill(new RandomStream(1))).hasMessageContaining("random close packing");
        PackedBlock tooFew = block(Mixes.single(), PackedBlock.Amount.fraction(1e-5));
        assertThatThrownBy(() -> tooFew.fill(new RandomStream(1))).hasMessageContaining("half of one grain");
        BoxRegion narrow = new BoxRegion(new Vector3d(), new Vector3d(1, 1, 0.004));
        assertThatThrownBy(() ->
                        new PackedBlock("bed", Mixes.single(), narrow, PackedBlock.Amount.grains(1), new Vector3d()))
                .hasMessageContaining("narrowest");
    }

    private static PackedBlock block(LotMix mix, PackedBlock.Amount amount) {
        return new PackedBlock("bed", mix, BOX, amount, new Vector3d(0, 0, -2));
    }

    /** Every pair, by brute force: no grid of the code under test. */
    private static void assertSoundPacking(GrainSeeds seeds) {
        double worst = 0;
        double outside = 0;
        for (int i = 0; i < seeds.size(); i++) {
            double r = seeds.radius(i);
            outside = Math.max(outside, Math.max(-0.03 - seeds.x(i) + r, seeds.x(i) + r - 0.03));
            outside = Math.max(outside, Math.max(-seeds.y(i) + r, seeds.y(i) + r - 0.05));
            outside = Math.max(outside, Math.max(1 - seeds.z(i) + r, seeds.z(i) + r - 1.07));
            for (int j = 0; j < i; j++) {
                double dx = seeds.x(i) - seeds.x(j);
                double dy = seeds.y(i) - seeds.y(j);
                double dz = seeds.z(i) - seeds.z(j);
                double overlap = r + seeds.radius(j) - Math.sqrt(dx * dx + dy * dy + dz * dz);
                worst = Math.max(worst, overlap / Math.min(r, seeds.radius(j)));
            }
        }
        assertThat(outside).isLessThan(1e-12);
        assertThat(worst).isLessThan(1e-3);
    }
}
