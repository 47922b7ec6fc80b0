// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.agreed;
import static tariff.bill.Bills.baseMonth;
import static tariff.bill.Bills.bill;
import static tariff.bill.Bills.last;
import static tariff.bill.Bills.rate;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.PEAK_KW;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.meter.Charged;
import tariff.meter.MeteredMonth;
import tariff.meter.Period;
import tariff.meter.Readings;
import tariff.meter.Site;
import tariff.meter.Unit;

/** What stands around the clause on power factor: discounts, seasons, parts of months, taxes. */
class ModifiersBillsTest {

    private static MeteredMonth kw(String month, String kw) {
        return MeteredMonth.of(month).with(PEAK_KW, kw);
    }

    private static Site primaryMetered() {
        return new Site("a site", Map.of(), Set.of("primary metered"));
    }

    private static MeteredMonth period(String first, String last, Readings readings) {
        return new MeteredMonth(new Period(LocalDate.parse(first), LocalDate.parse(last)), readings);
    }

    /** BC Hydro, general service: 1.5 % of the whole bill, then 0.25 per kW; on 10,000 and 400 kW. Own arithmetic. */
    @Test
    void theOrderOfDiscountsIsWorthMoney() {
        String percentFirst = rate("""
                { 'name': 'Bill', 'quantity': { 'constant': 10000 }, 'price': 1 },
                { 'name': 'Metering', 'percentOf': 'all above', 'percent': -1.5 },
                { 'name': 'Transformer', 'quantity': { 'peak': 'kW' }, 'price': -0.25 }""");
        String kilowattsFirst = rate("""
                { 'name': 'Bill', 'quantity': { 'constant': 10000 }, 'price': 1 },
                { 'name': 'Transformer', 'quantity': { 'peak': 'kW' }, 'price': -0.25 },
                { 'name': 'Metering', 'percentOf': 'all above', 'percent': -1.5 }""");
        assertThat(bill(percentFirst, baseMonth()).total()).isEqualTo("9750.00");
        assertThat(bill(kilowattsFirst, baseMonth()).total()).isEqualTo("9751.50");
    }

    /**
     * Primary metered: Columbia, Missouri −2 % of kWh and kW; Osage, Iowa −2.5 % of kWh. Low side metered: Batavia, Illinois +1 %, Mexico
     * +2 % (Manual of 21 Feb 2013, disposition 30). Own arithmetic on A at 1 a unit.
     */
    @ParameterizedTest
    @CsvSource({"-2,   kWh, -3200.00", "-2.5, kWh, -4000.00", "1,    kWh, 1600.00", "2,    kWh, 3200.00"})
    void aMeteringAdjustmentHoldsOnlyForSitesMarkedSo(String percent, String register, String adjustment) {
        String rate = rate("""
                { 'name': 'Energy', 'quantity': { 'energy': '%s' }, 'price': 1 },
                { 'name': 'Metering', 'when': { 'option': 'primary metered' }, 'percentOf': ['Energy'], 'percent': %s }""".formatted(register, percent));
        assertThat(last(bill(rate, primaryMetered(), List.of(baseMonth())).get(0)))
                .isEqualTo(adjustment);
        assertThat(bill(rate, Site.unnamed(), List.of(baseMonth())).get(0).total())
                .isEqualTo("160000.00");
    }

    /** Hood River Electric Cooperative: primary metered −5 % of charges, here before a tax of 6 % (invented). Own arithmetic. */
    @Test
    void aDiscountLowersTheTaxOnTop() {
        String rate = rate("""
                { 'name': 'Energy', 'quantity': { 'constant': 1000 }, 'price': 1 },
                { 'name': 'Primary', 'when': { 'option': 'primary metered' }, 'percentOf': 'all above', 'percent': -5 },
                { 'name': 'Tax', 'percentOf': 'all above', 'percent': 6 }""");
        assertThat(bill(rate, primaryMetered(), List.of(baseMonth())).get(0).total())
                .isEqualTo("1007.00");
        assertThat(bill(rate, baseMonth()).total()).isEqualTo("1060.00");
    }

    /** MEA, Bangkok: partial-peak demand is what exceeds the on-peak demand. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({"300, 400, 100.00", "400, 400, 0.00", "500, 400, 0.00"})
    void partialPeakDemandIsWhatExceedsTheOnPeak(String onPeak, String partial, String billed) {
        String rate = rate(
                "",
                "'windows': { 'peak': { 'from': '18:30', 'to': '21:30' }, 'partial': { 'from': '08:00', 'to': '18:30' } },",
                """
                { 'name': 'Partial peak', 'quantity': { 'excess': { 'peak': 'kW', 'in': 'partial' }, 'over': { 'peak': 'kW', 'in': 'peak' } },
                  'price': 1 }""");
        MeteredMonth month = MeteredMonth.of("2026-04")
                .withWindow("peak", Readings.none().with(PEAK_KW, onPeak))
                .withWindow("partial", Readings.none().with(PEAK_KW, partial));
        assertThat(last(bill(rate, month))).isEqualTo(billed);
    }

    private static String seasonal(String by) {
        return rate(
                "",
                "'seasons': { 'summer': { 'from': '06-01', 'to': '09-30' }, 'winter': { 'from': '10-01', 'to': '05-31' } },"
                        + " 'seasonBy': '" + by + "',",
                """
                { 'name': 'Demand', 'quantity': { 'peak': 'kW' }, 'price': { 'bySeason': { 'summer': 20, 'winter': 10 } } }""");
    }

    /** 22 May to 20 June: 10 days of winter, 20 of summer; statement of 5 July. Common practice, no source; own arithmetic on 100 kW. */
    @ParameterizedTest
    @CsvSource({"firstDay, 1000.00", "lastDay, 2000.00", "statementDate, 2000.00", "days, 1666.67"})
    void aPeriodAcrossTwoSeasonsIsPricedAsTheRateSays(String by, String charge) {
        MeteredMonth plain = period("2026-05-22", "2026-06-20", Readings.none().with(PEAK_KW, 100));
        MeteredMonth month = new MeteredMonth(
                plain.period(),
                plain.totals(),
                Map.of(),
                Charged.nothingKnown(),
                Optional.of(LocalDate.parse("2026-07-05")),
                false,
                Optional.empty());
        assertThat(last(bill(seasonal(by), month))).isEqualTo(charge);
    }

    /** A statement after the season's end: 1 to 30 September, printed on 5 October, is winter by its statement. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({"2026-09-30, 2000.00", "2026-10-01, 1000.00"})
    void theStatementDateMayLieInAnotherSeason(String day, String charge) {
        MeteredMonth month = new MeteredMonth(
                Period.of(java.time.YearMonth.of(2026, 9)),
                Readings.none().with(PEAK_KW, 100),
                Map.of(),
                Charged.nothingKnown(),
                Optional.of(LocalDate.parse(day)),
                false,
                Optional.empty());
        assertThat(last(bill(seasonal("statementDate"), month))).isEqualTo(charge);
    }

    /** A line that holds in one season only; most of 22 May to 20 June is summer, half of 17 May to 15 June is not most. */
    @ParameterizedTest
    @CsvSource({"2026-05-22, 2026-06-20, 7.00", "2026-05-17, 2026-06-15, 0.00", "2026-01-01, 2026-01-31, 0.00"})
    void aLineMayHoldInASeasonOnly(String first, String last, String charge) {
        String rate = rate(
                "",
                "'seasons': { 'summer': { 'from': '06-01', 'to': '09-30' }, 'winter': { 'from': '10-01', 'to': '05-31' } },",
                "{ 'name': 'Summer', 'when': { 'season': 'summer' }, 'quantity': { 'peak': 'kW' }, 'price': 1 }");
        assertThat(bill(rate, period(first, last, Readings.none().with(PEAK_KW, 7)))
                        .total())
                .isEqualTo(charge);
    }

    /** Price change inside the month: 400 kW, 10.00 for 12 of 31 days, 11.00 for 19; common practice, no source. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({"2026-03, 4245.16", "2026-02, 4000.00", "2026-04, 4400.00"})
    void aPriceChangeIsWeighedByDays(String month, String charge) {
        String rate = rate("""
                { 'name': 'Demand', 'quantity': { 'peak': 'kW' }, 'price': { 'byDate': [ { 'from': '2025-01-01', 'price': 10 },
                  { 'from': '2026-03-13', 'price': 11 } ] } }""");
        assertThat(last(bill(rate, kw(month, "400")))).isEqualTo(charge);
    }

    /** CLP Power Hong Kong, business tariffs 2025: block edges × days ÷ 30, only outside 25 to 35 days; edge 5,000 invented. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "2026-01-01, 2026-01-24, 7000.00", // 24 days: 4,000 × 1 + 6,000 × 0.5
        "2026-01-01, 2026-01-25, 7500.00", // 25 days: 5,000 × 1 + 5,000 × 0.5
        "2026-01-01, 2026-01-31, 7500.00",
        "2026-01-01, 2026-02-04, 7500.00", // 35 days
        "2026-01-01, 2026-02-05, 8000.00" // 36 days: 6,000 × 1 + 4,000 × 0.5
    })
    void blockEdgesFollowTheDaysOfAnUnusualPeriod(String first, String last, String charge) {
        String rate = rate("""
                { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'blocks': [ { 'upTo': { 'prorated': { 'constant': 5000, 'unit': 'kWh' },
                  'perDays': 30, 'unlessDays': [25, 35] }, 'price': 1 }, { 'price': 0.5 } ] }""");
        assertThat(bill(rate, period(first, last, Readings.none().with(ENERGY_KWH, 10_000)))
                        .total())
                .isEqualTo(charge);
    }

    /** Per-day prices × days of the period; common practice, no source. */
    @ParameterizedTest
    @CsvSource({"2026-02, 65.80", "2026-04, 70.50", "2028-02, 68.15"})
    void aStandingChargeCountsTheDays(String month, String charge) {
        String rate = rate("{ 'name': 'Standing', 'quantity': { 'days': 'period' }, 'price': 2.35 }");
        assertThat(last(bill(rate, kw(month, "1")))).isEqualTo(charge);
    }

    /** Blocks that run on across the year: what earlier months since January have used of 10,000 kWh. Common practice, no source. */
    @Test
    void aBlockOfTheYearIsUsedUpMonthByMonth() {
        String rate = rate("""
                { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'blocks': [ { 'upTo': { 'excess': { 'constant': 10000, 'unit': 'kWh' },
                  'over': { 'earlier': 'sum', 'of': { 'energy': 'kWh' }, 'since': 1 } }, 'price': 1 }, { 'price': 0.5 } ] }""");
        List<MeteredMonth> months = new ArrayList<>();
        for (String month : List.of("2025-12", "2026-01", "2026-02", "2026-03")) {
            months.add(MeteredMonth.of(month).with(ENERGY_KWH, 6_000));
        }
        // January 6,000 dear; February 4,000 dear, 2,000 cheap; March all cheap. December has lost its own year's past.
        assertThat(bill(rate, Site.unnamed(), months).subList(1, 4))
                .extracting(Bills::last)
                .containsExactly("6000.00", "5000.00", "3000.00");
    }

    /** St. Charles, Illinois and Chimney Rock PPD: a gross bill 10 % above net after the due date; shown beside the total. */
    @Test
    void aGrossBillIsShownAndNotCharged() {
        String rate = rate("""
                { 'name': 'Energy', 'quantity': { 'constant': 1000 }, 'price': 1 },
                { 'name': 'Late payment', 'shownOnly': true, 'percentOf': 'all above', 'percent': 10 },
                { 'name': 'Tax', 'percentOf': 'all above', 'percent': 5 }""");
        Statement statement = bill(rate, baseMonth());
        assertThat(statement.amount("Late payment")).isEqualTo("100.00");
        assertThat(statement.total()).isEqualTo("1050.00");
    }

    /** A fuel rider per kWh is not touched by power factor: 7.5 % of the demand alone. Own arithmetic on A. */
    @Test
    void aRiderStandsBelowThePowerFactorLine() {
        String rate = rate("""
                { 'name': 'Demand', 'quantity': { 'peak': 'kW' }, 'price': 10 },
                { 'name': 'Power factor', 'percentOf': 'all above', 'schedule': { 'powerFactor': 'billing', 'ratioTo': 0.9, 'below': 60 } },
                { 'name': 'Fuel', 'quantity': { 'energy': 'kWh' }, 'price': 0.01 },
                { 'name': 'Tax', 'percentOf': 'all above', 'percent': 10 }""");
        // 4,000 + 300 + 1,600, and a tenth
        assertThat(bill(rate, baseMonth()).total()).isEqualTo("6490.00");
    }

    /** A rate class that changes with demand: from 500 kW on another price. Common practice, no source. */
    @ParameterizedTest
    @CsvSource({"499.9, 4999.00", "500, 4000.00", "500.1, 4000.80"})
    void aClassChangesWithDemand(String kw, String charge) {
        String rate = rate("""
                { 'name': 'Small', 'when': { 'not': { 'quantity': { 'peak': 'kW' }, 'reaches': { 'constant': 500, 'unit': 'kW' } } },
                  'quantity': { 'peak': 'kW' }, 'price': 10 },
                { 'name': 'Large', 'when': { 'quantity': { 'peak': 'kW' }, 'reaches': { 'constant': 500, 'unit': 'kW' } },
                  'quantity': { 'peak': 'kW' }, 'price': 8 }""");
        assertThat(bill(rate, kw("2026-04", kw)).total()).isEqualTo(charge);
    }

    /** A credit on metered, not on billed, demand: 400 kW at −0.50, though 475 are billed. Common practice, no source. */
    @Test
    void aCreditMayLookAtMeteredDemand() {
        String rate = rate("'billing': { 'from': 'energies' }", """
                'quantities': { 'billed': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing', 'ratioTo': 0.95 } } },""", """
                { 'name': 'Demand', 'quantity': 'billed', 'price': 10 },
                { 'name': 'Transformer', 'quantity': { 'peak': 'kW' }, 'price': -0.50 }""");
        assertThat(bill(rate, baseMonth()).total()).isEqualTo("4550.00");
    }

    /** A loss factor of 2 % on kWh and kW of a site metered on the low side; common practice, no source. Own arithmetic on A. */
    @Test
    void lossesAreAFactorOnTheMeteredQuantity() {
        String rate = rate("""
                { 'name': 'Energy', 'quantity': { 'share': 1.02, 'of': { 'energy': 'kWh' } }, 'price': 0.1 },
                { 'name': 'Demand', 'quantity': { 'share': 1.02, 'of': { 'peak': 'kW' } }, 'price': 10 }""");
        // 163,200 × 0.1 + 408 × 10
        assertThat(bill(rate, baseMonth()).total()).isEqualTo("20400.00");
    }

    /** A contract that is not met: the floor is what is agreed, Kerala's 75 %; common practice without a contract is a refusal. */
    @Test
    void aMissingContractIsNamed() {
        String rate = rate(
                "{ 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kW' }, { 'agreed': 'kW' } ] }, 'price': 1 }");
        assertThat(last(bill(rate, agreed(Unit.KW, "450"), List.of(baseMonth())).get(0)))
                .isEqualTo("450.00");
        org.assertj.core.api.Assertions.assertThatThrownBy(() -> bill(rate, baseMonth()))
                .hasMessage("2026-04: the rate bills the agreed kW; the site gives none");
    }
}
