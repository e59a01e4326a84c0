// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.OptionalDouble;
import org.joml.Vector3dc;

/**
 * A prescribed rigid motion.
 *
 * @param name as in the case file
 * @param path where it leads at full strength
 * @param start first instant of motion, s; phases are counted from it
 * @param rampUp duration of the smooth rise after the start, s
 * @param stop first instant of rest, s; empty if it never stops
 * @param rampDown duration of the smooth fall before the stop, s
 */
public record MotionSpecification(
        String name, Path path, double start, double rampUp, OptionalDouble stop, double rampDown) {

    /** What moves how. */
    public sealed interface Path {}

    /** Straight motion. @param velocity m/s */
    public record ConstantVelocity(Vector3dc velocity) implements Path {}

    /**
     * Rotation about a fixed axis.
     *
     * @param point a point of the axis, m
     * @param axis direction, right-handed, not zero
     * @param speed rad/s
     */
    public record Rotation(Vector3dc point, Vector3dc axis, double speed) implements Path {}

    /**
     * Straight vibration: shift = amplitude * direction * sin(2 pi frequency (t - start) + phase).
     *
     * @param direction not zero
     * @param amplitude half of the stroke, m
     * @param frequency Hz
     * @param phase rad
     */
    public record Harmonic(Vector3dc direction, double amplitude, double frequency, double phase) implements Path {}

    /**
     * Elliptic or circular vibration: shift = a1 u1 cos(p) + a2 u2 sin(p), p = 2 pi frequency (t - start) + phase.
     *
     * @param firstAxis u1, not zero
     * @param firstAmplitude a1, m
     * @param secondAxis u2, at right angles to u1
     * @param secondAmplitude a2, m
     * @param frequency Hz
     * @param phase rad
     */
    public record Elliptic(
            Vector3dc firstAxis,
            double firstAmplitude,
            Vector3dc secondAxis,
            double secondAmplitude,
            double frequency,
            double phase)
            implements Path {}
}
