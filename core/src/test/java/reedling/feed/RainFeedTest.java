// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.joml.Vector3d;
import org.junit.jupiter.api.Test;
import reedling.error.ReedlingException;
import reedling.particle.RandomStream;

class RainFeedTest {

    private static final double FOREVER = Double.POSITIVE_INFINITY;
    private static final Region BOX = new BoxRegion(new Vector3d(0, 0, 1), new Vector3d(0.1, 0.05, 1.02));
    private static final Launch LAUNCH = new Launch(new Vector3d(0, 0, -1), 0.1, 20);
    private static final Vacancy ALWAYS = (x, y, z, r) -> true;

    private final GrainSeeds seeds = new GrainSeeds();

    @Test
    void massRateHoldsAtEveryMomentToWithinOneGrain() {
        RainFeed feed = feed(Mixes.vetchAndPea(), new FeedRate(FeedRate.Measure.MASS, 0.12, FOREVER, 0.5, FOREVER));
        double heaviest = Mixes.PEA_DENSITY * Math.PI / 6 * Math.pow(0.0076, 3);
        for (int step = 0; step <= 3000; step++) {
            double time = step * 1e-3;
            release(feed, time);
            double owed = 0.12 * Math.max(0, time - 0.5);
            assertThat(feed.fedMass()).isBetween(owed - heaviest, owed + 1e-12);
        }
        assertThat(feed.fedCount()).isGreaterThan(1500);
        assertThat(feed.finished()).isFalse();
    }

    @Test
    void lotsKeepTheirSharesByMassAndTheirMeanGrain() {
        LotMix mix = Mixes.vetchAndPea();
        RainFeed feed = feed(mix, new FeedRate(FeedRate.Measure.MASS, 1, FOREVER, 0, FOREVER));
        double[] mass = new double[2];
        double[] cubes = new double[2];
        int[] count = new int[2];
        for (int step = 0; step <= 1000; step++) {
            release(feed, step * 1e-3);
            for (int k = 0; k < seeds.size(); k++) {
                int lot = seeds.lot(k);
                mass[lot] += mix.grainMass(lot, seeds.radius(k));
                cubes[lot] += Math.pow(2 * seeds.radius(k), 3);
                count[lot]++;
                assertThat(seeds.material(k)).isEqualTo(lot);
            }
        }
        double total = mass[0] + mass[1];
        double grain = Mixes.PEA_DENSITY * Math.PI / 6 * Math.pow(0.0076, 3);
        assertThat(mass[0]).isEqualTo(0.3 * total, within(grain));
        for (int lot = 0; lot < 2; lot++) {
            // five standard errors: the cube scatters by about 3 * 0.08 of its mean
            assertThat(cubes[lot] / count[lot])
                    .isEqualTo(
                            mix.lot(lot).sizes().meanCube(),
                            within(5 * 0.26 * mix.lot(lot).sizes().meanCube() / Math.sqrt(count[lot])));
        }
        // number and mass agree with the mean grain of the mix, same scatter
        int all = count[0] + count[1];
        assertThat(total / all).isEqualTo(mix.meanGrainMass(), within(5 * 0.26 * mix.meanGrainMass() / Math.sqrt(all)));
    }

    @Test
    void countRateFeedsItsNumberBetweenStartAndStop() {
        RainFeed feed = feed(Mixes.single(), new FeedRate(FeedRate.Measure.COUNT, 100, FOREVER, 1, 3));
        assertThat(release(feed, 0.99)).isZero();
        assertThat(releaseAll(feed, 1.505)).isEqualTo(50);
        assertThat(feed.finished()).isFalse();
        assertThat(releaseAll(feed, 10)).isEqualTo(150);
        assertThat(feed.fedCount()).isEqualTo(200);
        assertThat(feed.finished()).isTrue();
    }

    @Test
    void totalEndsTheFeed() {
        RainFeed feed = feed(Mixes.vetchAndPea(), new FeedRate(FeedRate.Measure.MASS, 1, 0.02, 0, FOREVER));
        for (int step = 0; step < 200; step++) {
            release(feed, step * 1e-2);
        }
        assertThat(feed.fedMass()).isBetween(0.02 - 3.1e-4, 0.02);
        assertThat(feed.finished()).isTrue();
        RainFeed counted = feed(Mixes.single(), new FeedRate(FeedRate.Measure.COUNT, 1000, 17, 0, FOREVER));
        assertThat(releaseAll(counted, 5)).isEqualTo(17);
        assertThat(counted.finished()).isTrue();
    }

    @Test
    void grainsWithoutRoomWaitAndEnterLater() {
        RainFeed feed = feed(Mixes.single(), new FeedRate(FeedRate.Measure.COUNT, 1000, FOREVER, 0, 0.0105));
        seeds.clear();
        assertThat(feed.release(1, (x, y, z, r) -> false, seeds)).isZero();
        assertThat(feed.backlog()).isEqualTo(10);
        assertThat(feed.fedCount()).isZero();
        assertThat(feed.finished()).isFalse();
        assertThat(release(feed, 1.1)).isEqualTo(10);
        assertThat(feed.backlog()).isZero();
        assertThat(feed.finished()).isTrue();
    }

    @Test
    void crowdingDoesNotChangeTheSequenceOfSizes() {
        FeedRate rate = new FeedRate(FeedRate.Measure.MASS, 0.5, FOREVER, 0, FOREVER);
        RainFeed open = feed(Mixes.vetchAndPea(), rate);
        RainFeed crowded = feed(Mixes.vetchAndPea(), rate);
        List<Double> free = new ArrayList<>();
        List<Double> hindered = new ArrayList<>();
        for (int step = 1; step <= 100; step++) {
            release(open, step * 1e-3);
            collectRadii(free);
            seeds.clear();
            boolean blocked = step % 3 != 0;
            crowded.release(step * 1e-3, (x, y, z, r) -> !blocked && x > 0.04, seeds);
            collectRadii(hindered);
        }
        assertThat(hindered).hasSizeGreaterThan(50).isEqualTo(free.subList(0, hindered.size()));
    }

    @Test
    void grainsOfOneCallDoNotOverlapAndLieInTheRegion() {
        RainFeed feed = feed(Mixes.vetchAndPea(), new FeedRate(FeedRate.Measure.COUNT, 1e6, FOREVER, 0, 1e-4));
        int placed = release(feed, 1);
        assertThat(placed).isGreaterThan(30);
        for (int i = 0; i < placed; i++) {
            double r = seeds.radius(i);
            assertThat(seeds.x(i)).isBetween(r - 1e-15, 0.1 - r + 1e-15);
            assertThat(seeds.y(i)).isBetween(r - 1e-15, 0.05 - r + 1e-15);
            assertThat(seeds.z(i)).isBetween(1 + r - 1e-15, 1.02 - r + 1e-15);
            assertThat(seeds.velocityZ(i)).isBetween(-1.1, -0.9);
            assertThat(Math.abs(seeds.velocityX(i))).isBetween(0.0, 0.1);
            for (int j = 0; j < i; j++) {
                assertThat(distance(i, j)).isGreaterThanOrEqualTo(r + seeds.radius(j));
            }
        }
    }

    @Test
    void discSpreadsGrainsEvenlyOverItsArea() {
        Vector3d centre = new Vector3d(1, 2, 3);
        Vector3d axis = new Vector3d(1, 2, -2).div(3);
        Region disc = new DiscRegion(centre, axis, 0.1);
        RandomStream random = new RandomStream(4);
        double[] p = new double[3];
        int inner = 0;
        for (int k = 0; k < 10_000; k++) {
            disc.draw(random, 0.02, p);
            Vector3d offset = new Vector3d(p[0], p[1], p[2]).sub(centre);
            assertThat(offset.dot(axis)).isEqualTo(0, within(1e-15));
            assertThat(offset.length()).isLessThanOrEqualTo(0.08 + 1e-15);
            inner += offset.length() < 0.04 ? 1 : 0;
        }
        // a quarter of the area; five standard errors sqrt(1e4 * 3/16)
        assertThat(inner).isBetween(2500 - 217, 2500 + 217);
    }

    @Test
    void grainWiderThanTheRegionSitsInItsMiddle() {
        double[] p = new double[3];
        BOX.draw(new RandomStream(1), 0.011, p);
        assertThat(p[2]).isEqualTo(1.01, within(1e-15));
    }

    @Test
    void restoredFeedContinuesWithTheSameGrains() throws IOException {
        FeedRate rate = new FeedRate(FeedRate.Measure.MASS, 0.5, FOREVER, 0, FOREVER);
        RainFeed feed = feed(Mixes.vetchAndPea(), rate);
        release(feed, 0.1);
        seeds.clear();
        feed.release(0.12, (x, y, z, r) -> false, seeds);
        assertThat(feed.backlog()).isPositive();
        byte[] saved = save(feed);
        RainFeed resumed = new RainFeed(feed.plan(), new RandomStream(1234));
        resumed.restore(new DataInputStream(new ByteArrayInputStream(saved)));
        assertThat(resumed.backlog()).isEqualTo(feed.backlog());
        for (double time = 0.13; time < 0.3; time += 0.01) {
            int expected = release(feed, time);
            GrainSeeds again = new GrainSeeds();
            assertThat(resumed.release(time, ALWAYS, again)).isEqualTo(expected);
            for (int k = 0; k < expected; k++) {
                assertThat(again.x(k)).isEqualTo(seeds.x(k));
                assertThat(again.radius(k)).isEqualTo(seeds.radius(k));
                assertThat(again.velocityY(k)).isEqualTo(seeds.velocityY(k));
                assertThat(again.lot(k)).isEqualTo(seeds.lot(k));
            }
        }
        assertThat(save(resumed)).isEqualTo(save(feed));
    }

    @Test
    void stateOfAnotherMixIsRefused() throws IOException {
        FeedRate rate = new FeedRate(FeedRate.Measure.MASS, 0.5, FOREVER, 0, FOREVER);
        byte[] saved = save(feed(Mixes.vetchAndPea(), rate));
        RainFeed other = feed(Mixes.single(), rate);
        assertThatThrownBy(() -> other.restore(new DataInputStream(new ByteArrayInputStream(saved))))
                .isInstanceOf(ReedlingException.class)
                .hasMessageContaining("number of lots saved");
    }

    @Test
    void wrongPlansNameEveryMistake() {
        assertThatThrownBy(() -> new FeedRate(FeedRate.Measure.MASS, -1, 0, 2, 1))
                .isInstanceOfSatisfying(
                        ReedlingException.class, e -> assertThat(e.findings()).hasSize(3));
        assertThatThrownBy(() -> new Launch(new Vector3d(), -1, 0))
                .isInstanceOfSatisfying(
                        ReedlingException.class, e -> assertThat(e.findings()).hasSize(2));
    }

    private static RainFeed feed(LotMix mix, FeedRate rate) {
        return new RainFeed(new Rain("chute", mix, BOX, rate, LAUNCH), new RandomStream(42));
    }

    /** One call with nothing in the way but the grains of the call itself; {@code seeds} then holds those. */
    private int release(RainFeed feed, double time) {
        seeds.clear();
        return feed.release(time, ALWAYS, seeds);
    }

    /** Calls until no grain waits, as if each left the region at once. */
    private int releaseAll(RainFeed feed, double time) {
        int added = release(feed, time);
        while (feed.backlog() > 0) {
            added += release(feed, time);
        }
        return added;
    }

    private void collectRadii(List<Double> radii) {
        for (int k = 0; k < seeds.size(); k++) {
            radii.add(seeds.radius(k));
        }
    }

    private double distance(int i, int j) {
        double dx = seeds.x(i) - seeds.x(j);
        double dy = seeds.y(i) - seeds.y(j);
        double dz = seeds.z(i) - seeds.z(j);
        return Math.sqrt(dx * dx + dy * dy + dz * dz);
    }

    private static byte[] save(RainFeed feed) throws IOException {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        feed.save(new DataOutputStream(bytes));
        return bytes.toByteArray();
    }
}
