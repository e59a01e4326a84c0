// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.util.EnumSet;
import org.joml.Vector3d;
import org.junit.jupiter.api.Test;

class WallPoseTest {

    private static final Vector3d Z = new Vector3d(0, 0, 1);
    private final double[] out = new double[3];
    private final double[] other = new double[3];

    @Test
    void tiltedPlaneGivesDistanceAndNormalInTheWorld() {
        Vector3d up = new Vector3d(-0.6, 0, 0.8);
        Wall floor = new Wall("floor", 0, new HalfSpace(), Placement.facing(new Vector3d(1, 2, 3), up), new Still());
        WallPose pose = new WallPose(floor, 0);
        double gap = pose.gap(0, 1 - 0.06 + 0.8, 2 + 5, 3 + 0.08 + 0.6, out);
        assertThat(gap).isEqualTo(0.1, within(1e-15));
        assertThat(out).containsExactly(new double[] {0.6, 0, -0.8}, within(1e-15));
    }

    @Test
    void cylinderStandsBetweenItsTwoEnds() {
        Placement between = Placement.along(new Vector3d(0, -1, 0), new Vector3d(0, 3, 0));
        WallPose pose = new WallPose(new Wall("shaft", 0, new CylinderOutside(0.1, 4), between, new Still()), 0);
        assertThat(pose.gap(0, 0.3, 2.9, 0.4, out)).isEqualTo(0.4, within(1e-15));
        assertThat(out).containsExactly(new double[] {-0.6, 0, -0.8}, within(1e-14));
        assertThat(pose.gap(2, 0, 3.05, 0, out)).isEqualTo(0.05, within(1e-15));
    }

    @Test
    void oscillatingWallMovesByItsVelocityTimesTheStep() {
        Motion motion = Oscillating.harmonic(new Stroke(Z, 0.0025, 0.4), 20, Timing.from(0, 0.05));
        WallPose pose = new WallPose(new Wall("deck", 0, new HalfSpace(), Placement.world(), motion), 0.02);
        double before = pose.gap(0, 0, 0, 0.5, out);
        pose.advance(0.02 + 1e-5, 1e-5);
        double after = pose.gap(0, 0, 0, 0.5, out);
        pose.velocityAt(7, 8, 9, out);
        assertThat(before - after).isEqualTo(out[2] * 1e-5, within(1e-15));
        assertThat(Math.abs(out[2])).isGreaterThan(1e-3);
    }

    @Test
    void turningWallCarriesItsPointsWithSpinTimesLever() {
        Vector3d axis = new Vector3d(2, -1, 2).div(3);
        Vector3d pivot = new Vector3d(0.5, 0.1, -0.2);
        Turning motion = new Turning(pivot, axis, -3, Timing.always());
        Placement rest = Placement.axes(new Vector3d(1, 0, 0), new Vector3d(1, 0, 0), Z);
        WallPose pose = new WallPose(new Wall("paddle", 0, new Rectangle(1, 1), rest, motion), 1.2);
        pose.toWorld(0.2, 0.1, 0.3, out);
        double step = 1e-4;
        pose.advance(1.2 + step, step);
        pose.toWorld(0.2, 0.1, 0.3, other);
        Vector3d spin = new Vector3d(pose.spinX(), pose.spinY(), pose.spinZ());
        assertThat(spin.distance(new Vector3d(axis).mul(-3))).isLessThan(1e-10);
        double[] velocity = new double[3];
        pose.velocityAt(0.5 * (out[0] + other[0]), 0.5 * (out[1] + other[1]), 0.5 * (out[2] + other[2]), velocity);
        for (int c = 0; c < 3; c++) {
            // a chord against an arc: relative difference angle^2 / 24 of the step
            assertThat((other[c] - out[c]) / step).isEqualTo(velocity[c], within(1e-7));
        }
        double lever = new Vector3d(other).sub(pivot).cross(axis).length();
        pose.velocityAt(other[0], other[1], other[2], velocity);
        assertThat(new Vector3d(velocity).length()).isEqualTo(3 * lever, within(1e-9));
    }

    @Test
    void spinIsRightAcrossTheChangeOfSignOfTheQuaternion() {
        Turning motion = new Turning(new Vector3d(), Z, 2, Timing.always());
        WallPose pose = new WallPose(new Wall("drum", 0, new CylinderInside(1, 1), Placement.world(), motion), 0);
        for (int k = 1; k < 100; k++) {
            pose.advance(k * 0.1, 0.1);
            assertThat(pose.spinZ()).isEqualTo(2, within(1e-12));
        }
    }

    @Test
    void restoredPoseHasTheSameBits() {
        Motion motion = new Turning(new Vector3d(0.1, 0.2, 0.3), new Vector3d(1, 2, 3), 7, Timing.from(0.01, 0.3));
        Wall wall = new Wall("drum", 0, new CylinderInside(1, 1), Placement.at(new Vector3d(0.3, 0, 0)), motion);
        WallPose first = new WallPose(wall, 0);
        first.advance(0.17, 0.17);
        first.advance(0.18, 0.01);
        WallPose resumed = new WallPose(wall, 0);
        resumed.restore(first.timeBefore(), first.time(), first.step());
        assertThat(resumed.gap(0, 0.1, 0.2, 0.3, other)).isEqualTo(first.gap(0, 0.1, 0.2, 0.3, out));
        assertThat(other).containsExactly(out);
        first.velocityAt(0.4, 0.5, 0.6, out);
        resumed.velocityAt(0.4, 0.5, 0.6, other);
        assertThat(other).containsExactly(out);
        assertThat(out[0]).isNotZero();
    }

    @Test
    void stepsAndQueriesAllocateNothing() {
        Motion[] motions = {
            new Still(),
            Oscillating.harmonic(new Stroke(Z, 0.0025, 0.4), 20, Timing.from(0, 0.01)),
            new Turning(new Vector3d(), Z, 30, Timing.from(0, 0.01))
        };
        Surface[] surfaces = {
            new HalfSpace(),
            new Rectangle(1, 1),
            new BoxInside(1, 1, 1, EnumSet.of(BoxInside.Face.HIGH_Z)),
            new BoxOutside(1, 1, 1),
            new CylinderInside(1, 1),
            new CylinderOutside(1, 1)
        };
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        for (int k = 0; k < surfaces.length; k++) {
            Motion motion = motions[k % motions.length];
            WallPose pose = new WallPose(new Wall("wall", 0, surfaces[k], Placement.world(), motion), 0);
            query(pose, 10);
            long few = allocatedBy(threads, pose, 10);
            long many = allocatedBy(threads, pose, 10_000);
            assertThat(many - few).as("bytes of 9990 rounds on %s", surfaces[k]).isLessThan(9990);
        }
    }

    private long allocatedBy(ThreadMXBean threads, WallPose pose, int rounds) {
        long before = threads.getCurrentThreadAllocatedBytes();
        query(pose, rounds);
        return threads.getCurrentThreadAllocatedBytes() - before;
    }

    private void query(WallPose pose, int rounds) {
        for (int k = 0; k < rounds; k++) {
            pose.advance(k * 1e-5, 1e-5);
            for (int facet = 0; facet < pose.wall().surface().facets(); facet++) {
                pose.gap(facet, 0.3, k * 1e-4, 0.6, out);
            }
            pose.velocityAt(0.3, 0.4, 0.5, out);
        }
    }

    @Test
    void newWallHasNoVelocity() {
        Motion motion = new Gliding(new Vector3d(1, 1, 1), Timing.always());
        WallPose pose = new WallPose(new Wall("belt", 0, new HalfSpace(), Placement.world(), motion), 3);
        pose.velocityAt(1, 2, 3, out);
        assertThat(out).containsOnly(0);
    }

    @Test
    void placementRefusesParallelAxes() {
        Vector3d alsoZ = new Vector3d(0, 0, 2);
        assertThatThrownBy(() -> Placement.axes(new Vector3d(), Z, alsoZ)).hasMessageContaining("angle");
    }
}
