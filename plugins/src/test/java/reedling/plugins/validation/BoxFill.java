// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.validation;

/**
 * Part of an upright box that spheres fill: each sphere is cut into slices, and of each slice the part inside the box is
 * taken in closed form.
 */
final class BoxFill {

    private static final int SLICES = 200;

    private final double[] low;
    private final double[] high;
    private double filled;

    /**
     * @param low lower corner, m
     * @param high upper corner, m
     */
    BoxFill(double[] low, double[] high) {
        this.low = low.clone();
        this.high = high.clone();
    }

    void add(double x, double y, double z, double radius) {
        double from = Math.max(-1, (low[2] - z) / radius);
        double to = Math.min(1, (high[2] - z) / radius);
        if (from >= to
                || x + radius <= low[0]
                || x - radius >= high[0]
                || y + radius <= low[1]
                || y - radius >= high[1]) {
            return;
        }
        // heights z = sin(u) R: the slices are even where the circle's radius changes fastest; Simpson's rule
        double a = Math.asin(from);
        double step = (Math.asin(to) - a) / SLICES;
        double sum = 0;
        for (int k = 0; k <= SLICES; k++) {
            double u = a + k * step;
            double weight = k == 0 || k == SLICES ? 1 : 2 + 2 * (k & 1);
            double circle = radius * Math.cos(u);
            sum += weight * area(x, y, circle) * circle;
        }
        filled += sum * step / 3;
    }

    double fraction() {
        return filled / ((high[0] - low[0]) * (high[1] - low[1]) * (high[2] - low[2]));
    }

    /** Area of a circle inside the box's section, m2. */
    private double area(double x, double y, double radius) {
        double x0 = low[0] - x, x1 = high[0] - x, y0 = low[1] - y, y1 = high[1] - y;
        return corner(x1, y1, radius) - corner(x0, y1, radius) - corner(x1, y0, radius) + corner(x0, y0, radius);
    }

    /** Area of the circle about the origin with coordinates below a and b, m2. */
    private static double corner(double a, double b, double r) {
        if (a <= -r || b <= -r) {
            return 0;
        }
        if (a >= r || b >= r) {
            return half(Math.min(a, b), r);
        }
        if (a * a + b * b < r * r) {
            // quarter, two strips and a rectangle, with signs
            return 0.25 * Math.PI * r * r + strip(a, r) + strip(b, r) + a * b;
        }
        if (a < 0 && b < 0) {
            return 0;
        }
        return a > 0 && b > 0 ? half(a, r) + half(b, r) - Math.PI * r * r : half(Math.min(a, b), r);
    }

    /** Area of the circle with one coordinate below a, m2. */
    private static double half(double a, double r) {
        double inside = Math.min(a, r);
        return 0.5 * Math.PI * r * r + 2 * strip(inside, r);
    }

    /** Area between the axis and the line at a, on one side of the other axis, m2; negative for a < 0. */
    private static double strip(double a, double r) {
        return 0.5 * (a * Math.sqrt(r * r - a * a) + r * r * Math.asin(a / r));
    }
}
