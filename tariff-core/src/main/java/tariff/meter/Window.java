// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.Month;
import java.time.ZoneId;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;

/**
 * A time-of-use window by the local clock.
 *
 * <p>A window whose end is not after its start passes midnight. Each moment is judged by its own date: {@code Mon–Fri 22:00 to
 * 06:00} holds on Monday from 00:00 and not on Saturday at 02:00, so that it and {@code Mon–Fri 06:00 to 22:00} and {@code
 * Sat–Sun} share out the week.
 *
 * @param weekdays days of the week on which it holds
 * @param from the first minute
 * @param to the minute after the last, 00:00 for the end of the day; equal to {@code from} for the whole day
 * @param months months in which it holds
 * @param holidayRule what holidays are
 * @param holidays the dates that the rate calls holidays
 */
public record Window(
        Set<DayOfWeek> weekdays,
        LocalTime from,
        LocalTime to,
        Set<Month> months,
        HolidayRule holidayRule,
        Set<LocalDate> holidays) {
    static final int DAY = 24 * 60;

    /** @throws IllegalArgumentException if a time is not on a whole minute, or no weekday or month is named */
    public Window {
        weekdays = Set.copyOf(weekdays);
        months = Set.copyOf(months);
        holidays = Set.copyOf(holidays);
        if (from.toSecondOfDay() % 60 != 0 || to.toSecondOfDay() % 60 != 0) {
            throw new IllegalArgumentException("a window from " + from + " to " + to + " is not on whole minutes");
        }
        if (weekdays.isEmpty() || months.isEmpty()) {
            throw new IllegalArgumentException("a window needs a weekday and a month in which it holds");
        }
    }

    /** Every day of the year between two times: {@code Window.daily("07:00", "21:00")}. */
    public static Window daily(String from, String to) {
        return new Window(
                EnumSet.allOf(DayOfWeek.class),
                LocalTime.parse(from),
                LocalTime.parse(to),
                EnumSet.allOf(Month.class),
                HolidayRule.AS_ITS_WEEKDAY,
                Set.of());
    }

    public Window on(Set<DayOfWeek> newWeekdays) {
        return new Window(newWeekdays, from, to, months, holidayRule, holidays);
    }

    public Window in(Set<Month> newMonths) {
        return new Window(weekdays, from, to, newMonths, holidayRule, holidays);
    }

    public Window withHolidays(HolidayRule rule, Set<LocalDate> dates) {
        return new Window(weekdays, from, to, months, rule, dates);
    }

    public boolean holds(LocalDateTime moment) {
        return appliesOn(moment.toLocalDate()) && holdsAt(moment.getHour() * 60 + moment.getMinute());
    }

    /** Whether any part of the date is in the window. */
    public boolean appliesOn(LocalDate date) {
        boolean holiday = holidayRule != HolidayRule.AS_ITS_WEEKDAY && holidays.contains(date);
        DayOfWeek day = holiday ? DayOfWeek.SUNDAY : date.getDayOfWeek();
        return months.contains(date.getMonth())
                && weekdays.contains(day)
                && !(holiday && holidayRule == HolidayRule.EXCLUDED);
    }

    /** Whether a minute of a day on which the window applies is inside, counted from 00:00 by the clock. */
    public boolean holdsAt(int minuteOfDay) {
        int first = minute(from);
        int end = minute(to);
        return first < end ? first <= minuteOfDay && minuteOfDay < end : first <= minuteOfDay || minuteOfDay < end;
    }

    /** Whether the window begins and ends where intervals of this length do; otherwise an interval goes by its start. */
    public boolean fits(int stepMinutes) {
        return minute(from) % stepMinutes == 0 && minute(to) % stepMinutes == 0;
    }

    /** Minutes of the window in the period, as they pass: the hour that daylight saving skips or repeats is counted so. */
    public long minutesIn(Period period, ZoneId zone) {
        return MinutesHeld.in(period, zone, List.of(this));
    }

    /** Minutes of the period in which this window and another both hold, counted likewise. */
    public long minutesIn(Period period, ZoneId zone, Window other) {
        return MinutesHeld.in(period, zone, List.of(this, other));
    }

    /** Hours of the window in the period, to six decimals where a third or a sixth of an hour asks for them. */
    public BigDecimal hoursIn(Period period, ZoneId zone) {
        return MinutesHeld.hours(minutesIn(period, zone));
    }

    /** Hours of the period in which this window and another both hold, likewise. */
    public BigDecimal hoursIn(Period period, ZoneId zone, Window other) {
        return MinutesHeld.hours(minutesIn(period, zone, other));
    }

    /** The parts of a day on which the window applies, from a minute to the one after the last; one that passes midnight has two. */
    List<MinutesHeld.Span> spans() {
        int start = minute(from);
        int end = minute(to);
        return start < end
                ? List.of(new MinutesHeld.Span(start, end))
                : List.of(new MinutesHeld.Span(0, end), new MinutesHeld.Span(start, DAY));
    }

    private static int minute(LocalTime time) {
        return time.toSecondOfDay() / 60;
    }
}
