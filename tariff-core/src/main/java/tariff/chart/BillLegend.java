// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.List;
import tariff.chart.Sheet.Anchor;

/** Names and sums of the layers beside a bill, in the order of the stack. */
record BillLegend(List<BillChart.Layer> lines, double width) {
    private static final double SWATCH = 22;
    private static final double ROW = 15;
    private static final double GAP = 10;

    double height() {
        return lines.stream().mapToDouble(this::height).sum()
                + ROW * hatchedWords().size()
                + GAP;
    }

    void draw(Sheet sheet, Patterns patterns, double x, double top) {
        double y = top;
        for (int i = lines.size() - 1; i >= 0; i--) {
            sheet.rect(x, y, SWATCH, SWATCH * 0.7, patterns.area(i), Ink.TEXT);
            write(sheet, x, y, names(lines.get(i)));
            y += height(lines.get(i));
        }
        sheet.rect(x, y, SWATCH, SWATCH * 0.7, patterns.hatch(), Ink.TEXT);
        write(sheet, x, y, hatchedWords());
    }

    private void write(Sheet sheet, double x, double y, List<String> words) {
        double at = y + 12;
        for (String line : words) {
            sheet.text(x + SWATCH + 8, at, Lettering.PLAIN, Anchor.START, line);
            at += ROW;
        }
    }

    private double height(BillChart.Layer line) {
        return ROW * names(line).size() + GAP;
    }

    private List<String> names(BillChart.Layer line) {
        return Lettering.wrapped(line.name() + " " + Numbers.money(line.total()), room(), Lettering.PLAIN);
    }

    private List<String> hatchedWords() {
        double sum = lines.stream().mapToDouble(BillChart.Layer::totalReactive).sum();
        return Lettering.wrapped("of which because of reactive load " + Numbers.money(sum), room(), Lettering.PLAIN);
    }

    private double room() {
        return width - SWATCH - 8;
    }
}
