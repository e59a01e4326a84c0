// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import org.joml.Vector3d;
import org.joml.Vector3dc;
import reedling.error.RangeCheck;

/**
 * Harmonic, elliptic or circular translation at one frequency.
 *
 * <p>Formula: shift = e(t) ( a1 sin(p + phi1) u1 + a2 sin(p + phi2) u2 ), p = 2 pi f (t - origin), e the strength of
 * the timing. A second component of amplitude 0 leaves the straight harmonic motion; equal amplitudes a quarter
 * period apart give the circle.
 * <p>Errors: frequency not positive; directions not at right angles (cosine above 1e-9); a timing that switches at
 * once, because the wall would jump.
 * <p>Threads: immutable.
 *
 * @param first component along u1
 * @param second component along u2
 * @param frequency f, Hz
 * @param timing when it moves
 */
public record Oscillating(Stroke first, Stroke second, double frequency, Timing timing) implements Motion {

    private static final double RIGHT_ANGLE = 1e-9;

    public Oscillating {
        double cosine = first.direction().dot(second.direction());
        new RangeCheck("motion")
                .positive("frequency", frequency, "Hz")
                .require(Math.abs(cosine) < RIGHT_ANGLE, "cosine of the two directions", cosine, "", "0")
                .require(!timing.switchesAtOnce(), "ramp", timing.ramp(), "s", "a ramp > 0")
                .finish();
    }

    /** Straight harmonic motion. */
    public static Oscillating harmonic(Stroke stroke, double frequency, Timing timing) {
        return new Oscillating(stroke, new Stroke(across(stroke.direction()), 0, 0), frequency, timing);
    }

    /** Circle of {@code radius} (m) in the plane of u1 and u2 (at right angles), running from u1 towards u2. */
    public static Oscillating circular(Vector3dc u1, Vector3dc u2, double radius, double frequency, Timing timing) {
        Stroke first = new Stroke(u1, radius, 0.5 * Math.PI);
        return new Oscillating(first, new Stroke(u2, radius, 0), frequency, timing);
    }

    @Override
    public double longestStep(double time) {
        return timing.longestStep(time);
    }

    @Override
    public void pose(double time, Pose out) {
        double strength = timing.strength(time);
        double periods = frequency * (time - timing.origin());
        double one = strength * first.at(periods);
        double two = strength * second.at(periods);
        Vector3dc u = first.direction();
        Vector3dc v = second.direction();
        out.reset();
        out.shift(one * u.x() + two * v.x(), one * u.y() + two * v.y(), one * u.z() + two * v.z());
    }

    private static Vector3dc across(Vector3dc direction) {
        Vector3d axis = Math.abs(direction.z()) < 0.9 ? new Vector3d(0, 0, 1) : new Vector3d(1, 0, 0);
        return axis.cross(direction).normalize();
    }
}
