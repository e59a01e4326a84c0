// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import reedling.error.RangeCheck;

/**
 * A lot of grain: one material, one distribution of sizes. Errors: an empty name, a negative material number.
 * Threads: immutable.
 *
 * @param name as in the case file
 * @param material number in the material table
 * @param sizes distribution of diameters by number
 */
public record Lot(String name, int material, SizeDistribution sizes) {

    public Lot {
        new RangeCheck("lot." + name)
                .require(!name.isEmpty(), "name", "empty", "a name", "")
                .require(material >= 0, "material number", material, "", ">= 0")
                .finish();
    }
}
