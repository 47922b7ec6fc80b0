// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.time.format.TextStyle;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import tariff.bill.LineCost;
import tariff.bill.PowerFactorCost;
import tariff.bill.StatementLine;
import tariff.chart.BillChart;
import tariff.chart.CashChart;
import tariff.chart.Curve;
import tariff.chart.Flag;
import tariff.chart.SavingsChart;
import tariff.correction.Estimate;
import tariff.meter.Period;
import tariff.payback.Appraisal;

/** Charts of an assessment. */
public final class ProposalCharts {
    private static final double KINK = 0.25;

    private ProposalCharts() {}

    /**
     * All of them as SVG documents by name: {@code bill}, {@code savings}, and {@code cash} where there is a payback to speak of.
     *
     * @param proposedKvar marked among the sizes, if it lies within them
     */
    public static Map<String, String> documents(
            Assessment assessment, SavingsBySize bySize, Optional<BigDecimal> proposedKvar) {
        Map<String, String> all = new LinkedHashMap<>();
        all.put("bill", bill(assessment).svg());
        String title = titled(assessment, "Savings by size of the bank");
        all.put("savings", savings(title, bySize, proposedKvar).svg());
        cash(assessment).ifPresent(chart -> all.put("cash", chart.svg()));
        return Collections.unmodifiableMap(all);
    }

    /** The bills as they are, by line, with what each pays for being short of unity. */
    public static BillChart bill(Assessment assessment) {
        List<PowerFactorCost.Month> months = assessment.today().months();
        List<List<LineCost>> costs = months.stream().map(LineCost::of).toList();
        List<StatementLine> lines = months.get(0).asItIs().lines();
        List<BillChart.Layer> layers = new ArrayList<>();
        for (int i = 0; i < lines.size(); i++) {
            int line = i;
            if (!lines.get(line).shownOnly()) {
                layers.add(new BillChart.Layer(
                        lines.get(line).name(),
                        doubles(costs.stream().map(month -> month.get(line).asItIs())),
                        doubles(costs.stream().map(month -> month.get(line).toUnity()))));
            }
        }
        List<Period> periods =
                months.stream().map(month -> month.asItIs().month().period()).toList();
        String span = periods.get(0).through(periods.get(periods.size() - 1));
        return new BillChart(
                titled(assessment, "Bills " + span), assessment.billing().rate().currency(), names(periods), layers);
    }

    /** The running sum of cost and savings; empty where there is no payback to speak of. */
    public static Optional<CashChart> cash(Assessment assessment) {
        List<Curve> curves = assessment.appraisals().entrySet().stream()
                .map(ProposalCharts::cash)
                .toList();
        String bank = plain(assessment.proposal().bank().ratedKvar()) + " kvar";
        return curves.isEmpty()
                ? Optional.empty()
                : Optional.of(new CashChart(
                        titled(assessment, "Cost and savings of " + bank),
                        assessment.billing().rate().currency(),
                        curves));
    }

    /**
     * Savings by size of the bank, with its kinks and where each line stops paying.
     *
     * @param proposedKvar marked too, if it lies within the sizes
     */
    public static SavingsChart savings(String title, SavingsBySize bySize, Optional<BigDecimal> proposedKvar) {
        List<Double> kvar = doubles(bySize.sizes().stream().map(SavingsBySize.Size::kvar));
        List<Curve> curves = Arrays.stream(Estimate.values())
                .map(estimate -> {
                    List<Double> saved = doubles(bySize.sizes().stream().map(size -> size.total(estimate)));
                    return new Curve(word(estimate), saved, kinks(saved));
                })
                .toList();
        Stream<Flag> stops = bySize.stops(Estimate.CENTRAL).stream()
                .map(stop -> new Flag(
                        stop.kvar().doubleValue(), stop.line() + " stops paying at " + plain(stop.kvar()) + " kvar"));
        Stream<Flag> proposed = proposedKvar
                .filter(size -> size.doubleValue() <= kvar.get(kvar.size() - 1))
                .map(size -> new Flag(size.doubleValue(), "proposed: " + plain(size) + " kvar"))
                .stream();
        return new SavingsChart(
                title,
                bySize.currency(),
                kvar,
                curves,
                Stream.concat(stops, proposed).toList());
    }

    /** Where the slope changes by a quarter of the steepest at least, and by more than at either side. */
    static List<Integer> kinks(List<Double> values) {
        double[] bends = new double[values.size()];
        double steepest = 0;
        for (int i = 1; i < values.size(); i++) {
            steepest = Math.max(steepest, Math.abs(values.get(i) - values.get(i - 1)));
            if (i < values.size() - 1) {
                bends[i] = Math.abs(values.get(i + 1) - 2 * values.get(i) + values.get(i - 1));
            }
        }
        List<Integer> kinks = new ArrayList<>();
        for (int i = 1; i < values.size() - 1; i++) {
            if (bends[i] > KINK * steepest && bends[i] >= bends[i - 1] && bends[i] > bends[i + 1]) {
                kinks.add(i);
            }
        }
        return kinks;
    }

    private static Curve cash(Map.Entry<Estimate, Appraisal> each) {
        List<Integer> payback =
                each.getValue().payback().lasting().optional().stream().toList();
        return new Curve(word(each.getKey()), doubles(each.getValue().flow().cumulative().stream()), payback);
    }

    /** Jan to Dec where that says enough, else the periods. */
    private static List<String> names(List<Period> periods) {
        List<String> monthNames = periods.stream()
                .map(period -> period.month().getMonth().getDisplayName(TextStyle.SHORT, Locale.ENGLISH))
                .toList();
        boolean enough = monthNames.stream().distinct().count() == periods.size();
        return enough ? monthNames : periods.stream().map(Period::toString).toList();
    }

    private static String titled(Assessment assessment, String title) {
        String site = assessment.billing().site().name();
        return site.isBlank() ? title : site + ": " + title;
    }

    private static String word(Estimate estimate) {
        return estimate.name().toLowerCase(Locale.ROOT);
    }

    private static String plain(BigDecimal number) {
        return number.stripTrailingZeros().toPlainString();
    }

    private static List<Double> doubles(Stream<BigDecimal> amounts) {
        return amounts.map(BigDecimal::doubleValue).toList();
    }
}
