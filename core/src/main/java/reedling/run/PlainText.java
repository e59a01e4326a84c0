// SPDX-License-Identifier: Apache-2.0
package reedling.run;

import java.util.Locale;

/** Text of 80 columns in plain ASCII, for terminals and files alike. Threads: one. */
final class PlainText {

    private static final int COLUMNS = 80;
    private static final int FIGURE_COLUMN = 25;

    private final StringBuilder text = new StringBuilder();

    /** Adds an empty line and a heading. */
    void section(String heading) {
        text.append('\n');
        line(heading);
    }

    /** Adds a line, broken between words where it is too long. */
    void line(String words) {
        line(words, "    ");
    }

    /** Adds what a figure is and the figure, in two columns. */
    void entry(String what, String figure) {
        line(format("%-24s %s", what, figure), " ".repeat(FIGURE_COLUMN));
    }

    private void line(String words, String hanging) {
        String rest = words;
        String indent = "";
        while (indent.length() + rest.length() > COLUMNS) {
            int end = rest.lastIndexOf(' ', COLUMNS - indent.length());
            if (end <= 0) {
                break;
            }
            text.append(indent).append(rest.substring(0, end).stripTrailing()).append('\n');
            rest = rest.substring(end + 1);
            indent = hanging;
        }
        text.append(indent).append(rest.stripTrailing()).append('\n');
    }

    /** A number to the right of so many columns; a dash if there is none. */
    static String cell(int columns, double value) {
        String number = Double.isNaN(value) ? "-" : format("%.4g", value);
        return " ".repeat(Math.max(1, columns - number.length())) + number;
    }

    static String format(String words, Object... values) {
        return String.format(Locale.ROOT, words, values);
    }

    @Override
    public String toString() {
        return text.toString();
    }
}
