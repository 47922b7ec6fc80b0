// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.DoubleStream;
import tariff.chart.Sheet.Anchor;
import tariff.chart.Sheet.Heading;

/**
 * The duration curve of reactive demand with a bank drawn in: how many hours the lagging kvar were at least so high, what the bank takes of
 * them, what it leaves, and what it sends back where it is always on.
 */
public final class DurationChart {
    private static final double WIDTH = 920;
    private static final double PLOT_HEIGHT = 320;
    private static final int MOST_POINTS = 400;

    private final String title;
    private final double hours;
    private final double[] laggingKvar;
    private final double bankKvar;
    private final boolean alwaysOn;

    /**
     * A chart of demands and a bank.
     *
     * @param title over the chart
     * @param hours that the demands cover, above 0
     * @param laggingKvar demands of equal intervals, falling; below zero where the site sends kvar back; at least one
     * @param bankKvar of the bank, 0 or more
     * @param alwaysOn whether the bank stays on where less is drawn than it gives
     * @throws IllegalArgumentException for demands that are none or do not fall, hours or kvar out of range
     */
    public DurationChart(String title, double hours, double[] laggingKvar, double bankKvar, boolean alwaysOn) {
        Numbers.check("the demand", DoubleStream.of(laggingKvar).boxed().toList());
        Numbers.check("the bank", List.of(bankKvar, hours));
        if (laggingKvar.length == 0 || hours <= 0 || bankKvar < 0) {
            throw new IllegalArgumentException(
                    "a duration curve needs a demand, hours above 0 and a bank of 0 kvar or more");
        }
        for (int i = 1; i < laggingKvar.length; i++) {
            if (laggingKvar[i] > laggingKvar[i - 1]) {
                throw new IllegalArgumentException(
                        "a duration curve falls; demand " + i + " is above the one before it");
            }
        }
        this.title = title;
        this.hours = hours;
        this.laggingKvar = laggingKvar.clone();
        this.bankKvar = bankKvar;
        this.alwaysOn = alwaysOn;
    }

    /** The chart as an SVG file. */
    public String svg() {
        Heading heading = new Heading(title, "lagging kvar reached or exceeded, by hours");
        Axis y = Axis.holding(laggingKvar[laggingKvar.length - 1], Math.max(laggingKvar[0], bankKvar), 6);
        String bank = "bank " + Numbers.measure(bankKvar) + " kvar";
        double left = Frame.leftOf(y);
        double right = WIDTH - Sheet.MARGIN - 12 - Lettering.width(bank, Lettering.PLAIN);
        double keyTop = heading.bottom(WIDTH);
        double top = keyTop + key("none", "none", "none").height(left, WIDTH - Sheet.MARGIN) + 10;
        Frame frame = new Frame(left, top, right, top + PLOT_HEIGHT, Axis.holding(0, hours, 10), y);
        Sheet sheet = new Sheet("duration", heading, description(), WIDTH, frame.bottom() + Frame.FOOT);
        Patterns patterns = new Patterns(sheet, 3);
        key(patterns.hatch(), patterns.area(0), patterns.area(2)).draw(sheet, left, WIDTH - Sheet.MARGIN, keyTop);
        frame.drawY(sheet);
        area(sheet, frame, patterns.area(0), q -> Math.max(q, bankKvar), q -> bankKvar);
        area(sheet, frame, patterns.hatch(), this::taken, q -> 0);
        if (alwaysOn) {
            area(sheet, frame, patterns.area(2), q -> bankKvar, this::taken);
        }
        frame.drawX(sheet, "hours");
        sheet.svg.leaf(
                "polyline",
                "points",
                String.join(" ", points(frame, q -> q)),
                "fill",
                "none",
                "stroke",
                Ink.of(0).colour(),
                "stroke-width",
                2);
        sheet.line(
                left,
                frame.atY(bankKvar),
                right,
                frame.atY(bankKvar),
                Ink.of(1).colour(),
                2,
                Ink.of(1).dash());
        sheet.text(right + 8, frame.atY(bankKvar) + 4, Lettering.PLAIN, Anchor.START, bank);
        return sheet.finish();
    }

    private double taken(double kvar) {
        return Math.max(0, Math.min(kvar, bankKvar));
    }

    private Key key(String taken, String left, String sent) {
        Key.Entry off = new Key.Entry(List.of(taken), "taken off by the bank");
        Key.Entry kept = new Key.Entry(List.of(left), "left");
        Key.Entry back = new Key.Entry(List.of(sent), "sent back by the bank");
        return new Key(alwaysOn ? List.of(off, kept, back) : List.of(off, kept));
    }

    private void area(Sheet sheet, Frame frame, String fill, DoubleUnaryOperator upper, DoubleUnaryOperator lower) {
        List<String> back = new ArrayList<>(points(frame, lower));
        Collections.reverse(back);
        String outline = String.join(" ", points(frame, upper)) + " " + String.join(" ", back);
        sheet.svg.leaf("polygon", "points", outline, "fill", fill, "stroke", "none");
    }

    /** Two points for each demand drawn, where its hours begin and where they end. */
    private List<String> points(Frame frame, DoubleUnaryOperator height) {
        int drawn = Math.min(MOST_POINTS, laggingKvar.length);
        List<String> points = new ArrayList<>();
        for (int i = 0; i < drawn; i++) {
            int at = drawn == 1 ? 0 : (int) ((long) i * (laggingKvar.length - 1) / (drawn - 1));
            double y = frame.atY(height.applyAsDouble(laggingKvar[at]));
            points.add(point(frame.atX(hours * i / drawn), y));
            points.add(point(frame.atX(hours * (i + 1) / drawn), y));
        }
        return points;
    }

    private static String point(double x, double y) {
        return Numbers.coordinate(x) + "," + Numbers.coordinate(y);
    }

    private String description() {
        double interval = hours / laggingKvar.length;
        double off = Arrays.stream(laggingKvar).map(this::taken).sum() * interval;
        double all = Arrays.stream(laggingKvar).map(q -> Math.max(0, q)).sum() * interval;
        return "Duration curve over " + Numbers.measure(hours) + " hours, from " + Numbers.measure(laggingKvar[0])
                + " to "
                + Numbers.measure(laggingKvar[laggingKvar.length - 1]) + " kvar. A bank of "
                + Numbers.measure(bankKvar) + " kvar takes off " + Numbers.shown(off, 0) + " of "
                + Numbers.shown(all, 0) + " lagging kvarh"
                + (alwaysOn
                        ? " and sends back " + Numbers.shown(bankKvar * hours - off, 0) + " kvarh, as it is always on."
                        : ".");
    }
}
