// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static tariff.bill.Bills.rate;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.BitSet;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.json.RateFile;
import tariff.meter.IntervalSeries;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.meter.Period;
import tariff.meter.Site;
import tariff.notice.Refusal;

/** Rules that count by the hour or the quarter-hour. */
class HourlyBillsTest {
    private static final LocalDate DAY = LocalDate.of(2026, 3, 2);

    private static MeteredMonth series(int step, long[] kwh, long[] lagging) {
        IntervalSeries series = new IntervalSeries(
                Instant.parse("2026-03-02T00:00:00Z"),
                step,
                ZoneOffset.UTC,
                0,
                kwh,
                lagging,
                new long[kwh.length],
                Optional.empty(),
                new BitSet());
        return MonthlySums.of(series).month(new Period(DAY, DAY));
    }

    /** ANEEL Res. 414/2010: two hours of 100 kWh, one at PF 0.80 and one at 1: 100 × (0.92 ÷ 0.8 − 1) = 15 kWh; own arithmetic. */
    @Test
    void brazilianHoursAreChargedOneByOne() {
        String hourly = rate(
                "{ 'name': 'Excess', 'quantity': { 'each': 'hour', 'take': 'sum', 'of': { 'excess': { 'raised': { 'energy':"
                        + " 'kWh' }, 'by': { 'powerFactor': 'billing', 'ratioTo': 0.92 } }, 'over': { 'energy': 'kWh' } } }, 'price': 1 }");
        MeteredMonth month = series(60, new long[] {100, 100}, new long[] {75, 0});
        assertThat(Bills.bill(hourly, month).total()).isEqualByComparingTo("15.00");
        String monthly = rate(
                "{ 'name': 'Excess', 'quantity': { 'excess': { 'raised': { 'energy': 'kWh' }, 'by': { 'powerFactor':"
                        + " 'billing', 'ratioTo': 0.92 } }, 'over': { 'energy': 'kWh' } }, 'price': 1 }");
        assertThat(Bills.bill(monthly, month).total()).isEqualByComparingTo("0.00");
        PowerFactorCost cost =
                PowerFactorCost.of(new Billing(RateFile.parse(hourly), Site.unnamed()), List.of(), List.of(month));
        assertThat(cost.penalty()).isEqualByComparingTo("15.00");
    }

    /** Flemish technical regulation art. 6.1.8: 20 kWh at 1,000 kW agreed: free 0.0329 × 1,000 × 0.25 h = 8.225 kvarh, not 6.58. */
    @Test
    void aFreeShareWithAFloorIsTakenInEachQuarterHour() {
        String quarterly = rate(
                "{ 'name': 'Excess', 'quantity': { 'each': 'quarterHour', 'take': 'sum', 'of': { 'excess': { 'energy':"
                        + " 'lagging kvarh' }, 'over': { 'largest': [ { 'share': 0.329, 'of': { 'energy': 'kWh' } }, { 'hours': 0.25, 'of': {"
                        + " 'share': 0.0329, 'of': { 'agreed': 'kW' } } } ] } } }, 'price': 1000 }");
        MeteredMonth month = series(15, new long[] {20, 100}, new long[] {9, 33});
        Statement statement = Bills.bill(quarterly, Bills.agreed(tariff.meter.Unit.KW, "1000"), List.of(month))
                .get(0);
        // 9 − 8.225 = 0.775 in the first, 33 − 32.9 = 0.1 in the second
        assertThat(statement.total()).isEqualByComparingTo("875.00");
    }

    @Test
    void theMeanOfTheHighestDaysIsTakenOverTheDaysOwnPeaks() {
        String rate = rate(
                "{ 'name': 'Demand', 'quantity': { 'each': 'hour', 'take': 'meanOfHighest', 'count': 3, 'of': { 'peak': 'kW' } },"
                        + " 'price': 1 }");
        MeteredMonth month = series(60, new long[] {10, 70, 20, 50, 30}, new long[5]);
        assertThat(Bills.bill(rate, month).total()).isEqualByComparingTo("50.00");
    }

    /** A rounding to the ninth decimal changes nothing, but it keeps the sum out of whole numbers. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "{ 'excess': { 'energy': 'lagging kvarh' }, 'over': { 'share': 0.4843, 'of': { 'energy': 'kWh' } } }",
                "{ 'all': { 'energy': 'lagging kvarh' }, 'onceAbove': { 'share': 0.5, 'of': { 'energy': 'kWh' } } }",
                "{ 'largest': [ { 'energy': 'lagging kvarh' }, { 'hours': 0.25, 'of': { 'agreed': 'kW' } }, { 'energy': 'kWh' } ] }",
                "{ 'smallest': [ { 'energy': 'lagging kvarh' }, { 'constant': 17.25, 'unit': 'kvarh' } ] }",
                "{ 'sum': [ { 'energy': 'lagging kvarh' }, { 'share': -1, 'of': { 'energy': 'leading kvarh' } } ] }"
            })
    void sumsInWholeNumbersEqualSumsInDecimals(String quantity) {
        String sum =
                "{ 'name': 'X', 'quantity': { 'each': '%s', 'take': 'sum', 'of': %s }, 'price': 1, 'round': { 'to': 0.0000001 } }";
        String decimals = "{ 'rounded': " + quantity + ", 'to': 0.000000001 }";
        Random random = new Random(20260301);
        for (String cut : List.of("quarterHour", "halfHour", "hour", "day")) {
            long[] kwh = random.longs(96, 0, 60).toArray();
            long[] lagging = random.longs(96, 0, 40).toArray();
            MeteredMonth month = series(15, kwh, lagging);
            Site site = Bills.agreed(tariff.meter.Unit.KW, "100");
            assertThat(Bills.bill(rate(String.format(sum, cut, quantity)), site, List.of(month))
                            .get(0)
                            .lines()
                            .get(0)
                            .amount())
                    .isEqualTo(Bills.bill(rate(String.format(sum, cut, decimals)), site, List.of(month))
                            .get(0)
                            .lines()
                            .get(0)
                            .amount())
                    .isNotZero();
        }
    }

    @Test
    void aSeriesThatIsTooCoarseIsRefusedByName() {
        String rate = rate(
                "{ 'name': 'X', 'quantity': { 'each': 'quarterHour', 'take': 'sum', 'of': { 'energy': 'kWh' } }, 'price': 1 }");
        MeteredMonth month = series(60, new long[] {10}, new long[] {10});
        assertThatThrownBy(() -> Bills.bill(rate, month))
                .hasMessage(
                        "2026-03-02 to 2026-03-02: the rate counts by the quarter-hour; a series of 60 minutes has no quarter-hours");
    }

    @Test
    void aMonthOfTotalsIsRefusedByName() {
        String hourly = rate(
                "{ 'name': 'Excess', 'quantity': { 'each': 'hour', 'take': 'sum', 'of': { 'energy': 'kWh' } }, 'price': 1 }");
        assertThatThrownBy(() -> Bills.bill(hourly, Bills.baseMonth()))
                .isInstanceOf(Refusal.class)
                .hasMessage(
                        "2026-04: the rate counts by the hour; the bill gives only totals of the period, so give interval data");
    }
}
