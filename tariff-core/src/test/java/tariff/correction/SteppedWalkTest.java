// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.time.Instant;
import java.time.ZoneId;
import java.util.BitSet;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalSeries;
import tariff.meter.InventedYear;
import tariff.meter.MonthlySums;
import tariff.meter.Register;
import tariff.meter.Window;

/** Expected switching: own arithmetic, hour by hour, beside each case. */
class SteppedWalkTest {
    private static final SteppedBank.Target UNITY = SteppedBank.Target.kvar(BigDecimal.ZERO);

    @Test
    void followsTheLoadInStepsAndHoldsInsideTheDeadBand() {
        // 30 kvar: nearest of 0, 20, 40, 60 is 20 or 40, fewer operations 20. 33: left 13 ≤ 13.33, held. 34: 14 is
        // more, 40.
        // 70: 60 and full. 0: all out.
        SteppedWalk walk = walk(SteppedBank.of(UNITY, "20", "20", "20"), 30, 33, 34, 70, 0);
        assertThat(net(walk.corrected())).containsExactly(10L, 13L, -6L, 10L, 0L);
        assertThat(walk.operations()).containsExactly(2, 2, 2);
        assertThat(walk.hoursAtFullOutput()).isEqualByComparingTo("1");
    }

    @Test
    void exchangesUnequalStepsForTheNearestSum() {
        // 10:20:40, kvar 30 → 10 + 20; 40 → left 10 > 6.67, so 40 alone: three operations
        SteppedWalk walk = walk(SteppedBank.of(UNITY, "10", "20", "40"), 30, 40);
        assertThat(net(walk.corrected())).containsExactly(0L, 0L);
        assertThat(walk.operations()).containsExactly(2, 2, 1);
    }

    @Test
    void leavesWhatTheTargetPowerFactorAllows() {
        // 100 kW at 0.8 lagging leaves 75 kvar (identity: tan φ = 0.75); of 115 kvar 40 go
        SteppedWalk walk =
                walk(SteppedBank.of(SteppedBank.Target.powerFactor(new BigDecimal("0.8")), "20", "20", "20"), 115);
        assertThat(net(walk.corrected())).containsExactly(75L);
    }

    @Test
    void waitsForItsDelayAndKeepsToItsOperationsAnHour() {
        List<BigDecimal> steps = Collections.nCopies(3, new BigDecimal("20"));
        SteppedWalk slow = walk(new SteppedBank(steps, UNITY, 1, Optional.empty(), Optional.empty()), 60, 60, 60);
        assertThat(net(slow.corrected())).containsExactly(60L, 0L, 0L);
        SteppedWalk rare = walk(new SteppedBank(steps, UNITY, 0, Optional.of(1), Optional.empty()), 60, 60, 60);
        assertThat(net(rare.corrected())).containsExactly(40L, 20L, 0L);
    }

    @Test
    void aTimeSwitchKeepsItOff() {
        Window off = Window.daily("01:00", "02:00");
        SteppedBank bank = new SteppedBank(List.of(new BigDecimal("60")), UNITY, 0, Optional.empty(), Optional.of(off));
        assertThat(net(walk(bank, 60, 60, 60).corrected())).containsExactly(0L, 60L, 0L);
    }

    @Test
    void theCorrectedYearGivesTheOutcomesRegisters() {
        IntervalSeries year = InventedYear.of(31, "Europe/Berlin", 15);
        SteppedBank bank = SteppedBank.of(UNITY, "12.5", "25", "25", "50");
        SteppedWalk walk = SteppedWalk.of(year, year.all(), DemandInterval.block(15), bank);
        var totals = MonthlySums.of(walk.corrected()).month(year.days()).totals();
        assertThat(walk.outcome().laggingKvarh())
                .isEqualByComparingTo(totals.get(Register.LAGGING_KVARH).orElseThrow());
        assertThat(walk.outcome().peakKva())
                .isEqualByComparingTo(totals.get(Register.PEAK_KVA).orElseThrow());
        // it follows the load, so it sends back far less than a fixed bank of its size
        assertThat(walk.outcome().leadingKvarh())
                .isLessThan(BankWalk.fixed(year, year.all(), DemandInterval.block(15), new BigDecimal("112.5"))
                        .leadingKvarh());
    }

    @Test
    void tooManyDifferentStepsAreRefused() {
        List<BigDecimal> steps = java.util.stream.IntStream.rangeClosed(1, 13)
                .mapToObj(BigDecimal::valueOf)
                .toList();
        SteppedBank bank = new SteppedBank(steps, UNITY, 0, Optional.empty(), Optional.empty());
        assertThatThrownBy(() -> walk(bank, 1)).hasMessage("8192 combinations of steps; allowed: 4096");
    }

    private static SteppedWalk walk(SteppedBank bank, long... kvar) {
        long[] kwh = new long[kvar.length];
        java.util.Arrays.fill(kwh, 100);
        IntervalSeries series = new IntervalSeries(
                Instant.parse("2026-01-01T00:00:00Z"),
                60,
                ZoneId.of("UTC"),
                1,
                tenths(kwh),
                tenths(kvar),
                new long[kvar.length],
                Optional.empty(),
                new BitSet());
        return SteppedWalk.of(series, series.all(), DemandInterval.block(60), bank);
    }

    private static long[] tenths(long[] values) {
        return java.util.Arrays.stream(values).map(value -> value * 10).toArray();
    }

    private static long[] net(IntervalSeries series) {
        return java.util.stream.IntStream.range(0, series.size())
                .mapToLong(i -> (series.scaledLaggingKvarh(i) - series.scaledLeadingKvarh(i)) / 10)
                .toArray();
    }
}
