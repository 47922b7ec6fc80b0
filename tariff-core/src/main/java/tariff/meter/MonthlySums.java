// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import tariff.notice.Assumption;

/**
 * An interval series as the bill will see it: registers of billing periods, of their windows, and of the hours or days inside.
 *
 * <p>Sums are exact. kVAh are Σ√(kWh² + kvarh²) interval by interval with kvarh = lagging − leading, each root rounded half up
 * to the scale of the series. Peak kW, lagging kvar and leading kvar are the highest averages of their registers; peak kVA is
 * the highest √(kW² + (lagging − leading)²) of one demand interval. Only energy taken enters kVAh and kVA, not export. A window
 * that no interval of the period falls in has zeros; one whose intervals are all absent has no readings.
 *
 * @param series the meter
 * @param calendar the rate's windows
 * @param demand what a peak is averaged over
 * @param readOn when a billing period begins
 * @param apparentKvah whether kVAh are wanted: a root for each interval, which most rates do not need
 */
public record MonthlySums(
        IntervalSeries series,
        WindowCalendar calendar,
        DemandInterval demand,
        ReadingDay readOn,
        boolean apparentKvah) {
    /** @throws IllegalArgumentException if the series cannot give such a demand */
    public MonthlySums {
        demand.stepsIn(series);
    }

    /** Billing periods that are calendar months. */
    public MonthlySums(IntervalSeries series, WindowCalendar calendar, DemandInterval demand, boolean apparentKvah) {
        this(series, calendar, demand, ReadingDay.FIRST_OF_MONTH, apparentKvah);
    }

    /** No windows; calendar months; peaks over the step of the series. */
    public static MonthlySums of(IntervalSeries series) {
        return new MonthlySums(
                series, new WindowCalendar(series, Map.of()), DemandInterval.block(series.stepMinutes()), true);
    }

    /** The same questions to another series of the same intervals, such as the one behind a bank. */
    public MonthlySums on(IntervalSeries other) {
        return new MonthlySums(other, calendar, demand, readOn, apparentKvah);
    }

    /** The billing periods of the series; the first and the last only as far as it has days. */
    public List<MeteredMonth> months() {
        return months(readOn.periods(series.days()));
    }

    public List<MeteredMonth> months(List<Period> periods) {
        return periods.stream().map(this::month).toList();
    }

    /** The periods at the ends of the series that it holds only part of, which are billed as they stand. */
    public List<Assumption> partPeriods() {
        Period days = series.days();
        Period first = readOn.around(days.first());
        Period last = readOn.around(days.last());
        List<Assumption> parts = new ArrayList<>();
        if (series.start().isAfter(midnight(first.first()))) {
            parts.add(part(first));
        }
        if (series.end().isBefore(midnight(last.last().plusDays(1)))) {
            parts.add(part(last));
        }
        return parts.stream().distinct().toList();
    }

    private static Assumption part(Period whole) {
        return new Assumption(
                "part-period",
                whole.toString(),
                "the data hold only part of this billing period; it is billed as if that were all of it",
                "give data that begin and end with a billing period");
    }

    private Instant midnight(LocalDate date) {
        return date.atStartOfDay(series.zone()).toInstant();
    }

    /** The period's registers from the intervals that are present; see {@link IntervalSeries#coverage} for the others. */
    public MeteredMonth month(Period period) {
        return registers(period, series.range(period)).withDetail(new Inside(this, period));
    }

    /** The highest demands of the period. */
    public Peaks peaks(Period period) {
        return new Peaks(this, period);
    }

    /**
     * The period cut into hours or days by the clock, in order, each with registers of its own. One without a recorded interval
     * is left out.
     *
     * @throws IllegalArgumentException if an interval of the series is longer than the cut
     */
    public Stream<SubPeriod> each(Cut cut, Period period) {
        if (series.stepMinutes() > cut.minutes()) {
            throw new IllegalArgumentException(
                    "a series of " + series.stepMinutes() + " minutes has no " + cut.words());
        }
        return Stream.iterate(period.first(), date -> !date.isAfter(period.last()), date -> date.plusDays(1))
                .flatMap(date -> each(cut, date));
    }

    private Stream<SubPeriod> each(Cut cut, LocalDate date) {
        List<SubPeriod> parts = new ArrayList<>();
        cut(cut, date, (from, to, range) -> {
            MeteredMonth registers = registers(new Period(date, date), range);
            if (!registers.totals().values().isEmpty()) {
                parts.add(new SubPeriod(Instant.ofEpochSecond(from), Instant.ofEpochSecond(to), registers));
            }
        });
        return parts.stream();
    }

    /** What is done with a part of a day, from one second of the epoch to another. */
    interface Part {
        void visit(long from, long to, IntervalRange range);
    }

    /** Cuts a day by the clock; parts outside the series are passed over. */
    void cut(Cut cut, LocalDate date, Part part) {
        long midnight = date.atStartOfDay(series.zone()).toEpochSecond();
        long end = date.plusDays(1).atStartOfDay(series.zone()).toEpochSecond();
        long seconds = cut == Cut.DAYS ? end - midnight : 60L * cut.minutes();
        int next = series.firstFrom(midnight);
        for (long from = midnight; from < end; from += seconds) {
            long to = Math.min(from + seconds, end);
            int first = next;
            next = series.firstFrom(to);
            if (next > first) {
                part.visit(from, to, new IntervalRange(first, next));
            }
        }
    }

    private MeteredMonth registers(Period period, IntervalRange range) {
        MeteredMonth month =
                new MeteredMonth(period, range.size() == 0 ? Readings.none() : Tally.readings(this, range, 0));
        if (calendar.names().isEmpty() || month.totals().values().isEmpty()) {
            return month;
        }
        Map<String, Readings> windows = new TreeMap<>();
        for (String name : calendar.names()) {
            windows.put(name, Tally.readings(this, range, calendar.bit(name)));
        }
        return month.withWindows(windows);
    }
}
