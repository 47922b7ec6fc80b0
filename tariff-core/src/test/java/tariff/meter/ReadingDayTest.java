// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.BitSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.notice.Assumption;

class ReadingDayTest {
    private static final IntervalSeries YEAR = InventedYear.of(17, "Europe/Berlin", 15);

    // own arithmetic, from the calendar
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                // read on | first day | last day | periods
                "1  | 2026-01-20 | 2026-03-04 | 2026-01-20 to 2026-01-31; 2026-02; 2026-03-01 to 2026-03-04",
                "14 | 2026-01-14 | 2026-03-13 | 2026-01-14 to 2026-02-13; 2026-02-14 to 2026-03-13",
                "14 | 2026-01-13 | 2026-02-14 | 2026-01-13 to 2026-01-13; 2026-01-14 to 2026-02-13; 2026-02-14 to 2026-02-14",
                "28 | 2025-12-31 | 2026-03-01 | 2025-12-31 to 2026-01-27; 2026-01-28 to 2026-02-27; 2026-02-28 to 2026-03-01",
                "20 | 2026-05-03 | 2026-05-12 | 2026-05-03 to 2026-05-12",
                "5  | 2026-05-05 | 2026-05-05 | 2026-05-05 to 2026-05-05",
            })
    void aPeriodBeginsOnItsDayAndTheEndsGoAsFarAsTheDays(int day, LocalDate first, LocalDate last, String periods) {
        assertThat(new ReadingDay(day).periods(new Period(first, last)))
                .extracting(Period::toString)
                .containsExactly(periods.split("; "));
    }

    @Test
    void periodsThatTheDataHoldOnlyPartOfAreNamed() {
        assertThat(readOn(YEAR, 14).partPeriods())
                .extracting(Assumption::where)
                .containsExactly("2025-12-14 to 2026-01-13", "2026-12-14 to 2027-01-13");
        assertThat(readOn(YEAR, 1).partPeriods())
                .as("a whole year of calendar months")
                .isEmpty();
        IntervalSeries threeWeeks = InventedYear.between(
                3, "Europe/Berlin", 60, LocalDate.of(2026, 3, 14), LocalDate.of(2026, 4, 2), new BitSet());
        assertThat(MonthlySums.of(threeWeeks).partPeriods())
                .extracting(Assumption::where)
                .containsExactly("2026-03", "2026-04");
    }

    /** Nothing is billed twice, nothing is left out: the same kWh and kvarh however the year is cut. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 14, 27, 28})
    void periodsAddUpToWhatCalendarMonthsAddUpTo(int day) {
        List<MeteredMonth> periods = readOn(YEAR, day).months();
        List<MeteredMonth> months = MonthlySums.of(YEAR).months();
        assertThat(periods).hasSize(day == 1 ? 12 : 13);
        assertThat(periods.stream().mapToInt(each -> each.period().days()).sum())
                .isEqualTo(365);
        for (Register register :
                List.of(Register.ENERGY_KWH, Register.LAGGING_KVARH, Register.LEADING_KVARH, Register.APPARENT_KVAH)) {
            assertThat(sum(register, periods)).isEqualByComparingTo(sum(register, months));
        }
        assertThat(highestKw(periods)).isEqualByComparingTo(highestKw(months));
    }

    /** Own arithmetic: 1 kWh an hour; 14 March to 13 April have 31 days and lose an hour to summer time, 743 h; then 30 days, 720 h. */
    @Test
    void theNightInWhichClocksChangeIsInItsPeriod() {
        LocalDate first = LocalDate.of(2026, 3, 14);
        IntervalSeries shape =
                InventedYear.between(1, "Europe/Berlin", 60, first, LocalDate.of(2026, 5, 14), new BitSet());
        long[] ones = new long[shape.size()];
        java.util.Arrays.fill(ones, 1);
        IntervalSeries hours = new IntervalSeries(
                shape.start(), 60, shape.zone(), 0, ones, ones, ones, Optional.empty(), new BitSet());
        assertThat(readOn(hours, 14).months())
                .extracting(month ->
                        month.totals().get(Register.ENERGY_KWH).orElseThrow().intValueExact())
                .containsExactly(743, 720);
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 29})
    void aDayThatAMonthMayLackIsRefused(int day) {
        assertThatThrownBy(() -> new ReadingDay(day))
                .hasMessage("a period that begins on day " + day + "; allowed: 1 to 28");
    }

    @ParameterizedTest
    @CsvSource({
        "2026-01-01, 2026-01-31, 2026-03-01, 2026-03-31, 2026-01 to 2026-03",
        "2026-01-01, 2026-01-31, 2026-01-01, 2026-01-31, 2026-01",
        "2026-01-14, 2026-02-13, 2026-03-14, 2026-03-31, 2026-01-14 to 2026-03-31",
        "2026-01-01, 2026-01-31, 2026-03-01, 2026-03-04, 2026-01-01 to 2026-03-04",
    })
    void aSpanOfPeriodsIsSaidByMonthsOrByDays(
            LocalDate first, LocalDate firstEnd, LocalDate last, LocalDate lastEnd, String words) {
        assertThat(new Period(first, firstEnd).through(new Period(last, lastEnd)))
                .isEqualTo(words);
    }

    private static MonthlySums readOn(IntervalSeries series, int day) {
        return new MonthlySums(
                series,
                new WindowCalendar(series, Map.of()),
                DemandInterval.block(series.stepMinutes()),
                new ReadingDay(day),
                true);
    }

    private static BigDecimal sum(Register register, List<MeteredMonth> months) {
        return months.stream()
                .map(month -> month.totals().get(register).orElseThrow())
                .reduce(BigDecimal.ZERO, BigDecimal::add);
    }

    private static BigDecimal highestKw(List<MeteredMonth> months) {
        return months.stream()
                .map(month -> month.totals().get(Register.PEAK_KW).orElseThrow())
                .reduce(BigDecimal.ZERO, BigDecimal::max);
    }
}
