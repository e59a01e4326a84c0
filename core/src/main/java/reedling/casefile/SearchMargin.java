// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/**
 * How far beyond touch the neighbour search looks.
 *
 * @param value m, or a fraction of the smallest grain radius
 * @param fractionOfRadius which of the two
 */
public record SearchMargin(double value, boolean fractionOfRadius) {

    /** In m, for a smallest grain radius in m. */
    public double length(double smallestRadius) {
        return fractionOfRadius ? value * smallestRadius : value;
    }
}
