// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import tariff.bill.Bills;
import tariff.chart.Markup;
import tariff.proposal.Assessment;

/** A report carries nothing in from outside, fetches nothing, and has an end. */
class ReportFromOutsideTest {
    private static final String HOSTILE =
            "</title></style><script>alert(1)</script><img src=x onerror='alert(2)'>&amp;\u202e";

    @ParameterizedTest
    @MethodSource("tariff.report.ReportTest#reports")
    void nothingIsFetched(Report report) {
        String html = report.html().replace("xmlns=\"http://www.w3.org/2000/svg\"", "");
        assertThat(html)
                .doesNotContainPattern(Pattern.compile("<(script|link|iframe|object|embed|img|base|form|use|image)\\b"))
                .doesNotContainPattern("\\s(src|srcset|action|data|poster|on[a-z]+|xlink:href)=")
                .doesNotContainPattern("href=\"(?!#)")
                .doesNotContainPattern("url\\((?!#)")
                .doesNotContainPattern("@import|https?:|javascript:");
        assertThat(html).contains("content=\"default-src &#39;none&#39;; style-src &#39;unsafe-inline&#39;;");
    }

    @Test
    void namesStayNames() {
        String rate =
                Bills.rate(Handed.LINES).replace("Worked example", HOSTILE).replace("Reactive demand", HOSTILE);
        String html = Report.of(Assessment.of(Handed.billing(HOSTILE, rate), Handed.year(), Handed.proposal()))
                .html();
        assertThat(html)
                .doesNotContain("<script", "<img")
                .contains("&lt;/title&gt;&lt;/style&gt;&lt;script&gt;alert(1)&lt;/script&gt;");
        Pages page = Pages.read(html);
        assertThat(page.texts("title").get(0)).endsWith("onerror='alert(2)'>&amp;\ufffd");
        assertThat(page.rows("bill-lines").get(2).get(0)).startsWith("</title></style><script>");
    }

    @ParameterizedTest
    @CsvSource({
        "<, &lt;",
        "&, &amp;",
        "'\"', &quot;",
        "'''', &#39;",
        "'\u0001', \ufffd",
        "\u0085, \ufffd",
        "\u2067, \ufffd",
        "\ud800, \ufffd"
    })
    void whatIsMarkupBecomesWords(String given, String written) {
        assertThat(Markup.escaped(given)).isEqualTo(written);
    }

    /** Forty lines under a ratchet that leans on its own past: each month looks at eleven before it, which do the same. */
    @Test
    void aLongPastIsWorkedOutOnlySoFar() {
        String ratchet = "'quantities': { 'billed': { 'largest': [ { 'peak': 'kW' }, { 'share': 0.8, 'of':"
                + " { 'earlier': 'highest', 'of': 'billed', 'months': 11 } } ] } },";
        String lines = IntStream.range(0, 40)
                .mapToObj(i -> "{ 'name': 'Demand " + i + "', 'quantity': 'billed', 'price': 1 }")
                .collect(Collectors.joining(","));
        String rate = Bills.rate("'billing': { 'from': 'energies' }", ratchet, lines);
        String html = Report.of(Assessment.of(Handed.billing("", rate), Handed.year(), Handed.proposal()))
                .html();
        assertThat(html.length()).isLessThan(400_000);
        assertThat(html).contains("(worked out above)");
    }
}
