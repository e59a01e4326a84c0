// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import org.joml.Vector3dc;

/**
 * Box along the world axes.
 *
 * @param minimum lowest corner, m
 * @param maximum highest corner, m; each component above that of the minimum
 */
public record BoxRegion(Vector3dc minimum, Vector3dc maximum) implements Region {

    /** Whether the other box lies inside this one or touches it from inside. */
    public boolean contains(BoxRegion other) {
        return other.minimum.x() >= minimum.x()
                && other.minimum.y() >= minimum.y()
                && other.minimum.z() >= minimum.z()
                && other.maximum.x() <= maximum.x()
                && other.maximum.y() <= maximum.y()
                && other.maximum.z() <= maximum.z();
    }

    /** Whether the two boxes share a volume; faces may touch. */
    public boolean overlaps(BoxRegion other) {
        return other.minimum.x() < maximum.x()
                && other.minimum.y() < maximum.y()
                && other.minimum.z() < maximum.z()
                && other.maximum.x() > minimum.x()
                && other.maximum.y() > minimum.y()
                && other.maximum.z() > minimum.z();
    }

    @Override
    public BoxRegion surroundings() {
        return this;
    }
}
