// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.baseMonth;
import static tariff.bill.Bills.bill;
import static tariff.bill.Bills.energies;
import static tariff.bill.Bills.last;
import static tariff.bill.Bills.rate;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.PEAK_KW;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;

/** Floors and caps under lines, and ratchets: what a bill cannot fall below. */
class FloorsAndRatchetsTest {

    private static MeteredMonth kw(String month, String kw) {
        return MeteredMonth.of(month).with(PEAK_KW, kw);
    }

    /** Hood River Electric Cooperative: 3.70 × highest billed kW of 11 months, at least 100.00. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "20, 0, 100.00", // 3.70 × 20 = 74
        "100, 0, 370.00",
        "100, 370, 370.00", // at the floor
        "100, 371, 371.00",
        "100, 900, 900.00"
    })
    void aMinimumBillRestsOnTheHighestDemand(String pastKw, String usage, String total) {
        String rate = rate("""
                { 'name': 'Usage', 'quantity': { 'energy': 'kWh' }, 'price': 1 },
                { 'name': 'Minimum', 'of': ['Usage'], 'atLeast': { 'largest': [ { 'constant': 100, 'unit': 'money' }, { 'priced': {
                  'largest': [ { 'peak': 'kW' }, { 'earlier': 'highest', 'of': { 'peak': 'kW' }, 'months': 11 } ] }, 'at': 3.70 } ] } }""");
        List<MeteredMonth> months = List.of(
                kw("2026-03", pastKw).with(ENERGY_KWH, 5_000),
                kw("2026-04", "10").with(ENERGY_KWH, usage));
        assertThat(bill(rate, Site.unnamed(), months).get(1).total()).isEqualTo(total);
    }

    /** Metropolitan Electricity Authority, Bangkok: at least 70 % of the highest demand charge of 12 months. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({"100, 14000.00", "139, 14000.00", "140, 14000.00", "141, 14100.00"})
    void aFloorMayComeFromPastCharges(String kw, String total) {
        String rate = rate("""
                { 'name': 'Demand', 'quantity': { 'peak': 'kW' }, 'price': 100 },
                { 'name': 'Minimum', 'of': ['Demand'], 'atLeast': { 'share': 0.7, 'of': { 'earlier': 'highest', 'of': { 'amount': ['Demand'] },
                  'months': 11 } } }""");
        assertThat(bill(rate, Site.unnamed(), List.of(kw("2026-02", "200"), kw("2026-03", "50"), kw("2026-04", kw)))
                        .get(2)
                        .total())
                .isEqualTo(total);
    }

    /** When the minimum binds, power factor is worth nothing that month. Own arithmetic: 400 × 1 and 475 × 1 are both below 500. */
    @Test
    void aBindingMinimumSwallowsThePenalty() {
        String rate = rate("""
                { 'name': 'Demand', 'quantity': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing', 'ratioTo': 0.95 } }, 'price': 1 },
                { 'name': 'Minimum', 'of': 'all above', 'atLeast': { 'constant': 500, 'unit': 'money' } }""");
        MeteredMonth month = baseMonth();
        assertThat(bill(rate, month).total()).isEqualTo("500.00");
        assertThat(bill(rate, month.with(tariff.meter.Register.LAGGING_KVARH, 0))
                        .total())
                .isEqualTo("500.00");
    }

    /** A surcharge capped at 20 % of the energy line; common practice, no source. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({"10, 110.00", "20, 120.00", "21, 120.00", "90, 120.00"})
    void aCapTakesAwayWhatIsTooMuch(String surcharge, String total) {
        String rate = rate("""
                { 'name': 'Energy', 'quantity': { 'constant': 100 }, 'price': 1 },
                { 'name': 'Surcharge', 'quantity': { 'energy': 'kWh' }, 'price': 1 },
                { 'name': 'Cap', 'of': ['Surcharge'], 'atMost': { 'share': 0.2, 'of': { 'amount': ['Energy'] } } }""");
        assertThat(bill(rate, energies(surcharge, "0")).total()).isEqualTo(total);
    }

    /** The lower of two ways to bill: lines that are only shown, and the smaller of their sums. Common practice, no source. */
    @ParameterizedTest
    @CsvSource({"100, 40.00", "400, 160.00", "500, 200.00", "600, 230.00"})
    void theLowerOfTwoGroupsOfLinesIsCharged(String kwh, String total) {
        String rate = rate("""
                { 'name': 'A energy', 'shownOnly': true, 'quantity': { 'energy': 'kWh' }, 'price': 0.40 },
                { 'name': 'B standing', 'shownOnly': true, 'quantity': { 'constant': 1 }, 'price': 50 },
                { 'name': 'B energy', 'shownOnly': true, 'quantity': { 'energy': 'kWh' }, 'price': 0.30 },
                { 'name': 'Bill', 'quantity': { 'smallest': [ { 'amount': ['A energy'] }, { 'amount': ['B standing', 'B energy'] } ] },
                  'price': 1 }""");
        assertThat(bill(rate, energies(kwh, "0")).total()).isEqualTo(total);
    }

    private static String billedKw(String others) {
        return rate(
                "{ 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kW' }, " + others + " ] }, 'price': 1 }");
    }

    /** Osage Municipal Utilities, Iowa: 75 % of the last 11 months, never below 20 kW. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({"20, 10, 20.00", "40, 10, 30.00", "40, 30, 30.00", "40, 31, 31.00"})
    void aRatchetMayHaveAFloor(String past, String now, String billed) {
        String rate =
                billedKw("{ 'share': 0.75, 'of': { 'earlier': 'highest', 'of': { 'peak': 'kW' }, 'months': 11 } },"
                        + " { 'constant': 20, 'unit': 'kW' }");
        assertThat(last(bill(rate, Site.unnamed(), List.of(kw("2026-03", past), kw("2026-04", now)))
                        .get(1)))
                .isEqualTo(billed);
    }

    /** City of Columbia, Missouri: 75 % of June to September within the last 11 months. Own arithmetic. */
    @Test
    void onlySummerMonthsHoldTheDemandUp() {
        String rate = billedKw(
                "{ 'share': 0.75, 'of': { 'earlier': 'highest', 'of': { 'peak': 'kW' }, 'months': 11, 'onlyIn': [6, 7, 8, 9] } }");
        List<MeteredMonth> months = List.of(
                kw("2025-05", "900"),
                kw("2025-09", "800"),
                kw("2025-12", "1000"),
                kw("2026-01", "400"),
                kw("2026-08", "100"));
        List<Statement> bills = bill(rate, Site.unnamed(), months);
        assertThat(last(bills.get(3))).isEqualTo("600.00");
    }

    /** A ratchet on billed demand feeds on itself: 0.5 × of 100 is 50, of 50 is 25. Common practice, no source. */
    @Test
    void aRatchetMayLookAtBilledDemand() {
        String rate = rate("", """
                'quantities': { 'billed': { 'largest': [ { 'peak': 'kW' },
                  { 'share': 0.9, 'of': { 'earlier': 'highest', 'of': 'billed', 'months': 1 } } ] } },""", """
                { 'name': 'Demand', 'quantity': 'billed', 'price': 1 }""");
        List<Statement> bills =
                bill(rate, Site.unnamed(), List.of(kw("2026-01", "100"), kw("2026-02", "10"), kw("2026-03", "10")));
        // 100, then 0.9 × 100, then 0.9 × 90
        assertThat(bills).extracting(Bills::last).containsExactly("100.00", "90.00", "81.00");
    }

    /** 80 % of the previous 11, 10.00 each kVA, 500 falling to 380: saves 12,200.00 in the first year, 14,400.00 in a settled one. */
    @Test
    void theFirstYearSavesLessThanASettledOne() {
        String rate = rate("""
                { 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kW' },
                  { 'share': 0.8, 'of': { 'earlier': 'highest', 'of': { 'peak': 'kW' }, 'months': 11 } } ] }, 'price': 10 }""");
        List<MeteredMonth> months = new ArrayList<>();
        for (int i = 0; i < 36; i++) {
            months.add(kw(java.time.YearMonth.of(2025, 1).plusMonths(i).toString(), i < 12 ? "500" : "380"));
        }
        List<Statement> bills = bill(rate, Site.unnamed(), months);
        assertThat(year(bills, 0).subtract(year(bills, 1))).isEqualTo("12200.00");
        assertThat(year(bills, 0).subtract(year(bills, 2))).isEqualTo("14400.00");
    }

    private static BigDecimal year(List<Statement> bills, int year) {
        return bills.subList(12 * year, 12 * year + 12).stream()
                .map(Statement::total)
                .reduce(BigDecimal.ZERO, BigDecimal::add);
    }

    @Test
    void aShortHistoryIsSaidBesideTheFigure() {
        String rate =
                billedKw("{ 'share': 0.75, 'of': { 'earlier': 'highest', 'of': { 'peak': 'kW' }, 'months': 11 } }");
        assertThat(bill(rate, Site.unnamed(), List.of(kw("2026-03", "40"), kw("2026-04", "10")))
                        .get(1)
                        .assumptions())
                .extracting("message")
                .containsExactly(
                        "the highest value of the highest kW in the previous 11 months: only 1 of 11 earlier months are given;"
                                + " the others are taken not to matter");
    }
}
