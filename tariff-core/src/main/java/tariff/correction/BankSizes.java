// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.TreeMap;
import java.util.function.IntPredicate;
import tariff.meter.IntervalRange;
import tariff.meter.IntervalSeries;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.meter.Period;
import tariff.meter.Readings;
import tariff.meter.Register;

/**
 * What the meter would have recorded of a month behind a fixed bank of any size, always on: from one sorting of the month's intervals
 * in place of a walk for every size. Equal to {@link BankYear} for every size, but for the rounding of a bank's energy in 5- and 10-minute
 * intervals. Lives for one question, on one thread.
 */
public final class BankSizes {
    private final MonthlySums sums;
    private final IntervalSeries series;
    private final Map<Period, Month> known = new HashMap<>();

    private record Month(Stretch whole, Map<String, Stretch> windows) {}

    private record Stretch(BankCurve energies, DemandFront demands) {}

    /** @throws IllegalArgumentException if the sums are not {@link #suits suited} */
    public BankSizes(MonthlySums sums) {
        if (!suits(sums)) {
            throw new IllegalArgumentException(
                    "kVAh, or demands of more than one interval, cannot be had from one sorting");
        }
        this.sums = sums;
        this.series = sums.series();
    }

    /** Whether one sorting gives all that is asked: a kVAh is a root for each interval, and a longer demand a sum of many corners. */
    public static boolean suits(MonthlySums sums) {
        return !sums.apparentKvah() && sums.demand().stepsIn(sums.series()) == 1;
    }

    /**
     * The month behind the bank. What is inside it, hours and days, is left out.
     *
     * @param before one of the months of the sums, without the bank
     * @param kvar effective output, 0 to 1,000,000 kvar; rounded half up to the decimals of the series
     */
    public MeteredMonth month(MeteredMonth before, BigDecimal kvar) {
        Month month = known.computeIfAbsent(before.period(), this::sorted);
        BigDecimal bank = kvar.setScale(series.scale(), RoundingMode.HALF_UP);
        Map<String, Readings> windows = new TreeMap<>(before.windows());
        windows.replaceAll((name, readings) ->
                behind(readings, Objects.requireNonNull(month.windows().get(name)), bank));
        return new MeteredMonth(before.period(), behind(before.totals(), month.whole(), bank)).withWindows(windows);
    }

    private Readings behind(Readings before, Stretch stretch, BigDecimal kvar) {
        if (!before.has(Register.LAGGING_KVARH) || stretch.energies().isEmpty()) {
            return before;
        }
        BankCurve.Point energies = stretch.energies().after(kvar);
        long bank = BankWalk.scaledKvarh(series, kvar);
        int perHour = series.perHour();
        DemandFront demands = stretch.demands();
        return before.with(Register.LAGGING_KVARH, energies.laggingKvarh())
                .with(Register.LEADING_KVARH, energies.leadingKvarh())
                .with(Register.PEAK_LAGGING_KVAR, series.decimal(demands.lagging(bank) * perHour))
                .with(Register.PEAK_LEADING_KVAR, series.decimal(demands.leading(bank) * perHour))
                .with(Register.PEAK_KVA, series.decimal(demands.apparent(bank, perHour)));
    }

    private Month sorted(Period period) {
        IntervalRange range = series.range(period);
        Map<String, Stretch> windows = new HashMap<>();
        sums.calendar()
                .names()
                .forEach(
                        name -> windows.put(name, stretch(range, sums.calendar().bit(name))));
        return new Month(stretch(range, 0), windows);
    }

    private Stretch stretch(IntervalRange range, long window) {
        IntPredicate chosen = i -> (sums.calendar().mask(i) & window) == window;
        List<DemandFront.Interval> intervals = new ArrayList<>();
        for (int i = range.from(); i < range.to(); i++) {
            if (!series.isAbsent(i) && chosen.test(i)) {
                long lag = series.scaledLaggingKvarh(i);
                long lead = series.scaledLeadingKvarh(i);
                intervals.add(new DemandFront.Interval(series.scaledKwh(i), lag - lead, Math.min(lag, lead)));
            }
        }
        return new Stretch(new BankCurve(series, range, chosen), new DemandFront(intervals));
    }
}
