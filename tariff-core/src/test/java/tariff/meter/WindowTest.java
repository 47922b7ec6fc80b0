// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.Month;
import java.time.ZoneId;
import java.util.EnumSet;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class WindowTest {
    private static final Set<DayOfWeek> WORKDAYS = EnumSet.range(DayOfWeek.MONDAY, DayOfWeek.FRIDAY);
    private static final Window DAY = Window.daily("07:00", "21:00").on(WORKDAYS);
    private static final Window NIGHT = Window.daily("22:00", "06:00");

    @ParameterizedTest
    @CsvSource({
        "2026-03-02T06:59, false", // Monday, one minute before
        "2026-03-02T07:00, true",
        "2026-03-02T20:59, true",
        "2026-03-02T21:00, false",
        "2026-03-07T12:00, false", // Saturday
    })
    void holdsFromItsFirstMinuteToTheOneBeforeItsEnd(LocalDateTime moment, boolean holds) {
        assertThat(DAY.holds(moment)).isEqualTo(holds);
    }

    @Test
    void passesMidnightJudgingEachMomentByItsOwnDate() {
        Window weeknights = NIGHT.on(WORKDAYS);
        assertThat(weeknights.holds(LocalDateTime.parse("2026-03-02T00:30"))).isTrue(); // Monday
        assertThat(weeknights.holds(LocalDateTime.parse("2026-03-06T23:00"))).isTrue(); // Friday
        assertThat(weeknights.holds(LocalDateTime.parse("2026-03-07T02:00"))).isFalse(); // Saturday
    }

    @Test
    void holidaysAreSundaysOrExcludedOrNothingSpecial() {
        Set<LocalDate> holidays = Set.of(LocalDate.of(2026, 3, 2));
        LocalDateTime noon = LocalDateTime.parse("2026-03-02T12:00");
        Window sundays = Window.daily("00:00", "00:00").on(EnumSet.of(DayOfWeek.SUNDAY));
        assertThat(DAY.withHolidays(HolidayRule.AS_ITS_WEEKDAY, holidays).holds(noon))
                .isTrue();
        assertThat(DAY.withHolidays(HolidayRule.AS_SUNDAY, holidays).holds(noon))
                .isFalse();
        assertThat(sundays.withHolidays(HolidayRule.AS_SUNDAY, holidays).holds(noon))
                .isTrue();
        assertThat(Window.daily("00:00", "00:00")
                        .withHolidays(HolidayRule.EXCLUDED, holidays)
                        .holds(noon))
                .isFalse();
    }

    // own arithmetic: 31 nights of 8 h in March, one of them an hour short; 31 in October, one an hour long; New York
    // likewise
    @ParameterizedTest
    @CsvSource({
        "Europe/Berlin, 2026-03, 247",
        "Europe/Berlin, 2026-10, 249",
        "Europe/Berlin, 2026-01, 248",
        "America/New_York, 2026-03, 247",
        "America/New_York, 2026-11, 241",
    })
    void hoursFollowTheClock(String zone, java.time.YearMonth month, String hours) {
        assertThat(NIGHT.hoursIn(Period.of(month), ZoneId.of(zone))).isEqualByComparingTo(hours);
    }

    @Test
    void windowsThatShareOutTheWeekShareOutItsHours() {
        Window rest = Window.daily("21:00", "07:00").on(WORKDAYS);
        Window weekend = Window.daily("00:00", "00:00").on(EnumSet.of(DayOfWeek.SATURDAY, DayOfWeek.SUNDAY));
        Period year = new Period(LocalDate.of(2026, 1, 1), LocalDate.of(2026, 12, 31));
        ZoneId zone = ZoneId.of("Europe/Berlin");
        assertThat(DAY.minutesIn(year, zone) + rest.minutesIn(year, zone) + weekend.minutesIn(year, zone))
                .isEqualTo(365L * 24 * 60);
    }

    // own arithmetic: from 22:00 to 07:00 and from 21:00 on 20 Mondays to Fridays in February, 2 h before midnight and
    // 7 h
    // after; the night of the clock in March is a Sunday's, so 21 workdays keep theirs
    @ParameterizedTest
    @CsvSource({"2026-02, 180", "2026-03, 198"})
    void hoursOfTwoWindowsAreThoseInWhichBothHold(java.time.YearMonth month, String hours) {
        Window night = Window.daily("22:00", "07:00");
        Window rest = Window.daily("21:00", "07:00").on(WORKDAYS);
        ZoneId zone = ZoneId.of("Europe/Berlin");
        assertThat(night.hoursIn(Period.of(month), zone, rest)).isEqualByComparingTo(hours);
        assertThat(rest.hoursIn(Period.of(month), zone, night)).isEqualByComparingTo(hours);
    }

    /** The minutes of every interval that both windows hold, counted one by one. */
    @Test
    void theMinutesOfTwoWindowsAgreeWithTheCalendarOfASeries() {
        Window weeknights = NIGHT.on(WORKDAYS);
        Window early = Window.daily("00:30", "07:00").in(EnumSet.range(Month.MARCH, Month.OCTOBER));
        for (String zone : new String[] {"Europe/Berlin", "America/New_York", "Australia/Lord_Howe"}) {
            IntervalSeries series = InventedYear.of(3, zone, 30);
            WindowCalendar calendar = new WindowCalendar(series, Map.of("one", weeknights, "other", early));
            for (java.time.YearMonth month = java.time.YearMonth.of(2026, 1);
                    month.getYear() == 2026;
                    month = month.plusMonths(1)) {
                IntervalRange range = series.range(Period.of(month));
                long held = java.util.stream.IntStream.range(range.from(), range.to())
                        .filter(i -> calendar.mask(i) == 3)
                        .count();
                assertThat(weeknights.minutesIn(Period.of(month), series.zone(), early))
                        .as("%s %s", zone, month)
                        .isEqualTo(30 * held);
            }
        }
    }

    @Test
    void theCalendarOfASeriesAgreesWithTheWindowMomentByMoment() {
        for (String zone : new String[] {"Europe/Berlin", "America/New_York", "Asia/Kolkata"}) {
            IntervalSeries series = InventedYear.of(3, zone, 30);
            Window summer = NIGHT.in(EnumSet.range(Month.JUNE, Month.AUGUST));
            WindowCalendar calendar = new WindowCalendar(series, Map.of("day", DAY, "summer night", summer));
            for (int i = 0; i < series.size(); i++) {
                LocalDateTime local = series.startOf(i).atZone(series.zone()).toLocalDateTime();
                assertThat(calendar.holds(i, "day")).isEqualTo(DAY.holds(local));
                assertThat(calendar.holds(i, "summer night")).isEqualTo(summer.holds(local));
            }
        }
    }

    @Test
    void anUnknownWindowIsRefusedByName() {
        WindowCalendar calendar = new WindowCalendar(InventedYear.of(1, "UTC", 60), Map.of("day", DAY));
        assertThatThrownBy(() -> calendar.bit("night")).hasMessage("no window \"night\"; there are [day]");
    }
}
