// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.util.stream.IntStream;
import tariff.chart.DurationChart;
import tariff.correction.CapacitorBank;
import tariff.meter.IntervalSeries;

/** The reactive demand of interval data as a duration curve, with a bank drawn in. */
public final class DurationOfDemand {
    private DurationOfDemand() {}

    /**
     * The curve of lagging − leading kvar over the intervals that were recorded. A bank with switched steps follows the load, and a time
     * switch takes one off in hours that the curve does not tell apart, so only one without either is drawn as always on.
     *
     * @throws IllegalArgumentException if no interval was recorded
     */
    public static DurationChart chart(String title, IntervalSeries series, CapacitorBank bank) {
        double[] rising = IntStream.range(0, series.size())
                .filter(i -> !series.isAbsent(i))
                .mapToDouble(i ->
                        kvarh(series, series.scaledLaggingKvarh(i) - series.scaledLeadingKvarh(i)) * series.perHour())
                .sorted()
                .toArray();
        double[] falling = IntStream.range(0, rising.length)
                .mapToDouble(i -> rising[rising.length - 1 - i])
                .toArray();
        return new DurationChart(
                title,
                (double) falling.length / series.perHour(),
                falling,
                bank.effectiveKvar().doubleValue(),
                !bank.isAutomatic() && bank.off().isEmpty());
    }

    private static double kvarh(IntervalSeries series, long scaled) {
        return series.decimal(scaled).doubleValue();
    }
}
