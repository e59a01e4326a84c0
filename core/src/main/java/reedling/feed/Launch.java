// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import org.joml.Vector3d;
import org.joml.Vector3dc;
import reedling.error.RangeCheck;

/**
 * How a grain is set in. Errors: velocity not finite, jitter negative, tries below 1. Threads: immutable.
 *
 * @param velocity m/s
 * @param jitter m/s: each component is changed by a uniform random amount up to this
 * @param tries places tried for a grain in one call before it waits
 */
public record Launch(Vector3dc velocity, double jitter, int tries) {

    public Launch {
        velocity = new Vector3d(velocity);
        new RangeCheck("feed")
                .finite("velocity", velocity.length(), "m/s")
                .notNegative("jitter", jitter, "m/s")
                .require(tries >= 1, "tries", tries, "", "at least 1")
                .finish();
    }
}
