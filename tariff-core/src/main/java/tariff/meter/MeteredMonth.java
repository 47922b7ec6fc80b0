// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.YearMonth;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * One billing period as the meter and the bill give it.
 *
 * @param period the days billed
 * @param totals the registers over the whole period
 * @param windows the registers of each time-of-use window that the bill prints, by the rate's name for the window
 * @param charged what the utility asked for, if known
 * @param statementDate the day printed on the bill, if known; some rates choose the season by it
 * @param estimated whether the bill says that a reading was estimated
 * @param detail the hours and days inside, if interval data are known; never kept when readings are changed
 */
public record MeteredMonth(
        Period period,
        Readings totals,
        Map<String, Readings> windows,
        Charged charged,
        Optional<LocalDate> statementDate,
        boolean estimated,
        Optional<Detail> detail)
        implements Comparable<MeteredMonth> {

    /** What is inside a period. */
    @FunctionalInterface
    public interface Detail {
        /** The energies of each part in whole numbers, if they are at hand. */
        default Optional<CutEnergies> energies(Cut cut) {
            return Optional.empty();
        }

        /** The period cut into hours, days …, each with registers of its own, in order. */
        List<MeteredMonth> each(Cut cut);
    }

    public MeteredMonth {
        windows = Collections.unmodifiableMap(new TreeMap<>(windows));
    }

    /** A month of totals, without interval data. */
    public MeteredMonth(
            Period period,
            Readings totals,
            Map<String, Readings> windows,
            Charged charged,
            Optional<LocalDate> statementDate,
            boolean estimated) {
        this(period, totals, windows, charged, statementDate, estimated, Optional.empty());
    }

    public MeteredMonth(Period period, Readings totals) {
        this(period, totals, Map.of(), Charged.nothingKnown(), Optional.empty(), false);
    }

    /** A calendar month without readings, to add them to: {@code MeteredMonth.of("2026-03").with(PEAK_KW, "400")}. */
    public static MeteredMonth of(String month) {
        return new MeteredMonth(Period.of(YearMonth.parse(month)), Readings.none());
    }

    /** The whole period's register, or the window's if a window is named. */
    public Optional<BigDecimal> get(Register register, Optional<String> window) {
        if (window.isEmpty()) {
            return totals.get(register);
        }
        return Optional.ofNullable(windows.get(window.get())).flatMap(readings -> readings.get(register));
    }

    public MeteredMonth with(Register register, String value) {
        return with(totals.with(register, value));
    }

    public MeteredMonth with(Register register, long value) {
        return with(totals.with(register, value));
    }

    public MeteredMonth with(Readings newTotals) {
        return new MeteredMonth(period, newTotals, windows, charged, statementDate, estimated, Optional.empty());
    }

    public MeteredMonth withWindow(String name, Readings readings) {
        TreeMap<String, Readings> all = new TreeMap<>(windows);
        all.put(name, readings);
        return withWindows(all);
    }

    public MeteredMonth withWindows(Map<String, Readings> newWindows) {
        return new MeteredMonth(period, totals, newWindows, charged, statementDate, estimated, Optional.empty());
    }

    public MeteredMonth withCharged(Charged newCharged) {
        return new MeteredMonth(period, totals, windows, newCharged, statementDate, estimated, detail);
    }

    public MeteredMonth withDetail(Detail newDetail) {
        return new MeteredMonth(period, totals, windows, charged, statementDate, estimated, Optional.of(newDetail));
    }

    @Override
    public int compareTo(MeteredMonth other) {
        return period.compareTo(other.period);
    }
}
