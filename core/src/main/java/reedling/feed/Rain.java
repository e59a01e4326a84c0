// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import reedling.error.RangeCheck;

/**
 * Plan of a feed that lets grains rain, or shoot, from a region. Errors: an empty name. Threads: immutable.
 *
 * @param name as in the case file; also names the random streams of the feed
 * @param mix what is fed
 * @param region where
 * @param rate how much and when
 * @param launch how
 */
public record Rain(String name, LotMix mix, Region region, FeedRate rate, Launch launch) {

    public Rain {
        new RangeCheck("feed")
                .require(!name.isEmpty(), "name", "empty", "a name", "")
                .finish();
    }
}
