// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.List;
import tariff.chart.Sheet.Anchor;

/** A row of swatches with words, broken into rows where it is too wide. */
record Key(List<Entry> entries) {
    private static final double SWATCH = 22;
    private static final double ROW = 22;
    private static final double GAP = 20;

    /** A swatch's fills, one over the other, and its words. */
    record Entry(List<String> fills, String words) {
        private double width() {
            return SWATCH + 8 + Lettering.width(words, Lettering.PLAIN) + GAP;
        }
    }

    /** px that it takes. */
    double height(double left, double right) {
        return walk(left, right, 0, (entry, x, y) -> {}) + ROW;
    }

    void draw(Sheet sheet, double left, double right, double top) {
        walk(left, right, top, (entry, x, y) -> {
            entry.fills().forEach(fill -> sheet.rect(x, y, SWATCH, 14, fill, Ink.TEXT));
            sheet.text(x + SWATCH + 8, y + 11, Lettering.PLAIN, Anchor.START, entry.words());
        });
    }

    private double walk(double left, double right, double top, Step step) {
        double x = left;
        double y = top;
        for (Entry entry : entries) {
            if (x > left && x + entry.width() - GAP > right) {
                x = left;
                y += ROW;
            }
            step.at(entry, x, y);
            x += entry.width();
        }
        return y;
    }

    private interface Step {
        void at(Entry entry, double x, double y);
    }
}
