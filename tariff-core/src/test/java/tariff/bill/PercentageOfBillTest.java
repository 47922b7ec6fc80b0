// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.baseMonth;
import static tariff.bill.Bills.bill;
import static tariff.bill.Bills.energies;
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
import tariff.meter.Readings;

/** A percentage of the bill as a function of the power factor. */
class PercentageOfBillTest {

    /** Bills the percentage itself: 100 to take it of. */
    private static String percentage(String powerFactor, String schedule) {
        return rate("'billing': { " + powerFactor + " }", "'roundLines': { 'to': 0.0001 },", """
                { 'name': 'Bill', 'quantity': { 'constant': 100 }, 'price': 1 },
                { 'name': 'Power factor', 'percentOf': ['Bill'], 'schedule': { 'powerFactor': 'billing', %s } }""".formatted(schedule));
    }

    private static String mexico(String target) {
        return percentage(
                "'from': 'printed', 'round': { 'to': 0.0001 }",
                "'ratioTo': " + target
                        + ", 'below': 60, 'above': 25, 'atLeast': -2.5, 'atMost': 120, 'round': { 'to': 0.1 }");
    }

    private static MeteredMonth printed(String powerFactor) {
        return baseMonth().with(POWER_FACTOR, powerFactor);
    }

    /** CFE: 3/5 × (0.9 ÷ PF − 1), at most 120; credit 1/4 × (1 − 0.9 ÷ PF), at most 2.5; to one decimal. Own arithmetic unless said. */
    @ParameterizedTest
    @CsvSource({
        "0.90, 0.7145,  15.6000", // CFE bill of January 2004, scribd.com/document/381288443
        "0.90, 0.80,    7.5000",
        "0.90, 0.81,    6.7000", // 6.666…
        "0.90, 0.30,    120.0000", // the published cap is reached here
        "0.90, 0.20,    120.0000",
        "0.90, 1,       -2.5000", // and the credit's here
        "0.90, 0.90,    0.0000",
        "0.90, 0.8999,  0.0000", // 0.0067 rounds away
        "0.90, 0.8986,  0.1000", // 0.0935
        "0.90, 0.9001,  0.0000",
        "0.90, 0.95,    -1.3000", // 1.3158
        // since January 2024 at high voltage 0.95 (El Financiero, 20 Feb 2024), from 8 April 2026 0.97 (CRE A/073/2023)
        "0.95, 0.80,    11.3000", // 11.25 exactly; binary doubles give 11.2
        "0.97, 0.80,    12.8000" // 12.75 exactly
    })
    void aRatioFormHasNoStepButThatOfItsRounding(String target, String powerFactor, String percent) {
        assertThat(last(bill(mexico(target), printed(powerFactor)))).isEqualTo(percent);
    }

    /** Circular 15/2014/TT-BCT, table (epu.edu.vn/QLNL): the printed rows, k = (0.9 ÷ cos φ − 1) × 100 to 2 decimals, at most 52.54. */
    @ParameterizedTest
    @CsvSource({
        "0.90, 0.0000",
        "0.89, 1.1200",
        "0.85, 5.8800",
        "0.80, 12.5000",
        "0.75, 20.0000",
        "0.70, 28.5700",
        "0.60, 50.0000",
        "0.59, 52.5400",
        "0.30, 52.5400",
        "0.95, 0.0000"
    })
    void vietnamesePenaltyStopsBelowSixty(String powerFactor, String percent) {
        String rate = percentage(
                "'from': 'printed', 'round': { 'to': 0.01 }",
                "'ratioTo': 0.9, 'atMost': 52.54, 'round': { 'to': 0.01 }");
        assertThat(last(bill(rate, printed(powerFactor)))).isEqualTo(percent);
    }

    /** TNB (pdfcoffee.com/pengiraan-surcaj-faktor-kuasa): 1.5 % a point below 0.85, 3 % below 0.75; edges by own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "0.85, 0.0000",
        "0.8499, 0.0150",
        "0.80, 7.5000",
        "0.7501, 14.9850",
        "0.75, 15.0000",
        "0.7499, 15.0300",
        "0.60, 60.0000"
    })
    void twoSlopesMeetWithoutAStep(String powerFactor, String percent) {
        String rate = percentage(
                "'from': 'printed'",
                "'slopes': [ { 'below': 0.85, 'perPoint': 1.5 }, { 'below': 0.75, 'perPoint': 3 } ]");
        assertThat(last(bill(rate, printed(powerFactor)))).isEqualTo(percent);
    }

    private static final String CHINA = """
            'slopes': [ { 'below': 0.90, 'perPoint': 0.5 }, { 'below': 0.70, 'perPoint': 1 }, { 'below': 0.65, 'perPoint': 2 },
              { 'above': 0.90, 'perPoint': -0.15 } ], 'atLeast': -0.75""";

    /** (83) Shui-Dian-Cai-Zi 215 and its table (jiaoxuezhishi.com): −0.75 at 0.95, +10 at 0.70, +15 at 0.65; the rest own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "1,    -0.7500",
        "0.96, -0.7500",
        "0.95, -0.7500",
        "0.94, -0.6000",
        "0.91, -0.1500",
        "0.90, 0.0000",
        "0.89, 0.5000",
        "0.80, 5.0000",
        "0.71, 9.5000",
        "0.70, 10.0000",
        "0.69, 11.0000",
        "0.65, 15.0000",
        "0.64, 17.0000",
        "0.60, 25.0000"
    })
    void chineseAdjustmentGetsSteeperTwice(String powerFactor, String percent) {
        assertThat(last(bill(percentage("'from': 'printed', 'round': { 'to': 0.01 }", CHINA), printed(powerFactor))))
                .isEqualTo(percent);
    }

    /** The same rule adds leading kvarh: 0.7295 is 0.73, +8.5 %. Own arithmetic. */
    @Test
    void leadingKvarhCostAsMuchAsLaggingWhereTheyAreAdded() {
        String rate = percentage("'from': 'energies', 'leading': 'added', 'round': { 'to': 0.01 }", CHINA);
        assertThat(last(bill(rate, baseMonth().with(LEADING_KVARH, 30_000)))).isEqualTo("8.5000");
        assertThat(last(bill(rate, baseMonth().with(LEADING_KVARH, 0)))).isEqualTo("5.0000");
    }

    /** TEPCO prices of November 2016 (tcss-gunma.com): 1,630.80 × 3,000 × 0.85 = 4,158,540; 400 kW at 0.80 by own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "3000, 1000, 0,   4158540", // printed
        "400,  800,  600, 684936", // × 1.05
        "400,  850,  527, 652320", // 0.8499 is 0.85
        "400,  840,  520, 652320", // 0.8503 is 0.85
        "400,  84,   54,  658843" // 0.8412 is 0.84: 652,320 × 1.01 = 658,843.2
    })
    void japaneseDemandChargeIsMultipliedByOneEightyFiveLessThePowerFactor(
            String kw, String dayKwh, String dayKvarh, String yen) {
        String rate = rate(
                "'daytime': { 'from': 'energies', 'in': 'day', 'round': { 'to': 0.01 } }",
                "'windows': { 'day': { 'from': '08:00', 'to': '22:00' } }, 'roundLines': \"not\", 'roundTotal': { 'to': 1, 'mode': 'down' },",
                """
                { 'name': 'Demand', 'quantity': { 'peak': 'kW' }, 'price': 1630.80 },
                { 'name': 'Power factor', 'percentOf': ['Demand'], 'schedule': { 'powerFactor': 'daytime',
                  'slopes': [ { 'below': 0.85, 'perPoint': 1 }, { 'above': 0.85, 'perPoint': -1 } ] } }""");
        MeteredMonth month = MeteredMonth.of("2016-11")
                .with(PEAK_KW, kw)
                .withWindow("day", Readings.none().with(ENERGY_KWH, dayKwh).with(LAGGING_KVARH, dayKvarh));
        assertThat(bill(rate, month).total().toPlainString()).isEqualTo(yen);
    }

    /** circuloelectricidad.blogspot.com, Jan 2015: 4,238 kWh, 3,102 kvarh, 358,466 pesos: 44,127 at PF 0.8069; the others own arithmetic. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {"'round': { 'to': 0.0001 } | 44127", "| 44114", "'round': { 'to': 0.01 } | 43016"})
    void theRoundingOfThePowerFactorDecidesTheChileanSurcharge(String round, String pesos) {
        String rate = rate(
                "'billing': { 'from': 'energies'" + (round == null ? "" : ", " + round) + " }",
                "'roundLines': { 'to': 1 },",
                """
                { 'name': 'Energy', 'quantity': { 'constant': 358466 }, 'price': 1 },
                { 'name': 'Power factor', 'percentOf': ['Energy'], 'schedule': { 'powerFactor': 'billing',
                  'slopes': [ { 'below': 0.93, 'perPoint': 1 } ] } }""");
        assertThat(last(bill(rate, energies("4238", "3102")))).isEqualTo(pesos);
    }

    /** EDESA, ENRESP Res. 527/21: 10 % from 0.75 to 0.85, 20 % below 0.75. The edges as printed, one either side by own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "0.7499, 20.0000",
        "0.75,   10.0000",
        "0.7501, 10.0000",
        "0.8499, 10.0000",
        "0.85,   0.0000",
        "0.8501, 0.0000"
    })
    void aBandIsACliff(String powerFactor, String percent) {
        String rate = percentage(
                "'from': 'printed'",
                "'bands': [ { 'below': 0.75, 'value': 20 }, { 'below': 0.85, 'value': 10 }, { 'value': 0 } ]");
        assertThat(last(bill(rate, printed(powerFactor)))).isEqualTo(percent);
    }

    /** The same bands, had the sheet said "up to and including"; own arithmetic. */
    @ParameterizedTest
    @CsvSource({"0.75, 20.0000", "0.7501, 10.0000", "0.85, 10.0000", "0.8501, 0.0000"})
    void anInclusiveBandKeepsItsEdge(String powerFactor, String percent) {
        String rate = percentage(
                "'from': 'printed'",
                "'bands': [ { 'upTo': 0.75, 'value': 20 }, { 'upTo': 0.85, 'value': 10 }, { 'value': 0 } ]");
        assertThat(last(bill(rate, printed(powerFactor)))).isEqualTo(percent);
    }

    /** British Columbia, bands under 0.90: from memory. */
    @ParameterizedTest
    @CsvSource({
        "0.90, 0",
        "0.89, 2",
        "0.87, 4",
        "0.84, 9",
        "0.79, 16",
        "0.74, 24",
        "0.69, 34",
        "0.64, 44",
        "0.59, 57",
        "0.54, 72",
        "0.49, 80"
    })
    void elevenBandsReachEightyPerCent(String powerFactor, String percent) {
        String rate = percentage("'from': 'printed'", """
                'bands': [ { 'below': 0.50, 'value': 80 }, { 'below': 0.55, 'value': 72 }, { 'below': 0.60, 'value': 57 },
                  { 'below': 0.65, 'value': 44 }, { 'below': 0.70, 'value': 34 }, { 'below': 0.75, 'value': 24 },
                  { 'below': 0.80, 'value': 16 }, { 'below': 0.85, 'value': 9 }, { 'below': 0.88, 'value': 4 },
                  { 'below': 0.90, 'value': 2 }, { 'value': 0 } ]""");
        assertThat(last(bill(rate, printed(powerFactor)))).isEqualTo(percent + ".0000");
    }

    /** Taipower tariff of 1 Apr 2016 (vocus.cc): ±0.1 % a per cent around 80, none past 95. Own arithmetic; 0.80 and 0.95 the edges. */
    @ParameterizedTest
    @CsvSource({
        "0.74, 0.6000",
        "0.79, 0.1000",
        "0.80, 0.0000",
        "0.81, -0.1000",
        "0.92, -1.2000",
        "0.95, -1.5000",
        "0.97, -1.5000",
        "1,    -1.5000"
    })
    void aCreditStopsAtItsFloor(String powerFactor, String percent) {
        String rate = percentage(
                "'from': 'printed'",
                "'slopes': [ { 'below': 0.80, 'perPoint': 0.1 }, { 'above': 0.80, 'perPoint': -0.1 } ], 'atLeast': -1.5");
        assertThat(last(bill(rate, printed(powerFactor)))).isEqualTo(percent);
    }

    /** Taipower: contract overruns stay outside the base. Own arithmetic: 0.6 % of 1,000, not of 1,200. */
    @Test
    void onlyTheNamedLinesAreTheBase() {
        String rate = rate("'billing': { 'from': 'printed' }", "", """
                { 'name': 'Demand', 'quantity': { 'constant': 1000 }, 'price': 1 },
                { 'name': 'Overrun', 'quantity': { 'constant': 200 }, 'price': 1 },
                { 'name': 'Power factor', 'percentOf': ['Demand'], 'schedule': { 'powerFactor': 'billing',
                  'slopes': [ { 'below': 0.80, 'perPoint': 0.1 } ] } }""");
        assertThat(bill(rate, printed("0.74")).total()).isEqualTo("1206.00");
    }
}
