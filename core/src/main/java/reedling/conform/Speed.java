// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import reedling.math.Lanes;

/**
 * What a law costs, nanoseconds a contact and step on one thread, kernel alone.
 *
 * @param here as this machine runs it
 * @param otherWidth one row at a time where this machine runs eight, or the reverse; empty if it could not be measured
 * @param yardstick the built-in law of the same stage, if there is another
 * @param yardstickName its name, empty if there is none
 */
public record Speed(double here, OptionalDouble otherWidth, OptionalDouble yardstick, String yardstickName) {

    private static final double CLEARLY = 1.3;

    static Speed of(Subject subject, Optional<OtherWidth> other) {
        return new Speed(
                Cost.nanoseconds(subject.laws(), subject.stage()),
                other.map(one -> OptionalDouble.of(one.nanoseconds())).orElse(OptionalDouble.empty()),
                subject.yardstickLaws()
                        .map(laws -> OptionalDouble.of(Cost.nanoseconds(laws, subject.stage())))
                        .orElse(OptionalDouble.empty()),
                subject.yardstick().map(law -> law.name()).orElse(""));
    }

    /** Nanoseconds one row at a time over nanoseconds in eight lanes; empty if unknown. */
    public OptionalDouble gain() {
        if (otherWidth.isEmpty()) {
            return OptionalDouble.empty();
        }
        double other = otherWidth.getAsDouble();
        return OptionalDouble.of(Lanes.VECTORISED ? other / here : here / other);
    }

    /** In sentences. */
    public String text() {
        StringBuilder text = new StringBuilder(
                String.format(Locale.ROOT, "%.2f ns a contact and step, kernel alone, on one thread.", here));
        yardstick.ifPresentOrElse(
                other -> text.append(String.format(
                        Locale.ROOT,
                        " The built-in %s takes %.2f ns; this law takes %.2f times that.",
                        yardstickName,
                        other,
                        here / other)),
                () -> text.append(" There is no other built-in law of its stage to compare with."));
        gain().ifPresent(gain -> text.append(
                Lanes.VECTORISED
                        ? String.format(
                                Locale.ROOT,
                                " Forced to run one row at a time it takes %.2f ns: it is %s (gain %.1f).",
                                otherWidth.orElse(Double.NaN),
                                gain >= CLEARLY ? "vectorised" : "not vectorised",
                                gain)
                        : " This machine has no 512-bit vectors: whether the law is vectorised does not show here."));
        return text.toString();
    }
}
