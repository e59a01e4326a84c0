// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.OptionalDouble;
import reedling.probe.PegRule;

/**
 * What a run is measured for on a screen deck.
 *
 * @param bodies numbers of the deck's wires in the structure, from one side to the other, at least two
 * @param undersizeLot number of the lot that should pass
 * @param productLot number of the lot that should go over
 * @param passedOutlet number of the outlet below the deck
 * @param overOutlet number of the outlet at the end of the deck
 * @param peg when a grain counts as pegged
 * @param measureFrom start of the measured part, s
 * @param limits of the duty, as far as they are known
 */
public record ScreenPlan(
        int[] bodies,
        int undersizeLot,
        int productLot,
        int passedOutlet,
        int overOutlet,
        PegRule peg,
        double measureFrom,
        Limits limits) {

    /**
     * What the duty asks for; empty where nothing is known.
     *
     * @param recovery least undersize recovery, 0 to 1
     * @param loss largest part of the product lost, 0 to 1
     * @param pegged largest part of the open area pegged, per cent
     * @param stressRange allowable stress range of the wires, Pa
     */
    public record Limits(
            OptionalDouble recovery, OptionalDouble loss, OptionalDouble pegged, OptionalDouble stressRange) {

        /** Nothing known. */
        public static final Limits UNKNOWN = new Limits(
                OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());
    }
}
