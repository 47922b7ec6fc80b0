// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.agreed;
import static tariff.bill.Bills.baseMonth;
import static tariff.bill.Bills.bill;
import static tariff.bill.Bills.last;
import static tariff.bill.Bills.rate;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.meter.MeteredMonth;
import tariff.meter.Unit;

/** Demand in kVA, and the larger of kW and a share of kVA. */
class ApparentDemandBillsTest {

    private static MeteredMonth peaks(String kw, String kva) {
        return MeteredMonth.of("2026-04").with(PEAK_KW, kw).with(PEAK_KVA, kva);
    }

    /** HK Electric, Choice of tariff: 1 min at 1,000, 20 at 200, 9 at 500 is 9,500 ÷ 30, printed as 317 kVA. */
    @Test
    void aDemandIsBilledInWholeKva() {
        String rate = rate("{ 'name': 'Demand', 'quantity': { 'rounded': { 'peak': 'kVA' }, 'to': 1 }, 'price': 1 }");
        assertThat(last(bill(rate, peaks("300", "316.666667")))).isEqualTo("317.00");
    }

    /** Kerala SERC, schedule from 1 Dec 2007: floor 75 % of contract, 150 % above it; 300 per kVA invented. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "300,    101250.00", // floor: 337.5 × 300
        "337.5,  101250.00", // at the floor
        "337.51, 101253.00",
        "450,    135000.00", // at the contract
        "450.01, 135004.50", // 0.01 × 450 more
        "500,    157500.00"
    })
    void contractDemandIsAFloorAndTheBeginningOfTheOverrun(String kva, String charge) {
        String rate = rate("""
                { 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kVA' }, { 'share': 0.75, 'of': { 'agreed': 'kVA' } } ] },
                  'blocks': [ { 'upTo': { 'agreed': 'kVA' }, 'price': 300 }, { 'price': 450 } ] }""");
        assertThat(last(bill(rate, agreed(Unit.KVA, "450"), List.of(peaks("200", kva)))
                        .get(0)))
                .isEqualTo(charge);
    }

    /** East Midlands LV, April 2018 (costadvice.co.uk): 2.6 p a kVA and day agreed, 5.79 p exceeded; 450 kVA, 500, 30 days. Own arithmetic. */
    @Test
    void aDailyPriceCountsTheDaysOfThePeriod() {
        String rate = rate("""
                { 'name': 'Capacity', 'quantity': { 'prorated': { 'agreed': 'kVA' }, 'perDays': 1 }, 'price': 0.026 },
                { 'name': 'Exceeded', 'quantity': { 'prorated': { 'excess': { 'peak': 'kVA' }, 'over': { 'agreed': 'kVA' } }, 'perDays': 1 },
                  'price': 0.0579 }""");
        Statement statement =
                bill(rate, agreed(Unit.KVA, "450"), List.of(baseMonth())).get(0);
        assertThat(statement.amount("Capacity")).isEqualTo("351.00");
        assertThat(statement.amount("Exceeded")).isEqualTo("86.85");
        assertThat(statement.total()).isEqualTo("437.85");
    }

    /** Manitoba Hydro small demand, 1 Apr 2024, three-phase; 30,000 kWh and 100 kVA. Own arithmetic on the published prices. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {"'roundLines': \"not\", | 2802.54", "'roundLines': { 'to': 0.01 }, | 2802.55", "| 2802.55"})
    void roundingTheLinesFirstMovesTheTotalByACent(String rounding, String total) {
        String rate = rate("", rounding == null ? "" : rounding, """
                { 'name': 'Basic', 'quantity': { 'constant': 1 }, 'price': 33.69 },
                { 'name': 'First energy', 'quantity': { 'smallest': [ { 'energy': 'kWh' }, { 'constant': 11000, 'unit': 'kWh' } ] },
                  'price': 0.09485 },
                { 'name': 'Next energy', 'quantity': { 'energy': 'kWh' },
                  'blocks': [ { 'upTo': 11000, 'price': 0 }, { 'upTo': 19500, 'price': 0.07277 }, { 'price': 0 } ] },
                { 'name': 'Rest', 'quantity': { 'energy': 'kWh' }, 'blocks': [ { 'upTo': 19500, 'price': 0 }, { 'price': 0.04671 } ] },
                { 'name': 'Demand', 'quantity': { 'peak': 'kVA' }, 'blocks': [ { 'upTo': 50, 'price': 0 }, { 'price': 12.33 } ] }""");
        MeteredMonth month = MeteredMonth.of("2024-04").with(ENERGY_KWH, 30_000).with(PEAK_KVA, 100);
        assertThat(bill(rate, month).total()).isEqualTo(total);
    }

    /** The same sheet: 50 kVA are free. Own arithmetic: 12.33 for each kVA more. */
    @ParameterizedTest
    @CsvSource({"49.9, 0.00", "50, 0.00", "51, 12.33", "100, 616.50"})
    void aFreeBlockEndsAtItsEdge(String kva, String charge) {
        String rate = rate(
                "{ 'name': 'Demand', 'quantity': { 'peak': 'kVA' }, 'blocks': [ { 'upTo': 50, 'price': 0 }, { 'price': 12.33 } ] }");
        assertThat(last(bill(rate, peaks("40", kva)))).isEqualTo(charge);
    }

    /** Hydro-Québec: 0.95 at large power (Rate LG, 1 Apr 2017), 0.90 at medium power (Rate M explained, 2012). Own arithmetic on A. */
    @ParameterizedTest
    @CsvSource({
        "0.95, 500,      475.00",
        "0.90, 500,      450.00",
        "0.95, 421.0526, 400.00", // 399.99997: the kW are larger
        "0.95, 421.06,   400.01",
        "0.90, 444.44,   400.00",
        "0.90, 444.45,   400.01"
    })
    void theLargerOfKilowattsAndAShareOfKilovoltAmperesIsBilled(String share, String kva, String billedKw) {
        String rate = rate("{ 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kW' }, { 'share': " + share
                + ", 'of': { 'peak': 'kVA' } } ] }, 'price': 1 }");
        assertThat(last(bill(rate, peaks("400", kva)))).isEqualTo(billedKw);
    }

    /** Hydro-Québec Rate LG: 75 % of last winter's peak, never below 5,000 kW; winter is December to March. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "2026-07, 4000, 4000, 5000.00", // floor
        "2026-07, 4000, 8000, 6000.00", // 0.75 × 8,000
        "2026-07, 7000, 8000, 7000.00" // the month's own
    })
    void lastWintersPeakHoldsTheDemandUp(String month, String kw, String winterKw, String billedKw) {
        String rate = rate("""
                { 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kW' }, { 'share': 0.95, 'of': { 'peak': 'kVA' } },
                  { 'share': 0.75, 'of': { 'earlier': 'highest', 'of': { 'peak': 'kW' }, 'months': 11, 'onlyIn': [12, 1, 2, 3] } },
                  { 'constant': 5000, 'unit': 'kW' } ] }, 'price': 1 }""");
        List<MeteredMonth> months = List.of(
                MeteredMonth.of("2026-01").with(PEAK_KW, winterKw).with(PEAK_KVA, winterKw),
                MeteredMonth.of("2026-06").with(PEAK_KW, 9_999).with(PEAK_KVA, 9_999),
                MeteredMonth.of(month).with(PEAK_KW, kw).with(PEAK_KVA, kw));
        assertThat(last(bill(rate, tariff.meter.Site.unnamed(), months).get(2))).isEqualTo(billedKw);
    }
}
