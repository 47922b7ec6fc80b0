// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Element;
import org.w3c.dom.NamedNodeMap;
import tariff.chart.DrawnSvg.Box;

/** What holds for every chart, plain or hard to draw. */
class EveryChartTest {

    static Stream<Arguments> charts() {
        return SampleCharts.all().entrySet().stream().map(chart -> Arguments.of(chart.getKey(), chart.getValue()));
    }

    /** W3C SVG Accessibility API Mappings 1.0, section 5: name from title, description from desc, role img for a picture. */
    @ParameterizedTest(name = "{0}")
    @MethodSource("charts")
    void saysToAScreenReaderWhatItShows(String name, String svg) {
        DrawnSvg drawn = new DrawnSvg(svg);
        assertThat(drawn.root.getAttribute("role")).isEqualTo("img");
        String[] labels = drawn.root.getAttribute("aria-labelledby").split(" ", -1);
        assertThat(drawn.elements("title").get(0).getAttribute("id")).isEqualTo(labels[0]);
        assertThat(drawn.elements("desc").get(0).getAttribute("id")).isEqualTo(labels[1]);
        assertThat(drawn.elements("title").get(0).getTextContent()).isNotBlank();
        assertThat(drawn.elements("desc").get(0).getTextContent()).isNotBlank();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("charts")
    void needsNothingOutsideItselfAndRunsNothing(String name, String svg) {
        DrawnSvg drawn = new DrawnSvg(svg);
        assertThat(drawn.elements("script")).isEmpty();
        List<String> ids = drawn.everything().stream()
                .map(each -> each.getAttribute("id"))
                .filter(id -> !id.isEmpty())
                .toList();
        assertThat(ids).doesNotHaveDuplicates();
        for (Element each : drawn.everything()) {
            NamedNodeMap attributes = each.getAttributes();
            for (int i = 0; i < attributes.getLength(); i++) {
                assertThat(attributes.item(i).getNodeName())
                        .doesNotStartWith("on")
                        .doesNotContain("href");
                Matcher used = Pattern.compile("url\\(#(.*)\\)")
                        .matcher(attributes.item(i).getNodeValue());
                if (used.matches()) {
                    assertThat(ids).contains(used.group(1));
                }
            }
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("charts")
    void drawsNothingOutsideItsSheet(String name, String svg) {
        DrawnSvg drawn = new DrawnSvg(svg);
        double width = DrawnSvg.at(drawn.root, "width");
        double height = DrawnSvg.at(drawn.root, "height");
        assertThat(drawn.root.getAttribute("viewBox"))
                .isEqualTo("0 0 " + drawn.root.getAttribute("width") + " " + drawn.root.getAttribute("height"));
        assertThat(Stream.concat(drawn.textBoxes().stream(), drawn.shapeBoxes().stream()))
                .hasSizeGreaterThan(5)
                .allMatch(box -> box.left() >= 0 && box.top() >= 0 && box.right() <= width && box.bottom() <= height);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("charts")
    void noTwoTextsMeet(String name, String svg) {
        List<Box> texts = new DrawnSvg(svg).textBoxes();
        for (int i = 0; i < texts.size(); i++) {
            Box one = texts.get(i);
            assertThat(texts.subList(i + 1, texts.size())).noneMatch(one::meets);
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("charts")
    void textIsLargeEnoughToReadAndNumbersHaveTwoDecimalsAtMost(String name, String svg) {
        assertThat(new DrawnSvg(svg).elements("text"))
                .allMatch(text -> Integer.parseInt(text.getAttribute("font-size")) >= 11);
        assertThat(Pattern.compile("\\d\\.\\d{3}").matcher(svg).find()).isFalse();
        assertThat(svg).doesNotContain("NaN").doesNotContain("Infinity");
    }

    @Test
    void theSameNumbersGiveTheSameBytes() {
        Map<String, String> once = SampleCharts.all();
        assertThat(SampleCharts.all()).containsExactlyEntriesOf(once);
    }
}
