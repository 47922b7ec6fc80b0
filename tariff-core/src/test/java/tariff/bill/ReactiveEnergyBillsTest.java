// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.bill;
import static tariff.bill.Bills.energies;
import static tariff.bill.Bills.last;
import static tariff.bill.Bills.rate;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.EXPORTED_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;

/** kvarh above a share of the kWh. */
class ReactiveEnergyBillsTest {

    private static Readings readings(String kwh, String laggingKvarh) {
        return Readings.none().with(ENERGY_KWH, kwh).with(LAGGING_KVARH, laggingKvarh);
    }

    /** London Power Networks, 1 Oct 2011, 2.21: 33 % free, elsewhere tan φ of 0.95 (from memory); 0.45 p illustrative. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "0.33,              120000, 302.40",
        "0.328684105178863, 120000, 303.35",
        "0.33,              52799,  0.00",
        "0.33,              52800,  0.00",
        "0.33,              52802,  0.01" // 2 kvarh × 0.0045 = 0.009
    })
    void kvarhAboveAThirdOfTheKwhAreCharged(String share, String kvarh, String pounds) {
        String rate = rate("""
                { 'name': 'Reactive', 'quantity': { 'energy': 'lagging kvarh' },
                  'blocks': [ { 'upTo': { 'share': %s, 'of': { 'energy': 'kWh' } }, 'price': 0 }, { 'price': 0.0045 } ] }""".formatted(share));
        assertThat(last(bill(rate, energies("160000", kvarh)))).isEqualTo(pounds);
    }

    /** Spain, Real Decreto 1164/2001 art. 9.3 with prices since 2010 (icenergia.es): one price for the whole excess. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "120000, 2792.43", // PF 0.80 exactly: 67,200 × 0.041554
        "120001, 4188.77", // just below 0.80: 67,201 × 0.062332
        "119999, 2792.39",
        "52600,  0.00", // PF 0.94996: the band is met but the excess is none
        "52800,  0.00", // PF 0.9496: 33 %
        "52801,  0.04",
        "50000,  0.00" // PF 0.9545
    })
    void thePowerFactorChoosesThePriceOfTheWholeExcess(String kvarh, String euros) {
        String rate = rate("""
                { 'name': 'Reactive', 'quantity': { 'excess': { 'energy': 'lagging kvarh' }, 'over': { 'share': 0.33, 'of': { 'energy': 'kWh' } } },
                  'price': { 'bySchedule': { 'powerFactor': 'billing', 'bands': [ { 'below': 0.80, 'value': 0.062332 },
                    { 'below': 0.95, 'value': 0.041554 }, { 'value': 0 } ] } } }""");
        assertThat(last(bill(rate, energies("160000", kvarh)))).isEqualTo(euros);
    }

    /** Italy to 2015, low voltage (serviziperutenze.it): 50 and 75 %, 0.0323 and 0.0421. Own arithmetic: 40,000 and 10,000 kvarh. */
    @ParameterizedTest
    @CsvSource({"130000, 1713.00", "80000, 0.00", "80001, 0.03", "120000, 1292.00", "120001, 1292.04"})
    void theDearBandBeginsWhereTheCheapOneEnds(String kvarh, String euros) {
        String rate = rate("""
                { 'name': 'Reactive', 'quantity': { 'energy': 'lagging kvarh' }, 'blocks': [
                  { 'upTo': { 'share': 0.50, 'of': { 'energy': 'kWh' } }, 'price': 0 },
                  { 'upTo': { 'share': 0.75, 'of': { 'energy': 'kWh' } }, 'price': 0.0323 }, { 'price': 0.0421 } ] }""");
        assertThat(last(bill(rate, energies("160000", kvarh)))).isEqualTo(euros);
    }

    /** ARERA 232/2022: every kvarh sent in F3 costs 1.689 c€ at low voltage, 0.606 at medium. Own arithmetic on 10,000 kvarh. */
    @ParameterizedTest
    @CsvSource({"0.01689, 168.90", "0.00606, 60.60"})
    void kvarhSentAtNightAreChargedFromTheFirst(String price, String euros) {
        String rate = rate(
                "",
                "'windows': { 'F3': { 'weekdays': 'Mon-Sat', 'from': '23:00', 'to': '07:00' } },",
                "{ 'name': 'Sent', 'quantity': { 'energy': 'leading kvarh', 'in': 'F3' }, 'price': " + price + " }");
        MeteredMonth month =
                energies("160000", "0").withWindow("F3", Readings.none().with(LEADING_KVARH, 10_000));
        assertThat(last(bill(rate, month))).isEqualTo(euros);
    }

    /** Portugal, ERSE factors (edpsu.pt): 0.3–0.4 × 0.33, 0.4–0.5 × 1, above × 3; price 0.02 invented, A as one sum. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "120000, 2825.60", // 105.60 + 320.00 + 2,400.00
        "48000,  0.00",
        "64000,  105.60",
        "80000,  425.60"
    })
    void threeFactorsOnOnePrice(String kvarh, String euros) {
        String rate = rate("""
                { 'name': 'Reactive', 'quantity': { 'energy': 'lagging kvarh' }, 'blocks': [
                  { 'upTo': { 'share': 0.3, 'of': { 'energy': 'kWh' } }, 'price': 0 },
                  { 'upTo': { 'share': 0.4, 'of': { 'energy': 'kWh' } }, 'price': 0.0066 },
                  { 'upTo': { 'share': 0.5, 'of': { 'energy': 'kWh' } }, 'price': 0.02 }, { 'price': 0.06 } ] }""");
        assertThat(last(bill(rate, energies("160000", kvarh)))).isEqualTo(euros);
    }

    /** Algeria (El Watan, 21 Mar 2017): 45.53 c above 50 %, 9.11 c back below it. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "120000, 0,     18212.00",
        "60000,  0,     -1822.00",
        "80000,  0,     0.00",
        "80001,  0,     0.46",
        "79999,  0,     -0.09",
        "0,      0,     -7288.00",
        "0,      50000, -7288.00" // running leading earns no more: common practice, no source
    })
    void oneLineChargesAboveAndCreditsBelow(String lagging, String leading, String dinars) {
        String rate = rate("""
                { 'name': 'Malus', 'quantity': { 'excess': { 'energy': 'lagging kvarh' }, 'over': { 'share': 0.5, 'of': { 'energy': 'kWh' } } },
                  'price': 0.4553 },
                { 'name': 'Bonus', 'quantity': { 'excess': { 'share': 0.5, 'of': { 'energy': 'kWh' } }, 'over': { 'energy': 'lagging kvarh' } },
                  'price': -0.0911 }""");
        assertThat(bill(rate, energies("160000", lagging).with(LEADING_KVARH, leading))
                        .total())
                .isEqualTo(dinars);
    }

    /** Tarievencode elektriciteit 3.9.1 and kostencheck.nl: free to 62 % of taken and 20 % of fed kWh, 0.006. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({"0, 0, 124.80", "10000, 0, 112.80", "0, 5000, 154.80"})
    void dutchFreeShareCountsFedEnergyToo(String exported, String leading, String euros) {
        String rate = rate("""
                { 'name': 'Inductive', 'quantity': { 'energy': 'lagging kvarh' }, 'blocks': [ { 'upTo': { 'sum': [
                  { 'share': 0.62, 'of': { 'energy': 'kWh' } }, { 'share': 0.20, 'of': { 'energy': 'exported kWh' } } ] }, 'price': 0 },
                  { 'price': 0.006 } ] },
                { 'name': 'Capacitive', 'quantity': { 'energy': 'leading kvarh' }, 'price': 0.006 }""");
        MeteredMonth month =
                energies("160000", "120000").with(EXPORTED_KWH, exported).with(LEADING_KVARH, leading);
        assertThat(bill(rate, month).total()).isEqualTo(euros);
    }

    /** Stadtwerke Meissen, 1 Jan 2007: 50 % free in each of day and night, 0.97 and 0.25 ct. Own arithmetic. */
    @Test
    void dayAndNightHaveFreeSharesOfTheirOwn() {
        String rate = rate(
                "",
                "'windows': { 'day': { 'from': '06:00', 'to': '22:00' }, 'night': { 'from': '22:00', 'to': '06:00' } },",
                """
                { 'name': 'Day', 'quantity': { 'energy': 'lagging kvarh', 'in': 'day' },
                  'blocks': [ { 'upTo': { 'share': 0.5, 'of': { 'energy': 'kWh', 'in': 'day' } }, 'price': 0 }, { 'price': 0.0097 } ] },
                { 'name': 'Night', 'quantity': { 'energy': 'lagging kvarh', 'in': 'night' },
                  'blocks': [ { 'upTo': { 'share': 0.5, 'of': { 'energy': 'kWh', 'in': 'night' } }, 'price': 0 }, { 'price': 0.0025 } ] }""");
        Statement statement = bill(
                rate,
                energies("160000", "120000")
                        .withWindow("day", readings("100000", "70000"))
                        .withWindow("night", readings("60000", "50000")));
        assertThat(statement.amount("Day")).isEqualTo("194.00");
        assertThat(statement.amount("Night")).isEqualTo("50.00");
        assertThat(statement.total()).isEqualTo("244.00");
    }

    /**
     * EPDK decision 5999/3 of 2015, art. 13: from 50 kVA 20 % inductive and 15 % capacitive, all once exceeded. First row: the printed
     * invoice (alteksan.com); price 1. The others own arithmetic at the limits.
     */
    @ParameterizedTest
    @CsvSource({
        "67483.380, 300.840,   14363.040, 14363.04",
        "1000,      200,       150,       0.00",
        "1000,      200.001,   150,       200.00",
        "1000,      199.999,   149.999,   0.00",
        "1000,      200,       150.001,   150.00",
        "1000,      201,       151,       352.00"
    })
    void onceOverTheLimitEveryKvarhIsBilled(String kwh, String lagging, String leading, String billed) {
        String rate = rate("""
                { 'name': 'Inductive', 'quantity': { 'all': { 'energy': 'lagging kvarh' }, 'onceAbove': { 'share': 0.20, 'of': {
                  'energy': 'kWh' } } }, 'price': 1 },
                { 'name': 'Capacitive', 'quantity': { 'all': { 'energy': 'leading kvarh' }, 'onceAbove': { 'share': 0.15, 'of': {
                  'energy': 'kWh' } } }, 'price': 1 }""");
        assertThat(bill(rate, energies(kwh, lagging).with(LEADING_KVARH, leading))
                        .total())
                .isEqualTo(billed);
    }

    /** France: free to tan φ 0.4 in winter days only; from memory. Price 0.02 invented; own arithmetic: (90,000 − 40,000) × 0.02. */
    @ParameterizedTest
    @CsvSource({"90000, 1000.00", "40000, 0.00", "40001, 0.02"})
    void onlyWinterDaysCount(String kvarh, String euros) {
        String rate = rate(
                "",
                "'windows': { 'winter days': { 'from': '06:00', 'to': '22:00', 'months': [11, 12, 1, 2, 3] } },",
                """
                { 'name': 'Reactive', 'quantity': { 'energy': 'lagging kvarh', 'in': 'winter days' }, 'blocks': [
                  { 'upTo': { 'share': 0.4, 'of': { 'energy': 'kWh', 'in': 'winter days' } }, 'price': 0 }, { 'price': 0.02 } ] }""");
        MeteredMonth month = energies("160000", "200000").withWindow("winter days", readings("100000", kvarh));
        assertThat(last(bill(rate, month))).isEqualTo(euros);
    }

    /** Solar takes kWh away and leaves the kvarh: A less 60,000 kWh, 67,200 → 87,000 kvarh above 33 %. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({"160000, 67200.00", "100000, 87000.00"})
    void fewerKwhMakeMoreExcess(String kwh, String excess) {
        String rate = rate(
                "{ 'name': 'Excess', 'quantity': { 'excess': { 'energy': 'lagging kvarh' }, 'over': { 'share': 0.33,"
                        + " 'of': { 'energy': 'kWh' } } }, 'price': 1 }");
        assertThat(last(bill(rate, energies(kwh, "120000")))).isEqualTo(excess);
    }

    /**
     * Rules that count hour by hour are not to be had from monthly figures: Brazil (ANEEL Res. 414/2010) and Colombia (CREG 015 of 2018,
     * ch. 12) by the hour, Flanders (art. 6.1.8) by the quarter-hour, Portugal at medium voltage (ERSE) by the day.
     */
    @ParameterizedTest
    @CsvSource({"hour, hour", "quarterHour, quarter-hour", "day, day"})
    void aMonthOfTotalsCannotFeedARuleByTheHour(String each, String words) {
        String rate = rate("""
                { 'name': 'Excess', 'quantity': { 'each': '%s', 'take': 'sum', 'of': { 'excess': { 'energy': 'lagging kvarh' }, 'over': {
                  'share': 0.5, 'of': { 'energy': 'kWh' } } } }, 'price': 1 }""".formatted(each));
        assertThat(tariff.json.RateFile.parse(rate).words().lines())
                .containsExactly("Excess: sum, over each " + words
                        + ", of the lagging kvarh above 50 % of the kWh, at 1 per kvarh.");
        org.assertj.core.api.Assertions.assertThatThrownBy(() -> bill(rate, energies("160000", "120000")))
                .isInstanceOf(tariff.notice.Refusal.class)
                .hasMessage("2026-04: the rate counts by the " + words
                        + "; the bill gives only totals of the period, so give interval data");
    }
}
