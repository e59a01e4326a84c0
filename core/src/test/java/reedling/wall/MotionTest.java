// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.joml.Vector3d;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import reedling.error.ReedlingException;

class MotionTest {

    private static final Vector3d X = new Vector3d(1, 0, 0);
    private static final Vector3d Y = new Vector3d(0, 1, 0);
    private static final Vector3d Z = new Vector3d(0, 0, 1);
    private static final Timing RAMPED = new Timing(0.1, 0.9, 0.2);

    static List<Motion> rampedMotions() {
        return List.of(
                new Gliding(new Vector3d(1, -2, 0.5), RAMPED),
                new Turning(new Vector3d(0.1, 0, 0), Z, 9, RAMPED),
                Oscillating.harmonic(new Stroke(X, 0.1, 1.1), 5, RAMPED),
                new Oscillating(new Stroke(X, 0.1, 0.3), new Stroke(Z, 0.05, 2), 5, RAMPED));
    }

    @ParameterizedTest
    @MethodSource("rampedMotions")
    void velocityHasNoJumpOverRampsAndStops(Motion motion) {
        // a jump in velocity would show as a difference that does not shrink with the sampling step
        double coarse = largestVelocityChange(motion, 1e-4);
        double fine = largestVelocityChange(motion, 1e-5);
        assertThat(coarse).isPositive();
        assertThat(fine).isLessThan(0.12 * coarse);
    }

    @ParameterizedTest
    @MethodSource("rampedMotions")
    void wallRestsBeforeTheStartAndAfterTheStop(Motion motion) {
        assertThat(distance(motion, -5, 0.1)).isZero();
        assertThat(distance(motion, 0.9, 1.7)).isZero();
        assertThat(distance(motion, 0.4, 0.41)).isPositive();
    }

    @Test
    void glidingCoversSpeedTimesFullTimeAndHalfOfTheRamps() {
        Pose end = at(new Gliding(new Vector3d(2, 0, 0), RAMPED), 5);
        assertThat(end.shiftX).isEqualTo(2 * (0.8 - 0.2), within(1e-15));
    }

    @Test
    void elapsedTimeIsTheIntegralOfTheStrength() {
        double sum = 0;
        double width = 1e-4;
        for (int k = 0; k < 10_000; k++) {
            double middle = (k + 0.5) * width;
            sum += RAMPED.strength(middle) * width;
            // midpoint rule: width^2 / 24 times the slope, at most 1.875 / 0.2
            assertThat(RAMPED.elapsed(middle + 0.5 * width)).isEqualTo(sum, within(1e-8));
        }
        assertThat(RAMPED.strength(0.5)).isEqualTo(1);
        assertThat(RAMPED.strength(0.2)).isEqualTo(0.5, within(1e-12));
    }

    @Test
    void glidingAlwaysIsSpeedTimesTime() {
        assertThat(at(new Gliding(new Vector3d(2, 0, 0), Timing.always()), -3).shiftX)
                .isEqualTo(-6);
    }

    @Test
    void harmonicSpansItsStroke() {
        Motion motion = Oscillating.harmonic(Stroke.peakToPeak(new Vector3d(1, 0, 1), 0.005), 20, Timing.always());
        double low = 0;
        double high = 0;
        for (int k = 0; k <= 4000; k++) {
            Pose pose = at(motion, 1 + k * 0.05 / 4000);
            double along = (pose.shiftX + pose.shiftZ) / Math.sqrt(2);
            low = Math.min(low, along);
            high = Math.max(high, along);
            assertThat(pose.shiftX).isEqualTo(pose.shiftZ, within(1e-18));
        }
        assertThat(high - low).isEqualTo(0.005, within(1e-12));
    }

    @Test
    void circleKeepsItsRadiusAndRunsFromFirstToSecondDirection() {
        Motion motion = Oscillating.circular(X, Y, 0.003, 10, Timing.always());
        for (int k = 0; k < 100; k++) {
            Pose pose = at(motion, k * 1e-3);
            assertThat(Math.hypot(pose.shiftX, pose.shiftY)).isEqualTo(0.003, within(1e-17));
        }
        assertThat(at(motion, 0).shiftX).isEqualTo(0.003, within(1e-18));
        assertThat(at(motion, 0.025).shiftY).isEqualTo(0.003, within(1e-16));
    }

    @Test
    void ellipseSatisfiesItsEquation() {
        Motion motion = new Oscillating(new Stroke(X, 0.004, 0), new Stroke(Z, 0.001, Math.PI / 2), 7, Timing.always());
        for (int k = 0; k < 50; k++) {
            Pose pose = at(motion, k * 3.3e-3);
            assertThat(Math.hypot(pose.shiftX / 0.004, pose.shiftZ / 0.001)).isEqualTo(1, within(1e-12));
        }
    }

    @Test
    void turningReachesSpeedTimesTimeAboutItsAxis() {
        Pose pose = at(new Turning(new Vector3d(1, 2, 3), new Vector3d(0, 0, 5), 0.5, Timing.from(1, 0.4)), 3);
        double angle = 0.5 * (2 - 0.2);
        assertThat(2 * Math.atan2(pose.qz, pose.qw)).isEqualTo(angle, within(1e-14));
        assertThat(new double[] {pose.qx, pose.qy}).containsOnly(0);
        assertThat(new double[] {pose.pivotX, pose.pivotY, pose.pivotZ}).containsExactly(1, 2, 3);
    }

    @Test
    void everyMistakeOfATimingIsNamed() {
        assertThatThrownBy(() -> new Timing(Double.NaN, 1, -1))
                .isInstanceOf(ReedlingException.class)
                .hasMessageContaining("start")
                .hasMessageContaining("ramp")
                .hasMessageContaining("stop");
    }

    @Test
    void oscillationRefusesASwitchAndSkewDirections() {
        Stroke stroke = new Stroke(X, 0.1, 1);
        assertThatThrownBy(() -> Oscillating.harmonic(stroke, 5, Timing.from(0, 0)))
                .hasMessageContaining("ramp");
        Stroke skew = new Stroke(new Vector3d(1, 1, 0), 0.1, 1);
        assertThatThrownBy(() -> new Oscillating(stroke, skew, 5, RAMPED)).hasMessageContaining("cosine");
    }

    private static Pose at(Motion motion, double time) {
        Pose pose = new Pose();
        pose.qx = Double.NaN;
        motion.pose(time, pose);
        return pose;
    }

    private static double largestVelocityChange(Motion motion, double step) {
        double largest = 0;
        double[] last = new double[7];
        double[] velocity = new double[7];
        double[] lastVelocity = new double[7];
        int samples = (int) Math.round(1 / step);
        for (int k = -2; k <= samples; k++) {
            double[] now = numbers(at(motion, k * step));
            for (int c = 0; c < 7; c++) {
                velocity[c] = (now[c] - last[c]) / step;
                if (k >= 0) {
                    largest = Math.max(largest, Math.abs(velocity[c] - lastVelocity[c]));
                }
            }
            last = now;
            lastVelocity = velocity.clone();
        }
        return largest;
    }

    private static double distance(Motion motion, double from, double to) {
        double[] a = numbers(at(motion, from));
        double[] b = numbers(at(motion, to));
        double sum = 0;
        for (int c = 0; c < a.length; c++) {
            sum += Math.abs(a[c] - b[c]);
        }
        return sum;
    }

    private static double[] numbers(Pose p) {
        return new double[] {p.shiftX, p.shiftY, p.shiftZ, p.qw, p.qx, p.qy, p.qz};
    }
}
