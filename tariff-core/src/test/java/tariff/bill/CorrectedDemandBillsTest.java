// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.bill;
import static tariff.bill.Bills.last;
import static tariff.bill.Bills.rate;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.POWER_FACTOR;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.meter.MeteredMonth;

/** Billed kW = kW × target ÷ PF. */
class CorrectedDemandBillsTest {

    private static MeteredMonth month(String kw, String powerFactor) {
        return MeteredMonth.of("2026-04").with(PEAK_KW, kw).with(POWER_FACTOR, powerFactor);
    }

    private static String printed(String lines) {
        return rate("'billing': { 'from': 'printed' }", "", lines);
    }

    /** Lewis County PUD, Res. 2943 (2022): target 0.95, kW first to the whole kW, 50 kW free, 6.03. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "200,   0.84,   1062.43", // (200 × 0.95 ÷ 0.84 − 50) × 6.03
        "200.4, 0.84,   1062.43", // 200.4 is 200 first
        "199.5, 0.84,   1062.43", // a half goes up
        "199.4, 0.84,   1055.61", // 199 × 0.95 ÷ 0.84 = 225.059…
        "200,   0.95,   904.50",
        "200,   0.9499, 904.63",
        "200,   0.9501, 904.50",
        "200,   1,      904.50",
        "50,    0.95,   0.00",
        "50,    0.94,   3.21" // 0.5319… kW above the free ones
    })
    void demandIsRaisedInTheRatioOfTargetToPowerFactor(String kw, String powerFactor, String charge) {
        String rate = printed("""
                { 'name': 'Demand', 'quantity': { 'raised': { 'rounded': { 'peak': 'kW' }, 'to': 1 }, 'by': { 'powerFactor': 'billing',
                  'ratioTo': 0.95 } }, 'blocks': [ { 'upTo': 50, 'price': 0 }, { 'price': 6.03 } ] }""");
        assertThat(last(bill(rate, month(kw, powerFactor)))).isEqualTo(charge);
    }

    /** City of Columbia, Missouri, Industrial Service: target 0.90, 19.85. Own arithmetic: 1,125 kW. */
    @ParameterizedTest
    @CsvSource({"0.80, 22331.25", "0.90, 19850.00", "0.95, 19850.00"})
    void aThousandKilowattsAtEightyAreBilledAsMore(String powerFactor, String charge) {
        String rate = printed("""
                { 'name': 'Demand', 'quantity': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing', 'ratioTo': 0.90 } },
                  'price': 19.85 }""");
        assertThat(last(bill(rate, month("1000", powerFactor)))).isEqualTo(charge);
    }

    /** Norris PPD, irrigation newsletter for 2022: target 0.93, at most 10 % more, from 15 kW up, 23.80 a kW-year. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "80,    0.870, 2035.38", // 74.40 ÷ 0.87 = 85.52 kW, rounded as the leaflet does
        "80,    0.930, 1904.00",
        "80,    0.800, 2094.40", // held at 88 kW
        "15,    0.870, 381.51", // 13.95 ÷ 0.87 = 16.03 kW
        "14.99, 0.870, 356.76" // too small for the clause: 14.99 kW
    })
    void theIncreaseIsHeldAtTenPerCentAndLeavesSmallDemandsAlone(String kw, String powerFactor, String charge) {
        String rate = printed("""
                { 'name': 'Large', 'when': { 'quantity': { 'peak': 'kW' }, 'reaches': { 'constant': 15, 'unit': 'kW' } },
                  'quantity': { 'rounded': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing', 'ratioTo': 0.93, 'atMost': 10 } },
                  'to': 0.01 }, 'price': 23.80 },
                { 'name': 'Small', 'when': { 'not': { 'quantity': { 'peak': 'kW' }, 'reaches': { 'constant': 15, 'unit': 'kW' } } },
                  'quantity': { 'peak': 'kW' }, 'price': 23.80 }""");
        assertThat(bill(rate, month(kw, powerFactor)).total()).isEqualTo(charge);
    }

    /** The same leaflet without its steps of rounding: 2,035.31. Own arithmetic: 80 × 0.93 ÷ 0.87 × 23.80. */
    @Test
    void roundingInBetweenIsWorthSevenCents() {
        String rate = printed(
                "{ 'name': 'Demand', 'quantity': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing', 'ratioTo': 0.93 } },"
                        + " 'price': 23.80 }");
        assertThat(last(bill(rate, month("80", "0.870")))).isEqualTo("2035.31");
    }

    /** Clallam County PUD, Schedule E-M, 1 Apr 2024: (0.95 ÷ PF − 1) × demand charge. Own arithmetic: 500 × 0.1875. */
    @ParameterizedTest
    @CsvSource({"0.80, 93.75", "0.95, 0.00", "0.97, 0.00"})
    void theSameSumMayStandOnALineOfItsOwn(String powerFactor, String adjustment) {
        String rate = printed("""
                { 'name': 'Demand', 'quantity': { 'constant': 500 }, 'price': 1 },
                { 'name': 'Power factor', 'percentOf': ['Demand'], 'schedule': { 'powerFactor': 'billing', 'ratioTo': 0.95 } }""");
        assertThat(last(bill(rate, month("1", powerFactor)))).isEqualTo(adjustment);
    }

    /** Network operator's annex 7 (studylibde.com/doc/7839312): demand ÷ PF once PF < 0.96; kW to 1 decimal, PF to 4. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "0.9600,  400.0000",
        "0.9599,  416.7101", // a jump of 16.7 kW; a target ratio would give 400.04
        "0.95995, 400.0000", // 0.9600 once rounded
        "0.95994, 416.7101",
        "1,       400.0000"
    })
    void dividingByThePowerFactorOnlyOnceItIsLowIsACliff(String powerFactor, String billedKw) {
        String rate = rate(
                "'billing': { 'from': 'printed', 'round': { 'to': 0.0001 } }", "'roundLines': { 'to': 0.0001 },", """
                { 'name': 'Demand', 'quantity': { 'raised': { 'rounded': { 'peak': 'kW' }, 'to': 0.1 }, 'by': { 'powerFactor': 'billing',
                  'ratioTo': 1, 'onlyBelow': 0.96 } }, 'price': 1 }""");
        assertThat(last(bill(rate, month("400.04", powerFactor)))).isEqualTo(billedKw);
    }
}
