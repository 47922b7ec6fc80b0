// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.bill;
import static tariff.bill.Bills.last;
import static tariff.bill.Bills.rate;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.POWER_FACTOR;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.meter.MeteredMonth;

/** So many per cent for each point below a target. */
class PointScheduleBillsTest {

    private static MeteredMonth month(String kw, String powerFactor) {
        return MeteredMonth.of("2026-04").with(PEAK_KW, kw).with(POWER_FACTOR, powerFactor);
    }

    private static String percentOf100(String powerFactorRound, String target, String points) {
        return rate("'billing': { 'from': 'printed'" + powerFactorRound + " }", "", """
                { 'name': 'Bill', 'quantity': { 'constant': 100 }, 'price': 1 },
                { 'name': 'Power factor', 'percentOf': 'all above', 'schedule': { 'powerFactor': 'billing', 'points': '%s',
                  'slopes': [ { 'below': %s, 'perPoint': 1 } ] } }""".formatted(points, target));
    }

    /** Target 0.95; own arithmetic: 11.58, 11.28, 11.50 points. "Major fraction" is read as more than a half. */
    @ParameterizedTest
    @CsvSource({
        "exact,         0.8342, 11.58",
        "exact,         0.8372, 11.28",
        "exact,         0.8350, 11.50",
        "completed,     0.8342, 11.00",
        "completed,     0.8372, 11.00",
        "completed,     0.8350, 11.00",
        "started,       0.8342, 12.00",
        "started,       0.8372, 12.00",
        "started,       0.8350, 12.00",
        "majorFraction, 0.8342, 12.00",
        "majorFraction, 0.8372, 11.00",
        "majorFraction, 0.8350, 11.00",
        // at the target and one either side
        "started,       0.9499, 1.00",
        "started,       0.95,   0.00",
        "started,       0.9501, 0.00",
        "completed,     0.9401, 0.00",
        "completed,     0.94,   1.00",
        "started,       0.94,   1.00",
        "started,       0.9399, 2.00",
        "majorFraction, 0.9450, 0.00",
        "majorFraction, 0.9449, 1.00",
        "exact,         0.9499, 0.01"
    })
    void aBrokenPointCountsAsTheRateSays(String points, String powerFactor, String percent) {
        assertThat(last(bill(percentOf100("", "0.95", points), month("1", powerFactor))))
                .isEqualTo(percent);
    }

    /** The same with the power factor rounded half up to 0.01 first; own arithmetic. */
    @ParameterizedTest
    @CsvSource({"0.8342, 12.00", "0.8372, 11.00", "0.8350, 11.00"})
    void roundingThePowerFactorFirstIsYetAnotherRule(String powerFactor, String percent) {
        assertThat(last(bill(percentOf100(", 'round': { 'to': 0.01 }", "0.95", "exact"), month("1", powerFactor))))
                .isEqualTo(percent);
    }

    /**
     * St. Charles, Illinois, code 13.08.260: factor 1 + (0.85 − PF), 20.20; Batavia, Illinois, 1 May 2015: 1 + (0.90 − PF), 17.25; Chimney
     * Rock PPD, A-16-LP: 2 % for each 1 % below 0.95, 10.00. Own arithmetic.
     */
    @ParameterizedTest
    @CsvSource({
        "0.85, 1, 20.20, 250, 0.78, 5403.50", // 267.50 kW
        "0.85, 1, 20.20, 250, 0.85, 5050.00",
        "0.85, 1, 20.20, 250, 0.90, 5050.00",
        "0.90, 1, 17.25, 400, 0.80, 7590.00", // 440 kW
        "0.90, 1, 17.25, 400, 0.90, 6900.00",
        "0.95, 2, 10.00, 300, 0.90, 3300.00", // 330 kW
        "0.95, 2, 10.00, 300, 0.95, 3000.00"
    })
    void demandGrowsByThePoint(
            String target, String perPoint, String price, String kw, String powerFactor, String charge) {
        String rate = rate("'billing': { 'from': 'printed' }", "", """
                { 'name': 'Demand', 'quantity': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing',
                  'slopes': [ { 'below': %s, 'perPoint': %s } ] } }, 'price': %s }""".formatted(target, perPoint, price));
        assertThat(last(bill(rate, month(kw, powerFactor)))).isEqualTo(charge);
    }

    /** Columbia River PUD, Schedule 92: 0.95, each point or fraction; Klickitat PUD, 3A7 (2024): 0.97, exact reading. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({"0.95, started, 0.8372, 12.00", "0.97, exact, 0.8372, 13.28", "0.97, exact, 0.97, 0.00"})
    void eachPointOrFraction(String target, String points, String powerFactor, String percent) {
        assertThat(last(bill(percentOf100("", target, points), month("1", powerFactor))))
                .isEqualTo(percent);
    }

    /** Richland Municipal Code 14.20.020: 0.97, major fraction, from the month's kWh and kvarh; PF 0.8342 is 13.58 points. Own arithmetic. */
    @Test
    void richlandTakesThePowerFactorOfTheEnergies() {
        String rate = rate("""
                { 'name': 'Bill', 'quantity': { 'constant': 100 }, 'price': 1 },
                { 'name': 'Power factor', 'percentOf': 'all above', 'schedule': { 'powerFactor': 'billing', 'points': 'majorFraction',
                  'slopes': [ { 'below': 0.97, 'perPoint': 1 } ] } }""");
        // 83,420 ÷ √(83,420² + 55,147²) = 0.83420
        assertThat(last(bill(rate, Bills.energies("83420", "55147")))).isEqualTo("14.00");
    }

    /** Hood River Electric Cooperative, Commercial: 0.95 lagging or leading, major fraction, on the demand charge. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "60000, 0,     15.00", // PF 0.80 lagging
        "0,     60000, 15.00", // PF 0.80 leading
        "26000, 0,     0.00", // 80 ÷ √(80² + 26²) = 0.951
        "0,     27000, 0.00", // 0.9475: a quarter of a point
        "0,     28000, 1.00" // 0.9439: 0.61 of a point
    })
    void leadingIsAsBadAsLagging(String lagging, String leading, String surcharge) {
        String rate = rate("'billing': { 'from': 'energies', 'leading': 'larger' }", "", """
                { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.05 },
                { 'name': 'Demand', 'quantity': { 'peak': 'kW' }, 'price': 1 },
                { 'name': 'Power factor', 'percentOf': ['Demand'], 'schedule': { 'powerFactor': 'billing', 'points': 'majorFraction',
                  'slopes': [ { 'below': 0.95, 'perPoint': 1 } ] } }""");
        MeteredMonth month = MeteredMonth.of("2026-04")
                .with(ENERGY_KWH, 80_000)
                .with(LAGGING_KVARH, lagging)
                .with(LEADING_KVARH, leading)
                .with(PEAK_KW, 100);
        assertThat(last(bill(rate, month))).isEqualTo(surcharge);
    }

    /** Sun River Electric Cooperative, irrigation (2021): 1 % a point on the whole bill; target 0.95 invented. Own arithmetic. */
    @Test
    void aPointOnTheWholeBillTakesInEveryLineAbove() {
        String rate = rate("'billing': { 'from': 'printed' }", "", """
                { 'name': 'Base', 'quantity': { 'constant': 1 }, 'price': 40 },
                { 'name': 'Demand', 'quantity': { 'peak': 'kW' }, 'price': 9.60 },
                { 'name': 'Power factor', 'percentOf': 'all above', 'schedule': { 'powerFactor': 'billing', 'points': 'started',
                  'slopes': [ { 'below': 0.95, 'perPoint': 1 } ] } }""");
        // 40 + 960 = 1,000; 0.9321 is 1.79 points, so 2 %
        assertThat(last(bill(rate, month("100", "0.9321")))).isEqualTo("20.00");
    }
}
