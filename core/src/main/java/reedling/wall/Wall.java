// SPDX-License-Identifier: Apache-2.0
package reedling.wall;

import reedling.error.RangeCheck;

/**
 * A rigid wall. Errors: an empty name, a negative material number. Threads: immutable.
 *
 * @param name as in the case file
 * @param material number in the material table
 * @param surface shape in its own frame
 * @param placement where that frame stands at rest
 * @param motion displacement from rest, as a function of time
 */
public record Wall(String name, int material, Surface surface, Placement placement, Motion motion) {

    public Wall {
        new RangeCheck("wall." + name)
                .require(!name.isEmpty(), "name", "empty", "a name", "")
                .require(material >= 0, "material number", material, "", ">= 0")
                .finish();
    }
}
