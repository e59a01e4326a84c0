// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/**
 * What the report says about a screen deck.
 *
 * @param wires name of the deck's row of wires
 * @param undersizeLot name of the lot that should pass
 * @param productLot name of the lot that should go over
 * @param passed name of the outlet below the deck
 * @param over name of the outlet at the end of the deck
 * @param pegTime a grain that stays within pegDistance for this long counts as pegged, s
 * @param pegDistance relative to the deck, m
 * @param measureFrom start of the measured part of the run, s
 */
public record ScreenSpecification(
        String wires,
        String undersizeLot,
        String productLot,
        String passed,
        String over,
        double pegTime,
        double pegDistance,
        double measureFrom) {}
