// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.BitSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.function.DoubleSupplier;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.bill.Billing;
import tariff.bill.Bills;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.json.RateFile;
import tariff.meter.IntervalSeries;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.meter.Site;
import tariff.notice.Assumption;

/** Own simulation: invented years whose weeks are sampled again and again, and the truth of all of them. */
class SampleWeeksTest {
    private static final Billing BILLING = new Billing(
            RateFile.parse(
                    Bills.rate("{ 'name': 'Reactive', 'quantity': { 'energy': 'lagging kvarh' }, 'price': 0.02 }")),
            Site.unnamed());
    private static final int WEEK = 7 * 24;
    private static final int WEEKS = 52;

    // weeks that are independent of one another need the larger answer, weeks as alike as their months the smaller
    @ParameterizedTest
    @CsvSource({"1, true", "2, true", "3, true", "4, false", "5, false", "6, false"})
    void soManyWeeksSettleTheKvarhAboutNineTimesInTen(long seed, boolean independent) {
        IntervalSeries year = year(seed, independent);
        SampleWeeks weeks = answer(year, 100).orElseThrow();
        int enough = independent ? weeks.most() : weeks.fewest();
        assertThat(enough).as("neither nothing nor everything").isBetween(2, 51);
        assertThat(settled(year, 100, enough)).as("%s", weeks).isGreaterThan(0.8);
    }

    @ParameterizedTest
    @CsvSource({"1, true", "2, true", "4, false", "5, false"})
    void farFewerDoNot(long seed, boolean independent) {
        IntervalSeries year = year(seed, independent);
        SampleWeeks weeks = answer(year, 100).orElseThrow();
        assertThat(settled(year, 100, Math.max(1, weeks.fewest() / 4))).isLessThan(0.8);
    }

    @Test
    void nothingIsAskedForWhereTheBillsAlreadySayIt() {
        assertThat(answer(year(1, true), 2_000))
                .as("a bank above every peak leaves nothing open")
                .isEmpty();
        assertThat(SampleWeeks.of(Map.of())).isEmpty();
    }

    @Test
    void theRemedyOfTheOpenSpreadNamesTheWeeks() {
        IntervalSeries year = year(1, true);
        SampleWeeks weeks = answer(year, 100).orElseThrow();
        assertThat(Assessment.of(BILLING, totals(year), Proposal.of(CapacitorBank.fixed("100")))
                        .assumptions())
                .filteredOn(each -> each.code().equals("kvarh-spread"))
                .extracting(Assumption::remedy)
                .containsExactly("interval data settle it; " + weeks.words()
                        + " of them, spread over the year, would bring the kvarh taken off to within about 10 %");
    }

    private static Optional<SampleWeeks> answer(IntervalSeries year, int kvar) {
        Assessment assessment =
                Assessment.of(BILLING, totals(year), Proposal.of(CapacitorBank.fixed(BigDecimal.valueOf(kvar))));
        return SampleWeeks.of(Map.of(
                Estimate.LOW, assessment.savings(Estimate.LOW),
                Estimate.CENTRAL, assessment.savings(Estimate.CENTRAL),
                Estimate.HIGH, assessment.savings(Estimate.HIGH)));
    }

    private static List<MeteredMonth> totals(IntervalSeries year) {
        return MonthlySums.of(year).months().stream()
                .map(month -> new MeteredMonth(month.period(), month.totals()))
                .toList();
    }

    /** A day shift and nights, at a level that changes from week to week or from month to month. */
    private static IntervalSeries year(long seed, boolean independent) {
        Random random = new Random(seed);
        DoubleSupplier level = () -> 0.15 + 1.1 * random.nextDouble();
        double[] weekly = IntStream.range(0, WEEKS + 1)
                .mapToDouble(week -> level.getAsDouble())
                .toArray();
        double[] monthly =
                IntStream.range(0, 12).mapToDouble(month -> level.getAsDouble()).toArray();
        int size = 365 * 24;
        long[] kvarh = new long[size];
        for (int i = 0; i < size; i++) {
            double now = independent ? weekly[i / WEEK] : monthly[i * 12 / size];
            boolean shift = i % 24 >= 6 && i % 24 < 20;
            kvarh[i] = Math.round(now * (shift ? 200 : 50) + 10 * random.nextDouble());
        }
        return new IntervalSeries(
                Instant.parse("2025-01-01T00:00:00Z"),
                60,
                ZoneOffset.UTC,
                0,
                new long[size],
                kvarh,
                new long[size],
                Optional.empty(),
                new BitSet());
    }

    /** How often a sample of weeks, scaled by the billed kvarh, comes within a tenth of the truth. */
    private static double settled(IntervalSeries year, int kvar, int weeks) {
        Random random = new Random(99);
        double truth = share(year, kvar, IntStream.range(0, WEEKS).toArray());
        int draws = 1_000;
        long within = IntStream.range(0, draws)
                .filter(draw -> Math.abs(share(
                                                year,
                                                kvar,
                                                random.ints(0, WEEKS)
                                                        .distinct()
                                                        .limit(weeks)
                                                        .toArray())
                                        / truth
                                - 1)
                        <= 0.1)
                .count();
        return (double) within / draws;
    }

    private static double share(IntervalSeries year, int kvar, int[] weeks) {
        double all = 0;
        double removed = 0;
        for (int week : weeks) {
            for (int i = week * WEEK; i < (week + 1) * WEEK; i++) {
                all += year.scaledLaggingKvarh(i);
                removed += Math.min(kvar, year.scaledLaggingKvarh(i));
            }
        }
        return removed / all;
    }
}
