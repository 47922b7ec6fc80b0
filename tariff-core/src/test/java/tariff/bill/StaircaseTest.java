// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.baseMonth;
import static tariff.bill.Bills.rate;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;

import java.math.BigDecimal;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.bill.Staircase.Step;
import tariff.json.RateFile;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Site;

/** Own arithmetic throughout, on the base month: 160,000 kWh, 120,000 kvarh, 400 kW, power factor 0.80. */
class StaircaseTest {
    private static final String DEMAND = "{ 'name': 'Demand', 'quantity': { 'peak': 'kW' }, 'price': 10 },";

    private static String surcharge(String points) {
        return rate(DEMAND + """
                { 'name': 'Surcharge', 'percentOf': 'all above', 'schedule': { 'powerFactor': 'billing',
                  'slopes': [ { 'below': 0.95, 'perPoint': 1 } ], 'points': '%s' } }""".formatted(points));
    }

    private static Staircase ahead(String rate, MeteredMonth month) {
        return Staircase.of(new Billing(RateFile.parse(rate), Site.unnamed()), List.of(), List.of(month))
                .get(0);
    }

    private static Step step(String rate, MeteredMonth month) {
        return ahead(rate, month).nextStep().orElseThrow();
    }

    private static String plain(BigDecimal number) {
        return number.stripTrailingZeros().toPlainString();
    }

    /** 4,000.00 of demand at 1 % a point: 0.80 pays 15 points, 0.81 pays 14; 400 × (0.75 − 0.723988…) = 10.41 kvar. */
    @Test
    void underStartedPointsTheNextPointIsWorthAWholeOne() {
        Staircase ahead = ahead(surcharge("started"), baseMonth());
        assertThat(ahead.powerFactor().orElseThrow()).isEqualByComparingTo("0.80");
        assertThat(ahead.nextPoint()).isEqualByComparingTo("40.00");
        Step step = ahead.nextStep().orElseThrow();
        assertThat(step.saving()).isEqualByComparingTo("40.00");
        assertThat(step.at().improvement()).isEqualByComparingTo("0.01");
        assertThat(step.at().powerFactor().orElseThrow()).isEqualByComparingTo("0.81");
        assertThat(step.at().kvar().orElseThrow()).isEqualByComparingTo("10.41");
        assertThat(step.beyond()).isFalse();
    }

    @ParameterizedTest
    @CsvSource({
        // better by | bill; own arithmetic on 4,000.00
        "0,     4600.00",
        "0.003, 4600.00",
        "0.009999, 4600.00",
        "0.01,  4560.00",
        "0.013, 4560.00",
        "0.15,  4000.00"
    })
    void threeTenthsOfAStartedPointAreWorthNothing(BigDecimal better, BigDecimal bill) {
        Billing billing = new Billing(RateFile.parse(surcharge("started")), Site.unnamed());
        assertThat(new MonthCurve(new BetterYear(billing, List.of(baseMonth())), 0).bill(better))
                .isEqualByComparingTo(bill);
    }

    @Test
    void anExactSlopeHasNoStepAndTheSameWorth() {
        Staircase ahead = ahead(surcharge("exact"), baseMonth());
        assertThat(ahead.nextPoint()).isEqualByComparingTo("40.00");
        assertThat(ahead.nextStep()).isEmpty();
    }

    /** Completed points: 0.80 pays 15, anything above 14; so the step must be exceeded, not only reached. */
    @Test
    void underCompletedPointsTheStepLiesJustBeyondTheMonthItself() {
        Step step = step(surcharge("completed"), baseMonth());
        assertThat(step.at().powerFactor().orElseThrow()).isEqualByComparingTo("0.80");
        assertThat(step.beyond()).isTrue();
        assertThat(step.saving()).isEqualByComparingTo("40.00");
    }

    /** Bands of Salta (ENRESP Res. 527/21): below 0.75 20 %, 0.75 to 0.85 10 %; 200,000 kvarh are 0.6247. */
    @ParameterizedTest
    @CsvSource({"120000, 0.85, 400", "200000, 0.75, 400"})
    void aBandEndsInACliff(String kvarh, BigDecimal powerFactor, BigDecimal saving) {
        String bands = rate(DEMAND + """
                { 'name': 'Surcharge', 'percentOf': 'all above', 'schedule': { 'powerFactor': 'billing', 'bands': [
                  { 'below': 0.75, 'value': 20 }, { 'below': 0.85, 'value': 10 }, { 'value': 0 } ] } }""");
        Step step = step(bands, baseMonth().with(LAGGING_KVARH, kvarh));
        assertThat(step.at().powerFactor().orElseThrow()).isEqualByComparingTo(powerFactor);
        assertThat(step.saving()).isEqualByComparingTo(saving);
    }

    /** All kvarh once above 20 % of kWh: PF 1 ÷ √1.04 = 0.980580…; 32,000 kvarh × 0.05 fall away at once. Rule of Turkey, price invented. */
    @Test
    void allKvarhFallAwayWhereTheyDoNotExceedTheirLimit() {
        String cliff = rate("""
                { 'name': 'Reactive energy', 'price': 0.05, 'quantity': { 'all': { 'energy': 'lagging kvarh' },
                  'onceAbove': { 'share': 0.2, 'of': { 'energy': 'kWh' } } } }""");
        Step step = step(cliff, baseMonth());
        assertThat(step.at().powerFactor().orElseThrow())
                .isBetween(new BigDecimal("0.9805806"), new BigDecimal("0.9805808"));
        assertThat(step.saving()).isBetween(new BigDecimal("1599.95"), new BigDecimal("1600.00"));
    }

    /** Billed kW in whole kW move 10.00 at a time, six times in a point: a slope with treads, not a step. */
    @Test
    void wholeKilowattsOfALargeDemandAreNoStep() {
        String whole = rate("""
                { 'name': 'Demand', 'quantity': { 'rounded': { 'raised': { 'peak': 'kW' },
                  'by': { 'powerFactor': 'billing', 'ratioTo': 0.95, 'atLeast': 0 } }, 'to': 1 }, 'price': 10 }""");
        assertThat(ahead(whole, baseMonth()).nextStep()).isEmpty();
    }

    @Test
    void withoutEnergyThereIsNothingAhead() {
        Staircase ahead =
                ahead(surcharge("started"), baseMonth().with(ENERGY_KWH, 0).with(LAGGING_KVARH, 0));
        assertThat(ahead.powerFactor()).isEmpty();
        assertThat(ahead.nextPoint()).isEqualByComparingTo("0");
        assertThat(ahead.nextStep()).isEmpty();
        assertThat(ahead.flat()).isEmpty();
    }

    /** Where the last cent is saved: own arithmetic; 1 ÷ √(1 + 0.33²) = 0.949627. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "{ 'name': 'kvarh', 'quantity': { 'energy': 'lagging kvarh' }, 'blocks': [ { 'upTo': { 'share': 0.33, 'of': { 'energy': 'kWh' } }, 'price': 0 }, { 'price': 0.04 } ] } | 0.9497",
                "{ 'name': 'kW', 'quantity': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing', 'ratioTo': 0.90, 'atLeast': 0 } }, 'price': 10 } | 0.9",
                "{ 'name': 'kVA', 'quantity': { 'peak': 'kVA' }, 'price': 10 } | 1"
            })
    void savingsEndWhereTheClauseDoes(String line, String powerFactor) {
        Staircase ahead = ahead(rate(line), baseMonth());
        assertThat(plain(ahead.flat().orElseThrow().powerFactor().orElseThrow()))
                .isEqualTo(powerFactor);
    }

    /** A penalty below 0.90 and a credit above it up to 2.5 %, reached at 0.95: savings go on to 0.95. Own arithmetic. */
    @Test
    void creditsAboveTheTargetStillCountAsSavings() {
        String credit = rate(DEMAND + """
                { 'name': 'Adjustment', 'percentOf': 'all above', 'schedule': { 'powerFactor': 'billing', 'atLeast': -2.5,
                  'slopes': [ { 'below': 0.90, 'perPoint': 1 }, { 'above': 0.90, 'perPoint': -0.5 } ] } }""");
        assertThat(plain(ahead(credit, baseMonth())
                        .flat()
                        .orElseThrow()
                        .powerFactor()
                        .orElseThrow()))
                .isEqualTo("0.95");
        MeteredMonth good = baseMonth().with(LAGGING_KVARH, 64_000);
        assertThat(ahead(credit, good).nextPoint()).isEqualByComparingTo("20.00");
    }

    /** Base month with 30,000 kvarh leading added: 0.729537…; one point better leaves the leading kvarh as they are. */
    @Test
    void addedLeadingKvarhStayWhileThePowerFactorRisesByOnePoint() {
        String added = rate("'billing': { 'from': 'energies', 'leading': 'added' }", "", DEMAND + """
                { 'name': 'Surcharge', 'percentOf': 'all above', 'schedule': { 'powerFactor': 'billing',
                  'slopes': [ { 'below': 0.95, 'perPoint': 1 } ] } }""");
        MeteredMonth month = baseMonth().with(LEADING_KVARH, 30_000);
        Staircase ahead = ahead(added, month);
        assertThat(ahead.powerFactor().orElseThrow()).isBetween(new BigDecimal("0.729536"), new BigDecimal("0.729538"));
        assertThat(ahead.nextPoint()).isEqualByComparingTo("40.00");
    }

    /** 500 kVA at 10.00: 400 ÷ 0.81 = 493.83 kVA with the peak, 61.73 saved; windows move alike. */
    @Test
    void kvaAndWindowsMoveWithThePoint() {
        String kva = rate(
                "'billing': { 'from': 'peak', 'in': 'day' }",
                "'windows': { 'day': { 'from': '07:00', 'to': '21:00' } },",
                """
                { 'name': 'kVA', 'quantity': { 'peak': 'kVA', 'in': 'day' }, 'price': 10 }""");
        Readings day = Readings.none().with(PEAK_KW, 400).with(PEAK_KVA, 500);
        MeteredMonth month = MeteredMonth.of("2026-04").withWindow("day", day);
        assertThat(ahead(kva, month).nextPoint()).isEqualByComparingTo("61.73");
    }

    /** 80 % of the highest of the months before holds the bill today; had they been better too, the point would be worth its price. */
    @Test
    void aRatchetHidesNothing() {
        String ratchet = rate("""
                { 'name': 'kVA', 'quantity': { 'largest': [ { 'peak': 'kVA' }, { 'share': 0.8, 'of': { 'earlier': 'highest',
                  'of': { 'peak': 'kVA' }, 'months': 11 } } ] }, 'price': 10 }""");
        MeteredMonth winter = MeteredMonth.of("2026-03").with(PEAK_KW, 800).with(PEAK_KVA, 1000);
        Billing billing = new Billing(RateFile.parse(ratchet), Site.unnamed());
        List<Staircase> both = Staircase.of(billing, List.of(winter), List.of(baseMonth()));
        // 0.8 × (1,000 − 800 ÷ 0.81) × 10 = 98.765…: 8,000.00 less 7,901.23
        assertThat(both.get(0).nextPoint()).isEqualByComparingTo("98.77");
    }

    /** Two hours of 100 kWh, one with 75 kvarh: at 0.81 in that hour 72.40 kvarh, so 2.60 × 1.00 less. Own arithmetic. */
    @Test
    void insideAMonthEveryHourIsBetter() {
        String hourly = rate("""
                { 'name': 'kvarh', 'quantity': { 'each': 'hour', 'take': 'sum', 'of': { 'energy': 'lagging kvarh' } }, 'price': 1 }""");
        MeteredMonth first = MeteredMonth.of("2026-04").with(ENERGY_KWH, 100).with(LAGGING_KVARH, 75);
        MeteredMonth second = MeteredMonth.of("2026-04").with(ENERGY_KWH, 100).with(LAGGING_KVARH, 0);
        MeteredMonth month = MeteredMonth.of("2026-04")
                .with(ENERGY_KWH, 200)
                .with(LAGGING_KVARH, 75)
                .withDetail(cut -> List.of(first, second));
        Staircase ahead = ahead(hourly, month);
        assertThat(ahead.nextPoint()).isEqualByComparingTo("2.60");
        assertThat(ahead.flat()).isPresent();
    }

    /** Nothing reactive is billed: nothing lies ahead. */
    @Test
    void aRateWithoutReactiveClauseIsFlatFromTheStart() {
        Staircase ahead = ahead(rate("{ 'name': 'Demand', 'quantity': { 'peak': 'kW' }, 'price': 10 }"), baseMonth());
        assertThat(ahead.nextPoint()).isEqualByComparingTo("0");
        assertThat(ahead.flat()).isEmpty();
        assertThat(ahead.nextStep()).isEmpty();
    }
}
