// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;

/**
 * The day of the month on which a billing period begins; the period ends the day before the next.
 *
 * @param day 1 to 28, so that every month has it
 */
public record ReadingDay(int day) {
    public static final int LAST = 28;
    /** Periods that are calendar months. */
    public static final ReadingDay FIRST_OF_MONTH = new ReadingDay(1);

    /** @throws IllegalArgumentException if a month could be without the day */
    public ReadingDay {
        if (day < 1 || day > LAST) {
            throw new IllegalArgumentException("a period that begins on day " + day + "; allowed: 1 to " + LAST);
        }
    }

    /** The whole period that a date lies in. */
    public Period around(LocalDate date) {
        LocalDate here = date.withDayOfMonth(day);
        LocalDate start = here.isAfter(date) ? here.minusMonths(1) : here;
        return new Period(start, start.plusMonths(1).minusDays(1));
    }

    /** The periods that the days lie in, in order; the first and the last only as far as the days go. */
    public List<Period> periods(Period days) {
        List<Period> periods = new ArrayList<>();
        for (LocalDate next = days.first(); !next.isAfter(days.last()); ) {
            LocalDate last = around(next).last();
            periods.add(new Period(next, last.isAfter(days.last()) ? days.last() : last));
            next = last.plusDays(1);
        }
        return periods;
    }
}
