// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.List;
import tariff.chart.Sheet.Anchor;
import tariff.chart.Sheet.Heading;

/**
 * Curves over one x axis, each with its dash, its marker and its name at its end.
 *
 * @param kind of chart, a word for ids
 * @param counts what the x axis counts
 * @param places of all curves on the x axis, rising, at least one
 */
record CurvePlot(
        String kind,
        Heading heading,
        String description,
        String counts,
        Axis x,
        List<Double> places,
        List<Curve> curves,
        List<Flag> flags) {
    private static final double WIDTH = 920;
    private static final double PLOT_HEIGHT = 320;
    private static final double LABEL_GAP = 12;
    private static final int MARKERS = 6;

    CurvePlot {
        if (places.isEmpty()) {
            throw new IllegalArgumentException("a chart of curves needs at least one place");
        }
        for (Curve curve : curves) {
            if (curve.values().size() != places.size()) {
                throw new IllegalArgumentException(
                        curve.name() + " has " + curve.values().size() + " values for " + places.size() + " places");
            }
        }
    }

    String svg() {
        Axis y = Axis.holding(extreme(false), extreme(true), 6);
        double labels = Lettering.widest(curves.stream().map(Curve::label).toList(), Lettering.PLAIN);
        double right = WIDTH - Sheet.MARGIN - LABEL_GAP - labels;
        Frame across = new Frame(Frame.leftOf(y), 0, right, 1, x, y);
        Flags placed = new Flags(
                flags.stream()
                        .map(flag -> new Flag(across.atX(flag.place()), flag.words()))
                        .toList(),
                WIDTH - Sheet.MARGIN);
        double top = heading.bottom(WIDTH) + placed.height() + 8;
        Frame frame = new Frame(across.left(), top, right, top + PLOT_HEIGHT, x, y);
        Sheet sheet = new Sheet(kind, heading, description, WIDTH, frame.bottom() + Frame.FOOT);
        frame.drawY(sheet);
        frame.drawX(sheet, counts);
        placed.drawPoles(sheet, top, frame.bottom());
        for (int i = 0; i < curves.size(); i++) {
            draw(sheet, frame, curves.get(i), i);
        }
        drawNames(sheet, frame);
        placed.drawWords(sheet, top);
        return sheet.finish();
    }

    private void draw(Sheet sheet, Frame frame, Curve curve, int series) {
        Ink ink = Ink.of(series);
        StringBuilder points = new StringBuilder();
        for (int i = 0; i < places.size(); i++) {
            points.append(i == 0 ? "" : " ")
                    .append(Numbers.coordinate(frame.atX(places.get(i))))
                    .append(',')
                    .append(Numbers.coordinate(frame.atY(curve.values().get(i))));
        }
        sheet.svg.open("g", "class", "series");
        sheet.svg.text(curve.name(), "title");
        sheet.svg.leaf(
                "polyline",
                "points",
                points,
                "fill",
                "none",
                "stroke",
                ink.colour(),
                "stroke-width",
                2,
                "stroke-dasharray",
                ink.dash());
        int every = Math.max(1, places.size() / MARKERS);
        for (int i = (every * (series + 1)) / (curves.size() + 1); i < places.size(); i += every) {
            sheet.marker(frame.atX(places.get(i)), frame.atY(curve.values().get(i)), ink);
        }
        for (int i : curve.marked()) {
            sheet.ring(frame.atX(places.get(i)), frame.atY(curve.values().get(i)), ink);
        }
        sheet.svg.close();
    }

    private void drawNames(Sheet sheet, Frame frame) {
        double[] wanted = curves.stream()
                .mapToDouble(curve -> frame.atY(curve.values().get(places.size() - 1)))
                .toArray();
        double[] at = Lettering.spread(wanted, 18, frame.top(), frame.bottom());
        double end = frame.atX(places.get(places.size() - 1));
        for (int i = 0; i < wanted.length; i++) {
            sheet.line(
                    end,
                    wanted[i],
                    frame.right() + LABEL_GAP - 4,
                    at[i],
                    Ink.of(i).colour(),
                    0.8,
                    "none");
            sheet.text(
                    frame.right() + LABEL_GAP,
                    at[i] + 4,
                    Lettering.PLAIN,
                    Anchor.START,
                    curves.get(i).label());
        }
    }

    private double extreme(boolean highest) {
        double extreme = 0;
        for (Curve curve : curves) {
            for (double value : curve.values()) {
                extreme = highest ? Math.max(extreme, value) : Math.min(extreme, value);
            }
        }
        return extreme;
    }
}
