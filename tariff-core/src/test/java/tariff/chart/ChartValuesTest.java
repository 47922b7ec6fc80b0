// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.w3c.dom.Element;
import org.w3c.dom.Node;

/** That a chart shows its numbers, and tells its series apart without colour. Own arithmetic. */
class ChartValuesTest {

    /** 400, of which 100 reactive, and 200 in credit: heights as 4 : 1 : 2. */
    @Test
    void columnsAreAsHighAsTheirAmounts() {
        BillChart chart = new BillChart(
                "Bill",
                "EUR",
                List.of("Jan"),
                List.of(
                        new BillChart.Layer("Demand", List.of(400.0), List.of(100.0)),
                        new BillChart.Layer("Credit", List.of(-200.0), List.of(50.0))));
        DrawnSvg drawn = new DrawnSvg(chart.svg());
        List<Element> bars = drawn.elements("rect").stream()
                .filter(rect -> rect.getParentNode().getNodeName().equals("g"))
                .toList();
        assertThat(bars).hasSize(3);
        double unit = DrawnSvg.at(bars.get(0), "height") / 4;
        assertThat(DrawnSvg.at(bars.get(1), "height")).isCloseTo(unit, within(0.02));
        assertThat(DrawnSvg.at(bars.get(2), "height")).isCloseTo(2 * unit, within(0.02));
        assertThat(DrawnSvg.at(bars.get(1), "y")).isEqualTo(DrawnSvg.at(bars.get(0), "y"));
        assertThat(bars.get(1).getAttribute("fill")).endsWith("-hatch)");
        assertThat(bars.get(0).getAttribute("fill")).isNotEqualTo(bars.get(2).getAttribute("fill"));
        assertThat(drawn.words()).contains("Demand 400.00", "Credit −200.00");
        assertThat(String.join(" ", drawn.words())).contains("of which because of reactive load 150.00");
    }

    @Test
    void namesAreEscapedAndKeptWhole() {
        String svg = SampleCharts.bill(12, 5).svg();
        assertThat(svg).contains("Energy, &quot;day&quot; &amp; night &lt;all&gt;");
        assertThat(new DrawnSvg(svg).words()).contains("Energy, \"day\" & night <all>");
        assertThat(Markup.escaped("a\u0000b\tc")).isEqualTo("a\uFFFDb c");
    }

    @Test
    void everyLineOfTheBillHasAPatternOfItsOwn() {
        DrawnSvg drawn = new DrawnSvg(SampleCharts.bill(12, 11).svg());
        List<String> patterns = drawn.elements("pattern").stream()
                .filter(pattern -> pattern.getAttribute("id").contains("-area"))
                .map(pattern -> tile(pattern))
                .toList();
        assertThat(patterns).hasSize(8).doesNotHaveDuplicates();
        assertThat(drawn.words()).anyMatch(words -> words.startsWith("Other lines"));
    }

    /** Stroke paths tell patterns apart; the two plain ones differ in lightness, as grey paper shows it. */
    private static String tile(Element pattern) {
        Node path = pattern.getElementsByTagName("path").item(0);
        Element rect = (Element) pattern.getElementsByTagName("rect").item(0);
        return path == null ? rect.getAttribute("fill") : ((Element) path).getAttribute("d");
    }

    @Test
    void everyCurveHasADashAMarkerAndItsNameAtItsEnd() {
        DrawnSvg drawn = new DrawnSvg(SampleCharts.savings(1).svg());
        List<Element> curves = drawn.elements("polyline");
        assertThat(curves).hasSize(3);
        assertThat(curves.stream().map(curve -> curve.getAttribute("stroke-dasharray")))
                .doesNotHaveDuplicates();
        assertThat(curves.stream()
                        .map(curve -> ((Element) ((Element) curve.getParentNode())
                                        .getElementsByTagName("path")
                                        .item(0))
                                .getAttribute("d")))
                .doesNotHaveDuplicates();
        assertThat(drawn.words()).contains("low: 8,800", "central: 9,800", "high: 10,800");
        assertThat(drawn.words()).contains("Reactive energy stops at 180 kvar", "Demand stops at 300 kvar");
    }

    /** −3,000 at the start, 0 in month 20: the ring of payback sits on the line of nothing, at 20 ÷ 180 of the width to year 15. */
    @Test
    void theRingOfPaybackSitsWhereTheSumReachesNothing() {
        DrawnSvg drawn = new DrawnSvg(SampleCharts.cash(15).svg());
        Element ring = drawn.elements("circle").get(0);
        String[] points =
                drawn.elements("polyline").get(1).getAttribute("points").split(" ", -1);
        double first = Double.parseDouble(points[0].split(",", -1)[0]);
        double last = Double.parseDouble(points[180].split(",", -1)[0]);
        assertThat(DrawnSvg.at(ring, "cx")).isCloseTo(first + (last - first) * 20 / 180, within(0.02));
        double nothing = drawn.elements("line").stream()
                .filter(line -> line.getAttribute("stroke-width").equals("1.2"))
                .mapToDouble(line -> DrawnSvg.at(line, "y1"))
                .findFirst()
                .orElseThrow();
        assertThat(DrawnSvg.at(ring, "cy")).isCloseTo(nothing, within(0.02));
        assertThat(drawn.words()).contains("central: paid back in month 20", "high: paid back in month 10");
    }

    /** 4 hours at 40, 30, 20, 10 kvar and a bank of 25: 25 + 25 + 20 + 10 = 80 of 100 kvarh off, 100 − 80 = 20 sent back. */
    @Test
    void theDurationCurveCountsWhatTheBankTakes() {
        String always = new DurationChart("Load", 4, new double[] {40, 30, 20, 10}, 25, true).svg();
        assertThat(new DrawnSvg(always).elements("desc").get(0).getTextContent())
                .isEqualTo(
                        "Duration curve over 4 hours, from 40 to 10 kvar. A bank of 25 kvar takes off 80 of 100 lagging kvarh and"
                                + " sends back 20 kvarh, as it is always on.");
        assertThat(new DrawnSvg(always).words()).contains("sent back by the bank", "bank 25 kvar");
        String switched = new DurationChart("Load", 4, new double[] {40, 30, 20, 10}, 25, false).svg();
        assertThat(new DrawnSvg(switched).words()).doesNotContain("sent back by the bank");
    }

    /** From 12,345 to 26,000 and to −2,000: 13,655 against 14,345. */
    @Test
    void barsOfATornadoAreAsLongAsTheSwing() {
        DrawnSvg drawn = new DrawnSvg(SampleCharts.tornado().svg());
        List<Element> bars = drawn.elements("rect").stream()
                .filter(rect -> rect.getAttribute("height").equals("17"))
                .toList();
        assertThat(bars).hasSize(10);
        assertThat(DrawnSvg.at(bars.get(1), "width") / DrawnSvg.at(bars.get(0), "width"))
                .isCloseTo(13_655.0 / 14_345, within(0.001));
        assertThat(drawn.words()).contains("as expected 12,345.00", "−2,000.00", "26,000.00", "input 20 % lower");
    }

    @ParameterizedTest
    @CsvSource({
        // low, high, about | step, first, last, label of the last; own arithmetic
        "0, 9400, 6, 2000, 0, 10000, '10,000'",
        "-500, 9400, 6, 2000, -2000, 10000, '10,000'",
        "0, 0.07, 6, 0.02, 0, 0.08, 0.08",
        "0, 1.4, 6, 0.25, 0, 1.5, 1.50",
        "0, 0, 6, 0.2, 0, 1, 1.0",
        "-3, -1, 6, 0.5, -3, 0, 0.0"
    })
    void ticksAreRoundNumbersThatHoldTheValues(
            double low, double high, int about, double step, double first, double last, String label) {
        Axis axis = Axis.holding(low, high, about);
        assertThat(axis.step()).isCloseTo(step, within(1e-12));
        assertThat(axis.ticks().get(0)).isCloseTo(first, within(1e-12));
        double end = axis.ticks().get(axis.ticks().size() - 1);
        assertThat(end).isCloseTo(last, within(1e-12));
        assertThat(axis.label(end)).isEqualTo(label);
    }

    @Test
    void whatCannotBeDrawnIsRefused() {
        assertThatThrownBy(() -> new BillChart("Bill", "EUR", List.of(), List.of()))
                .hasMessage("a chart of bills needs at least one month");
        assertThatThrownBy(() ->
                        new BillChart("Bill", "EUR", List.of("Jan", "Feb"), List.of(SampleCharts.layer("Tax", 1, 1))))
                .hasMessage("Tax has 1 amounts and 1 reactive parts for 2 months");
        assertThatThrownBy(() -> new Curve("low", List.of(Double.NaN), List.of()))
                .hasMessage("low holds NaN; a chart needs finite numbers");
        assertThatThrownBy(() -> new Curve("low", List.of(1.0), List.of(1)))
                .hasMessage("low has 1 values; no mark can stand at 1");
        assertThatThrownBy(() -> new DurationChart("Load", 2, new double[] {1, 2}, 0, false))
                .hasMessage("a duration curve falls; demand 1 is above the one before it");
        assertThatThrownBy(() -> new TornadoChart("T", "EUR", "lower", "higher", 0, List.of()))
                .hasMessage("a tornado needs at least one bar");
    }
}
