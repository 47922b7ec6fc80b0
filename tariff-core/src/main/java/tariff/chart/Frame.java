// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.List;
import tariff.chart.Sheet.Anchor;

/** The rectangle that values are drawn in, with its axes. */
record Frame(double left, double top, double right, double bottom, Axis x, Axis y) {
    /** px below the frame that the x axis takes. */
    static final double FOOT = 44;

    private static final double GAP = 8;

    /** px left of a frame that the labels of a y axis take. */
    static double leftOf(Axis y) {
        return Sheet.MARGIN + y.labelWidth(Lettering.PLAIN) + GAP;
    }

    double atX(double value) {
        return left + x.share(value) * (right - left);
    }

    double atY(double value) {
        return bottom - y.share(value) * (bottom - top);
    }

    /** Grid, labels of the y axis and the line of nothing. */
    void drawY(Sheet sheet) {
        for (double tick : y.ticks()) {
            sheet.line(left, atY(tick), right, atY(tick), Ink.FAINT, 0.8, "none");
            sheet.text(left - GAP, atY(tick) + 4, Lettering.PLAIN, Anchor.END, y.label(tick));
        }
        sheet.line(left, atY(0), right, atY(0), Ink.TEXT, 1.2, "none");
    }

    /** Ticks and labels of the x axis, and what it counts. */
    void drawX(Sheet sheet, String counts) {
        List<Double> ticks = x.ticks();
        int every = every(ticks.size(), x.labelWidth(Lettering.PLAIN), (right - left) / (ticks.size() - 1));
        for (int i = 0; i < ticks.size(); i++) {
            double at = atX(ticks.get(i));
            sheet.line(at, bottom, at, bottom + 4, Ink.TEXT, 0.8, "none");
            if (i % every == 0) {
                sheet.text(at, bottom + 18, Lettering.PLAIN, Anchor.MIDDLE, x.label(ticks.get(i)));
            }
        }
        sheet.line(left, bottom, right, bottom, Ink.TEXT, 0.8, "none");
        sheet.text((left + right) / 2, bottom + 36, Lettering.PLAIN, Anchor.MIDDLE, counts);
    }

    /** Every how many labels there is room for one. */
    static int every(int labels, double labelWidth, double slot) {
        for (int every : new int[] {1, 2, 3, 4, 6, 12}) {
            if (every * slot >= labelWidth + GAP) {
                return every;
            }
        }
        return Math.max(1, labels);
    }
}
