// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.Arrays;

/**
 * A line or a set of points of a drawing.
 *
 * @param name for the legend
 * @param x values, in the unit of the axis
 * @param y values, in the unit of the axis
 * @param points true for marks, false for a line
 */
record Series(String name, double[] x, double[] y, boolean points) {

    double largest() {
        return Arrays.stream(y).map(Math::abs).max().orElse(0);
    }
}
