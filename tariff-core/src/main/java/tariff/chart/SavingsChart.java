// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.List;
import tariff.chart.Sheet.Heading;

/**
 * What a bank saves a year against its size, with rings at the kinks and flags where a clause stops paying.
 *
 * @param title over the chart
 * @param currency of the savings
 * @param kvar sizes of the bank, rising, at least one
 * @param curves savings at each size
 * @param flags sizes worth a word
 */
public record SavingsChart(String title, String currency, List<Double> kvar, List<Curve> curves, List<Flag> flags) {
    public SavingsChart {
        kvar = List.copyOf(kvar);
        Numbers.check("kvar", kvar);
        curves = List.copyOf(curves);
        flags = List.copyOf(flags);
    }

    /** The chart as an SVG file. */
    public String svg() {
        Heading heading =
                new Heading(title, currency + " saved in a settled year, by size of the bank; rings mark kinks");
        return new CurvePlot("savings", heading, description(), "kvar of the bank", axis(), kvar, curves, flags).svg();
    }

    private Axis axis() {
        double most = kvar.stream().mapToDouble(Double::doubleValue).max().orElse(0);
        return Axis.holding(0, most, 10);
    }

    private String description() {
        StringBuilder words = new StringBuilder("Curves of yearly savings in " + currency + " against kvar.");
        for (Curve curve : curves) {
            double best = curve.values().stream()
                    .mapToDouble(Double::doubleValue)
                    .max()
                    .orElse(0);
            words.append(' ').append(curve.name()).append(": at most ").append(Numbers.money(best));
            words.append(" at ")
                    .append(Numbers.measure(kvar.get(curve.values().indexOf(best))))
                    .append(" kvar.");
        }
        flags.forEach(flag -> words.append(' ').append(flag.words()).append('.'));
        return words.toString();
    }
}
