// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.DayOfWeek;
import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.Month;
import java.time.ZoneId;
import java.time.zone.ZoneOffsetTransition;
import java.util.EnumSet;
import java.util.Set;
import org.jspecify.annotations.Nullable;

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
    private static final int DAY = 24 * 60;

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
        long minutes = 0;
        for (LocalDate date = period.first(); !date.isAfter(period.last()); date = date.plusDays(1)) {
            minutes += appliesOn(date) ? minutesOn(date, zone) : 0;
        }
        return minutes;
    }

    /** Hours of the window in the period, to six decimals where a third or a sixth of an hour asks for them. */
    public BigDecimal hoursIn(Period period, ZoneId zone) {
        return BigDecimal.valueOf(minutesIn(period, zone))
                .divide(BigDecimal.valueOf(60), 6, RoundingMode.HALF_UP)
                .stripTrailingZeros();
    }

    private long minutesOn(LocalDate date, ZoneId zone) {
        Instant at = date.atStartOfDay(zone).toInstant();
        Instant end = date.plusDays(1).atStartOfDay(zone).toInstant();
        long minutes = 0;
        while (at.isBefore(end)) {
            @Nullable ZoneOffsetTransition next = zone.getRules().nextTransition(at);
            Instant until = next == null || next.getInstant().isAfter(end) ? end : next.getInstant();
            int first = minute(at.atZone(zone).toLocalTime());
            int last = first + (int) ((until.getEpochSecond() - at.getEpochSecond()) / 60);
            minutes += inside(first, last);
            at = until;
        }
        return minutes;
    }

    private int inside(int first, int last) {
        int start = minute(from);
        int end = minute(to);
        return start < end
                ? overlap(first, last, start, end)
                : overlap(first, last, 0, end) + overlap(first, last, start, DAY);
    }

    private static int overlap(int first, int last, int start, int end) {
        return Math.max(0, Math.min(last, end) - Math.max(first, start));
    }

    private static int minute(LocalTime time) {
        return time.toSecondOfDay() / 60;
    }
}
