// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import java.util.Arrays;
import java.util.Comparator;
import java.util.stream.IntStream;
import reedling.particle.RandomStream;

/**
 * The grains of a block before they have a place, largest first. Threads: confined to its owner.
 *
 * @param radius m
 * @param lot number in the mix
 */
record DrawnGrains(double[] radius, int[] lot) {

    static DrawnGrains draw(PackedBlock block, RandomStream sizes) {
        LotMix mix = block.mix();
        double wanted = block.amount().solidFraction() * block.box().volume();
        int most = block.amount().count() > 0 ? block.amount().count() : Integer.MAX_VALUE;
        double[] radius = new double[64];
        int[] lot = new int[64];
        double[] drawnMass = new double[mix.size()];
        double volume = 0;
        int count = 0;
        // more than the box holds is refused later; no use in drawing it all
        while (count < most && volume <= block.box().volume()) {
            int number = mix.neediest(drawnMass);
            double r = 0.5 * mix.lot(number).sizes().diameter(sizes);
            double sphere = 4 * Math.PI / 3 * r * r * r;
            // the last grain is taken if that ends nearer to the volume wanted
            if (most == Integer.MAX_VALUE && volume + 0.5 * sphere > wanted) {
                break;
            }
            if (count == radius.length) {
                radius = Arrays.copyOf(radius, 2 * count);
                lot = Arrays.copyOf(lot, 2 * count);
            }
            radius[count] = r;
            lot[count++] = number;
            volume += sphere;
            drawnMass[number] += mix.grainMass(number, r);
        }
        return largestFirst(radius, lot, count);
    }

    private static DrawnGrains largestFirst(double[] radius, int[] lot, int count) {
        int[] order = IntStream.range(0, count)
                .boxed()
                .sorted(Comparator.comparingDouble((Integer k) -> -radius[k]))
                .mapToInt(Integer::intValue)
                .toArray();
        return new DrawnGrains(
                IntStream.of(order).mapToDouble(k -> radius[k]).toArray(),
                IntStream.of(order).map(k -> lot[k]).toArray());
    }
}
