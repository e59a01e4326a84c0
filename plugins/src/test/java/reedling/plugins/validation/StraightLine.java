// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.validation;

/** Straight line of least squares through points. */
final class StraightLine {

    private int count;
    private double x;
    private double y;
    private double xx;
    private double xy;

    void add(double atX, double atY) {
        count++;
        x += atX;
        y += atY;
        xx += atX * atX;
        xy += atX * atY;
    }

    double slope() {
        return (count * xy - x * y) / (count * xx - x * x);
    }

    /** Value at x = 0. */
    double start() {
        return (y - slope() * x) / count;
    }
}
