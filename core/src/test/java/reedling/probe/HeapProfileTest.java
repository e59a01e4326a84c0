// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import reedling.particle.GrainStore;
import reedling.particle.RandomStream;

class HeapProfileTest {

    private static final double RADIUS = 0.002;
    private static final double FOOT = 0.09;

    private static HeapPlan plan(double x, double y, double floor) {
        return new HeapPlan("heap", x, y, floor, 0.004, 0.2, 0.8);
    }

    /** Grains scattered so densely under a cone that the highest of each cell lies on it; tops touch the cone. */
    private static GrainStore cone(double degrees, double x, double y, double floor) {
        GrainStore grains = new GrainStore();
        RandomStream random = new RandomStream(4);
        double fall = Math.tan(Math.toRadians(degrees));
        for (int k = 0; k < 200_000; k++) {
            double u = random.uniform(-FOOT, FOOT);
            double v = random.uniform(-FOOT, FOOT);
            double top = fall * (FOOT - Math.hypot(u, v));
            if (top > 2 * RADIUS) {
                grains.add(x + u, y + v, floor + top - RADIUS, RADIUS, 1000, 0, 0);
            }
        }
        return grains;
    }

    /** The highest grain of a cell of 4 mm lies half a cell further in than its middle, everywhere alike. */
    @ParameterizedTest
    @ValueSource(doubles = {15, 24, 38})
    void coneGivesItsAngleBack(double degrees) {
        HeapProfile profile = new HeapProfile(plan(0, 0, 0), cone(degrees, 0, 0, 0));
        assertThat(profile.angle()).isEqualTo(degrees, within(0.3));
        assertThat(profile.deviation()).isLessThan(2e-4);
        double foot = FOOT - 2 * RADIUS / Math.tan(Math.toRadians(degrees));
        assertThat(profile.footRadius()).isEqualTo(foot, within(0.004));
        assertThat(profile.flankRings()).isBetween(9, 14);
    }

    @Test
    void placeOfThePlateDoesNotMatter() {
        HeapProfile here = new HeapProfile(plan(0, 0, 0), cone(24, 0, 0, 0));
        HeapProfile there = new HeapProfile(plan(0.3, -0.2, 0.7), cone(24, 0.3, -0.2, 0.7));
        assertThat(there.angle()).isEqualTo(here.angle(), within(0.05));
        assertThat(there.topHeight()).isEqualTo(here.topHeight(), within(1e-4));
    }

    /** A grain near the toe moves the foot by a part of a ring, nothing more. */
    @Test
    void grainsThatRolledAwayDoNotCount() {
        GrainStore grains = cone(24, 0, 0, 0);
        double angle = new HeapProfile(plan(0, 0, 0), grains).angle();
        for (int k = 0; k < 50; k++) {
            grains.add(0.12 + 0.004 * k, 0.01 * k, RADIUS, RADIUS, 1000, 0, 0);
        }
        assertThat(new HeapProfile(plan(0, 0, 0), grains).angle()).isEqualTo(angle, within(0.02));
    }

    @Test
    void aSingleLayerHasNoFlank() {
        GrainStore grains = new GrainStore();
        for (int k = 0; k < 400; k++) {
            grains.add(0.008 * (k % 20), 0.008 * (k / 20), RADIUS, RADIUS, 1000, 0, 0);
        }
        assertThat(new HeapProfile(plan(0.08, 0.08, 0), grains).angle()).isNaN();
        assertThat(new HeapProfile(plan(0, 0, 0), new GrainStore()).angle()).isNaN();
    }

    @Test
    void readingsKeepTheirNames() {
        BulkProbe probe = plan(0, 0, 0).open();
        assertThat(probe.readings(cone(24, 0, 0, 0)))
                .extracting(Reading::key)
                .containsExactly(
                        "angle_of_repose_deg",
                        "foot_radius_m",
                        "top_height_m",
                        "flank_deviation_m",
                        "flank_rings",
                        "rms_speed_m_per_s");
        assertThat(probe.closingTable(cone(24, 0, 0, 0))).hasSizeBetween(20, 40);
    }
}
