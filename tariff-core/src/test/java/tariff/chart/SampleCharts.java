// SPDX-License-Identifier: Apache-2.0
package tariff.chart;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;

/** Charts of invented numbers, plain ones and such as are hard to draw. */
final class SampleCharts {
    private SampleCharts() {}

    static Map<String, String> all() {
        Map<String, String> charts = new LinkedHashMap<>();
        charts.put("bill of a year", bill(12, 5).svg());
        charts.put("bill of one month", bill(1, 3).svg());
        charts.put("bill of three years", bill(36, 4).svg());
        charts.put("bill of eleven lines", bill(12, 11).svg());
        charts.put(
                "bill of nothing",
                new BillChart("Nothing", "EUR", List.of("Jan"), List.of(layer("Energy", 1, 0))).svg());
        charts.put("bill in large amounts", largeBill().svg());
        charts.put("savings", savings(1).svg());
        charts.put("savings below zero", savings(-1).svg());
        charts.put("savings of nothing", savings(0).svg());
        charts.put(
                "savings of one size",
                new SavingsChart(
                                "One size",
                                "EUR",
                                List.of(0.0),
                                List.of(new Curve("central", List.of(5.0), List.of())),
                                List.of())
                        .svg());
        charts.put("savings with many flags", manyFlags().svg());
        charts.put("cash of fifteen years", cash(15).svg());
        charts.put("cash of one year", cash(1).svg());
        charts.put("cash of sixty years", cash(60).svg());
        charts.put("duration, always on", duration(35_040, true).svg());
        charts.put("duration, switched", duration(35_040, false).svg());
        charts.put("duration of one demand", new DurationChart("One", 1, new double[] {40}, 0, true).svg());
        charts.put("duration of nothing", new DurationChart("None", 8760, new double[100], 0, true).svg());
        charts.put("tornado", tornado().svg());
        charts.put(
                "tornado without swing",
                new TornadoChart(
                                "Flat",
                                "net present value, EUR",
                                "lower",
                                "higher",
                                0,
                                List.of(new TornadoChart.Bar("Savings", 0, 0)))
                        .svg());
        return charts;
    }

    static BillChart.Layer layer(String name, int months, double amount) {
        return new BillChart.Layer(name, Collections.nCopies(months, amount), Collections.nCopies(months, amount / 4));
    }

    static BillChart bill(int months, int lines) {
        List<BillChart.Layer> layers = new ArrayList<>();
        String[] names = {
            "Energy, \"day\" & night <all>",
            "Demand",
            "Reactive energy",
            "Power factor adjustment",
            "Tax",
            "Standing charge",
            "Fuel rider for the month before",
            "Metering",
            "Credit for primary metering",
            "Levy",
            "Street lighting"
        };
        for (int line = 0; line < lines; line++) {
            int size = line == 3 || line == 8 ? -500 : 6000 / (line + 1);
            int at = line;
            layers.add(new BillChart.Layer(
                    names[line],
                    IntStream.range(0, months)
                            .mapToObj(m -> size * (1 + 0.3 * StrictMath.sin(m + at)))
                            .toList(),
                    Collections.nCopies(months, line == 0 ? 0.0 : 400.0)));
        }
        return new BillChart("Harbourside cold store, year of bills", "EUR", names(months), layers);
    }

    private static List<String> names(int months) {
        return IntStream.range(0, months)
                .mapToObj(m -> String.format("%d-%02d", 2023 + m / 12, m % 12 + 1))
                .toList();
    }

    private static BillChart largeBill() {
        return new BillChart(
                "A title so long that it must be broken into two lines, because the name of the site, of its utility and of the rate are"
                        + " all in it",
                "JPY",
                names(12),
                List.of(
                        layer(
                                "A name of a line of the bill that is as long as they come, with several clauses in it",
                                12,
                                9e8),
                        layer("Averyveryverylongwordthatcannotbebrokenatanyspacewhatsoever", 12, -1e8)));
    }

    static SavingsChart savings(int sign) {
        List<Double> kvar = IntStream.rangeClosed(0, 40).mapToObj(i -> i * 9.0).toList();
        List<Curve> curves = new ArrayList<>();
        double[] slope = {40, 60, 80};
        String[] names = {"low", "central", "high"};
        for (int i = 0; i < 3; i++) {
            double most = 10_000 + 1000 * i;
            double per = slope[i];
            curves.add(new Curve(
                    names[i],
                    kvar.stream()
                            .map(q -> sign * (Math.min(q * per, most) - Math.max(0, q - 300) * 20))
                            .toList(),
                    i == 1 ? List.of(20) : List.of()));
        }
        return new SavingsChart(
                "Savings by size of the bank",
                "EUR",
                kvar,
                curves,
                List.of(new Flag(180, "Reactive energy stops at 180 kvar"), new Flag(300, "Demand stops at 300 kvar")));
    }

    private static SavingsChart manyFlags() {
        SavingsChart plain = savings(1);
        List<Flag> flags = new ArrayList<>();
        for (int i = 0; i < 8; i++) {
            flags.add(new Flag(
                    100 + 30 * i, "Power factor adjustment, clause " + i + ", stops at " + (100 + 30 * i) + " kvar"));
        }
        flags.add(new Flag(
                360,
                "A line of the bill with a name so long that it cannot be written in full above any chart at all"));
        return new SavingsChart("Many flags", "EUR", plain.kvar(), plain.curves(), flags);
    }

    static CashChart cash(int years) {
        List<Curve> curves = new ArrayList<>();
        String[] names = {"low", "central", "high"};
        for (int i = 0; i < 3; i++) {
            double monthly = 150.0 * i;
            curves.add(new Curve(
                    names[i],
                    IntStream.rangeClosed(0, 12 * years)
                            .mapToObj(m -> -3000 + monthly * m - (m >= 96 ? 1000.0 : 0))
                            .toList(),
                    i == 0 || 20 / i > 12 * years ? List.of() : List.of(20 / i)));
        }
        return new CashChart("Cost and savings of 150 kvar", "EUR", curves);
    }

    static DurationChart duration(int intervals, boolean alwaysOn) {
        double[] kvar = DoubleStream.iterate(0, i -> i < intervals, i -> i + 1)
                .map(i -> 300 * StrictMath.pow(1 - i / intervals, 1.5) - 20)
                .toArray();
        return new DurationChart("Reactive demand in 2025", 8760, kvar, 150, alwaysOn);
    }

    static TornadoChart tornado() {
        return new TornadoChart(
                "What the verdict hangs on",
                "net present value, EUR",
                "20 % lower",
                "20 % higher",
                12_345,
                List.of(
                        new TornadoChart.Bar("Savings", -2_000, 26_000),
                        new TornadoChart.Bar("Cost of purchase and of installation, all in", 15_000, 9_000),
                        new TornadoChart.Bar("Discount rate", 14_000, 11_000),
                        new TornadoChart.Bar("Upkeep", 12_600, 12_100),
                        new TornadoChart.Bar("Escalation", 12_345, 12_345)));
    }
}
