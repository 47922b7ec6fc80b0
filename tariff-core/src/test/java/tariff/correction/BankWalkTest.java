// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.BitSet;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalRange;
import tariff.meter.IntervalSeries;
import tariff.meter.InventedYear;
import tariff.meter.MonthlySums;
import tariff.meter.Readings;
import tariff.meter.Register;

class BankWalkTest {
    private static final BitSet SOME_ABSENT = BitSet.valueOf(new long[] {0, 0b1011, 0, 0b1});

    private final IntervalSeries year = InventedYear.between(
            21, "Europe/Berlin", 15, LocalDate.of(2026, 1, 1), LocalDate.of(2027, 1, 1), SOME_ABSENT);

    @Test
    void aBankOfNothingChangesNothing() {
        Readings before = MonthlySums.of(year).month(year.days()).totals();
        ReactiveOutcome after = BankWalk.fixed(year, year.all(), DemandInterval.block(15), BigDecimal.ZERO);
        assertThat(after.avoidedKvarh()).isEqualByComparingTo("0");
        assertThat(after.laggingKvarh())
                .isEqualByComparingTo(before.get(Register.LAGGING_KVARH).orElseThrow());
        assertThat(after.leadingKvarh())
                .isEqualByComparingTo(before.get(Register.LEADING_KVARH).orElseThrow());
        assertThat(after.peakKva())
                .isEqualByComparingTo(before.get(Register.PEAK_KVA).orElseThrow());
    }

    // Identity R⁺ − R⁻ = Q − c·T: x⁺ − (−x)⁺ = x
    @ParameterizedTest
    @ValueSource(ints = {5, 10, 15, 30, 60})
    void laggingLessLeadingFallsByTheBanksWholeOutput(int step) {
        IntervalSeries series = InventedYear.of(4, "America/New_York", step);
        ReactiveOutcome none = BankWalk.fixed(series, series.all(), DemandInterval.block(60), BigDecimal.ZERO);
        ReactiveOutcome some = BankWalk.fixed(series, series.all(), DemandInterval.block(60), new BigDecimal("87.5"));
        assertThat(none.laggingKvarh()
                        .subtract(none.leadingKvarh())
                        .subtract(some.laggingKvarh().subtract(some.leadingKvarh())))
                .isEqualByComparingTo(new BigDecimal("87.5").multiply(BigDecimal.valueOf(8760)));
    }

    @Test
    void walkAgreesWithACalculationIntervalByInterval() {
        BigDecimal lagging = BigDecimal.ZERO;
        BigDecimal leading = BigDecimal.ZERO;
        BigDecimal bank = new BigDecimal("60").divide(BigDecimal.valueOf(4));
        for (int i = 0; i < year.size(); i++) {
            if (!year.isAbsent(i)) {
                BigDecimal lag = year.decimal(year.scaledLaggingKvarh(i));
                BigDecimal lead = year.decimal(year.scaledLeadingKvarh(i));
                BigDecimal net = lag.subtract(lead).subtract(bank);
                lagging = lagging.add(lag.min(lead)).add(net.max(BigDecimal.ZERO));
                leading = leading.add(lag.min(lead)).add(net.negate().max(BigDecimal.ZERO));
            }
        }
        ReactiveOutcome walk = BankWalk.fixed(year, year.all(), DemandInterval.block(15), new BigDecimal("60"));
        assertThat(walk.laggingKvarh()).isEqualByComparingTo(lagging);
        assertThat(walk.leadingKvarh()).isEqualByComparingTo(leading);
    }

    @Test
    void theCorrectedSeriesGivesTheSameMonthAsTheWalk() {
        BigDecimal kvar = new BigDecimal("72.4");
        Readings totals = MonthlySums.of(BankWalk.corrected(year, kvar))
                .month(year.days())
                .totals();
        ReactiveOutcome walk = BankWalk.fixed(year, year.all(), DemandInterval.block(15), kvar);
        assertThat(walk.laggingKvarh())
                .isEqualByComparingTo(totals.get(Register.LAGGING_KVARH).orElseThrow());
        assertThat(walk.leadingKvarh())
                .isEqualByComparingTo(totals.get(Register.LEADING_KVARH).orElseThrow());
        assertThat(walk.peakKva())
                .isEqualByComparingTo(totals.get(Register.PEAK_KVA).orElseThrow());
        assertThat(walk.peakLaggingKvar())
                .isEqualByComparingTo(totals.get(Register.PEAK_LAGGING_KVAR).orElseThrow());
        assertThat(walk.peakLeadingKvar())
                .isEqualByComparingTo(totals.get(Register.PEAK_LEADING_KVAR).orElseThrow());
    }

    @Test
    void theCurveGivesWhatTheWalkGivesForAnySizeInAnyRange() {
        Random random = new Random(5);
        for (int i = 0; i < 40; i++) {
            int from = random.nextInt(year.size());
            IntervalRange range = new IntervalRange(from, from + random.nextInt(year.size() - from + 1));
            BigDecimal kvar = BigDecimal.valueOf(random.nextInt(300_000), 3);
            BankCurve.Point point = new BankCurve(year, range).after(kvar);
            ReactiveOutcome walk = BankWalk.fixed(year, range, DemandInterval.block(15), kvar);
            assertThat(point.laggingKvarh()).isEqualByComparingTo(walk.laggingKvarh());
            assertThat(point.leadingKvarh()).isEqualByComparingTo(walk.leadingKvarh());
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"-1", "1000001"})
    void aBankOutsideItsRangeIsRefused(String kvar) {
        assertThatThrownBy(() -> BankWalk.corrected(year, new BigDecimal(kvar)))
                .hasMessage("a bank of " + kvar + " kvar; allowed: 0 to 1000000");
    }
}
