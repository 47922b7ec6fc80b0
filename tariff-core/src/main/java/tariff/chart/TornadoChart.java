// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.List;
import java.util.stream.Stream;
import tariff.chart.Sheet.Anchor;
import tariff.chart.Sheet.Heading;

/**
 * How far a result moves when one input at a time is lower or higher than thought. Bars are drawn in the order given, which should be the
 * widest first.
 *
 * @param title over the chart
 * @param measure what the bars show, with its unit
 * @param lower what is done to an input for the plain bars: {@code 20 % lower}
 * @param higher the same for the hatched bars
 * @param expected the result with all inputs as thought
 * @param bars one for each input, at least one
 */
public record TornadoChart(String title, String measure, String lower, String higher, double expected, List<Bar> bars) {
    private static final double WIDTH = 920;
    private static final double ROW = 46;
    private static final double BAR = 17;
    private static final double WIDEST_NAME = 180;
    private static final double GAP = 6;

    /**
     * One input.
     *
     * @param input its name
     * @param whenLower the result when it is lower
     * @param whenHigher the result when it is higher
     */
    public record Bar(String input, double whenLower, double whenHigher) {}

    /** Throws {@link IllegalArgumentException} without a bar or for a number that cannot be drawn. */
    public TornadoChart {
        bars = List.copyOf(bars);
        if (bars.isEmpty()) {
            throw new IllegalArgumentException("a tornado needs at least one bar");
        }
        Numbers.check(
                title,
                Stream.concat(
                                Stream.of(expected),
                                bars.stream().flatMap(bar -> Stream.of(bar.whenLower, bar.whenHigher)))
                        .toList());
    }

    /** The chart as an SVG file. */
    public String svg() {
        Heading heading = new Heading(title, measure);
        double names = Math.min(
                WIDEST_NAME, Lettering.widest(bars.stream().map(Bar::input).toList(), Lettering.PLAIN));
        double values = Lettering.widest(
                        bars.stream()
                                .flatMap(bar -> Stream.of(bar.whenLower, bar.whenHigher))
                                .map(Numbers::money)
                                .toList(),
                        Lettering.SMALL)
                + GAP;
        double keyTop = heading.bottom(WIDTH);
        double keyHeight = key("none", "none").height(Sheet.MARGIN, WIDTH - Sheet.MARGIN);
        double top = keyTop + keyHeight + 24;
        double left = Sheet.MARGIN + names + 12 + values;
        double right = WIDTH - Sheet.MARGIN - values;
        double bottom = top + ROW * bars.size();
        Frame frame = new Frame(left, top, right, bottom, reach(), Axis.holding(0, 1, 1));
        Sheet sheet = new Sheet("tornado", heading, description(), WIDTH, bottom + Frame.FOOT);
        Patterns patterns = new Patterns(sheet, 1);
        key(patterns.area(0), patterns.hatch()).draw(sheet, Sheet.MARGIN, WIDTH - Sheet.MARGIN, keyTop);
        for (double tick : frame.x().ticks()) {
            sheet.line(frame.atX(tick), top, frame.atX(tick), bottom, Ink.FAINT, 0.8, "none");
        }
        frame.drawX(sheet, measure);
        for (int i = 0; i < bars.size(); i++) {
            draw(sheet, frame, patterns, bars.get(i), top + ROW * i + 6);
        }
        sheet.line(frame.atX(expected), top - 6, frame.atX(expected), bottom, Ink.TEXT, 1.6, "none");
        expectedLabel(sheet, frame.atX(expected), top - 10);
        return sheet.finish();
    }

    private void expectedLabel(Sheet sheet, double x, double y) {
        String words = "as expected " + Numbers.money(expected);
        double half = Lettering.width(words, Lettering.PLAIN) / 2;
        double middle = Math.max(Sheet.MARGIN + half, Math.min(sheet.width() - Sheet.MARGIN - half, x));
        sheet.text(middle, y, Lettering.PLAIN, Anchor.MIDDLE, words);
    }

    private void draw(Sheet sheet, Frame frame, Patterns patterns, Bar bar, double y) {
        List<String> names = Lettering.wrapped(bar.input, WIDEST_NAME, Lettering.PLAIN);
        double at = y + BAR + 4 - 7.5 * (names.size() - 1);
        for (String name : names) {
            sheet.text(Sheet.MARGIN, at, Lettering.PLAIN, Anchor.START, name);
            at += 15;
        }
        half(sheet, frame, patterns.area(0), bar.whenLower, y);
        half(sheet, frame, patterns.hatch(), bar.whenHigher, y + BAR);
    }

    private void half(Sheet sheet, Frame frame, String fill, double value, double y) {
        double from = frame.atX(Math.min(expected, value));
        double to = frame.atX(Math.max(expected, value));
        sheet.rect(from, y, to - from, BAR, fill, Ink.TEXT);
        boolean rightwards = value >= expected;
        sheet.text(
                rightwards ? to + GAP : from - GAP,
                y + 13,
                Lettering.SMALL,
                rightwards ? Anchor.START : Anchor.END,
                Numbers.money(value));
    }

    private Key key(String plain, String hatched) {
        return new Key(List.of(
                new Key.Entry(List.of(plain), "input " + lower), new Key.Entry(List.of(hatched), "input " + higher)));
    }

    private Axis reach() {
        double low = bars.stream()
                .mapToDouble(bar -> Math.min(bar.whenLower, bar.whenHigher))
                .reduce(expected, Math::min);
        double high = bars.stream()
                .mapToDouble(bar -> Math.max(bar.whenLower, bar.whenHigher))
                .reduce(expected, Math::max);
        return Axis.holding(low, high, 8);
    }

    private String description() {
        StringBuilder words = new StringBuilder(measure + ", as expected " + Numbers.money(expected) + ".");
        for (Bar bar : bars) {
            words.append(' ').append(bar.input).append(": ").append(Numbers.money(bar.whenLower));
            words.append(" when ").append(lower).append(", ").append(Numbers.money(bar.whenHigher));
            words.append(" when ").append(higher).append('.');
        }
        return words.toString();
    }
}
