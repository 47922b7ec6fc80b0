// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.BitSet;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalRange;
import tariff.meter.IntervalSeries;
import tariff.meter.InventedYear;
import tariff.meter.MonthlySums;
import tariff.meter.Period;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.WindowCalendar;

/** What the peaks of a bank are averaged over. */
class BankDemandTest {
    private static final LocalDate FIRST = LocalDate.of(2026, 3, 25);
    private static final BigDecimal SIXTY = new BigDecimal("60");

    /**
     * Own arithmetic: 60 kvar take 15 kvarh from each quarter-hour of 10, 40, 50 and 20, which leaves 5 leading, 25, 35 and 5 lagging.
     * The two in the middle have 60 kvarh and 45 kWh in half an hour: 120 kvar, 90 kW, 150 kVA. The blocks have 25 and 40 kvarh: 80 kvar.
     */
    @Test
    void aSlidingHalfHourFindsWhatBlocksMiss() {
        IntervalSeries series = quarterHours(new BitSet());
        ReactiveOutcome sliding = BankWalk.fixed(series, series.all(), DemandInterval.sliding(30), SIXTY);
        assertThat(sliding.peakLaggingKvar()).isEqualByComparingTo("120");
        assertThat(sliding.peakLeadingKvar()).isEqualByComparingTo("10");
        assertThat(sliding.peakKva()).isEqualByComparingTo("150");
        ReactiveOutcome blocks = BankWalk.fixed(series, series.all(), DemandInterval.block(30), SIXTY);
        assertThat(blocks.peakLaggingKvar()).isEqualByComparingTo("80");
        assertThat(blocks.laggingKvarh()).isEqualByComparingTo(sliding.laggingKvarh());
    }

    /** Own arithmetic, as above: without the third quarter-hour only the first two make a half-hour, 25 kvarh lagging. */
    @Test
    void aRunWithAnAbsentIntervalGivesNoDemand() {
        BitSet absent = new BitSet();
        absent.set(2);
        IntervalSeries series = quarterHours(absent);
        assertThat(BankWalk.fixed(series, series.all(), DemandInterval.sliding(30), SIXTY)
                        .peakLaggingKvar())
                .isEqualByComparingTo("50");
        assertThat(BankWalk.fixed(series, new IntervalRange(1, 4), DemandInterval.sliding(30), SIXTY)
                        .peakKva())
                .isEqualByComparingTo("0");
    }

    static Stream<Arguments> stepsAndDemands() {
        return IntStream.of(5, 15, 30)
                .boxed()
                .flatMap(step -> IntStream.of(5, 10, 15, 20, 30, 60)
                        .filter(minutes -> minutes % step == 0)
                        .boxed()
                        .flatMap(minutes ->
                                Stream.of(Arguments.of(step, minutes, false), Arguments.of(step, minutes, true))));
    }

    /** Three ways to the same peaks, the third run by run. Banks are multiples of 0.012 kvar, whose energy is exact at every step. */
    @ParameterizedTest
    @MethodSource("stepsAndDemands")
    void theWalkHasThePeaksOfTheCorrectedSeries(int step, int minutes, boolean sliding) {
        Random random = new Random(step * 1000L + minutes);
        DemandInterval demand = new DemandInterval(minutes, sliding);
        for (int round = 0; round < 20; round++) {
            IntervalSeries series = gappy(step, random);
            BigDecimal kvar = BigDecimal.valueOf(12L * random.nextInt(20_000), 3);
            LocalDate from = FIRST.plusDays(random.nextInt(6));
            Period days = new Period(from, from.plusDays(random.nextInt(3)));
            ReactiveOutcome walk = BankWalk.fixed(series, series.range(days), demand, kvar);
            IntervalSeries corrected = BankWalk.corrected(series, kvar);
            agree(walk, totals(corrected, demand, days));
            assertThat(walk.peakLaggingKvar()).isEqualByComparingTo(runByRun(corrected, demand, days));
        }
    }

    /** The same with steps, multiples of 12 kvar. */
    @ParameterizedTest
    @MethodSource("stepsAndDemands")
    void switchedStepsHaveThePeaksOfTheCorrectedSeries(int step, int minutes, boolean sliding) {
        DemandInterval demand = new DemandInterval(minutes, sliding);
        IntervalSeries series = gappy(step, new Random(minutes));
        SteppedBank bank = SteppedBank.of(SteppedBank.Target.kvar(BigDecimal.ZERO), "12", "24", "48", "96");
        Period days = series.days();
        SteppedWalk walk = SteppedWalk.of(series, series.all(), demand, bank);
        agree(walk.outcome(), totals(walk.corrected(), demand, days));
    }

    private static void agree(ReactiveOutcome walk, Readings totals) {
        assertThat(walk.laggingKvarh())
                .isEqualByComparingTo(totals.get(Register.LAGGING_KVARH).orElseThrow());
        assertThat(walk.peakLaggingKvar()).isEqualByComparingTo(peak(totals, Register.PEAK_LAGGING_KVAR));
        assertThat(walk.peakLeadingKvar()).isEqualByComparingTo(peak(totals, Register.PEAK_LEADING_KVAR));
        assertThat(walk.peakKva()).isEqualByComparingTo(peak(totals, Register.PEAK_KVA));
    }

    /** The highest lagging kvar by the definition of a demand: every run of intervals, added up anew. */
    private static BigDecimal runByRun(IntervalSeries series, DemandInterval demand, Period days) {
        IntervalRange range = series.range(days);
        int steps = demand.stepsIn(series);
        long highest = 0;
        for (int from = range.from(); from + steps <= range.to(); from += demand.sliding() ? 1 : steps) {
            if (IntStream.range(from, from + steps).noneMatch(series::isAbsent)) {
                highest = Math.max(
                        highest,
                        IntStream.range(from, from + steps)
                                .mapToLong(series::scaledLaggingKvarh)
                                .sum());
            }
        }
        return series.decimal(highest * demand.perHour());
    }

    /** A walk without a whole demand has a peak of 0, where readings have none. */
    private static BigDecimal peak(Readings totals, Register register) {
        return totals.get(register).orElse(BigDecimal.ZERO);
    }

    private static Readings totals(IntervalSeries series, DemandInterval demand, Period days) {
        return new MonthlySums(series, new WindowCalendar(series, Map.of()), demand, false)
                .month(days)
                .totals();
    }

    /** A week over the night in which clocks go forward, with single intervals and stretches that were not recorded. */
    private static IntervalSeries gappy(int step, Random random) {
        int size = (7 * 24 - 1) * 60 / step;
        BitSet absent = new BitSet(size);
        for (int gap = 0; gap < 12; gap++) {
            int from = random.nextInt(size);
            absent.set(from, Math.min(size, from + 1 + random.nextInt(gap % 2 == 0 ? 1 : 20)));
        }
        return InventedYear.between(random.nextLong(), "Europe/Berlin", step, FIRST, FIRST.plusDays(7), absent);
    }

    private static IntervalSeries quarterHours(BitSet absent) {
        return new IntervalSeries(
                Instant.parse("2026-01-01T00:00:00Z"),
                15,
                ZoneId.of("UTC"),
                0,
                new long[] {10, 20, 25, 10},
                new long[] {10, 40, 50, 20},
                new long[4],
                Optional.empty(),
                absent);
    }
}
