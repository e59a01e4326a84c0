// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;
import reedling.unit.Dimension;
import reedling.unit.QuantityText;

/** Plain ASCII text of at most 80 columns: headings, figures in two columns, cautions. */
final class ForecastText {

    private static final int COLUMNS = 80;
    private static final int FIGURE_COLUMN = 27;
    private static final MathContext DIGITS = new MathContext(3);

    private final StringBuilder text = new StringBuilder();
    private int cautions;

    void heading(String words) {
        text.append('\n').append(words).append('\n');
    }

    void entry(String what, String figure) {
        broken(String.format(Locale.ROOT, "  %-24s %s", what, figure), FIGURE_COLUMN);
    }

    void line(String words) {
        broken(words, 4);
    }

    /** Something that its reader should look at before the run. */
    void caution(String words) {
        cautions++;
        broken("CAUTION: " + words, 4);
    }

    int cautions() {
        return cautions;
    }

    private void broken(String words, int hanging) {
        String rest = words;
        while (rest.length() > COLUMNS) {
            int end = rest.lastIndexOf(' ', COLUMNS);
            if (rest.substring(0, Math.max(0, end)).isBlank()) {
                break; // one long word
            }
            text.append(rest.substring(0, end).stripTrailing()).append('\n');
            rest = " ".repeat(hanging) + rest.substring(end + 1);
        }
        text.append(rest.stripTrailing()).append('\n');
    }

    /** Three digits and a unit. */
    static String figure(double value, Dimension dimension) {
        if (!Double.isFinite(value)) {
            return QuantityText.of(value, dimension);
        }
        double rounded = new BigDecimal(value).round(DIGITS).doubleValue();
        return QuantityText.of(rounded, dimension).replace('µ', 'u').replace('\u03bc', 'u');
    }

    static String number(double value) {
        if (Math.abs(value) >= 1000 && Math.abs(value) < 1e15) {
            return String.format(
                    Locale.ROOT, "%,d", new BigDecimal(value).round(DIGITS).longValue());
        }
        return figure(value, Dimension.NUMBER);
    }

    static String duration(double seconds) {
        return seconds < 120
                ? figure(seconds, Dimension.TIME)
                : seconds < 7200 ? number(seconds / 60) + " min" : number(seconds / 3600) + " h";
    }

    @Override
    public String toString() {
        return text.toString();
    }
}
