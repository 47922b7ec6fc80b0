// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.math.BigDecimal;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.meter.IntervalSeries;
import tariff.meter.InventedYear;
import tariff.meter.MonthlySums;
import tariff.meter.Register;
import tariff.meter.Window;

/** A bank as it is offered, run through interval data. Expected figures: own arithmetic, beside each case. */
class BankYearTest {
    private static final Window SECOND_HOUR = Window.daily("01:00", "02:00");

    @Test
    void theTimeSwitchTakesTheFixedKvarAndTheStepsOff() {
        // 90 kvar: 50 fixed and 40 switched leave nothing; from 01:00 to 02:00 all 90 are left
        CapacitorBank bank =
                CapacitorBank.plain(new BigDecimal("50"), kvar("40")).offIn(SECOND_HOUR);
        BankYear year = BankYear.of(hours(90, 90, 90), bank);
        assertThat(lagging(year)).containsExactly("0.00", "90.00", "0.00");
        // in, out, in
        assertThat(year.steps().orElseThrow().operations()).containsExactly(3);
        assertThat(year.steps().orElseThrow().hoursAtFullOutput()).isEqualByComparingTo("2");
    }

    @Test
    void theControllerWaitsForItsDelayAndKeepsToItsLimit() {
        CapacitorBank steps = CapacitorBank.automatic("20", "20", "20");
        Controller slow = new Controller(Optional.empty(), 60, Optional.empty());
        assertThat(lagging(BankYear.of(hours(60, 60, 60), steps.withController(slow))))
                .containsExactly("60.00", "0.00", "0.00");
        Controller rare = new Controller(Optional.empty(), 0, Optional.of(1));
        assertThat(lagging(BankYear.of(hours(60, 60, 60), steps.withController(rare))))
                .containsExactly("40.00", "20.00", "0.00");
    }

    // delay, minutes | interval, minutes | intervals that pass before a step is switched
    @ParameterizedTest
    @CsvSource({"0, 15, 0", "14, 15, 0", "15, 15, 1", "16, 15, 2", "30, 15, 2", "45, 60, 0", "60, 60, 1", "60, 5, 12"})
    void aDelayIsCountedInWholeIntervalsAndNothingBelowOne(int delay, int step, int intervals) {
        assertThat(new Controller(Optional.empty(), delay, Optional.empty()).delayIntervals(step))
                .isEqualTo(intervals);
    }

    // what | delay | limit | message
    @ParameterizedTest
    @CsvSource({
        "-1, 1, 'delayMinutes is -1; allowed: 0 to 60'",
        "61, 1, 'delayMinutes is 61; allowed: 0 to 60'",
        "0, 0, 'operationsPerHour is 0; allowed: 1 or more'"
    })
    void whatNoControllerCanBeToldIsRefused(int delay, int limit, String message) {
        assertThatThrownBy(() -> new Controller(Optional.empty(), delay, Optional.of(limit)))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage(message);
    }

    @Test
    void theBankBurnsKwhWhereItGivesKvar() {
        // 50 kvar × 10 W = 0.5 kWh in each hour but the second
        CapacitorBank bank =
                CapacitorBank.fixed("50").withLosses(BigDecimal.TEN).offIn(SECOND_HOUR);
        BankYear year = BankYear.of(hours(90, 90, 90), bank);
        assertThat(kwh(year)).containsExactly("100.50", "100.00", "100.50");
        assertThat(year.after().month(year.before().series().days()).totals().get(Register.PEAK_KW))
                .hasValueSatisfying(kw -> assertThat(kw).isEqualByComparingTo("100.5"));
    }

    @Test
    void lossesBelowTheLastDigitAreCarriedOn() {
        // 10 kvar × 0.4 W = 0.004 kWh an hour; the sums 0.004, 0.008, 0.012, 0.016, 0.020 round to 0, 1, 1, 2, 2
        // hundredths
        BankYear year =
                BankYear.of(hours(90, 90, 90, 90, 90), CapacitorBank.fixed("10").withLosses(new BigDecimal("0.4")));
        assertThat(kwh(year)).containsExactly("100.00", "100.01", "100.00", "100.01", "100.00");
    }

    @Test
    void stepsThatAreOutBurnNothing() {
        // 60 of 90 kvar are given in the first hour only: 60 × 10 W = 0.6 kWh
        CapacitorBank bank = CapacitorBank.automatic("60").withLosses(BigDecimal.TEN);
        assertThat(kwh(BankYear.of(hours(90, 0, 0), bank))).containsExactly("100.60", "100.00", "100.00");
    }

    /** kWh after less kWh before are the kvarh delivered × W ÷ 1000, to half of the last digit; nothing else moves. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6})
    void allThatIsBurntIsCountedOnce(long seed) {
        Random random = new Random(seed);
        int step = List.of(5, 10, 15, 30, 60).get(random.nextInt(5));
        BitSet absent = new BitSet();
        absent.set(100, 140);
        MonthlySums sums = MonthlySums.of(InventedYear.between(
                seed,
                "Europe/Berlin",
                step,
                java.time.LocalDate.of(2026, 3, 1),
                java.time.LocalDate.of(2026, 4, 15),
                absent));
        CapacitorBank free = CapacitorBank.plain(new BigDecimal("35"), kvar("20", "40", "40"))
                .withController(new Controller(Optional.of(new BigDecimal("0.98")), 20, Optional.of(4)))
                .offIn(Window.daily("22:00", "05:30"));
        BigDecimal watts = new BigDecimal(random.nextInt(8000)).movePointLeft(3);
        BankYear lossless = BankYear.of(sums, free);
        BankYear lossy = BankYear.of(sums, free.withLosses(watts));
        BigDecimal burnt = BigDecimal.ZERO;
        BigDecimal delivered = BigDecimal.ZERO;
        for (int i = 0; i < sums.series().size(); i++) {
            assertThat(lossless.after().series().scaledKwh(i))
                    .isEqualTo(sums.series().scaledKwh(i));
            assertThat(net(lossy, i)).isEqualTo(net(lossless, i));
            burnt = burnt.add(sums.series()
                    .decimal(lossy.after().series().scaledKwh(i) - sums.series().scaledKwh(i)));
            delivered = delivered.add(sums.series().decimal(net(sums.series(), i) - net(lossy, i)));
        }
        assertThat(lossy.steps()).isEqualTo(lossless.steps().isPresent() ? lossy.steps() : Optional.empty());
        assertThat(burnt).isCloseTo(delivered.multiply(watts).movePointLeft(3), within(new BigDecimal("0.0000005")));
        assertThat(delivered).isPositive();
    }

    private static long net(BankYear year, int interval) {
        return net(year.after().series(), interval);
    }

    private static long net(IntervalSeries series, int interval) {
        return series.scaledLaggingKvarh(interval) - series.scaledLeadingKvarh(interval);
    }

    private static List<BigDecimal> kvar(String... steps) {
        return Arrays.stream(steps).map(BigDecimal::new).toList();
    }

    /** 100 kW and so many lagging kvar, hour by hour from midnight; figures to a hundredth. */
    private static MonthlySums hours(long... kvar) {
        long[] kwh = new long[kvar.length];
        Arrays.fill(kwh, 100_00);
        return MonthlySums.of(new IntervalSeries(
                Instant.parse("2026-01-01T00:00:00Z"),
                60,
                ZoneOffset.UTC,
                2,
                kwh,
                Arrays.stream(kvar).map(each -> each * 100).toArray(),
                new long[kvar.length],
                Optional.empty(),
                new BitSet()));
    }

    private static List<String> lagging(BankYear year) {
        IntervalSeries series = year.after().series();
        return IntStream.range(0, series.size())
                .mapToObj(i -> series.decimal(series.scaledLaggingKvarh(i)).toPlainString())
                .toList();
    }

    private static List<String> kwh(BankYear year) {
        IntervalSeries series = year.after().series();
        return IntStream.range(0, series.size())
                .mapToObj(i -> series.decimal(series.scaledKwh(i)).toPlainString())
                .toList();
    }
}
