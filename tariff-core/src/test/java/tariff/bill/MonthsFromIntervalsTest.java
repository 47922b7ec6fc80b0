// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.time.LocalDate;
import java.time.ZonedDateTime;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Predicate;
import org.junit.jupiter.api.Test;
import tariff.json.RateFile;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalSeries;
import tariff.meter.InventedYear;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.meter.Period;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Site;
import tariff.meter.Unit;
import tariff.meter.WindowCalendar;
import tariff.notice.Refusal;
import tariff.rate.Rate;

/** Where a rate needs only totals, a month out of intervals is billed as the same month given as totals, under rates drawn at random. */
class MonthsFromIntervalsTest {
    private static final int RATES = 150;
    private static final Site SITE = new Site("", Map.of(Unit.KW, new BigDecimal("450")), Set.of());

    @Test
    void aMonthOfIntervalsIsBilledAsItsTotalsAre() {
        int billed = 0;
        for (int seed = 0; seed < RATES; seed++) {
            Rate rate = RateFile.parse(new RandomRates(seed).rate());
            LocalDate first = LocalDate.of(2026, 1 + seed % 12, 1);
            int step = seed % 2 == 0 ? 30 : 60;
            IntervalSeries series =
                    InventedYear.between(seed, "Europe/Berlin", step, first, first.plusMonths(2), new BitSet());
            List<MeteredMonth> byIntervals = new MonthlySums(
                            series, new WindowCalendar(series, rate.windows()), DemandInterval.block(step), true)
                    .months();
            List<MeteredMonth> byTotals = List.of(totals(series, first), totals(series, first.plusMonths(1)));
            List<String> expected = answer(rate, byTotals);
            assertThat(answer(rate, byIntervals)).as("seed %s", seed).isEqualTo(expected);
            billed += expected.get(0).startsWith("refused") ? 0 : 1;
        }
        assertThat(billed).isGreaterThan(RATES / 3);
    }

    /** Every amount as a bill prints it, or why there is none. */
    private static List<String> answer(Rate rate, List<MeteredMonth> months) {
        List<String> answer = new ArrayList<>();
        try {
            for (Statement statement : new Billing(rate, SITE).statements(months)) {
                statement.lines().forEach(line -> answer.add(printed(line.name(), line.amount())));
                answer.add(printed("total", statement.total()));
            }
        } catch (Refusal refusal) {
            return List.of("refused " + refusal.findings());
        }
        return answer;
    }

    /** Divisions keep 34 digits; what is beyond nobody bills. */
    private static String printed(String name, BigDecimal amount) {
        return name + " "
                + amount.setScale(15, RoundingMode.HALF_UP).stripTrailingZeros().toPlainString();
    }

    private static MeteredMonth totals(IntervalSeries series, LocalDate first) {
        LocalDate last = first.plusMonths(1).minusDays(1);
        Predicate<ZonedDateTime> inMonth =
                at -> !at.toLocalDate().isBefore(first) && !at.toLocalDate().isAfter(last);
        Predicate<ZonedDateTime> inDay = at -> at.getHour() >= 7 && at.getHour() < 21;
        return new MeteredMonth(new Period(first, last), added(series, inMonth))
                .withWindow("day", added(series, inMonth.and(inDay)));
    }

    private static Readings added(IntervalSeries series, Predicate<ZonedDateTime> counts) {
        Map<Register, BigDecimal> sums = new EnumMap<>(Register.class);
        BigDecimal perHour = BigDecimal.valueOf(series.perHour());
        for (int i = 0; i < series.size(); i++) {
            if (!counts.test(series.startOf(i).atZone(series.zone()))) {
                continue;
            }
            BigDecimal kwh = series.decimal(series.scaledKwh(i));
            BigDecimal lagging = series.decimal(series.scaledLaggingKvarh(i));
            BigDecimal leading = series.decimal(series.scaledLeadingKvarh(i));
            BigDecimal net = lagging.subtract(leading);
            BigDecimal kvah = kwh.multiply(kwh).add(net.multiply(net)).sqrt(MathContext.DECIMAL64);
            sums.merge(Register.ENERGY_KWH, kwh, BigDecimal::add);
            sums.merge(Register.LAGGING_KVARH, lagging, BigDecimal::add);
            sums.merge(Register.LEADING_KVARH, leading, BigDecimal::add);
            sums.merge(Register.APPARENT_KVAH, rounded(kvah, series), BigDecimal::add);
            sums.merge(Register.PEAK_KW, kwh.multiply(perHour), BigDecimal::max);
            sums.merge(Register.PEAK_LAGGING_KVAR, lagging.multiply(perHour), BigDecimal::max);
            sums.merge(Register.PEAK_LEADING_KVAR, leading.multiply(perHour), BigDecimal::max);
            sums.merge(Register.PEAK_KVA, rounded(kvah.multiply(perHour), series), BigDecimal::max);
        }
        return new Readings(sums);
    }

    private static BigDecimal rounded(BigDecimal value, IntervalSeries series) {
        return value.setScale(series.scale(), RoundingMode.HALF_UP);
    }
}
