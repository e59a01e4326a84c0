// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.Collection;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import org.joml.Vector3d;
import reedling.wall.Gliding;
import reedling.wall.Motion;
import reedling.wall.Oscillating;
import reedling.wall.Still;
import reedling.wall.Stroke;
import reedling.wall.Timing;
import reedling.wall.Turning;

/** Motions of a case by name. */
final class MotionParts {

    private final Map<String, Motion> byName = new HashMap<>();
    private final Collection<MotionSpecification> specifications;

    private MotionParts(Collection<MotionSpecification> specifications) {
        this.specifications = specifications;
    }

    static MotionParts make(CaseSpecification specification, PartFaults faults) {
        MotionParts parts = new MotionParts(specification.motions().values());
        specification.motions().forEach((name, motion) -> {
            String path = "motions." + name;
            if (motion.stop().isPresent() && motion.rampUp() != motion.rampDown()) {
                faults.add(
                        path + ".ramp_down",
                        motion.rampDown() + " s",
                        "ramp_up, " + motion.rampUp() + " s",
                        "A motion that stops falls as it rose: give both the same duration.");
            }
            faults.make(path, () -> motion(motion)).ifPresent(made -> parts.byName.put(name, made));
        });
        return parts;
    }

    /** The motion of a name; rest without one, or for one that was refused. */
    Motion of(Optional<String> name) {
        return name.map(byName::get).orElseGet(Still::new);
    }

    /** Period of the fastest vibration or rotation, s; infinite without one. */
    double shortestPeriod() {
        return specifications.stream()
                .mapToDouble(motion -> period(motion.path()))
                .min()
                .orElse(Double.POSITIVE_INFINITY);
    }

    private static double period(MotionSpecification.Path path) {
        return switch (path) {
            case MotionSpecification.ConstantVelocity straight -> Double.POSITIVE_INFINITY;
            case MotionSpecification.Rotation rotation -> 2 * Math.PI / Math.abs(rotation.speed());
            case MotionSpecification.Harmonic harmonic -> 1 / harmonic.frequency();
            case MotionSpecification.Elliptic elliptic -> 1 / elliptic.frequency();
        };
    }

    private static Motion motion(MotionSpecification motion) {
        Timing timing = timing(motion);
        return switch (motion.path()) {
            case MotionSpecification.ConstantVelocity straight -> new Gliding(straight.velocity(), timing);
            case MotionSpecification.Rotation turn -> new Turning(turn.point(), turn.axis(), turn.speed(), timing);
            case MotionSpecification.Harmonic harmonic ->
                Oscillating.harmonic(
                        new Stroke(harmonic.direction(), harmonic.amplitude(), harmonic.phase()),
                        harmonic.frequency(),
                        timing);
            case MotionSpecification.Elliptic elliptic -> elliptic(elliptic, timing);
        };
    }

    /** The first component is a cosine: a sine a quarter of a period ahead. */
    private static Motion elliptic(MotionSpecification.Elliptic elliptic, Timing timing) {
        Vector3d first = new Vector3d(elliptic.firstAxis()).normalize();
        // numbers of a file meet a right angle only to the digits written
        Vector3d second = new Vector3d(elliptic.secondAxis()).normalize();
        second.sub(new Vector3d(first).mul(first.dot(second)));
        return new Oscillating(
                new Stroke(first, elliptic.firstAmplitude(), elliptic.phase() + 0.5 * Math.PI),
                new Stroke(second, elliptic.secondAmplitude(), elliptic.phase()),
                elliptic.frequency(),
                timing);
    }

    /** A motion that runs at full strength from the very start was under way before it. */
    private static Timing timing(MotionSpecification motion) {
        if (motion.start() == 0 && motion.rampUp() == 0 && motion.stop().isEmpty()) {
            return Timing.always();
        }
        return new Timing(motion.start(), motion.stop().orElse(Double.POSITIVE_INFINITY), motion.rampUp());
    }
}
