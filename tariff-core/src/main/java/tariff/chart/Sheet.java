// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.zip.CRC32;

/** A sheet of white paper with a title, on which a chart is drawn; places are px from the upper left corner. */
final class Sheet {
    static final double MARGIN = 16;
    private static final double LINE = 20;
    private static final String FACES = "Arial, Helvetica, 'Liberation Sans', 'DejaVu Sans', sans-serif";

    /** What stands left, centred or right of a place. */
    enum Anchor {
        START("start"),
        MIDDLE("middle"),
        END("end");

        private final String word;

        Anchor(String word) {
            this.word = word;
        }
    }

    final Svg svg = new Svg();
    private final String id;
    private final double width;

    /**
     * A sheet with its heading.
     *
     * @param kind of chart, a word for ids
     * @param description for those who do not see the chart
     */
    Sheet(String kind, Heading heading, String description, double width, double height) {
        this.width = width;
        this.id = kind + "-" + fingerprint(heading.title() + description);
        svg.open(
                "svg",
                "xmlns",
                "http://www.w3.org/2000/svg",
                "viewBox",
                "0 0 " + Numbers.coordinate(width) + " " + Numbers.coordinate(height),
                "width",
                width,
                "height",
                height,
                "role",
                "img",
                "aria-labelledby",
                id("title") + " " + id("desc"),
                "font-family",
                FACES,
                "fill",
                Ink.TEXT);
        svg.text(heading.title(), "title", "id", id("title"));
        svg.text(description, "desc", "id", id("desc"));
        svg.leaf("rect", "x", 0.0, "y", 0.0, "width", width, "height", height, "fill", Ink.PAPER);
        double y = MARGIN + Lettering.TITLE;
        for (String line : heading.titleLines(width)) {
            text(MARGIN, y, Lettering.TITLE, Anchor.START, line);
            y += LINE;
        }
        for (String line : heading.subtitleLines(width)) {
            text(MARGIN, y, Lettering.PLAIN, Anchor.START, line);
            y += LINE;
        }
    }

    /** Title and unit of a chart. */
    record Heading(String title, String subtitle) {
        private List<String> titleLines(double width) {
            return Lettering.wrapped(title, width - 2 * MARGIN, Lettering.TITLE);
        }

        private List<String> subtitleLines(double width) {
            return Lettering.wrapped(subtitle, width - 2 * MARGIN, Lettering.PLAIN);
        }

        /** px from the top to where the chart may begin. */
        double bottom(double width) {
            return MARGIN
                    + LINE * (titleLines(width).size() + subtitleLines(width).size())
                    + 14;
        }
    }

    /** Ids differ from sheet to sheet, so that several may stand in one page. */
    String id(String name) {
        return id + "-" + name;
    }

    double width() {
        return width;
    }

    void text(double x, double y, int size, Anchor anchor, String words) {
        svg.text(words, "text", "x", x, "y", y, "font-size", size, "text-anchor", anchor.word);
    }

    void line(double x1, double y1, double x2, double y2, String colour, double thickness, String dash) {
        svg.leaf(
                "line",
                "x1",
                x1,
                "y1",
                y1,
                "x2",
                x2,
                "y2",
                y2,
                "stroke",
                colour,
                "stroke-width",
                thickness,
                "stroke-dasharray",
                dash);
    }

    void rect(double x, double y, double width, double height, String fill, String stroke) {
        svg.leaf(
                "rect",
                "x",
                x,
                "y",
                y,
                "width",
                width,
                "height",
                height,
                "fill",
                fill,
                "stroke",
                stroke,
                "stroke-width",
                0.8);
    }

    void marker(double x, double y, Ink ink) {
        svg.leaf(
                "path",
                "transform",
                "translate(" + Numbers.coordinate(x) + " " + Numbers.coordinate(y) + ")",
                "d",
                ink.marker(),
                "fill",
                ink.colour(),
                "stroke",
                ink.colour(),
                "stroke-width",
                0.8);
    }

    /** A ring around a point that matters. */
    void ring(double x, double y, Ink ink) {
        svg.leaf("circle", "cx", x, "cy", y, "r", 6.5, "fill", "none", "stroke", ink.colour(), "stroke-width", 1.8);
    }

    /** Finishes the sheet. */
    String finish() {
        svg.close();
        return svg.toString();
    }

    private static String fingerprint(String words) {
        CRC32 sum = new CRC32();
        sum.update(words.getBytes(StandardCharsets.UTF_8));
        return Long.toHexString(sum.getValue());
    }
}
