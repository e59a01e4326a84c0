// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.List;
import java.util.Locale;
import java.util.function.Function;

/** A chart as an SVG element. */
final class Drawing {

    private static final int WIDTH = 560;
    private static final int HEIGHT = 380;
    private static final int LEFT = 78;
    private static final int RIGHT = 16;
    private static final int TOP = 14;
    private static final int BOTTOM = 84;
    private static final int TEXT = 14; // px
    private static final String INK = "#1c2326";
    private static final String GRID = "#e2e7e9";
    private static final List<String> COLOURS = List.of("#1f5f8b", "#c2571a", "#4d7c0f", "#7c3f98");

    private final StringBuilder svg = new StringBuilder();
    private final Chart chart;
    private final Axis x;
    private final Axis y;

    private Drawing(Chart chart) {
        this.chart = chart;
        double[] across = bounds(Series::x);
        double[] up = bounds(Series::y);
        x = Axis.around(across[0], across[1], LEFT, WIDTH - RIGHT, chart.logarithmic());
        // values that are all alike would otherwise be drawn as noise
        double middle = 0.5 * (up[0] + up[1]);
        double least = 0.05 * Math.abs(middle);
        boolean flat = up[1] - up[0] < least;
        y = Axis.around(flat ? middle - least : up[0], flat ? middle + least : up[1], HEIGHT - BOTTOM, TOP, false);
    }

    static String of(Chart chart) {
        return new Drawing(chart).draw();
    }

    private double[] bounds(Function<Series, double[]> values) {
        double least = Double.POSITIVE_INFINITY;
        double most = Double.NEGATIVE_INFINITY;
        for (Series line : chart.series()) {
            for (double value : values.apply(line)) {
                if (Double.isFinite(value)) {
                    least = Math.min(least, value);
                    most = Math.max(most, value);
                }
            }
        }
        return least <= most ? new double[] {least, most} : new double[] {0, 1};
    }

    private String draw() {
        add(
                "<svg viewBox=\"0 0 %d %d\" role=\"img\" aria-label=\"%s\" font-family=\"system-ui, sans-serif\""
                        + " font-size=\"%d\" fill=\"%s\">",
                WIDTH, HEIGHT, CertificatePage.escape(chart.title()), TEXT, INK);
        grid();
        for (int k = 0; k < chart.series().size(); k++) {
            series(chart.series().get(k), COLOURS.get(k % COLOURS.size()));
        }
        frame();
        legend();
        return svg.append("</svg>").toString();
    }

    private void grid() {
        double bottom = HEIGHT - BOTTOM;
        for (double mark : x.marks()) {
            add(
                    "<line x1=\"%1$.1f\" y1=\"%2$d\" x2=\"%1$.1f\" y2=\"%3$.1f\" stroke=\"%4$s\"/>",
                    x.pixel(mark), TOP, bottom, GRID);
            add(
                    "<text x=\"%.1f\" y=\"%.1f\" text-anchor=\"middle\">%s</text>",
                    x.pixel(mark), bottom + 20, minus(x.written(mark)));
        }
        for (double mark : y.marks()) {
            add(
                    "<line x1=\"%1$d\" y1=\"%2$.1f\" x2=\"%3$d\" y2=\"%2$.1f\" stroke=\"%4$s\"/>",
                    LEFT, y.pixel(mark), WIDTH - RIGHT, GRID);
            add(
                    "<text x=\"%d\" y=\"%.1f\" text-anchor=\"end\">%s</text>",
                    LEFT - 8, y.pixel(mark) + 5, minus(y.written(mark)));
        }
        if (y.low() < 0 && y.high() > 0) {
            add(
                    "<line x1=\"%1$d\" y1=\"%2$.1f\" x2=\"%3$d\" y2=\"%2$.1f\" stroke=\"#8a979c\"/>",
                    LEFT, y.pixel(0), WIDTH - RIGHT);
        }
    }

    private static String minus(String number) {
        return number.replace('-', '\u2212');
    }

    private void series(Series line, String colour) {
        if (line.points()) {
            for (int k = 0; k < line.x().length; k++) {
                if (Double.isFinite(line.y()[k])) {
                    add(
                            "<circle cx=\"%.1f\" cy=\"%.1f\" r=\"4\" fill=\"%s\"/>",
                            x.pixel(line.x()[k]), y.pixel(line.y()[k]), colour);
                }
            }
            return;
        }
        StringBuilder path = new StringBuilder();
        boolean pen = false;
        for (int k = 0; k < line.x().length; k++) {
            boolean finite = Double.isFinite(line.y()[k]);
            if (finite) {
                path.append(String.format(
                        Locale.ROOT, "%s%.1f %.1f", pen ? "L" : "M", x.pixel(line.x()[k]), y.pixel(line.y()[k])));
            }
            pen = finite;
        }
        add("<path d=\"%s\" fill=\"none\" stroke=\"%s\" stroke-width=\"2\" stroke-linejoin=\"round\"/>", path, colour);
    }

    private void frame() {
        int bottom = HEIGHT - BOTTOM;
        add(
                "<rect x=\"%d\" y=\"%d\" width=\"%d\" height=\"%d\" fill=\"none\" stroke=\"#8a979c\"/>",
                LEFT, TOP, WIDTH - LEFT - RIGHT, bottom - TOP);
        add(
                "<text x=\"%d\" y=\"%d\" text-anchor=\"middle\">%s</text>",
                (LEFT + WIDTH - RIGHT) / 2, bottom + 42, CertificatePage.escape(chart.xLabel()));
        int middle = (TOP + bottom) / 2;
        add(
                "<text x=\"18\" y=\"%1$d\" text-anchor=\"middle\" transform=\"rotate(-90 18 %1$d)\">%2$s</text>",
                middle, CertificatePage.escape(chart.yLabel()));
    }

    private void legend() {
        double at = LEFT;
        int line = HEIGHT - 14;
        for (int k = 0; k < chart.series().size(); k++) {
            Series series = chart.series().get(k);
            String colour = COLOURS.get(k % COLOURS.size());
            if (series.points()) {
                add("<circle cx=\"%.1f\" cy=\"%d\" r=\"4\" fill=\"%s\"/>", at + 10, line - 5, colour);
            } else {
                add(
                        "<line x1=\"%.1f\" y1=\"%2$d\" x2=\"%3$.1f\" y2=\"%2$d\" stroke=\"%4$s\" stroke-width=\"2\"/>",
                        at, line - 5, at + 20, colour);
            }
            add("<text x=\"%.1f\" y=\"%d\">%s</text>", at + 27, line, CertificatePage.escape(series.name()));
            at += 45 + 7.2 * series.name().length();
        }
    }

    private void add(String format, Object... values) {
        svg.append(String.format(Locale.ROOT, format, values));
    }
}
