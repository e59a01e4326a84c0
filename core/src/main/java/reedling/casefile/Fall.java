// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import org.joml.Vector3d;
import org.joml.Vector3dc;
import reedling.structure.Position;

/**
 * How fast grains of a case get before they hit something.
 *
 * <p>Formula: v = sqrt(v0^2 + 2 g h) + peak speed of the fastest vibration, v0 speed of the feed with its jitter, h from
 * the top of the feed down to the lowest end of a wire or, without wires, to the lowest corner of the bounds. An upper
 * bound for grains that fall freely.
 */
final class Fall {

    private final CaseSpecification specification;
    private final Vector3d gravity;

    Fall(CaseSpecification specification, Position acceleration) {
        this.specification = specification;
        gravity = new Vector3d(acceleration.x(), acceleration.y(), acceleration.z());
    }

    /** Acceleration of free fall, m/s2. */
    Vector3dc gravity() {
        return gravity;
    }

    /** Fastest impact of a grain of any feed, m/s. */
    double fastest() {
        double fastest = 0;
        for (FeedSpecification feed : specification.feeds().values()) {
            double jitter = feed instanceof FeedSpecification.Stream stream ? Math.sqrt(3) * stream.jitter() : 0;
            double start = feed.velocity().length() + jitter;
            double drop = Math.max(0, depth(feed.region().surroundings(), true) + lowest());
            fastest = Math.max(fastest, Math.sqrt(start * start + 2 * gravity.length() * drop));
        }
        return fastest + driveSpeed();
    }

    /** Largest speed of any vibration, m/s. */
    double driveSpeed() {
        return specification.motions().values().stream()
                .mapToDouble(motion -> switch (motion.path()) {
                    case MotionSpecification.Harmonic h -> 2 * Math.PI * h.frequency() * h.amplitude();
                    case MotionSpecification.Elliptic e ->
                        2 * Math.PI * e.frequency() * Math.max(e.firstAmplitude(), e.secondAmplitude());
                    case MotionSpecification.ConstantVelocity straight ->
                        straight.velocity().length();
                    case MotionSpecification.Rotation turning -> 0;
                })
                .max()
                .orElse(0);
    }

    /** Height of the highest (or, negative, depth of the lowest) corner of a box above the origin, against gravity, m. */
    private double depth(BoxRegion box, boolean top) {
        double height = 0;
        for (int axis = 0; axis < 3; axis++) {
            double up = gravity.length() == 0 ? 0 : -gravity.get(axis) / gravity.length();
            double low = box.minimum().get(axis) * up;
            double high = box.maximum().get(axis) * up;
            height += top ? Math.max(low, high) : -Math.min(low, high);
        }
        return height;
    }

    /** How far below the origin the lowest place is that grains are expected to hit, m. */
    private double lowest() {
        double depth = Double.NEGATIVE_INFINITY;
        for (WireSpecification wire : specification.wires().values()) {
            depth = Math.max(depth, depth(new BoxRegion(wire.start(), wire.start()), false));
            depth = Math.max(depth, depth(new BoxRegion(wire.end(), wire.end()), false));
        }
        return depth == Double.NEGATIVE_INFINITY ? depth(specification.bounds(), false) : depth;
    }
}
