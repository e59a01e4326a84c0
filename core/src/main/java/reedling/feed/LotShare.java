// SPDX-License-Identifier: Apache-2.0
package reedling.feed;

import reedling.error.RangeCheck;
import reedling.particle.Lot;

/**
 * A lot and its part in a mix. Errors: part not positive. Threads: immutable.
 *
 * @param lot the grain
 * @param massPart part by mass relative to the other lots of the mix; the parts need not add up to 1
 */
public record LotShare(Lot lot, double massPart) {

    public LotShare {
        new RangeCheck("mix." + lot.name()).positive("mass part", massPart, "").finish();
    }
}
