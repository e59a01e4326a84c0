// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import reedling.unit.Dimension;
import reedling.unit.QuantityText;

/** Start before stop, for feeds and motions. */
final class TimeOrder {

    private TimeOrder() {}

    /** Whether the stop, if any, comes after the start and both ramps; reports it otherwise. */
    static boolean holds(Values values, Rules rules) {
        if (!values.has("stop")) {
            return true;
        }
        double least = values.number("start");
        String what = "start, ";
        if (values.has("ramp_up")) {
            least += values.number("ramp_up") + values.number("ramp_down");
            what = "start and both ramps, ";
        }
        double stop = values.number("stop");
        if (stop > least) {
            return true;
        }
        rules.error(
                values.path() + ".stop",
                QuantityText.of(stop, Dimension.TIME),
                "more than " + what + QuantityText.of(least, Dimension.TIME),
                "Stop later or start earlier.");
        return false;
    }
}
