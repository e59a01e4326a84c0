// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import org.joml.Vector3d;
import org.joml.Vector3dc;
import reedling.error.RangeCheck;

/**
 * One harmonic component of an oscillation: shift = a sin(2 pi f (t - origin) + phase) along a direction.
 *
 * <p>Errors: direction of zero length, amplitude negative, phase not finite.
 * <p>Threads: immutable.
 *
 * @param direction stored at length 1, world frame
 * @param amplitude a, m: half of the way from one end to the other
 * @param phase rad
 */
public record Stroke(Vector3dc direction, double amplitude, double phase) {

    public Stroke {
        new RangeCheck("motion.stroke")
                .positive("direction", direction.length(), "m")
                .notNegative("amplitude", amplitude, "m")
                .finite("phase", phase, "rad")
                .finish();
        direction = new Vector3d(direction).normalize();
    }

    /** The component whose way from one end to the other is {@code peakToPeak} (m), with phase 0. */
    public static Stroke peakToPeak(Vector3dc direction, double peakToPeak) {
        return new Stroke(direction, 0.5 * peakToPeak, 0);
    }

    /** Shift along the direction, m, after a number of periods. */
    double at(double periods) {
        // whole periods go first: the phase would otherwise lose digits in a long run
        double part = periods - Math.floor(periods);
        return amplitude * Circle.sine(part + phase / (2 * Math.PI));
    }
}
