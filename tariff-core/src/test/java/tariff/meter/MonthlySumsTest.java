// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.BitSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class MonthlySumsTest {
    private static final Period DAY = new Period(LocalDate.of(2026, 1, 1), LocalDate.of(2026, 1, 1));

    @Test
    void twoHoursOneWithKvarhOneWithout() {
        // kVAh: own arithmetic, √(100² + 75²) + 100 = 225; the kW and the kVA peak are 100 and 125
        IntervalSeries series = series(60, new long[] {100, 100}, new long[] {75, 0}, new long[] {0, 0}, new BitSet());
        Readings totals = MonthlySums.of(series).month(DAY).totals();
        assertThat(totals.get(Register.APPARENT_KVAH).orElseThrow()).isEqualByComparingTo("225");
        assertThat(totals.get(Register.PEAK_KVA).orElseThrow()).isEqualByComparingTo("125");
        assertThat(totals.get(Register.PEAK_KW).orElseThrow()).isEqualByComparingTo("100");
        assertThat(totals.get(Register.EXPORTED_KWH)).isEmpty();
    }

    @Test
    void halfHourBlocksAndSlidingAveragesOfQuarterHours() {
        // own arithmetic: quarter hours of 10, 40, 50, 20 kWh; blocks 50 and 70 kWh = 100 and 140 kW, sliding 90 kWh =
        // 180 kW
        IntervalSeries series = series(15, new long[] {10, 40, 50, 20}, new long[4], new long[4], new BitSet());
        assertThat(peakKw(series, DemandInterval.block(15))).isEqualByComparingTo("200");
        assertThat(peakKw(series, DemandInterval.block(30))).isEqualByComparingTo("140");
        assertThat(peakKw(series, DemandInterval.sliding(30))).isEqualByComparingTo("180");
    }

    @Test
    void aBlockWithAnAbsentIntervalGivesNoDemand() {
        BitSet absent = new BitSet();
        absent.set(2);
        IntervalSeries series = series(15, new long[] {10, 40, 50, 90}, new long[4], new long[4], absent);
        assertThat(peakKw(series, DemandInterval.block(30))).isEqualByComparingTo("100");
        assertThat(MonthlySums.of(series)
                        .month(DAY)
                        .get(Register.ENERGY_KWH, Optional.empty())
                        .orElseThrow())
                .isEqualByComparingTo("140");
    }

    @Test
    void aSeriesCannotGiveAShorterDemandThanItsStep() {
        IntervalSeries series = InventedYear.of(1, "UTC", 60);
        WindowCalendar none = new WindowCalendar(series, Map.of());
        assertThatThrownBy(() -> new MonthlySums(series, none, DemandInterval.block(15), true))
                .hasMessage("a series of 60 minutes cannot give a demand over 15 minutes");
        assertThatThrownBy(() -> MonthlySums.of(series).each(Cut.HALF_HOURS, DAY))
                .hasMessage("a series of 60 minutes has no half-hours");
    }

    @ParameterizedTest
    @ValueSource(strings = {"Europe/Berlin", "America/New_York", "Asia/Kolkata"})
    void monthsDaysAndHoursAddUpToTheWholeAndWindowsShareItOut(String zone) {
        IntervalSeries series = InventedYear.of(11, zone, 15);
        Map<String, Window> windows =
                Map.of("day", Window.daily("07:00", "21:00"), "night", Window.daily("21:00", "07:00"));
        MonthlySums sums = new MonthlySums(series, new WindowCalendar(series, windows), DemandInterval.block(15), true);
        Readings whole = sums.month(series.days()).totals();
        List<MeteredMonth> months = sums.months();
        assertThat(months).hasSize(12);
        for (Register register : whole.values().keySet()) {
            BigDecimal expected = whole.get(register).orElseThrow();
            assertThat(fold(register, months)).as(register.key()).isEqualByComparingTo(expected);
            assertThat(fold(register, parts(sums, Cut.DAYS, series.days()))).isEqualByComparingTo(expected);
            assertThat(fold(register, parts(sums, Cut.HOURS, series.days()))).isEqualByComparingTo(expected);
            for (MeteredMonth month : months) {
                BigDecimal day = month.get(register, Optional.of("day")).orElseThrow();
                BigDecimal night = month.get(register, Optional.of("night")).orElseThrow();
                assertThat(register.isPeak() ? day.max(night) : day.add(night))
                        .isEqualByComparingTo(
                                month.get(register, Optional.empty()).orElseThrow());
            }
        }
    }

    @Test
    void daysOfTheClockHave23And25Hours() {
        MonthlySums sums = MonthlySums.of(InventedYear.of(2, "Europe/Berlin", 15));
        LocalDate spring = LocalDate.of(2026, 3, 29);
        LocalDate autumn = LocalDate.of(2026, 10, 25);
        assertThat(sums.each(Cut.HOURS, new Period(spring, spring))).hasSize(23);
        assertThat(sums.each(Cut.HOURS, new Period(autumn, autumn))).hasSize(25);
        assertThat(sums.each(Cut.QUARTER_HOURS, new Period(autumn, autumn))).hasSize(100);
    }

    @Test
    void theFirstAndLastMonthReachAsFarAsTheSeries() {
        IntervalSeries series =
                InventedYear.between(5, "UTC", 60, LocalDate.of(2026, 1, 20), LocalDate.of(2026, 3, 5), new BitSet());
        assertThat(MonthlySums.of(series).months().stream().map(MeteredMonth::period))
                .map(Period::toString)
                .containsExactly("2026-01-20 to 2026-01-31", "2026-02", "2026-03-01 to 2026-03-04");
    }

    @Test
    void aWindowOutOfSeasonHasZerosAndOneWithoutRecordsHasNothing() {
        BitSet absent = new BitSet();
        absent.set(12, 24);
        IntervalSeries series =
                InventedYear.between(5, "UTC", 60, LocalDate.of(2026, 1, 1), LocalDate.of(2026, 1, 2), absent);
        Map<String, Window> windows = Map.of(
                "summer", Window.daily("00:00", "00:00").in(java.util.EnumSet.of(java.time.Month.JULY)),
                "afternoon", Window.daily("12:00", "00:00"));
        MeteredMonth day =
                new MonthlySums(series, new WindowCalendar(series, windows), DemandInterval.block(60), true).month(DAY);
        assertThat(day.get(Register.PEAK_KW, Optional.of("summer")).orElseThrow())
                .isEqualByComparingTo("0");
        assertThat(day.get(Register.ENERGY_KWH, Optional.of("afternoon"))).isEmpty();
    }

    @Test
    void peaksComeHighestFirstWithWhatCoincided() {
        IntervalSeries series = series(
                60, new long[] {50, 90, 70, 90}, new long[] {80, 10, 20, 30}, new long[] {0, 4, 0, 0}, new BitSet());
        Peaks peaks = MonthlySums.of(series).peaks(DAY);
        PeakDemand highest = peaks.at(Register.PEAK_KW).orElseThrow();
        assertThat(highest.start()).isEqualTo(Instant.parse("2026-01-01T01:00:00Z"));
        assertThat(highest.laggingKvar()).isEqualByComparingTo("10");
        assertThat(highest.leadingKvar()).isEqualByComparingTo("4");
        assertThat(peaks.highest(Register.PEAK_KW, 3, Optional.empty()).stream().map(PeakDemand::kw))
                .extracting(BigDecimal::intValueExact)
                .containsExactly(90, 90, 70);
        // own arithmetic: 50² + 80² = 8,900; 90² + 30² = 9,000 is higher
        assertThat(peaks.at(Register.PEAK_KVA).orElseThrow().kw()).isEqualByComparingTo("90");
        assertThat(peaks.at(Register.PEAK_LAGGING_KVAR).orElseThrow().kw()).isEqualByComparingTo("50");
        assertThat(peaks.perDay(Register.PEAK_KW, Optional.empty())).containsExactly(highest);
    }

    private static BigDecimal peakKw(IntervalSeries series, DemandInterval demand) {
        MonthlySums sums = new MonthlySums(series, new WindowCalendar(series, Map.of()), demand, true);
        return sums.month(DAY).get(Register.PEAK_KW, Optional.empty()).orElseThrow();
    }

    private static List<MeteredMonth> parts(MonthlySums sums, Cut cut, Period period) {
        return sums.each(cut, period).map(SubPeriod::registers).toList();
    }

    private static BigDecimal fold(Register register, List<MeteredMonth> parts) {
        return parts.stream()
                .map(part -> part.get(register, Optional.empty()).orElseThrow())
                .reduce(BigDecimal.ZERO, register.isPeak() ? BigDecimal::max : BigDecimal::add);
    }

    private static IntervalSeries series(int step, long[] kwh, long[] lagging, long[] leading, BitSet absent) {
        return new IntervalSeries(
                Instant.parse("2026-01-01T00:00:00Z"),
                step,
                ZoneId.of("UTC"),
                0,
                kwh,
                lagging,
                leading,
                Optional.empty(),
                absent);
    }
}
