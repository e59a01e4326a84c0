// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.Optional;
import org.joml.Vector3dc;
import reedling.unit.Dimension;
import reedling.unit.QuantityText;

/** Keys of boxes along the world axes. */
final class BoxKeys {

    static final Key MIN = Key.required("min", Key.vector(Dimension.LENGTH), "Corner with the lowest coordinates.");
    static final Key MAX = Key.required("max", Key.vector(Dimension.LENGTH), "Corner with the highest coordinates.");

    private static final String AXES = "xyz";

    private BoxKeys() {}

    /** The box, or a finding for every axis along which it has no extent. */
    static Optional<BoxRegion> read(Values values, Rules rules) {
        Vector3dc low = values.vector("min");
        Vector3dc high = values.vector("max");
        boolean sound = true;
        for (int axis = 0; axis < 3; axis++) {
            if (low.get(axis) >= high.get(axis)) {
                String got = QuantityText.of(high.get(axis), Dimension.LENGTH) + " along " + AXES.charAt(axis);
                String least = QuantityText.of(low.get(axis), Dimension.LENGTH);
                rules.error(values.path() + ".max", got, "more than min, " + least, "Exchange the two.");
                sound = false;
            }
        }
        return sound ? Optional.of(new BoxRegion(low, high)) : Optional.empty();
    }
}
