// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.time.YearMonth;
import java.time.ZoneId;
import java.time.temporal.ChronoUnit;

/**
 * A billing period, both days included.
 *
 * @param first the first day billed
 * @param last the last day billed, not before the first
 */
public record Period(LocalDate first, LocalDate last) implements Comparable<Period> {

    /** @throws IllegalArgumentException if the last day is before the first */
    public Period {
        if (last.isBefore(first)) {
            throw new IllegalArgumentException("a period from " + first + " cannot end on " + last);
        }
    }

    public static Period of(YearMonth month) {
        return new Period(month.atDay(1), month.atEndOfMonth());
    }

    /** Days billed, at least 1. */
    public int days() {
        return (int) ChronoUnit.DAYS.between(first, last) + 1;
    }

    /** Hours from the first midnight to the last by a clock: the hour that daylight saving skips or repeats is counted so. */
    public BigDecimal hours(ZoneId zone) {
        return MinutesHeld.hours(ChronoUnit.MINUTES.between(
                first.atStartOfDay(zone), last.plusDays(1).atStartOfDay(zone)));
    }

    /** The calendar month that holds most of the period's days, the earlier of two that hold as many. */
    public YearMonth month() {
        YearMonth best = YearMonth.from(first);
        long most = 0;
        for (YearMonth each = best; !each.isAfter(YearMonth.from(last)); each = each.plusMonths(1)) {
            long days = overlap(Period.of(each));
            if (days > most) {
                most = days;
                best = each;
            }
        }
        return best;
    }

    /** Whether the period is exactly one calendar month. */
    public boolean isCalendarMonth() {
        return equals(of(YearMonth.from(first)));
    }

    /** Days that both periods hold, 0 if they are apart. */
    public long overlap(Period other) {
        LocalDate from = first.isAfter(other.first) ? first : other.first;
        LocalDate to = last.isBefore(other.last) ? last : other.last;
        return Math.max(0, ChronoUnit.DAYS.between(from, to) + 1);
    }

    /** The words for this period, others and a last one: {@code 2026-01 to 2026-03}, by days unless both ends are calendar months. */
    public String through(Period end) {
        if (equals(end)) {
            return toString();
        }
        return isCalendarMonth() && end.isCalendarMonth() ? this + " to " + end : first + " to " + end.last;
    }

    @Override
    public int compareTo(Period other) {
        int byFirst = first.compareTo(other.first);
        return byFirst != 0 ? byFirst : last.compareTo(other.last);
    }

    /** {@code 2026-03} for a calendar month, else {@code 2026-03-05 to 2026-04-04}. */
    @Override
    public String toString() {
        return isCalendarMonth() ? YearMonth.from(first).toString() : first + " to " + last;
    }
}
