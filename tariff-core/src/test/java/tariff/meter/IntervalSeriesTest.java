// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.BitSet;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class IntervalSeriesTest {
    // Days on which clocks change: EU directive 2000/84/EC (last Sundays of March and October); US Energy Policy Act of
    // 2005,
    // section 110 (second Sunday of March, first of November).
    @ParameterizedTest
    @CsvSource({
        "Europe/Berlin,    2026-03-29, 92",
        "Europe/Berlin,    2026-03-28, 96",
        "Europe/Berlin,    2026-10-25, 100",
        "America/New_York, 2026-03-08, 92",
        "America/New_York, 2026-11-01, 100",
        "Asia/Kolkata,     2026-03-29, 96",
    })
    void daysHaveTheIntervalsThatTheClockGivesThem(String zone, LocalDate date, int intervals) {
        IntervalSeries series = InventedYear.of(1, zone, 15);
        Period day = new Period(date, date);
        assertThat(series.range(day).size()).isEqualTo(intervals);
        assertThat(series.coverage(day)).isEqualTo(new Coverage(intervals, intervals));
    }

    @Test
    void aYearHas35040QuarterHoursWhateverTheClockDoes() {
        assertThat(InventedYear.of(1, "Europe/Berlin", 15).size()).isEqualTo(35_040);
    }

    @Test
    void absentIntervalsAreCountedAndNotReadAsZero() {
        BitSet absent = new BitSet();
        absent.set(2);
        IntervalSeries series = series(new long[] {1, 2, -9, 4}, absent);
        assertThat(series.absentCount()).isEqualTo(1);
        assertThat(series.isAbsent(2)).isTrue();
        Period day = new Period(LocalDate.of(2026, 1, 1), LocalDate.of(2026, 1, 1));
        assertThat(series.coverage(day)).isEqualTo(new Coverage(96, 3));
        assertThat(series.coverage(day).missingPercent()).isEqualByComparingTo("96.88"); // own arithmetic: 93 / 96
    }

    @Test
    void energyBelowZeroIsRefusedByItsInterval() {
        assertThatThrownBy(() -> series(new long[] {1, -2}, new BitSet()))
                .hasMessage("kWh of the interval from 2026-01-01T00:15:00Z is below zero");
    }

    @Test
    void aTotalThatCannotBeHeldIsRefused() {
        assertThatThrownBy(() -> series(new long[] {1L << 52, 1}, new BitSet()))
                .hasMessage("kWh add up to more than can be held");
    }

    @Test
    void anOddStepIsRefused() {
        assertThatThrownBy(() -> new IntervalSeries(
                        Instant.EPOCH,
                        20,
                        ZoneId.of("UTC"),
                        3,
                        new long[1],
                        new long[1],
                        new long[1],
                        Optional.empty(),
                        new BitSet()))
                .hasMessage("an interval of 20 minutes; allowed: 5, 10, 15, 30, 60");
    }

    private static IntervalSeries series(long[] kwh, BitSet absent) {
        long[] none = new long[kwh.length];
        return new IntervalSeries(
                Instant.parse("2026-01-01T00:00:00Z"),
                15,
                ZoneId.of("UTC"),
                3,
                kwh,
                none,
                none,
                Optional.empty(),
                absent);
    }
}
