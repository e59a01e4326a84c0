// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.List;

/**
 * A drawing of what a law does.
 *
 * @param title what is shown
 * @param note how it was obtained
 * @param xLabel quantity and unit
 * @param yLabel quantity and unit
 * @param logarithmic whether the x axis is
 * @param series lines and points
 */
record Chart(String title, String note, String xLabel, String yLabel, boolean logarithmic, List<Series> series) {

    Chart {
        series = List.copyOf(series);
    }
}
