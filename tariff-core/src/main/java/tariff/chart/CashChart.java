// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.List;
import java.util.stream.IntStream;
import tariff.chart.Sheet.Heading;

/**
 * The running sum of what a bank costs and saves, month by month, with the month of payback marked.
 *
 * @param title over the chart
 * @param currency of the sums
 * @param curves the sum at the end of each month, month 0 first; a marked month is that of payback
 */
public record CashChart(String title, String currency, List<Curve> curves) {
    private static final double YEAR = 12;

    /** Throws {@link IllegalArgumentException} without a curve. */
    public CashChart {
        curves = List.copyOf(curves);
        if (curves.isEmpty()) {
            throw new IllegalArgumentException("a chart of cash needs at least one curve");
        }
    }

    /** The chart as an SVG file. */
    public String svg() {
        int months = curves.get(0).values().size();
        List<Double> years =
                IntStream.range(0, months).mapToObj(month -> month / YEAR).toList();
        List<Flag> flags = curves.stream()
                .flatMap(curve -> curve.marked().stream().map(month -> new Flag(month / YEAR, payback(curve, month))))
                .toList();
        Heading heading = new Heading(title, currency + ", running sum of cost and savings");
        return new CurvePlot(
                        "cash",
                        heading,
                        description(),
                        "years in service",
                        Axis.whole(0, (months - 1) / YEAR, 12),
                        years,
                        curves,
                        flags)
                .svg();
    }

    private static String payback(Curve curve, int month) {
        return curve.name() + ": paid back in month " + month;
    }

    private String description() {
        StringBuilder words = new StringBuilder("Running sums in " + currency + " month by month.");
        for (Curve curve : curves) {
            words.append(" At the end of the life ").append(curve.label()).append("; ");
            words.append(
                    curve.marked().isEmpty()
                            ? "not paid back."
                            : "paid back in month " + curve.marked().get(0) + ".");
        }
        return words.toString();
    }
}
