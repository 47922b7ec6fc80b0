// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.BitSet;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalSeries;
import tariff.meter.InventedYear;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.meter.ReadingDay;
import tariff.meter.Readings;
import tariff.meter.Window;
import tariff.meter.WindowCalendar;

/** One sorting against a walk for every size, register by register. */
class BankSizesTest {

    // minutes | how far registers may differ: 5-minute walks round the bank's energy to a millionth in each interval
    @ParameterizedTest
    @CsvSource({"15, 0", "30, 0", "60, 0", "5, 0.01"})
    void everySizeGivesWhatItsWalkGives(int minutes, BigDecimal within) {
        BitSet absent = new BitSet();
        absent.set(100, 130);
        absent.set(7);
        IntervalSeries series = InventedYear.between(
                11, "Europe/Berlin", minutes, LocalDate.of(2026, 3, 10), LocalDate.of(2026, 5, 2), absent);
        MonthlySums sums = sums(series, minutes, false);
        BankSizes sizes = new BankSizes(sums);
        Random random = new Random(3);
        for (int i = 0; i < 60; i++) {
            BigDecimal kvar = i == 0 ? BigDecimal.ZERO : BigDecimal.valueOf(random.nextInt(40_000), 2);
            BankYear walked = BankYear.of(sums, CapacitorBank.fixed(kvar));
            for (MeteredMonth before : sums.months()) {
                MeteredMonth expected = walked.month(before.period());
                MeteredMonth month = sizes.month(before, kvar);
                assertSame(month.totals(), expected.totals(), within, kvar);
                assertThat(month.windows().keySet())
                        .isEqualTo(expected.windows().keySet());
                expected.windows()
                        .forEach((name, readings) -> assertSame(
                                month.windows().getOrDefault(name, Readings.none()), readings, within, kvar));
            }
        }
    }

    @Test
    void whatNeedsARootForEachIntervalOrASumOfManyIsLeftToTheWalk() {
        IntervalSeries series = InventedYear.of(1, "UTC", 15);
        assertThat(BankSizes.suits(sums(series, 15, false))).isTrue();
        assertThatThrownBy(() -> new BankSizes(sums(series, 15, true)))
                .hasMessage("kVAh, or demands of more than one interval, cannot be had from one sorting");
        assertThatThrownBy(() -> new BankSizes(sums(series, 30, false))).isInstanceOf(IllegalArgumentException.class);
    }

    private static MonthlySums sums(IntervalSeries series, int demandMinutes, boolean apparentKvah) {
        Map<String, Window> windows =
                Map.of("day", Window.daily("07:00", "21:00"), "never", Window.daily("03:00", "03:05"));
        return new MonthlySums(
                series,
                new WindowCalendar(series, windows),
                DemandInterval.block(demandMinutes),
                ReadingDay.FIRST_OF_MONTH,
                apparentKvah);
    }

    private static void assertSame(Readings found, Readings expected, BigDecimal within, BigDecimal kvar) {
        assertThat(found.values().keySet()).isEqualTo(expected.values().keySet());
        expected.values()
                .forEach((register, value) -> assertThat(found.get(register)
                                .orElseThrow()
                                .subtract(value)
                                .abs())
                        .as("%s behind %s kvar: %s, walked %s", register, kvar, found.get(register), value)
                        .isLessThanOrEqualTo(within));
    }
}
