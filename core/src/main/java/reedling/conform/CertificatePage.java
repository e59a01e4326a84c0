// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.util.Locale;

/** A certificate as one page of HTML without anything from outside. */
public final class CertificatePage {

    private static final String STYLE = """
            body { font: 16px/1.5 system-ui, sans-serif; color: #1c2326; background: #fff; max-width: 60rem; margin: 2rem auto;
                   padding: 0 1rem; }
            h1 { font-size: 1.6rem; margin-bottom: 0; } h2 { font-size: 1.15rem; margin: 2rem 0 .5rem; }
            p { margin: .3rem 0; } .source, .note { color: #4a565b; font-size: .9rem; }
            .verdict { display: inline-block; margin: 1rem 0; padding: .3rem .8rem; border-radius: .3rem; font-weight: 600; }
            .pass { background: #ddf0e0; color: #14532d; } .fail { background: #fbdfdc; color: #7f1d1d; }
            table { border-collapse: collapse; width: 100%; }
            td, th { text-align: left; vertical-align: top; padding: .35rem .6rem .35rem 0; border-bottom: 1px solid #d7dddf; }
            td.mark { width: 4rem; font-weight: 600; } td.good { color: #14532d; } td.bad { color: #7f1d1d; }
            .charts { display: grid; grid-template-columns: repeat(auto-fit, minmax(26rem, 1fr)); gap: 1.5rem; }
            figure { margin: 0; } figcaption { font-weight: 600; } svg { width: 100%; height: auto; }
            """;

    private final StringBuilder page = new StringBuilder();

    private CertificatePage() {}

    /** The whole page. */
    public static String of(Certificate certificate) {
        CertificatePage page = new CertificatePage();
        page.write(certificate);
        return page.page.toString();
    }

    private void write(Certificate certificate) {
        String name = escape(certificate.plugin().name());
        line("<!DOCTYPE html>");
        line("<html lang=\"en\"><head><meta charset=\"utf-8\">"
                + "<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">");
        line("<title>Certificate of " + name + "</title><style>" + STYLE + "</style></head><body>");
        line("<h1>" + name + "</h1>");
        line("<p>" + escape(certificate.plugin().summary()) + "</p>");
        line("<p class=\"source\">" + escape(certificate.plugin().kind()) + " plugin, version "
                + escape(certificate.plugin().version()) + ". Source: "
                + escape(certificate.plugin().source()) + "</p>");
        line("<p class=\"verdict " + (certificate.passed() ? "pass" : "fail") + "\">" + escape(certificate.verdict())
                + "</p>");
        checks(certificate);
        certificate.speed().ifPresent(speed -> line("<h2>Cost</h2><p>" + escape(speed.text()) + "</p>"));
        if (!certificate.charts().isEmpty()) {
            line("<h2>What it does</h2><div class=\"charts\">");
            certificate.charts().forEach(this::chart);
            line("</div>");
        }
        line("<h2>How it was tried</h2>");
        certificate.setting().forEach(one -> line("<p class=\"note\">" + escape(one) + "</p>"));
        line("<p class=\"note\">Jar: " + escape(certificate.plugin().jar()) + "</p>");
        line("</body></html>");
    }

    private void checks(Certificate certificate) {
        line("<h2>Checks</h2><table>");
        for (LawTrial.Result result : certificate.results()) {
            StringBuilder words = new StringBuilder(escape(result.outcome().measured()));
            result.outcome()
                    .findings()
                    .forEach(finding ->
                            words.append("<br><b>").append(escape(finding)).append("</b>"));
            line(String.format(
                    Locale.ROOT,
                    "<tr><td class=\"mark %s\">%s</td><td>%s</td><td>%s</td></tr>",
                    result.passed() ? "good" : "bad",
                    result.passed() ? "pass" : "FAIL",
                    escape(result.check()),
                    words));
        }
        line("</table>");
    }

    private void chart(Chart chart) {
        line("<figure><figcaption>" + escape(chart.title()) + "</figcaption>");
        line(Drawing.of(chart));
        line("<p class=\"note\">" + escape(chart.note()) + "</p></figure>");
    }

    private void line(String text) {
        page.append(text).append('\n');
    }

    static String escape(String text) {
        return text.replace("&", "&amp;")
                .replace("<", "&lt;")
                .replace(">", "&gt;")
                .replace("\"", "&quot;");
    }
}
